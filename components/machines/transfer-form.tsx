'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { Checkbox, Select, TextInput } from '@/components/ui/inputs';
import { api } from '@/lib/http/api-client';
import { transfer } from '@/lib/schemas/machine';

interface TransferProps {
  machineId: string;
  today: string;
  customers: { id: string; name: string }[];
}

/** Hands the machine on: to whom, from which day, and whether the reports of the years before go along. */
export function TransferButton(props: TransferProps) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button small onClick={() => setOpen(true)}>
        Hand on to another owner
      </Button>
      <Dialog open={open} onOpenChange={setOpen} title="Hand the machine on">
        <TransferForm {...props} onDone={() => setOpen(false)} />
      </Dialog>
    </>
  );
}

function TransferForm({ machineId, today, customers, onDone }: TransferProps & { onDone: () => void }) {
  const router = useRouter();
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: transfer,
    defaultValues: { customerId: '', fromDate: today, seesHistory: false },
    send: (body, idempotencyKey) => api(`/api/machines/${machineId}/owners`, { method: 'POST', body, idempotencyKey }),
    onDone: () => {
      onDone();
      router.refresh();
    },
  });
  return (
    <form onSubmit={submit} noValidate className="grid gap-4">
      <Field label="New owner" error={errorAt('customerId')}>
        <Select {...form.register('customerId')}>
          <option value="">Choose</option>
          {customers.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </Select>
      </Field>
      <Field label="Owns it from" error={errorAt('fromDate')}>
        <TextInput type="date" {...form.register('fromDate')} />
      </Field>
      <Checkbox
        label="May see the reports of the years before"
        hint="The owner before keeps what was measured for it in any case."
        {...form.register('seesHistory')}
      />
      <FormProblem problem={problem} />
      <div>
        <Button type="submit" variant="strong" disabled={sending}>
          {sending ? 'Handing on' : 'Hand it on'}
        </Button>
      </div>
    </form>
  );
}
