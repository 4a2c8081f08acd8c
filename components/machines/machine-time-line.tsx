import Link from 'next/link';
import { dayIn, dayWords } from '@/lib/dates';
import { purposes } from '@/lib/schemas/job';
import { ReportLine, type ReportLineReport } from './report-line';

interface TimeLineJob {
  id: string;
  reference: string;
  purpose: keyof typeof purposes;
  state: 'open' | 'in-check' | 'issued' | 'closed';
  startsOn: string;
  endsOn: string | null;
  customerName: string | null;
}

export interface TimeLineReport extends ReportLineReport {
  jobId: string;
  headline: string;
  issuedAt: Date | null;
}

const states = { open: 'open', 'in-check': 'waits for the check', issued: 'report issued', closed: 'closed' } as const;

/** The machine's life as the scribed line of a plan: a tick a job, newest first, each with its reports. */
export function MachineTimeLine(props: {
  jobs: TimeLineJob[];
  reports: TimeLineReport[];
  timeZone: string;
  /** Staff open the job itself; a customer sees what was issued. */
  linkJobs: boolean;
}) {
  const { jobs, reports, timeZone, linkJobs } = props;
  return (
    <ol className="relative before:absolute before:inset-y-1 before:left-[7.4rem] before:w-[1.5px] before:bg-line">
      {jobs.map((job) => (
        <li key={job.id} className="grid grid-cols-[6.5rem_2rem_1fr] items-baseline border-b border-hair py-3">
          <time dateTime={job.startsOn} className="text-sm text-ink2">
            {dayWords(job.endsOn ?? job.startsOn)}
          </time>
          <span aria-hidden="true" className="relative -top-1 h-[1.5px] w-5 bg-ink" />
          <div className="min-w-0">
            <p className="flex flex-wrap items-baseline gap-x-3">
              {linkJobs ? (
                <Link
                  href={`/jobs/${job.id}`}
                  className="inline-flex min-h-9 items-center font-medium text-blue underline"
                >
                  {job.reference}
                </Link>
              ) : (
                <span className="font-medium">{job.reference}</span>
              )}
              <span>{purposes[job.purpose]}</span>
              <span className="text-sm text-ink2">
                {[job.customerName, linkJobs ? states[job.state] : null].filter(Boolean).join(' · ')}
              </span>
            </p>
            {reports
              .filter(({ jobId }) => jobId === job.id)
              .map((report) => (
                <div key={report.id}>
                  <ReportLine report={report} timeZone={timeZone} />
                  <p className="text-sm text-ink2">
                    {report.headline}
                    {report.issuedAt && ` Issued ${dayIn(report.issuedAt, timeZone)}.`}
                  </p>
                </div>
              ))}
          </div>
        </li>
      ))}
    </ol>
  );
}
