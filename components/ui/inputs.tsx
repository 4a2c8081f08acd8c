'use client';

import type { ComponentProps } from 'react';
import { useFieldLinks } from './field';

const box =
  'min-h-12 w-full rounded border-[1.5px] border-ink2 bg-leaf px-3 text-ink focus:border-blue focus:bg-blue-wash aria-invalid:border-oxide disabled:border-line disabled:text-ink2';

/** One line of text. Browsers must not correct what is read off a nameplate. */
export function TextInput({ className = '', ...rest }: ComponentProps<'input'>) {
  return (
    <input
      type="text"
      autoComplete="off"
      spellCheck={false}
      {...useFieldLinks()}
      className={`${box} ${className}`}
      {...rest}
    />
  );
}

/** A figure kept as the text that was typed. No numeric keyboard: those of some tablets lack the minus. */
export function NumberText({ className = '', ...rest }: ComponentProps<'input'>) {
  return <TextInput className={`text-right font-mono tabular-nums ${className}`} enterKeyHint="next" {...rest} />;
}

export function TextArea({ className = '', rows = 3, ...rest }: ComponentProps<'textarea'>) {
  return <textarea rows={rows} {...useFieldLinks()} className={`${box} py-2.5 ${className}`} {...rest} />;
}

/** The browser's own list: it works with gloves, a screen reader and a keyboard alike. */
export function Select({ className = '', ...rest }: ComponentProps<'select'>) {
  return <select {...useFieldLinks()} className={`${box} ${className}`} {...rest} />;
}

/** Chooses a file; on a tablet the camera is among the choices. */
export function FileInput({ className = '', ...rest }: ComponentProps<'input'>) {
  return (
    <input
      type="file"
      {...useFieldLinks()}
      className={`min-h-12 w-full text-[15px] file:mr-3 file:min-h-12 file:rounded file:border-[1.5px] file:border-solid file:border-blue file:bg-transparent file:px-4 file:font-medium file:text-blue ${className}`}
      {...rest}
    />
  );
}

export function Checkbox({
  label,
  hint,
  className = '',
  ...rest
}: ComponentProps<'input'> & { label: string; hint?: string }) {
  return <Tick type="checkbox" label={label} hint={hint} className={className} {...rest} />;
}

export function Radio({
  label,
  hint,
  className = '',
  ...rest
}: ComponentProps<'input'> & { label: string; hint?: string }) {
  return <Tick type="radio" label={label} hint={hint} className={className} {...rest} />;
}

function Tick({ label, hint, className, ...rest }: ComponentProps<'input'> & { label: string; hint?: string }) {
  return (
    <label className={`flex min-h-12 items-center gap-3 ${className}`}>
      <input className="size-6 shrink-0 accent-blue" {...rest} />
      <span>
        {label}
        {hint && <span className="block text-sm text-ink2">{hint}</span>}
      </span>
    </label>
  );
}
