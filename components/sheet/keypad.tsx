'use client';

import type { PointerEvent } from 'react';
import { keypadMark } from './use-entry';

const keys = ['7', '8', '9', '⌫', '4', '5', '6', '±', '1', '2', '3', '.', '0'] as const;
type Key = (typeof keys)[number];
const spoken: Partial<Record<Key, string>> = {
  '⌫': 'Delete the last figure',
  '±': 'Change the sign',
  '.': 'Decimal mark',
};

const isReading = (element: Element | null): element is HTMLInputElement =>
  element instanceof HTMLInputElement && element.dataset.pointer !== undefined && !element.readOnly;

/** Figures by thumb, so that the tablet's own keyboard can stay away, also while an instrument is paired as a keyboard. */
export function Keypad({ onNothing }: { onNothing: () => HTMLInputElement | null }) {
  const target = () => (isReading(document.activeElement) ? document.activeElement : onNothing());
  // The field must keep the focus, or every key would end the reading.
  const stay = (event: PointerEvent) => event.preventDefault();
  const press = (key: Key) => {
    const input = target();
    if (!input) return;
    input.focus();
    write(input, key);
  };
  const next = (shiftKey: boolean) => {
    const input = target();
    input?.dispatchEvent(new KeyboardEvent('keydown', { key: 'Enter', shiftKey, bubbles: true, cancelable: true }));
  };
  return (
    <fieldset className="grid grid-cols-4 gap-2" onPointerDown={stay} onMouseDown={(event) => event.preventDefault()}>
      <legend className="sr-only">Keypad</legend>
      {keys.map((key) => (
        <button
          key={key}
          type="button"
          tabIndex={-1}
          aria-label={spoken[key]}
          className="min-h-14 rounded border-[1.5px] border-line bg-leaf font-mono text-xl active:bg-blue-wash"
          onClick={() => press(key)}
        >
          {key}
        </button>
      ))}
      <button
        type="button"
        tabIndex={-1}
        className="min-h-14 rounded border-[1.5px] border-blue font-medium text-blue active:bg-blue-wash"
        onClick={() => next(true)}
      >
        Back
      </button>
      <button
        type="button"
        tabIndex={-1}
        className="col-span-2 min-h-14 rounded border-[1.5px] border-blue bg-blue-wash font-semibold text-blue active:bg-leaf"
        onClick={() => next(false)}
      >
        Next reading
      </button>
    </fieldset>
  );
}

function write(input: HTMLInputElement, key: Key): void {
  input.dataset.source = keypadMark;
  const [start, end] = [input.selectionStart ?? input.value.length, input.selectionEnd ?? input.value.length];
  if (key === '±') {
    const value = input.value.trimStart();
    input.value = /^[-−–]/.test(value) ? value.slice(1) : `-${value.replace(/^\+/, '')}`;
  } else if (key === '⌫') {
    if (start === end && start > 0) input.setRangeText('', start - 1, start, 'end');
    else input.setRangeText('', start, end, 'end');
  } else input.setRangeText(key, start, end, 'end');
  input.dispatchEvent(new Event('input', { bubbles: true }));
}
