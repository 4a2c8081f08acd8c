import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import type { Counts } from '@/lib/reporting/report-model';
import { REPORT_WORDS } from '@/lib/reporting/words';

const counted = [
  'planned',
  'judged',
  'within',
  'out',
  'undecided',
  'forInformation',
  'leftOut',
  'notMeasured',
] as const;

/** How many tests came out how, as found and as left. */
export function CountsTable({ counts }: { counts: { asFound: Counts; asLeft: Counts } }) {
  const words = REPORT_WORDS.counts;
  const rows = [
    { name: REPORT_WORDS.summary.asFound, count: counts.asFound },
    { name: REPORT_WORDS.summary.asLeft, count: counts.asLeft },
  ];
  return (
    <Table caption={words.heading}>
      <TableHead>
        <td className="w-px" />
        {counted.map((key) => (
          <HeadCell key={key} figure>
            {words[key]}
          </HeadCell>
        ))}
      </TableHead>
      <tbody>
        {rows.map(({ name, count }) => (
          <Row key={name}>
            <RowHead className="whitespace-nowrap">{name}</RowHead>
            {counted.map((key) => (
              <DataCell key={key} figure className={count[key] === 0 ? 'text-ink2' : ''}>
                {count[key]}
              </DataCell>
            ))}
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
