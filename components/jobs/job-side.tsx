import Link from 'next/link';
import { ReportStateWord } from '@/components/machines/report-state';
import type { LeftOutReason } from '@/lib/schemas/job';
import { leftOutReasons } from '@/lib/schemas/job';

const roles = { inspector: 'measures', reviewer: 'has the check', customer: 'for the customer' } as const;

export function JobPeople({ people }: { people: { name: string; role: keyof typeof roles }[] }) {
  return (
    <section aria-labelledby="people">
      <h2 id="people" className="font-semibold">
        People
      </h2>
      {people.length === 0 ? (
        <p className="text-ink2">Nobody is named.</p>
      ) : (
        <ul className="text-[15px]">
          {people.map(({ name, role }) => (
            <li key={`${name}${role}`}>
              {name} <span className="text-ink2">{roles[role]}</span>
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}

interface NotPlanned {
  key: string;
  title: string;
  reason: LeftOutReason;
  text: string | null;
}

/** So many lines stand open; more of them behind their count. */
const SHORT_LIST = 8;

/** Tests that fit the machine and were not taken into the plan, by reason, each with what was said of it. */
export function NotInPlan({ exclusions }: { exclusions: NotPlanned[] }) {
  if (exclusions.length === 0) return null;
  const reasons = Object.entries(leftOutReasons)
    .map(([reason, words]) => ({ words, members: exclusions.filter((one) => one.reason === reason) }))
    .filter(({ members }) => members.length > 0);
  return (
    <section aria-labelledby="not-in-plan" className="mt-8">
      <h2 id="not-in-plan" className="font-semibold">
        Not in the plan
      </h2>
      {reasons.map(({ words, members }) => (
        <details key={words} open={members.length <= SHORT_LIST}>
          <summary className="flex min-h-12 items-center border-b border-hair">
            <span aria-hidden="true" className="mr-2">
              ▸
            </span>
            {words}: {members.length === 1 ? '1 test' : `${members.length} tests`}
          </summary>
          <ul className="text-[15px] leading-snug">
            {members.map(({ key, title, text }) => (
              <li key={key} className="border-b border-hair py-1.5">
                {title} {text && <span className="text-ink2">· {text}</span>}
              </li>
            ))}
          </ul>
        </details>
      ))}
    </section>
  );
}

export function JobReports(props: {
  reports: { id: string; number: string; revision: number; state: string; pdfState: string; signedAt: Date | null }[];
  timeZone: string;
}) {
  const { reports, timeZone } = props;
  if (reports.length === 0) return null;
  return (
    <section aria-labelledby="reports">
      <h2 id="reports" className="font-semibold">
        Reports
      </h2>
      <ul>
        {reports.map((report) => (
          <li key={report.id} className="flex flex-wrap items-center gap-x-3 text-[15px]">
            <Link
              href={`/reports/${report.id}`}
              className="inline-flex min-h-12 items-center font-mono text-blue underline"
            >
              {report.number} r{report.revision}
            </Link>
            <ReportStateWord state={report.state} signedAt={report.signedAt} timeZone={timeZone} />
            {report.pdfState === 'failed' && <span className="text-oxide">PDF failed</span>}
            {report.pdfState === 'waiting' && <span className="text-ink2">PDF is being made</span>}
          </li>
        ))}
      </ul>
    </section>
  );
}
