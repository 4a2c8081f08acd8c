'use client';

import { Field } from '@/components/ui/field';
import { NumberText, Select } from '@/components/ui/inputs';
import type { Chosen, FormOption } from '@/lib/explaining/methods/calculator-form';

/** What is chosen before the fields are drawn: reference, number of turns, judged figure. */
export function OptionFields(props: {
  options: readonly FormOption[];
  chosen: Chosen;
  problems: Record<string, string>;
  onChange: (chosen: Chosen) => void;
}) {
  const { options, chosen, problems, onChange } = props;
  if (options.length === 0) return null;
  return (
    <div className="mb-3 grid gap-x-6 gap-y-3 sm:grid-cols-2 lg:grid-cols-4">
      {options.map((option) => {
        const common = {
          value: chosen[option.name] ?? '',
          onChange: (event: { target: { value: string } }) =>
            onChange({ ...chosen, [option.name]: event.target.value }),
        };
        if (option.kind === 'figure') {
          return (
            <Field
              key={option.name}
              label={`${option.label}, ${option.unit}`}
              error={problems[option.name] || undefined}
            >
              <NumberText {...common} />
            </Field>
          );
        }
        return (
          <Field key={option.name} label={option.label}>
            <Select {...common}>
              {option.choices.map(({ value, label }) => (
                <option key={value} value={value}>
                  {label}
                </option>
              ))}
            </Select>
          </Field>
        );
      })}
    </div>
  );
}
