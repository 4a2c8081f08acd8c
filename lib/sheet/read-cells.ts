import type { DecimalText } from '@/standards/types';
import type { SheetValues } from './layouts/layout-engine';
import { read } from './read-cell';
import { allFields, fieldsOfTable } from './sheet-fields';
import type { CellProblem, Cells, Field, SheetFields } from './types';
import { unusualReadings } from './unusual-readings';

export interface ReadCells {
  /** What could be read, in the unit of its field; a choice as it stands. */
  values: SheetValues;
  problems: CellProblem[];
}

/**
 * Reads every cell of a sheet by the one number parser. What cannot be read is a problem that blocks, what looks like a slip one that
 * asks to be looked at: 20 times the tolerance away from its neighbours, or 25.4 times as large as they are.
 * @param toleranceUm tolerance of the sheet, µm; null where none is given
 */
export function readCells(fields: SheetFields, cells: Cells, toleranceUm: DecimalText | null = null): ReadCells {
  const values = new Map<string, string>();
  const problems: CellProblem[] = [];
  for (const field of allFields(fields)) {
    const outcome = readField(field, cells);
    if (outcome === null) continue;
    if ('value' in outcome) values.set(field.pointer, outcome.value);
    else problems.push({ pointer: field.pointer, severity: 'cannot-read', message: outcome.message });
  }
  const groups = fields.tables.flatMap((table) => alike(fieldsOfTable(table).filter(({ role }) => role === 'reading')));
  return { values, problems: [...problems, ...groups.flatMap((group) => unusualReadings(group, values, toleranceUm))] };
}

/** Readings that can be compared with each other: of one table and in one unit of length or slope. */
function alike(readings: Field[]): Field[][] {
  const units = [...new Set(readings.map(({ unit }) => unit))];
  return units
    .filter((unit) => unit === 'µm' || unit === 'mm' || unit === 'µm/m')
    .map((unit) => readings.filter((field) => field.unit === unit));
}

function readField(field: Field, cells: Cells): { value: string } | { message: string } | null {
  const cell = cells[field.pointer];
  if (!cell) return null;
  if (field.role === 'choice' || field.unit === null) {
    const text = cell.text.trim();
    if (text === '') return null;
    if (!field.options || field.options.some(({ value }) => value === text)) return { value: text };
    return { message: `Choose one of: ${field.options.map(({ label }) => label).join(', ')}.` };
  }
  const outcome = read(cell, field.unit);
  if (outcome.state === 'empty') return null;
  return outcome.state === 'ok' ? { value: outcome.value } : { message: outcome.problem };
}
