import type { Db } from '@/db/client';
import { findReport, listSignatures, type ReportRow, type ReportState, type SignatureRow } from '@/db/queries/reports';

export interface ReportRevision {
  id: string;
  number: string;
  revision: number;
  state: ReportState;
  pdfState: 'waiting' | 'ready' | 'failed';
  issuedAt: Date;
  signedAt: Date | null;
}

export interface ReportView {
  report: ReportRow;
  job: { id: string; reference: string; state: 'open' | 'in-check' | 'issued' | 'closed' };
  /** Null where the machine itself is not the reader's to see any more. */
  machineId: string | null;
  /** All revisions of the job's report that the reader may see, newest first; this one among them. */
  revisions: ReportRevision[];
  signatures: SignatureRow[];
}

/** An issued report with its evidence and its place among the revisions. */
export async function reportView(db: Db, id: string): Promise<ReportView | undefined> {
  const report = await findReport(db, id);
  if (!report) return undefined;
  const job = await db('jobs')
    .where({ id: report.jobId })
    .first({ id: 'id', reference: 'reference', state: 'state', machineId: 'machine_id' });
  if (!job) return undefined;
  const machine = await db('machines').where({ id: job.machineId }).first('id');
  return {
    report,
    job: { id: job.id, reference: job.reference, state: job.state },
    machineId: machine?.id ?? null,
    revisions: await listRevisions(db, report.jobId),
    signatures: await listSignatures(db, id),
  };
}

/** The revisions of a job's report, newest first. */
export const listRevisions = (db: Db, jobId: string): Promise<ReportRevision[]> =>
  db('reports').where({ job_id: jobId }).orderBy('revision', 'desc').select({
    id: 'id',
    number: 'number',
    revision: 'revision',
    state: 'state',
    pdfState: 'pdf_state',
    issuedAt: 'issued_at',
    signedAt: 'signed_at',
  });

/** Which sheet stands behind a number of the report; staff read sheets, so a customer's page asks on the report's behalf. */
export const sheetNumbers = (db: Db, jobId: string): Promise<{ id: string; position: number }[]> =>
  db('sheets').where({ job_id: jobId }).orderBy('position').select('id', 'position');
