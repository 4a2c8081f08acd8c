import { execFile } from 'node:child_process';
import path from 'node:path';
import { promisify } from 'node:util';
import createKnex, { type Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inScope, type Scope } from '@/db/client';
import { globalTables } from '@/db/global-tables';
import { type MachineHistory, machineHistory } from '@/db/read-models/machine-history';
import { demoAccounts, demoPassword } from '@/lib/auth/demo-accounts';
import { passwordMatches } from '@/lib/auth/password';
import { newId } from '@/lib/id';
import { foldSerial } from '@/lib/schemas/serial-number';
import { Dec } from '@/lib/units/decimal';
import { type ClonedDatabase, cloneDatabase } from '@/tests/helpers/clone-database';
import { seededDatabase } from '@/tests/helpers/seeded-database';

let database: ClonedDatabase;
let app: Knex;
let owner: Knex;
const scopes = new Map<string, Scope>();

async function fill(into: ClonedDatabase, demo: '0' | '1'): Promise<string> {
  const { stdout } = await promisify(execFile)(process.execPath, ['--import', 'tsx', 'db/seeds/demo.ts'], {
    cwd: path.resolve(import.meta.dirname, '../..'),
    env: {
      ...process.env,
      ...{ APP_DATABASE_URL: into.appUrl, OWNER_DATABASE_URL: into.ownerUrl, WITNESSMARK_DEMO: demo },
    },
  });
  return stdout;
}

beforeAll(async () => {
  database = await seededDatabase();
  app = createKnex({ client: 'pg', connection: database.appUrl, pool: { min: 0, max: 3 } });
  owner = createKnex({ client: 'pg', connection: database.ownerUrl, pool: { min: 0, max: 1 } });
  for (const { organisation_id, name } of await owner('organisations').select('organisation_id', 'name')) {
    scopes.set(name.split(' ')[0], { organisationId: organisation_id, accountId: newId(), customerId: null });
  }
});
afterAll(async () => {
  await app?.destroy();
  await owner?.destroy();
  await database?.drop();
});

const at = <T>(organisation: 'Quillmere' | 'Brackwater', work: (trx: Knex.Transaction) => Promise<T>) =>
  inScope(scopes.get(organisation)!, work, app);
const here = <T>(work: (trx: Knex.Transaction) => Promise<T>) => at('Quillmere', work);

/** Rows of every table that belongs to organisations. */
async function rowCounts(): Promise<Record<string, number>> {
  const { rows: tables } = await owner.raw(
    `select relname from pg_class where relnamespace = 'public'::regnamespace and relkind = 'r' order by 1`,
  );
  const outside = new Set<string>(globalTables.map(({ name }) => name));
  const counts: Record<string, number> = {};
  for (const organisation of ['Quillmere', 'Brackwater'] as const) {
    await at(organisation, async (trx) => {
      for (const { relname } of tables.filter((table: { relname: string }) => !outside.has(table.relname))) {
        const { rows } = await trx.raw('select count(*)::int as count from ??', [relname]);
        counts[`${organisation} ${relname}`] = rows[0].count;
      }
    });
  }
  return counts;
}

describe('filling', () => {
  it('a second time, even twice at once, changes nothing', async () => {
    const before = await rowCounts();
    expect(before['Quillmere readings']).toBeGreaterThan(1000);
    expect(await fill(database, '1')).toBe('');
    await Promise.all([fill(database, '1'), fill(database, '1')]);
    expect(await rowCounts()).toEqual(before);
  });

  it('is not done with the demo off', async () => {
    const empty = await cloneDatabase();
    const knex = createKnex({ client: 'pg', connection: empty.ownerUrl, pool: { min: 0, max: 1 } });
    try {
      expect(await fill(empty, '0')).toBe('');
      expect(await knex('organisations').select('name')).toEqual([]);
    } finally {
      await knex.destroy();
      await empty.drop();
    }
  });
});

