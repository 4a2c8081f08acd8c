import type { Knex } from 'knex';
import { recordEvent } from '@/db/queries/audit';
import { findJob } from '@/db/queries/jobs';
import { insertRemarks } from '@/db/queries/remarks';
import { findReport, insertSignature, lockReport, queueRendering, setReportState } from '@/db/queries/reports';
import type { Viewer } from '@/lib/auth/viewer';
import { conflict, notFound } from '@/lib/errors';
import type { RequestOrigin } from '@/lib/http/request-origin';
import type { Outcome, SignatureForm } from '@/lib/schemas/signature';

const states = { accept: 'signed', 'accept-with-remarks': 'signed-with-remarks', refuse: 'refused' } as const;

/**
 * The customer's answer to an issued report, exactly once: signed in, or on the tablet of the inspector, who is then the recorded
 * witness. What was signed is named by its hash; nothing of it can change afterwards.
 * @throws DomainError 409 when the report has an answer already
 */
export async function signReport(
  trx: Knex.Transaction,
  viewer: Viewer,
  reportId: string,
  form: SignatureForm,
  origin: RequestOrigin,
  signedAt: Date = new Date(),
): Promise<{ state: (typeof states)[Outcome] }> {
  const report = await lockReport(trx, reportId);
  if (report?.state !== 'issued') {
    const seen = report ?? (await findReport(trx, reportId));
    if (!seen) throw notFound('report');
    throw conflict('This report has its answer already, or has been replaced.', { report: `/reports/${reportId}` });
  }
  const job = await findJob(trx, report.jobId);
  if (job?.state === 'open' || job?.state === 'in-check') {
    throw conflict('The job has been opened again: this revision will be replaced and takes no answer any more.');
  }
  const onTablet = viewer.customerId === null;
  const state = states[form.outcome];
  await insertSignature(trx, reportId, {
    role: 'customer',
    outcome: form.outcome,
    name: form.name,
    functionTitle: form.functionTitle,
    company: form.company,
    place: form.place,
    typed: form.typed,
    strokes: form.strokes ?? null,
    reason: form.reason,
    intentText: form.intentText,
    method: onTablet ? 'on-tablet' : 'signed-in',
    witness: onTablet ? viewer.name : null,
    modelSha256: report.modelSha256,
    ip: origin.ip,
    userAgent: origin.userAgent,
    deviceTimeZone: form.deviceTimeZone ?? null,
    signedAt,
    accountId: viewer.accountId,
  });
  await insertRemarks(
    trx,
    report.jobId,
    reportId,
    form.remarks.map((remark) => ({
      text: remark.text,
      sheetId: remark.sheetId ?? null,
      owner: remark.owner,
      due: remark.due,
    })),
  );
  await setReportState(trx, reportId, { state, signedAt, pdfState: 'waiting' });
  await queueRendering(trx, reportId);
  await recordEvent(trx, viewer, {
    action: form.outcome === 'refuse' ? 'report.refused' : 'report.signed',
    subjectType: 'report',
    subjectId: reportId,
    detail: { outcome: form.outcome, name: form.name, method: onTablet ? 'on-tablet' : 'signed-in' },
  });
  return { state };
}
