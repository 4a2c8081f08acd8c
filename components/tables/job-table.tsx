import Link from 'next/link';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import { VerdictMark } from '@/components/ui/verdict-mark';
import { dayWords } from '@/lib/dates';
import { type Purpose, purposes } from '@/lib/schemas/job';

export interface JobLine {
  id: string;
  reference: string;
  purpose: string;
  state: 'open' | 'in-check' | 'issued' | 'closed';
  startsOn: string;
  manufacturer: string;
  model: string;
  serialNumber: string;
  customerName: string;
  planned: number;
  leftOut: number;
  measured: number;
  out: number;
}

const stateWords = { open: 'in work', 'in-check': 'in check', issued: 'report issued', closed: 'closed' } as const;

export function JobTable({ jobs }: { jobs: JobLine[] }) {
  return (
    <Table caption="Jobs, the newest first">
      <TableHead>
        <HeadCell>Job</HeadCell>
        <HeadCell>Serial number</HeadCell>
        <HeadCell>Machine</HeadCell>
        <HeadCell>Customer</HeadCell>
        <HeadCell>Begun</HeadCell>
        <HeadCell figure>Measured</HeadCell>
        <HeadCell>State</HeadCell>
      </TableHead>
      <tbody>
        {jobs.map((job) => (
          <Row key={job.id}>
            <RowHead>
              <Link href={`/jobs/${job.id}`} className="inline-flex min-h-9 items-center text-blue underline">
                {job.reference}
              </Link>
              <span className="block text-sm font-normal text-ink2">{purposes[job.purpose as Purpose]}</span>
            </RowHead>
            <DataCell className="whitespace-nowrap font-mono">{job.serialNumber}</DataCell>
            <DataCell>
              {job.manufacturer} {job.model}
            </DataCell>
            <DataCell>{job.customerName}</DataCell>
            <DataCell className="whitespace-nowrap">{dayWords(job.startsOn)}</DataCell>
            <DataCell figure className="whitespace-nowrap">
              {job.planned === 0 ? 'no plan' : `${job.measured} of ${job.planned - job.leftOut}`}
            </DataCell>
            <DataCell className="whitespace-nowrap">
              <span className={job.state === 'in-check' ? 'font-medium text-brass' : ''}>{stateWords[job.state]}</span>
              {job.out > 0 && (
                <span className="block">
                  <VerdictMark verdict="out-of-tolerance" words={`${job.out} out`} />
                </span>
              )}
            </DataCell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
