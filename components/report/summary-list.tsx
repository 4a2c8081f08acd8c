import type { ReactNode } from 'react';
import { VerdictMark } from '@/components/ui/verdict-mark';
import type { SummaryRow } from '@/lib/reporting/report-model';
import { summaryTolerance } from '@/lib/reporting/result-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { AsFoundFigure, asLeftWords } from './as-found-figure';
import { SummaryTitle } from './summary-title';
import { finalVerdict, verdictWords } from './summary-words';

/** The summary on a telephone: a test over three lines, so that its verdict is never off the edge. */
export function SummaryList({ rows, linkOf }: { rows: SummaryRow[]; linkOf?: (row: SummaryRow) => string }) {
  const words = REPORT_WORDS.summary;
  return (
    <ol className="border-t-[1.5px] border-ink">
      {rows.map((row) => (
        <li key={row.order} className="grid grid-cols-[2rem_minmax(0,1fr)] border-b border-hair py-2">
          <span className="font-mono text-sm leading-6">{row.order}</span>
          <div>
            <SummaryTitle row={row} href={linkOf?.(row)} />
            <p>
              <VerdictMark verdict={finalVerdict(row)} words={verdictWords(row)} />
            </p>
            <dl className="flex flex-wrap gap-x-4 text-sm text-ink2">
              <Figure name={words.asFound}>
                <AsFoundFigure row={row} />
              </Figure>
              <Figure name={words.asLeft}>{asLeftWords(row)}</Figure>
              <Figure name={words.tolerance}>{summaryTolerance(row)}</Figure>
            </dl>
          </div>
        </li>
      ))}
    </ol>
  );
}

function Figure({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div className="flex gap-1.5">
      <dt>{name}</dt>
      <dd className="font-mono text-ink">{children}</dd>
    </div>
  );
}
