import type { Db } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import { lockJob, updateComponentConditions } from '@/db/queries/jobs';
import type { Viewer } from '@/lib/auth/viewer';
import { changedMeanwhile, conflict, invalid, notFound } from '@/lib/errors';
import { machineParts } from '@/lib/planning/machine-parts';
import type { ComponentConditions } from '@/lib/schemas/component-conditions';
import { closedBecause } from './keep-readings';

/**
 * Keeps what was opened, as a whole; a component that is not named is one of which nothing is said.
 * @throws DomainError 422 for a component that the machine does not have; 409 when the report is out; 412 when changed meanwhile
 */
export async function keepComponentConditions(
  db: Db,
  viewer: Viewer,
  jobId: string,
  version: number,
  conditions: ComponentConditions,
): Promise<void> {
  const job = await lockJob(db, jobId);
  if (!job) throw notFound('job');
  if (closedBecause(job.state)) throw conflict('The report of this job has been issued: what it says does not change.');
  const parts = new Set(machineParts(job.makeUp).map(({ id }) => id));
  const unknown = Object.keys(conditions).filter((id) => !parts.has(id));
  if (unknown.length > 0)
    throw invalid(unknown.map((id) => ({ pointer: `/${id}`, detail: `The machine of this job has no ${id}.` })));
  if (!(await updateComponentConditions(db, jobId, version, conditions))) throw changedMeanwhile();
  await recordEvent(db, viewer, {
    action: 'job.changed',
    subjectType: 'job',
    subjectId: jobId,
    detail: { components: conditions },
  });
}
