'use client';

import { type KeyboardEvent, useCallback, useRef, useSyncExternalStore } from 'react';
import { limitWords } from '@/lib/reporting/checked-items';
import { CHECK_ANSWERS } from '@/lib/reporting/words';
import { longestReading, longestRemark } from '@/lib/schemas/text-lengths';
import { answerAt, remarkAt, valueAt } from '@/lib/sheet/layouts/check-list';
import type { CellPointer } from '@/lib/sheet/types';
import type { CheckItem } from '@/standards/types';
import { fieldId, problemAt, problemId } from './field-problem';
import { useEvaluated, useOpenPass } from './sheet-context';

/** The items of a function check, each with its three answers, its figure where it has one, and room for a remark. */
export function CheckList({ items, say }: { items: readonly CheckItem[]; say: (words: string) => void }) {
  const { session, passId, readOnly } = useOpenPass();
  const onKeyDown = (event: KeyboardEvent) => {
    if (readOnly || !(event.ctrlKey || event.metaKey) || event.shiftKey || event.key.toLowerCase() !== 'z') return;
    event.preventDefault();
    const undone = session.undoLast();
    if (undone?.passId === passId) session.inputOf(passId, undone.pointer)?.focus();
    else if (undone) say('The newest change was in another set of readings; it has been taken back there.');
  };
  return (
    <ol onKeyDown={onKeyDown} className="border-t-[1.5px] border-ink">
      {items.map((item, index) => (
        <OneItem key={item.id} item={item} number={index + 1} />
      ))}
    </ol>
  );
}

function OneItem({ item, number }: { item: CheckItem; number: number }) {
  const { passId } = useOpenPass();
  const { value } = item;
  const limits = value ? limitWords(value) : '';
  const titleId = fieldId(passId, `/items/${item.id}`);
  return (
    <li className="grid gap-x-6 gap-y-2 border-b border-hair py-3 md:grid-cols-[minmax(0,1fr)_auto]">
      <p id={titleId} className="flex gap-2.5 leading-snug">
        <span className="font-mono text-ink2">{number}</span>
        <span>{item.question}</span>
      </p>
      <Answers item={item} titleId={titleId} />
      <div className="flex flex-wrap gap-x-6 gap-y-2 md:col-span-2 md:pl-6">
        {value && (
          <div className="flex min-h-12 flex-wrap items-center gap-x-2 text-sm text-ink2">
            <span aria-hidden="true">
              {value.label}, {value.unit}
              {limits && ` (${limits})`}
            </span>
            <PlainField
              pointer={valueAt(item)}
              figure
              label={[`${item.question} – ${value.label}`, value.unit, limits].filter(Boolean).join(', ')}
            />
          </div>
        )}
        <div className="flex min-h-12 min-w-0 grow items-center gap-2 text-sm text-ink2">
          <span aria-hidden="true">Remark</span>
          <PlainField pointer={remarkAt(item)} label={`${item.question} – remark`} />
        </div>
      </div>
    </li>
  );
}

/** Yes, no, not fitted: one group of radio buttons a row, each 48 px high. */
function Answers({ item, titleId }: { item: CheckItem; titleId: string }) {
  const { session, passId, readOnly } = useOpenPass();
  const pointer = answerAt(item);
  const read = () => session.textOf(passId, pointer);
  const answer = useSyncExternalStore(session.subscribe, read, read);
  const problem = useProblem(pointer);
  const group = useRef<HTMLFieldSetElement>(null);
  // The session leads to an answer as to a field; its text is drawn here, so there is nothing to write into it.
  const register = useCallback(
    (fieldset: HTMLFieldSetElement | null) => {
      group.current = fieldset;
      session.register(passId, pointer, fieldset && answerField(fieldset, () => session.textOf(passId, pointer)));
    },
    [session, passId, pointer],
  );
  return (
    <fieldset
      ref={register}
      aria-labelledby={titleId}
      aria-describedby={problem ? problemId(passId, pointer) : undefined}
    >
      <div className="flex">
        {Object.entries(CHECK_ANSWERS).map(([key, words]) => (
          <label
            key={key}
            className={`-ml-[1.5px] flex min-h-12 min-w-16 cursor-pointer items-center justify-center border-[1.5px] px-4 first:ml-0 first:rounded-l last:rounded-r has-focus-visible:z-10 has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-blue ${chosenLook(key, answer)}`}
          >
            <input
              type="radio"
              name={fieldId(passId, pointer)}
              value={key}
              checked={answer === key}
              disabled={readOnly}
              onChange={() => session.fill(passId, [{ pointer, text: key }], 'typed')}
              className="sr-only"
            />
            {answer === key && (
              <span aria-hidden="true" className="mr-2">
                ●
              </span>
            )}
            {words}
          </label>
        ))}
      </div>
      <Problem text={problem} pointer={pointer} />
    </fieldset>
  );
}