describe('people', () => {
  it('are those that the sign-in page names, with the password that it says', async () => {
    const accounts = await owner('accounts').orderBy('email').select('email', 'password_hash');
    expect(accounts.map(({ email }) => email)).toEqual(demoAccounts.map(({ email }) => email).sort());
    for (const { password_hash } of accounts) expect(await passwordMatches(password_hash, demoPassword)).toBe(true);
    const roles = await here((trx) => trx('memberships').orderBy('email').select('email', 'roles', 'customer_id'));
    expect(roles.map(({ email, roles: held }) => [email, held])).toEqual([
      ['admin@quillmere.example', ['administrator']],
      ['customer@ashdown.example', ['customer']],
      ['inspector@quillmere.example', ['inspector']],
      ['reviewer@quillmere.example', ['reviewer']],
    ]);
    expect(roles.filter(({ customer_id }) => customer_id !== null)).toHaveLength(1);
  });

  it('of the other organisation find nothing of the first', async () => {
    const counts = await rowCounts();
    for (const table of ['machines', 'jobs', 'sheets', 'readings', 'reports', 'instruments'])
      expect(counts[`Brackwater ${table}`], table).toBe(0);
  });
});

describe('machines', () => {
  it('are at least eight, of invented makers, with serial numbers that are easy to misread', async () => {
    const machines = await here((trx) =>
      trx('machines').select('manufacturer', 'serial_number', 'serial_folded', 'kind'),
    );
    expect(machines.length).toBeGreaterThanOrEqual(8);
    expect(new Set(machines.map(({ kind }) => kind)).size).toBe(5);
    for (const { serial_number, serial_folded } of machines) expect(serial_folded).toBe(foldSerial(serial_number));
    const mixed = machines.filter(
      ({ serial_number }) => /[OIBSZ]/.test(serial_number) && /[01582]/.test(serial_number),
    );
    expect(mixed.length).toBeGreaterThanOrEqual(8);
    // Two that only a careful eye tells apart.
    const folded = machines.map(({ manufacturer, serial_folded }) => `${manufacturer} ${serial_folded}`);
    expect(folded.length - new Set(folded).size).toBeGreaterThanOrEqual(2);
    expect(machines.map(({ serial_number }) => serial_number)).toContain('LK32-0O81-B');
  });
});

