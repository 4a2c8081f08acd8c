import type { TestDefinition } from '@/standards/types';
import { engineOf } from './layouts/engine-of';
import type { Cells, Field, SheetFields } from './types';

/** Fields, tables and order of the readings of one pass; rows grow with what is written in them. */
export function sheetFields(definition: TestDefinition, cells: Cells): SheetFields {
  return engineOf(definition.layout).fields(definition.layout, cells);
}

/** Every field of a sheet: those above the tables first, then row by row. */
export function allFields(fields: SheetFields): Field[] {
  const inTables = fields.tables.flatMap(fieldsOfTable);
  return [...fields.setUp, ...inTables];
}

export function fieldsOfTable(table: SheetFields['tables'][number]): Field[] {
  return table.rows.flatMap(({ cells }) => cells.flatMap((cell) => (cell && 'field' in cell ? [cell.field] : [])));
}
