import type { Db } from '@/db/client';
import { newId } from '@/lib/id';
import type { OperationAnswer, ReadingOperation } from '@/lib/schemas/operation';
import type { Unit } from '@/lib/units/unit';
import { own } from './jobs';
import { figureOf, listReadings } from './passes';

interface Cell {
  text: string;
  unit: Unit | null;
  version: number;
  by: string | null;
  at: Date;
}

interface Author {
  accountId: string;
  name: string;
}

/**
 * Applies operations to the fields of a sheet, in the order given, once each: an operation that is known already is answered as it was
 * answered then; one that was typed over another version is a conflict, and both texts are kept. The caller holds the sheet's lock.
 *
 * @param passIds passes of the sheet that may be written to
 * @param closed says why nothing may be written, or null
 */
export async function applyOperations(
  db: Db,
  sheetId: string,
  passIds: Set<string>,
  operations: ReadingOperation[],
  author: Author,
  closed: string | null,
): Promise<OperationAnswer[]> {
  const known = await knownOperations(
    db,
    operations.map((operation) => operation.opId),
  );
  const cells = await currentCells(
    db,
    [...new Set(operations.map((operation) => operation.passId))].filter((id) => passIds.has(id)),
  );
  const answers: OperationAnswer[] = [];
  const changed = new Map<string, ReadingOperation & { version: number }>();
  const log: Record<string, unknown>[] = [];

  for (const operation of operations) {
    const earlier = known.get(operation.opId);
    if (earlier) {
      answers.push(earlier);
      continue;
    }
    const key = `${operation.passId} ${operation.cellId}`;
    const cell = cells.get(key);
    const answer = decide(operation, cell, passIds, closed);
    answers.push(answer);
    known.set(operation.opId, answer.outcome === 'applied' ? { ...answer, outcome: 'already' } : answer);
    if (answer.outcome === 'applied') {
      cells.set(key, {
        text: operation.text,
        unit: operation.unit,
        version: answer.version,
        by: author.name,
        at: new Date(),
      });
      changed.set(key, { ...operation, version: answer.version });
    }
    if (passIds.has(operation.passId)) log.push(logRow(db, sheetId, operation, answer, author));
  }
  if (log.length > 0) await db('reading_operations').insert(log);
  await writeReadings(db, [...changed.values()]);
  return answers;
}

function decide(
  operation: ReadingOperation,
  cell: Cell | undefined,
  passIds: Set<string>,
  closed: string | null,
): OperationAnswer {
  const { opId } = operation;
  if (!passIds.has(operation.passId))
    return { opId, outcome: 'rejected', problem: 'This set of readings does not belong to this sheet.' };
  if (closed) return { opId, outcome: 'rejected', problem: closed };
  const version = cell?.version ?? 0;
  // The same text over another version is no conflict: two devices agree.
  if (operation.baseVersion !== version && cell?.text !== operation.text) {
    return {
      opId,
      outcome: 'conflict',
      server: {
        text: cell?.text ?? '',
        unit: cell?.unit ?? null,
        version,
        by: cell?.by ?? null,
        at: (cell?.at ?? new Date(0)).toISOString(),
      },
    };
  }
  return { opId, outcome: 'applied', version: version + 1 };
}

async function knownOperations(db: Db, opIds: string[]): Promise<Map<string, OperationAnswer>> {
  const rows: { id: string; outcome: OperationAnswer['outcome']; version: number | null; problem: string | null }[] =
    await db('reading_operations').whereIn('id', opIds).select('id', 'outcome', 'version', 'problem');
  return new Map(
    rows.map((row) => [
      row.id,
      row.outcome === 'conflict'
        ? ({ opId: row.id, outcome: 'conflict', server: JSON.parse(row.problem ?? '{}') } as OperationAnswer)
        : row.outcome === 'rejected'
          ? { opId: row.id, outcome: 'rejected', problem: row.problem ?? '' }
          : { opId: row.id, outcome: 'already', version: row.version ?? 0 },
    ]),
  );
}

async function currentCells(db: Db, passIds: string[]): Promise<Map<string, Cell>> {
  const [readings, authors] = await Promise.all([
    listReadings(db, passIds),
    db('reading_operations')
      .whereIn('pass_id', passIds)
      .where({ outcome: 'applied' })
      .distinctOn('pass_id', 'pointer')
      .orderBy([{ column: 'pass_id' }, { column: 'pointer' }, { column: 'sequence', order: 'desc' }])
      .select({ passId: 'pass_id', pointer: 'pointer', by: 'account_name' }) as Promise<
      { passId: string; pointer: string; by: string }[]
    >,
  ]);
  const by = new Map(authors.map((row) => [`${row.passId} ${row.pointer}`, row.by]));
  return new Map(
    readings.map((row) => {
      const key = `${row.passId} ${row.pointer}`;
      return [
        key,
        { text: row.text, unit: row.unit, version: row.version, by: by.get(key) ?? null, at: row.updatedAt },
      ];
    }),
  );
}

const logRow = (db: Db, sheetId: string, operation: ReadingOperation, answer: OperationAnswer, author: Author) => ({
  organisation_id: own(db),
  id: operation.opId,
  sheet_id: sheetId,
  pass_id: operation.passId,
  pointer: operation.cellId,
  base_version: operation.baseVersion,
  text: operation.text,
  unit: operation.unit,
  source: operation.source,
  device_time: operation.deviceTime,
  reason: operation.reason ?? null,
  outcome: answer.outcome,
  version: answer.outcome === 'applied' ? answer.version : null,
  problem:
    answer.outcome === 'conflict'
      ? JSON.stringify(answer.server)
      : answer.outcome === 'rejected'
        ? answer.problem
        : null,
  account_id: author.accountId,
  account_name: author.name,
});

async function writeReadings(db: Db, changed: (ReadingOperation & { version: number })[]): Promise<void> {
  if (changed.length === 0) return;
  await db('readings')
    .insert(
      changed.map((operation) => ({
        organisation_id: own(db),
        id: newId(),
        pass_id: operation.passId,
        pointer: operation.cellId,
        text: operation.text,
        ...figureOf(operation.text, operation.unit),
        source: operation.source,
        version: operation.version,
        device_time: operation.deviceTime,
        updated_at: db.fn.now(),
      })),
    )
    .onConflict(['organisation_id', 'pass_id', 'pointer'])
    .merge(['text', 'value', 'unit', 'source', 'version', 'device_time', 'updated_at']);
}

export interface CellChange {
  passId: string;
  pointer: string;
  text: string;
  unit: string | null;
  by: string;
  at: Date;
  reason: string | null;
}

/** Every text that ever stood in the fields of these passes, oldest first. */
export const listChanges = (db: Db, passIds: string[]): Promise<CellChange[]> =>
  db('reading_operations').whereIn('pass_id', passIds).where({ outcome: 'applied' }).orderBy('sequence').select({
    passId: 'pass_id',
    pointer: 'pointer',
    text: 'text',
    unit: 'unit',
    by: 'account_name',
    at: 'device_time',
    reason: 'reason',
  });
