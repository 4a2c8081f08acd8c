import createKnex, { type Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inScope, type Scope } from '@/db/client';
import { globalTables } from '@/db/global-tables';
import { newId } from '@/lib/id';
import type { ClonedDatabase } from '@/tests/helpers/clone-database';
import { seededDatabase } from '@/tests/helpers/seeded-database';

let database: ClonedDatabase;
let app: Knex;
let owner: Knex;
let ours: string;
let theirs: string;
let tables: string[];

const staff = (organisationId: string): Scope => ({ organisationId, accountId: newId(), customerId: null });
const as = <T>(scope: Scope, work: (trx: Knex.Transaction) => Promise<T>) => inScope(scope, work, app);

beforeAll(async () => {
  database = await seededDatabase();
  app = createKnex({ client: 'pg', connection: database.appUrl, pool: { min: 0, max: 4 } });
  owner = createKnex({ client: 'pg', connection: database.ownerUrl, pool: { min: 0, max: 2 } });
  const organisations = await owner('organisations').select('organisation_id', 'name');
  ours = organisations.find((row) => row.name.startsWith('Quillmere')).organisation_id;
  theirs = organisations.find((row) => row.name.startsWith('Brackwater')).organisation_id;
  const { rows } = await owner.raw(
    `select relname from pg_class where relnamespace = 'public'::regnamespace and relkind in ('r', 'p') order by 1`,
  );
  const outside = new Set<string>(globalTables.map((table) => table.name));
  tables = rows.map((row: { relname: string }) => row.relname).filter((name: string) => !outside.has(name));
  // Tables that the demo scenario leaves empty.
  await as(staff(ours), async (trx) => {
    await trx('invitations').insert({
      organisation_id: ours,
      id: newId(),
      email: 'a@b.example',
      name: 'A',
      roles: ['inspector'],
      invited_by: newId(),
      expires_at: new Date(),
    });
    await trx('idempotency_keys').insert({
      organisation_id: ours,
      id: newId(),
      key: 'k',
      account_id: newId(),
      request_hash: 'h',
      status: 200,
    });
    await trx('outbox').insert({
      organisation_id: ours,
      id: newId(),
      recipient: 'a@b.example',
      subject: 's',
      text_body: 't',
      html_body: 'h',
      message_id: 'm',
    });
    const fileId = newId();
    await trx('files').insert({
      organisation_id: ours,
      id: fileId,
      key: 'k',
      kind: 'photo',
      name: 'n',
      content_type: 'image/png',
      byte_length: 1,
      sha256: 'x',
    });
    const { id: sheetId } = await trx('sheets').first('id');
    await trx('sheet_photos').insert({
      organisation_id: ours,
      id: newId(),
      sheet_id: sheetId,
      file_id: fileId,
      width_px: 4,
      height_px: 3,
      added_by: 'A',
    });
    await trx('plan_templates').insert({
      organisation_id: ours,
      id: newId(),
      manufacturer: 'M',
      model: 'm',
      name: 'whole',
      choices: '{}',
      account_name: 'A',
    });
  });
});

afterAll(async () => {
  await app?.destroy();
  await owner?.destroy();
  await database?.drop();
});

/** Columns that a row may be given; identity columns are the database's own. */
async function columnsOf(table: string): Promise<string[]> {
  const { rows } = await owner.raw(
    `select attname from pg_attribute where attrelid = ?::regclass and attnum > 0 and not attisdropped and attidentity = '' and attgenerated = ''`,
    [table],
  );
  return rows.map((row: { attname: string }) => row.attname);
}

async function refusedOrNothing(work: () => Promise<number>): Promise<number | string> {
  try {
    return await work();
  } catch (error) {
    return (error as { code: string }).code;
  }
}

