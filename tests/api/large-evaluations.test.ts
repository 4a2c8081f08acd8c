import { setTimeout as sleep } from 'node:timers/promises';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { POST } from '@/app/api/evaluations/route';
import { appDb } from '@/db/client';
import { type EvaluationInput, evaluate, evaluateUnknown } from '@/lib/evaluation';
import { countReadings } from '@/lib/evaluation/count-readings';
import { evaluationPool } from '@/lib/queue/evaluation-pool';
import { type ClonedDatabase, cloneDatabase } from '@/tests/helpers/clone-database';

let database: ClonedDatabase;
let address = 0;

beforeAll(async () => {
  database = await cloneDatabase();
  process.env.APP_DATABASE_URL = database.appUrl;
});
afterAll(async () => {
  evaluationPool().close();
  await appDb().destroy();
  globalThis.witnessmarkPool = undefined;
  await database.drop();
});
// Each test comes from an address of its own, so that none uses up what another is allowed.
beforeEach(() => {
  address += 1;
});
afterEach(() => {
  delete process.env.EVALUATION_TIME_LIMIT_MS;
});

async function ask(body: unknown, signal?: AbortSignal) {
  const response = await POST(
    new Request('http://127.0.0.1:3000/api/evaluations', {
      method: 'POST',
      headers: { 'content-type': 'application/json', 'x-forwarded-for': `198.51.100.${address}` },
      body: JSON.stringify(body),
      signal,
    }),
  );
  const { status, headers } = response;
  const text = await response.text();
  return { status, headers, body: text === '' ? null : JSON.parse(text) };
}

const figure = (i: number) => `${((i * 7919) % 1999) - 999}.${(i * 31) % 10}`;

const straightness = (count: number): EvaluationInput => ({
  method: 'straightness',
  reference: 'minimum-zone',
  points: Array.from({ length: count }, (_, i) => ({ position: String(i), reading: figure(i) })),
});
const small: EvaluationInput = { method: 'two-collar', D1: '40.012', D2: '40.009', distance: '100' };

/** A profile whose windows each need a fit of their own: several seconds of work in less than 2 MB. */
const slow: EvaluationInput = {
  method: 'straightness',
  reference: 'least-squares',
  localLength: '10000',
  points: Array.from({ length: 20_000 }, (_, i) => ({ position: String(i), reading: figure(i) })),
};

describe('where it is computed', () => {
  it('500 readings here, 501 in the process beside, with the same figures', async () => {
    const pool = evaluationPool();
    const here = await ask(straightness(500));
    expect([here.status, here.body]).toEqual([200, { result: evaluateUnknown(straightness(500)) }]);
    expect([pool.answered, pool.processId]).toEqual([0, undefined]);

    const beside = await ask(straightness(501));
    expect([beside.status, beside.body]).toEqual([200, { result: evaluateUnknown(straightness(501)) }]);
    expect(beside.headers.get('content-type')).toBe('application/json');
    expect(beside.headers.get('cache-control')).toBe('no-store');
    expect(pool.answered).toBe(1);
    expect(pool.processId).toBeGreaterThan(0);
    expect(pool.processId).not.toBe(process.pid);
  });

  it('the same process answers the next one', async () => {
    const before = evaluationPool().processId;
    expect((await ask(straightness(600))).status).toBe(200);
    expect(evaluationPool().processId).toBe(before);
  });

  it('a refusal from there is a refusal here', async () => {
    const broken = { ...straightness(501), reference: 'guess', extra: '1' };
    const { status, headers, body } = await ask(broken);
    expect([status, headers.get('content-type')]).toEqual([422, 'application/problem+json']);
    const pointers = body.errors.map((error: { pointer: string }) => error.pointer);
    expect(pointers).toEqual(expect.arrayContaining(['/reference', '/extra']));
  });

  it('a long text without readings goes there too', async () => {
    const before = evaluationPool().answered;
    const { status } = await ask({ ...small, note: 'x'.repeat(250_000) });
    expect([status, evaluationPool().answered]).toEqual([422, before + 1]);
  });
});

