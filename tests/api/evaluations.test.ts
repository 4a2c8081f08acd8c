import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { POST as evaluate } from '@/app/api/evaluations/route';
import { appDb } from '@/db/client';
import { expectAgreement } from '@/tests/evaluation/agree';
import job from '@/tests/evaluation/data/worked-job.json';
import { type ClonedDatabase, cloneDatabase } from '@/tests/helpers/clone-database';

let database: ClonedDatabase;
let address = 0;

beforeAll(async () => {
  database = await cloneDatabase();
  process.env.APP_DATABASE_URL = database.appUrl;
});
afterAll(async () => {
  await appDb().destroy();
  globalThis.witnessmarkPool = undefined;
  await database.drop();
});
// Each test comes from an address of its own, so that none uses up what another is allowed.
beforeEach(() => {
  address += 1;
});

async function ask(body: unknown, from = `198.51.100.${address}`) {
  const response = await evaluate(
    new Request('http://127.0.0.1:3000/api/evaluations', {
      method: 'POST',
      headers: { 'content-type': 'application/json', 'x-forwarded-for': from },
      body: typeof body === 'string' ? body : JSON.stringify(body),
    }),
  );
  const { status, headers } = response;
  return { status, headers, body: await response.json() };
}

interface Check {
  request: object;
  expected: Record<string, unknown>;
}

/** Every pair of a request and its answer that the job holds, wherever it stands. */
function checksIn(value: unknown, path: string): { path: string; check: Check }[] {
  if (typeof value !== 'object' || value === null) return [];
  const own = value as Record<string, unknown>;
  const here =
    typeof own.request === 'object' && own.request !== null && typeof own.expected === 'object'
      ? [{ path, check: own as unknown as Check }]
      : [];
  return [...here, ...Object.entries(own).flatMap(([key, part]) => checksIn(part, `${path}/${key}`))];
}

/** Angles and what rests on a distribution have no finite decimals: agreement to 1e-12 is asked for. */
const loose = Object.fromEntries(
  ['phase', 'standard', 'degreesOfFreedom', 'coverageFactor', 'expanded'].map((field) => [field, '1e-12']),
);

describe('every request of the worked job', () => {
  const checks = checksIn({ plan: job.plan, events: job.events }, '');

  it('is found', () => {
    expect(checks.length).toBeGreaterThan(90);
    const methods = new Set(checks.map(({ check }) => (check.request as { method: string }).method));
    expect(methods.size).toBeGreaterThan(15);
  });

  it.each(checks.map(({ path, check }, index) => [path, check, index] as const))('%s', async (_, check, index) => {
    const answer = await ask(check.request, `203.0.113.${index}`);
    expect([answer.status, Object.keys(answer.body)]).toEqual([200, ['result']]);
    expectAgreement(answer.body.result, check.expected, '', loose);
  });
});

describe('a request that cannot be evaluated', () => {
  const straightness = {
    method: 'straightness',
    points: [
      { position: '0', reading: '0' },
      { position: '100', reading: '1' },
      { position: '200', reading: '0' },
    ],
    reference: 'end-points',
  };
  const refused: [what: string, request: unknown, pointer: string][] = [
    [
      'a figure that is no decimal',
      { ...straightness, points: [{ position: '0', reading: 'a' }] },
      '/points/0/reading',
    ],
    ['a JavaScript number', { ...straightness, points: [{ position: 0, reading: '1' }] }, '/points/0/position'],
    [
      'a comma, which only a person may type',
      { ...straightness, points: [{ position: '0', reading: '1,5' }] },
      '/points/0/reading',
    ],
    ['a method that is not there', { method: 'guess' }, '/method'],
    ['no object', [1, 2], ''],
    ['no JSON', '{"method":', ''],
  ];

  it.each(refused)('%s: 422 with the place', async (_, request, pointer) => {
    const { status, headers, body } = await ask(request);
    expect([status, headers.get('content-type')]).toEqual([422, 'application/problem+json']);
    expect(body).toMatchObject({ status: 422, instance: '/api/evaluations', title: expect.any(String) });
    expect(body.errors.map((error: { pointer: string }) => error.pointer)).toContain(pointer);
    for (const { detail } of body.errors) expect(detail.length).toBeGreaterThan(5);
    expect(JSON.stringify(body)).not.toMatch(/undefined|ZodError|at .*\.ts:/);
  });

  it('names all its faults at once', async () => {
    const points = [
      { position: '0', reading: 'x' },
      { position: 'y', reading: '1' },
    ];
    const { body } = await ask({ ...straightness, points });
    expect(body.errors.map((error: { pointer: string }) => error.pointer)).toEqual(
      expect.arrayContaining(['/points/0/reading', '/points/1/position']),
    );
  });

  it('is not larger than 2 MB', async () => {
    expect((await ask(`"${'1'.repeat(2_000_001)}"`)).status).toBe(422);
  });
});

describe('how often', () => {
  const small = { method: 'two-collar', D1: '40.012', D2: '40.009', distance: '100' };

  it('two hundred requests within a minute from one address are all answered', async () => {
    const answers = [];
    for (let turn = 0; turn < 20; turn++)
      answers.push(...(await Promise.all(Array.from({ length: 10 }, () => ask(small)))));
    expect(answers.filter(({ status }) => status !== 200)).toEqual([]);
    expect(answers.every(({ headers }) => headers.get('cache-control') === 'no-store')).toBe(true);
  });

  it('who asks without end is told how long to wait, and nobody else is kept waiting', async () => {
    const statuses = new Set<number>();
    let wait: string | null = null;
    for (let turn = 0; turn < 60 && wait === null; turn++) {
      for (const answer of await Promise.all(Array.from({ length: 10 }, () => ask(small)))) {
        statuses.add(answer.status);
        if (answer.status === 429) wait = answer.headers.get('retry-after');
      }
    }
    expect([...statuses].sort()).toEqual([200, 429]);
    expect(Number(wait)).toBeGreaterThan(0);
    expect((await ask(small, '192.0.2.77')).status).toBe(200);
  });
});
