'use client';

import { FieldErrorLine } from '@/components/ui/field';
import { Checkbox } from '@/components/ui/inputs';
import { at, type ComposerForm } from './composer-form';

/** Several of a list, each a tick. */
export function TickList(props: {
  api: ComposerForm;
  path: string;
  legend: string;
  hint?: string;
  options: { value: string; label: string }[];
}) {
  const { api, path, legend, hint, options } = props;
  const chosen = (api.form.watch(at(path)) ?? []) as unknown as string[];
  const toggle = (value: string, wanted: boolean) =>
    api.form.setValue(
      at(path),
      options
        .map((option) => option.value)
        .filter((one) => (one === value ? wanted : chosen.includes(one))) as unknown as string,
      { shouldValidate: api.form.formState.isSubmitted },
    );
  const error = api.errorAt(at(path));
  return (
    <fieldset>
      <legend className="font-medium">{legend}</legend>
      {hint && <p className="text-sm text-ink2">{hint}</p>}
      <div className="flex flex-wrap gap-x-6">
        {options.map(({ value, label }) => (
          <Checkbox
            key={value}
            label={label}
            checked={chosen.includes(value)}
            onChange={(event) => toggle(value, event.target.checked)}
          />
        ))}
      </div>
      {error && <FieldErrorLine>{error}</FieldErrorLine>}
    </fieldset>
  );
}
