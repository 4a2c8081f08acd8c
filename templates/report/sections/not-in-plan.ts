import { groupNotInPlan } from '@/lib/reporting/group-not-in-plan';
import type { ReportModel } from '@/lib/reporting/report-model';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { type FlowItem, slabItem, space } from '@/templates/report/flow/ops';
import { flowingText, heading, type Kit } from '@/templates/report/flow/parts';
import { TYPE } from '@/templates/report/theme';

/** Tests of the codes that the plan does not have: each reason once, the titles run on below it. */
export function notInPlan(kit: Kit, model: ReportModel): FlowItem[] {
  if (!model.notInPlan.length) return [];
  const groups = groupNotInPlan(model.notInPlan).flatMap(({ reason, titles }, index) => [
    space(index ? 5 : 2),
    slabItem(kit.type.paragraph(`${reason} (${titles.length})`, TYPE.strong, kit.widthPt), {
      keepWithNext: true,
    }),
    flowingText(kit, titles.join(' · ')),
  ]);
  return [...heading(kit, REPORT_WORDS.notInPlan.heading), ...groups];
}
