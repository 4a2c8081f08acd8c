'use client';

import { useRouter } from 'next/navigation';
import { useRef } from 'react';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { FileInput, NumberText, Select, TextInput } from '@/components/ui/inputs';
import { api, uploadFile } from '@/lib/http/api-client';
import { calibrationFields, resolutionUnits } from '@/lib/schemas/instrument';

/** Adds a certificate. */
export function CalibrationForm({ instrumentId }: { instrumentId: string }) {
  const router = useRouter();
  const file = useRef<HTMLInputElement>(null);
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: calibrationFields,
    defaultValues: {
      certificate: '',
      laboratory: '',
      calibratedOn: '',
      dueOn: '',
      expandedUncertainty: '',
      uncertaintyUnit: 'µm',
      coverageFactor: '2',
      fileId: '',
    },
    send: async (body, idempotencyKey) => {
      const chosen = file.current?.files?.[0];
      const fileId = chosen ? await uploadFile('certificate', chosen) : null;
      return api(`/api/instruments/${instrumentId}/calibrations`, {
        method: 'POST',
        body: { ...body, fileId },
        idempotencyKey,
      });
    },
    onDone: () => {
      form.reset();
      if (file.current) file.current.value = '';
      router.refresh();
    },
  });
  return (
    <form onSubmit={submit} noValidate className="grid max-w-3xl gap-4 sm:grid-cols-6">
      <Field label="Certificate" error={errorAt('certificate')} className="sm:col-span-3">
        <TextInput className="font-mono" {...form.register('certificate')} />
      </Field>
      <Field label="Laboratory" optional error={errorAt('laboratory')} className="sm:col-span-3">
        <TextInput {...form.register('laboratory')} />
      </Field>
      <Field label="Calibrated on" error={errorAt('calibratedOn')} className="sm:col-span-3">
        <TextInput type="date" {...form.register('calibratedOn')} />
      </Field>
      <Field label="Due on" hint="The last valid day" error={errorAt('dueOn')} className="sm:col-span-3">
        <TextInput type="date" {...form.register('dueOn')} />
      </Field>
      <Field label="Expanded uncertainty" error={errorAt('expandedUncertainty')} className="sm:col-span-2">
        <NumberText {...form.register('expandedUncertainty')} />
      </Field>
      <Field label="Unit" error={errorAt('uncertaintyUnit')} className="sm:col-span-2">
        <Select {...form.register('uncertaintyUnit')}>
          <option value="">none</option>
          {resolutionUnits.map((unit) => (
            <option key={unit}>{unit}</option>
          ))}
        </Select>
      </Field>
      <Field label="Coverage factor k" error={errorAt('coverageFactor')} className="sm:col-span-2">
        <NumberText {...form.register('coverageFactor')} />
      </Field>
      <Field label="The certificate itself" optional hint="PDF or picture, up to 15 MB" className="sm:col-span-6">
        <FileInput ref={file} accept="application/pdf,image/jpeg,image/png,image/webp" />
      </Field>
      <div className="grid gap-4 sm:col-span-6">
        <FormProblem problem={problem} />
        <div>
          <Button type="submit" variant="strong" disabled={sending}>
            {sending ? 'Adding' : 'Add the certificate'}
          </Button>
        </div>
      </div>
    </form>
  );
}
