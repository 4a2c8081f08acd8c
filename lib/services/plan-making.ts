import type { Db } from '@/db/client';
import type { JobRow } from '@/db/queries/jobs';
import { type PlanStart, planStarts } from '@/db/read-models/plan-starts';
import { testDurations } from '@/db/read-models/test-durations';
import { type Estimate, estimateOf } from '@/lib/planning/estimate-minutes';
import { anyTouched, whyItFollows } from '@/lib/planning/what-follows';
import type { PlannedSheet } from '@/standards/types';
import { proposalsNow } from './make-plan';

export interface PlanMaking {
  proposals: PlannedSheet[];
  /** By key: how long it will take, and from what that is known. */
  estimates: Record<string, Estimate>;
  /** By key, where something is said to have been opened: why the test follows; a test without entry does not follow. */
  follows: Record<string, string[]>;
  starts: PlanStart[];
}

/** All that a person makes a plan out of. */
export async function planMaking(db: Db, job: JobRow, timeZone: string): Promise<PlanMaking> {
  const proposals = await proposalsNow(db, job);
  const past = await testDurations(db, timeZone);
  const touched = anyTouched(job.componentConditions);
  const follows = proposals.flatMap(({ key, dependsOn }) => {
    const why = touched ? whyItFollows(dependsOn, job.makeUp, job.componentConditions) : null;
    return why === null ? [] : [[key, why] as const];
  });
  return {
    proposals,
    estimates: Object.fromEntries(proposals.map((sheet) => [sheet.key, estimateOf(sheet, past)])),
    follows: Object.fromEntries(follows),
    starts: await planStarts(db, job),
  };
}
