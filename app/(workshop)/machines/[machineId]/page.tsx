import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { DriftPlots } from '@/components/machines/drift-plots';
import { MachineTimeLine } from '@/components/machines/machine-time-line';
import { MakeUpWords } from '@/components/machines/make-up-words';
import { NameplatePhoto } from '@/components/machines/nameplate-photo';
import { OwnerList } from '@/components/machines/owner-list';
import { TransferButton } from '@/components/machines/transfer-form';
import { LinkButton } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { Nameplate } from '@/components/ui/nameplate';
import { SectionTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { listCustomers } from '@/db/queries/customers';
import { machineHistory } from '@/db/read-models/machine-history';
import { machineView } from '@/db/read-models/machine-view';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { todayIn } from '@/lib/dates';
import { id } from '@/lib/schemas/common';

export const metadata: Metadata = { title: 'Machine' };

export default async function MachinePage({ params }: { params: Promise<{ machineId: string }> }) {
  const viewer = await requireViewer();
  const { machineId } = await params;
  if (!id.safeParse(machineId).success) notFound();
  const may = (action: Parameters<typeof can>[1]) => can(viewer.roles, action);
  const { machine, history, customers } = await inScope(scopeOf(viewer), async (trx) => ({
    machine: await machineView(trx, machineId),
    history: await machineHistory(trx, machineId),
    customers: may('machine.transfer') ? await listCustomers(trx) : [],
  }));
  if (!machine) notFound();
  const drifting = history.drift.filter(({ points }) => points.length > 1);
  const openJob = may('job.manage') && (
    <LinkButton href={`/jobs/new?machine=${machine.id}`} variant="strong">
      Open a job
    </LinkButton>
  );
  return (
    <>
      <h1 className="sr-only">
        {machine.manufacturer} {machine.model} {machine.serialNumber}
      </h1>
      <Nameplate
        fields={[
          { label: 'Maker', value: machine.manufacturer },
          { label: 'Model', value: machine.model },
          { label: 'Serial number', value: machine.serialNumber, serial: true },
          ...(machine.year ? [{ label: 'Year', value: machine.year }] : []),
          ...(machine.control ? [{ label: 'Control', value: machine.control }] : []),
          ...(machine.customer ? [{ label: 'Owner', value: machine.customer.name }] : []),
          ...(machine.site ? [{ label: 'Where it stands', value: machine.site }] : []),
        ]}
      />
      <div className="mt-2 grid gap-x-10 lg:grid-cols-[minmax(0,1fr)_22rem]">
        <section aria-labelledby="history">
          <SectionTitle id="history" note="Newest first">
            Jobs and reports
          </SectionTitle>
          {history.jobs.length === 0 ? (
            <EmptyState title="Nothing measured yet" action={openJob}>
              {viewer.customerId
                ? 'Reports of this machine appear here when they are issued.'
                : 'A job makes the plan of tests from the make-up.'}
            </EmptyState>
          ) : (
            <>
              <MachineTimeLine
                jobs={history.jobs}
                reports={history.reports}
                timeZone={viewer.timeZone}
                linkJobs={may('job.read')}
              />
              {openJob && <div className="mt-5">{openJob}</div>}
            </>
          )}
          {drifting.length > 0 && (
            <>
              <SectionTitle note="As left, mm where no other unit stands, from the signed reports">
                How its geometry moved
              </SectionTitle>
              <DriftPlots tests={drifting} />
            </>
          )}
        </section>
        <aside>
          <SectionTitle>Make-up</SectionTitle>
          <MakeUpWords makeUp={machine.makeUp} />
          {may('machine.manage') && (
            <LinkButton href={`/machines/${machine.id}/edit`} small className="mt-3">
              Change nameplate or make-up
            </LinkButton>
          )}
          {(machine.nameplateFileId || may('machine.manage')) && (
            <NameplatePhoto machineId={machine.id} fileId={machine.nameplateFileId} changes={may('machine.manage')} />
          )}
          <SectionTitle>Owners</SectionTitle>
          <OwnerList owners={machine.owners} />
          {may('machine.transfer') && (
            <div className="mt-3">
              <TransferButton machineId={machine.id} today={todayIn(viewer.timeZone)} customers={customers} />
            </div>
          )}
        </aside>
      </div>
    </>
  );
}
