import type { ReportModel } from '@/lib/reporting/report-model';
import { REPORT_WORDS } from '@/lib/reporting/words';
import type { FlowItem } from '@/templates/report/flow/ops';
import { heading, type Kit } from '@/templates/report/flow/parts';
import { table } from '@/templates/report/flow/table';

/** Tests of the codes that the plan does not have, with the reason. */
export function notInPlan(kit: Kit, model: ReportModel): FlowItem[] {
  if (!model.notInPlan.length) return [];
  const words = REPORT_WORDS.notInPlan;
  const widthPt = (kit.widthPt - 8) / 2;
  const columns = [
    { head: words.test, widthPt },
    { head: words.reason, widthPt },
  ];
  const rows = model.notInPlan.map(({ title, reason }) => [title, reason]);
  return [...heading(kit, words.heading), table(kit.type, columns, rows)];
}
