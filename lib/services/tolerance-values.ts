import type { Db } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import { ownOrganisation } from '@/db/queries/organisations';
import { currentOwnDefinitions } from '@/db/queries/own-definitions';
import {
  agreeToToleranceValue,
  holdingToleranceValues,
  insertToleranceValues,
  isNewestToleranceValue,
  lockToleranceValue,
  newestToleranceValues,
  type ToleranceValueRow,
  toleranceValueHistory,
} from '@/db/queries/tolerance-values';
import type { Viewer } from '@/lib/auth/viewer';
import { conflict, type FieldError, forbidden, invalid, notFound } from '@/lib/errors';
import { findTestWithOwn } from '@/lib/planning/catalogue-with-own';
import { type CellState, cellStates } from '@/lib/planning/cell-states';
import { toleranceCells } from '@/lib/planning/organisation-values';
import type { ToleranceValuesForm } from '@/lib/schemas/tolerance-value';
import type { TestDefinition } from '@/standards/types';

/** A test of the catalogue or an own one. @throws DomainError 404 */
export async function findTest(db: Db, code: string, test: string) {
  const found = findTestWithOwn(code, test, await currentOwnDefinitions(db));
  if (!found) throw notFound('test');
  return found;
}

export interface ToleranceValuesOfTest {
  cells: CellState<ToleranceValueRow>[];
  /** Everything that was said, newest first. */
  history: ToleranceValueRow[];
}

export async function toleranceValuesOf(db: Db, definition: TestDefinition): Promise<ToleranceValuesOfTest> {
  const history = await toleranceValueHistory(db, definition);
  const holding = await holdingToleranceValues(db);
  return { cells: cellStates(definition, holding, await newestToleranceValues(db)), history };
}

/**
 * Writes down what a person says of figures of one test. With two people wanted, it waits for the second one; a withdrawal holds at
 * once, so that a figure that somebody doubts is not used meanwhile.
 * @throws DomainError 422 naming the figure that the test does not have; 409 where nothing was said that could be withdrawn
 */
export async function sayOfTolerance(
  db: Db,
  viewer: Viewer,
  definition: TestDefinition,
  form: ToleranceValuesForm,
): Promise<string[]> {
  const known = new Map(toleranceCells(definition).map((cell) => [cell.cell, cell]));
  const errors: FieldError[] = [];
  form.cells.forEach(({ cell }, index) => {
    const pointer = `/cells/${index}/cell`;
    if (!known.has(cell)) errors.push({ pointer, detail: `This test has no figure “${cell}”.` });
    else if (form.cells.findIndex((other) => other.cell === cell) < index)
      errors.push({ pointer, detail: 'This figure stands there twice.' });
  });
  if (errors.length > 0) throw invalid(errors);
  if (form.state === 'withdrawn') await refuseEmptyWithdrawal(db, definition, form);
  const { fourEyes } = await ownOrganisation(db);
  const ids = await insertToleranceValues(
    db,
    form.cells.map((said) => {
      const { cell, toleranceUm, unit } = known.get(said.cell)!;
      const figure = form.state === 'withdrawn' ? null : 'figure' in said ? said.figure : toleranceUm;
      return {
        ...{ definition, cell, state: form.state, figure, unit, remark: form.remark, account: viewer },
        ofEdition: form.state === 'withdrawn' ? '' : form.ofEdition,
        clause: form.state === 'withdrawn' ? '' : form.clause,
        needsSecond: fourEyes && form.state !== 'withdrawn',
      };
    }),
  );
  const { id, code, edition, version } = definition;
  for (const [index, subjectId] of ids.entries()) {
    await recordEvent(db, viewer, {
      ...{ action: 'tolerance.confirmed', subjectType: 'tolerance', subjectId },
      detail: { test: { id, code, edition, version }, ...form.cells[index], state: form.state },
    });
  }
  return ids;
}

async function refuseEmptyWithdrawal(db: Db, definition: TestDefinition, form: ToleranceValuesForm): Promise<void> {
  const { cells } = await toleranceValuesOf(db, definition);
  const errors = form.cells.flatMap(({ cell }, index) => {
    const found = cells.find((one) => one.cell === cell);
    if (found?.holding || found?.waiting) return [];
    return [{ pointer: `/cells/${index}/cell`, detail: `Nobody has said anything of “${found?.words}”.` }];
  });
  if (errors.length > 0) throw invalid(errors);
}

/**
 * The second person has looked the value up too: it holds from now on.
 * @throws DomainError 403 for the person who wrote it down; 409 where it does not wait, or something newer was said of the figure
 */
export async function agreeToTolerance(db: Db, viewer: Viewer, id: string): Promise<ToleranceValueRow> {
  const row = await lockToleranceValue(db, id);
  if (!row) throw notFound('value');
  if (!row.needsSecond) throw conflict('This value waits for nobody.');
  if (row.secondAccountId) throw conflict(`${row.secondAccountName} has agreed already.`);
  if (row.accountId === viewer.accountId)
    throw forbidden('You wrote this value down yourself: somebody else has to look it up too.');
  if (!(await isNewestToleranceValue(db, row)))
    throw conflict('Something newer was said of this figure meanwhile. Look at it again.');
  await agreeToToleranceValue(db, id, viewer);
  const { definition, cell, figure } = row;
  await recordEvent(db, viewer, {
    ...{ action: 'tolerance.agreed', subjectType: 'tolerance', subjectId: id },
    detail: { test: definition, cell, figure },
  });
  return (await lockToleranceValue(db, id)) ?? row;
}
