'use client';

import { Field } from '@/components/ui/field';
import { NumberText, Select } from '@/components/ui/inputs';
import type { ImportChoices } from '@/lib/sheet/text-import/types';
import type { DecimalMark, Separator } from '@/lib/sheet/text-table';

const separators: Record<Separator, string> = {
  tab: 'tabs',
  semicolon: 'semicolons',
  comma: 'commas',
  spaces: 'spaces',
};
const marks: Record<DecimalMark, string> = { point: 'point: 1.5', comma: 'comma: 1,5' };

/** How the text is to be read: guessed from it, put right here. */
export function ShapeChoices(props: { choices: ImportChoices; onChange: (change: Partial<ImportChoices>) => void }) {
  const { choices, onChange } = props;
  return (
    <fieldset className="grid gap-4 sm:grid-cols-3">
      <legend className="mb-1 font-semibold">How it is written</legend>
      <Field label="Columns parted by">
        <Select
          value={choices.separator}
          onChange={(event) => onChange({ separator: event.target.value as Separator })}
        >
          {Object.entries(separators).map(([value, label]) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </Select>
      </Field>
      <Field label="Decimal mark">
        <Select
          value={choices.decimalMark}
          onChange={(event) => onChange({ decimalMark: event.target.value as DecimalMark })}
        >
          {Object.entries(marks).map(([value, label]) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </Select>
      </Field>
      <Field label="Lines to skip at the top">
        <NumberText
          inputMode="numeric"
          value={String(choices.skipLines)}
          onChange={(event) => {
            const digits = event.target.value.replace(/\D/g, '').slice(0, 5);
            onChange({ skipLines: digits === '' ? 0 : Number(digits) });
          }}
        />
      </Field>
    </fieldset>
  );
}
