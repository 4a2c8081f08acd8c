import type { ReportModel } from '@/lib/reporting/report-model';
import { sentence } from '@/lib/reporting/report-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { type FlowItem, space } from '@/templates/report/flow/ops';
import { flowingText, heading, type Kit } from '@/templates/report/flow/parts';
import { type Column, table, tableWidth } from '@/templates/report/flow/table';
import { TYPE } from '@/templates/report/theme';

/** Instruments used, with certificate and due date; who allowed one that was out of date stands below. */
export function instruments(kit: Kit, model: ReportModel): FlowItem[] {
  if (!model.instruments.length) return [];
  const words = REPORT_WORDS.instruments;
  const fixed: Column[] = [
    { head: words.resolution, widthPt: 46, style: TYPE.figure },
    { head: words.uncertainty, widthPt: 102, style: TYPE.figure },
    { head: words.certificate, widthPt: 56, style: TYPE.figure },
    { head: words.calibrated, widthPt: 58, style: TYPE.figure },
    { head: words.due, widthPt: 58, style: TYPE.figure },
  ];
  const number: Column = { head: words.number, widthPt: 40, style: TYPE.figure };
  const name: Column = { head: words.name, widthPt: 0 };
  name.widthPt = kit.widthPt - tableWidth([number, name, ...fixed]);
  const show = (text: string | null) => text ?? REPORT_WORDS.none;
  const rows = model.instruments.map((i) => [
    i.number,
    i.name,
    show(i.resolution),
    show(i.uncertainty),
    show(i.certificate),
    show(i.calibrated),
    show(i.due),
  ]);
  const overrides = model.instruments.flatMap((i) => (i.override ? [`${i.number}: ${sentence(i.override)}.`] : []));
  const list = table(kit.type, [number, name, ...fixed], rows);
  list.keepWithNext = overrides.length > 0;
  return [...heading(kit, words.heading), list, ...overrides.flatMap((text) => [space(4), flowingText(kit, text)])];
}
