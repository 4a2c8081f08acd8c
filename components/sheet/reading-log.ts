import { ApiProblem, type api } from '@/lib/http/api-client';
import { newId } from '@/lib/id';
import type { OperationAnswer, ReadingOperation } from '@/lib/schemas/operation';
import type { SheetOutcome } from '@/lib/sheet/types';
import { type DeviceStore, isFull } from './device-store';
import {
  applyAnswers,
  type CellUpdate,
  cellKey,
  countLog,
  decideConflict,
  type KnownCell,
  type LoggedOperation,
  newestOwn,
  nextBatch,
  nextSequence,
  type OperationLog,
  rejectOperations,
  sortedLog,
  versionAfter,
  withoutOperation,
} from './operation-log';
import type { SaveState } from './save-words';

export interface PassAnswer {
  id: string;
  version: number;
  takenAt: string | null;
  outcome: SheetOutcome;
}

interface BatchAnswer {
  results: OperationAnswer[];
  passes: PassAnswer[];
}

export type Change = Pick<ReadingOperation, 'passId' | 'cellId' | 'text' | 'unit' | 'source'> & { reason?: string };

export type SheetPlace = Pick<LoggedOperation, 'sheetId' | 'jobId' | 'sheetTitle'>;

interface Surroundings {
  store: DeviceStore;
  send: typeof api;
  /** Time of the day in words, for the state line. */
  clockTime: (at: Date) => string;
}

const retryFirstMs = 2_000;
const retryLongestMs = 60_000;
const requestTimeoutMs = 20_000;
/** Not the reading's fault: it stays and is sent again. */
const triesAgain = (status: number) =>
  status === 0 ||
  status === 401 ||
  status === 403 ||
  status === 408 ||
  status === 409 ||
  status === 429 ||
  status >= 500;

/**
 * The log of one person on one device: writes every change to the device before it counts as kept, sends it, takes the answers in.
 * It knows nothing of fields; whoever shows them listens.
 */
export class ReadingLog {
  log: OperationLog = [];
  state: SaveState;
  private readonly unwritten = new Set<string>();
  private lastSequence = 0;
  private failures = 0;
  private sending = false;
  private timer: ReturnType<typeof setTimeout> | undefined;
  private lastBatch: { body: string; key: string } | null = null;
  private readonly listeners = new Set<() => void>();
  private readonly onUpdates = new Set<(updates: CellUpdate[], passes: PassAnswer[]) => void>();

  constructor(
    private readonly around: Surroundings,
    serverTime: string | null = null,
  ) {
    this.state = {
      waiting: 0,
      conflicts: 0,
      rejected: 0,
      unwritten: 0,
      storage: 'ready',
      server: 'reached',
      serverTime,
    };
  }

