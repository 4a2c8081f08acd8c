import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  applyAnswers,
  baseVersion,
  countLog,
  decideConflict,
  type LoggedOperation,
  nextBatch,
  nextSequence,
  type OperationLog,
  rejectOperations,
  textOver,
} from '@/components/sheet/operation-log';
import { saveWords } from '@/components/sheet/save-words';
import type { OperationAnswer, ReadingOperation } from '@/lib/schemas/operation';

const change = (opId: string, cellId: string, text: string, seq: number, base: number): LoggedOperation => ({
  sheetId: 'sheet',
  jobId: 'job',
  sheetTitle: 'Nose run-out',
  state: 'waiting',
  operation: {
    opId,
    passId: 'pass',
    cellId,
    baseVersion: base,
    text,
    unit: 'µm',
    source: 'typed',
    deviceTime: '2026-03-10T08:00:00Z',
    seq,
  },
});
const theirs = { text: '9', unit: 'µm', version: 4, by: 'J. Penhale', at: '2026-03-10T08:01:00Z' };

describe('what is sent', () => {
  it('sends of each cell its oldest change only, in the order typed', () => {
    const log = [change('a', '/r/0', '1', 1, 0), change('b', '/r/0', '2', 2, 1), change('c', '/r/1', '3', 3, 0)];
    expect(nextBatch(log)?.operations.map((operation) => operation.opId)).toEqual(['a', 'c']);
  });

  it('sends no more than the server takes, and one sheet at a time', () => {
    const many = Array.from({ length: 150 }, (_, k) => change(`op${k}`, `/r/${k}`, '1', k, 0));
    const other = { ...change('z', '/r/0', '1', 999, 0), sheetId: 'other' };
    expect(nextBatch([...many, other])?.operations).toHaveLength(100);
    expect(nextBatch([...many, other])?.operations.some((operation) => operation.opId === 'z')).toBe(false);
    expect(nextBatch([other])?.sheetId).toBe('other');
  });

  it('holds later changes of a cell back while its conflict waits for a decision', () => {
    const { log } = applyAnswers(
      [change('a', '/r/0', '1', 1, 0), change('b', '/r/0', '2', 2, 1)],
      [{ opId: 'a', outcome: 'conflict', server: theirs }],
    );
    expect(nextBatch(log)).toBeNull();
    expect(countLog(log)).toEqual({ waiting: 1, conflicts: 1, rejected: 0 });
  });
});

describe('answers', () => {
  it('lays the next change of the cell over the version that the server gave', () => {
    const { log, updates } = applyAnswers(
      [change('a', '/r/0', '1', 1, 6), change('b', '/r/0', '2', 2, 7)],
      [{ opId: 'a', outcome: 'already', version: 12 }],
    );
    expect(log.map((entry) => entry.operation)).toMatchObject([{ opId: 'b', baseVersion: 12 }]);
    expect(updates).toEqual([
      { sheetId: 'sheet', passId: 'pass', cellId: '/r/0', cell: { text: '1', unit: 'µm', version: 12 } },
    ]);
  });

  it('moves a refused change aside and lets the rest go on', () => {
    const log = [change('a', '/r/0', 'x', 1, 3), change('b', '/r/0', '2', 2, 4), change('c', '/r/1', '5', 3, 0)];
    const after = rejectOperations(log, new Map([['a', 'The report has been issued.']]));
    expect(after[0]).toMatchObject({ state: 'rejected', problem: 'The report has been issued.' });
    expect(nextBatch(after)?.operations).toMatchObject([{ opId: 'b', baseVersion: 3 }, { opId: 'c' }]);
    expect(textOver([after[0]!], { text: '8', unit: 'µm', version: 3 }, 'pass', '/r/0').text).toBe('8');
  });

  it('changes nothing for an operation that another tab has settled', () => {
    const log = [change('a', '/r/0', '1', 1, 0)];
    expect(applyAnswers(log, [{ opId: 'gone', outcome: 'applied', version: 1 }])).toEqual({ log, updates: [] });
  });
});