describe('5,000 readings are answered within 5 s', () => {
  const angles = Array.from({ length: 5000 }, (_, i) => (i * 0.072).toFixed(3));
  const inputs: EvaluationInput[] = [
    straightness(5000),
    {
      method: 'flatness',
      reference: 'minimum-zone',
      points: angles.map((_, i) => ({ x: String(i % 71), y: String(Math.floor(i / 71)), reading: figure(i) })),
    },
    { method: 'roundness', points: angles.map((angle, i) => ({ angle, reading: figure(i) })) },
    {
      method: 'circular',
      nominalRadius: '100',
      clockwise: angles.map((angle, i) => ({ angle, radius: figure(i) })),
    },
  ];

  it.each(inputs.map((input) => [input.method, input] as const))('%s, minimum zone', async (_, input) => {
    expect(countReadings(input)).toBe(5000);
    const answer = await ask(input);
    expect(answer.status).toBe(200);
    expect(answer.body.result.deviation).toBe((evaluate(input) as { deviation: string }).deviation);
  });
});

describe('past the time limit', () => {
  it('503 with an id and when to come again; the next one is answered', async () => {
    process.env.EVALUATION_TIME_LIMIT_MS = '1';
    const before = evaluationPool().processId;
    const { status, headers, body } = await ask(slow);
    expect([status, headers.get('content-type')]).toEqual([503, 'application/problem+json']);
    expect(Number(headers.get('retry-after'))).toBeGreaterThan(0);
    expect(body).toMatchObject({ status: 503, title: 'This takes too long', instance: '/api/evaluations' });
    expect(body.errorId).toMatch(/^[0-9a-f-]{36}$/);
    expect(body.detail).toContain('20000 readings');

    expect((await ask(small)).status).toBe(200);
    delete process.env.EVALUATION_TIME_LIMIT_MS;
    expect((await ask(straightness(501))).status).toBe(200);
    expect(evaluationPool().processId).not.toBe(before);
  });

  it('the server answers others all the while', async () => {
    process.env.EVALUATION_TIME_LIMIT_MS = '3000';
    await ask(straightness(501));
    let answered = false;
    const large = ask(slow).then((answer) => {
      answered = true;
      return answer;
    });
    for (let turn = 0; turn < 3; turn++) expect((await ask(small)).status).toBe(200);
    expect(answered).toBe(false);
    expect((await large).status).toBe(503);
  });
});

describe('when the process is lost', () => {
  it('the next evaluation gets another', async () => {
    await ask(straightness(501));
    const before = evaluationPool().processId!;
    process.kill(before, 'SIGKILL');
    expect((await ask(straightness(501))).status).toBe(200);
    expect(evaluationPool().processId).not.toBe(before);
  });

  it('an evaluation in hand is begun anew', async () => {
    await ask(straightness(501));
    const before = evaluationPool().processId!;
    const inHand = ask({ ...straightness(5000), localLength: '2500' });
    await sleep(100);
    process.kill(before, 'SIGKILL');
    expect((await inHand).status).toBe(200);
  });
});

describe('when more ask than there are places', () => {
  it('who comes too late is told when to come again; who goes away frees the place', async () => {
    await ask(straightness(501));
    const gone = new AbortController();
    const inHand = ask(slow, gone.signal);
    await sleep(200);
    const waiting = Array.from({ length: 8 }, () => ask(straightness(501)));
    await sleep(200);
    const { status, headers, body } = await ask(straightness(501));
    expect([status, body.title]).toEqual([503, 'Busy']);
    expect(Number(headers.get('retry-after'))).toBeGreaterThan(0);
    expect(body.errorId).toMatch(/^[0-9a-f-]{36}$/);

    gone.abort();
    expect((await inHand).status).toBe(499);
    expect((await Promise.all(waiting)).map((answer) => answer.status)).toEqual(new Array(8).fill(200));
  });

  it('who goes away while waiting is forgotten', async () => {
    const first = ask({ ...straightness(5000), localLength: '2500' });
    await sleep(50);
    const gone = new AbortController();
    const before = evaluationPool().answered;
    const waiting = ask(straightness(501), gone.signal);
    await sleep(50);
    gone.abort();
    expect((await waiting).status).toBe(499);
    expect((await first).status).toBe(200);
    expect((await ask(straightness(501))).status).toBe(200);
    expect(evaluationPool().answered).toBe(before + 2);
  });
});
