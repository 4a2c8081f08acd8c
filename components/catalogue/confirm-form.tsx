'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Field, FieldErrorLine } from '@/components/ui/field';
import { Checkbox, NumberText, Radio, TextArea, TextInput } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import { api } from '@/lib/http/api-client';
import type { ToleranceCell } from '@/lib/planning/organisation-values';
import { toleranceValueStates, toleranceValuesForm } from '@/lib/schemas/tolerance-value';

interface Typed {
  state: keyof typeof toleranceValueStates;
  cells: { cell: string; figure?: string }[];
  ofEdition?: string;
  clause?: string;
  remark?: string | null;
}

/** What is sent: a figure only where one is put in, a place only where something is said to stand there. */
function shaped({ state, cells, ofEdition, clause, remark }: Typed): Typed {
  const bare = cells.map(({ cell }) => ({ cell }));
  if (state === 'withdrawn') return { state, cells: bare, remark };
  const named = cells.map(({ cell, figure }) => ({ cell, figure: figure ?? '' }));
  return { state, cells: state === 'replaced' ? named : bare, ofEdition, clause, remark };
}

/** Says the same of several figures at once, since they stand in one clause. */
export function ConfirmForm(props: {
  address: { code: string; test: string };
  cells: ToleranceCell[];
  fourEyes: boolean;
}) {
  const { address, cells, fourEyes } = props;
  const router = useRouter();
  const [kept, setKept] = useState(false);
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: toleranceValuesForm,
    defaultValues: {
      state: 'confirmed',
      cells: cells.map(({ cell }) => ({ cell })),
      ofEdition: '',
      clause: '',
      remark: '',
    },
    prepare: (values) => shaped(values as Typed) as typeof values,
    send: (values) => {
      setKept(false);
      const path = `/api/catalogue/${encodeURIComponent(address.code)}/${encodeURIComponent(address.test)}/values`;
      return api(path, { method: 'POST', body: values });
    },
    onDone: () => {
      setKept(true);
      router.refresh();
    },
  });
  const { register, setValue, watch } = form;
  const state = watch('state');
  const chosen = (watch('cells') ?? []) as Typed['cells'];
  const choose = (cell: string, wanted: boolean) => {
    const next = wanted ? [...chosen, { cell }] : chosen.filter((one) => one.cell !== cell);
    // In the order of the table, whatever was ticked first.
    const order = (one: Typed['cells'][number]) => cells.findIndex((each) => each.cell === one.cell);
    setValue('cells', next.sort((a, b) => order(a) - order(b)) as never, {
      shouldValidate: form.formState.isSubmitted,
    });
  };
  return (
    <details className="mt-4 border-y border-line" open={kept || undefined}>
      <summary className="flex min-h-12 items-center font-semibold text-blue">
        <span aria-hidden="true" className="mr-2">
          ▸
        </span>
        Confirm, replace or withdraw
      </summary>
      <form onSubmit={submit} noValidate className="grid gap-4 pb-4 sm:grid-cols-2">
        <fieldset className="sm:col-span-2">
          <legend className="font-medium">Which figures</legend>
          <div className="grid gap-x-8 sm:grid-cols-2">
            {cells.map(({ cell, words, toleranceUm, unit }) => (
              <Checkbox
                key={cell}
                label={words}
                hint={`catalogue: ${toleranceUm} ${unit}`}
                checked={chosen.some((one) => one.cell === cell)}
                onChange={(event) => choose(cell, event.target.checked)}
              />
            ))}
          </div>
          {errorAt('cells') && <FieldErrorLine>{errorAt('cells')}</FieldErrorLine>}
        </fieldset>
        <fieldset className="sm:col-span-2">
          <legend className="font-medium">What you say of them</legend>
          {Object.entries(toleranceValueStates).map(([value, words]) => (
            <Radio key={value} value={value} label={words} {...register('state')} />
          ))}
        </fieldset>
        {state === 'replaced' && (
          <div className="grid gap-3 sm:col-span-2 sm:grid-cols-2 lg:grid-cols-3">
            {chosen.map(({ cell }, index) => {
              const of = cells.find((one) => one.cell === cell);
              const path = `cells.${index}.figure` as never;
              return (
                <Field key={cell} label={`${of?.words ?? cell}, ${of?.unit}`} error={errorAt(path)}>
                  <NumberText {...register(path)} />
                </Field>
              );
            })}
          </div>
        )}
        {state !== 'withdrawn' && (
          <>
            <Field label="Edition of your copy" error={errorAt('ofEdition' as never)} hint="As on its title page">
              <TextInput {...register('ofEdition' as never)} />
            </Field>
            <Field label="Page or clause" error={errorAt('clause' as never)}>
              <TextInput {...register('clause' as never)} />
            </Field>
          </>
        )}
        <Field label="Remark" optional error={errorAt('remark')} className="sm:col-span-2">
          <TextArea rows={2} {...register('remark')} />
        </Field>
        <div className="grid gap-3 sm:col-span-2">
          {fourEyes && state !== 'withdrawn' && (
            <p className="text-sm text-ink2">It holds when a second person has looked it up too.</p>
          )}
          <FormProblem problem={problem} />
          {kept && (
            <Notice title="Written down" live>
              Plans that are made from now on use it as it stands in the table.
            </Notice>
          )}
          <div>
            <Button type="submit" variant="strong" disabled={sending}>
              {sending ? 'Saving' : 'Write it down'}
            </Button>
          </div>
        </div>
      </form>
    </details>
  );
}
