'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useWatch } from 'react-hook-form';
import { z } from 'zod';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Select, TextInput } from '@/components/ui/inputs';
import { api } from '@/lib/http/api-client';
import type { MachinePart } from '@/lib/planning/machine-parts';
import { type ComponentConditions, type PartCondition, partConditions } from '@/lib/schemas/component-conditions';

export interface OpenedPartsData {
  jobId: string;
  version: number;
  parts: MachinePart[];
  conditions: ComponentConditions;
  mayChange: boolean;
}

/** What the work did to each component. It proposes the tests, and it prints. */
export function OpenedParts(props: OpenedPartsData) {
  const { parts, conditions, mayChange } = props;
  const [open, setOpen] = useState(false);
  const said = parts.flatMap(({ id, words }) => (conditions[id] ? [{ id, words, ...conditions[id] }] : []));
  return (
    <section aria-labelledby="opened">
      <h2 id="opened" className="font-semibold">
        What was opened
      </h2>
      {said.length === 0 ? (
        <p className="text-ink2">Nothing is said yet.</p>
      ) : (
        <ul className="text-[15px]">
          {said
            .filter((part) => !isPlain(part))
            .map(({ id, words, condition, text }) => (
              <li key={id}>
                {words}{' '}
                <span className="text-ink2">{[partConditions[condition], text].filter(Boolean).join(', ')}</span>
              </li>
            ))}
          {said.some(isPlain) && (
            <li>
              <span className="text-ink2">{partConditions.untouched}: </span>
              {said
                .filter(isPlain)
                .map(({ words }) => words)
                .join(', ')}
            </li>
          )}
        </ul>
      )}
      {mayChange && (
        <button type="button" className="min-h-12 font-medium text-blue underline" onClick={() => setOpen(true)}>
          {said.length === 0 ? 'Say what was opened' : 'Change what was opened'}
        </button>
      )}
      {open && <OpenedDialog {...props} onClose={() => setOpen(false)} />}
    </section>
  );
}

/** Untouched, with nothing to add: of a large machine that is most of it, so these share a line. */
const isPlain = ({ condition, text }: { condition: PartCondition; text: string | null }) =>
  condition === 'untouched' && !text;

/** Fields of the dialog; a component without a condition is one of which nothing is said. */
const rowsForm = z.object({
  rows: z.array(
    z.object({ condition: z.union([z.literal(''), z.enum(Object.keys(partConditions))]), text: z.string().max(200) }),
  ),
});

function OpenedDialog(props: OpenedPartsData & { onClose: () => void }) {
  const { jobId, version, parts, conditions, onClose } = props;
  const router = useRouter();
  const { form, submit, problem, sending } = useApiForm({
    schema: rowsForm,
    defaultValues: {
      rows: parts.map(({ id }) => ({ condition: conditions[id]?.condition ?? '', text: conditions[id]?.text ?? '' })),
    },
    send: ({ rows }) =>
      api(`/api/jobs/${jobId}/components`, {
        method: 'PUT',
        version,
        body: Object.fromEntries(
          parts.flatMap(({ id }, index) => {
            const row = rows[index];
            return row && row.condition !== '' ? [[id, row]] : [];
          }),
        ),
      }),
    onDone: () => {
      router.refresh();
      onClose();
    },
  });
  const rows = useWatch({ control: form.control, name: 'rows' });
  const fillRest = (condition: PartCondition) =>
    rows.forEach((row, index) => {
      if (row.condition === '') form.setValue(`rows.${index}.condition`, condition);
    });
  return (
    <Dialog
      open
      onOpenChange={(stays) => !stays && onClose()}
      title="What was opened"
      description="What the work did to each component. It prints, and the plan proposes the tests that follow from it."
    >
      <form onSubmit={submit} noValidate className="grid gap-3">
        <ul>
          {parts.map(({ id, words }, index) => (
            <li
              key={id}
              className="grid items-center gap-x-3 gap-y-1 border-b border-hair py-1.5 sm:grid-cols-[8rem_14rem_1fr]"
            >
              <span>{words}</span>
              <Select aria-label={`${words}: what was done`} {...form.register(`rows.${index}.condition`)}>
                <option value="">nothing said</option>
                {Object.entries(partConditions).map(([value, done]) => (
                  <option key={value} value={value}>
                    {done}
                  </option>
                ))}
              </Select>
              <TextInput
                aria-label={`${words}: in your words`}
                placeholder="In your words"
                maxLength={200}
                {...form.register(`rows.${index}.text`)}
              />
            </li>
          ))}
        </ul>
        <div>
          <Button variant="quiet" onClick={() => fillRest('untouched')}>
            Everything else was untouched
          </Button>
        </div>
        <FormProblem problem={problem} />
        <div className="flex flex-wrap justify-end gap-3">
          <Button onClick={onClose}>Leave as it was</Button>
          <Button type="submit" variant="strong" disabled={sending}>
            Keep what was opened
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
