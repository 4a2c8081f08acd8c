'use client';

import { createContext, type ReactNode, useContext, useId } from 'react';

interface FieldLinks {
  id: string;
  'aria-describedby'?: string;
  'aria-invalid'?: true;
}

const FieldContext = createContext<FieldLinks | null>(null);

/** The ids that tie an input to its label, hint and error; nothing outside a Field. */
export const useFieldLinks = (): Partial<FieldLinks> => useContext(FieldContext) ?? {};

/** Label, input, hint and error belong together for the eye and for a screen reader. */
export function Field(props: {
  label: ReactNode;
  hint?: ReactNode;
  error?: string;
  optional?: boolean;
  className?: string;
  children: ReactNode;
}) {
  const id = useId();
  const { label, hint, error, optional, className, children } = props;
  const describedBy = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ');
  const links: FieldLinks = {
    id,
    ...(describedBy ? { 'aria-describedby': describedBy } : {}),
    ...(error ? { 'aria-invalid': true } : {}),
  };
  return (
    <div className={`grid content-start gap-1 ${className ?? ''}`}>
      <label htmlFor={id} className="font-medium">
        {label}
        {optional && <span className="font-normal text-ink2"> (may stay empty)</span>}
      </label>
      <FieldContext value={links}>{children}</FieldContext>
      {hint && (
        <p id={`${id}-hint`} className="text-sm text-ink2">
          {hint}
        </p>
      )}
      {error && <FieldErrorLine id={`${id}-error`}>{error}</FieldErrorLine>}
    </div>
  );
}

/** Says what is wrong at the place where it is put right. */
export function FieldErrorLine({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <p id={id} className="border-l-4 border-oxide pl-2 text-sm font-medium text-oxide">
      {children}
    </p>
  );
}
