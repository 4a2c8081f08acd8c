import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, afterEach, expect, test } from 'vitest';
import { defaultRenderLimits, RenderPool } from '@/lib/queue/render-pool';

const childModule = path.join(import.meta.dirname, '../helpers/obedient-render-child.ts');
const limits = { ...defaultRenderLimits, renderTimeoutMs: 1500 };

let pool: RenderPool;
afterEach(() => pool.close());

const traces = mkdtempSync(path.join(tmpdir(), 'witnessmark-render-'));
afterAll(() => rmSync(traces, { recursive: true }));

async function processThatDraws(model: object = { act: 'answer' }): Promise<number> {
  return Number((await pool.render(model)).toString().split(' ')[0]);
}

test('keeps one process warm and draws one document after the other', async () => {
  pool = new RenderPool(childModule, limits);
  const models = [1, 2, 3].map((text) => ({ act: 'answer', text: String(text) }));
  const drawn = await Promise.all(models.map((model) => pool.render(model)));
  const [first] = drawn[0]!.toString().split(' ');
  expect(drawn.map(String)).toEqual([1, 2, 3].map((text) => `${first} ${text}`));
});

test('replaces the process after its number of documents', async () => {
  pool = new RenderPool(childModule, { ...limits, maxRenders: 2 });
  const numbers = [];
  for (let document = 0; document < 4; document++) numbers.push(await processThatDraws());
  expect(numbers[1]).toBe(numbers[0]);
  expect(numbers[2]).not.toBe(numbers[1]);
  expect(numbers[3]).toBe(numbers[2]);
});

test('replaces the process when it holds too much memory', async () => {
  pool = new RenderPool(childModule, { ...limits, maxRssBytes: 1024 });
  expect(await processThatDraws()).not.toBe(await processThatDraws());
});

test.each(['hang', 'crash', 'fail'])('tries once more in a fresh process when the first does %s', async (act) => {
  pool = new RenderPool(childModule, limits);
  const former = await processThatDraws();
  expect(await processThatDraws({ act, once: path.join(traces, act) })).not.toBe(former);
});

test.each([
  ['hang', 'took more than 1.5 s'],
  ['crash', 'ended (9)'],
  ['fail', 'no such font'],
])('gives up after the second %s and draws the next document', async (act, message) => {
  pool = new RenderPool(childModule, limits);
  await expect(pool.render({ act })).rejects.toThrow(message);
  expect(await processThatDraws()).toBeGreaterThan(0);
});
