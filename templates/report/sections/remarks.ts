import type { ReportModel } from '@/lib/reporting/report-model';
import { longDate } from '@/lib/reporting/report-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import type { FlowItem } from '@/templates/report/flow/ops';
import { heading, type Kit } from '@/templates/report/flow/parts';
import { type Column, table, tableWidth } from '@/templates/report/flow/table';
import { TYPE } from '@/templates/report/theme';

/** Remarks and points, numbered as the summary names them, with who and until when. */
export function remarks(kit: Kit, model: ReportModel): FlowItem[] {
  if (!model.remarks.length) return [];
  const words = REPORT_WORDS.remarks;
  const text: Column = { head: words.text, widthPt: 0 };
  const columns: Column[] = [
    { head: words.number, widthPt: 24, style: TYPE.figure },
    { head: words.test, widthPt: 26, style: TYPE.figure },
    text,
    { head: words.owner, widthPt: 82 },
    { head: words.due, widthPt: 74 },
    { head: words.closed, widthPt: 74 },
  ];
  text.widthPt = kit.widthPt - tableWidth(columns);
  const rows = model.remarks.map((remark) => [
    String(remark.no),
    remark.sheetOrder === null ? REPORT_WORDS.none : String(remark.sheetOrder),
    remark.text,
    remark.owner ?? REPORT_WORDS.none,
    remark.due ? longDate(remark.due) : REPORT_WORDS.none,
    remark.closed ? longDate(remark.closed) : words.open,
  ]);
  return [...heading(kit, words.heading), table(kit.type, columns, rows)];
}
