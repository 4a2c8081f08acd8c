'use client';

import Link from 'next/link';
import { Field } from '@/components/ui/field';
import { Checkbox, NumberText, Select, TextInput } from '@/components/ui/inputs';
import { minutesWords } from '@/lib/planning/estimate-minutes';
import { type LeftOutReason, leftOutReasons } from '@/lib/schemas/job';
import type { PlanProblem, ProposedTest, TestChoice } from './plan-choices';

/** One proposed test: taken, or not and why; its tolerance, or the contract's. */
export function PlanTest(props: {
  test: ProposedTest;
  choice: TestChoice;
  problems: PlanProblem[];
  /** Something is said to have been opened. */
  opened: boolean;
  onChange: (change: Partial<TestChoice>) => void;
}) {
  const { test, choice, problems, opened, onChange } = props;
  const problem = (field: PlanProblem['field']) => problems.find((one) => one.field === field)?.message;
  const { contract } = choice;
  return (
    <li className="grid gap-x-6 border-b border-hair py-1 md:grid-cols-[minmax(0,1fr)_minmax(0,20rem)] lg:grid-cols-[minmax(0,1fr)_minmax(0,26rem)]">
      <div>
        <Checkbox
          label={test.title}
          hint={`${test.code} · ${timeWords(test)}`}
          checked={choice.taken}
          onChange={(event) => onChange({ taken: event.target.checked, contract: null })}
        />
        {opened && <p className="pb-2 pl-9 text-sm text-ink2">{followsWords(test)}</p>}
        {test.standsInFor && <p className="pb-2 pl-9 text-sm text-ink2">Another way to measure: {test.standsInFor}</p>}
      </div>
      {choice.taken ? (
        <div className="py-2 text-[15px] leading-snug text-ink2 max-md:pl-9">
          <p className={contract ? 'line-through' : 'text-ink'}>{test.tolerance}</p>
          {!contract && test.foundBy && (
            <p>
              {test.foundBy} · <span className={test.unconfirmed ? 'text-brass' : ''}>{test.provenance}</span>
            </p>
          )}
          {!contract && test.refused && (
            <p className="font-medium text-brass">
              Not confirmed: this job takes confirmed tolerances only.{' '}
              <Link href={test.href} className="underline">
                Look at it in the catalogue
              </Link>
            </p>
          )}
          {contract ? (
            <div className="mt-2 grid gap-2 text-base text-ink sm:grid-cols-[8rem_1fr]">
              <Field
                label={`By contract, ${test.contractUnit === 'arcsec' ? '″' : test.contractUnit}`}
                error={problem('tolerance')}
              >
                <NumberText
                  data-place={`tolerance ${test.key}`}
                  value={contract.tolerance}
                  onChange={(event) => onChange({ contract: { ...contract, tolerance: event.target.value } })}
                />
              </Field>
              <Field label="Where it is agreed" error={problem('source')}>
                <TextInput
                  data-place={`source ${test.key}`}
                  value={contract.source}
                  placeholder="Order, item"
                  onChange={(event) => onChange({ contract: { ...contract, source: event.target.value } })}
                />
              </Field>
              <button
                type="button"
                className="min-h-9 justify-self-start text-blue underline sm:col-span-2"
                onClick={() => onChange({ contract: null })}
              >
                Keep the catalogue’s tolerance
              </button>
            </div>
          ) : test.contractUnit === null ? null : (
            <button
              type="button"
              data-place={`unconfirmed ${test.key}`}
              className="min-h-9 text-blue underline"
              onClick={() => onChange({ contract: { tolerance: '', source: '' } })}
            >
              The contract says another tolerance
              <span className="sr-only"> for {test.title}</span>
            </button>
          )}
        </div>
      ) : (
        <div className="grid gap-2 py-2 max-md:pl-9 sm:grid-cols-2">
          <Field label="Not taken because" error={problem('reason')}>
            <Select
              data-place={`reason ${test.key}`}
              value={choice.reason}
              onChange={(event) => onChange({ reason: event.target.value as LeftOutReason | '' })}
            >
              <option value="">Choose a reason</option>
              {Object.entries(leftOutReasons).map(([value, words]) => (
                <option key={value} value={value}>
                  {words}
                </option>
              ))}
            </Select>
          </Field>
          <Field label="In your words" optional>
            <TextInput
              value={choice.text}
              maxLength={400}
              onChange={(event) => onChange({ text: event.target.value })}
            />
          </Field>
        </div>
      )}
    </li>
  );
}

const timeWords = ({ minutes, fromPasses }: ProposedTest): string =>
  `${minutesWords(minutes)}, ${fromPasses === null ? 'our estimate' : `median of ${fromPasses} of your own measurements`}`;

/** Why it follows from what was opened. */
function followsWords({ follows }: ProposedTest): string {
  if (follows === null) return 'Rests on nothing that was touched.';
  return follows.length === 0 ? 'Rests on no single component.' : `Follows: ${follows.join('; ')}.`;
}
