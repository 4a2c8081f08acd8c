import Link from 'next/link';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import { dayIn } from '@/lib/dates';

interface Written {
  version: number;
  withdrawn: boolean;
  accountName: string;
  recordedAt: Date;
}

/** Everything that was written of an own test, newest first; each version can still be read. */
export function OwnVersions(props: { id: string; history: Written[]; shown: number; timeZone: string }) {
  const { id, history, shown, timeZone } = props;
  return (
    <Table caption="Versions">
      <TableHead>
        <HeadCell>Version</HeadCell>
        <HeadCell>What was done</HeadCell>
        <HeadCell>By</HeadCell>
        <HeadCell>Day</HeadCell>
      </TableHead>
      <tbody>
        {history.map(({ version, withdrawn, accountName, recordedAt }) => (
          <Row key={`${version} ${withdrawn}`}>
            <RowHead className="font-normal">
              {withdrawn || version === shown ? (
                version
              ) : (
                <Link
                  href={`/catalogue/own/${id}?version=${version}`}
                  className="inline-flex min-h-9 min-w-9 items-center text-blue underline"
                >
                  {version}
                </Link>
              )}
            </RowHead>
            <DataCell>{withdrawn ? 'withdrawn' : 'composed'}</DataCell>
            <DataCell>{accountName}</DataCell>
            <DataCell>{dayIn(recordedAt, timeZone)}</DataCell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
