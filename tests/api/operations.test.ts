import { setTimeout as pause } from 'node:timers/promises';
import fc from 'fast-check';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { POST as takeOperations } from '@/app/api/sheets/[id]/operations/route';
import { lockJob, setJobState } from '@/db/queries/jobs';
import { findSheet, updateSheet } from '@/db/queries/sheets';
import { newId } from '@/lib/id';
import { definitionOf } from '@/lib/planning/definition-of';
import type { ReadingOperation } from '@/lib/schemas/operation';
import { keepReadings, rulesOf } from '@/lib/services/keep-readings';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import type { Cells } from '@/lib/sheet/types';
import type { Unit } from '@/lib/units/unit';
import { type Asked, Workshop } from './workshop';

/** A main spindle's nose: nine readings of one turn, and nothing to set up. */
const nose = 'SP-1a:S1';
const collars = 'WP-1:T1:Z1:S1';
const machine = 'LK32-0O81-B';

let workshop: Workshop;
let jobId: string;
let sheetId: string;
let passId: string;
let seq = 0;

beforeAll(async () => {
  workshop = await Workshop.open();
});
afterAll(() => workshop?.close());

async function freshSheet(key = nose): Promise<void> {
  const planned = await workshop.plannedJob(machine, [key]);
  jobId = planned.jobId;
  ({ sheetId, passId } = planned.sheets.get(key)!);
}
beforeEach(() => freshSheet());

const cell = (angle: number) => `/insertions/0/readings/${angle}`;

function operation(cellId: string, text: string, more: Partial<ReadingOperation> = {}): ReadingOperation {
  seq += 1;
  return {
    opId: newId(),
    passId,
    cellId,
    baseVersion: 0,
    text,
    unit: 'µm',
    source: 'typed',
    deviceTime: '2026-03-10T10:10:00+01:00',
    seq,
    ...more,
  };
}

const send = (operations: ReadingOperation[], asked: Asked = {}) =>
  workshop.call(takeOperations, {
    path: `/api/sheets/${sheetId}/operations`,
    params: { id: sheetId },
    body: { operations },
    ...asked,
  });

/** All that is kept of the sheet; what is only a moment of the clock is left out. */
async function kept(): Promise<{ readings: Record<string, unknown>; log: number; result: unknown }> {
  return workshop.as('inspector', async (trx) => {
    const readings: { pointer: string; text: string; version: number; value: string | null; unit: string | null }[] =
      await trx('readings')
        .where({ pass_id: passId })
        .orderBy('pointer')
        .select('pointer', 'text', 'version', 'value', 'unit');
    const result = await trx('pass_results')
      .where({ pass_id: passId })
      .first('state', 'deviation_um', 'tolerance_um', 'limit_um', 'margin_um', 'verdict', 'displayed_mm', 'outcome');
    const log = await trx('reading_operations').where({ sheet_id: sheetId }).select('id');
    return {
      readings: Object.fromEntries(readings.map(({ pointer, ...rest }) => [pointer, rest])),
      log: log.length,
      result: result ?? null,
    };
  });
}

const turn = ['-2.2', '-0.8', '0.2', '0.8', '0.2', '0', '-1', '-2', '-2.2'];
const wholeTurn = () => turn.map((text, angle) => operation(cell(angle), text));
const outcomes = (answer: { body: { results: { outcome: string }[] } }) =>
  answer.body.results.map(({ outcome }) => outcome);

