import { DataCell, HeadCell, Row, Table, TableHead } from '@/components/ui/table';
import { VerdictMark } from '@/components/ui/verdict-mark';
import type { SummaryRow } from '@/lib/reporting/report-model';
import { summaryTolerance } from '@/lib/reporting/result-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { AsFoundFigure, asLeftWords, wasNotFine } from './as-found-figure';
import { ByWidth } from './by-width';
import { SummaryList } from './summary-list';
import { SummaryTitle } from './summary-title';
import { finalVerdict, verdictWords } from './summary-words';

interface SummaryProps {
  rows: SummaryRow[];
  caption?: string;
  /** Leads from a test to its place. */
  linkOf?: (row: SummaryRow) => string;
}

/** Every planned test with as found, as left, tolerance, verdict as a mark and a word. */
export function SummaryTable({ rows, caption, linkOf }: SummaryProps) {
  const words = REPORT_WORDS.summary;
  const notes = [
    rows.some((row) => row.linked) ? words.linkedNote : '',
    rows.some((row) => wasNotFine(row) && row.unit !== 'items') ? words.asFoundOut : '',
    rows.some((row) => wasNotFine(row) && row.unit === 'items') ? words.asFoundOutOfOrder : '',
  ].filter((note) => note !== '');
  return (
    <>
      <ByWidth
        wide={<WideTable rows={rows} caption={caption} linkOf={linkOf} />}
        narrow={<SummaryList rows={rows} linkOf={linkOf} />}
      />
      {notes.length > 0 && <p className="mt-1.5 text-sm text-ink2">{notes.join(' ')}</p>}
    </>
  );
}

function WideTable({ rows, caption, linkOf }: SummaryProps) {
  const words = REPORT_WORDS.summary;
  return (
    <Table caption={caption ?? words.heading}>
      <TableHead>
        <HeadCell>{words.number}</HeadCell>
        <HeadCell>{words.test}</HeadCell>
        <HeadCell figure className="whitespace-nowrap">
          {words.asFound}
        </HeadCell>
        <HeadCell figure className="whitespace-nowrap">
          {words.asLeft}
        </HeadCell>
        <HeadCell figure>{words.tolerance}</HeadCell>
        <HeadCell>{words.verdict}</HeadCell>
      </TableHead>
      <tbody>
        {rows.map((row) => (
          <Row key={row.order}>
            <DataCell className="font-mono text-sm">{row.order}</DataCell>
            <th scope="row" className="px-2.5 py-2.5 align-baseline font-normal">
              <SummaryTitle row={row} href={linkOf?.(row)} />
            </th>
            <DataCell figure className="whitespace-nowrap">
              <AsFoundFigure row={row} />
            </DataCell>
            <DataCell figure className="whitespace-nowrap">
              {asLeftWords(row)}
            </DataCell>
            <DataCell figure className="whitespace-nowrap">
              {summaryTolerance(row)}
            </DataCell>
            <DataCell className={row.leftOut ? 'min-w-40 align-top' : 'whitespace-nowrap align-top'}>
              <VerdictMark verdict={finalVerdict(row)} words={verdictWords(row)} className="leading-6" />
            </DataCell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
