import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import type { GuideField } from '@/lib/explaining/methods/method-guide';
import { resultRows } from '@/lib/explaining/methods/result-rows';

/** Every figure of a result, unrounded. */
export function ResultTable({ result, fields }: { result: object; fields: readonly GuideField[] }) {
  return (
    <Table caption="Every figure of the result, not rounded">
      <TableHead>
        <HeadCell>Figure</HeadCell>
        <HeadCell>Value</HeadCell>
        <HeadCell>Unit</HeadCell>
      </TableHead>
      <tbody>
        {resultRows(result, fields).map(({ name, words, figure, unit }) => (
          <Row key={name}>
            <RowHead className="min-w-36 font-normal">
              <span className="font-mono">{name}</span>
              <span className="block text-sm text-ink2">{words}</span>
            </RowHead>
            <DataCell className="break-words font-mono [overflow-wrap:anywhere]">{figure}</DataCell>
            <DataCell className="text-sm text-ink2">{unit}</DataCell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
