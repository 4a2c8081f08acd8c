import type { MarkKind } from '@/components/plots/verdict-ink';
import { DataCell, HeadCell, Row, Table, TableHead } from '@/components/ui/table';
import { VerdictMark } from '@/components/ui/verdict-mark';
import type { CheckedItem } from '@/lib/reporting/report-model';
import { verdictText } from '@/lib/reporting/result-text';
import { REPORT_WORDS } from '@/lib/reporting/words';

/** Items of a function check: what was asked, the answer with its mark, the figure, the remark. */
export function CheckItems({ items, name }: { items: readonly CheckedItem[]; name: string }) {
  const words = REPORT_WORDS.block;
  const hasValue = items.some(({ value }) => value !== null);
  const hasRemark = items.some(({ remark }) => remark !== null);
  return (
    <Table caption={name} className="text-sm">
      <TableHead>
        <HeadCell>{words.items}</HeadCell>
        <HeadCell>{words.answer}</HeadCell>
        {hasValue && <HeadCell>{words.value}</HeadCell>}
        {hasRemark && <HeadCell>{words.remark}</HeadCell>}
      </TableHead>
      <tbody>
        {items.map((item) => (
          <Row key={item.question}>
            <th scope="row" className="min-w-40 py-1 pr-2.5 align-baseline font-normal">
              {item.question}
            </th>
            <DataCell className="whitespace-nowrap py-1">
              <VerdictMark verdict={markOf(item)} words={answerWords(item)} />
            </DataCell>
            {hasValue && <DataCell className="py-1 font-mono">{item.value}</DataCell>}
            {hasRemark && <DataCell className="py-1">{item.remark}</DataCell>}
          </Row>
        ))}
      </tbody>
    </Table>
  );
}

const markOf = ({ inOrder }: CheckedItem): MarkKind =>
  inOrder === null ? 'not-measured' : inOrder ? 'within-tolerance' : 'out-of-tolerance';

/** “yes” with a figure outside its limits says both. */
const answerWords = ({ answer, inOrder }: CheckedItem): string => {
  const words = answer ?? REPORT_WORDS.block.notAnswered;
  return answer === 'yes' && inOrder === false ? `${words}, ${verdictText('out-of-tolerance', 'items')}` : words;
};
