import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { AnswerNotice, AnswerRecord } from '@/components/report/answer-record';
import { ReportInShort } from '@/components/report/report-in-short';
import { ReportPage } from '@/components/report/report-page';
import { SeenBefore, SeenMark } from '@/components/report/seen';
import { SigningForm } from '@/components/report/signing-form';
import { LinkButton } from '@/components/ui/button';
import { Nameplate } from '@/components/ui/nameplate';
import { Notice } from '@/components/ui/notice';
import { SectionTitle } from '@/components/ui/page-title';
import { can } from '@/lib/auth/permissions';
import { dayIn } from '@/lib/dates';
import { type LoadedReport, loadReport } from '../load-report';

export const metadata: Metadata = { title: 'Sign the acceptance report' };

/**
 * The tablet in the customer's hand, the inspector beside it as the named witness: the report and the answer, nothing of the office.
 */
export default async function SignHerePage({ params }: { params: Promise<{ reportId: string }> }) {
  const { reportId } = await params;
  const loaded = await loadReport(reportId);
  const { viewer, report, model, answer, replacedBy } = loaded;
  if (!can(viewer.roles, 'report.witness')) redirect(`/reports/${reportId}`);
  return (
    <SeenBefore>
      {/* The shell's header, search and menu are the office's: they are not there while the tablet is handed over. */}
      <style>{'header[data-print], footer[data-print], a.sr-only { display: none }'}</style>
      <div className="mx-auto max-w-[64rem]">
        <div className="mb-4 flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
          <p className="text-lg font-semibold">{model.letterhead.name}</p>
          <p className="font-mono text-sm text-ink2">
            {report.number} · revision {report.revision}
          </p>
        </div>
        <Nameplate
          fields={[
            { label: 'Maker', value: model.machine.manufacturer },
            { label: 'Model', value: model.machine.model },
            { label: 'Serial number', value: model.machine.serialNumber, serial: true },
            { label: 'Customer', value: model.customer.name },
          ]}
        />
        {answer ? (
          <Recorded loaded={loaded} answer={answer} />
        ) : report.state === 'issued' ? (
          <Signing loaded={loaded} />
        ) : (
          <div className="mt-6 grid gap-4">
            <h1 className="text-2xl font-semibold">This revision cannot be signed any more</h1>
            {replacedBy && (
              <Notice tone="brass" title={`Replaced by revision ${replacedBy.revision}`}>
                <p>It was issued on {dayIn(replacedBy.issuedAt, viewer.timeZone)}.</p>
                <LinkButton href={`/reports/${replacedBy.id}/sign-here`} variant="strong" className="mt-2">
                  Sign revision {replacedBy.revision}
                </LinkButton>
              </Notice>
            )}
          </div>
        )}
        <p className="mt-12 border-t border-line pt-3 text-sm text-ink2">
          <Link href={`/reports/${reportId}`} className="inline-flex min-h-12 items-center underline">
            Give the tablet back to {viewer.name}
          </Link>
        </p>
      </div>
    </SeenBefore>
  );
}

function Signing({ loaded }: { loaded: LoadedReport }) {
  const { viewer, report, model } = loaded;
  return (
    <>
      <h1 className="mt-6 text-2xl font-semibold">Acceptance report: read, answer, sign</h1>
      <p className="mt-1 text-ink2">Witness beside you: {viewer.name}</p>
      <section aria-labelledby="in-short">
        <SectionTitle id="in-short">In short</SectionTitle>
        <ReportInShort model={model} />
        <SeenMark />
      </section>
      <SectionTitle id="document">The document</SectionTitle>
      <details className="group">
        <summary className="inline-flex min-h-12 list-none items-center rounded border-[1.5px] border-blue px-5 font-medium text-blue">
          <span className="group-open:hidden">Show the whole document</span>
          <span className="hidden group-open:inline">Fold the document up</span>
        </summary>
        <div className="mt-4">
          <ReportPage model={model} photosAt={`/api/reports/${loaded.report.id}/photos`} />
          <div id="document-end">
            <SeenMark />
          </div>
        </div>
      </details>
      <section aria-labelledby="answer">
        <SectionTitle id="answer">The answer</SectionTitle>
        <SigningForm
          reportId={report.id}
          sheets={loaded.sheets}
          prefill={{
            name: model.customer.engineer ?? '',
            functionTitle: '',
            company: model.customer.name,
            place: model.conditions.place ?? '',
          }}
          firstWay="drawn"
          doneHref={`/reports/${report.id}/sign-here`}
        />
      </section>
    </>
  );
}

function Recorded({ loaded, answer }: { loaded: LoadedReport; answer: NonNullable<LoadedReport['answer']> }) {
  const { viewer, report, answerRemarks } = loaded;
  return (
    <>
      <h1 className="mb-4 mt-6 text-2xl font-semibold">The answer is recorded. Thank you.</h1>
      <AnswerNotice answer={answer} timeZone={viewer.timeZone} />
      <div className="mt-5">
        <AnswerRecord
          answer={answer}
          remarks={answerRemarks}
          document={{ number: report.number, revision: report.revision }}
          timeZone={viewer.timeZone}
        />
      </div>
    </>
  );
}
