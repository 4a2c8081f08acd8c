import { evaluate } from '@/lib/evaluation';
import { Fraction } from '@/lib/units/fraction';
import { round } from '@/lib/units/round';
import type { CellDefault, DecimalText } from '@/standards/types';
import { read } from './read-cell';
import type { Cells } from './types';

/**
 * Sag of a solid steel mandrel at every position of the sheet, as cells to be proposed; never written unasked, because only the person
 * at the machine knows which mandrel it is. Positions beyond the mandrel get none.
 * @param mandrel free length from the nose and diameter, mm
 * @returns `/sag/<row>` → text in µm, rounded to 0.01
 */
export function mandrelSagCells(
  cells: Cells,
  mandrel: { lengthMm: DecimalText; diameterMm: DecimalText },
): Record<string, CellDefault> {
  const proposed: Record<string, CellDefault> = {};
  for (const [pointer, cell] of Object.entries(cells)) {
    const row = /^\/positions\/(\d+)$/.exec(pointer)?.[1];
    const position = row === undefined ? null : read(cell, 'mm');
    if (position?.state !== 'ok' || !reaches(position.value, mandrel.lengthMm)) continue;
    const { lengthMm: length, diameterMm: diameter } = mandrel;
    const result = evaluate({ method: 'correction', kind: 'mandrel-sag', length, diameter, at: position.value });
    if ('sag' in result) proposed[`/sag/${row}`] = { text: round(result.sag, '0.01'), unit: 'µm' };
  }
  return proposed;
}

function reaches(position: string, length: string): boolean {
  const at = Fraction.from(position);
  return at.sign() >= 0 && at.compare(Fraction.from(length)) <= 0;
}