describe('a conflict', () => {
  const conflicted = (): OperationLog =>
    applyAnswers(
      [change('a', '/r/0', '1', 1, 0), change('b', '/r/0', '2', 2, 1)],
      [{ opId: 'a', outcome: 'conflict', server: theirs }],
    ).log;
  const made = { opId: 'new', deviceTime: '2026-03-10T08:02:00Z' };

  it('shows the own text until somebody decides', () => {
    expect(textOver(conflicted(), { text: '9', unit: 'µm', version: 4 }, 'pass', '/r/0').text).toBe('2');
  });

  it('sends the own texts over the server’s version when they are chosen', () => {
    const log = decideConflict(conflicted(), 'a', 'own', made);
    expect(nextBatch(log)?.operations).toMatchObject([
      { opId: 'new', text: '1', baseVersion: 4, reason: 'chosen over “9” of J. Penhale' },
    ]);
    expect(applyAnswers(log, [{ opId: 'new', outcome: 'applied', version: 5 }]).log.at(0)?.operation).toMatchObject({
      opId: 'b',
      text: '2',
      baseVersion: 5,
    });
  });

  it('records the choice when the server’s text is kept', () => {
    const log = decideConflict(conflicted(), 'a', 'server', made);
    expect(log.map((entry) => entry.operation)).toMatchObject([
      { opId: 'new', text: '9', baseVersion: 4, reason: '“9” of J. Penhale chosen over “1”, “2”' },
    ]);
  });
});

describe('numbers of a device', () => {
  it('rise even when the clock is put back', () => {
    expect(nextSequence([], 500, 100)).toBe(501);
    expect(nextSequence([change('a', '/r/0', '1', 900, 0)], 0, 100)).toBe(901);
    expect(nextSequence([], 0, 100)).toBe(100);
  });
});

describe('whatever gets lost on the way', () => {
  /** The server of db/queries/operations.ts in small: each operation once, over its version only. */
  class Server {
    cells = new Map<string, { text: string; version: number }>();
    answered = new Map<string, OperationAnswer>();
    take(operations: readonly ReadingOperation[]): OperationAnswer[] {
      return operations.map((operation) => {
        const known = this.answered.get(operation.opId);
        if (known) return known.outcome === 'applied' ? { ...known, outcome: 'already' as const } : known;
        const cell = this.cells.get(operation.cellId) ?? { text: '', version: 0 };
        const answer: OperationAnswer =
          operation.baseVersion === cell.version
            ? { opId: operation.opId, outcome: 'applied', version: cell.version + 1 }
            : { opId: operation.opId, outcome: 'conflict', server: { ...theirs, ...cell } };
        if (answer.outcome === 'applied')
          this.cells.set(operation.cellId, { text: operation.text, version: answer.version });
        this.answered.set(operation.opId, answer);
        return answer;
      });
    }
  }

  it('ends with the newest text of each cell, nothing twice and no conflict with itself', () => {
    const step = fc.oneof(
      fc.record({ kind: fc.constant('type' as const), cell: fc.nat(3), text: fc.stringMatching(/^\d{1,3}$/) }),
      fc.record({ kind: fc.constant('send' as const), replyLost: fc.boolean(), limit: fc.integer({ min: 1, max: 4 }) }),
    );
    fc.assert(
      fc.property(fc.array(step, { maxLength: 60 }), (steps) => {
        const server = new Server();
        let log: OperationLog = [];
        let seq = 0;
        const typed = new Map<string, string[]>();
        const send = (limit: number, replyLost: boolean) => {
          const batch = nextBatch(log, limit);
          if (!batch) return false;
          const answers = server.take(batch.operations);
          if (!replyLost) log = applyAnswers(log, answers).log;
          return true;
        };
        for (const one of steps) {
          if (one.kind === 'send') send(one.limit, one.replyLost);
          else {
            const cellId = `/r/${one.cell}`;
            const known = server.cells.get(cellId);
            const base = baseVersion(log, known ? { ...known, unit: 'µm' } : undefined, 'pass', cellId);
            seq = nextSequence(log, seq, 0);
            log = [...log, change(`op${seq}`, cellId, one.text, seq, base)];
            typed.set(cellId, [...(typed.get(cellId) ?? []), one.text]);
          }
        }
        while (send(100, false)) expect(countLog(log).conflicts).toBe(0);
        expect(log).toEqual([]);
        for (const [cellId, texts] of typed) {
          expect(server.cells.get(cellId)).toEqual({ text: texts.at(-1), version: texts.length });
        }
      }),
    );
  });
});

describe('the line that says where the readings are', () => {
  const state = {
    waiting: 0,
    conflicts: 0,
    rejected: 0,
    unwritten: 0,
    storage: 'ready' as const,
    server: 'reached' as const,
    serverTime: '14:02',
  };
  it.each([
    [{}, 'All on server 14:02'],
    [{ waiting: 3 }, 'On this device: 3 waiting · server 14:02'],
    [{ waiting: 3, server: 'signed-out' as const }, 'On this device: 3 waiting · sign in to send'],
    [{ waiting: 1, unwritten: 1, storage: 'full' as const }, 'Not saved – storage full'],
    [{ conflicts: 1, rejected: 1 }, '2 need a decision'],
    [{ conflicts: 1, waiting: 2 }, '1 needs a decision · 2 waiting'],
  ])('%o', (change, words) => {
    expect(saveWords({ ...state, ...change }).words).toBe(words);
  });
});
