import { expect, it } from 'vitest';
import type { LoggedOperation } from '@/components/sheet/operation-log';
import { ReadingLog } from '@/components/sheet/reading-log';
import { SheetSession } from '@/components/sheet/sheet-session';
import { takenWords } from '@/components/sheet/text-import/taken-words';
import { ApiProblem } from '@/lib/http/api-client';
import { readingOperation } from '@/lib/schemas/operation';
import { guessChoices, importText } from '@/lib/sheet/text-import/import-text';
import type { SheetRules } from '@/lib/sheet/types';
import { currentDefinitions } from '@/standards/registry';
import type { TestDefinition } from '@/standards/types';

const passId = '01a230df-d079-72c0-ad15-1ecefe8eca0b';
const definition: TestDefinition = {
  ...currentDefinitions()[0]!,
  method: 'positioning',
  layout: { kind: 'target-cycles', quantity: 'linear', cycles: 2, targets: ['0', '100'] },
};
const rules: SheetRules = {
  definition: { id: definition.id, code: definition.code, edition: definition.edition, version: definition.version },
  tolerance: null,
  direction: 'either',
  decisionRule: 'simple',
};

function open() {
  const kept = new Map<string, LoggedOperation>();
  const store = {
    load: async () => [...kept.values()],
    write: async (entries: readonly LoggedOperation[], removed: readonly string[]) => {
      for (const entry of entries) kept.set(entry.operation.opId, entry);
      for (const opId of removed) kept.delete(opId);
    },
  };
  const log = new ReadingLog({
    store,
    clockTime: () => '10:00',
    // No network: everything stays on the device.
    send: async () => {
      throw new ApiProblem({ status: 0, title: 'No network', detail: '', errors: [] } as never);
    },
  } as never);
  const cells = {
    '/targets/0': { text: '0', unit: 'mm' as const, version: 1 },
    '/targets/1': { text: '100', unit: 'mm' as const, version: 1 },
    '/forward/1/0': { text: '7', unit: 'µm' as const, version: 3 },
  };
  const session = new SheetSession(
    { sheetId: 'sheet', jobId: 'job', sheetTitle: 'Z1 positioning' },
    rules,
    definition,
    [{ id: passId, cells }],
    log,
  );
  return { session, log, kept };
}

const text =
  'target\tforward\tforward\tbackward\tbackward\n0\t0.001\t0.002\t-0.001\t0\n50\t0.003\t0.004\t0\t0.001\n200\t0.005\t0.006\t0.001\t0.002\n';

it('taking a text over is one change of each field, kept on the device as pasted, and one step back', async () => {
  const { session, log, kept } = open();
  const choices = { ...guessChoices(definition.layout, text), positions: 'replace' as const };
  expect(choices.columns).toEqual(['position', 'first', 'first', 'second', 'second']);
  const made = importText(definition, session.cellsOf(passId), text, {
    ...choices,
    units: { first: 'mm', second: 'mm' },
  });
  expect([made.problems, made.notes, made.over.length]).toEqual([[], [], 2]);
  // Looking at the preview has changed nothing.
  expect([log.log.length, session.textOf(passId, '/targets/1')]).toEqual([0, '100']);

  session.fill(passId, made.fills, 'paste');
  expect(session.textOf(passId, '/targets/2')).toBe('200');
  expect(session.cellAt(passId, '/backward/2/1')).toEqual({ text: '0.002 mm', unit: 'mm' });
  expect(session.evaluation(passId).outcome).toMatchObject({ state: 'complete', result: { method: 'positioning' } });
  await Promise.resolve();

  const operations = log.log.map(({ operation }) => operation);
  // Target 0 stands as it was: nothing to write there.
  expect(operations).toHaveLength(2 + 12);
  expect(new Set(operations.map(({ source }) => source))).toEqual(new Set(['paste']));
  for (const operation of operations) expect(readingOperation.safeParse(operation).success).toBe(true);
  expect(operations.find(({ cellId }) => cellId === '/forward/1/0')).toMatchObject({
    text: '0.003 mm',
    unit: 'mm',
    baseVersion: 3,
  });
  expect([...kept.keys()].sort()).toEqual(operations.map(({ opId }) => opId).sort());
  expect(takenWords(made)).toBe(
    '15 figures taken over from the text, 2 of the fields held something else before. Ctrl Z in a field takes all of it back.',
  );

  session.undoLast();
  expect(session.textOf(passId, '/targets/1')).toBe('100');
  expect(session.cellAt(passId, '/forward/1/0')).toEqual({ text: '7', unit: 'µm' });
  expect(session.textOf(passId, '/targets/2')).toBe('');
  expect(session.evaluation(passId).outcome.state).toBe('not-yet');
});

it('5,000 readings are taken over at once', () => {
  const circle: TestDefinition = {
    ...definition,
    method: 'circular',
    layout: { kind: 'circle-trace', anglesDeg: [], nominalRadiusMm: '100', arcDeg: '360' },
  };
  const log = open().log;
  const place = { sheetId: 'sheet', jobId: 'job', sheetTitle: 'Circle' };
  const session = new SheetSession(place, rules, circle, [{ id: passId, cells: {} }], log);
  const lines = Array.from({ length: 2500 }, (_, i) => `${(i * 0.144).toFixed(3)};${i % 7};${i % 5}`);
  const whole = `angle;cw;ccw\n${lines.join('\n')}\n`;
  const made = importText(circle, {}, whole, guessChoices(circle.layout, whole));
  expect([made.problems, made.fills.length]).toEqual([[], 10_000]);
  session.fill(passId, made.fills, 'paste');
  expect(log.log).toHaveLength(10_000);
});
