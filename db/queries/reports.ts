import type { Db } from '@/db/client';
import { newId } from '@/lib/id';
import type { ReportModel } from '@/lib/reporting/report-model';
import type { Outcome } from '@/lib/schemas/signature';
import { own } from './jobs';

export type ReportState = 'checked' | 'issued' | 'signed' | 'signed-with-remarks' | 'refused' | 'superseded';

export interface ReportRow {
  id: string;
  jobId: string;
  number: string;
  revision: number;
  state: ReportState;
  model: ReportModel;
  modelSha256: string;
  pdfState: 'waiting' | 'ready' | 'failed';
  pdfFileId: string | null;
  signedPdfFileId: string | null;
  pdfErrorId: string | null;
  issuedAt: Date;
  signedAt: Date | null;
  supersedes: string | null;
  version: number;
}

const columns = {
  id: 'id',
  jobId: 'job_id',
  number: 'number',
  revision: 'revision',
  state: 'state',
  model: 'model',
  modelSha256: 'model_sha256',
  pdfState: 'pdf_state',
  pdfFileId: 'pdf_file_id',
  signedPdfFileId: 'signed_pdf_file_id',
  pdfErrorId: 'pdf_error_id',
  issuedAt: 'issued_at',
  signedAt: 'signed_at',
  supersedes: 'supersedes',
  version: 'version',
};

export const findReport = (db: Db, id: string): Promise<ReportRow | undefined> =>
  db('reports').where({ id }).first(columns);

/** For somebody who is about to change it; a customer can lock only a report that waits for an answer. */
export const lockReport = (db: Db, id: string): Promise<ReportRow | undefined> =>
  db('reports').where({ id }).forUpdate().first(columns);

export const latestReport = (db: Db, jobId: string): Promise<ReportRow | undefined> =>
  db('reports').where({ job_id: jobId }).orderBy('revision', 'desc').first(columns);

/** Numbers run per organisation and year, without a gap: the counter's row is locked until the transaction ends. */
export async function nextReportNumber(db: Db, code: string, year: number): Promise<string> {
  const [row] = await db('report_counters')
    .insert({ organisation_id: own(db), id: newId(), year, last: 1 })
    .onConflict(['organisation_id', 'year'])
    .merge({ last: db.raw('report_counters.last + 1') })
    .returning('last');
  return `${code}-${year}-${String(row.last).padStart(6, '0')}`;
}

export async function insertReport(
  db: Db,
  report: {
    id: string;
    jobId: string;
    model: ReportModel;
    modelText: string;
    modelSha256: string;
    issuedBy: string;
    issuedAt: Date;
    supersedes: string | null;
  },
): Promise<void> {
  await db('reports').insert({
    organisation_id: own(db),
    id: report.id,
    job_id: report.jobId,
    number: report.model.document.number,
    revision: report.model.document.revision,
    state: 'issued',
    model: report.modelText,
    model_sha256: report.modelSha256,
    issued_by: report.issuedBy,
    issued_at: report.issuedAt,
    supersedes: report.supersedes,
  });
}

export const queueRendering = (db: Db, reportId: string): PromiseLike<unknown> =>
  db.raw(
    `select enqueue('render-report', jsonb_build_object('organisationId', app_organisation(), 'reportId', ?::text), ?)`,
    [reportId, `render-report:${reportId}`],
  );

export async function setReportState(
  db: Db,
  id: string,
  change: { state: ReportState; signedAt?: Date; pdfState?: 'waiting' },
): Promise<void> {
  await db('reports')
    .where({ id })
    .update({
      state: change.state,
      version: db.raw('version + 1'),
      ...(change.signedAt ? { signed_at: change.signedAt } : {}),
      ...(change.pdfState ? { pdf_state: change.pdfState } : {}),
    });
}

export async function keepReportPdf(db: Db, id: string, kind: 'issued' | 'signed', fileId: string): Promise<void> {
  await db('reports')
    .where({ id })
    .update({
      [kind === 'signed' ? 'signed_pdf_file_id' : 'pdf_file_id']: fileId,
      pdf_state: 'ready',
      pdf_error_id: null,
    });
}

export async function noteRenderFailure(db: Db, id: string, errorId: string): Promise<void> {
  await db('reports').where({ id }).update({ pdf_state: 'failed', pdf_error_id: errorId });
}

export interface FileRow {
  id: string;
  key: string;
  name: string;
  contentType: string;
  sha256: string;
}

export const findFile = (db: Db, id: string): Promise<FileRow | undefined> =>
  db('files')
    .where({ id })
    .first({ id: 'id', key: 'key', name: 'name', contentType: 'content_type', sha256: 'sha256' });

export async function insertFile(
  db: Db,
  file: {
    key: string;
    kind: 'report' | 'certificate' | 'nameplate' | 'photo';
    name: string;
    contentType: string;
    byteLength: number;
    sha256: string;
  },
): Promise<string> {
  const id = newId();
  await db('files').insert({
    organisation_id: own(db),
    id,
    key: file.key,
    kind: file.kind,
    name: file.name,
    content_type: file.contentType,
    byte_length: file.byteLength,
    sha256: file.sha256,
  });
  return id;
}

export interface SignatureRow {
  id: string;
  role: 'inspector' | 'reviewer' | 'customer';
  outcome: 'measured' | 'checked' | Outcome;
  name: string;
  functionTitle: string | null;
  company: string | null;
  place: string | null;
  typed: string | null;
  strokes: string[] | null;
  reason: string | null;
  intentText: string;
  method: 'on-tablet' | 'signed-in' | 'signing-link';
  witness: string | null;
  modelSha256: string;
  ip: string;
  userAgent: string;
  deviceTimeZone: string | null;
  signedAt: Date;
}

export const listSignatures = (db: Db, reportId: string): Promise<SignatureRow[]> =>
  db('signatures').where({ report_id: reportId }).orderBy('signed_at').select({
    id: 'id',
    role: 'role',
    outcome: 'outcome',
    name: 'name',
    functionTitle: 'function_title',
    company: 'company',
    place: 'place',
    typed: 'typed',
    strokes: 'strokes',
    reason: 'reason',
    intentText: 'intent_text',
    method: 'method',
    witness: 'witness',
    modelSha256: 'model_sha256',
    ip: 'ip',
    userAgent: 'user_agent',
    deviceTimeZone: 'device_time_zone',
    signedAt: 'signed_at',
  });

export async function insertSignature(
  db: Db,
  reportId: string,
  signature: Omit<SignatureRow, 'id'> & { accountId: string | null },
): Promise<void> {
  await db('signatures').insert({
    organisation_id: own(db),
    id: newId(),
    report_id: reportId,
    role: signature.role,
    outcome: signature.outcome,
    name: signature.name,
    function_title: signature.functionTitle,
    company: signature.company,
    place: signature.place,
    typed: signature.typed,
    strokes: signature.strokes && JSON.stringify(signature.strokes),
    reason: signature.reason,
    intent_text: signature.intentText,
    intent_language: 'en',
    model_sha256: signature.modelSha256,
    method: signature.method,
    witness: signature.witness,
    account_id: signature.accountId,
    ip: signature.ip,
    user_agent: signature.userAgent,
    device_time_zone: signature.deviceTimeZone,
    signed_at: signature.signedAt,
  });
}
