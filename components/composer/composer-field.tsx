'use client';

import { Field } from '@/components/ui/field';
import { NumberText, Select, TextArea, TextInput } from '@/components/ui/inputs';
import { at, type ComposerForm } from './composer-form';

/** One field of the composer with its label, hint and problem. */
export function ComposerField(props: {
  api: ComposerForm;
  path: string;
  label: string;
  hint?: string;
  optional?: boolean;
  /** Lines of text; a figure; one of a list; otherwise one line. */
  rows?: number;
  figure?: boolean;
  mono?: boolean;
  options?: { value: string; label: string }[];
  onPick?: (value: string) => void;
  className?: string;
}) {
  const { api, path, label, hint, optional, rows, figure, mono, options, onPick, className } = props;
  const registered = api.form.register(at(path), onPick ? { onChange: (event) => onPick(event.target.value) } : {});
  return (
    <Field label={label} hint={hint} optional={optional} error={api.errorAt(at(path))} className={className}>
      {options ? (
        <Select {...registered}>
          {options.map(({ value, label: words }) => (
            <option key={value} value={value}>
              {words}
            </option>
          ))}
        </Select>
      ) : rows ? (
        <TextArea rows={rows} {...registered} />
      ) : figure ? (
        <NumberText {...registered} />
      ) : (
        <TextInput className={mono ? 'font-mono' : ''} {...registered} />
      )}
    </Field>
  );
}
