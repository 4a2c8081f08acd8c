import type { MarkKind } from '@/components/plots/verdict-ink';
import { DataCell, HeadCell, Row, Table, TableHead } from '@/components/ui/table';
import { VerdictMark } from '@/components/ui/verdict-mark';
import { REPORT_WORDS } from '@/lib/reporting/words';

export interface FurtherLimit {
  label: string;
  /** As they are shown, with their unit. */
  value: string;
  limit: string;
  verdict: MarkKind;
  words: string;
}

/** Further figures of the same readings, each with its own limit: what it is, what it came to, what it may be, the verdict. */
export function FurtherLimits({ limits, name }: { limits: readonly FurtherLimit[]; name: string }) {
  if (limits.length === 0) return null;
  const words = REPORT_WORDS.block;
  return (
    <div className="mt-2 max-w-2xl">
      <Table caption={name} className="text-[15px]">
        <TableHead>
          <HeadCell className="py-0.5">{words.further}</HeadCell>
          <HeadCell figure className="py-0.5">
            {words.result}
          </HeadCell>
          <HeadCell figure className="py-0.5">
            {words.limitOf}
          </HeadCell>
          <HeadCell className="py-0.5">{words.verdict}</HeadCell>
        </TableHead>
        <tbody>
          {limits.map(({ label, value, limit, verdict, words: said }) => (
            <Row key={label}>
              <th scope="row" className="py-0.5 pr-2.5 text-left font-normal">
                {label}
              </th>
              <DataCell figure className="whitespace-nowrap py-0.5">
                {value}
              </DataCell>
              <DataCell figure className="whitespace-nowrap py-0.5">
                {limit}
              </DataCell>
              <DataCell className="whitespace-nowrap py-0.5">
                <VerdictMark verdict={verdict} words={said} />
              </DataCell>
            </Row>
          ))}
        </tbody>
      </Table>
    </div>
  );
}
