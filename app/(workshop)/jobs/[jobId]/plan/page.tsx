import type { Metadata } from 'next';
import { notFound, redirect } from 'next/navigation';
import type { ProposedTest } from '@/components/jobs/plan-choices';
import { PlanMaker } from '@/components/jobs/plan-maker';
import { toleranceWords } from '@/components/sheet/tolerance-words';
import { LinkButton } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { Nameplate } from '@/components/ui/nameplate';
import { PageTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { findJob } from '@/db/queries/jobs';
import { machineHead } from '@/db/read-models/sheet-view';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { groupProposals } from '@/lib/planning/group-proposals';
import { confirmationWords, isSettled } from '@/lib/planning/is-settled';
import { provenanceWords } from '@/lib/reporting/record-words';
import { id as isId } from '@/lib/schemas/common';
import { purposes } from '@/lib/schemas/job';
import { proposalsNow } from '@/lib/services/make-plan';
import { codeTitle } from '@/standards/registry';
import type { PlannedSheet } from '@/standards/types';

export const metadata: Metadata = { title: 'Make the plan' };

export default async function PlanPage({ params }: { params: Promise<{ jobId: string }> }) {
  const viewer = await requireViewer();
  const { jobId } = await params;
  if (!can(viewer.roles, 'job.manage') || !isId.safeParse(jobId).success) notFound();
  const found = await inScope(scopeOf(viewer), async (trx) => {
    const job = await findJob(trx, jobId);
    return job && { job, machine: await machineHead(trx, job.machineId), proposals: await proposalsNow(trx, job) };
  });
  if (!found?.machine) notFound();
  const { job, machine, proposals } = found;
  // Once made, the plan stands on the board; single tests are left out on their sheets.
  if (job.planMadeAt) redirect(`/jobs/${jobId}`);
  const tests = proposedTests(proposals, job.refuseUnconfirmed);
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
        <PlanMaker jobId={jobId} tests={tests} />
      )}
    </>
  );
}

const proposedTests = (proposals: PlannedSheet[], refuseUnconfirmed: boolean): ProposedTest[] =>
  groupProposals(proposals).flatMap(({ title, sheets }) =>
    sheets.map((sheet) => proposedTest(title, sheet, refuseUnconfirmed)),
  );

function proposedTest(group: string, sheet: PlannedSheet, refuseUnconfirmed: boolean): ProposedTest {
  const { turret, axis, spindle, reference, tailstock } = sheet.component;
  const { tolerance } = sheet;
  return {
    key: sheet.key,
    group,
    title: sheet.title,
    components: [turret, axis, spindle, reference, tailstock].filter((one) => one !== undefined),
    code: `${codeTitle(sheet.definition.code, sheet.definition.edition)} · ${sheet.definition.id}`,
    tolerance: toleranceWords(tolerance, sheet.direction),
    foundBy: tolerance?.foundBy ?? null,
    provenance: tolerance && (confirmationWords(tolerance) ?? provenanceWords[tolerance.provenance.kind]),
    unconfirmed: tolerance?.provenance.kind === 'from-memory' && !tolerance.confirmation,
    refused: refuseUnconfirmed && !isSettled(tolerance),
  };
}
