import path from 'node:path';
import createKnex, { type Knex } from 'knex';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { dumpSchema } from '@/db/server/dump-schema';
import { migrate } from '@/db/server/migrate';
import { type ClonedDatabase, cloneDatabase } from '@/tests/helpers/clone-database';

const modules = import.meta.glob<Knex.Migration>('../../migrations/*.ts', { eager: true });

/** The same files under the same names; loaded by the test runner, because Knex itself would ask plain Node for TypeScript. */
const migrationSource: Knex.MigrationSource<string> = {
  getMigrations: async () => Object.keys(modules).sort(),
  getMigrationName: (file) => path.basename(file),
  getMigration: async (file) => modules[file]!,
};

let database: ClonedDatabase;
let owner: Knex;

beforeAll(async () => {
  database = await cloneDatabase();
  owner = createKnex({
    client: 'pg',
    connection: database.ownerUrl,
    pool: { min: 0, max: 2 },
    migrations: { migrationSource },
  });
});
afterAll(async () => {
  await owner?.destroy();
  await database?.drop();
});

async function ownObjects(): Promise<string[]> {
  const { rows } = await owner.raw(
    `select relname as name from pg_class where relnamespace = 'public'::regnamespace and relkind in ('r', 'p', 'v', 'S')
     union all select proname from pg_proc where pronamespace = 'public'::regnamespace order by 1`,
  );
  return rows.map((row: { name: string }) => row.name).filter((name: string) => !name.startsWith('knex_migrations'));
}

it('a second run changes nothing and loses nothing', async () => {
  const organisation = '01900000-0000-7000-8000-000000000001';
  await owner('organisations').insert({ organisation_id: organisation, name: 'Quillmere', code: 'QMF' });
  const before = await dumpSchema(database.ownerUrl);
  await migrate(database.ownerUrl);
  await Promise.all([migrate(database.ownerUrl), migrate(database.ownerUrl)]);
  expect(await dumpSchema(database.ownerUrl)).toBe(before);
  await owner.transaction(async (trx) => {
    await trx.raw(`select set_config('app.organisation', ?, true), set_config('app.customer', 'staff', true)`, [
      organisation,
    ]);
    expect(await trx('organisations').select('name')).toEqual([{ name: 'Quillmere' }]);
  });
});

it('a run that was killed holding the library’s lock does not keep the next one out', async () => {
  await owner('knex_migrations_lock').update({ is_locked: 1 });
  await migrate(database.ownerUrl);
  expect(await owner('knex_migrations_lock').select('is_locked')).toEqual([{ is_locked: 0 }]);
});

it('everything can be taken back, and made again to the letter', async () => {
  const before = await dumpSchema(database.ownerUrl);
  const objects = await ownObjects();
  expect(objects).toEqual(expect.arrayContaining(['sheets', 'readings', 'app_organisation', 'enqueue']));
  const [, undone] = await owner.migrate.rollback(undefined, true);
  expect(undone.length).toBeGreaterThan(3);
  expect(await ownObjects()).toEqual([]);
  await owner.migrate.latest();
  expect(await ownObjects()).toEqual(objects);
  expect(await dumpSchema(database.ownerUrl)).toBe(before);
});

it('each step alone can be taken back and made again', async () => {
  const before = await dumpSchema(database.ownerUrl);
  const [done] = await owner.migrate.list();
  for (const _ of done) await owner.migrate.down();
  expect(await ownObjects()).toEqual([]);
  for (const _ of done) await owner.migrate.up();
  expect(await dumpSchema(database.ownerUrl)).toBe(before);
});
