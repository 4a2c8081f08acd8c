'use client';

import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/inputs';
import { api } from '@/lib/http/api-client';
import { signIn } from '@/lib/http/sign-in-client';
import { acceptance, acceptanceWithAccount } from '@/lib/schemas/people';
import { PasswordField } from './password-field';

/** The invited person's side: name, function, and a new password or the one that the address has already. */
export function AcceptanceForm(props: { token: string; name: string; hasAccount: boolean }) {
  const { token, name, hasAccount } = props;
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: hasAccount ? acceptanceWithAccount : acceptance,
    defaultValues: { token, name, functionTitle: '', password: '' },
    send: async (values) => {
      const { data } = await api<{ email: string }>('/api/invitations/accept', { method: 'POST', body: values });
      await signIn(data.email, values.password);
    },
    onDone: () => window.location.assign('/'),
  });
  return (
    <form method="post" onSubmit={submit} noValidate className="grid max-w-md gap-4">
      <Field label="Your name, as it stands on reports" error={errorAt('name')}>
        <TextInput {...form.register('name')} autoComplete="name" />
      </Field>
      <Field label="Your function" optional error={errorAt('functionTitle')}>
        <TextInput {...form.register('functionTitle')} autoComplete="organization-title" />
      </Field>
      <PasswordField
        label={hasAccount ? 'Your password' : 'Choose a password'}
        isNew={!hasAccount}
        error={errorAt('password')}
        {...form.register('password')}
      />
      <FormProblem problem={problem} />
      <Button type="submit" variant="strong" disabled={sending}>
        {sending ? 'Joining' : 'Accept the invitation'}
      </Button>
    </form>
  );
}
