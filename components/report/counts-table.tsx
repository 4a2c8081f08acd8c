import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import type { Counts } from '@/lib/reporting/report-model';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { ByWidth } from './by-width';

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
const words = REPORT_WORDS.counts;
const { asFound, asLeft } = REPORT_WORDS.summary;

interface BothCounts {
  asFound: Counts;
  asLeft: Counts;
}

/** How many tests came out how, as found and as left; stands upright on a telephone. */
export function CountsTable({ counts }: { counts: BothCounts }) {
  return <ByWidth wide={<Lying counts={counts} />} narrow={<Standing counts={counts} />} />;
}

function Lying({ counts }: { counts: BothCounts }) {
  const rows = [
    { name: asFound, count: counts.asFound },
    { name: asLeft, count: counts.asLeft },
  ];
  return (
    <Table caption={words.heading} className="[&_td]:px-1.5 [&_th]:px-1.5 [&_th:first-child]:pl-0">
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

function Standing({ counts }: { counts: BothCounts }) {
  return (
    <Table caption={words.heading}>
      <TableHead>
        <td />
        <HeadCell figure>{asFound}</HeadCell>
        <HeadCell figure>{asLeft}</HeadCell>
      </TableHead>
      <tbody>
        {counted.map((key) => (
          <Row key={key}>
            <RowHead className="py-1.5 font-normal">{words[key]}</RowHead>
            <DataCell figure className="py-1.5">
              {counts.asFound[key]}
            </DataCell>
            <DataCell figure className="py-1.5">
              {counts.asLeft[key]}
            </DataCell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
