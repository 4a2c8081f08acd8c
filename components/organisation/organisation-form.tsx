'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Radio, Select, TextArea, TextInput } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import { api } from '@/lib/http/api-client';
import { organisationFields } from '@/lib/schemas/organisation';

interface Letterhead {
  name: string;
  code: string;
  addressLines: string[];
  contact: string | null;
  timeZone: string;
  paper: 'A4' | 'Letter';
  version: number;
}

/** Letterhead and defaults; in the first start with `goOnTo`, where it leads next. */
export function OrganisationForm(props: { organisation: Letterhead; timeZones: string[]; goOnTo?: string }) {
  const router = useRouter();
  const { organisation, timeZones, goOnTo } = props;
  const [saved, setVersion] = useState(organisation.version);
  // Another form of the page may have saved meanwhile; what is typed here stays.
  const version = Math.max(saved, organisation.version);
  const [kept, setKept] = useState(false);
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: organisationFields,
    defaultValues: {
      name: organisation.name,
      code: organisation.code,
      addressLines: organisation.addressLines.join('\n'),
      contact: organisation.contact ?? '',
      timeZone: organisation.timeZone,
      paper: organisation.paper,
    },
    send: (values) => {
      setKept(false);
      return api<Letterhead>('/api/organisation', { method: 'PATCH', body: values, version });
    },
    onDone: ({ data }) => {
      setVersion(data.version);
      if (goOnTo) return router.push(goOnTo);
      setKept(true);
      router.refresh();
    },
  });
  return (
    <form onSubmit={submit} noValidate className="grid max-w-3xl gap-4 sm:grid-cols-2">
      <Field label="Name on the letterhead" error={errorAt('name')} className="sm:col-span-2">
        <TextInput {...form.register('name')} autoComplete="organization" />
      </Field>
      <Field label="Address, a line each" optional error={errorAt('addressLines')}>
        <TextArea rows={4} {...form.register('addressLines')} />
      </Field>
      <Field label="Contact line" optional hint="Telephone, e-mail, web" error={errorAt('contact')}>
        <TextInput {...form.register('contact')} />
      </Field>
      <Field
        label="Code before report numbers"
        hint="Reports that are issued keep their number"
        error={errorAt('code')}
      >
        <TextInput {...form.register('code')} className="font-mono uppercase" />
      </Field>
      <Field label="Time zone" hint="Dates on reports are in it" error={errorAt('timeZone')}>
        <Select {...form.register('timeZone')}>
          {timeZones.map((zone) => (
            <option key={zone}>{zone}</option>
          ))}
        </Select>
      </Field>
      <fieldset className="sm:col-span-2">
        <legend className="font-medium">Paper of the reports</legend>
        <div className="flex gap-x-8">
          <Radio label="A4" value="A4" {...form.register('paper')} />
          <Radio label="Letter" value="Letter" {...form.register('paper')} />
        </div>
      </fieldset>
      <div className="grid gap-4 sm:col-span-2">
        <FormProblem problem={problem} />
        {kept && (
          <Notice title="Saved" live>
            The next report is issued with it.
          </Notice>
        )}
        <div>
          <Button type="submit" variant="strong" disabled={sending}>
            {sending ? 'Saving' : goOnTo ? 'Save and go on' : 'Save'}
          </Button>
        </div>
      </div>
    </form>
  );
}
