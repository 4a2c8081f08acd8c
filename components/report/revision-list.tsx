import Link from 'next/link';
import { ReportStateWord } from '@/components/machines/report-state';
import { dayIn } from '@/lib/dates';

export interface RevisionLine {
  id: string;
  number: string;
  revision: number;
  state: string;
  pdfState: string;
  issuedAt: Date;
  signedAt: Date | null;
}

/** The revisions of a job's report, newest first, each with its state and its PDF. */
export function RevisionList(props: { revisions: RevisionLine[]; timeZone: string; here?: string }) {
  const { revisions, timeZone, here } = props;
  return (
    <ul>
      {revisions.map((report) => (
        <li key={report.id} className="border-b border-hair py-2">
          <p className="flex flex-wrap items-baseline gap-x-3">
            {report.id === here ? (
              <span className="font-mono font-medium" aria-current="page">
                {name(report)}
              </span>
            ) : (
              <Link
                href={`/reports/${report.id}`}
                className="inline-flex min-h-9 items-center font-mono text-blue underline"
              >
                {name(report)}
              </Link>
            )}
            {report.pdfState === 'ready' && report.id !== here && (
              <a
                href={`/api/reports/${report.id}/pdf`}
                download
                className="inline-flex min-h-9 items-center text-blue underline"
              >
                PDF<span className="sr-only"> of {name(report)}</span>
              </a>
            )}
          </p>
          <p className="text-sm">
            <ReportStateWord state={report.state} signedAt={report.signedAt} timeZone={timeZone} />
            <span className="text-ink2"> · issued {dayIn(report.issuedAt, timeZone)}</span>
          </p>
        </li>
      ))}
    </ul>
  );
}

const name = ({ number, revision }: RevisionLine) => `${number} r${revision}`;