describe('every table', () => {
  it('is either under row-level security, forced, with policies, or listed with its reason', async () => {
    const { rows } = await owner.raw(
      `select c.relname, c.relrowsecurity, c.relforcerowsecurity,
              array(select p.polcmd::text from pg_policy p where p.polrelid = c.oid) as commands,
              exists (select 1 from pg_index i join pg_attribute a on a.attrelid = c.oid and a.attname = 'organisation_id'
                       where i.indrelid = c.oid and i.indisprimary and a.attnum = any (i.indkey)) as keyed
         from pg_class c where c.relnamespace = 'public'::regnamespace and c.relkind in ('r', 'p')`,
    );
    const outside = new Map<string, string>(globalTables.map((table) => [table.name, table.reason]));
    for (const row of rows) {
      if (outside.has(row.relname)) continue;
      expect({
        table: row.relname,
        enabled: row.relrowsecurity,
        forced: row.relforcerowsecurity,
        keyed: row.keyed,
      }).toEqual({
        table: row.relname,
        enabled: true,
        forced: true,
        keyed: true,
      });
      expect(row.commands, row.relname).toEqual(expect.arrayContaining(['r', 'a', 'w', 'd']));
    }
    expect(tables.length).toBeGreaterThan(20);
  });

  it('shows nothing of another organisation, and takes nothing for it', async () => {
    for (const table of tables) {
      const [sample] = await as(staff(ours), (trx) => trx(table).where({ organisation_id: ours }).limit(1));
      expect(sample, `${table} has a row to be seen`).toBeDefined();
      const strangers = await as(staff(theirs), (trx) => trx(table).where({ organisation_id: ours }));
      expect(strangers, `${table}: select`).toEqual([]);
      const all = await as(staff(theirs), (trx) => trx(table).select('organisation_id'));
      expect(new Set(all.map((row) => row.organisation_id)), `${table}: select all`).not.toContain(ours);

      const updated = await refusedOrNothing(() =>
        as(staff(theirs), (trx) => trx(table).where({ organisation_id: ours }).update({ organisation_id: theirs })),
      );
      expect([0, '42501'], `${table}: update gave ${updated}`).toContain(updated);
      const removed = await refusedOrNothing(() =>
        as(staff(theirs), (trx) => trx(table).where({ organisation_id: ours }).delete()),
      );
      expect([0, '42501'], `${table}: delete gave ${removed}`).toContain(removed);

      const columns = await columnsOf(table);
      const list = columns.map((column) => `"${column}"`).join(', ');
      const added = await refusedOrNothing(async () => {
        const row = { ...sample, ...('id' in sample ? { id: newId() } : {}) };
        await as(staff(theirs), (trx) =>
          trx.raw(
            `insert into ${table} (${list}) select ${list} from jsonb_populate_record(null::${table}, ?::jsonb)`,
            [JSON.stringify(row)],
          ),
        );
        return 1;
      });
      expect(added, `${table}: insert`).toBe('42501');
      const moved = await refusedOrNothing(() =>
        as(staff(ours), (trx) => trx(table).where({ organisation_id: ours }).update({ organisation_id: theirs })),
      );
      expect(['42501', 'WM001'], `${table}: move gave ${moved}`).toContain(moved);
    }
  });

  it('fails without the setting instead of showing everything', async () => {
    for (const table of tables) {
      await expect(app(table).select(app.raw('1')).limit(1), table).rejects.toMatchObject({
        code: expect.stringMatching(/^(42704|22P02)$/),
      });
      await expect(
        app.transaction(async (trx) => {
          await trx.raw(`select set_config('app.organisation', ?, true)`, [ours]);
          return trx(table).limit(1);
        }),
        `${table} with an organisation but nobody named`,
      ).rejects.toMatchObject({ code: expect.stringMatching(/^(42704|22P02)$/) });
    }
  });

  it('outside row-level security is reached through its named functions only', async () => {
    for (const { name, functions } of globalTables) {
      for (const statement of [`select * from ${name}`, `delete from ${name}`, `insert into ${name} default values`]) {
        await expect(app.raw(statement), statement).rejects.toMatchObject({ code: '42501' });
      }
      for (const named of functions) {
        const { rows } = await owner.raw(
          `select p.prosecdef, pg_get_functiondef(p.oid) as body, has_function_privilege('witnessmark_app', p.oid, 'execute') as allowed
             from pg_proc p where p.pronamespace = 'public'::regnamespace and p.proname = ?`,
          [named],
        );
        expect(rows, named).toHaveLength(1);
        expect({ named, definer: rows[0].prosecdef, allowed: rows[0].allowed }).toEqual({
          named,
          definer: true,
          allowed: true,
        });
        expect(rows[0].body, `${named} fixes its search path`).toMatch(/SET search_path TO/);
      }
    }
    const { rows } = await owner.raw(
      `select p.proname from pg_proc p where p.pronamespace = 'public'::regnamespace and p.prosecdef order by 1`,
    );
    const known = new Set<string>([
      ...globalTables.flatMap((table) => [...table.functions]),
      'first_organisation_needed',
      'first_organisation_create',
      'enqueue',
    ]);
    expect(rows.map((row: { proname: string }) => row.proname).filter((name: string) => !known.has(name))).toEqual([]);
  });
});