describe('jobs', () => {
  it('of the machine with three channels: 60 sheets and more, function checks among them, measured in part', async () => {
    const sheets = await here((trx) =>
      trx('sheets')
        .join('jobs', 'jobs.id', 'sheets.job_id')
        .where('jobs.reference', 'QMF-2090')
        .orderBy('position')
        .select({ key: 'key', component: 'component', step: 'working_step' }),
    );
    expect(sheets.length).toBeGreaterThanOrEqual(60);
    const channels = new Set(sheets.map(({ component }) => component.channel).filter(Boolean));
    expect(channels).toEqual(new Set([1, 2, 3]));
    expect(sheets.filter(({ key }) => key.startsWith('FC-')).length).toBeGreaterThan(10);
    const steps = sheets.map(({ step }) => step);
    expect([...steps].sort((a, b) => a - b)).toEqual(steps);
  });

  it('stand in every state: no plan, half measured, in check, issued, signed, signed with remarks, refused', async () => {
    const jobs = await here((trx) =>
      trx('jobs')
        .leftJoin('reports', (join) =>
          join.on('reports.organisation_id', 'jobs.organisation_id').andOn('reports.job_id', 'jobs.id'),
        )
        .select({ state: 'jobs.state', planned: 'jobs.plan_made_at', report: 'reports.state' }),
    );
    const words = jobs.map(({ state, planned, report }) => report ?? (planned ? state : 'no plan'));
    for (const state of ['no plan', 'open', 'in-check', 'issued', 'signed', 'signed-with-remarks', 'refused'])
      expect(words, state).toContain(state);
    // A report that is out has closed its job, and only such a one.
    expect(jobs.every(({ state, report }) => (report !== null) === ['issued', 'closed'].includes(state))).toBe(true);
  });

  it('have the worked job among them, and a job that is half measured', async () => {
    const worked = await here((trx) => trx('jobs').where({ reference: 'QMF-2041' }).first('state'));
    expect(worked).toMatchObject({ state: 'issued' });
    const half = await here((trx) =>
      trx('sheets')
        .join('jobs', 'jobs.id', 'sheets.job_id')
        .leftJoin('passes', 'passes.sheet_id', 'sheets.id')
        .leftJoin('pass_results', 'pass_results.pass_id', 'passes.id')
        .where({ 'jobs.reference': 'QMF-2087' })
        .select({ verdict: 'pass_results.verdict' }),
    );
    const measured = half.filter(({ verdict }) => verdict !== null).length;
    expect(measured).toBeGreaterThan(1);
    expect(half.length - measured).toBeGreaterThan(1);
  });

  it('hold readings like real ones: noise, slips put right with a reason, out as found and within as left', async () => {
    const slips = await here((trx) =>
      trx('reading_operations').where({ outcome: 'applied' }).whereNotNull('reason').select('reason', 'version'),
    );
    expect(slips.length).toBeGreaterThan(4);
    expect(slips.every(({ version }) => version > 1)).toBe(true);
    const { rows: mended } = await here((trx) =>
      trx.raw(
        `select s.id from sheets s
           join passes f on f.sheet_id = s.id and f.kind = 'as-found' join pass_results rf on rf.pass_id = f.id
           join passes l on l.sheet_id = s.id and l.kind = 'as-left' join pass_results rl on rl.pass_id = l.id
          where rf.verdict = 'out-of-tolerance' and rl.verdict = 'within-tolerance'`,
      ),
    );
    expect(mended.length).toBeGreaterThan(3);
    const { rows: flat } = await here((trx) =>
      trx.raw(`select pass_id from readings where source <> 'planned' and value is not null
                group by pass_id having count(*) > 8 and count(distinct value) < 3`),
    );
    expect(flat).toEqual([]);
    const lost = await here((trx) => trx('readings').whereNull('value').whereNotNull('unit').select('text'));
    expect(lost).toEqual([]);
  });

  it('use no instrument after its due date without a reason, and issue nothing that is not complete', async () => {
    const models = await here((trx) => trx('reports').select('model'));
    expect(models.length).toBeGreaterThanOrEqual(9);
    for (const { model } of models) {
      expect(model.counts.asLeft.notMeasured, model.document.number).toBe(0);
      for (const { certificate, due } of model.instruments) expect([certificate, due]).not.toContain(null);
    }
    const numbers = models.map(({ model }) => model.document.number);
    expect(new Set(numbers).size).toBe(numbers.length);
  });
});

describe('a machine that was measured every year', () => {
  let history: MachineHistory;
  beforeAll(async () => {
    history = await here(async (trx) => {
      const { id } = await trx('machines').where({ serial_number: 'HP25-1I10-S5' }).first('id');
      return machineHistory(trx, id);
    });
  });

  it('has signed reports over six years, the newest first', () => {
    const signed = history.reports.filter(({ state }) => state.startsWith('signed'));
    expect(signed).toHaveLength(6);
    const years = signed.map(({ issuedAt }) => issuedAt!.getUTCFullYear());
    expect(years).toEqual([...new Set(years)].sort((a, b) => b - a));
    expect(years[0]! - years.at(-1)!).toBe(5);
  });

  it('shows the spindle wear, while the slides stay where they are', () => {
    const test = (title: RegExp) => {
      const found = history.drift.find(({ title: own }) => title.test(own));
      expect(found?.points).toHaveLength(6);
      return found!.points.map(({ asLeftMm }) => new Dec(asLeftMm.replace('\u2212', '-')));
    };
    const nose = test(/Nose of S1|Nose of .*: radial run-out/i);
    expect(nose.at(-1)!.gt(nose[0]!.times(1.5))).toBe(true);
    const slide = test(/parallel/i);
    expect(slide.at(-1)!.abs().lt(slide[0]!.abs().times(2))).toBe(true);
    for (const { points } of history.drift)
      expect(points.map(({ measuredOn }) => measuredOn)).toEqual(points.map(({ measuredOn }) => measuredOn).sort());
  });
});
