'use client';

import { type ComponentProps, useState } from 'react';
import { Field } from '@/components/ui/field';
import { Checkbox, TextInput } from '@/components/ui/inputs';

/** A new password or the own one. Pasting is welcome; nothing is demanded of it but length and not being the first guess. */
export function PasswordField(props: ComponentProps<'input'> & { label: string; error?: string; isNew: boolean }) {
  const { label, error, isNew, ...input } = props;
  const [shown, setShown] = useState(false);
  return (
    <div>
      <Field
        label={label}
        error={error}
        hint={isNew ? 'At least 8 characters; 15 or more are better. Four plain words do well.' : undefined}
      >
        <TextInput
          {...input}
          type={shown ? 'text' : 'password'}
          autoComplete={isNew ? 'new-password' : 'current-password'}
        />
      </Field>
      <Checkbox label="Show the password" checked={shown} onChange={(event) => setShown(event.target.checked)} />
    </div>
  );
}
