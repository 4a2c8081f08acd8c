import Link from 'next/link';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import type { confirmedCount } from '@/lib/planning/cell-states';
import { toleranceLines, toleranceUnit } from '@/lib/planning/tolerance-words';
import { provenanceWords } from '@/lib/reporting/record-words';
import { DIRECTION_WORDS } from '@/lib/reporting/words';
import type { TestDefinition, ToleranceRule } from '@/standards/types';
import { countWords } from './cell-words';

export interface TestLine {
  test: TestDefinition;
  count: ReturnType<typeof confirmedCount>;
}

/** Tests of one code, each with its tolerance and how far that is confirmed. */
export function CodeTests({ slug, title, lines }: { slug: string; title: string; lines: TestLine[] }) {
  return (
    <div className="mt-2">
      <Table caption={`Tests of ${title}`}>
        <TableHead>
          <HeadCell>No.</HeadCell>
          <HeadCell>Test</HeadCell>
          <HeadCell figure>Tolerance, mm</HeadCell>
          <HeadCell>How it may lie</HeadCell>
          <HeadCell>Where the tolerance comes from</HeadCell>
          <HeadCell>Confirmed</HeadCell>
        </TableHead>
        <tbody>
          {lines.map(({ test, count }) => (
            <Row key={test.id}>
              <DataCell className="whitespace-nowrap font-mono text-[15px]">{test.id}</DataCell>
              <RowHead>
                <Link
                  href={`/catalogue/${slug}/${test.id}`}
                  className="inline-flex min-h-9 items-center text-blue underline"
                >
                  {test.title}
                </Link>
              </RowHead>
              <DataCell figure className="whitespace-nowrap">
                {test.tolerance ? spread(test.tolerance) : 'none'}
              </DataCell>
              <DataCell>{DIRECTION_WORDS[test.direction]}</DataCell>
              <DataCell>{test.tolerance && provenanceWords[test.tolerance.provenance.kind]}</DataCell>
              <DataCell className={count.confirmed < count.total ? 'text-brass' : 'text-ink2'}>
                {countWords(count)}
              </DataCell>
            </Row>
          ))}
        </tbody>
      </Table>
    </div>
  );
}

/** `0.005 to 0.012`: the first and the last line of the table; the unit where it is none of length. */
function spread(rule: ToleranceRule): string {
  const figures = toleranceLines(rule).map(({ tolerance }) => tolerance);
  const [first = '', last = ''] = [figures[0], figures.at(-1)];
  const unit = toleranceUnit(rule);
  return `${first === last ? first : `${first} to ${last}`}${unit === 'mm' ? '' : ` ${unit}`}`;
}
