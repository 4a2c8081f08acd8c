'use client';

import { useEffect, useState } from 'react';
import { CustomerForm } from '@/components/customers/customer-form';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/inputs';
import { useMachineForm } from './machine-input';

/** The customer that owns the machine; a new one is added on the spot. */
export function OwnerField({ customers }: { customers: { id: string; name: string }[] }) {
  const { register, setValue, formState } = useMachineForm();
  const [added, setAdded] = useState<{ id: string; name: string }[]>([]);
  const [adding, setAdding] = useState(false);
  // After it has been drawn as an option: a list cannot choose what it does not hold.
  useEffect(() => {
    const newest = added.at(-1);
    if (newest) setValue('customerId', newest.id, { shouldDirty: true });
  }, [added, setValue]);
  const known = new Set(customers.map(({ id }) => id));
  const options = [...customers, ...added.filter(({ id }) => !known.has(id))];
  return (
    <div className="flex flex-wrap items-start gap-3">
      <Field label="Customer that owns it" error={formState.errors.customerId?.message} className="min-w-64 flex-1">
        <Select {...register('customerId')}>
          <option value="">Not known yet</option>
          {options.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </Select>
      </Field>
      <Button className="mt-7" onClick={() => setAdding(true)}>
        Add a customer
      </Button>
      <Dialog open={adding} onOpenChange={setAdding} title="Add a customer">
        <CustomerForm
          onDone={(customer) => {
            setAdded((before) => [...before, customer]);
            setAdding(false);
          }}
        />
      </Dialog>
    </div>
  );
}
