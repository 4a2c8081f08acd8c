import Link from 'next/link';
import { ReportStateWord } from '@/components/machines/report-state';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import { dayIn } from '@/lib/dates';

interface Recent {
  id: string;
  machineId: string;
  number: string;
  revision: number;
  state: string;
  issuedAt: Date | null;
  hasPdf: boolean;
  manufacturer: string;
  model: string;
  serialNumber: string;
}

/** What was issued last, for those who do not look for anything yet. */
export function RecentReports({ reports, timeZone }: { reports: Recent[]; timeZone: string }) {
  return (
    <Table caption="Reports issued last">
      <TableHead>
        <HeadCell>Report</HeadCell>
        <HeadCell>Serial number</HeadCell>
        <HeadCell>Machine</HeadCell>
        <HeadCell>Issued</HeadCell>
        <HeadCell>State</HeadCell>
        <HeadCell>PDF</HeadCell>
      </TableHead>
      <tbody>
        {reports.map((report) => (
          <Row key={report.id}>
            <RowHead className="whitespace-nowrap">
              <Link
                href={`/reports/${report.id}`}
                className="inline-flex min-h-9 items-center font-mono text-[15px] text-blue underline"
              >
                {report.number}
                {report.revision > 1 && ` rev ${report.revision}`}
              </Link>
            </RowHead>
            <DataCell className="whitespace-nowrap font-mono text-[15px]">
              <Link
                href={`/machines/${report.machineId}`}
                className="inline-flex min-h-9 items-center text-blue underline"
              >
                {report.serialNumber}
              </Link>
            </DataCell>
            <DataCell>
              {report.manufacturer} {report.model}
            </DataCell>
            <DataCell className="whitespace-nowrap">{report.issuedAt && dayIn(report.issuedAt, timeZone)}</DataCell>
            <DataCell>
              <ReportStateWord state={report.state} />
            </DataCell>
            <DataCell>
              {report.hasPdf && (
                <a
                  href={`/api/reports/${report.id}/pdf`}
                  className="inline-flex min-h-9 items-center text-blue underline"
                >
                  PDF<span className="sr-only"> of {report.number}</span>
                </a>
              )}
            </DataCell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
