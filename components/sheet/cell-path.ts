import type { CellPointer, FieldTable, SheetFields } from '@/lib/sheet/types';

/** Fields as a table holds them: null where a cell is derived or empty. */
const gridOf = (table: FieldTable): (CellPointer | null)[][] =>
  table.rows.map((row) => row.cells.map((cell) => (cell && 'field' in cell ? cell.field.pointer : null)));

function placeOf(fields: SheetFields, pointer: CellPointer) {
  for (const [index, table] of fields.tables.entries()) {
    const grid = gridOf(table);
    for (const [row, cells] of grid.entries()) {
      const column = cells.indexOf(pointer);
      if (column >= 0) return { table: index, grid, row, column };
    }
  }
  return null;
}

/**
 * Where Enter goes: along the readings in the order taken; from a set-up field to the next one in its column, and from the last of
 * them to the first reading that is empty. null at the end.
 */
export function nextField(
  fields: SheetFields,
  pointer: CellPointer,
  step: 1 | -1,
  isEmpty: (pointer: CellPointer) => boolean,
): CellPointer | null {
  const at = fields.order.indexOf(pointer);
  if (at >= 0) return fields.order[at + step] ?? null;
  const above = fields.setUp.findIndex((field) => field.pointer === pointer);
  const neighbour = above >= 0 ? fields.setUp[above + step]?.pointer : inColumn(fields, pointer, step);
  if (neighbour) return neighbour;
  return step === 1 ? (fields.order.find(isEmpty) ?? fields.order[0] ?? null) : null;
}

/** Up or down the column: the next row that has a field there, in this table or the one beside it. */
export function inColumn(fields: SheetFields, pointer: CellPointer, step: 1 | -1): CellPointer | null {
  const place = placeOf(fields, pointer);
  if (!place) return null;
  for (let row = place.row + step; place.grid[row]; row += step) {
    const found = place.grid[row]?.[place.column];
    if (found) return found;
  }
  const next = fields.tables[place.table + step];
  if (!next) return null;
  const column = gridOf(next).map((row) => row[place.column] ?? null);
  return (step === 1 ? column : column.reverse()).find((found) => found !== null) ?? null;
}

export interface Spread {
  fills: { pointer: CellPointer; text: string }[];
  /** Values for which there was no field: never dropped in silence. */
  left: string[];
}

/**
 * A pasted column (or block, its columns parted by tabs or semicolons; a comma may be a decimal mark and parts nothing) laid over the
 * fields from the focused one: down, and to the right. A single column of readings goes on where the order taken goes on.
 * @returns null for a single value: that is pasted by the browser
 */
export function spreadPaste(fields: SheetFields, pointer: CellPointer, pasted: string): Spread | null {
  const lines = pasted.replace(/(\r\n|\r|\n)+$/, '').split(/\r\n|\r|\n/);
  const rows = lines.map((line) => line.split(/[\t;]/).map((text) => text.trim()));
  const single = rows.every((row) => row.length === 1);
  if (single && rows.length === 1) return null;
  const at = fields.order.indexOf(pointer);
  const target = single && at >= 0 ? alongOrder(fields.order.slice(at)) : block(fields, pointer);
  const spread: Spread = { fills: [], left: [] };
  for (const [down, row] of rows.entries()) {
    for (const [right, text] of row.entries()) {
      const place = target(down, right);
      if (place) spread.fills.push({ pointer: place, text });
      else if (text !== '') spread.left.push(text);
    }
  }
  return spread;
}

const alongOrder = (order: CellPointer[]) => (down: number) => order[down] ?? null;

function block(fields: SheetFields, pointer: CellPointer): (down: number, right: number) => CellPointer | null {
  const place = placeOf(fields, pointer);
  if (!place) return (down, right) => (down === 0 && right === 0 ? pointer : null);
  return (down, right) => place.grid[place.row + down]?.[place.column + right] ?? null;
}
