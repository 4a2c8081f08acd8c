import { readFile } from 'node:fs/promises';
import path from 'node:path';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { dumpSchema } from '@/db/server/dump-schema';
import { type ClonedDatabase, cloneDatabase } from '@/tests/helpers/clone-database';

let database: ClonedDatabase;
let dumped: string;

beforeAll(async () => {
  database = await cloneDatabase();
  dumped = await dumpSchema(database.ownerUrl);
});
afterAll(() => database?.drop());

it('db/schema.sql is what the migrations make (mend it with `npm run schema`)', async () => {
  expect(dumped).toBe(await readFile(path.join(import.meta.dirname, '../../db/schema.sql'), 'utf8'));
});

it('keeps every measured value as numeric, never as a floating-point number', () => {
  // The one exception is no measured value: how many attempts are left of a throttle.
  const floating = dumped.split('\n').filter((line) => /\b(double precision|real)\b/.test(line));
  const columns = floating.filter((line) => /^ {4}\w+ /.test(line)).map((line) => line.trim().split(' ')[0]);
  expect(columns).toEqual(['allowance']);
  for (const column of [
    'deviation_um',
    'tolerance_um',
    'limit_um',
    'margin_um',
    'value',
    'air',
    'machine',
    'temperature',
  ])
    expect(dumped).toMatch(new RegExp(`^ {4}${column} numeric( NOT NULL)?,?$`, 'm'));
});
