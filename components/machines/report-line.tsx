import Link from 'next/link';
import { ReportStateWord } from './report-state';

export interface ReportLineReport {
  id: string;
  number: string;
  revision: number;
  state: string;
  signedAt: Date | null;
  hasPdf: boolean;
}

/** A report in one line: its page, its state, its PDF. */
export function ReportLine({ report, timeZone }: { report: ReportLineReport; timeZone: string }) {
  return (
    <p className="flex flex-wrap items-baseline gap-x-4">
      <Link href={`/reports/${report.id}`} className="inline-flex min-h-9 items-center font-mono text-blue underline">
        {report.number}
        {report.revision > 1 && ` rev ${report.revision}`}
      </Link>
      <ReportStateWord state={report.state} signedAt={report.signedAt} timeZone={timeZone} />
      {report.hasPdf && (
        <a href={`/api/reports/${report.id}/pdf`} className="inline-flex min-h-9 items-center text-blue underline">
          PDF<span className="sr-only"> of {report.number}</span>
        </a>
      )}
    </p>
  );
}
