import type { Metadata } from 'next';
import { CountsTable } from '@/components/report/counts-table';
import { FindingsList } from '@/components/report/findings-list';
import { HandIn } from '@/components/report/hand-in';
import { IssueForm } from '@/components/report/issue-form';
import { SummaryTable } from '@/components/report/summary-table';
import { LinkButton } from '@/components/ui/button';
import { Nameplate } from '@/components/ui/nameplate';
import { Notice } from '@/components/ui/notice';
import { SectionTitle } from '@/components/ui/page-title';
import { can } from '@/lib/auth/permissions';
import type { Viewer } from '@/lib/auth/viewer';
import { checkFindings } from '@/lib/reporting/check-findings';
import { buildReport } from '@/lib/services/build-report';
import { loadJobReport } from '../report/load-job-report';
import { findingLines } from './finding-lines';

type Params = { params: Promise<{ jobId: string }> };

export async function generateMetadata({ params }: Params): Promise<Metadata> {
  const { source } = await loadJobReport((await params).jobId);
  return { title: `Check · ${source.board.job.reference}` };
}

/** What the lead engineer sees before anything goes out. */
export default async function CheckPage({ params }: Params) {
  const { viewer, source, revisions } = await loadJobReport((await params).jobId);
  const { board, organisation } = source;
  const { job, machine } = board;
  const findings = findingLines(checkFindings(board, organisation.timeZone), board);
  const model = buildReport(source, null);
  const sheetAt = new Map(board.sheets.map((sheet) => [sheet.position, sheet.id]));
  const count = (weight: (typeof findings)[number]['weight']) =>
    findings.filter((finding) => finding.weight === weight).length;
  return (
    <>
      <Nameplate
        fields={[
          { label: 'Maker', value: machine.manufacturer },
          { label: 'Model', value: machine.model },
          { label: 'Serial number', value: machine.serialNumber, serial: true },
          { label: 'Job', value: `${job.reference} · ${model.job.purpose}` },
        ]}
      />
      <div className="mt-5 grid gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,1fr)_22rem]">
        <div className="min-w-0">
          <div className="mb-5 flex flex-wrap items-baseline gap-x-4">
            <h1 className="text-2xl font-semibold">Check</h1>
            <p>{model.headline}</p>
          </div>
          <FindingsList findings={findings} boardHref={`/jobs/${job.id}`} />
        </div>
        <aside className="grid content-start gap-5 lg:row-span-2">
          <NextStep
            viewer={viewer}
            job={job}
            newestReport={revisions[0]?.id ?? null}
            blocking={count('blocks')}
            toConfirm={count('confirm')}
          />
          <div className="grid gap-2">
            <LinkButton href={`/jobs/${job.id}/report`}>Read the report as it would stand</LinkButton>
            <LinkButton href={`/jobs/${job.id}`} variant="quiet">
              Back to the job’s board
            </LinkButton>
          </div>
        </aside>
        <div className="min-w-0">
          <SectionTitle>Counts</SectionTitle>
          <CountsTable counts={model.counts} />
          <SectionTitle note="In working order">Every test</SectionTitle>
          <SummaryTable
            rows={model.summary}
            caption="Every test"
            linkOf={(row) => `/jobs/${job.id}/sheets/${sheetAt.get(row.order)}`}
          />
        </div>
      </div>
    </>
  );
}

/** What the person in front of the page can do next: hand in, issue, or nothing but look. */
function NextStep(props: {
  viewer: Viewer;
  job: { id: string; state: string; planMadeAt: Date | null };
  newestReport: string | null;
  blocking: number;
  toConfirm: number;
}) {
  const { viewer, job, newestReport, blocking, toConfirm } = props;
  if (job.state === 'issued' || job.state === 'closed') {
    return (
      <Notice title="The report of this job is out">
        {newestReport && (
          <LinkButton href={`/reports/${newestReport}`} variant="strong" className="mt-2 w-full">
            Open the report
          </LinkButton>
        )}
      </Notice>
    );
  }
  const issues = can(viewer.roles, 'report.issue');
  const handsIn = job.state === 'open' && job.planMadeAt !== null && can(viewer.roles, 'job.manage');
  return (
    <>
      {issues && (
        <div className="border-[1.5px] border-brass bg-brass-wash p-4">
          <p className="font-semibold">{job.state === 'in-check' ? 'Waiting for you' : 'Not handed in yet'}</p>
          <p className="mb-3">
            {job.state === 'in-check'
              ? 'The job has been handed in for the check.'
              : `The inspector has not handed this job in.${blocking === 0 ? ' It can be issued all the same.' : ''}`}
          </p>
          <IssueForm jobId={job.id} blocking={blocking} toConfirm={toConfirm} />
        </div>
      )}
      {!issues && job.state === 'in-check' && (
        <Notice title="Handed in for the check">
          <p>The lead engineer issues the report. Readings can still be put right until then.</p>
        </Notice>
      )}
      {handsIn && (
        <div className={issues ? '' : 'border-[1.5px] border-line p-4'}>
          {!issues && (
            <p className="mb-3">
              {blocking === 0
                ? 'Nothing is missing. The lead engineer checks the job and issues its report.'
                : `${blocking === 1 ? 'One point blocks' : `${blocking} points block`} the report. The job can be handed in all the same; readings stay open until the report is out.`}
            </p>
          )}
          <HandIn jobId={job.id} strong={!issues && blocking === 0} />
        </div>
      )}
    </>
  );
}
