import type { MarkKind } from '@/components/plots/verdict-ink';
import type { CheckedItem, PassBlock } from '@/lib/reporting/report-model';
import { verdictText } from '@/lib/reporting/result-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import type { FlowItem, Slab } from '@/templates/report/flow/ops';
import { type Kit, markedWords } from '@/templates/report/flow/parts';
import { type Column, type TableCell, table, tableWidth } from '@/templates/report/flow/table';
import { TYPE } from '@/templates/report/theme';

/** Items of a function check: what was asked, the answer with its mark, the figure, the remark. */
export function checkItems(kit: Kit, pass: PassBlock, widthPt: number): FlowItem[] {
  const items = pass.items ?? [];
  if (!items.length) return [];
  const words = REPORT_WORDS.block;
  const hasValue = items.some(({ value }) => value !== null);
  const hasRemark = items.some(({ remark }) => remark !== null);
  const question: Column = { head: words.items, widthPt: 0 };
  const answer: Column = { head: words.answer, widthPt: 116 };
  const columns = [
    question,
    answer,
    ...(hasValue ? [{ head: words.value, widthPt: 84, style: { ...TYPE.figure, sizePt: 8 } }] : []),
    ...(hasRemark ? [{ head: words.remark, widthPt: widthPt * 0.26 }] : []),
  ];
  question.widthPt = widthPt - tableWidth(columns);
  const rows = items.map((item): TableCell[] => [
    item.question,
    answerCell(kit, item, answer.widthPt - 6),
    ...(hasValue ? [item.value ?? ''] : []),
    ...(hasRemark ? [item.remark ?? ''] : []),
  ]);
  return [table(kit.type, columns, rows, 'close')];
}

function answerCell(kit: Kit, { answer, inOrder }: CheckedItem, widthPt: number): Slab {
  const kind: MarkKind = inOrder === null ? 'not-measured' : inOrder ? 'within-tolerance' : 'out-of-tolerance';
  const words = answer ?? REPORT_WORDS.block.notAnswered;
  // “yes” with a figure outside its limits says both.
  const beside =
    answer === 'yes' && inOrder === false ? `${words}, ${verdictText('out-of-tolerance', 'items')}` : words;
  return markedWords(kit, kind, beside, TYPE.body, widthPt);
}
