import type { Db } from '@/db/client';
import { ownOrganisation } from '@/db/queries/organisations';
import { currentOwnDefinitions } from '@/db/queries/own-definitions';
import { holdingToleranceValues, newestToleranceValues, type ToleranceValueRow } from '@/db/queries/tolerance-values';
import { type CsvCell, writeCsv } from '@/lib/csv/write-csv';
import { catalogueWithOwn } from '@/lib/planning/catalogue-with-own';
import { type CellState, cellStates } from '@/lib/planning/cell-states';
import { formatDay } from '@/lib/reporting/format-time';
import type { TestDefinition } from '@/standards/types';

/** Columns of the table of values, in their order; the same in both ways. */
export const valuesColumns = [
  'code',
  'edition',
  'test',
  'version',
  'title',
  'cell',
  'figure',
  'unit',
  'state',
  'confirmedBy',
  'confirmedOn',
  'ofEdition',
  'clause',
  'secondBy',
  'remark',
] as const;
export type ValuesColumn = (typeof valuesColumns)[number];

export interface TestWithCells {
  test: TestDefinition;
  cells: CellState<ToleranceValueRow>[];
}

/** Every current test, own ones too, with the state of each of its figures. */
export async function testsWithCells(db: Db): Promise<TestWithCells[]> {
  const holding = await holdingToleranceValues(db);
  const newest = await newestToleranceValues(db);
  return catalogueWithOwn(await currentOwnDefinitions(db))
    .flatMap(({ tests }) => tests)
    .map((test) => ({ test, cells: cellStates(test, holding, newest) }));
}

/** The organisation's values as a table: every figure of every current test, confirmed or not. */
export async function valuesAsCsv(db: Db): Promise<string> {
  const { timeZone } = await ownOrganisation(db);
  const rows = (await testsWithCells(db)).flatMap(({ test, cells }) =>
    cells.map((cell) => valuesRow(test, cell, timeZone)),
  );
  return writeCsv([[...valuesColumns], ...rows]);
}

function valuesRow(test: TestDefinition, cell: CellState<ToleranceValueRow>, timeZone: string): CsvCell[] {
  const said = cell.waiting ?? cell.holding;
  const columns: Record<ValuesColumn, CsvCell> = {
    code: test.code,
    edition: test.edition,
    test: test.id,
    version: { figure: String(test.version) },
    title: test.title,
    cell: cell.cell,
    figure: { figure: said?.figure ?? cell.toleranceUm },
    unit: cell.unit,
    state: said?.state ?? 'unconfirmed',
    confirmedBy: said?.accountName ?? null,
    confirmedOn: said ? formatDay(said.recordedAt, timeZone) : null,
    ofEdition: said?.ofEdition ?? null,
    clause: said?.clause ?? null,
    secondBy: cell.waiting ? waitsForSecond : (said?.secondAccountName ?? null),
    remark: said?.remark ?? null,
  };
  return valuesColumns.map((column) => columns[column]);
}

/** Stands in `secondBy` where the second person has not agreed yet. */
const waitsForSecond = 'waiting';
