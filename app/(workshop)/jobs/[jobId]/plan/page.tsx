import type { Metadata } from 'next';
import { notFound, redirect } from 'next/navigation';
import { OpenedParts } from '@/components/jobs/opened-parts';
import { PlanMaker } from '@/components/jobs/plan-maker';
import { LinkButton } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { Nameplate } from '@/components/ui/nameplate';
import { PageTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { findJob } from '@/db/queries/jobs';
import { machineHead } from '@/db/read-models/sheet-view';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { machineParts } from '@/lib/planning/machine-parts';
import { anyTouched } from '@/lib/planning/what-follows';
import { id as isId } from '@/lib/schemas/common';
import { purposes } from '@/lib/schemas/job';
import { closedBecause } from '@/lib/services/keep-readings';
import { planMaking } from '@/lib/services/plan-making';
import { proposedTests, startChoices } from './proposed-tests';

export const metadata: Metadata = { title: 'Make the plan' };

export default async function PlanPage({ params }: { params: Promise<{ jobId: string }> }) {
  const viewer = await requireViewer();
  const { jobId } = await params;
  if (!can(viewer.roles, 'job.manage') || !isId.safeParse(jobId).success) notFound();
  const found = await inScope(scopeOf(viewer), async (trx) => {
    const job = await findJob(trx, jobId);
    if (!job) return undefined;
    const machine = await machineHead(trx, job.machineId);
    return { job, machine, making: job.planMadeAt ? null : await planMaking(trx, job, viewer.timeZone) };
  });
  if (!found?.machine) notFound();
  const { job, machine, making } = found;
  // Once made, the plan stands on the board; single tests are left out on their sheets.
  if (!making) redirect(`/jobs/${jobId}`);
  const tests = proposedTests(making, job.refuseUnconfirmed);
  return (
    <>
      <Nameplate
        fields={[
          { label: 'Maker', value: machine.manufacturer },
          { label: 'Model', value: machine.model },
          { label: 'Serial number', value: machine.serialNumber, serial: true },
          { label: 'Job', value: `${job.reference} · ${purposes[job.purpose]}` },
        ]}
      />
      <div className="mt-5">
        <PageTitle note="Every test that fits the machine’s make-up, in working order. Nothing is left out without a reason.">
          The plan
        </PageTitle>
      </div>
      {tests.length === 0 ? (
        <EmptyState
          title="No test fits this machine"
          action={<LinkButton href={`/machines/${machine.id}`}>Look at the machine</LinkButton>}
        >
          Its make-up names no spindle or axis that a test of the catalogue is for.
        </EmptyState>
      ) : (
        <>
          <OpenedParts
            jobId={jobId}
            version={job.version}
            parts={machineParts(job.makeUp)}
            conditions={job.componentConditions}
            mayChange={closedBecause(job.state) === null}
          />
          <PlanMaker
            jobId={jobId}
            tests={tests}
            starts={startChoices(making, viewer.timeZone)}
            opened={anyTouched(job.componentConditions)}
          />
        </>
      )}
    </>
  );
}
