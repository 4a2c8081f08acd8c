'use client';

import { Field } from '@/components/ui/field';
import { NumberText, Select } from '@/components/ui/inputs';
import { useMachineForm } from './machine-input';

const sizes = [
  ['distanceBetweenCentresMm', 'Distance between centres'],
  ['swingOverBedMm', 'Swing over bed'],
  ['swingOverCrossSlideMm', 'Swing over cross slide'],
  ['chuckDiameterMm', 'Chuck diameter'],
  ['barDiameterMm', 'Bar diameter'],
] as const;

/** The one size by which the builder classes the machine, and the others as far as they are known. All in mm. */
export function SizeFields() {
  const { register, formState } = useMachineForm();
  const errors = formState.errors.makeUp;
  return (
    <fieldset>
      <legend className="font-semibold">Sizes, in mm</legend>
      <p className="text-sm text-ink2">Tolerances are found by the size class. Of the other sizes, what is known.</p>
      <div className="mt-2 grid gap-4 sm:grid-cols-3">
        <Field label="Size class by" error={errors?.sizeClass?.criterion?.message} className="sm:col-span-2">
          <Select {...register('makeUp.sizeClass.criterion')}>
            <option value="chuck-diameter">chuck diameter</option>
            <option value="bar-diameter">bar diameter</option>
            <option value="swing-over-bed">swing over bed</option>
          </Select>
        </Field>
        <Field label="That size" error={errors?.sizeClass?.valueMm?.message}>
          <NumberText {...register('makeUp.sizeClass.valueMm')} />
        </Field>
        {sizes.map(([name, label]) => (
          <Field key={name} label={label} error={errors?.[name]?.message}>
            <NumberText {...register(`makeUp.${name}`)} />
          </Field>
        ))}
      </div>
    </fieldset>
  );
}