  subscribe = (listener: () => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** Hears of every cell that the server has taken. */
  listen(listener: (updates: CellUpdate[], passes: PassAnswer[]) => void): () => void {
    this.onUpdates.add(listener);
    return () => this.onUpdates.delete(listener);
  }

  snapshot = () => this.state;

  /** Takes in what waits on the device from earlier, or from another tab. */
  async load(): Promise<void> {
    try {
      const stored = await this.around.store.load();
      const known = new Set(this.log.map((entry) => entry.operation.opId));
      this.log = sortedLog([...this.log, ...stored.filter((entry) => !known.has(entry.operation.opId))]);
    } catch {
      this.state = { ...this.state, storage: 'unavailable' };
    }
    this.changed();
  }

  /** Starts sending by itself: now, when the network or the tab comes back, and again after a failure. */
  start(): () => void {
    const wake = () => {
      if (document.visibilityState === 'visible') void this.load().then(() => this.sendNow());
    };
    window.addEventListener('online', wake);
    document.addEventListener('visibilitychange', wake);
    void this.sendNow();
    return () => {
      window.removeEventListener('online', wake);
      document.removeEventListener('visibilitychange', wake);
      clearTimeout(this.timer);
    };
  }

  /** One committed change of a field. Shown as waiting at once, as kept when the device has it; sent after that. */
  commit(sheet: SheetPlace, changes: readonly { change: Change; known: KnownCell | undefined }[]): Promise<void> {
    const added: LoggedOperation[] = [];
    const newest = new Map(newestOwn(this.log));
    for (const { change, known } of changes) {
      const key = cellKey(change.passId, change.cellId);
      this.lastSequence = nextSequence(this.log, this.lastSequence, Date.now());
      const entry: LoggedOperation = {
        ...sheet,
        state: 'waiting',
        operation: {
          opId: newId(),
          baseVersion: versionAfter(newest.get(key), known),
          deviceTime: new Date().toISOString(),
          seq: this.lastSequence,
          ...change,
        },
      };
      newest.set(key, entry);
      added.push(entry);
    }
    this.log = [...this.log, ...added];
    return this.keep(added, []).then(() => this.sendNow());
  }

  decide(opId: string, choice: 'own' | 'server'): void {
    const before = this.log;
    this.log = decideConflict(this.log, opId, choice, { opId: newId(), deviceTime: new Date().toISOString() });
    void this.keepDifference(before).then(() => this.sendNow());
  }

  /** A refused change that has been read is taken off the device. */
  putAside(opId: string): void {
    const before = this.log;
    this.log = withoutOperation(this.log, opId);
    void this.keepDifference(before);
  }

  async sendNow(): Promise<void> {
    if (this.sending) return;
    this.sending = true;
    clearTimeout(this.timer);
    try {
      for (let batch = nextBatch(this.log); batch; batch = nextBatch(this.log)) {
        if (!(await this.sendBatch(batch))) break;
      }
    } finally {
      this.sending = false;
    }
  }

  private async sendBatch(batch: { sheetId: string; operations: ReadingOperation[] }): Promise<boolean> {
    const body = { operations: batch.operations };
    const text = `${batch.sheetId} ${JSON.stringify(body)}`;
    if (this.lastBatch?.body !== text) this.lastBatch = { body: text, key: newId() };
    try {
      const { data } = await this.around.send<BatchAnswer>(`/api/sheets/${batch.sheetId}/operations`, {
        method: 'POST',
        body,
        idempotencyKey: this.lastBatch.key,
        signal: AbortSignal.timeout(requestTimeoutMs),
      });
      const before = this.log;
      const { log, updates } = applyAnswers(this.log, data.results);
      // Taken in while the operations still stand in the log: a field that somebody has typed over meanwhile, even back to what it was
      // before, is seen to differ from what was sent, and keeps what is being typed.
      for (const listener of this.onUpdates) listener(updates, data.passes);
      this.log = log;
      this.reached('reached');
      await this.keepDifference(before);
      return true;
    } catch (error) {
      return this.refused(batch.operations, error);
    }
  }

  private async refused(operations: ReadingOperation[], error: unknown): Promise<boolean> {
    const problem = error instanceof ApiProblem ? error : null;
    if (!problem || triesAgain(problem.status)) {
      this.failures += 1;
      this.reached(problem?.status === 401 ? 'signed-out' : problem?.status === 403 ? 'refusing' : 'unreachable');
      this.timer = setTimeout(() => void this.sendNow(), this.pauseMs());
      return false;
    }
    const before = this.log;
    this.log = rejectOperations(this.log, whoseFault(operations, problem));
    this.reached('reached');
    await this.keepDifference(before);
    return true;
  }

  /** Half of the pause is chance, so that tablets that lost the same network do not all come back in the same moment. */
  private pauseMs(): number {
    const pause = Math.min(retryFirstMs * 2 ** (this.failures - 1), retryLongestMs);
    return pause / 2 + (Math.random() * pause) / 2;
  }

  private reached(server: SaveState['server']): void {
    if (server === 'reached') this.failures = 0;
    const serverTime = server === 'reached' ? this.around.clockTime(new Date()) : this.state.serverTime;
    this.state = { ...this.state, server, serverTime };
    this.changed();
  }

  private keepDifference(before: OperationLog): Promise<void> {
    const stood = new Set(before);
    const changed = this.log.filter((entry) => !stood.has(entry));
    const now = new Set(this.log.map((entry) => entry.operation.opId));
    return this.keep(
      changed,
      before.map((entry) => entry.operation.opId).filter((opId) => !now.has(opId)),
    );
  }

  private async keep(changed: LoggedOperation[], removed: string[]): Promise<void> {
    for (const entry of changed) this.unwritten.add(entry.operation.opId);
    for (const opId of removed) this.unwritten.delete(opId);
    this.changed();
    try {
      await this.around.store.write(changed, removed);
      for (const entry of changed) this.unwritten.delete(entry.operation.opId);
      this.state = { ...this.state, storage: 'ready' };
    } catch (error) {
      // Still in memory, and still sent: only the line says that the device holds nothing.
      this.state = { ...this.state, storage: isFull(error) ? 'full' : 'unavailable' };
    }
    this.changed();
  }

  private changed(): void {
    this.state = { ...this.state, ...countLog(this.log), unwritten: this.unwritten.size };
    for (const listener of this.listeners) listener();
  }
}

/** Which changes a refused batch is to be blamed on: those that the errors name; otherwise all. */
function whoseFault(operations: ReadingOperation[], problem: ApiProblem): Map<string, string> {
  const named = problem.errors.flatMap(({ pointer, detail }) => {
    const operation = operations[Number(/^\/operations\/(\d+)/.exec(pointer)?.[1] ?? -1)];
    return operation ? [[operation.opId, detail] as const] : [];
  });
  return new Map(named.length > 0 ? named : operations.map((operation) => [operation.opId, problem.detail] as const));
}
