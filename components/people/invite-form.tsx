'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Field, FieldErrorLine } from '@/components/ui/field';
import { Checkbox, Select, TextInput } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import { roles } from '@/lib/auth/permissions';
import { api } from '@/lib/http/api-client';
import { invitation, roleWords } from '@/lib/schemas/people';

/** Asks somebody by e-mail to join. */
export function InviteForm({ customers }: { customers: { id: string; name: string }[] }) {
  const router = useRouter();
  const [invited, setInvited] = useState<string | null>(null);
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: invitation,
    defaultValues: { email: '', name: '', roles: ['inspector'], customerId: '' },
    send: (values, idempotencyKey) => {
      setInvited(null);
      return api('/api/invitations', { method: 'POST', body: values, idempotencyKey });
    },
    onDone: (_, values) => {
      setInvited(values.email);
      form.reset();
      router.refresh();
    },
  });
  const forCustomer = form.watch('roles').includes('customer');
  return (
    <form onSubmit={submit} noValidate className="grid max-w-3xl gap-4 sm:grid-cols-2">
      <Field label="E-mail address" error={errorAt('email')}>
        <TextInput type="email" {...form.register('email')} />
      </Field>
      <Field label="Name" error={errorAt('name')}>
        <TextInput {...form.register('name')} />
      </Field>
      <fieldset className="sm:col-span-2">
        <legend className="font-medium">Roles</legend>
        <div className="grid gap-x-6 sm:grid-cols-2">
          {roles.map((role) => (
            <Checkbox
              key={role}
              value={role}
              label={roleWords[role].name}
              hint={roleWords[role].does}
              {...form.register('roles')}
            />
          ))}
        </div>
        {errorAt('roles') && <FieldErrorLine>{errorAt('roles')}</FieldErrorLine>}
      </fieldset>
      {forCustomer && (
        <Field label="For which customer" error={errorAt('customerId')}>
          <Select {...form.register('customerId')}>
            <option value="">Choose</option>
            {customers.map((customer) => (
              <option key={customer.id} value={customer.id}>
                {customer.name}
              </option>
            ))}
          </Select>
        </Field>
      )}
      <div className="grid gap-4 sm:col-span-2">
        <FormProblem problem={problem} />
        {invited && (
          <Notice title="Invited" live>
            A mail is on its way to {invited}. The link in it holds for seven days.
          </Notice>
        )}
        <div>
          <Button type="submit" variant="strong" disabled={sending}>
            {sending ? 'Inviting' : 'Send the invitation'}
          </Button>
        </div>
      </div>
    </form>
  );
}
