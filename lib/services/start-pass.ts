import type { Db } from '@/db/client';
import { holdJob } from '@/db/queries/jobs';
import { insertPass, listPasses, listReadings, type PassRow } from '@/db/queries/passes';
import { listResults } from '@/db/queries/results';
import { lockSheet, type SheetRow } from '@/db/queries/sheets';
import { conflict, notFound } from '@/lib/errors';
import { definitionOf } from '@/lib/planning/definition-of';
import { sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells } from '@/lib/sheet/types';
import type { CellDefault } from '@/standards/types';
import { closedBecause } from './keep-readings';

/**
 * Begins another set of readings of a sheet. The set-up of the newest one is carried over; readings never are.
 * `linkTo`: as left = as found, nothing was done and nothing is typed again.
 */
export async function startPass(
  db: Db,
  sheetId: string,
  pass: { kind: PassRow['kind']; linkTo: string | null },
  by: { name: string },
): Promise<string> {
  const sheet = await lockSheet(db, sheetId);
  const job = sheet && (await holdJob(db, sheet.jobId));
  if (!sheet || !job) throw notFound('sheet');
  const closed = closedBecause(job.state);
  if (closed) throw conflict(closed);
  const passes = await listPasses(db, [sheetId]);
  const number = passes.filter((row) => row.kind === pass.kind).length + 1;
  if (pass.kind === 'as-found' && number > 1)
    throw conflict('The readings as found are taken once, before anything is touched.');
  if (pass.linkTo) return linkPass(db, sheet, passes, pass.linkTo, number, by.name);
  const newest = passes.filter((row) => row.linkedTo === null).at(-1);
  const setUp = newest ? await carriedSetUp(db, sheet, newest.id) : sheet.setUp;
  return insertPass(db, { sheetId, kind: pass.kind, number, linkedTo: null, setUp });
}

async function carriedSetUp(db: Db, sheet: SheetRow, passId: string): Promise<Record<string, CellDefault>> {
  const readings = await listReadings(db, [passId]);
  const cells: Cells = Object.fromEntries(readings.map((row) => [row.pointer, { text: row.text, unit: row.unit }]));
  const fields = sheetFields(definitionOf(sheet.definition, sheet.ownDefinition), cells);
  const taken = new Set(fields.order);
  return Object.fromEntries(Object.entries(cells).filter(([pointer, cell]) => !taken.has(pointer) && cell.text !== ''));
}

async function linkPass(
  db: Db,
  sheet: SheetRow,
  passes: PassRow[],
  linkTo: string,
  number: number,
  by: string,
): Promise<string> {
  const found = passes.find((row) => row.id === linkTo && row.kind === 'as-found');
  if (!found) throw conflict('As left can only be linked to the readings as found of the same sheet.');
  if (passes.some((row) => row.linkedTo !== null)) throw conflict('As left is declared to be as found already.');
  if (passes.some((row) => row.kind !== 'as-found' && row.takenAt !== null))
    throw conflict('Readings were taken after those as found: as left cannot be declared to be as found any more.');
  const [result] = await listResults(db, [found.id]);
  if (result?.state !== 'complete')
    throw conflict('The readings as found are not complete: they cannot stand for as left.');
  return insertPass(db, {
    sheetId: sheet.id,
    kind: 'as-left',
    number,
    linkedTo: found.id,
    setUp: {},
    takenAt: found.takenAt,
    takenBy: by,
  });
}
