'use client';

import { useRouter } from 'next/navigation';
import { useRef, useState } from 'react';
import { FormProblem } from '@/components/forms/form-problem';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { ApiProblem, api } from '@/lib/http/api-client';
import { newId } from '@/lib/id';
import { LeaveOutMany } from './leave-out-many';
import { allTaken, chooseFor, type PlanChoices, type ProposedTest, planOf, type TestChoice } from './plan-choices';
import { PlanTest } from './plan-test';
import { ReasonForAll } from './reason-for-all';

/** All proposals in working order, all taken. What is not taken wants a reason; then the plan is made, once. */
export function PlanMaker({ jobId, tests }: { jobId: string; tests: ProposedTest[] }) {
  const router = useRouter();
  const [choices, setChoices] = useState<PlanChoices>(() => allTaken(tests));
  const [tried, setTried] = useState(false);
  const [sending, setSending] = useState(false);
  const [problem, setProblem] = useState<ApiProblem | null>(null);
  const summary = useRef<HTMLDivElement>(null);
  const key = useRef(newId());
  const { form, problems } = planOf(tests, choices);
  const taken = form.include.length;
  const groups = [...new Set(tests.map(({ group }) => group))];
  const choose = (keys: string[], change: Partial<TestChoice>) => setChoices(chooseFor(choices, keys, change));

  const make = async () => {
    setTried(true);
    if (problems.length > 0 || taken === 0) {
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
                    onClick={() => focusPlace(`${field} ${test}`)}
                  >
                    {tests.find((one) => one.key === test)?.title}: {message}
                  </button>
                </li>
              ))}
            </ul>
          </Notice>
        )}
      </div>
      <LeaveOutMany
        tests={tests}
        onLeaveOut={(keys, reason, text) => choose(keys, { taken: false, reason, text, contract: null })}
      />
      {groups.map((group) => {
        const members = tests.filter((test) => test.group === group);
        const keys = members.map((test) => test.key);
        const allIn = keys.every((one) => choices[one]?.taken);
        const noneIn = keys.length > 1 && keys.every((one) => !choices[one]?.taken);
        return (
          <section key={group} aria-label={group} className="mt-6">
            <div className="flex flex-wrap items-center justify-between gap-x-4 border-b-[1.5px] border-ink">
              <h2 className="text-lg font-semibold">{group}</h2>
              {noneIn && <ReasonForAll group={group} onChoose={(reason) => choose(keys, { reason })} />}
              {members.length > 1 && (
                <button
                  type="button"
                  className="min-h-12 text-blue underline"
                  onClick={() => choose(keys, { taken: !allIn, reason: '', text: '' })}
                >
                  {allIn ? `Take none of these ${members.length}` : `Take all ${members.length}`}
                </button>
              )}
            </div>
            <ul>
              {members.map((test) => (
                <PlanTest
                  key={test.key}
                  test={test}
                  choice={choices[test.key] as TestChoice}
                  problems={tried ? problems.filter((one) => one.key === test.key) : []}
                  onChange={(change) => choose([test.key], change)}
                />
              ))}
            </ul>
          </section>
        );
      })}
      <div
        data-print="no"
        className="sticky bottom-0 -mx-7 mt-6 flex flex-wrap items-center justify-between gap-3 border-t border-line bg-paper px-7 py-2.5"
      >
        <p>
          {taken} of {tests.length} tests taken
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
