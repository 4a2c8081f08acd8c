'use client';

import { useCallback } from 'react';
import type { Field } from '@/lib/sheet/types';
import { fieldId, fieldLabel, problemAt, problemId } from './field-problem';
import { readAs } from './read-as';
import { useEvaluated, useOpenPass } from './sheet-context';

const looks: Record<Field['role'], string> = {
  reading: 'min-w-16 sm:min-w-20 border-line bg-leaf text-xl',
  'set-up': 'min-w-14 border-line text-base text-ink2',
  choice: 'border-ink2 bg-leaf text-base',
};
const box =
  'ml-auto block h-12 w-full max-w-52 rounded border-[1.5px] px-2 focus:border-blue focus:bg-blue-wash focus:text-ink aria-invalid:border-oxide';

/** One field: an uncontrolled input; what happens in it is handled by the table around it (use-entry.ts). */
export function ReadingCell({ field, framed }: { field: Field; framed?: boolean }) {
  const { session, passId, title, readOnly, keypad, checked, confirmed } = useOpenPass();
  const { pointer } = field;
  const problem = useEvaluated(session, passId, (evaluated) => {
    const said = problemAt(evaluated, pointer, { checked, confirmed, text: session.textOf(passId, pointer) });
    const understood = said ? '' : readAs(session.cellAt(passId, pointer), field);
    return said || (understood && `=${understood}`);
  });
  const register = useCallback(
    (input: HTMLInputElement | HTMLSelectElement | null) => {
      session.register(passId, pointer, input);
      // A row that appears late, or again, shows what stands in it now.
      if (input && input.value !== session.textOf(passId, pointer)) input.value = session.textOf(passId, pointer);
    },
    [session, passId, pointer],
  );
  const common = {
    id: fieldId(passId, pointer),
    ref: register,
    'data-pointer': pointer,
    'data-role': field.role,
    'aria-label': fieldLabel(title, field),
    'aria-describedby': problem ? problemId(passId, pointer) : undefined,
    'aria-invalid': problem.startsWith('!') || undefined,
    defaultValue: session.textOf(passId, pointer),
  };
  if (field.role === 'choice') {
    return (
      <>
        <select {...common} disabled={readOnly} className={`${box} ${looks.choice}`}>
          {field.options?.map(({ value, label }) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </select>
        <FieldProblem text={problem} pointer={pointer} />
      </>
    );
  }
  return (
    <>
      <input
        {...common}
        type="text"
        autoComplete="off"
        spellCheck={false}
        enterKeyHint="next"
        inputMode={keypad ? 'none' : undefined}
        readOnly={readOnly}
        className={`${box} ${looks[field.role]} ${framed ? 'border-ink2 bg-leaf' : ''} text-right font-mono tabular-nums`}
      />
      <FieldProblem text={problem} pointer={pointer} />
    </>
  );
}

/** Cannot be read: oxide and "Cannot be read". Unusual: brass, with the button that says it was looked at. Missing: brass. */
function FieldProblem({ text, pointer }: { text: string; pointer: string }) {
  const { passId, confirm } = useOpenPass();
  if (!text) return null;
  const kind = text[0];
  if (kind === '=') {
    return (
      <p id={problemId(passId, pointer)} className="px-2 pb-1 text-right text-sm text-ink2">
        {text.slice(1)}
      </p>
    );
  }
  const look = kind === '!' ? 'border-oxide text-oxide' : 'border-brass text-brass';
  return (
    <p id={problemId(passId, pointer)} className={`my-1 border-l-4 pl-2 text-left text-sm font-medium ${look}`}>
      {kind === '?' && 'Unusual: '}
      {text.slice(1)}
      {kind === '?' && (
        <button type="button" className="ml-1 min-h-6 underline" onClick={() => confirm(pointer)}>
          It was read so
        </button>
      )}
    </p>
  );
}
