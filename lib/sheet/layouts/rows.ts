import type { Cells, Field, FieldTable } from '@/lib/sheet/types';
import type { Unit } from '@/lib/units/unit';
import type { SheetValues } from './layout-engine';
import { isFilled, readingField, rowsToOffer, setUpField } from './parts';

/** One column of a table whose rows grow: where, when or at which angle (`place`), or what was read there. */
export interface RowColumn {
  role: 'place' | 'reading';
  label: string;
  unit: Unit;
  pointer(row: number): string;
  /** A reading without which the row still counts. */
  optional?: boolean;
}

export interface RowTable {
  title: string | null;
  columns: RowColumn[];
  maximum: number;
}

const rowsOf = (count: number) => Array.from({ length: count }, (_, row) => row);
const placeOf = (table: RowTable) => table.columns.find(({ role }) => role === 'place');

/** The rows that are drawn: those with anything in them and one more. */
export function offeredRows(table: RowTable, cells: Cells): number[] {
  return rowsOf(rowsToOffer(cells, (row) => table.columns.map((column) => column.pointer(row)), table.maximum));
}

/** A table of fields: the place first, then what was read there. */
export function rowFields(table: RowTable, cells: Cells): FieldTable {
  const place = placeOf(table);
  const at = (row: number) => {
    const text = place && cells[place.pointer(row)]?.text.trim();
    return place && text ? `${place.label} ${text} ${place.unit}`.replace(' °', '°') : `row ${row + 1}`;
  };
  const field = (column: RowColumn, row: number): Field => {
    const name = table.title ? `${table.title}, ` : '';
    return column.role === 'place'
      ? setUpField(column.pointer(row), `${name}${column.label}, row ${row + 1}`, column.unit, true)
      : {
          ...readingField(column.pointer(row), `${name}${column.label} at ${at(row)}`, column.unit),
          ...optional(column),
        };
  };
  return {
    title: table.title,
    columns: table.columns.map(({ label, unit }) => ({ label, unit })),
    rows: offeredRows(table, cells).map((row) => ({
      label: `${row + 1}`,
      cells: table.columns.map((column) => ({ field: field(column, row) })),
    })),
  };
}

const optional = (column: RowColumn) => (column.optional ? { optional: true } : {});

/** Rows whose place is written: that is where a reading is expected. */
export function placedRows(table: RowTable, cells: Cells): number[] {
  const place = placeOf(table);
  return offeredRows(table, cells).filter((row) => !place || isFilled(cells, place.pointer(row)));
}

/** Rows that exist, and those of them that are complete; each complete one as its figures in the order of the columns. */
export function readRows(table: RowTable, values: SheetValues) {
  const place = placeOf(table);
  const needed = table.columns.filter((column) => !column.optional);
  const existing = rowsOf(table.maximum).filter((row) =>
    place ? values.has(place.pointer(row)) : table.columns.some((column) => values.has(column.pointer(row))),
  );
  const complete = existing.filter((row) => needed.every((column) => values.has(column.pointer(row))));
  const figures = complete.map((row) => table.columns.map((column) => values.get(column.pointer(row))));
  return { existing, complete, figures };
}