describe('a batch', () => {
  it('is applied, judged, and answered for each change', async () => {
    const operations = wholeTurn();
    const { status, body } = await send(operations);
    expect(status).toBe(200);
    expect(body.results).toEqual(operations.map(({ opId }) => ({ opId, outcome: 'applied', version: 1 })));
    expect(body.passes).toMatchObject([
      {
        id: passId,
        version: 2,
        takenAt: '2026-03-10T09:10:00.000Z',
        outcome: { state: 'complete', filled: 9, total: 9 },
      },
    ]);
    const { readings, log, result } = await kept();
    expect(Object.values(readings)).toMatchObject(turn.map((text) => ({ text, version: 1, unit: 'µm' })));
    expect(log).toBe(9);
    expect(result).toMatchObject({ state: 'complete', deviation_um: '3', verdict: 'within-tolerance' });
  });

  it('sent three times leaves one state, and is answered `already`', async () => {
    const operations = wholeTurn();
    await send(operations);
    const once = await kept();
    for (let again = 0; again < 2; again++) {
      const answer = await send(operations);
      expect(answer.body.results).toEqual(operations.map(({ opId }) => ({ opId, outcome: 'already', version: 1 })));
      expect(answer.body.passes).toEqual([]);
      expect(await kept()).toEqual(once);
    }
  });

  it('keeps who took the readings first, whoever puts them right', async () => {
    await send(wholeTurn());
    await send([operation(cell(0), '-2', { baseVersion: 1, deviceTime: '2026-03-11T08:00:00Z' })], { as: 'reviewer' });
    const pass = await workshop.as('inspector', (trx) => trx('passes').where({ id: passId }).first());
    expect(pass).toMatchObject({ taken_by: 'T. Orrell', taken_at: new Date('2026-03-10T09:10:00Z') });
    const history = await workshop.as('inspector', (trx) =>
      trx('reading_operations')
        .where({ pointer: cell(0), sheet_id: sheetId })
        .orderBy('sequence')
        .select('text', 'account_name'),
    );
    expect(history).toEqual([
      { text: '-2.2', account_name: 'T. Orrell' },
      { text: '-2', account_name: 'J. Penhale' },
    ]);
  });

  it('of one cell goes in the device’s order, however it is shuffled', async () => {
    const [first, second, third] = [
      operation(cell(0), '1'),
      operation(cell(0), '11', { baseVersion: 1 }),
      operation(cell(0), '1.1', { baseVersion: 2 }),
    ];
    const { body } = await send([third, first, second]);
    expect(body.results).toEqual([
      { opId: third.opId, outcome: 'applied', version: 3 },
      { opId: first.opId, outcome: 'applied', version: 1 },
      { opId: second.opId, outcome: 'applied', version: 2 },
    ]);
    expect((await kept()).readings).toEqual({ [cell(0)]: { text: '1.1', version: 3, value: '1.1', unit: 'µm' } });
  });
});

describe('two people on one field', () => {
  it('a change over another version is a conflict: both texts are kept, the server’s stands', async () => {
    await send([operation(cell(0), '4')], { as: 'reviewer' });
    const mine = operation(cell(0), '5');
    const answer = await send([mine, operation(cell(1), '7')]);
    expect(answer.body.results[0]).toMatchObject({
      opId: mine.opId,
      outcome: 'conflict',
      server: { text: '4', unit: 'µm', version: 1, by: 'J. Penhale' },
    });
    expect(answer.body.results[1].outcome).toBe('applied');
    expect((await kept()).readings[cell(0)]).toMatchObject({ text: '4', version: 1 });
    const log = await workshop.as('inspector', (trx) =>
      trx('reading_operations').where({ id: mine.opId }).first('text', 'outcome', 'account_name'),
    );
    expect(log).toEqual({ text: '5', outcome: 'conflict', account_name: 'T. Orrell' });
    // The answer stays the one that it was, and the choice of the person is a change of its own.
    expect((await send([mine])).body.results[0]).toEqual(answer.body.results[0]);
    const chosen = operation(cell(0), '5', { baseVersion: 1, reason: 'chosen over “4” of J. Penhale' });
    expect(outcomes(await send([chosen]))).toEqual(['applied']);
    expect((await kept()).readings[cell(0)]).toMatchObject({ text: '5', version: 2 });
  });

  it('what was typed over a text in conflict never slips past it because the numbers fit by chance', async () => {
    await send([operation(cell(0), '4')], { as: 'reviewer' });
    const mine = [operation(cell(0), '5'), operation(cell(0), '6', { baseVersion: 1 })];
    expect(outcomes(await send(mine))).toEqual(['conflict', 'conflict']);
    expect(outcomes(await send([mine[0]!, operation(cell(0), '7', { baseVersion: 1 })]))).toEqual([
      'conflict',
      'conflict',
    ]);
    expect((await kept()).readings[cell(0)]).toMatchObject({ text: '4', version: 1 });
  });

  it('the same figure from two devices is no conflict; the same digits in another unit are one', async () => {
    await send([operation(cell(0), '0.5')], { as: 'reviewer' });
    expect(outcomes(await send([operation(cell(0), '0.5')]))).toEqual(['applied']);
    expect(outcomes(await send([operation(cell(0), '0.5', { unit: 'mm' })]))).toEqual(['conflict']);
    expect((await kept()).readings[cell(0)]).toMatchObject({ text: '0.5', unit: 'µm', version: 2 });
  });

  it('two batches at the same moment lose nothing', async () => {
    const halves = [wholeTurn().slice(0, 5), wholeTurn().slice(5)];
    const contested = ['10', '20', '30', '40'].map((text) => operation('/contested/0', text));
    const answers = await Promise.all([
      ...halves.map((half) => send(half)),
      ...contested.map((one) => send([one], { as: 'reviewer' })),
    ]);
    expect(answers.slice(0, 2).flatMap(outcomes)).toEqual(Array(9).fill('applied'));
    expect(answers.slice(2).flatMap(outcomes).sort()).toEqual(['applied', 'conflict', 'conflict', 'conflict']);
    const { readings, log, result } = await kept();
    expect(Object.keys(readings)).toHaveLength(10);
    expect(log).toBe(13);
    expect(result).toMatchObject({ state: 'complete', deviation_um: '3' });
  });
});

