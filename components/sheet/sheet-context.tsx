'use client';

import { createContext, useContext, useSyncExternalStore } from 'react';
import type { CellPointer } from '@/lib/sheet/types';
import type { OpenSheet } from './sheet-data';
import type { Evaluated, SheetSession } from './sheet-session';

interface OpenPass {
  session: SheetSession;
  passId: string;
  title: OpenSheet['title'];
  readOnly: boolean;
  keypad: boolean;
  /** "Check the sheet" was pressed: what is missing is said at its field until it is there. */
  checked: boolean;
  /** Unusual figures that somebody has looked at. */
  confirmed: ReadonlySet<CellPointer>;
  confirm: (pointer: CellPointer) => void;
}

export const OpenPassContext = createContext<OpenPass | null>(null);

export function useOpenPass(): OpenPass {
  const open = useContext(OpenPassContext);
  if (!open) throw new Error('Fields stand inside an open set of readings');
  return open;
}

/** A part of what a set of readings comes to; drawn again only when this part changes. */
export function useEvaluated<T>(session: SheetSession, passId: string, select: (evaluated: Evaluated) => T): T {
  const read = () => select(session.evaluation(passId));
  return useSyncExternalStore(session.subscribe, read, read);
}
