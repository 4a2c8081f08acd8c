import { dayIn } from '@/lib/dates';
import type { CellState, SaidOfCell } from '@/lib/planning/cell-states';

/** `confirmed by R. Tamm on 10 Mar 2026: 2020, p. 14`; who has not agreed yet is said too. */
export function saidWords(said: SaidOfCell, timeZone: string): string {
  const { state, accountName, recordedAt, ofEdition, clause, secondAccountName } = said;
  const second = secondAccountName ? ` and ${secondAccountName}` : '';
  const where = [ofEdition, clause].filter(Boolean).join(', ');
  return `${state} by ${accountName}${second} on ${dayIn(recordedAt, timeZone)}${where ? `: ${where}` : ''}`;
}

export const cellStateWords: Record<CellState['state'], string> = {
  unconfirmed: 'unconfirmed',
  waiting: 'waiting for the second person',
  confirmed: 'confirmed',
  replaced: 'replaced',
};

/** `2 of 3 confirmed`, `2 of 3 confirmed, 1 waiting`; what has no tolerance has nothing to confirm. */
export function countWords({
  confirmed,
  waiting,
  total,
}: {
  confirmed: number;
  waiting: number;
  total: number;
}): string {
  if (total === 0) return 'nothing to confirm';
  const count = confirmed === total ? `all ${total} confirmed` : `${confirmed} of ${total} confirmed`;
  return waiting > 0 ? `${count}, ${waiting} waiting` : count;
}
