import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import type { ReportModel } from '@/lib/reporting/report-model';
import { longDate } from '@/lib/reporting/report-text';
import { REPORT_WORDS } from '@/lib/reporting/words';

/** Remarks and points, numbered as the summary names them, with who and until when. */
export function RemarksTable({ remarks }: { remarks: ReportModel['remarks'] }) {
  const words = REPORT_WORDS.remarks;
  return (
    <Table caption={words.heading}>
      <TableHead>
        <HeadCell>{words.number}</HeadCell>
        <HeadCell>{words.test}</HeadCell>
        <HeadCell>{words.text}</HeadCell>
        <HeadCell>{words.owner}</HeadCell>
        <HeadCell>{words.due}</HeadCell>
        <HeadCell>{words.closed}</HeadCell>
      </TableHead>
      <tbody>
        {remarks.map((remark) => (
          <Row key={remark.no}>
            <RowHead className="font-mono">{remark.no}</RowHead>
            <DataCell className="font-mono">{remark.sheetOrder ?? REPORT_WORDS.none}</DataCell>
            <DataCell className="min-w-48">{remark.text}</DataCell>
            <DataCell>{remark.owner ?? REPORT_WORDS.none}</DataCell>
            <DataCell>{remark.due ? longDate(remark.due) : REPORT_WORDS.none}</DataCell>
            <DataCell>{remark.closed ? longDate(remark.closed) : words.open}</DataCell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
