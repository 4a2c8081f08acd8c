'use client';

import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { PasswordField } from '@/components/people/password-field';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Select, TextInput } from '@/components/ui/inputs';
import { api } from '@/lib/http/api-client';
import { signIn } from '@/lib/http/sign-in-client';
import { founding } from '@/lib/schemas/organisation';

/** First start: the organisation and its first administrator. */
export function FoundingForm({ timeZones }: { timeZones: string[] }) {
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: founding,
    defaultValues: { organisationName: '', code: '', timeZone: 'UTC', name: '', email: '', password: '' },
    send: async (values) => {
      await api('/api/welcome', { method: 'POST', body: values });
      await signIn(values.email, values.password);
    },
    onDone: () => window.location.assign('/welcome'),
  });
  return (
    <form method="post" onSubmit={submit} noValidate className="grid max-w-3xl gap-4 sm:grid-cols-2">
      <Field label="Name of your organisation" error={errorAt('organisationName')} className="sm:col-span-2">
        <TextInput {...form.register('organisationName')} autoComplete="organization" />
      </Field>
      <Field label="Code before report numbers" hint="QMF gives QMF-2026-000001" error={errorAt('code')}>
        <TextInput {...form.register('code')} className="font-mono uppercase" />
      </Field>
      <Field label="Time zone" hint="Dates on reports are in it" error={errorAt('timeZone')}>
        <Select {...form.register('timeZone')}>
          {timeZones.map((zone) => (
            <option key={zone}>{zone}</option>
          ))}
        </Select>
      </Field>
      <h2 className="mt-4 text-lg font-semibold sm:col-span-2">You, the first administrator</h2>
      <Field label="Your name, as it stands on reports" error={errorAt('name')}>
        <TextInput {...form.register('name')} autoComplete="name" />
      </Field>
      <Field label="Your e-mail address" error={errorAt('email')}>
        <TextInput {...form.register('email')} type="email" autoComplete="username" />
      </Field>
      <div className="sm:col-span-2">
        <PasswordField label="Choose a password" isNew error={errorAt('password')} {...form.register('password')} />
      </div>
      <div className="grid gap-4 sm:col-span-2">
        <FormProblem problem={problem} />
        <Button type="submit" variant="strong" disabled={sending}>
          {sending ? 'Setting up' : 'Go on to the letterhead'}
        </Button>
      </div>
    </form>
  );
}
