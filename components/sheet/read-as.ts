import { read } from '@/lib/sheet/read-cell';
import type { Cell, Field } from '@/lib/sheet/types';
import { formatDecimal } from '@/lib/units/format';
import { parseNumber } from '@/lib/units/parse-number';

/** One mark and exactly three figures behind it: `1,234` could be meant as a thousand and more. */
const couldBeGrouped = /^\s*[+\-−–]?\d{1,3}[.,]\d{3}(?!\d)/;

/**
 * How a figure is understood, said before it is committed, where it could be meant otherwise or was typed in another unit than the
 * column's: `read as 1.234 mm`. '' where there is nothing to say.
 */
export function readAs(cell: Cell, field: Field): string {
  if (field.unit === null || field.role === 'choice') return '';
  const understood = read(cell, field.unit);
  if (understood.state !== 'ok') return '';
  const parsed = parseNumber(cell.text, { defaultUnit: cell.unit ?? field.unit });
  const converted = parsed.ok && parsed.unit !== field.unit;
  if (!converted && !couldBeGrouped.test(cell.text)) return '';
  return `read as ${formatDecimal(understood.value)} ${field.unit}`;
}
