import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { AnswerNotice, AnswerRecord } from '@/components/report/answer-record';
import { PdfState } from '@/components/report/pdf-state';
import { LinkButton } from '@/components/ui/button';
import { PageTitle } from '@/components/ui/page-title';
import { loadReport } from '../load-report';

export const metadata: Metadata = { title: 'The answer is recorded' };

/** After signing: what was recorded, and the document with the answer on it. */
export default async function AnsweredPage({ params }: { params: Promise<{ reportId: string }> }) {
  const { reportId } = await params;
  const { viewer, report, answer, answerRemarks } = await loadReport(reportId);
  if (!answer) redirect(`/reports/${reportId}`);
  const { pdfState, pdfFileId, signedPdfFileId, pdfErrorId } = report;
  return (
    <>
      <PageTitle
        note={
          <span className="font-mono">
            {report.number} · revision {report.revision}
          </span>
        }
      >
        The answer is recorded
      </PageTitle>
      <AnswerNotice answer={answer} timeZone={viewer.timeZone} />
      <div className="mt-5 grid gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,1fr)_19rem]">
        <AnswerRecord
          answer={answer}
          remarks={answerRemarks}
          document={{ number: report.number, revision: report.revision }}
          timeZone={viewer.timeZone}
        />
        <aside className="grid content-start gap-4">
          <PdfState reportId={reportId} answered first={{ pdfState, pdfFileId, signedPdfFileId, pdfErrorId }} />
          <LinkButton href={`/reports/${reportId}`}>Back to the report</LinkButton>
        </aside>
      </div>
    </>
  );
}
