import type { Db } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import { ownOrganisation } from '@/db/queries/organisations';
import { insertToleranceValues, type NewToleranceValue, type ToleranceValueRow } from '@/db/queries/tolerance-values';
import type { Viewer } from '@/lib/auth/viewer';
import { invalid } from '@/lib/errors';
import type { CellState } from '@/lib/planning/cell-states';
import { decimalFigure } from '@/lib/schemas/tolerance-value';
import { Fraction } from '@/lib/units/fraction';
import type { TestDefinition } from '@/standards/types';
import { type ImportProblem, readTable, type TableRow } from './values-import-table';
import { type TestWithCells, testsWithCells, type ValuesColumn } from './values-table';

export interface ImportChange {
  line: number;
  code: string;
  edition: string;
  test: string;
  title: string;
  cell: string;
  /** In `unit`; null: withdrawn. */
  figure: string | null;
  unit: string;
  before: string;
  state: 'confirmed' | 'replaced' | 'withdrawn';
}

export interface ImportOutcome {
  preview: boolean;
  lines: number;
  unchanged: number;
  changes: ImportChange[];
  problems: ImportProblem[];
}

/**
 * Takes a table of values over, as it is written by `valuesAsCsv` or filled in elsewhere. Each changed line becomes what the importing
 * person says of the figure (with two people wanted, it waits for the second); lines that say what holds already, and those marked
 * `unconfirmed`, change nothing. Who confirmed a line before, and when, is not taken over: an import cannot speak for others.
 * @param preview true: only say what would happen; false: take it over, and nothing at all where a line has a problem
 * @throws DomainError 422 with every problem, when it is to be taken over
 */
export async function importValues(db: Db, viewer: Viewer, csv: string, preview: boolean): Promise<ImportOutcome> {
  const read = readTable(csv);
  const tests = await testsWithCells(db);
  const outcome: ImportOutcome = {
    preview,
    lines: read.rows.length,
    unchanged: 0,
    changes: [],
    problems: read.problems,
  };
  const values: Omit<NewToleranceValue, 'needsSecond' | 'account'>[] = [];
  const seen = new Map<string, number>();
  for (const row of read.rows) {
    const found = locate(row, tests, seen, outcome.problems);
    const said = found && readWord(row, found, outcome.problems);
    if (!said) continue;
    if (said === 'unchanged') outcome.unchanged += 1;
    else {
      values.push(said);
      outcome.changes.push(asChange(row, found, said));
    }
  }
  outcome.problems.sort((a, b) => a.line - b.line);
  if (preview) return outcome;
  if (outcome.problems.length > 0)
    throw invalid(
      outcome.problems.map(({ line, column, detail }) => ({
        pointer: '/csv',
        detail: `Line ${line}${column && `, ${column}`}: ${detail}`,
      })),
    );
  const { id: organisationId, fourEyes } = await ownOrganisation(db);
  await insertToleranceValues(
    db,
    values.map((value) => ({ ...value, account: viewer, needsSecond: fourEyes && value.state !== 'withdrawn' })),
  );
  if (values.length > 0)
    await recordEvent(db, viewer, {
      ...{ action: 'tolerance.imported', subjectType: 'organisation', subjectId: organisationId },
      detail: { changes: outcome.changes },
    });
  return outcome;
}

interface Found {
  test: TestDefinition;
  cell: CellState<ToleranceValueRow>;
}

function locate(
  { line, text }: TableRow,
  tests: TestWithCells[],
  seen: Map<string, number>,
  problems: ImportProblem[],
): Found | null {
  const wrong = (column: ValuesColumn, detail: string) => {
    problems.push({ line, column, detail });
    return null;
  };
  const ofCode = tests.filter(({ test }) => test.code === text.code && test.edition === text.edition);
  if (ofCode.length === 0) {
    const known = tests.find(({ test }) => test.code === text.code);
    return known
      ? wrong('edition', `The catalogue has no edition “${text.edition}” of ${text.code}.`)
      : wrong('code', `The catalogue has no code “${text.code}”.`);
  }
  const found = ofCode.find(({ test }) => test.id === text.test);
  if (!found) return wrong('test', `There is no test “${text.test}” of ${text.code}.`);
  if (String(found.test.version) !== text.version)
    return wrong('version', `${text.test} is at version ${found.test.version}: look at its figures again.`);
  const cell = found.cells.find((one) => one.cell === text.cell);
  if (!cell) return wrong('cell', `${text.test} has no figure “${text.cell}”.`);
  const key = JSON.stringify([text.code, text.edition, text.test, text.cell]);
  const before = seen.get(key);
  if (before !== undefined) return wrong('cell', `The same figure stands in line ${before}.`);
  seen.set(key, line);
  return { test: found.test, cell };
}

