'use client';

import { minutesWords } from '@/lib/planning/estimate-minutes';
import { setUpRuns } from '@/lib/planning/group-proposals';
import type { PlanChoices, PlanProblem, ProposedTest, TestChoice } from './plan-choices';
import { PlanTest } from './plan-test';
import { ReasonForAll } from './reason-for-all';

export const groupAnchor = (group: string): string => `step-${group.toLowerCase().replace(/[^a-z0-9]+/g, '-')}`;

/** One step of the working order: its tests, those that are set up together under their words, with counts and times. */
export function PlanGroup(props: {
  group: string;
  tests: ProposedTest[];
  choices: PlanChoices;
  problems: PlanProblem[];
  opened: boolean;
  onChoose: (keys: string[], change: Partial<TestChoice>) => void;
}) {
  const { group, tests, choices, problems, opened, onChoose } = props;
  const keys = tests.map((test) => test.key);
  const taken = tests.filter(({ key }) => choices[key]?.taken);
  const allIn = taken.length === tests.length;
  return (
    <section aria-label={group} id={groupAnchor(group)} className="mt-6 scroll-mt-4">
      <div className="flex flex-wrap items-center justify-between gap-x-4 border-b-[1.5px] border-ink">
        <h2 className="text-lg font-semibold">
          {group} <span className="text-sm font-normal text-ink2">{countWords(tests, taken)}</span>
        </h2>
        {keys.length > 1 && taken.length === 0 && (
          <ReasonForAll group={group} onChoose={(reason) => onChoose(keys, { reason })} />
        )}
        {tests.length > 1 && (
          <button
            type="button"
            className="min-h-12 text-blue underline"
            onClick={() => onChoose(keys, { taken: !allIn, reason: '', text: '' })}
          >
            {allIn ? `Take none of these ${tests.length}` : `Take all ${tests.length}`}
          </button>
        )}
      </div>
      {setUpRuns(tests.map((test) => ({ ...test, setUpTogether: test.setUp }))).map(({ words, sheets }) => (
        <div key={sheets[0]?.key}>
          {words !== null && sheets.length > 1 && (
            <h3 className="mt-3 border-l-4 border-line pl-3 text-[15px] font-medium">
              Set up together: {words}{' '}
              <span className="font-normal text-ink2">
                {countWords(
                  sheets,
                  sheets.filter(({ key }) => choices[key]?.taken),
                )}
              </span>
            </h3>
          )}
          <ul>
            {sheets.map((test) => (
              <PlanTest
                key={test.key}
                test={test}
                choice={choices[test.key] as TestChoice}
                problems={problems.filter((one) => one.key === test.key)}
                opened={opened}
                onChange={(change) => onChoose([test.key], change)}
              />
            ))}
          </ul>
        </div>
      ))}
    </section>
  );
}

/** `4 of 6 taken · 1 h 10 min`. */
function countWords(tests: ProposedTest[], taken: ProposedTest[]): string {
  return `${taken.length} of ${tests.length} taken · ${minutesWords(sumOfMinutes(taken))}`;
}

export const sumOfMinutes = (tests: { minutes: number }[]): number =>
  tests.reduce((sum, { minutes }) => sum + minutes, 0);
