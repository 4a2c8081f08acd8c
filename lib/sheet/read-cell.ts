import { convert, convertible } from '@/lib/units/convert';
import { parseNumber } from '@/lib/units/parse-number';
import { UNITS, type Unit } from '@/lib/units/unit';
import type { DecimalText } from '@/standards/types';
import type { Cell } from './types';

export type ReadCell = { state: 'empty' } | { state: 'ok'; value: DecimalText } | { state: 'bad'; problem: string };

/** One field read: a unit typed with the figure counts before the column's. @returns the value in `unit` */
export function read(cell: Cell, unit: Unit): ReadCell {
  if (cell.text.trim() === '') return { state: 'empty' };
  const parsed = parseNumber(cell.text, { defaultUnit: cell.unit ?? unit });
  if (!parsed.ok) return { state: 'bad', problem: parsed.problem };
  const from = parsed.unit ?? unit;
  if (!convertible(from, unit)) {
    const possible = UNITS.filter((candidate) => convertible(candidate, unit)).join(' or ');
    return { state: 'bad', problem: `${from} does not fit here. Write it in ${possible}.` };
  }
  return { state: 'ok', value: convert(parsed.value, from, unit) };
}
