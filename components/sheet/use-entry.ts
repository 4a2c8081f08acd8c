'use client';

import { type ClipboardEvent, type FocusEvent, type FormEvent, type KeyboardEvent, useMemo } from 'react';
import type { CellPointer } from '@/lib/sheet/types';
import { inColumn, nextField, spreadPaste } from './cell-path';
import { KeyBurst } from './key-burst';
import type { Change } from './reading-log';
import type { SheetSession } from './sheet-session';

/** A pause after which what was typed is kept without a key. */
const pauseMs = 600;

type FieldElement = HTMLInputElement | HTMLSelectElement;

/** Set on an input by the on-page keypad, so that its figures are told from typed ones. */
export const keypadMark = 'keypad';

function fieldOf(target: EventTarget): { input: FieldElement; pointer: CellPointer } | null {
  const input = target as FieldElement;
  const pointer = input.dataset?.pointer;
  return pointer ? { input, pointer } : null;
}

interface Entry {
  onInput: (event: FormEvent) => void;
  onKeyDown: (event: KeyboardEvent) => void;
  onBlur: (event: FocusEvent) => void;
  onFocus: (event: FocusEvent) => void;
  onPaste: (event: ClipboardEvent) => void;
}

/**
 * Everything that happens in the fields of a set of readings, handled once around them. Enter and an instrument's terminator move on
 * at once, in the same turn, so that its next reading cannot land in the old field.
 */
export function useEntry(options: {
  session: SheetSession;
  passId: string;
  readOnly: boolean;
  /** At the end of the readings. */
  onEnd: () => void;
  say: (words: string) => void;
}): Entry {
  const { session, passId, readOnly, onEnd, say } = options;
  return useMemo(() => {
    const burst = new KeyBurst();
    let pause: ReturnType<typeof setTimeout> | undefined;

    const commit = (input: FieldElement, pointer: CellPointer) => {
      clearTimeout(pause);
      const source: Change['source'] =
        input.dataset.source === keypadMark ? 'keypad' : burst.isDevice() ? 'device' : 'typed';
      delete input.dataset.source;
      session.commit(passId, [pointer], source);
    };
    const focus = (pointer: CellPointer) => {
      const input = session.inputOf(passId, pointer);
      input?.focus();
      return input !== null;
    };
    const advance = (input: FieldElement, pointer: CellPointer, step: 1 | -1) => {
      commit(input, pointer);
      burst.forget();
      const empty = (candidate: CellPointer) => session.textOf(passId, candidate).trim() === '';
      const next = nextField(session.evaluation(passId).fields, pointer, step, empty);
      if (!(next && focus(next)) && step === 1) onEnd();
    };

    return {
      onInput(event) {
        const field = fieldOf(event.target);
        if (!field || readOnly) return;
        session.type(passId, field.pointer, field.input.value);
        clearTimeout(pause);
        if (field.input.dataset.role === 'choice') commit(field.input, field.pointer);
        else pause = setTimeout(() => commit(field.input, field.pointer), pauseMs);
      },

      onKeyDown(event) {
        const field = fieldOf(event.target);
        if (!field) return;
        const { input, pointer } = field;
        const { key } = event;
        if ((event.ctrlKey || event.metaKey) && !event.shiftKey && key.toLowerCase() === 'z' && !readOnly) {
          event.preventDefault();
          clearTimeout(pause);
          if (input.value !== session.committedText(passId, pointer)) session.restore(passId, pointer);
          else {
            const undone = session.undoLast();
            if (undone?.passId === passId) focus(undone.pointer);
            else if (undone) say('The newest change was in another set of readings; it has been taken back there.');
          }
        } else if (event.ctrlKey || event.metaKey || event.altKey || input.dataset.role === 'choice') {
          return;
        } else if (key === 'Enter' || (key === 'Tab' && !event.shiftKey && burst.isDevice())) {
          event.preventDefault();
          advance(input, pointer, key === 'Enter' && event.shiftKey ? -1 : 1);
        } else if (key === 'ArrowUp' || key === 'ArrowDown') {
          event.preventDefault();
          const next = inColumn(session.evaluation(passId).fields, pointer, key === 'ArrowDown' ? 1 : -1);
          if (next) focus(next);
        } else if (key === 'Escape' && !readOnly) {
          event.preventDefault();
          clearTimeout(pause);
          session.restore(passId, pointer);
          (input as HTMLInputElement).select();
        } else if (key.length === 1) {
          burst.key(event.timeStamp, event.repeat);
        }
      },

      onBlur(event) {
        const field = fieldOf(event.target);
        if (field && !readOnly) commit(field.input, field.pointer);
        burst.forget();
      },

      onFocus(event) {
        const field = fieldOf(event.target);
        // What is typed next replaces the old figure, which stays in the history.
        if (field && field.input instanceof HTMLInputElement) field.input.select();
      },

      onPaste(event) {
        const field = fieldOf(event.target);
        if (!field || readOnly || field.input.dataset.role === 'choice') return;
        const spread = spreadPaste(
          session.evaluation(passId).fields,
          field.pointer,
          event.clipboardData.getData('text/plain'),
        );
        if (!spread) return;
        event.preventDefault();
        const over = spread.fills.filter(({ pointer }) => session.textOf(passId, pointer).trim() !== '').length;
        session.fill(passId, spread.fills, 'paste');
        say(pasteWords(spread.fills.length, over, spread.left));
      },
    };
  }, [session, passId, readOnly, onEnd, say]);
}

function pasteWords(filled: number, over: number, left: string[]): string {
  const parts = [`${filled} values pasted`];
  if (over > 0) parts.push(`${over} of them over values that stood there`);
  if (left.length > 0) parts.push(`no field was left for ${left.length}: ${left.slice(0, 12).join(' · ')}`);
  return `${parts.join(', ')}. Ctrl Z takes all of it back.`;
}
