import type { MarkKind } from '@/components/plots/verdict-ink';
import { verdictMark } from '@/components/plots/verdict-mark-geometry';
import type { ReportModel, SummaryRow } from '@/lib/reporting/report-model';
import { summaryTolerance, verdictText } from '@/lib/reporting/result-text';
import { titleWithComponent } from '@/lib/reporting/title-with-component';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { drawingSlab } from '@/templates/report/flow/drawing-slab';
import { type FlowItem, moved, type Slab, slabItem, space } from '@/templates/report/flow/ops';
import { heading, type Kit, markedWords } from '@/templates/report/flow/parts';
import { type Column, type TableCell, table, tableWidth } from '@/templates/report/flow/table';
import { TYPE } from '@/templates/report/theme';

/** One row a planned test: as found, as left, tolerance, verdict as a mark and a word. */
export function summary(kit: Kit, model: ReportModel): FlowItem[] {
  const words = REPORT_WORDS.summary;
  const otherUnits = model.summary.some(({ unit }) => unit !== undefined && unit !== 'items');
  const fixed: Column[] = [
    { head: words.asFound, widthPt: 66, align: 'decimal', style: TYPE.figure },
    { head: words.asLeft, widthPt: 52, align: 'decimal', style: TYPE.figure },
    { head: words.tolerance, widthPt: otherUnits ? 58 : 42, align: 'decimal', style: TYPE.figure },
    { head: words.verdict, widthPt: 112 },
  ];
  const number: Column = { head: words.number, widthPt: 24, style: TYPE.figure };
  const test: Column = { head: words.test, widthPt: 0 };
  test.widthPt = kit.widthPt - tableWidth([number, test, ...fixed]);
  const columns = [number, test, ...fixed];
  const decimals = Math.max(0, ...model.summary.map((row) => row.asFound?.match(/[.,](\d+)/)?.[1]?.length ?? 0));
  const rows = model.summary.map((row): TableCell[] => [
    String(row.order),
    titleWithComponent(row.title, row.component),
    asFoundCell(kit, row, fixed[0] as Column, decimals),
    row.asLeft === null ? REPORT_WORDS.none : row.linked ? `${words.linkedSign} ${row.asLeft}` : row.asLeft,
    summaryTolerance(row),
    verdictCell(kit, row, fixed[3] as Column),
  ]);
  const notes = [
    model.summary.some((row) => row.linked) ? words.linkedNote : '',
    model.summary.some((row) => wasNotFine(row) && row.unit !== 'items') ? words.asFoundOut : '',
    model.summary.some((row) => wasNotFine(row) && row.unit === 'items') ? words.asFoundOutOfOrder : '',
  ].filter((note) => note !== '');
  const note = notes.length ? [space(5), slabItem(kit.type.paragraph(notes.join(' '), TYPE.small, kit.widthPt))] : [];
  return [...heading(kit, words.heading), table(kit.type, columns, rows), ...note];
}

const FINE: readonly MarkKind[] = ['within-tolerance', 'for-information'];
const wasNotFine = ({ asFoundVerdict }: SummaryRow) => asFoundVerdict !== null && !FINE.includes(asFoundVerdict);

/** A figure as found, with the mark before it where it was not within tolerance. */
function asFoundCell(kit: Kit, row: SummaryRow, column: Column, decimals: number): TableCell {
  const verdict = row.asFoundVerdict;
  if (!verdict || FINE.includes(verdict)) return row.asFound ?? REPORT_WORDS.none;
  const mark = drawingSlab(kit.type, verdictMark(verdict), 20);
  // A function check has no figure: the mark stands alone.
  if (row.asFound === null) return { heightPt: TYPE.figure.leadPt, ops: [moved(mark, 0, 0)] };
  const own = row.asFound.match(/[.,](\d+)/)?.[1]?.length ?? 0;
  const right = column.widthPt - 6 - (decimals - own) * kit.type.width('0', TYPE.figure);
  const figure = kit.type.line(row.asFound, TYPE.figure, right, 'end');
  return { heightPt: figure.heightPt, ops: [moved(mark, 0, 0), ...figure.ops] } satisfies Slab;
}

function verdictCell(kit: Kit, row: SummaryRow, column: Column): Slab {
  // What was only measured as found counts as it was found.
  const kind = row.leftOut !== null ? 'left-out' : (row.asLeftVerdict ?? row.asFoundVerdict ?? 'not-measured');
  const parts = [
    [verdictText(kind, row.unit, true), row.leftOut ?? ''].filter((part) => part !== '').join(': '),
    row.remarkNo === null ? '' : `${REPORT_WORDS.summary.remark} ${row.remarkNo}`,
  ];
  return markedWords(kit, kind, parts.filter((part) => part !== '').join(', '), TYPE.strong, column.widthPt - 6);
}
