'use client';

import { useRouter } from 'next/navigation';
import type { z } from 'zod';
import { CodeChoice, type OfferedCode } from '@/components/forms/code-choice';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Field, FieldErrorLine } from '@/components/ui/field';
import { Checkbox, NumberText, Radio, Select, TextArea, TextInput } from '@/components/ui/inputs';
import { api } from '@/lib/http/api-client';
import { decisionRules, jobForm, purposes } from '@/lib/schemas/job';

export interface JobFormData {
  defaults: z.input<typeof jobForm>;
  customers: { id: string; name: string }[];
  members: { id: string; name: string; functionTitle: string | null; roles: string[] }[];
  /** Fields that were taken over, and from where: said at each of them. */
  takenOver: Partial<Record<keyof z.input<typeof jobForm>, string>>;
  lastReference: string | null;
  offeredCodes: OfferedCode[];
}

/** Opens a job on a machine. What the last visit said is proposed, and marked as such. */
export function JobForm({ data }: { data: JobFormData }) {
  const { defaults, customers, members, takenOver, lastReference } = data;
  const router = useRouter();
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: jobForm,
    defaultValues: defaults,
    send: async (values, idempotencyKey) =>
      (await api<{ id: string }>('/api/jobs', { method: 'POST', body: values, idempotencyKey })).data,
    onDone: ({ id }) => router.push(`/jobs/${id}/plan`),
  });
  const { register } = form;
  return (
    <form onSubmit={submit} noValidate className="grid max-w-4xl gap-x-8 gap-y-5 sm:grid-cols-2">
      <Field
        label="Reference"
        error={errorAt('reference')}
        hint={
          lastReference
            ? `Your own number of the job. The newest one is ${lastReference}.`
            : 'Your own number of the job.'
        }
      >
        <TextInput className="font-mono" {...register('reference')} />
      </Field>
      <Field label="Customer" error={errorAt('customerId')} hint={takenOver.customerId}>
        <Select {...register('customerId')}>
          <option value="">Choose the customer</option>
          {customers.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </Select>
      </Field>
      <fieldset className="sm:col-span-2">
        <legend className="font-medium">Purpose</legend>
        <div className="grid gap-x-8 sm:grid-cols-2 lg:grid-cols-3">
          {Object.entries(purposes).map(([value, words]) => (
            <Radio key={value} value={value} label={words} {...register('purpose')} />
          ))}
        </div>
        {errorAt('purpose') && <FieldErrorLine>{errorAt('purpose')}</FieldErrorLine>}
      </fieldset>
      <Field label="What is done" error={errorAt('scope')} optional className="sm:col-span-2">
        <TextArea rows={2} {...register('scope')} />
      </Field>
      <Field label="First day" error={errorAt('startsOn')}>
        <TextInput type="date" {...register('startsOn')} />
      </Field>
      <Field label="Last day" error={errorAt('endsOn')} optional>
        <TextInput type="date" {...register('endsOn')} />
      </Field>
      <Field label="Customer’s order" error={errorAt('customerOrder')} optional>
        <TextInput {...register('customerOrder')} />
      </Field>
      <Field label="Customer’s engineer" error={errorAt('customerEngineer')} hint={takenOver.customerEngineer} optional>
        <TextInput {...register('customerEngineer')} />
      </Field>
      <Field label="Place" error={errorAt('place')} hint={takenOver.place} optional>
        <TextInput {...register('place')} />
      </Field>
      <Field label="Hours run" error={errorAt('hours')} optional>
        <NumberText {...register('hours')} />
      </Field>
      <fieldset className="sm:col-span-2">
        <legend className="font-medium">Decision rule</legend>
        {Object.entries(decisionRules).map(([value, words]) => (
          <Radio key={value} value={value} label={words} {...register('decisionRule')} />
        ))}
        {takenOver.decisionRule && <p className="text-sm text-ink2">{takenOver.decisionRule}</p>}
      </fieldset>
      <div className="sm:col-span-2">
        <CodeChoice
          offered={data.offeredCodes}
          chosen={form.watch('codes') ?? []}
          onChoose={(next) => form.setValue('codes', next, { shouldValidate: form.formState.isSubmitted })}
          hint="The plan is made of their tests; the job keeps these editions."
          error={errorAt('codes')}
        />
      </div>
      <div className="sm:col-span-2">
        <Checkbox
          label="Take confirmed tolerances only"
          hint="The plan refuses a test whose tolerance is neither confirmed by you nor given by the contract."
          {...register('refuseUnconfirmed')}
        />
      </div>
      <People members={members} form={form} hint={takenOver.people} />
      <div className="grid gap-4 sm:col-span-2">
        {errorAt('machineId') && <FieldErrorLine>{errorAt('machineId')}</FieldErrorLine>}
        <FormProblem problem={problem} />
        <div>
          <Button type="submit" variant="strong" disabled={sending}>
            Open the job
          </Button>
        </div>
      </div>
    </form>
  );
}

const parts = [
  { role: 'inspector' as const, title: 'Who measures' },
  { role: 'reviewer' as const, title: 'Who has the check' },
];

function People(props: {
  members: JobFormData['members'];
  form: ReturnType<typeof useApiForm<typeof jobForm>>['form'];
  hint: string | undefined;
}) {
  const { members, form, hint } = props;
  const people = form.watch('people') ?? [];
  const toggle = (member: JobFormData['members'][number], role: 'inspector' | 'reviewer', chosen: boolean) =>
    form.setValue(
      'people',
      chosen
        ? [...people, { membershipId: member.id, name: member.name, role }]
        : people.filter((one) => !(one.membershipId === member.id && one.role === role)),
    );
  return (
    <>
      {parts.map(({ role, title }) => (
        <fieldset key={role}>
          <legend className="font-medium">{title}</legend>
          {members
            .filter(({ roles }) => roles.includes(role))
            .map((member) => (
              <Checkbox
                key={member.id}
                label={member.name}
                hint={member.functionTitle ?? undefined}
                checked={people.some((one) => one.membershipId === member.id && one.role === role)}
                onChange={(event) => toggle(member, role, event.target.checked)}
              />
            ))}
        </fieldset>
      ))}
      {hint && <p className="text-sm text-ink2 sm:col-span-2">{hint}</p>}
    </>
  );
}
