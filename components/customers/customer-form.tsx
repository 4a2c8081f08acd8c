'use client';

import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { TextArea, TextInput } from '@/components/ui/inputs';
import { api } from '@/lib/http/api-client';
import { customerFields } from '@/lib/schemas/customer';

export interface CustomerLine {
  id: string;
  name: string;
  addressLines: string[];
  contact: string | null;
  email: string | null;
  version: number;
}

/** Adds a customer, or changes one. */
export function CustomerForm(props: {
  customer?: CustomerLine;
  onDone: (customer: { id: string; name: string }) => void;
}) {
  const { customer, onDone } = props;
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: customerFields,
    defaultValues: {
      name: customer?.name ?? '',
      addressLines: customer?.addressLines.join('\n') ?? '',
      contact: customer?.contact ?? '',
      email: customer?.email ?? '',
    },
    send: async (body, idempotencyKey) => {
      const path = customer ? `/api/customers/${customer.id}` : '/api/customers';
      const request = customer
        ? ({ method: 'PATCH', body, version: customer.version } as const)
        : ({ method: 'POST', body, idempotencyKey } as const);
      return (await api<{ id: string; name: string }>(path, request)).data;
    },
    onDone,
  });
  return (
    <form
      noValidate
      className="grid max-w-xl gap-4"
      onSubmit={(event) => {
        // It may stand in a dialog above another form.
        event.stopPropagation();
        return submit(event);
      }}
    >
      <Field label="Name" error={errorAt('name')}>
        <TextInput {...form.register('name')} />
      </Field>
      <Field label="Address, a line each" optional error={errorAt('addressLines')}>
        <TextArea {...form.register('addressLines')} />
      </Field>
      <Field label="Whom to ask for" optional error={errorAt('contact')}>
        <TextInput {...form.register('contact')} />
      </Field>
      <Field label="E-mail address" optional error={errorAt('email')}>
        <TextInput type="email" {...form.register('email')} />
      </Field>
      <FormProblem problem={problem} />
      <div>
        <Button type="submit" variant="strong" disabled={sending}>
          {sending ? 'Saving' : customer ? 'Save the customer' : 'Add the customer'}
        </Button>
      </div>
    </form>
  );
}
