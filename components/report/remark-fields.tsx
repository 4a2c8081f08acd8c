'use client';

import { type UseFormReturn, useFieldArray } from 'react-hook-form';
import type { z } from 'zod';
import { Button } from '@/components/ui/button';
import { Field, FieldErrorLine } from '@/components/ui/field';
import { Select, TextArea, TextInput } from '@/components/ui/inputs';
import type { SignatureForm, signatureForm } from '@/lib/schemas/signature';

export interface RemarkSheet {
  id: string;
  order: number;
  title: string;
}

type Input = z.input<typeof signatureForm>;

export const emptyRemark = { text: '', sheetId: null, owner: '', due: '' };

/** The remarks that go with an acceptance, each for a test or for the whole, with who closes it until when. */
export function RemarkFields(props: {
  form: UseFormReturn<Input, unknown, SignatureForm>;
  sheets: RemarkSheet[];
  errorAt: (path: `remarks` | `remarks.${number}.${'text' | 'sheetId' | 'owner' | 'due'}`) => string | undefined;
}) {
  const { form, sheets, errorAt } = props;
  const { fields, append, remove } = useFieldArray({ control: form.control, name: 'remarks' });
  const whole = errorAt('remarks');
  return (
    <fieldset className="grid min-w-0 gap-4">
      <legend className="mb-1 font-medium">Remarks</legend>
      {fields.map((field, index) => (
        <div key={field.id} className="grid gap-3 border-l-[1.5px] border-ink pl-4">
          <Field label={`Remark ${index + 1}`} error={errorAt(`remarks.${index}.text`)}>
            <TextArea rows={2} {...form.register(`remarks.${index}.text`)} />
          </Field>
          <div className="grid gap-3 sm:grid-cols-2">
            <Field label="About" className="sm:col-span-2" error={errorAt(`remarks.${index}.sheetId`)}>
              <Select {...form.register(`remarks.${index}.sheetId`, { setValueAs: (value: string) => value || null })}>
                <option value="">the whole report</option>
                {sheets.map(({ id, order, title }) => (
                  <option key={id} value={id}>
                    {order} {title}
                  </option>
                ))}
              </Select>
            </Field>
            <Field label="Who closes it" optional error={errorAt(`remarks.${index}.owner`)}>
              <TextInput {...form.register(`remarks.${index}.owner`)} />
            </Field>
            <Field label="Until" optional error={errorAt(`remarks.${index}.due`)}>
              <TextInput type="date" {...form.register(`remarks.${index}.due`)} />
            </Field>
          </div>
          {fields.length > 1 && (
            <div>
              <Button variant="quiet" onClick={() => remove(index)}>
                Take remark {index + 1} out
              </Button>
            </div>
          )}
        </div>
      ))}
      {whole && <FieldErrorLine>{whole}</FieldErrorLine>}
      <div>
        <Button onClick={() => append(emptyRemark)}>Add a remark</Button>
      </div>
    </fieldset>
  );
}
