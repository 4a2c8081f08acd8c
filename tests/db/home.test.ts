import createKnex, { type Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inScope } from '@/db/client';
import { homeView } from '@/db/read-models/home';
import { newJobView } from '@/db/read-models/new-job';
import { sheetSurroundings } from '@/db/read-models/sheet-surroundings';
import type { Role } from '@/lib/auth/permissions';
import type { ClonedDatabase } from '@/tests/helpers/clone-database';
import { seededDatabase } from '@/tests/helpers/seeded-database';

let database: ClonedDatabase;
let app: Knex;

interface Member {
  organisationId: string;
  accountId: string;
  membershipId: string;
  customerId: string | null;
  roles: Role[];
}

beforeAll(async () => {
  database = await seededDatabase();
  app = createKnex({ client: 'pg', connection: database.appUrl });
});
afterAll(async () => {
  await app?.destroy();
  await database?.drop();
});

/** Who signs in with this address, found where the sign-in finds it. */
async function member(email: string): Promise<Member> {
  const { rows } = await app.raw('select id from account_by_email(?)', [email]);
  const accountId: string = rows[0].id;
  const organisationId: string = (await app.raw('select organisation_id from account_memberships(?)', [accountId]))
    .rows[0].organisation_id;
  return inScope(
    { organisationId, accountId, customerId: null },
    async (trx) => {
      const row = await trx('memberships')
        .where({ account_id: accountId })
        .first({ membershipId: 'id', customerId: 'customer_id', roles: 'roles' });
      return { organisationId, accountId, ...row };
    },
    app,
  );
}

const homeOf = async (email: string, today = new Date().toISOString().slice(0, 10)) => {
  const viewer = await member(email);
  return inScope(viewer, (trx) => homeView(trx, viewer, today), app);
};

const plannedSheets = async (reference: string) => {
  const viewer = await member('inspector@quillmere.example');
  const count = (trx: Knex.Transaction) =>
    trx('sheets')
      .join('jobs', 'jobs.id', 'sheets.job_id')
      .where('jobs.reference', reference)
      .count('* as sheets')
      .first();
  return Number((await inScope(viewer, count, app))?.sheets);
};

describe('what waits', () => {
  it('for the inspector: jobs in work with their next sheet, nothing of the office', async () => {
    const home = await homeOf('inspector@quillmere.example');
    const half = home.toMeasure.find(({ reference }) => reference === 'QMF-2087');
    // Half of the plan is measured; the last of that half is only begun.
    const planned = await plannedSheets('QMF-2087');
    const begun = Math.ceil(planned / 2);
    expect(planned).toBe(12);
    expect(half).toMatchObject({ planMade: true, measured: begun - 1, planned, next: { position: begun } });
    expect(home.toMeasure.find(({ reference }) => reference === 'QMF-2088')).toMatchObject({
      planMade: false,
      planned: 0,
      next: null,
    });
    expect(home.toCheck).toEqual([]);
    expect(home.overdueInstruments).toEqual([]);
  });

  it('for the reviewer: jobs handed in, no job to measure', async () => {
    const home = await homeOf('reviewer@quillmere.example');
    expect(home.toCheck.map(({ reference }) => reference)).toEqual(['QMF-2079']);
    expect(home.toMeasure).toEqual([]);
  });

  it('for the administrator: instruments by the newest certificate, on the day that is asked for', async () => {
    const numbers = async (today: string) =>
      (await homeOf('admin@quillmere.example', today)).overdueInstruments.map(({ number }) => number).sort();
    const all = await numbers('2999-01-01');
    const none = await numbers('1999-01-01');
    expect(all.length).toBeGreaterThan(3);
    expect(none).toEqual([]);
  });

  it('for the customer: its own reports that wait for a signature, and nothing else', async () => {
    const home = await homeOf('customer@ashdown.example');
    expect(home.toSign.length).toBeGreaterThan(0);
    expect(home.toSign.every(({ serialNumber }) => /^(LK32|HP25|QT)/.test(serialNumber))).toBe(true);
    expect({ ...home, toSign: [] }).toEqual({
      toMeasure: [],
      toCheck: [],
      refused: [],
      toSign: [],
      overdueInstruments: [],
      failedMails: [],
      failedPdfs: [],
    });
  });

  it('for another organisation: nothing of the first', async () => {
    const home = await homeOf('admin@brackwater.example', '2999-01-01');
    expect(Object.values(home).flat()).toEqual([]);
  });
});

it('a sheet knows its neighbours and the instruments used last in its job', async () => {
  const viewer = await member('inspector@quillmere.example');
  await inScope(
    viewer,
    async (trx) => {
      const job = await trx('jobs').where({ reference: 'QMF-2087' }).first('id');
      const sheets = await trx('sheets').where({ job_id: job.id }).orderBy('position').select('id');
      const first = await sheetSurroundings(trx, job.id, sheets[0].id);
      expect(first.neighbours).toMatchObject({ previous: null, next: { position: 2 }, count: sheets.length });
      expect(first.recentInstruments.length).toBeGreaterThan(0);
      const last = await sheetSurroundings(trx, job.id, sheets.at(-1).id);
      expect(last.neighbours).toMatchObject({ previous: { position: sheets.length - 1 }, next: null });
    },
    app,
  );
});

it('a new job starts from the last one on the same machine', async () => {
  const viewer = await member('inspector@quillmere.example');
  await inScope(
    viewer,
    async (trx) => {
      const last = await trx('jobs').where({ reference: 'QMF-2087' }).first('machine_id');
      const view = await newJobView(trx, last.machine_id);
      expect(view.machine).toMatchObject({ serialNumber: 'HP25-I110-55' });
      expect(view.lastJob).toMatchObject({ reference: 'QMF-2087' });
      expect(view.lastJob?.people.some(({ role }) => role === 'inspector')).toBe(true);
      expect(view.members.every(({ roles }) => roles.includes('inspector') || roles.includes('reviewer'))).toBe(true);
    },
    app,
  );
});
