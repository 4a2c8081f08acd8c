import type { Db } from '@/db/client';
import type { JobRow } from '@/db/queries/jobs';
import { type PlanStartSource, planStarts } from '@/db/read-models/plan-starts';
import { testDurations } from '@/db/read-models/test-durations';
import { choicesOfPlan } from '@/lib/planning/choices-of-plan';
import { type Estimate, estimateOf, pastDurations } from '@/lib/planning/estimate-minutes';
import { anyTouched, whyItFollows } from '@/lib/planning/what-follows';
import type { PlanForm } from '@/lib/schemas/job';
import type { PlannedSheet } from '@/standards/types';
import { proposalsNow } from './make-plan';

/** Something that a new plan can begin from; it only preselects. */
export interface PlanStart extends Omit<PlanStartSource, 'plan'> {
  choices: PlanForm;
}

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
  const past = pastDurations(await testDurations(db, timeZone));
  const touched = anyTouched(job.componentConditions);
  const follows = proposals.flatMap(({ key, dependsOn }) => {
    const why = touched ? whyItFollows(dependsOn, job.makeUp, job.componentConditions) : null;
    return why === null ? [] : [[key, why] as const];
  });
  return {
    proposals,
    estimates: Object.fromEntries(proposals.map((sheet) => [sheet.key, estimateOf(sheet, past)])),
    follows: Object.fromEntries(follows),
    starts: (await planStarts(db, job)).map(({ plan, ...start }) => ({
      ...start,
      choices: 'include' in plan ? plan : choicesOfPlan(plan),
    })),
  };
}