type Said = Omit<NewToleranceValue, 'needsSecond' | 'account'>;

/** What a line says of its figure; null where it cannot be read, with the problems. */
function readWord({ line, text }: TableRow, found: Found, problems: ImportProblem[]): Said | 'unchanged' | null {
  const { test, cell } = found;
  const wrong = (column: ValuesColumn, detail: string) => problems.push({ line, column, detail });
  const before = problems.length;
  const { state } = text;
  if (state !== 'confirmed' && state !== 'replaced' && state !== 'withdrawn' && state !== 'unconfirmed') {
    wrong('state', `“${text.state}” is none of confirmed, replaced, withdrawn, unconfirmed.`);
    return null;
  }
  if (text.unit.replace('\u03bc', 'µ') !== cell.unit) wrong('unit', `This figure is given in ${cell.unit}.`);
  const { definition, remark } = { definition: test, remark: text.remark === '' ? null : text.remark };
  if (state === 'withdrawn') {
    if (problems.length > before) return null;
    if (!cell.holding && !cell.waiting) return 'unchanged';
    return { definition, cell: cell.cell, state, figure: null, unit: cell.unit, ofEdition: '', clause: '', remark };
  }
  const figure = decimalFigure.safeParse(text.figure);
  if (!figure.success) wrong('figure', figure.error.issues[0]?.message ?? 'This is no figure.');
  const asPrinted = figure.success && sameFigure(figure.data, cell.toleranceUm);
  if (state === 'unconfirmed') {
    const now = cell.waiting ?? cell.holding;
    if (figure.success && !asPrinted && !(now?.figure && sameFigure(figure.data, now.figure)))
      wrong('state', `The catalogue has ${cell.toleranceUm}. A figure of your own is “replaced”.`);
    return problems.length > before ? null : 'unchanged';
  }
  if (state === 'confirmed' && figure.success && !asPrinted)
    wrong('figure', `Only the catalogue’s ${cell.toleranceUm} can be confirmed; a figure of your own is “replaced”.`);
  checkLength(text.ofEdition, 'ofEdition', 60, 'the edition of your copy', wrong);
  checkLength(text.clause, 'clause', 120, 'page or clause', wrong);
  if ((remark ?? '').length > 500) wrong('remark', 'The remark is longer than 500 characters.');
  if (problems.length > before || !figure.success) return null;
  const said: Said = {
    ...{ definition, cell: cell.cell, state, figure: figure.data, unit: cell.unit },
    ...{ ofEdition: text.ofEdition, clause: text.clause, remark },
  };
  return [cell.holding, cell.waiting].some((row) => row && saysTheSame(row, said)) ? 'unchanged' : said;
}

function checkLength(
  text: string,
  column: ValuesColumn,
  most: number,
  what: string,
  wrong: (column: ValuesColumn, detail: string) => void,
): void {
  if (text === '') wrong(column, `Give ${what}.`);
  if (text.length > most) wrong(column, `Longer than ${most} characters.`);
}

const sameFigure = (a: string, b: string): boolean => Fraction.from(a).compare(Fraction.from(b)) === 0;

const saysTheSame = (row: ToleranceValueRow, said: Said): boolean =>
  row.state === said.state &&
  row.figure !== null &&
  said.figure !== null &&
  sameFigure(row.figure, said.figure) &&
  row.ofEdition === said.ofEdition &&
  row.clause === said.clause &&
  row.remark === said.remark;

function asChange({ line, text }: TableRow, { test, cell }: Found, said: Said): ImportChange {
  const { state, figure, unit } = said;
  return {
    ...{ line, code: text.code, edition: text.edition, test: test.id, title: test.title, cell: cell.words },
    ...{ figure, unit, before: cell.figure, state },
  };
}
