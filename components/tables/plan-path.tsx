'use client';

import Link from 'next/link';
import { useState } from 'react';
import type { MarkKind } from '@/components/plots/verdict-ink';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/inputs';
import { VerdictMark } from '@/components/ui/verdict-mark';
import { minutesWords } from '@/lib/planning/estimate-minutes';

export interface PathSheet {
  id: string;
  position: number;
  title: string;
  /** `S1 · Z1`. */
  component: string;
  mark: MarkKind;
  /** Word beside the mark, where it is not the mark's own. */
  words?: string;
  /** `concave 0.0240`, the reason why it is left out. */
  result: string;
  /** The one to go to next. */
  isNext: boolean;
  /** Step of the working order; null in plans from before it was kept. */
  step: string | null;
  /** What stands set up for it and its neighbours. */
  setUp: string | null;
  /** Until its readings as found are taken; 0 afterwards. */
  minutesLeft: number;
}

/** A plan of more lines than this can be searched. */
const LONG_PLAN = 20;

/** The plan as a scribed line with a tick for each sheet, in working order; every line leads to its sheet. */
export function PlanPath({ jobId, sheets }: { jobId: string; sheets: PathSheet[] }) {
  const [filter, setFilter] = useState('');
  const shown = filterLines(sheets, filter);
  return (
    <>
      {sheets.length > LONG_PLAN && (
        <div data-print="no" className="grid items-end gap-x-4 sm:grid-cols-[minmax(0,22rem)_1fr]">
          <Field label="Show only tests with" optional>
            <TextInput type="search" value={filter} onChange={(event) => setFilter(event.target.value)} />
          </Field>
          <p role="status" className="pb-3 text-ink2">
            {shown.length === sheets.length
              ? `${sheets.length} tests`
              : `${shown.length} of ${sheets.length} tests are shown`}
          </p>
        </div>
      )}
      {stepsOf(shown).map(({ step, runs }) => (
        <section key={runs[0]?.sheets[0]?.id} aria-label={step ?? undefined}>
          {step !== null && (
            <h2 className="mt-4 flex flex-wrap items-baseline gap-x-3 border-b-[1.5px] border-ink pb-0.5 font-semibold">
              {step}
              <span className="text-sm font-normal text-ink2">{countWords(runs.flatMap((run) => run.sheets))}</span>
            </h2>
          )}
          {runs.map(({ setUp, sheets: members }, index) => (
            // Without a heading of its own a run would read as a part of the group above it.
            <div key={members[0]?.id} className={index > 0 && (setUp === null || members.length === 1) ? 'mt-3' : ''}>
              {setUp !== null && members.length > 1 && (
                <h3 className="mt-2 border-l-4 border-line pl-3 text-[15px] font-medium">
                  Set up together: {setUp} <span className="text-sm font-normal text-ink2">{countWords(members)}</span>
                </h3>
              )}
              <ol className="relative">
                <span aria-hidden="true" className="absolute inset-y-0 left-[3.4rem] w-0.5 bg-line" />
                {members.map((sheet) => (
                  <PathLine key={sheet.id} jobId={jobId} sheet={sheet} />
                ))}
              </ol>
            </div>
          ))}
        </section>
      ))}
    </>
  );
}

function PathLine({ jobId, sheet }: { jobId: string; sheet: PathSheet }) {
  return (
    <li className="relative border-b border-hair">
      <Link
        href={`/jobs/${jobId}/sheets/${sheet.id}`}
        aria-current={sheet.isNext ? 'step' : undefined}
        className={`grid min-h-12 grid-cols-[2.5rem_1.8rem_minmax(0,1fr)] items-center gap-y-0.5 py-1.5 hover:bg-blue-wash sm:grid-cols-[2.5rem_1.8rem_minmax(0,1fr)_11.5rem_minmax(5.5rem,10rem)] ${sheet.isNext ? 'bg-brass-wash' : ''}`}
      >
        <span className="pl-1 font-mono text-[15px] text-ink2">{sheet.position}</span>
        <span aria-hidden="true" className={`ml-1 h-0.5 w-3.5 ${sheet.isNext ? 'bg-brass' : 'bg-ink'}`} />
        <span className="pr-3">
          {sheet.title} <span className="text-[15px] text-ink2">{sheet.component}</span>
          {sheet.isNext && <span className="sr-only">, next to measure</span>}
        </span>
        <span className="max-sm:col-start-3">
          <VerdictMark verdict={sheet.mark} words={sheet.words} />
        </span>
        <span className="pr-1 text-[15px] text-ink2 max-sm:col-start-3">
          {sheet.result || (sheet.minutesLeft > 0 && minutesWords(sheet.minutesLeft))}
        </span>
      </Link>
    </li>
  );
}

interface Step {
  step: string | null;
  runs: { setUp: string | null; sheets: PathSheet[] }[];
}

/** Lines that hold every word of the text in number, title, component, step, set-up, or in what is shown of the result. */
export function filterLines(sheets: PathSheet[], text: string): PathSheet[] {
  const words = text.toLowerCase().split(/\s+/).filter(Boolean);
  if (words.length === 0) return sheets;
  return sheets.filter((sheet) => {
    const { position, title, component, step, setUp, mark, result } = sheet;
    const held = [position, title, component, step, setUp, sheet.words ?? mark.replaceAll('-', ' '), result];
    return words.every((word) => held.join(' ').toLowerCase().includes(word));
  });
}

/** Neighbours of one step under its heading, in it neighbours that are set up together. */
function stepsOf(sheets: PathSheet[]): Step[] {
  const steps: Step[] = [];
  for (const sheet of sheets) {
    let last = steps.at(-1);
    if (!last || last.step !== sheet.step) {
      last = { step: sheet.step, runs: [] };
      steps.push(last);
    }
    const run = last.runs.at(-1);
    if (run && run.setUp === sheet.setUp) run.sheets.push(sheet);
    else last.runs.push({ setUp: sheet.setUp, sheets: [sheet] });
  }
  return steps;
}

/** `6 tests · 45 min to measure`. */
function countWords(sheets: PathSheet[]): string {
  const minutes = sheets.reduce((sum, { minutesLeft }) => sum + minutesLeft, 0);
  const count = sheets.length === 1 ? '1 test' : `${sheets.length} tests`;
  return minutes > 0 ? `${count} · ${minutesWords(minutes)} to measure` : count;
}
