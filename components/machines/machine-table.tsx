import Link from 'next/link';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import { machineKinds } from '@/lib/schemas/make-up';
import { ReportStateWord } from './report-state';

interface MachineTableItem {
  id: string;
  manufacturer: string;
  model: string;
  serialNumber: string;
  kind: keyof typeof machineKinds;
  site: string | null;
  customerName: string | null;
  lastReport: { id: string; number: string; state: string } | null;
}

/** The register: serial numbers first, since they are what is read off the machine. */
export function MachineTable({ machines }: { machines: MachineTableItem[] }) {
  return (
    <Table caption="Machines">
      <TableHead>
        <HeadCell>Serial number</HeadCell>
        <HeadCell>Machine</HeadCell>
        <HeadCell>Owner and place</HeadCell>
        <HeadCell>Newest report</HeadCell>
      </TableHead>
      <tbody>
        {machines.map((machine) => (
          <Row key={machine.id}>
            <RowHead className="whitespace-nowrap">
              <Link
                href={`/machines/${machine.id}`}
                className="inline-flex min-h-9 items-center font-mono text-lg text-blue underline"
              >
                {machine.serialNumber}
              </Link>
            </RowHead>
            <DataCell>
              {machine.manufacturer} {machine.model}
              <span className="block text-sm text-ink2">{machineKinds[machine.kind]}</span>
            </DataCell>
            <DataCell>
              {machine.customerName}
              <span className="block text-sm text-ink2">{machine.site}</span>
            </DataCell>
            <DataCell>
              {machine.lastReport ? (
                <>
                  <Link
                    href={`/reports/${machine.lastReport.id}`}
                    className="inline-flex min-h-9 items-center font-mono text-[15px] text-blue underline"
                  >
                    {machine.lastReport.number}
                  </Link>
                  <span className="block text-sm">
                    <ReportStateWord state={machine.lastReport.state} />
                  </span>
                </>
              ) : (
                <span className="text-ink2">none yet</span>
              )}
            </DataCell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
