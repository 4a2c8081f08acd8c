import { DrawingSvg } from '@/components/plots/drawing-svg';
import { verdictMark } from '@/components/plots/verdict-mark-geometry';
import type { SummaryRow } from '@/lib/reporting/report-model';
import { verdictText } from '@/lib/reporting/result-text';
import { REPORT_WORDS } from '@/lib/reporting/words';

const fine = ['within-tolerance', 'for-information'];

/** It was not within tolerance as it was found. */
export const wasNotFine = (row: SummaryRow): boolean =>
  row.asFoundVerdict !== null && !fine.includes(row.asFoundVerdict);

/** A figure as found, with the mark before it where it was not within tolerance. */
export function AsFoundFigure({ row }: { row: SummaryRow }) {
  const verdict = row.asFoundVerdict;
  if (!verdict || !wasNotFine(row)) return row.asFound ?? REPORT_WORDS.none;
  return (
    <span className="inline-flex items-center gap-1.5">
      <DrawingSvg drawing={verdictMark(verdict)} fixed decorative className="h-3 w-auto shrink-0" />
      <span className="sr-only">
        {verdictText(verdict, row.unit)}
        {row.asFound && ': '}
      </span>
      {row.asFound}
    </span>
  );
}

/** `= 0.0035` where as left is as found. */
export const asLeftWords = (row: SummaryRow): string => {
  if (row.asLeft === null) return REPORT_WORDS.none;
  return row.linked ? `${REPORT_WORDS.summary.linkedSign} ${row.asLeft}` : row.asLeft;
};
