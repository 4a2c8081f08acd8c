import type { Db } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import { lockJob, updateRefusal } from '@/db/queries/jobs';
import type { Viewer } from '@/lib/auth/viewer';
import { changedMeanwhile, conflict, notFound } from '@/lib/errors';

/**
 * Changes whether the plan of a job takes confirmed tolerances only.
 * @throws DomainError 409 when the plan is made: it was made by the choice that stood then; 412 when changed meanwhile
 */
export async function changeJob(
  db: Db,
  viewer: Viewer,
  jobId: string,
  version: number,
  change: { refuseUnconfirmed: boolean },
): Promise<void> {
  const job = await lockJob(db, jobId);
  if (!job) throw notFound('job');
  if (job.planMadeAt)
    throw conflict('The plan of this job is made: which tolerances it takes does not change any more.');
  if (!(await updateRefusal(db, jobId, version, change.refuseUnconfirmed))) throw changedMeanwhile();
  await recordEvent(db, viewer, { action: 'job.changed', subjectType: 'job', subjectId: jobId, detail: change });
}
