import type { ReactNode } from 'react';
import { LinkButton } from '@/components/ui/button';
import type { CheckFinding } from '@/lib/reporting/check-findings';
import { HandInButton } from './hand-in-button';
import { LinkAsLeftButton } from './link-as-left-button';

export interface Waiting {
  jobId: string;
  state: 'open' | 'in-check' | 'issued' | 'closed';
  planMade: boolean;
  findings: CheckFinding[];
  next: { id: string; position: number; title: string } | null;
  /** Sheets that are complete as found and need no more than the declaration that as left is as found. */
  linkable: string[];
  report: { id: string; number: string; state: string } | null;
  may: { measure: boolean; manage: boolean; issue: boolean };
  checkers: string[];
}

/** What the person looking has to do with this job now, and what keeps it from the check. */
export function WaitingForYou(props: Waiting) {
  const { jobId, state, planMade, findings, next, linkable, report, may, checkers } = props;
  const blocks = findings.filter(({ weight }) => weight === 'blocks');
  if (!planMade) {
    return (
      <Plate title={may.manage ? 'Waiting for you' : 'Not begun'}>
        <p>The plan has not been made: which tests are measured, and against which tolerances.</p>
        {may.manage && (
          <LinkButton variant="strong" href={`/jobs/${jobId}/plan`}>
            Make the plan
          </LinkButton>
        )}
      </Plate>
    );
  }
  if (state === 'issued' || state === 'closed') {
    return (
      <Plate
        title={report?.state === 'issued' ? 'Waiting for the customer' : 'Done'}
        quiet={report?.state !== 'issued'}
      >
        <p>{report ? `Report ${report.number} is out.` : 'The report of this job is out.'}</p>
        {report && (
          <LinkButton variant="strong" href={`/reports/${report.id}`}>
            Open the report
          </LinkButton>
        )}
      </Plate>
    );
  }
  const go = next && may.measure && (
    <LinkButton variant={blocks.length > 0 ? 'strong' : 'plain'} href={`/jobs/${jobId}/sheets/${next.id}`}>
      Go to {next.position}
    </LinkButton>
  );
  const check = (
    <LinkButton variant={blocks.length === 0 && may.issue ? 'strong' : 'plain'} href={`/jobs/${jobId}/check`}>
      {may.issue ? 'Check and report' : 'See the check'}
    </LinkButton>
  );
  return (
    <Plate title={titleOf(props, blocks.length)} quiet={!waits(props, blocks.length)}>
      {state === 'in-check' && (
        <p>
          Handed in for the check
          {checkers.length > 0 && `: ${checkers.join(', ')} ${checkers.length > 1 ? 'have' : 'has'} it`}.
        </p>
      )}
      {blocks.length > 0 ? <Blocks findings={blocks} next={next} /> : <p>Nothing keeps this job from the check.</p>}
      {go}
      {may.measure && linkable.length > 0 && <LinkAsLeftButton jobId={jobId} sheetIds={linkable} />}
      {state === 'open' && may.manage && blocks.length === 0 && !may.issue && <HandInButton jobId={jobId} />}
      {check}
    </Plate>
  );
}

const waits = ({ state, may }: Waiting, blocking: number) =>
  state === 'in-check' ? may.issue : blocking > 0 ? may.measure : may.manage;

function titleOf(waiting: Waiting, blocking: number): string {
  if (waits(waiting, blocking)) return 'Waiting for you';
  return waiting.state === 'in-check' ? 'In check' : 'In work';
}

const kinds: Partial<Record<CheckFinding['kind'], [one: string, many: string]>> = {
  'not-measured': ['sheet is not measured', 'sheets are not measured'],
  'no-as-left': ['sheet has no readings as left', 'sheets have no readings as left'],
  'no-instrument': ['set of readings names no instrument', 'sets of readings name no instrument'],
  'instrument-overdue': ['instrument was used after its due date', 'instruments were used after their due date'],
};

/** What blocks the check: counted by kind, with the numbers of the sheets. */
function Blocks({ findings, next }: { findings: CheckFinding[]; next: Waiting['next'] }) {
  const grouped = new Map<CheckFinding['kind'], CheckFinding[]>();
  for (const finding of findings) grouped.set(finding.kind, [...(grouped.get(finding.kind) ?? []), finding]);
  return (
    <>
      {next && (
        <p>
          Next: {next.position} {next.title}.
        </p>
      )}
      <ul className="grid gap-1">
        {[...grouped].map(([kind, found]) => (
          <li key={kind}>
            {found.length} {kinds[kind]?.[found.length === 1 ? 0 : 1] ?? found[0]?.text}
            <span className="text-[15px] text-ink2"> · {numbers(found)}</span>
          </li>
        ))}
      </ul>
    </>
  );
}

const mostNumbers = 9;

function numbers(findings: CheckFinding[]): string {
  const all = [...new Set(findings.flatMap(({ position }) => (position === null ? [] : [position])))];
  const shown = all.slice(0, mostNumbers).join(', ');
  return all.length > mostNumbers ? `${shown} and ${all.length - mostNumbers} more` : shown;
}

function Plate({ title, quiet, children }: { title: string; quiet?: boolean; children: ReactNode }) {
  return (
    <section
      aria-label={title}
      className={`grid gap-3 rounded border-[1.5px] px-4 py-4 ${quiet ? 'border-line bg-leaf' : 'border-brass bg-brass-wash'}`}
    >
      <h2 className="font-semibold">{title}</h2>
      {children}
    </section>
  );
}
