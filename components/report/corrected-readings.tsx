import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import type { TestBlock } from '@/lib/reporting/report-model';
import { longDate } from '@/lib/reporting/report-text';
import { REPORT_WORDS } from '@/lib/reporting/words';

/** Readings that stood differently before: what was typed first, what stands now, who changed it and when. */
export function CorrectedReadings({ block }: { block: TestBlock }) {
  const changed = block.passes.flatMap((pass) =>
    pass.corrections.map((correction) => ({ ...correction, pass: pass.kindWords })),
  );
  if (changed.length === 0) return null;
  const words = REPORT_WORDS.block;
  return (
    <div className="mt-3">
      <Table caption={`${words.corrected}, ${block.title}`} className="text-sm">
        <TableHead>
          <HeadCell>{words.corrected}</HeadCell>
          <HeadCell figure>{words.was}</HeadCell>
          <HeadCell figure>{words.now}</HeadCell>
          <HeadCell>{words.by}</HeadCell>
          <HeadCell>{words.at}</HeadCell>
          <HeadCell>{words.reason}</HeadCell>
        </TableHead>
        <tbody>
          {changed.map((correction, index) => (
            <Row key={index}>
              <RowHead className="py-1 font-normal">
                {correction.pass}, {correction.field}
              </RowHead>
              <DataCell figure className="py-1">
                {correction.was}
              </DataCell>
              <DataCell figure className="py-1">
                {correction.now}
              </DataCell>
              <DataCell className="py-1">{correction.by}</DataCell>
              <DataCell className="py-1">{longDate(correction.at)}</DataCell>
              <DataCell className="py-1">{correction.reason ?? REPORT_WORDS.none}</DataCell>
            </Row>
          ))}
        </tbody>
      </Table>
    </div>
  );
}
