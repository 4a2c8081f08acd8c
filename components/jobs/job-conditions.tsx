'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { TextArea } from '@/components/ui/inputs';
import { api } from '@/lib/http/api-client';
import { conditionLabels } from '@/lib/reporting/record-words';
import { type Conditions, conditionsForm } from '@/lib/schemas/job';

const hints: Record<keyof Conditions, string> = {
  warmUp: 'What ran, how long, since when',
  compensation: 'What was on: lost motion, pitch, temperature',
  level: 'Along and across, and when it was taken',
  coolant: 'On or off, and its temperature',
  notes: 'Anything else a reader must know',
};
const names = Object.keys(conditionLabels) as (keyof Conditions)[];

/** What stood around the measurement. Every line prints. */
export function JobConditions(props: {
  jobId: string;
  version: number;
  conditions: Partial<Conditions>;
  mayChange: boolean;
}) {
  const { conditions, mayChange } = props;
  const [open, setOpen] = useState(false);
  const written = names.filter((name) => conditions[name]);
  return (
    <section aria-labelledby="conditions">
      <h2 id="conditions" className="font-semibold">
        Conditions
      </h2>
      {written.length === 0 ? (
        <p className="text-ink2">Not described yet.</p>
      ) : (
        <dl className="grid gap-1 text-[15px]">
          {written.map((name) => (
            <div key={name}>
              <dt className="inline text-ink2">{conditionLabels[name]}: </dt>
              <dd className="inline">{conditions[name]}</dd>
            </div>
          ))}
        </dl>
      )}
      {mayChange && (
        <button type="button" className="min-h-12 font-medium text-blue underline" onClick={() => setOpen(true)}>
          {written.length === 0 ? 'Describe the conditions' : 'Change the conditions'}
        </button>
      )}
      {open && <ConditionsDialog {...props} onClose={() => setOpen(false)} />}
    </section>
  );
}

function ConditionsDialog(props: {
  jobId: string;
  version: number;
  conditions: Partial<Conditions>;
  onClose: () => void;
}) {
  const { jobId, version, conditions, onClose } = props;
  const router = useRouter();
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: conditionsForm,
    defaultValues: Object.fromEntries(names.map((name) => [name, conditions[name] ?? ''])),
    send: (values) => api(`/api/jobs/${jobId}/conditions`, { method: 'PUT', version, body: values }),
    onDone: () => {
      router.refresh();
      onClose();
    },
  });
  return (
    <Dialog open onOpenChange={(stays) => !stays && onClose()} title="Conditions" description="Every line prints.">
      <form onSubmit={submit} noValidate className="grid gap-4">
        {names.map((name) => (
          <Field key={name} label={conditionLabels[name]} hint={hints[name]} error={errorAt(name)} optional>
            <TextArea rows={2} {...form.register(name)} />
          </Field>
        ))}
        <FormProblem problem={problem} />
        <div className="flex flex-wrap justify-end gap-3">
          <Button onClick={onClose}>Leave as it was</Button>
          <Button type="submit" variant="strong" disabled={sending}>
            Keep the conditions
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
