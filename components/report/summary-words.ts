import type { MarkKind } from '@/components/plots/verdict-ink';
import type { SummaryRow } from '@/lib/reporting/report-model';
import { verdictText } from '@/lib/reporting/result-text';
import { REPORT_WORDS } from '@/lib/reporting/words';

/** What counts in the end: as left, else as it was found. */
export const finalVerdict = (row: SummaryRow): MarkKind =>
  row.leftOut !== null ? 'left-out' : (row.asLeftVerdict ?? row.asFoundVerdict ?? 'not-measured');

/** `out, remark 1`; `left out: not agreed`. */
export function verdictWords(row: SummaryRow): string {
  const parts = [
    [verdictText(finalVerdict(row), row.unit, true), row.leftOut ?? ''].filter((part) => part !== '').join(': '),
    row.remarkNo === null ? '' : `${REPORT_WORDS.summary.remark} ${row.remarkNo}`,
  ];
  return parts.filter((part) => part !== '').join(', ');
}

/** What a reader must have seen before accepting: everything that is not plainly within tolerance or for information. */
export const isDeviation = (row: SummaryRow): boolean =>
  !['within-tolerance', 'for-information'].includes(finalVerdict(row));
