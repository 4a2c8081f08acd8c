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
 * Applies operations to the fields of a sheet, once each and in the device's own order (`seq`, not its clock): an operation that is
 * known already is answered as it was answered then; one that was typed over another version is a conflict, and both texts are kept.
 * The answers stand in the order of the operations. The caller holds the sheet's lock.
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
  const answers = new Array<OperationAnswer>(operations.length);
  const inOrder = operations.map((operation, index) => ({ operation, index }));
  inOrder.sort((a, b) => a.operation.seq - b.operation.seq);
  const undecided = new Set<string>();
  const changed = new Map<string, ReadingOperation & { version: number }>();
  const log: Record<string, unknown>[] = [];

  for (const { operation, index } of inOrder) {
    const key = `${operation.passId} ${operation.cellId}`;
    const earlier = known.get(operation.opId);
    if (earlier) {
      answers[index] = sameChange(earlier, operation) ? earlier.answer : usedAlready(operation);
      if (earlier.answer.outcome === 'conflict') undecided.add(key);
      continue;
    }
    const cell = cells.get(key);
    const answer = decide(operation, cell, passIds, closed, undecided.has(key));
    answers[index] = answer;
    known.set(operation.opId, {
      ...operation,
      answer: answer.outcome === 'applied' ? { ...answer, outcome: 'already' } : answer,
    });
    if (answer.outcome === 'conflict') undecided.add(key);
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

/** An operation that the server has answered for, with what it wanted. */
type KnownOperation = Pick<ReadingOperation, 'passId' | 'cellId' | 'text'> & { answer: OperationAnswer };

const sameChange = (earlier: KnownOperation, operation: ReadingOperation): boolean =>
  earlier.passId === operation.passId && earlier.cellId === operation.cellId && earlier.text === operation.text;

/** Answering `already` here would let the device forget a text that the server never kept. */
const usedAlready = ({ opId }: ReadingOperation): OperationAnswer => ({
  opId,
  outcome: 'rejected',
  problem: 'The id of this change belongs to another change that was sent before.',
});

/** `0.5` and `0.5` agree only when both mean the same unit; a unit typed with the figure counts before the column's. */
const agrees = (cell: Cell | undefined, { text, unit }: ReadingOperation): boolean =>
  cell !== undefined && cell.text === text && figureOf(text, cell.unit).unit === figureOf(text, unit).unit;

function decide(
  operation: ReadingOperation,
  cell: Cell | undefined,
  passIds: Set<string>,
  closed: string | null,
  behindConflict: boolean,
): OperationAnswer {
  const { opId } = operation;
  if (!passIds.has(operation.passId))
    return { opId, outcome: 'rejected', problem: 'This set of readings does not belong to this sheet.' };
  if (closed) return { opId, outcome: 'rejected', problem: closed };
  const version = cell?.version ?? 0;
  // The same figure over another version is no conflict: two devices agree. What was typed over a text that is itself in conflict may
  // fit the stranger's version by chance: it waits for the same decision.
  if ((behindConflict || operation.baseVersion !== version) && !agrees(cell, operation)) {
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

async function knownOperations(db: Db, opIds: string[]): Promise<Map<string, KnownOperation>> {
  const rows: {
    id: string;
    passId: string;
    cellId: string;
    text: string;
    outcome: OperationAnswer['outcome'];
    version: number | null;
    problem: string | null;
  }[] = await db('reading_operations').whereIn('id', opIds).select({
    id: 'id',
    passId: 'pass_id',
    cellId: 'pointer',
    text: 'text',
    outcome: 'outcome',
    version: 'version',
    problem: 'problem',
  });
  return new Map(
    rows.map(({ id, passId, cellId, text, outcome, version, problem }) => {
      const answer =
        outcome === 'conflict'
          ? ({ opId: id, outcome, server: JSON.parse(problem ?? '{}') } as OperationAnswer)
          : outcome === 'rejected'
            ? { opId: id, outcome, problem: problem ?? '' }
            : { opId: id, outcome: 'already' as const, version: version ?? 0 };
      return [id, { passId, cellId, text, answer }];
    }),
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
    .merge(['text', 'value', 'unit', 'resolution', 'source', 'version', 'device_time', 'updated_at']);
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
