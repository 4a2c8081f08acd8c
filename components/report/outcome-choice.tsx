'use client';

import { useId } from 'react';
import type { UseFormRegisterReturn } from 'react-hook-form';
import { FieldErrorLine } from '@/components/ui/field';
import { type Outcome, outcomes } from '@/lib/schemas/signature';

const means: Record<Outcome, string> = {
  accept: 'The machine is taken as the report records it.',
  'accept-with-remarks': 'The machine is taken; what is still open stands as remarks on the report.',
  refuse: 'The machine is not taken, for a reason that you give.',
};

/** Three answers of equal weight. The two that accept wait until the deviations have been seen. */
export function OutcomeChoice(props: {
  register: UseFormRegisterReturn;
  acceptable: boolean;
  error?: string;
  onChoose: () => void;
}) {
  const { register, acceptable, error, onChoose } = props;
  const id = useId();
  return (
    <fieldset
      className="min-w-0"
      aria-describedby={
        [error ? `${id}-error` : '', acceptable ? '' : `${id}-wait`].filter(Boolean).join(' ') || undefined
      }
    >
      <legend className="mb-1 font-medium">What is the answer?</legend>
      <div className="grid gap-3 md:grid-cols-3">
        {(Object.keys(outcomes) as Outcome[]).map((outcome) => {
          const waits = outcome !== 'refuse' && !acceptable;
          return (
            <label
              key={outcome}
              className={`flex min-h-16 items-start gap-3 rounded border-[1.5px] p-4 has-[:checked]:border-blue has-[:checked]:bg-blue-wash has-[:focus-visible]:outline-3 has-[:focus-visible]:outline-offset-2 has-[:focus-visible]:outline-blue ${waits ? 'border-line' : 'border-ink2 bg-leaf'}`}
            >
              <input
                type="radio"
                value={outcome}
                {...register}
                disabled={waits}
                onChange={(event) => {
                  onChoose();
                  return register.onChange(event);
                }}
                className="mt-0.5 size-6 shrink-0 accent-blue outline-none"
              />
              <span>
                <span className="block text-lg font-semibold leading-7">{outcomes[outcome]}</span>
                <span className="text-sm text-ink2">{means[outcome]}</span>
              </span>
            </label>
          );
        })}
      </div>
      {!acceptable && (
        <p id={`${id}-wait`} className="mt-2 border-l-4 border-brass pl-3">
          Accepting opens when you have had{' '}
          <a href="#in-short" className="text-blue underline">
            the list of deviations
          </a>{' '}
          or{' '}
          <a href="#document-end" className="text-blue underline">
            the end of the document
          </a>{' '}
          in front of you.
        </p>
      )}
      {error && (
        <div className="mt-2">
          <FieldErrorLine id={`${id}-error`}>{error}</FieldErrorLine>
        </div>
      )}
    </fieldset>
  );
}
