import type { ReportModel } from '@/lib/reporting/report-model';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { type FlowItem, space } from '@/templates/report/flow/ops';
import { flowingText, heading, type Kit } from '@/templates/report/flow/parts';
import { TYPE } from '@/templates/report/theme';

/** For what the report stands and for what not; with which program it was made. */
export function statement(kit: Kit, model: ReportModel): FlowItem[] {
  return [
    ...heading(kit, REPORT_WORDS.statement),
    flowingText(kit, model.statement),
    space(4),
    flowingText(kit, `${REPORT_WORDS.program} ${model.document.programVersion}`, TYPE.small),
  ];
}
