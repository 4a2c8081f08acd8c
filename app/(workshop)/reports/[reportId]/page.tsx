import type { Metadata } from 'next';
import Link from 'next/link';
import { AnswerRecord } from '@/components/report/answer-record';
import { PdfState } from '@/components/report/pdf-state';
import { ReopenJob } from '@/components/report/reopen-job';
import { ReportInShort } from '@/components/report/report-in-short';
import { ReportPage } from '@/components/report/report-page';
import { RevisionList } from '@/components/report/revision-list';
import { SeenBefore, SeenMark } from '@/components/report/seen';
import { SigningForm } from '@/components/report/signing-form';
import { LinkButton } from '@/components/ui/button';
import { Nameplate } from '@/components/ui/nameplate';
import { PageTitle, SectionTitle } from '@/components/ui/page-title';
import { can } from '@/lib/auth/permissions';
import { type LoadedReport, loadReport } from './load-report';
import { ReportStanding } from './report-standing';

type Params = { params: Promise<{ reportId: string }> };

export async function generateMetadata({ params }: Params): Promise<Metadata> {
  const { report } = await loadReport((await params).reportId);
  return { title: `${report.number} revision ${report.revision}` };
}

/** An issued report: in short, the whole document, the answer. */
export default async function IssuedReportPage({ params }: Params) {
  const loaded = await loadReport((await params).reportId);
  const { viewer, report, model, answer } = loaded;
  const signs = report.state === 'issued' && viewer.customerId !== null && can(viewer.roles, 'report.sign');
  return (
    <SeenBefore>
      <div data-print="no">
        <PageTitle
          note={
            <span className="font-mono">
              {report.number} · revision {report.revision}
            </span>
          }
        >
          Acceptance report
        </PageTitle>
        <Plate loaded={loaded} />
        <div className="mt-4">
          <ReportStanding loaded={loaded} />
        </div>
        <div className="mt-2 grid gap-x-10 lg:grid-cols-[minmax(0,1fr)_19rem]">
          <section aria-labelledby="in-short" className="min-w-0">
            <SectionTitle id="in-short">In short</SectionTitle>
            <ReportInShort model={model} />
            <SeenMark />
          </section>
          <Aside loaded={loaded} />
        </div>
        <div className="max-w-[64rem]">
          <SectionTitle id="document" note="The same content as the PDF">
            The document
          </SectionTitle>
        </div>
      </div>
      <ReportPage model={model} photosAt={`/api/reports/${report.id}/photos`} />
      <div id="document-end">
        <SeenMark />
      </div>
      <section aria-labelledby="answer" data-print="no" className="max-w-[64rem]">
        {signs && (
          <>
            <SectionTitle id="answer">Your answer</SectionTitle>
            <SigningForm
              reportId={report.id}
              sheets={loaded.sheets}
              prefill={{
                name: viewer.name,
                functionTitle: viewer.functionTitle ?? '',
                company: model.customer.name,
                place: '',
              }}
              firstWay="typed"
              doneHref={`/reports/${report.id}/answered`}
            />
          </>
        )}
        {!signs && answer && (
          <>
            <SectionTitle id="answer">The answer, as it was recorded</SectionTitle>
            <AnswerRecord
              answer={answer}
              remarks={[]}
              document={{ number: report.number, revision: report.revision }}
              timeZone={viewer.timeZone}
            />
          </>
        )}
        {!signs && !answer && (
          <>
            <SectionTitle id="answer">The answer</SectionTitle>
            <p>There is no answer{report.state === 'issued' ? ' yet' : ''}.</p>
          </>
        )}
      </section>
    </SeenBefore>
  );
}

function Plate({ loaded: { model, machineId, viewer, job } }: { loaded: LoadedReport }) {
  const { manufacturer, model: type, serialNumber } = model.machine;
  return (
    <Nameplate
      fields={[
        { label: 'Maker', value: manufacturer },
        { label: 'Model', value: type },
        {
          label: 'Serial number',
          serial: true,
          value: machineId ? (
            <Link href={`/machines/${machineId}`} className="underline">
              {serialNumber}
            </Link>
          ) : (
            serialNumber
          ),
        },
        { label: 'Customer', value: model.customer.name },
        {
          label: 'Job',
          value: can(viewer.roles, 'job.read') ? (
            <Link href={`/jobs/${job.id}`} className="underline">
              {job.reference}
            </Link>
          ) : (
            job.reference
          ),
        },
      ]}
    />
  );
}

/** PDF, revisions, and what staff can do about the report. */
function Aside({ loaded }: { loaded: LoadedReport }) {
  const { viewer, report, job, revisions, answer, replacedBy } = loaded;
  const { pdfState, pdfFileId, signedPdfFileId, pdfErrorId } = report;
  const may = (action: Parameters<typeof can>[1]) => can(viewer.roles, action);
  const refused = report.state === 'refused';
  const out = job.state === 'issued' || job.state === 'closed';
  return (
    <aside className="mt-8 grid content-start gap-5">
      {report.state === 'issued' && may('report.witness') && (
        <LinkButton href={`/reports/${report.id}/sign-here`} variant="strong">
          Have it signed on this tablet
        </LinkButton>
      )}
      {out && !replacedBy && may('report.issue') && (
        <ReopenJob
          jobId={job.id}
          nextRevision={report.revision + 1}
          strong={refused}
          reason={refused ? `Refused: ${answer?.reason ?? ''}` : ''}
        />
      )}
      <PdfState
        reportId={report.id}
        answered={answer !== null}
        first={{ pdfState, pdfFileId, signedPdfFileId, pdfErrorId }}
      />
      <div>
        <h2 className="font-semibold">Revisions</h2>
        <RevisionList revisions={revisions} timeZone={viewer.timeZone} here={report.id} />
      </div>
    </aside>
  );
}
