'use client';

import { Field } from '@/components/ui/field';
import { NumberText, TextInput } from '@/components/ui/inputs';
import { useMachineForm } from './machine-input';

/** What is read off the plate. */
export function NameplateFields() {
  const { register, formState } = useMachineForm();
  const { errors } = formState;
  return (
    <div className="grid gap-4 sm:grid-cols-2 lg:grid-cols-4">
      <Field label="Manufacturer" error={errors.manufacturer?.message}>
        <TextInput {...register('manufacturer')} />
      </Field>
      <Field label="Model" error={errors.model?.message}>
        <TextInput {...register('model')} />
      </Field>
      <Field label="Serial number" hint="As it is printed, dashes and all" error={errors.serialNumber?.message}>
        <TextInput className="font-mono text-lg" {...register('serialNumber')} />
      </Field>
      <Field label="Year" optional error={errors.year?.message}>
        <NumberText {...register('year')} />
      </Field>
      <Field label="Control" optional error={errors.control?.message} className="lg:col-span-2">
        <TextInput {...register('control')} />
      </Field>
      <Field label="Where it stands" optional error={errors.site?.message} className="lg:col-span-2">
        <TextInput {...register('site')} />
      </Field>
    </div>
  );
}
