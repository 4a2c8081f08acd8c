import type { AnnexEntry, ReportModel } from '@/lib/reporting/report-model';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { type FlowItem, slabItem, space } from '@/templates/report/flow/ops';
import { flowingText, heading, type Kit } from '@/templates/report/flow/parts';
import { type Column, table, tableWidth } from '@/templates/report/flow/table';
import { TYPE } from '@/templates/report/theme';

/** On demand: how every result came about, with the figures put into the formulas. */
export function annex(kit: Kit, model: ReportModel): FlowItem[] {
  if (!model.annex?.length) return [];
  const words = REPORT_WORDS.annex;
  return [
    ...heading(kit, words.heading),
    flowingText(kit, words.note, TYPE.small),
    ...model.annex.flatMap((entry) => entryItems(kit, entry)),
  ];
}

function entryItems(kit: Kit, { sheetOrder, title, passWords, explanation }: AnnexEntry): FlowItem[] {
  const words = REPORT_WORDS.annex;
  const formula: Column = { head: words.formula, widthPt: 0, style: TYPE.small };
  const columns: Column[] = [
    { head: words.step, widthPt: 150, style: TYPE.small },
    formula,
    { head: words.numbers, widthPt: 150, style: TYPE.small },
    { head: words.value, widthPt: 84, style: TYPE.small },
  ];
  formula.widthPt = kit.widthPt - tableWidth(columns);
  const rows = explanation.steps.map(({ what, formula: law, withNumbers, value }) => [what, law, withNumbers, value]);
  const name = kit.type.paragraph(`${sheetOrder} · ${title}, ${passWords}`, TYPE.strong, kit.widthPt);
  const readings = explanation.readings.map(({ label, figure }) => `${label}: ${figure}`).join(' · ');
  return [
    space(8),
    slabItem(name, { keepWithNext: true }),
    table(kit.type, columns, rows),
    ...(readings === '' ? [] : [space(2), flowingText(kit, `${words.readings}: ${readings}`, TYPE.small)]),
    space(1),
    flowingText(
      kit,
      `${explanation.title} · ${explanation.source.text} · ${words.ruleSet} ${explanation.ruleSet}`,
      TYPE.small,
    ),
  ];
}
