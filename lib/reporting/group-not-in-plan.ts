import type { ReportModel } from './report-model';

export interface NotPlanned {
  reason: string;
  titles: string[];
}

/** What the plan does not have, by reason: each reason once, in the order in which it first stands, with all the titles that it holds for. */
export function groupNotInPlan(entries: ReportModel['notInPlan']): NotPlanned[] {
  const groups = new Map<string, string[]>();
  for (const { title, reason } of entries) groups.set(reason, [...(groups.get(reason) ?? []), title]);
  return [...groups].map(([reason, titles]) => ({ reason, titles }));
}