function chosenLook(key: string, answer: string): string {
  if (key !== answer) return 'border-ink2 bg-leaf text-ink';
  return key === 'no'
    ? 'z-[1] border-oxide bg-oxide-wash font-semibold text-oxide'
    : 'z-[1] border-blue bg-blue-wash font-semibold text-blue';
}

/** What the session needs of a field: its text, and the way to it. */
function answerField(fieldset: HTMLFieldSetElement, textOf: () => string): HTMLInputElement {
  const field = {
    get value() {
      return textOf();
    },
    set value(_text: string) {},
    focus: () =>
      (fieldset.querySelector<HTMLInputElement>('input:checked') ?? fieldset.querySelector('input'))?.focus(),
  };
  return field as unknown as HTMLInputElement;
}

/** A figure or a remark beside an answer; kept when it is left, and on Enter. */
function PlainField({ pointer, label, figure }: { pointer: CellPointer; label: string; figure?: boolean }) {
  const { session, passId, readOnly } = useOpenPass();
  const problem = useProblem(pointer);
  const register = useCallback(
    (input: HTMLInputElement | null) => {
      session.register(passId, pointer, input);
      if (input && input.value !== session.textOf(passId, pointer)) input.value = session.textOf(passId, pointer);
    },
    [session, passId, pointer],
  );
  const commit = () => session.commit(passId, [pointer], 'typed');
  return (
    <span className={figure ? 'w-28' : 'min-w-40 grow'}>
      <input
        id={fieldId(passId, pointer)}
        ref={register}
        type="text"
        autoComplete="off"
        maxLength={figure ? longestReading : longestRemark}
        aria-label={label}
        aria-describedby={problem ? problemId(passId, pointer) : undefined}
        aria-invalid={problem.startsWith('!') || undefined}
        defaultValue={session.textOf(passId, pointer)}
        readOnly={readOnly}
        onChange={(event) => session.type(passId, pointer, event.target.value)}
        onBlur={commit}
        onKeyDown={(event) => event.key === 'Enter' && commit()}
        className={`h-12 w-full rounded border-[1.5px] border-line bg-leaf px-2 text-base text-ink focus:border-blue aria-invalid:border-oxide ${figure ? 'text-right font-mono tabular-nums' : ''}`}
      />
      <Problem text={problem} pointer={pointer} />
    </span>
  );
}

function useProblem(pointer: CellPointer): string {
  const { session, passId, checked, confirmed } = useOpenPass();
  return useEvaluated(session, passId, (evaluated) =>
    problemAt(evaluated, pointer, { checked, confirmed, text: session.textOf(passId, pointer) }),
  );
}

function Problem({ text, pointer }: { text: string; pointer: CellPointer }) {
  const { passId } = useOpenPass();
  if (!text) return null;
  const look = text[0] === '!' ? 'border-oxide text-oxide' : 'border-brass text-brass';
  return (
    <p id={problemId(passId, pointer)} className={`mt-1 border-l-4 pl-2 text-sm font-medium ${look}`}>
      {text.slice(1)}
    </p>
  );
}
