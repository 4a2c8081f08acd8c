import Link from 'next/link';
import { AnswerNotice } from '@/components/report/answer-record';
import { Notice } from '@/components/ui/notice';
import { dayIn } from '@/lib/dates';
import type { LoadedReport } from './load-report';

/** How the report stands, in words: waits, answered by whom and when, replaced by which revision. */
export function ReportStanding({ loaded }: { loaded: LoadedReport }) {
  const { viewer, report, job, answer, replacedBy } = loaded;
  const waits = report.state === 'issued';
  const reopened = viewer.customerId === null && !replacedBy && (job.state === 'open' || job.state === 'in-check');
  return (
    <div className="grid max-w-[64rem] gap-3">
      {replacedBy && (
        <Notice tone="brass" title={`Replaced by revision ${replacedBy.revision}`}>
          <p>
            Revision {replacedBy.revision} was issued on {dayIn(replacedBy.issuedAt, viewer.timeZone)}; what stands here
            is kept, and is not the last word.{' '}
            <Link href={`/reports/${replacedBy.id}`} className="text-blue underline">
              Go to revision {replacedBy.revision}
            </Link>
          </p>
        </Notice>
      )}
      {answer && <AnswerNotice answer={answer} timeZone={viewer.timeZone} />}
      {waits && viewer.customerId !== null && (
        <Notice tone="brass" title="This report waits for your answer">
          <p>
            Read what is out of tolerance or left out, look into the document, then{' '}
            <a href="#answer" className="text-blue underline">
              accept it, accept it with remarks, or refuse it
            </a>
            .
          </p>
        </Notice>
      )}
      {waits && viewer.customerId === null && (
        <Notice title="Issued; waits for the customer’s answer">
          <p>{loaded.model.customer.name} can answer signed in, or beside the machine on the inspector’s tablet.</p>
        </Notice>
      )}
      {reopened && (
        <Notice tone="brass" title="The job is open again">
          <p>
            Its next report will be revision {report.revision + 1} and will replace this one.{' '}
            <Link href={`/jobs/${job.id}`} className="text-blue underline">
              Go to the job
            </Link>
          </p>
        </Notice>
      )}
    </div>
  );
}
