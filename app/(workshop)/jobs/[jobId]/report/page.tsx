import type { Metadata } from 'next';
import { ReopenJob } from '@/components/report/reopen-job';
import { ReportPage } from '@/components/report/report-page';
import { RevisionList } from '@/components/report/revision-list';
import { LinkButton } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { PageTitle, SectionTitle } from '@/components/ui/page-title';
import { can } from '@/lib/auth/permissions';
import { buildReport } from '@/lib/services/build-report';
import { loadJobReport } from './load-job-report';

type Params = { params: Promise<{ jobId: string }> };

export async function generateMetadata({ params }: Params): Promise<Metadata> {
  const { source } = await loadJobReport((await params).jobId);
  return { title: `Report · ${source.board.job.reference}` };
}

/** The job's reports, and the next one as it would stand now. */
export default async function JobReportPage({ params }: Params) {
  const { viewer, source, revisions } = await loadJobReport((await params).jobId);
  const { job } = source.board;
  const newest = revisions[0];
  const open = job.state === 'open' || job.state === 'in-check';
  return (
    <>
      <div data-print="no">
        <PageTitle note={job.reference} action={<LinkButton href={`/jobs/${job.id}`}>Back to the job</LinkButton>}>
          {open ? 'The report as it would stand now' : 'Report'}
        </PageTitle>
        {open && (
          <Notice tone="brass" title="A draft: nothing of this is issued" className="max-w-[64rem]">
            <p>
              It follows the sheets until the report is issued. What is missing stands on{' '}
              <a href={`/jobs/${job.id}/check`} className="text-blue underline">
                the check
              </a>
              .
            </p>
          </Notice>
        )}
        {newest && (
          <section aria-labelledby="revisions" className="mb-6 max-w-xl">
            <SectionTitle id="revisions" note="Newest first">
              Issued for this job
            </SectionTitle>
            <RevisionList revisions={revisions} timeZone={viewer.timeZone} />
          </section>
        )}
        {!open && newest && (
          <div className="flex flex-wrap gap-3">
            <LinkButton href={`/reports/${newest.id}`} variant="strong">
              Open the newest report
            </LinkButton>
            {can(viewer.roles, 'report.issue') && <ReopenJob jobId={job.id} nextRevision={newest.revision + 1} />}
          </div>
        )}
      </div>
      {open && (
        <div className="mt-6 print:mt-0">
          <ReportPage model={buildReport(source, null)} photosAt="/api/files" />
        </div>
      )}
    </>
  );
}