describe('what is refused', () => {
  it('stands aside and stops nothing else', async () => {
    const other = await workshop.plannedJob(machine, [nose]);
    const foreign = operation(cell(0), '9', { passId: other.sheets.get(nose)!.passId });
    const nowhere = operation(cell(0), '9', { passId: newId() });
    const { body } = await send([foreign, ...wholeTurn(), nowhere]);
    expect(outcomes({ body })).toEqual(['rejected', ...Array(9).fill('applied'), 'rejected']);
    expect(body.results[0].problem).toMatch(/does not belong to this sheet/);
    expect((await kept()).log).toBe(9);
  });

  it('an id that was used for another change acknowledges nothing', async () => {
    const first = operation(cell(0), '1');
    await send([first]);
    const [changed, moved] = [
      { ...first, text: '2', baseVersion: 1 },
      { ...first, cellId: cell(1) },
    ];
    expect(outcomes(await send([changed]))).toEqual(['rejected']);
    expect(outcomes(await send([moved]))).toEqual(['rejected']);
    expect((await kept()).readings).toMatchObject({ [cell(0)]: { text: '1', version: 1 } });
  });

  it('a test left out takes no readings until it is taken in again', async () => {
    const leftOut = { reason: 'not-possible' as const, text: 'chuck cannot come off' };
    await workshop.as('inspector', (trx) => updateSheet(trx, sheetId, 1, { leftOut, by: 'T. Orrell' }));
    const answer = await send([operation(cell(0), '1')]);
    expect(answer.body.results[0]).toMatchObject({ outcome: 'rejected', problem: expect.stringMatching(/left out/) });
    await workshop.as('inspector', (trx) => updateSheet(trx, sheetId, 2, { leftOut: null, by: 'T. Orrell' }));
    expect(outcomes(await send([operation(cell(0), '1')]))).toEqual(['applied']);
  });

  it.each(['issued', 'closed'] as const)('a job that is %s takes no readings, and its results stay', async (state) => {
    await send(wholeTurn());
    const before = await kept();
    await workshop.as('inspector', (trx) => setJobState(trx, jobId, state));
    const answer = await send([operation(cell(0), '50', { baseVersion: 1 })]);
    expect(answer.body.results[0]).toMatchObject({ outcome: 'rejected', problem: expect.stringMatching(/issued/) });
    const after = await kept();
    expect([after.readings, after.result]).toEqual([before.readings, before.result]);
  });

  it('a report that is being issued at this moment is waited for', async () => {
    await send(wholeTurn());
    let late: ReturnType<typeof send> | undefined;
    await workshop.as('reviewer', async (trx) => {
      await lockJob(trx, jobId);
      late = send([operation(cell(0), '50', { baseVersion: 1 })]);
      await pause(200);
      await setJobState(trx, jobId, 'issued');
    });
    expect(outcomes(await late!)).toEqual(['rejected']);
  });

  it('another organisation finds no such sheet', async () => {
    const { status, body } = await send(wholeTurn(), { as: 'stranger' });
    expect([status, body.title]).toEqual([404, 'Not found']);
    expect((await kept()).log).toBe(0);
  });

  it('nobody, and nobody who may not measure', async () => {
    expect((await send(wholeTurn(), { as: null })).status).toBe(401);
    expect((await send(wholeTurn(), { as: 'administrator' })).status).toBe(403);
    expect((await send(wholeTurn(), { as: 'customer' })).status).toBe(403);
    expect((await send(wholeTurn(), { headers: { origin: 'https://elsewhere.example' } })).status).toBe(403);
    expect((await kept()).log).toBe(0);
  });

  it('a request that does not fit names the fields', async () => {
    const wrong = [
      { ...operation(cell(0), '1'), unit: 'furlong' },
      { ...operation('no pointer', '1') },
      { ...operation(cell(0), '1'), organisationId: newId() },
    ];
    const { status, body } = await send(wrong as ReadingOperation[]);
    expect(status).toBe(422);
    expect(body.errors.map(({ pointer }: { pointer: string }) => pointer)).toEqual([
      '/operations/0/unit',
      '/operations/1/cellId',
      '/operations/2',
    ]);
    expect((await send([], {})).status).toBe(422);
    expect((await send(Array.from({ length: 101 }, () => operation(cell(0), '1')))).status).toBe(422);
  });
});

