import Link from 'next/link';
import { DrawingSvg } from '@/components/plots/drawing-svg';
import { verdictMark } from '@/components/plots/verdict-mark-geometry';
import { DataCell, HeadCell, Row, Table, TableHead } from '@/components/ui/table';
import { VerdictMark } from '@/components/ui/verdict-mark';
import type { SummaryRow } from '@/lib/reporting/report-model';
import { titleWithComponent } from '@/lib/reporting/title-with-component';
import { REPORT_WORDS, VERDICT_WORDS } from '@/lib/reporting/words';
import { finalVerdict, verdictWords } from './summary-words';

const fine = ['within-tolerance', 'for-information'];

/** One row a planned test: as found, as left, tolerance, verdict as a mark and a word. `linkOf` leads from a test to its place. */
export function SummaryTable(props: { rows: SummaryRow[]; caption?: string; linkOf?: (row: SummaryRow) => string }) {
  const { rows, caption, linkOf } = props;
  const words = REPORT_WORDS.summary;
  const notes = [
    rows.some((row) => row.linked) ? words.linkedNote : '',
    rows.some((row) => row.asFoundVerdict && !fine.includes(row.asFoundVerdict)) ? words.asFoundOut : '',
  ].filter((note) => note !== '');
  return (
    <>
      <Table caption={caption ?? words.heading}>
        <TableHead>
          <HeadCell>{words.number}</HeadCell>
          <HeadCell>{words.test}</HeadCell>
          <HeadCell figure>{words.asFound}</HeadCell>
          <HeadCell figure>{words.asLeft}</HeadCell>
          <HeadCell figure>{words.tolerance}</HeadCell>
          <HeadCell>{words.verdict}</HeadCell>
        </TableHead>
        <tbody>
          {rows.map((row) => (
            <Row key={row.order}>
              <DataCell className="font-mono text-sm">{row.order}</DataCell>
              <th scope="row" className="px-2.5 py-2.5 align-baseline font-normal">
                {linkOf ? (
                  <Link href={linkOf(row)} className="text-blue underline">
                    {titleWithComponent(row.title, row.component)}
                  </Link>
                ) : (
                  titleWithComponent(row.title, row.component)
                )}
              </th>
              <DataCell figure className="whitespace-nowrap">
                <AsFound row={row} />
              </DataCell>
              <DataCell figure className="whitespace-nowrap">
                {row.asLeft === null
                  ? REPORT_WORDS.none
                  : row.linked
                    ? `${words.linkedSign} ${row.asLeft}`
                    : row.asLeft}
              </DataCell>
              <DataCell figure>{row.toleranceMm ?? REPORT_WORDS.none}</DataCell>
              <DataCell className={row.leftOut ? 'min-w-40 align-top' : 'whitespace-nowrap align-top'}>
                <VerdictMark verdict={finalVerdict(row)} words={verdictWords(row)} className="leading-6" />
              </DataCell>
            </Row>
          ))}
        </tbody>
      </Table>
      {notes.length > 0 && <p className="mt-1.5 text-sm text-ink2">{notes.join(' ')}</p>}
    </>
  );
}

/** A figure as found, with the mark before it where it was not within tolerance. */
function AsFound({ row }: { row: SummaryRow }) {
  const verdict = row.asFoundVerdict;
  if (row.asFound === null || !verdict || fine.includes(verdict)) return row.asFound ?? REPORT_WORDS.none;
  return (
    <span className="inline-flex items-center gap-1.5">
      <DrawingSvg drawing={verdictMark(verdict)} fixed decorative className="h-3 w-auto shrink-0" />
      <span className="sr-only">{VERDICT_WORDS[verdict]}: </span>
      {row.asFound}
    </span>
  );
}
