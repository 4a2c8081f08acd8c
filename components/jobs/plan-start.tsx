'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import type { PlanForm } from '@/lib/schemas/job';
import { useRemoval } from './use-action';

export interface StartChoice {
  id: string;
  kind: 'template' | 'same-machine' | 'same-model';
  /** `Template “Yearly”, 12 Mar 2026`. */
  words: string;
  choices: PlanForm;
}

/** What the plan can begin from: a template of the model, the plan of an earlier job. It only preselects. */
export function PlanStart(props: { starts: StartChoice[]; keys: string[]; onTake: (choices: PlanForm) => void }) {
  const { starts, keys, onTake } = props;
  const [chosen, setChosen] = useState('');
  const [taken, setTaken] = useState<StartChoice | null>(null);
  const removal = useRemoval();
  const start = starts.find(({ id }) => id === chosen);
  if (starts.length === 0) return null;
  return (
    <div className="border-t border-line py-3">
      <div className="grid items-end gap-3 sm:grid-cols-[minmax(0,1fr)_auto_auto]">
        <Field label="Begin from">
          <Select value={chosen} onChange={(event) => setChosen(event.target.value)}>
            <option value="">Every test that fits</option>
            {starts.map(({ id, words }) => (
              <option key={id} value={id}>
                {words}
              </option>
            ))}
          </Select>
        </Field>
        <Button
          disabled={!start}
          onClick={() => {
            if (!start) return;
            onTake(start.choices);
            setTaken(start);
          }}
        >
          Take over its selection
        </Button>
        {start?.kind === 'template' && (
          <Button
            variant="danger"
            disabled={removal.isPending}
            onClick={() => removal.mutate(`/api/plan-templates/${start.id}`, { onSuccess: () => setChosen('') })}
          >
            Remove the template
          </Button>
        )}
      </div>
      <p className="mt-1 text-sm text-ink2">It only preselects: everything can still be changed.</p>
      {removal.error && <p className="mt-2 text-oxide">{removal.error.message}</p>}
      {taken && (
        <Notice title={`Taken over: ${taken.words}`} live className="mt-3">
          {takenOverWords(taken.choices, keys)}
        </Notice>
      )}
    </div>
  );
}

/** What came over, what did not, and what has to be looked at. */
export function takenOverWords({ include, exclusions, contractTolerances }: PlanForm, keys: string[]): string {
  const mine = new Set(keys);
  const known = new Set([...include, ...exclusions.map(({ key }) => key)]);
  const gone = include.filter((key) => !mine.has(key)).length;
  const fresh = keys.filter((key) => !known.has(key)).length;
  const agreed = contractTolerances.filter(({ key }) => mine.has(key)).length;
  return [
    `${include.length - gone} tests are taken.`,
    gone > 0 ? `${gone} of its tests do not fit this machine and its codes.` : null,
    fresh > 0 ? `${fresh} tests that it does not know stand as every plan begins.` : null,
    agreed > 0 ? `${agreed} tolerances come from the contract of that time: look at each.` : null,
  ]
    .filter((part) => part !== null)
    .join(' ');
}
