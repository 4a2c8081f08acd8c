import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { CalibrationWord } from '@/components/instruments/calibration-word';
import { LinkButton } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { PageTitle } from '@/components/ui/page-title';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import { inScope } from '@/db/client';
import { instrumentList } from '@/db/read-models/instrument-list';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { todayIn } from '@/lib/dates';

export const metadata: Metadata = { title: 'Instruments' };

export default async function InstrumentsPage({ searchParams }: { searchParams: Promise<{ after?: string }> }) {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'instrument.read')) notFound();
  const { after } = await searchParams;
  const filter = { after, today: todayIn(viewer.timeZone), limit: 100 };
  const { items, next } = await inScope(scopeOf(viewer), (trx) => instrumentList(trx, filter));
  const waiting = items.filter(({ state, retired }) => state !== 'in-date' && !retired).length;
  const add = can(viewer.roles, 'instrument.manage') && (
    <LinkButton href="/instruments/new" variant="strong">
      Add an instrument
    </LinkButton>
  );
  if (items.length === 0) {
    return (
      <>
        <PageTitle>Instruments</PageTitle>
        <EmptyState title="No instrument yet" action={add}>
          Indicators, mandrels, squares: each with its certificate. A sheet can then only be measured with what is in
          date, or with a reason that prints.
        </EmptyState>
      </>
    );
  }
  return (
    <>
      <PageTitle
        note={waiting > 0 ? `${waiting} due soon, overdue or without a certificate` : 'All in date'}
        action={add}
      >
        Instruments
      </PageTitle>
      <Table caption="Instruments">
        <TableHead>
          <HeadCell>Number</HeadCell>
          <HeadCell>Instrument</HeadCell>
          <HeadCell figure>Resolution</HeadCell>
          <HeadCell>Certificate</HeadCell>
          <HeadCell>Calibration</HeadCell>
        </TableHead>
        <tbody>
          {items.map((instrument) => (
            <Row key={instrument.id} className={instrument.retired ? 'text-ink2' : ''}>
              <RowHead className="whitespace-nowrap">
                <Link
                  href={`/instruments/${instrument.id}`}
                  className="inline-flex min-h-9 items-center font-mono text-blue underline"
                >
                  {instrument.number}
                </Link>
              </RowHead>
              <DataCell>
                {instrument.name}
                <span className="block text-sm text-ink2">{instrument.kind}</span>
              </DataCell>
              <DataCell figure className="whitespace-nowrap">
                {instrument.resolution && `${instrument.resolution} ${instrument.resolutionUnit}`}
              </DataCell>
              <DataCell className="font-mono text-[15px]">{instrument.certificate}</DataCell>
              <DataCell>
                {instrument.retired ? (
                  'out of use'
                ) : (
                  <CalibrationWord state={instrument.state} dueOn={instrument.dueOn} />
                )}
              </DataCell>
            </Row>
          ))}
        </tbody>
      </Table>
      {next && (
        <Link
          href={`/instruments?after=${encodeURIComponent(next)}`}
          className="inline-flex min-h-12 items-center text-blue underline"
        >
          More instruments
        </Link>
      )}
    </>
  );
}
