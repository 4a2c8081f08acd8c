import { createHash } from 'node:crypto';
import type { Knex } from 'knex';
import { recordEvent } from '@/db/queries/audit';
import { lockJob, setJobState } from '@/db/queries/jobs';
import {
  insertReport,
  insertSignature,
  latestReport,
  nextReportNumber,
  queueRendering,
  setReportState,
} from '@/db/queries/reports';
import { reportSource } from '@/db/read-models/report-source';
import type { Viewer } from '@/lib/auth/viewer';
import { conflict, DomainError, notFound } from '@/lib/errors';
import type { RequestOrigin } from '@/lib/http/request-origin';
import { newId } from '@/lib/id';
import { checkFindings } from '@/lib/reporting/check-findings';
import { issueIntent } from '@/lib/schemas/signature';
import { buildReport } from './build-report';

/**
 * Checks the job once more and issues its report: the document is frozen, numbered, and handed to the worker for its PDF.
 * `annex`: with the way to every figure.
 * @throws DomainError 422 when something blocks the report or was not confirmed; 409 when it is out already
 */
export async function issueReport(
  trx: Knex.Transaction,
  viewer: Viewer,
  jobId: string,
  { confirmed, annex }: { confirmed: boolean; annex: boolean },
  origin: RequestOrigin,
  issuedAt: Date = new Date(),
): Promise<{ id: string; number: string; revision: number }> {
  const job = await lockJob(trx, jobId);
  if (!job) throw notFound('job');
  if (job.state === 'issued' || job.state === 'closed') {
    throw conflict('The report of this job is out already. Open the job again for a new revision.');
  }
  const source = await reportSource(trx, jobId);
  if (!source) throw notFound('job');
  const findings = checkFindings(source.board, source.organisation.timeZone);
  const stops = findings.filter(
    (finding) => finding.weight === 'blocks' || (finding.weight === 'confirm' && !confirmed),
  );
  if (stops.length > 0) {
    const errors = stops.map((finding) => ({
      pointer: finding.weight === 'confirm' ? '/confirmed' : '',
      detail: finding.position === null ? finding.text : `Test ${finding.position}: ${finding.text}`,
    }));
    throw new DomainError(422, 'The report cannot go out yet', errors[0]?.detail ?? '', errors);
  }
  const earlier = await latestReport(trx, jobId);
  const number = earlier?.number ?? (await nextReportNumber(trx, source.organisation.code, issuedAt.getUTCFullYear()));
  const revision = (earlier?.revision ?? 0) + 1;
  const model = buildReport(source, { number, revision, at: issuedAt, by: viewer }, annex);
  const modelText = JSON.stringify(model);
  const modelSha256 = createHash('sha256').update(modelText).digest('hex');
  const id = newId();
  await insertReport(trx, {
    id,
    jobId,
    model,
    modelText,
    modelSha256,
    issuedBy: viewer.membershipId,
    issuedAt,
    supersedes: earlier?.id ?? null,
  });
  if (earlier && earlier.state !== 'superseded') {
    await setReportState(trx, earlier.id, { state: 'superseded' });
    await recordEvent(trx, viewer, {
      action: 'report.superseded',
      subjectType: 'report',
      subjectId: earlier.id,
      detail: { by: id },
    });
  }
  await insertSignature(trx, id, {
    role: 'reviewer',
    outcome: 'checked',
    name: viewer.name,
    functionTitle: viewer.functionTitle,
    company: viewer.organisationName,
    place: null,
    typed: viewer.name,
    strokes: null,
    reason: null,
    intentText: issueIntent,
    method: 'signed-in',
    witness: null,
    modelSha256,
    ip: origin.ip,
    userAgent: origin.userAgent,
    deviceTimeZone: null,
    signedAt: issuedAt,
    accountId: viewer.accountId,
  });
  await setJobState(trx, jobId, 'issued');
  await queueRendering(trx, id);
  await recordEvent(trx, viewer, {
    action: 'report.issued',
    subjectType: 'report',
    subjectId: id,
    detail: { number, revision },
  });
  return { id, number, revision };
}