describe('a customer', () => {
  const customerOf = async (name: string): Promise<Scope> => {
    const { id } = await as(staff(ours), (trx) => trx('customers').where({ name }).first('id'));
    return { organisationId: ours, accountId: newId(), customerId: id };
  };

  it('sees its own machines, jobs and issued reports, and nothing of the office', async () => {
    const ashdown = await customerOf('Ashdown Turned Parts');
    const machines = await as(ashdown, (trx) => trx('machines').orderBy('serial_number').select('serial_number'));
    expect(machines.map((row) => row.serial_number)).toEqual([
      'HP25-1I10-S5',
      'LK32-0081-8',
      'LK32-0O81-B',
      'QT-10-0DB1',
    ]);
    const jobs = await as(ashdown, (trx) => trx('jobs').select('customer_id'));
    expect(new Set(jobs.map((row) => row.customer_id))).toEqual(new Set([ashdown.customerId]));
    const reports = await as(ashdown, (trx) => trx('reports').select('state'));
    expect(reports.length).toBeGreaterThan(6);
    for (const table of [
      'sheets',
      'passes',
      'readings',
      'reading_operations',
      'pass_results',
      'instruments',
      'calibrations',
      'outbox',
      'audit_events',
      'invitations',
      'job_people',
    ]) {
      expect(await as(ashdown, (trx) => trx(table).limit(1)), table).toEqual([]);
    }
    expect(await as(ashdown, (trx) => trx('customers').select('name'))).toEqual([{ name: 'Ashdown Turned Parts' }]);
  });

  it('changes nothing, not even its own', async () => {
    const ashdown = await customerOf('Ashdown Turned Parts');
    for (const [table, change] of [
      ['machines', { site: 'elsewhere' }],
      ['jobs', { scope: 'other' }],
      ['customers', { name: 'Other' }],
      ['remarks', { text: 'other' }],
    ] as const) {
      expect(await refusedOrNothing(() => as(ashdown, (trx) => trx(table).update(change))), table).toBe(0);
    }
    const signed = await refusedOrNothing(() =>
      as(ashdown, (trx) => trx('reports').whereNot({ state: 'issued' }).update({ state: 'signed' })),
    );
    expect(signed).toBe(0);
    const otherwise = await refusedOrNothing(() =>
      as(ashdown, (trx) => trx('reports').where({ state: 'issued' }).update({ state: 'superseded' })),
    );
    expect(otherwise).toBe('42501');
  });

  it('who buys a machine sees what the transfer grants, and the seller keeps its own reports', async () => {
    const millbrook = await customerOf('Millbrook Hydraulics');
    const ashdown = await customerOf('Ashdown Turned Parts');
    const machine = await as(staff(ours), (trx) =>
      trx('machines').where({ serial_number: 'HP25-1I10-S5' }).first('id'),
    );
    const reportsOf = (scope: Scope) =>
      as(scope, (trx) =>
        trx('reports')
          .join('jobs', 'jobs.id', 'reports.job_id')
          .where('jobs.machine_id', machine.id)
          .select('reports.id'),
      );
    const before = (await reportsOf(ashdown)).length;
    expect(before).toBe(6);
    await as(staff(ours), async (trx) => {
      await trx('machine_owners').where({ machine_id: machine.id }).update({ until_date: '2026-11-30' });
      await trx('machine_owners').insert({
        organisation_id: ours,
        id: newId(),
        machine_id: machine.id,
        customer_id: millbrook.customerId,
        from_date: '2026-11-30',
        sees_history: false,
      });
    });
    expect(await as(millbrook, (trx) => trx('machines').where({ id: machine.id }).select('id'))).toHaveLength(1);
    expect(await reportsOf(millbrook)).toHaveLength(0);
    await as(staff(ours), (trx) =>
      trx('machine_owners')
        .where({ machine_id: machine.id, customer_id: millbrook.customerId })
        .update({ sees_history: true }),
    );
    expect(await reportsOf(millbrook)).toHaveLength(before);
    expect(await reportsOf(ashdown)).toHaveLength(before);
  });
});

it('two organisations sharing two connections never see each other', async () => {
  const narrow = createKnex({ client: 'pg', connection: database.appUrl, pool: { min: 0, max: 2 } });
  try {
    const seen = await Promise.all(
      Array.from({ length: 200 }, async (_, index) => {
        const organisationId = index % 2 === 0 ? ours : theirs;
        const rows = await inScope(staff(organisationId), (trx) => trx('customers').select('organisation_id'), narrow);
        return rows.length > 0 && rows.every((row) => row.organisation_id === organisationId);
      }),
    );
    expect(seen.filter((own) => !own)).toEqual([]);
  } finally {
    await narrow.destroy();
  }
});
