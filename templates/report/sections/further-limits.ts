import type { PassBlock } from '@/lib/reporting/report-model';
import { furtherFigures } from '@/lib/reporting/result-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { type FlowItem, space } from '@/templates/report/flow/ops';
import { type Kit, markedWords } from '@/templates/report/flow/parts';
import { type Column, table } from '@/templates/report/flow/table';
import { TYPE } from '@/templates/report/theme';

/** Further figures of the same readings with limits of their own: what it is, what it came to, what it may be, the verdict. */
export function furtherLimits(kit: Kit, pass: PassBlock): FlowItem[] {
  const figures = furtherFigures(pass.judgement, { text: pass.resultMm, unit: pass.resultUnit });
  if (!figures.length) return [];
  const words = REPORT_WORDS.block;
  const columns: Column[] = [
    { head: words.further, widthPt: kit.widthPt * 0.42 },
    { head: words.result, widthPt: 74, align: 'right', style: TYPE.figure },
    { head: words.limitOf, widthPt: 74, align: 'right', style: TYPE.figure },
    { head: words.verdict, widthPt: 116, gapPt: 14 },
  ];
  const verdictPt = 110;
  const rows = figures.map(({ label, value, limit, verdict, words: verdictWords }) => [
    label,
    value,
    limit,
    markedWords(kit, verdict, verdictWords, TYPE.strong, verdictPt),
  ]);
  return [space(4), table(kit.type, columns, rows, 'close')];
}
