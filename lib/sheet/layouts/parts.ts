import { read } from '@/lib/sheet/read-cell';
import type { CellProblem, Cells, Field } from '@/lib/sheet/types';
import { Fraction } from '@/lib/units/fraction';
import { round } from '@/lib/units/round';
import type { Unit } from '@/lib/units/unit';
import type { SheetValues } from './layout-engine';

export function readingField(pointer: string, label: string, unit: Unit = 'µm'): Field {
  return { pointer, role: 'reading', unit, label };
}

export function setUpField(pointer: string, label: string, unit: Unit, optional = false): Field {
  return { pointer, role: 'set-up', unit, label, ...(optional ? { optional } : {}) };
}

/** A count that is no measured figure: it has no unit and goes into no input. */
export function countField(pointer: string, label: string): Field {
  return { pointer, role: 'set-up', unit: null, label, optional: true };
}

export function choiceField(pointer: string, label: string, options: { value: string; label: string }[]): Field {
  return { pointer, role: 'choice', unit: null, label, options };
}

export const measuringLengthField = setUpField(
  '/measuringLength',
  'measuring length (left empty: from the first to the last position)',
  'mm',
  true,
);
export const sagField = setUpField('/sag', 'sag of the bracket', 'µm', true);
export const upField = setUpField('/up', 'angle at which the indicator stands on top', '°');
export const surfaceOptions = [
  { value: 'outside', label: 'outside (mandrel)' },
  { value: 'bore', label: 'bore' },
];

export function isFilled(cells: Cells, pointer: string): boolean {
  return (cells[pointer]?.text.trim() ?? '') !== '';
}

/** What stands in a choice, or the one that holds while nothing was chosen. */
export function chosen(cells: Cells, pointer: string, fallback: string): string {
  return cells[pointer]?.text.trim() || fallback;
}

/** Rows to draw: up to the last one with anything in it, and one empty row more up to a maximum. */
export function rowsToOffer(cells: Cells, pointersOfRow: (row: number) => string[], maximum: number): number {
  let last = -1;
  for (let row = 0; row < maximum; row++)
    if (pointersOfRow(row).some((pointer) => isFilled(cells, pointer))) last = row;
  return Math.min(last + 2, maximum);
}

/** Rows that exist: their position is written. */
export function existingRows(values: SheetValues, positionOfRow: (row: number) => string, maximum: number): number[] {
  return Array.from({ length: maximum }, (_, row) => row).filter((row) => values.has(positionOfRow(row)));
}

/** `z 90 mm` for the label of a field; the row's number while its position is empty. */
export function placeWords(cells: Cells, pointer: string, name: string, row: number): string {
  const text = cells[pointer]?.text.trim();
  return text ? `${name} ${text} mm` : `row ${row + 1}`;
}

/** Values of several pointers, or null where one of them is missing. Missing is never read as 0. */
export function all(values: SheetValues, pointers: string[]): string[] | null {
  const found = pointers.map((pointer) => values.get(pointer));
  return found.every((value) => value !== undefined) ? found : null;
}

export function span(positions: string[]): string {
  return Fraction.range(positions.map((position) => Fraction.from(position))).toText();
}

export function derivedMean(cells: Cells, pointers: string[]): string {
  const values = readAll(cells, pointers);
  return values ? shown(Fraction.mean(values)) : '';
}

export function derivedRange(cells: Cells, pointers: string[]): string {
  const values = readAll(cells, pointers);
  return values ? shown(Fraction.range(values)) : '';
}

export function derivedDifference(cells: Cells, minuend: string, subtrahend: string): string {
  const values = readAll(cells, [minuend, subtrahend]);
  return values ? shown(values[0]!.minus(values[1]!)) : '';
}

function readAll(cells: Cells, pointers: string[]): Fraction[] | null {
  const values: Fraction[] = [];
  for (const pointer of pointers) {
    const cell = cells[pointer];
    const found = cell && read(cell, 'µm');
    if (found?.state !== 'ok') return null;
    values.push(Fraction.from(found.value));
  }
  return values;
}

/** Rounded at the last step only; for the reader, never for a verdict. */
function shown(value: Fraction): string {
  return round(value.toText(), '0.1', 'half-even');
}

export function counted(used: number, total: number, what: string): string | null {
  return used === total ? null : `by ${used} of ${total} ${what}`;
}

export function sagNote(values: SheetValues, pointer: string, message: string): CellProblem[] {
  return values.has(pointer) ? [] : [{ pointer, severity: 'unusual', message }];
}

export const noBracketSag =
  'No sag of the bracket is stated: the result contains it. Write 0 where it was checked and found to be none.';
