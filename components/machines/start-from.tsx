'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { toMakeUpInput, useMachineForm } from './machine-input';

/** Whole machines to start from. Choosing another one later asks first, because it replaces the rows. */
export function StartFrom({ initial }: { initial: number }) {
  const form = useMachineForm();
  const [chosen, setChosen] = useState(initial);
  const [asked, setAsked] = useState<number | null>(null);
  const take = (index: number) => {
    const start = startingMakeUps[index];
    if (!start) return;
    setChosen(index);
    setAsked(null);
    const values = { ...form.getValues(), makeUp: toMakeUpInput(start.makeUp) };
    form.reset(values, { keepDefaultValues: false, keepSubmitCount: true });
  };
  const choose = (index: number) => {
    if (index === chosen) return;
    if (form.formState.dirtyFields.makeUp) setAsked(index);
    else take(index);
  };
  return (
    <fieldset>
      <legend className="font-semibold">Start from the kind that is nearest</legend>
      <div className="mt-2 grid gap-2 sm:grid-cols-2 lg:grid-cols-3">
        {startingMakeUps.map(({ title }, index) => (
          <button
            key={title}
            type="button"
            aria-pressed={index === chosen}
            onClick={() => choose(index)}
            className={`min-h-16 rounded border-[1.5px] px-4 py-2 text-left ${
              index === chosen
                ? 'border-blue bg-blue-wash font-semibold text-blue'
                : 'border-ink2 bg-leaf hover:border-blue'
            }`}
          >
            {title}
            {index === chosen && <span className="block text-sm font-normal">chosen; change below what differs</span>}
          </button>
        ))}
      </div>
      {asked !== null && (
        <Notice tone="brass" title="The rows below have been changed" live className="mt-3">
          <p>Starting again from “{startingMakeUps[asked]?.title}” replaces them.</p>
          <div className="mt-2 flex flex-wrap gap-2">
            <Button small onClick={() => take(asked)}>
              Replace them
            </Button>
            <Button small variant="quiet" onClick={() => setAsked(null)}>
              Keep them
            </Button>
          </div>
        </Notice>
      )}
    </fieldset>
  );
}
