import Link from 'next/link';
import { ReportLine, type ReportLineReport } from '@/components/machines/report-line';
import { Notice } from '@/components/ui/notice';
import type { Match } from '@/lib/schemas/serial-match';
import { MarkedSerial } from './marked-serial';

interface Hit {
  machine: {
    id: string;
    manufacturer: string;
    model: string;
    serialNumber: string;
    year: number | null;
    site: string | null;
    customerName: string | null;
  };
  match: Match;
  matchedOn: string;
  reports: ReportLineReport[];
}

const words: Record<Match, string> = {
  exact: 'exactly this',
  folded: 'the same but for dashes and look-alike signs',
  prefix: 'begins with it',
  part: 'contains it',
  slip: 'similar, one sign differs',
};

/** Machines found, each with its reports: one click to the machine, one to a report or its PDF. */
export function ArchiveHits({ hits, query, timeZone }: { hits: Hit[]; query: string; timeZone: string }) {
  const similar = hits[0]?.match === 'slip';
  return (
    <>
      {similar && (
        <Notice tone="brass" title="Not found as it was typed" className="mb-3">
          These are similar. Compare the marked signs with the nameplate before you open one.
        </Notice>
      )}
      <ol className="border-t-[1.5px] border-ink">
        {hits.map(({ machine, match, matchedOn, reports }) => (
          <li
            key={machine.id}
            className="grid gap-x-8 border-b border-hair py-3 md:grid-cols-[minmax(0,1fr)_minmax(0,1.1fr)]"
          >
            <div>
              <Link
                href={`/machines/${machine.id}`}
                className="inline-flex min-h-12 items-center font-mono text-xl text-blue underline"
              >
                {matchedOn === 'serial number' ? (
                  <span>
                    <MarkedSerial serialNumber={machine.serialNumber} query={query} match={match} />
                  </span>
                ) : (
                  machine.serialNumber
                )}
              </Link>
              <p>
                {machine.manufacturer} {machine.model}
                {machine.year && `, ${machine.year}`}
              </p>
              <p className="text-sm text-ink2">
                {[machine.customerName, machine.site].filter(Boolean).join(' · ')}
                <span className="block">
                  {matchedOn}: {words[match]}
                </span>
              </p>
            </div>
            <div className="pt-2">
              {reports.length === 0 ? (
                <p className="text-ink2">no report yet</p>
              ) : (
                reports.map((report) => <ReportLine key={report.id} report={report} timeZone={timeZone} />)
              )}
            </div>
          </li>
        ))}
      </ol>
    </>
  );
}
