import pg from 'pg';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { type ClonedDatabase, cloneDatabase } from '@/tests/helpers/clone-database';

let database: ClonedDatabase;
beforeAll(async () => {
  database = await cloneDatabase();
});
afterAll(() => database.drop());

async function query(url: string, statement: string): Promise<Record<string, unknown>[]> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return (await client.query(statement)).rows;
  } finally {
    await client.end();
  }
}

test('the application role owns nothing and cannot bypass row-level security', async () => {
  const rows = await query(
    database.appUrl,
    `select rolsuper, rolbypassrls, rolcreaterole, rolcreatedb,
       (select count(*) from pg_class where relowner = r.oid)::int as owned,
       pg_has_role(r.oid, 'witnessmark_owner', 'member') as is_owner
     from pg_roles r where rolname = current_user`,
  );
  expect(rows).toEqual([
    { rolsuper: false, rolbypassrls: false, rolcreaterole: false, rolcreatedb: false, owned: 0, is_owner: false },
  ]);
});

test('the application role cannot make tables or read the queue', async () => {
  await expect(query(database.appUrl, 'create table public.stray (id int)')).rejects.toMatchObject({ code: '42501' });
  await expect(query(database.appUrl, 'select * from graphile_worker.jobs')).rejects.toMatchObject({ code: '42501' });
});

test('clones do not see each other', async () => {
  const other = await cloneDatabase();
  await query(other.ownerUrl, 'create table only_here (id int)');
  expect(await query(database.ownerUrl, "select to_regclass('only_here') as found")).toEqual([{ found: null }]);
  await other.drop();
});
