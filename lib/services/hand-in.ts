import type { Db } from '@/db/client';
import { type AuditActor, recordEvent } from '@/db/queries/audit';
import { lockJob, setJobState } from '@/db/queries/jobs';
import { conflict, notFound } from '@/lib/errors';

/**
 * The inspector hands the job to the office for the check: the act, the name and the time print on the report.
 * Readings can still be put right until the report is out.
 */
export async function handIn(db: Db, actor: AuditActor, jobId: string, at: Date = new Date()): Promise<void> {
  const job = await lockJob(db, jobId);
  if (!job) throw notFound('job');
  if (job.state !== 'open') throw conflict('This job has been handed in already.');
  if (!job.planMadeAt) throw conflict('Make the plan first.');
  await setJobState(db, jobId, 'in-check');
  await recordEvent(db, actor, {
    action: 'job.changed',
    subjectType: 'job',
    subjectId: jobId,
    detail: { state: 'in-check' },
    at,
  });
}
