import type { Db } from '@/db/client';
import { holdJob } from '@/db/queries/jobs';
import { applyOperations } from '@/db/queries/operations';
import { findPass, listPasses, listReadings, type PassRow } from '@/db/queries/passes';
import { keepResult } from '@/db/queries/results';
import { lockSheet, type SheetRow } from '@/db/queries/sheets';
import { notFound } from '@/lib/errors';
import { definitionOf } from '@/lib/planning/definition-of';
import type { OperationAnswer, ReadingOperation } from '@/lib/schemas/operation';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import type { Cells, SheetOutcome, SheetRules } from '@/lib/sheet/types';

export interface KeptReadings {
  results: OperationAnswer[];
  passes: { id: string; version: number; takenAt: string | null; outcome: SheetOutcome }[];
}

export function rulesOf(sheet: SheetRow, decisionRule: SheetRules['decisionRule']): SheetRules {
  const { definition, tolerance, direction, ruleSet } = sheet;
  return { definition, tolerance, direction, ruleSet, decisionRule };
}

export const closedBecause = (state: string): string | null =>
  state === 'open' || state === 'in-check'
    ? null
    : 'The report of this job has been issued: its readings do not change any more.';

/** Judges a pass from what is stored and keeps the result. */
export async function judgePass(
  db: Db,
  sheet: SheetRow,
  passId: string,
  decisionRule: SheetRules['decisionRule'],
): Promise<SheetOutcome> {
  const readings = await listReadings(db, [passId]);
  const cells: Cells = Object.fromEntries(readings.map((row) => [row.pointer, { text: row.text, unit: row.unit }]));
  const outcome = judgeSheet(rulesOf(sheet, decisionRule), definitionOf(sheet.definition, sheet.ownDefinition), cells);
  await keepResult(db, passId, sheet.ruleSet, outcome);
  return outcome;
}

/** Applies a batch of operations to a sheet and judges the passes that it changed, in the caller's transaction. */
export async function keepReadings(
  db: Db,
  sheetId: string,
  operations: ReadingOperation[],
  author: { accountId: string; name: string },
): Promise<KeptReadings> {
  const sheet = await lockSheet(db, sheetId);
  const job = sheet && (await holdJob(db, sheet.jobId));
  if (!sheet || !job) throw notFound('sheet');
  const passes = await listPasses(db, [sheetId]);
  const writable = new Set(passes.filter((pass) => pass.linkedTo === null).map((pass) => pass.id));
  const closed = sheet.leftOutReason
    ? 'This test has been left out. Take it into the plan again first.'
    : closedBecause(job.state);
  const results = await applyOperations(db, sheetId, writable, operations, author, closed);
  const applied = new Set(results.filter((answer) => answer.outcome === 'applied').map((answer) => answer.opId));
  const changed = [
    ...new Set(operations.filter((operation) => applied.has(operation.opId)).map((operation) => operation.passId)),
  ];
  const answers: KeptReadings['passes'] = [];
  for (const passId of changed) {
    await noteTaking(db, passes, passId, operations, author.name);
    const outcome = await judgePass(db, sheet, passId, job.decisionRule);
    const pass = await findPass(db, passId);
    answers.push({ id: passId, version: pass?.version ?? 0, takenAt: pass?.takenAt?.toISOString() ?? null, outcome });
  }
  return { results, passes: answers };
}

/** The first reading says when a pass was taken and by whom; both can be put right on the sheet. */
async function noteTaking(
  db: Db,
  passes: PassRow[],
  passId: string,
  operations: ReadingOperation[],
  name: string,
): Promise<void> {
  const pass = passes.find((row) => row.id === passId);
  const first = operations.find((operation) => operation.passId === passId && operation.source !== 'planned');
  await db('passes')
    .where({ id: passId })
    .update({
      version: db.raw('version + 1'),
      ...(pass?.takenAt || !first ? {} : { taken_at: first.deviceTime, taken_by: name }),
    });
}
