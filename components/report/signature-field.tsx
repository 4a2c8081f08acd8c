'use client';

import { useId } from 'react';
import { FieldErrorLine } from '@/components/ui/field';
import { Radio, TextInput } from '@/components/ui/inputs';
import { SignaturePad } from './signature-pad';

export type SignatureWay = 'drawn' | 'typed';

/** Drawn or typed, both count the same; everything works with the keyboard alone. */
export function SignatureField(props: {
  way: SignatureWay;
  onWay: (way: SignatureWay) => void;
  strokes: string[];
  onStrokes: (strokes: string[]) => void;
  typed: string;
  onTyped: (typed: string) => void;
  error?: string;
}) {
  const { way, onWay, strokes, onStrokes, typed, onTyped, error } = props;
  const id = useId();
  return (
    <fieldset className="min-w-0" aria-describedby={error ? `${id}-error` : undefined}>
      <legend className="font-medium">Signature</legend>
      <div className="flex flex-wrap gap-x-8">
        <Radio
          name={`${id}-way`}
          label="Draw it with finger, pen or mouse"
          checked={way === 'drawn'}
          onChange={() => onWay('drawn')}
        />
        <Radio name={`${id}-way`} label="Type the name" checked={way === 'typed'} onChange={() => onWay('typed')} />
      </div>
      {way === 'drawn' ? (
        <>
          <p className="mb-1 text-sm text-ink2">Sign on the line in this field</p>
          <SignaturePad strokes={strokes} onChange={onStrokes} />
        </>
      ) : (
        <div className="grid max-w-[37.5rem] gap-1">
          <label htmlFor={`${id}-typed`} className="text-sm text-ink2">
            Your name, typed as your signature
          </label>
          <TextInput
            id={`${id}-typed`}
            value={typed}
            maxLength={120}
            aria-invalid={error ? true : undefined}
            className="text-xl"
            onChange={(event) => onTyped(event.target.value)}
          />
        </div>
      )}
      {error && (
        <div className="mt-1">
          <FieldErrorLine id={`${id}-error`}>{error}</FieldErrorLine>
        </div>
      )}
    </fieldset>
  );
}