describe('a key', () => {
  const keyed = (operations: ReadingOperation[], key: string) =>
    send(operations, { headers: { 'idempotency-key': key } });

  it('gives the first answer again, word for word', async () => {
    const [key, operations] = [newId(), wholeTurn()];
    const first = await keyed(operations, key);
    expect(outcomes(first)).toEqual(Array(9).fill('applied'));
    expect(await keyed(operations, key)).toMatchObject({ status: first.status, body: first.body });
    expect((await kept()).log).toBe(9);
  });

  it('with another payload is refused, and nothing is written', async () => {
    const key = newId();
    await keyed([operation(cell(0), '1')], key);
    const { status, body } = await keyed([operation(cell(1), '2')], key);
    expect([status, body.title]).toEqual([422, 'Key used already']);
    expect(Object.keys((await kept()).readings)).toEqual([cell(0)]);
  });

  it('sent twice at once is worked on once', async () => {
    const [key, operations] = [newId(), wholeTurn()];
    const both = await Promise.all([keyed(operations, key), keyed(operations, key)]);
    expect(both.map(outcomes)).toEqual([Array(9).fill('applied'), Array(9).fill('applied')]);
    expect((await kept()).log).toBe(9);
  });

  it('belongs to the person: the same key of somebody else is another one', async () => {
    const key = newId();
    await keyed([operation(cell(0), '1')], key);
    const other = await send([operation(cell(1), '2')], { as: 'reviewer', headers: { 'idempotency-key': key } });
    expect(outcomes(other)).toEqual(['applied']);
  });
});

describe('a text', () => {
  const typed: [text: string, unit: Unit, value: string | null, keptUnit: Unit][] = [
    ['0,0026 mm', 'µm', '0.0026', 'mm'],
    ['−2,2', 'µm', '-2.2', 'µm'],
    ['–0.003mm', 'µm', '-0.003', 'mm'],
    ['+1,50', 'µm', '1.50', 'µm'],
    ['−0', 'µm', '0', 'µm'],
    ['0.0001 in', 'µm', '0.0001', 'in'],
    ['123456789012345678901234567890.123456789', 'µm', '123456789012345678901234567890.123456789', 'µm'],
    ['0.1', 'mm', '0.1', 'mm'],
    ['1.234,5', 'µm', null, 'µm'],
    ['3 4', 'µm', null, 'µm'],
    ['about 5', 'µm', null, 'µm'],
    ['', 'µm', null, 'µm'],
  ];

  it('is kept as typed, with the exact figure beside it, or with none when it cannot be read', async () => {
    const operations = typed.map(([text, unit], index) => operation(`/probe/${index}`, text, { unit }));
    expect(outcomes(await send(operations))).toEqual(typed.map(() => 'applied'));
    const { readings } = await kept();
    expect(typed.map((_, index) => readings[`/probe/${index}`])).toEqual(
      typed.map(([text, , value, unit]) => ({ text, version: 1, value, unit })),
    );
    const types = await workshop.owner.raw(
      `select pg_typeof(value)::text as value, pg_typeof(text)::text as text from (select (null::readings).*) r`,
    );
    expect(types.rows).toEqual([{ value: 'numeric', text: 'text' }]);
  });

  it('that cannot be read keeps the sheet from a result, and says which', async () => {
    const operations = wholeTurn();
    operations[3] = operation(cell(3), '0.8.1');
    const { body } = await send(operations);
    expect(body.passes[0].outcome).toMatchObject({
      state: 'not-yet',
      problems: [{ pointer: cell(3), severity: 'cannot-read' }],
    });
    expect(await kept()).toMatchObject({ readings: { [cell(3)]: { text: '0.8.1', value: null } }, result: null });
    const mended = await send([operation(cell(3), '0,8', { baseVersion: 1 })]);
    expect(mended.body.passes[0].outcome.state).toBe('complete');
    expect((await kept()).result).toMatchObject({ deviation_um: '3' });
    // Emptied again: no result may stay behind.
    await send([operation(cell(3), '', { baseVersion: 2 })]);
    expect((await kept()).result).toBeNull();
  });

  it('in another unit counts in its own: 0,0026 mm in a column of µm', async () => {
    const operations = wholeTurn();
    operations[3] = operation(cell(3), '0,0026 mm');
    await send(operations);
    expect((await kept()).result).toMatchObject({ deviation_um: '4.8' });
  });
});

