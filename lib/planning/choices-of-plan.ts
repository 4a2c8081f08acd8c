import type { LeftOutReason, PlanForm } from '@/lib/schemas/job';
import type { PlannedTolerance } from '@/standards/types';

export interface MadePlan {
  sheets: {
    key: string;
    tolerance: PlannedTolerance | null;
    leftOutReason: LeftOutReason | null;
    leftOutText: string | null;
  }[];
  exclusions: { key: string; reason: LeftOutReason; text: string | null }[];
}

/** What was chosen when a plan was made and since: to begin another plan from. Pure. */
export function choicesOfPlan({ sheets, exclusions }: MadePlan): PlanForm {
  return {
    include: sheets.filter(({ leftOutReason }) => leftOutReason === null).map(({ key }) => key),
    exclusions: [
      ...exclusions.map(({ key, reason, text }) => ({ key, reason, text })),
      ...sheets.flatMap(({ key, leftOutReason, leftOutText }) =>
        leftOutReason ? [{ key, reason: leftOutReason, text: leftOutText }] : [],
      ),
    ],
    contractTolerances: sheets.flatMap(({ key, tolerance, leftOutReason }) =>
      tolerance?.provenance.kind === 'contract' && leftOutReason === null
        ? [{ key, toleranceUm: tolerance.baseUm, source: tolerance.provenance.text }]
        : [],
    ),
  };
}
