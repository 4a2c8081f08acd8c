import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { JobForm, type JobFormData } from '@/components/jobs/job-form';
import { LinkButton } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { Nameplate } from '@/components/ui/nameplate';
import { PageTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { type Organisation, ownOrganisation } from '@/db/queries/organisations';
import { currentOwnDefinitions } from '@/db/queries/own-definitions';
import { machineList } from '@/db/read-models/machine-list';
import { type NewJobView, newJobView } from '@/db/read-models/new-job';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import type { Viewer } from '@/lib/auth/viewer';
import { todayIn } from '@/lib/dates';
import { newestEditions } from '@/lib/planning/newest-editions';
import { offeredCodes } from '@/lib/planning/offered-codes';
import { id as isId } from '@/lib/schemas/common';

export const metadata: Metadata = { title: 'Open a job' };

export default async function NewJobPage({ searchParams }: { searchParams: Promise<{ machine?: string }> }) {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'job.manage')) notFound();
  const { machine: asked } = await searchParams;
  const machineId = isId.safeParse(asked).success ? asked! : null;
  const { view, machines, organisation, hasOwnTests } = await inScope(scopeOf(viewer), async (trx) => {
    const found = await newJobView(trx, machineId);
    return {
      organisation: await ownOrganisation(trx),
      hasOwnTests: (await currentOwnDefinitions(trx)).length > 0,
      view: found,
      machines: found.machine ? [] : (await machineList(trx, { limit: 200 })).items,
    };
  });
  const { machine } = view;
  if (machineId && !machine) notFound();
  if (!machine) return <ChooseMachine machines={machines} />;
  return (
    <>
      <Nameplate
        fields={[
          { label: 'Maker', value: machine.manufacturer },
          { label: 'Model', value: machine.model },
          { label: 'Serial number', value: machine.serialNumber, serial: true },
          { label: 'Owner', value: machine.customerName ?? 'not known' },
        ]}
      />
      <div className="mt-5">
        <PageTitle>Open a job on this machine</PageTitle>
      </div>
      <JobForm data={formData(viewer, view, machine, organisation, offeredCodes(hasOwnTests))} />
    </>
  );
}

/** What the last visit said is proposed again; the dates and the order are new. */
function formData(
  viewer: Viewer,
  view: NewJobView,
  machine: NonNullable<NewJobView['machine']>,
  organisation: Organisation,
  offered: ReturnType<typeof offeredCodes>,
): JobFormData {
  const { lastJob, customers, members, lastReference } = view;
  const from = lastJob ? `From the last job here, ${lastJob.reference}` : undefined;
  const still = new Set(members.map(({ id }) => id));
  const me = members.filter(({ id, roles }) => id === viewer.membershipId && roles.includes('inspector'));
  const people =
    lastJob?.people.filter(
      ({ membershipId, role }) => membershipId && still.has(membershipId) && role !== 'customer',
    ) ?? me.map(({ id, name }) => ({ membershipId: id, name, role: 'inspector' }));
  const customerId = machine.customerId ?? lastJob?.customerId ?? '';
  const place = lastJob?.place ?? machine.site ?? '';
  return {
    customers,
    members,
    lastReference,
    offeredCodes: offered,
    defaults: {
      codes: organisation.codes ?? newestEditions(offered).map(({ code, edition }) => ({ code, edition })),
      refuseUnconfirmed: organisation.refuseUnconfirmed,
      machineId: machine.id,
      customerId,
      reference: '',
      // The purpose is what this visit is about: chosen anew each time.
      purpose: undefined as unknown as 'periodic',
      scope: '',
      customerOrder: '',
      customerEngineer: lastJob?.customerEngineer ?? '',
      decisionRule: lastJob?.decisionRule ?? 'simple',
      startsOn: todayIn(viewer.timeZone),
      endsOn: '',
      place,
      hours: '',
      people: people as JobFormData['defaults']['people'],
    },
    takenOver: {
      customerId: machine.customerId ? 'The owner of the machine' : customerId && from,
      customerEngineer: lastJob?.customerEngineer ? from : undefined,
      place: lastJob?.place ? from : place ? 'Where the machine stands' : undefined,
      decisionRule: from,
      people: lastJob ? `People: ${from?.charAt(0).toLowerCase()}${from?.slice(1)}` : undefined,
    },
  };
}

function ChooseMachine({ machines }: { machines: Awaited<ReturnType<typeof machineList>>['items'] }) {
  return (
    <>
      <PageTitle note="A job is always on one machine.">Open a job: which machine?</PageTitle>
      {machines.length === 0 ? (
        <EmptyState
          title="No machine yet"
          action={
            <LinkButton href="/machines/new" variant="strong">
              Register a machine
            </LinkButton>
          }
        >
          Register the machine once, by its serial number; then open the job on it.
        </EmptyState>
      ) : (
        <>
          <ul className="divide-y divide-hair border-y border-line">
            {machines.map((machine) => (
              <li key={machine.id}>
                <Link
                  href={`/jobs/new?machine=${machine.id}`}
                  className="flex min-h-12 flex-wrap items-baseline gap-x-5 py-2.5 hover:bg-blue-wash"
                >
                  <span className="font-mono text-blue underline">{machine.serialNumber}</span>
                  <span>
                    {machine.manufacturer} {machine.model}
                  </span>
                  <span className="text-ink2">{machine.customerName}</span>
                </Link>
              </li>
            ))}
          </ul>
          <p className="mt-4">
            <LinkButton href="/machines/new">It is not registered yet</LinkButton>
          </p>
        </>
      )}
    </>
  );
}
