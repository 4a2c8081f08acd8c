import type { OperationAnswer, ReadingOperation, ServerCell } from '@/lib/schemas/operation';
import type { Unit } from '@/lib/units/unit';

/** A committed change as the device keeps it until the server has answered for it. */
export interface LoggedOperation {
  sheetId: string;
  /** Where the sheet is and what it is called, to lead back to it. */
  jobId: string;
  sheetTitle: string;
  operation: ReadingOperation;
  state: 'waiting' | 'conflict' | 'rejected';
  /** conflict: what the server holds instead. */
  server?: ServerCell;
  /** rejected: why. */
  problem?: string;
}

/** Oldest first (by `seq`). Every function here is pure: it answers a new log and leaves the old one as it is. */
export type OperationLog = readonly LoggedOperation[];

export interface KnownCell {
  text: string;
  unit: Unit | null;
  /** 0: the server has never held anything here. */
  version: number;
}

export interface CellUpdate {
  sheetId: string;
  passId: string;
  cellId: string;
  cell: KnownCell;
}

/** The server takes no more at once. */
export const batchLimit = 100;

export const cellKey = (passId: string, cellId: string) => `${passId} ${cellId}`;
const keyOf = (entry: LoggedOperation) => cellKey(entry.operation.passId, entry.operation.cellId);
const idOf = (entry: LoggedOperation) => entry.operation.opId;

export const sortedLog = (entries: readonly LoggedOperation[]): OperationLog =>
  [...entries].sort((a, b) => a.operation.seq - b.operation.seq);

/**
 * Numbers of a device rise, across reloads too, without being stored: the clock starts them, and a clock that was put back does not
 * lower them while something waits.
 */
export function nextSequence(log: OperationLog, last: number, nowMs: number): number {
  return Math.max(nowMs, last + 1, (log.at(-1)?.operation.seq ?? 0) + 1);
}

/**
 * Version that a new change of a cell is typed over. Behind a change that is still waiting this is only a forecast: it is put right
 * when the earlier one is answered, before the new one is ever sent.
 */
export function baseVersion(log: OperationLog, known: KnownCell | undefined, passId: string, cellId: string): number {
  return versionAfter(newestOwn(log).get(cellKey(passId, cellId)), known);
}

/** As `baseVersion`, where the newest own change of the cell is at hand. */
export function versionAfter(newest: LoggedOperation | undefined, known: KnownCell | undefined): number {
  return newest ? newest.operation.baseVersion + 1 : (known?.version ?? 0);
}

/** What stands in a cell: the newest own text that has not been refused, over what the server holds. */
export function textOver(log: OperationLog, known: KnownCell | undefined, passId: string, cellId: string): KnownCell {
  const own = newestOwn(log).get(cellKey(passId, cellId))?.operation;
  if (own) return { text: own.text, unit: own.unit, version: known?.version ?? 0 };
  return known ?? { text: '', unit: null, version: 0 };
}

/**
 * What to send next: of each cell only its oldest waiting change. Were two sent together and the first turned out a conflict, the
 * second could fit the stranger's version by chance and overwrite it unseen.
 */
export function nextBatch(
  log: OperationLog,
  limit = batchLimit,
): { sheetId: string; operations: ReadingOperation[] } | null {
  const seen = new Set<string>();
  const heads: LoggedOperation[] = [];
  for (const entry of log) {
    if (entry.state === 'rejected' || seen.has(keyOf(entry))) continue;
    seen.add(keyOf(entry));
    if (entry.state === 'waiting') heads.push(entry);
  }
  const sheetId = heads[0]?.sheetId;
  if (!sheetId) return null;
  const mine = heads.filter((entry) => entry.sheetId === sheetId).slice(0, limit);
  return { sheetId, operations: mine.map((entry) => entry.operation) };
}

