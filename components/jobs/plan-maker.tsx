'use client';

import { useRouter } from 'next/navigation';
import { useRef, useState } from 'react';
import { flushSync } from 'react-dom';
import { FormProblem } from '@/components/forms/form-problem';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import { ApiProblem, api } from '@/lib/http/api-client';
import { newId } from '@/lib/id';
import { minutesWords } from '@/lib/planning/estimate-minutes';
import { filterTests } from './filter-tests';
import { FollowsNotice } from './follows-notice';
import { LeaveOutMany } from './leave-out-many';
import {
  choicesByOpened,
  choicesFrom,
  chooseFor,
  firstChoices,
  type PlanChoices,
  type ProposedTest,
  planOf,
  type TestChoice,
} from './plan-choices';
import { groupAnchor, PlanGroup, sumOfMinutes } from './plan-group';
import { PlanStart, type StartChoice } from './plan-start';

/**
 * All proposals in working order, all taken to begin with, or what a template, an earlier plan or what was opened proposes. What is not
 * taken wants a reason; then the plan is made, once.
 */
export function PlanMaker(props: {
  jobId: string;
  tests: ProposedTest[];
  starts: StartChoice[];
  /** Something is said to have been opened. */
  opened: boolean;
}) {
  const { jobId, tests, starts, opened } = props;
  const router = useRouter();
  const [choices, setChoices] = useState<PlanChoices>(() => firstChoices(tests));
  const [filter, setFilter] = useState('');
  const [tried, setTried] = useState(false);
  const [sending, setSending] = useState(false);
  const [problem, setProblem] = useState<ApiProblem | null>(null);
  const summary = useRef<HTMLDivElement>(null);
  const key = useRef(newId());
  const { form, problems } = planOf(tests, choices);
  const taken = form.include.length;
  const minutes = sumOfMinutes(tests.filter((test) => choices[test.key]?.taken));
  const shown = filterTests(tests, filter);
  const groups = [...new Set(shown.map(({ group }) => group))];
  const choose = (keys: string[], change: Partial<TestChoice>) => setChoices(chooseFor(choices, keys, change));

  const make = async () => {
    setTried(true);
    if (problems.length > 0 || taken === 0) {
      // What has to be put right may be hidden.
      setFilter('');
      summary.current?.focus();
      return;
    }
    setSending(true);
    setProblem(null);
    try {
      await api(`/api/jobs/${jobId}/plan`, { method: 'POST', body: form, idempotencyKey: key.current });
      router.push(`/jobs/${jobId}`);
      router.refresh();
    } catch (error) {
      if (!(error instanceof ApiProblem)) throw error;
      key.current = newId();
      setProblem(error);
      setSending(false);
    }
  };

  return (
    <>
      <div ref={summary} tabIndex={-1} className="outline-none">
        {tried && (problems.length > 0 || taken === 0) && (
          <Notice tone="oxide" title="The plan is not complete" live className="mb-4">
            <ul>
              {taken === 0 && <li>Take at least one test into the plan.</li>}
              {problems.map(({ key: test, field, message }) => (
                <li key={`${test}${field}`}>
                  <button
                    type="button"
                    className="min-h-9 text-left underline"
                    onClick={() => {
                      flushSync(() => setFilter(''));
                      focusPlace(`${field} ${test}`);
                    }}
                  >
                    {tests.find((one) => one.key === test)?.title}: {message}
                  </button>
                </li>
              ))}
            </ul>
          </Notice>
        )}
      </div>
      {opened && <FollowsNotice tests={tests} onTake={() => setChoices(choicesByOpened(tests, choices))} />}
      <PlanStart
        starts={starts}
        keys={tests.map((test) => test.key)}
        onTake={(from) => setChoices(choicesFrom(tests, from))}
      />
      <LeaveOutMany
        tests={tests}
        onLeaveOut={(keys, reason, text) => choose(keys, { taken: false, reason, text, contract: null })}
      />
      <div className="mt-3 grid items-end gap-3 sm:grid-cols-[minmax(0,24rem)_1fr]">
        <Field
          label="Show only tests with"
          optional
          hint="Words of the title, the code, the set-up or a component: T2, mandrel"
        >
          <TextInput value={filter} type="search" onChange={(event) => setFilter(event.target.value)} />
        </Field>
        <p role="status" className="pb-3 text-ink2">
          {shown.length === tests.length
            ? `${tests.length} tests`
            : `${shown.length} of ${tests.length} tests are shown`}
        </p>
      </div>
      {groups.length > 1 && (
        <nav aria-label="Steps of the plan" className="mt-2 flex flex-wrap gap-x-5">
          {groups.map((group) => (
            <a
              key={group}
              href={`#${groupAnchor(group)}`}
              className="inline-flex min-h-9 items-center text-blue underline"
            >
              {group}
            </a>
          ))}
        </nav>
      )}
      {groups.map((group) => (
        <PlanGroup
          key={group}
          group={group}
          tests={shown.filter((test) => test.group === group)}
          choices={choices}
          problems={tried ? problems : []}
          opened={opened}
          onChoose={choose}
        />
      ))}
      <div
        data-print="no"
        className="sticky bottom-0 -mx-7 mt-6 flex flex-wrap items-center justify-between gap-3 border-t border-line bg-paper px-7 py-2.5"
      >
        <p>
          {taken} of {tests.length} tests taken, about {minutesWords(minutes)}
        </p>
        <Button variant="strong" disabled={sending} onClick={make}>
          Make the plan
        </Button>
        {problem && (
          <div className="w-full">
            <FormProblem problem={problem} />
          </div>
        )}
      </div>
    </>
  );
}

function focusPlace(place: string): void {
  document.querySelector<HTMLElement>(`[data-place="${CSS.escape(place)}"]`)?.focus();
}
