'use client';

import { useState } from 'react';
import { z } from 'zod';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/inputs';
import { api } from '@/lib/http/api-client';
import { planTemplateForm } from '@/lib/schemas/plan-template';

/** Keeps the plan of this job for the next machine of the same model. */
export function KeepTemplate({ jobId, model }: { jobId: string; model: string }) {
  const [open, setOpen] = useState(false);
  const [kept, setKept] = useState<string | null>(null);
  return (
    <section aria-labelledby="template">
      <h2 id="template" className="font-semibold">
        Template
      </h2>
      {kept && (
        <p role="status" className="text-[15px]">
          Kept as “{kept}”: a new plan for a {model} can begin from it.
        </p>
      )}
      <button type="button" className="min-h-12 font-medium text-blue underline" onClick={() => setOpen(true)}>
        Keep this plan as a template
      </button>
      {open && (
        <TemplateDialog
          jobId={jobId}
          model={model}
          onClose={() => setOpen(false)}
          onKept={(name) => {
            setKept(name);
            setOpen(false);
          }}
        />
      )}
    </section>
  );
}

function TemplateDialog(props: { jobId: string; model: string; onClose: () => void; onKept: (name: string) => void }) {
  const { jobId, model, onClose, onKept } = props;
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: z.object({ name: planTemplateForm.shape.name }),
    defaultValues: { name: '' },
    send: ({ name }, idempotencyKey) =>
      api('/api/plan-templates', { method: 'POST', body: { jobId, name }, idempotencyKey }),
    onDone: (_, { name }) => onKept(name),
  });
  return (
    <Dialog
      open
      onOpenChange={(stays) => !stays && onClose()}
      title="Keep this plan as a template"
      description={`For machines of this maker and model, ${model}: which tests are taken, why the others are not, and contract tolerances. The same name replaces an older one.`}
    >
      <form onSubmit={submit} noValidate className="grid gap-4">
        <Field label="Name" hint="What it is for: yearly check, after a collision" error={errorAt('name')}>
          <TextInput {...form.register('name')} />
        </Field>
        <FormProblem problem={problem} />
        <div className="flex flex-wrap justify-end gap-3">
          <Button onClick={onClose}>Do not keep it</Button>
          <Button type="submit" variant="strong" disabled={sending}>
            Keep the template
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