/** Takes the server's answers in; an answer to something unknown (another tab was quicker) changes nothing. */
export function applyAnswers(
  log: OperationLog,
  answers: readonly OperationAnswer[],
): { log: OperationLog; updates: CellUpdate[] } {
  let next = [...log];
  const updates: CellUpdate[] = [];
  for (const answer of answers) {
    const entry = next.find((candidate) => idOf(candidate) === answer.opId);
    if (!entry) continue;
    if (answer.outcome === 'conflict') {
      next = replace(next, { ...entry, state: 'conflict', server: answer.server });
    } else if (answer.outcome === 'rejected') {
      next = rebase(
        replace(next, { ...entry, state: 'rejected', problem: answer.problem }),
        entry,
        entry.operation.baseVersion,
      );
    } else {
      const { passId, cellId, text, unit } = entry.operation;
      updates.push({ sheetId: entry.sheetId, passId, cellId, cell: { text, unit, version: answer.version } });
      next = rebase(
        next.filter((candidate) => candidate !== entry),
        entry,
        answer.version,
      );
    }
  }
  return { log: next, updates };
}

/** Moves changes aside that the server will never take as they are; the rest go on. */
export function rejectOperations(log: OperationLog, problems: ReadonlyMap<string, string>): OperationLog {
  return applyAnswers(
    log,
    [...problems].map(([opId, problem]) => ({ opId, outcome: 'rejected' as const, problem })),
  ).log;
}

/**
 * The person has picked one of two texts. The choice is a change of its own, typed over the server's version, and says why: so that
 * both texts and the choice stand in the history. Later own texts follow the own one, or are named in the reason and dropped.
 */
export function decideConflict(
  log: OperationLog,
  opId: string,
  choice: 'own' | 'server',
  made: Pick<ReadingOperation, 'opId' | 'deviceTime'>,
): OperationLog {
  const entry = log.find((candidate) => idOf(candidate) === opId);
  if (entry?.state !== 'conflict' || !entry.server) return log;
  const { server } = entry;
  const own = ownEntries(log, keyOf(entry));
  const texts = own.map(({ operation }) => `“${operation.text}”`).join(', ');
  const who = server.by ?? 'another device';
  const kept = `“${server.text}” of ${who}`;
  const operation: ReadingOperation = {
    ...entry.operation,
    ...made,
    baseVersion: server.version,
    ...(choice === 'server' ? { text: server.text, unit: server.unit as Unit | null } : {}),
    reason: (choice === 'own' ? `chosen over ${kept}` : `${kept} chosen over ${texts}`).slice(0, 500),
  };
  const { sheetId, jobId, sheetTitle } = entry;
  const decided: LoggedOperation = { sheetId, jobId, sheetTitle, operation, state: 'waiting' };
  const others = choice === 'server' ? log.filter((candidate) => candidate === entry || !own.includes(candidate)) : log;
  return others.map((candidate) => (candidate === entry ? decided : candidate));
}

export const withoutOperation = (log: OperationLog, opId: string): OperationLog =>
  log.filter((entry) => idOf(entry) !== opId);

export interface LogCounts {
  waiting: number;
  conflicts: number;
  rejected: number;
}

export function countLog(log: OperationLog): LogCounts {
  const count = (state: LoggedOperation['state']) => log.filter((entry) => entry.state === state).length;
  return { waiting: count('waiting'), conflicts: count('conflict'), rejected: count('rejected') };
}

const newestOf = new WeakMap<OperationLog, ReadonlyMap<string, LoggedOperation>>();

/** The newest own change of each cell (`cellKey`) that has not been refused. A log never changes, so it is gone through once. */
export function newestOwn(log: OperationLog): ReadonlyMap<string, LoggedOperation> {
  const ready = newestOf.get(log);
  if (ready) return ready;
  const made = new Map(log.flatMap((entry) => (entry.state === 'rejected' ? [] : [[keyOf(entry), entry] as const])));
  newestOf.set(log, made);
  return made;
}

const ownEntries = (log: OperationLog, key: string) =>
  log.filter((entry) => entry.state !== 'rejected' && keyOf(entry) === key);

const replace = (log: LoggedOperation[], changed: LoggedOperation) =>
  log.map((entry) => (idOf(entry) === idOf(changed) ? changed : entry));

/** The next change of the same cell was typed over what has just been answered. */
function rebase(log: LoggedOperation[], answered: LoggedOperation, version: number): LoggedOperation[] {
  const follower = log.find((entry) => entry.state === 'waiting' && keyOf(entry) === keyOf(answered));
  if (!follower) return log;
  return replace(log, { ...follower, operation: { ...follower.operation, baseVersion: version } });
}
