import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { cache } from 'react';
import { ConfirmedOnly } from '@/components/jobs/confirmed-only';
import { JobConditions } from '@/components/jobs/job-conditions';
import { JobPeople, JobReports, NotInPlan } from '@/components/jobs/job-side';
import { KeepTemplate } from '@/components/jobs/keep-template';
import { OpenedParts } from '@/components/jobs/opened-parts';
import { TemperatureLog } from '@/components/jobs/temperature-log';
import { WaitingForYou } from '@/components/jobs/waiting-for-you';
import { minutesLeft, nextSheet, pathSheets } from '@/components/tables/path-sheets';
import { type PathSheet, PlanPath } from '@/components/tables/plan-path';
import { EmptyState } from '@/components/ui/empty-state';
import { Nameplate } from '@/components/ui/nameplate';
import { inScope } from '@/db/client';
import { type JobBoard, jobBoard } from '@/db/read-models/job-board';
import { testDurations } from '@/db/read-models/test-durations';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { dayIn, dayWords, todayIn } from '@/lib/dates';
import { minutesWords, pastDurations } from '@/lib/planning/estimate-minutes';
import { machineParts } from '@/lib/planning/machine-parts';
import { checkFindings } from '@/lib/reporting/check-findings';
import { formatTime } from '@/lib/reporting/format-time';
import { sheetState } from '@/lib/reporting/sheet-state';
import { id as isId } from '@/lib/schemas/common';
import { purposes } from '@/lib/schemas/job';

type Params = { params: Promise<{ jobId: string }> };

const load = cache(async (jobId: string) => {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'job.read') || !isId.safeParse(jobId).success) notFound();
  const { board, durations } = await inScope(scopeOf(viewer), async (trx) => {
    const board = await jobBoard(trx, jobId);
    // How long it will take matters while something waits to be measured.
    return { board, durations: board?.job.state === 'open' ? await testDurations(trx, viewer.timeZone) : [] };
  });
  if (!board) notFound();
  return { viewer, board, past: pastDurations(durations) };
});

export async function generateMetadata({ params }: Params): Promise<Metadata> {
  const { board } = await load((await params).jobId);
  return { title: `${board.job.reference} · ${board.machine.serialNumber}` };
}

export default async function JobPage({ params }: Params) {
  const { viewer, board, past } = await load((await params).jobId);
  const lines = pathSheets(board.sheets, past);
  const { job, machine, customer, sheets } = board;
  const may = {
    measure: can(viewer.roles, 'sheet.measure'),
    manage: can(viewer.roles, 'job.manage'),
    issue: can(viewer.roles, 'report.issue'),
  };
  const open = job.state === 'open' || job.state === 'in-check';
  return (
    <>
      <Nameplate
        fields={[
          { label: 'Maker', value: machine.manufacturer },
          { label: 'Model', value: machine.model },
          {
            label: 'Serial number',
            serial: true,
            value: (
              <Link href={`/machines/${machine.id}`} className="hover:text-blue hover:underline">
                {machine.serialNumber}
              </Link>
            ),
          },
          { label: 'Job', value: `${job.reference} · ${purposes[job.purpose]}` },
          { label: 'Customer', value: customer.name },
        ]}
      />
      <div className="mt-5 grid gap-x-9 gap-y-6 lg:grid-cols-[minmax(0,1fr)_18.75rem] lg:grid-rows-[auto_1fr]">
        <div className="lg:col-start-2 lg:row-start-1">
          <WaitingForYou
            jobId={job.id}
            state={job.state}
            planMade={job.planMadeAt !== null}
            findings={checkFindings(board, viewer.timeZone)}
            next={nextSheet(sheets)}
            linkable={linkableSheets(board)}
            report={board.reports.find(({ state }) => state !== 'superseded') ?? null}
            may={may}
            checkers={board.people.filter(({ role }) => role === 'reviewer').map(({ name }) => name)}
          />
        </div>
        <div className="max-lg:order-3 lg:col-start-2 lg:row-start-2">
          <div className="grid gap-5 sm:max-lg:grid-cols-2">
            <JobReports reports={board.reports} timeZone={viewer.timeZone} />
            <JobConditions
              jobId={job.id}
              version={job.version}
              conditions={job.conditions}
              mayChange={may.manage && open}
            />
            <OpenedParts
              jobId={job.id}
              version={job.version}
              parts={machineParts(job.makeUp)}
              conditions={job.componentConditions}
              mayChange={may.manage && open}
            />
            <TemperatureLog
              jobId={job.id}
              mayAdd={may.measure && open}
              temperatures={board.temperatures.map((row) => ({
                id: row.id,
                time: `${dayIn(row.measuredAt, viewer.timeZone).slice(0, -5)} ${formatTime(row.measuredAt, viewer.timeZone).slice(11)}`,
                air: row.airText,
                machine: row.machineText,
              }))}
            />
            <JobPeople people={board.people} />
            <JobFacts board={board} />
            <ConfirmedOnly
              jobId={job.id}
              version={job.version}
              refuseUnconfirmed={job.refuseUnconfirmed}
              mayChange={may.manage && open && job.planMadeAt === null}
            />
            {may.manage && job.planMadeAt !== null && (
              <KeepTemplate jobId={job.id} model={`${machine.manufacturer} ${machine.model}`} />
            )}
          </div>
        </div>
        <div className="max-lg:order-2 lg:row-span-2 lg:row-start-1">
          <div className="mb-1 flex flex-wrap items-baseline gap-x-4">
            <h1 className="text-2xl font-semibold">The plan, in working order</h1>
            {sheets.length > 0 && <p className="text-sm text-ink2">{progressWords(board, lines, viewer.timeZone)}</p>}
          </div>
          {sheets.length > 0 ? (
            <PlanPath jobId={job.id} sheets={lines} />
          ) : (
            <EmptyState title="No plan yet">
              The plan is made from the machine’s make-up: every test that fits, for every component, with its tolerance
              by the machine’s sizes.
            </EmptyState>
          )}
          <NotInPlan exclusions={board.exclusions} />
        </div>
      </div>
    </>
  );
}

