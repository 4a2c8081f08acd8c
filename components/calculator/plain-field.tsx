'use client';

import { Field } from '@/components/ui/field';
import { NumberText, Select } from '@/components/ui/inputs';
import type { Field as SheetField } from '@/lib/sheet/types';

interface Plain {
  field: SheetField;
  text: string;
  problem: string | undefined;
  onType: (pointer: string, text: string) => void;
}

/** One field with its name, unit and what is wrong with it. */
export function PlainField({ field, text, problem, onType }: Plain) {
  const { pointer, label, unit, options, optional } = field;
  const onChange = (event: { target: { value: string } }) => onType(pointer, event.target.value);
  return (
    <Field label={unit ? `${label}, ${unit}` : label} error={problem} optional={optional}>
      {options ? (
        <Select value={text} onChange={onChange}>
          {options.map(({ value, label: words }) => (
            <option key={value} value={value}>
              {words}
            </option>
          ))}
        </Select>
      ) : (
        <NumberText value={text} onChange={onChange} />
      )}
    </Field>
  );
}
