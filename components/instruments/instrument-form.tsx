'use client';

import { useRouter } from 'next/navigation';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { NumberText, Select, TextInput } from '@/components/ui/inputs';
import { api } from '@/lib/http/api-client';
import { instrumentFields, resolutionUnits } from '@/lib/schemas/instrument';

export interface FormInstrument {
  id: string;
  number: string;
  name: string;
  kind: string;
  resolution: string | null;
  resolutionUnit: string | null;
  version: number;
}

/** Adds an instrument or an artefact, or changes one. */
export function InstrumentForm(props: { instrument?: FormInstrument; kinds: string[]; onDone?: () => void }) {
  const { instrument, kinds, onDone } = props;
  const router = useRouter();
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: instrumentFields,
    defaultValues: {
      number: instrument?.number ?? '',
      name: instrument?.name ?? '',
      kind: instrument?.kind ?? '',
      resolution: instrument?.resolution ?? '',
      resolutionUnit: resolutionUnits.find((unit) => unit === instrument?.resolutionUnit) ?? (instrument ? '' : 'µm'),
    },
    send: async (body, idempotencyKey) => {
      const request = instrument
        ? ({ method: 'PATCH', body, version: instrument.version } as const)
        : ({ method: 'POST', body, idempotencyKey } as const);
      return (await api<{ id: string }>(`/api/instruments${instrument ? `/${instrument.id}` : ''}`, request)).data;
    },
    onDone: ({ id }) => {
      onDone?.();
      router.push(`/instruments/${id}`);
      router.refresh();
    },
  });
  return (
    <form onSubmit={submit} noValidate className="grid max-w-2xl gap-4 sm:grid-cols-2">
      <Field label="Number in your register" error={errorAt('number')}>
        <TextInput className="font-mono" {...form.register('number')} />
      </Field>
      <Field label="Kind" hint="Sheets ask for a kind" error={errorAt('kind')}>
        <TextInput list="instrument-kinds" {...form.register('kind')} />
      </Field>
      <datalist id="instrument-kinds">
        {kinds.map((kind) => (
          <option key={kind} value={kind} />
        ))}
      </datalist>
      <Field label="Name, as it prints" error={errorAt('name')} className="sm:col-span-2">
        <TextInput {...form.register('name')} />
      </Field>
      <Field label="Resolution" hint="Empty for mandrels, squares and the like" error={errorAt('resolution')}>
        <NumberText {...form.register('resolution')} />
      </Field>
      <Field label="Unit" error={errorAt('resolutionUnit')}>
        <Select {...form.register('resolutionUnit')}>
          <option value="">none</option>
          {resolutionUnits.map((unit) => (
            <option key={unit}>{unit}</option>
          ))}
        </Select>
      </Field>
      <div className="grid gap-4 sm:col-span-2">
        <FormProblem problem={problem} />
        <div>
          <Button type="submit" variant="strong" disabled={sending}>
            {sending ? 'Saving' : instrument ? 'Save the instrument' : 'Add the instrument'}
          </Button>
        </div>
      </div>
    </form>
  );
}