it('the result kept is what judging the kept readings gives', async () => {
  await freshSheet(collars);
  const { body } = await send([
    operation('/D1', '40,0120', { unit: 'mm' }),
    operation('/D2', '40.0085', { unit: 'mm' }),
    operation('/distance', '70', { unit: 'mm', baseVersion: 1 }),
  ]);
  await workshop.as('inspector', async (trx) => {
    const sheet = (await findSheet(trx, sheetId))!;
    const rows = await trx('readings').where({ pass_id: passId }).select('pointer', 'text', 'unit');
    const cells: Cells = Object.fromEntries(rows.map(({ pointer, text, unit }) => [pointer, { text, unit }]));
    const judged = judgeSheet(rulesOf(sheet, 'simple'), definitionOf(sheet.definition), cells);
    if (judged.state !== 'complete') throw new Error(JSON.stringify(judged));
    expect(body.passes[0].outcome).toEqual(JSON.parse(JSON.stringify(judged)));
    expect(judged.result.deviation).toBe('1.75');
    expect((await kept()).result).toEqual({
      state: 'complete',
      deviation_um: judged.result.deviation,
      tolerance_um: judged.judgement.toleranceUm,
      limit_um: judged.judgement.limitUm,
      margin_um: judged.judgement.marginUm,
      verdict: judged.judgement.verdict,
      displayed_mm: judged.displayed.textMm,
      outcome: JSON.parse(JSON.stringify(judged)),
    });
  });
});

describe('O-2: whatever is sent again, in whatever order', () => {
  /** Changes of three cells in the order typed, cut into requests; each request then arrives any number of times after its first. */
  const scenario = fc.record({
    texts: fc.array(fc.record({ angle: fc.nat(2), text: fc.constantFrom('1', '2,5', '-0.8', '', 'x', '−3 µm') }), {
      minLength: 1,
      maxLength: 9,
    }),
    cuts: fc.array(fc.boolean(), { minLength: 9, maxLength: 9 }),
    replays: fc.array(fc.record({ after: fc.nat(8), which: fc.nat(8), times: fc.integer({ min: 1, max: 3 }) }), {
      maxLength: 4,
    }),
    shuffle: fc.array(fc.nat(1000), { minLength: 9, maxLength: 9 }),
  });

  it('the sheet ends in the same state', async () => {
    const author = workshop.viewer('inspector');
    const keep = (operations: ReadingOperation[]) =>
      workshop.as('inspector', (trx) => keepReadings(trx, sheetId, operations, author));
    await fc.assert(
      fc.asyncProperty(scenario, async ({ texts, cuts, replays, shuffle }) => {
        const typed = (): ReadingOperation[] => {
          const versions = [0, 0, 0];
          return texts.map(({ angle, text }) => operation(cell(angle), text, { baseVersion: versions[angle]!++ }));
        };
        await freshSheet();
        await keep(typed());
        const plain = await kept();

        await freshSheet();
        const requests: ReadingOperation[][] = [];
        typed().forEach((one, index) => {
          if (requests.length === 0 || cuts[index]) requests.push([one]);
          else requests.at(-1)!.push(one);
        });
        for (const [index, request] of requests.entries()) {
          await keep(
            request
              .map((one, k) => [shuffle[k]!, one] as const)
              .sort(([a], [b]) => a - b)
              .map(([, one]) => one),
          );
          for (const replay of replays.filter(({ after }) => after % requests.length === index)) {
            const again = requests[replay.which % (index + 1)]!;
            for (let time = 0; time < replay.times; time++) {
              const { results } = await keep(again);
              expect(results.every(({ outcome }) => outcome === 'already')).toBe(true);
            }
          }
        }
        expect(await kept()).toEqual(plain);
      }),
      { numRuns: 25 },
    );
  });
});
