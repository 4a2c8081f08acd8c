import { isOverdue } from '@/lib/schemas/instrument-state';
import type { Instrument } from './sheet-data';

/** `due 2026-03-14`, `overdue since 2026-02-01`, `no certificate`. */
export function dueWords(one: Pick<Instrument, 'dueOn'>, measuredOn: string): string {
  if (one.dueOn === null) return 'no certificate';
  return isOverdue(one.dueOn, measuredOn) ? `overdue since ${one.dueOn}` : `due ${one.dueOn}`;
}