/** Complete as found, nothing newer, and nothing that has to be put right. */
function linkableSheets({ job, sheets }: JobBoard): string[] {
  if (job.state !== 'open' && job.state !== 'in-check') return [];
  return sheets
    .filter((sheet) => {
      const { state, verdict } = sheetState(sheet);
      const good = verdict === 'within-tolerance' || verdict === 'for-information';
      return state === 'found' && good && sheet.passes.every(({ kind }) => kind === 'as-found');
    })
    .map(({ id }) => id);
}

/** `31 of 47 measured · day 3 · about 4 h 30 min to measure`. */
function progressWords({ job, sheets }: JobBoard, lines: PathSheet[], timeZone: string): string {
  const states = sheets.map((sheet) => sheetState(sheet).state);
  const planned = states.filter((state) => state !== 'left-out').length;
  const measured = states.filter((state) => state === 'found' || state === 'left').length;
  const day = Math.floor((Date.parse(todayIn(timeZone)) - Date.parse(job.startsOn)) / 86_400_000) + 1;
  const running = job.state === 'open' && day >= 1 ? ` · day ${day}` : '';
  const minutes = minutesLeft(lines);
  const left = job.state === 'open' && minutes > 0 ? ` · about ${minutesWords(minutes)} to measure` : '';
  return `${measured} of ${planned} measured${running}${left}`;
}

function JobFacts({ board: { job } }: { board: JobBoard }) {
  const facts: [string, string | null][] = [
    ['Days', job.endsOn ? `${dayWords(job.startsOn)} to ${dayWords(job.endsOn)}` : `from ${dayWords(job.startsOn)}`],
    ['Scope', job.scope],
    ['Order', job.customerOrder],
    ['Place', job.place],
    ['Decision rule', job.decisionRule === 'simple' ? 'simple acceptance' : 'guarded acceptance'],
  ];
  return (
    <section aria-labelledby="facts">
      <h2 id="facts" className="font-semibold">
        The job
      </h2>
      <dl className="grid gap-1 text-[15px]">
        {facts.map(([label, value]) =>
          value ? (
            <div key={label}>
              <dt className="inline text-ink2">{label}: </dt>
              <dd className="inline">{value}</dd>
            </div>
          ) : null,
        )}
      </dl>
    </section>
  );
}
