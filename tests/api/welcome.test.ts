import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET as getOrganisation } from '@/app/api/organisation/route';
import { POST as welcome } from '@/app/api/welcome/route';
import { appDb } from '@/db/client';
import { accountByEmail, accountMemberships, firstOrganisationNeeded } from '@/db/queries/accounts';
import { callRoute } from '@/tests/helpers/call-route';
import { type ClonedDatabase, cloneDatabase } from '@/tests/helpers/clone-database';

let database: ClonedDatabase;
beforeAll(async () => {
  database = await cloneDatabase();
  process.env.APP_DATABASE_URL = database.appUrl;
  process.env.NEXTAUTH_SECRET = 'a secret of the tests, long enough';
});
afterAll(async () => {
  await appDb().destroy();
  globalThis.witnessmarkPool = undefined;
  await database.drop();
});

const form = {
  organisationName: 'Heron Alignment',
  code: 'hal',
  timeZone: 'Europe/Oslo',
  name: 'I. Heron',
  email: 'I.Heron@heron.example',
  password: 'reeds in the shallow',
};

describe('the first start', () => {
  it('founds one organisation with one administrator, also when two press at the same moment', async () => {
    expect(await firstOrganisationNeeded(appDb())).toBe(true);
    const broken = await callRoute<{ errors: { pointer: string }[] }>(welcome, {
      body: { ...form, code: '?', password: 'short' },
    });
    expect(broken.body.errors.map(({ pointer }) => pointer).sort()).toEqual(['/code', '/password']);
    expect(await firstOrganisationNeeded(appDb())).toBe(true);
    const other = { ...form, email: 'other@heron.example' };
    const answers = await Promise.all([callRoute(welcome, { body: form }), callRoute(welcome, { body: other })]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect(await firstOrganisationNeeded(appDb())).toBe(false);
  });

  it('leads to somebody who may do everything, in an organisation that is not set up yet', async () => {
    const accounts = await Promise.all(
      ['i.heron@heron.example', 'other@heron.example'].map((email) => accountByEmail(appDb(), email)),
    );
    const [account] = accounts.filter((each) => each !== undefined);
    expect(accounts.filter((each) => each !== undefined)).toHaveLength(1);
    const [membership] = await accountMemberships(appDb(), account?.id ?? '');
    expect(membership?.roles).toEqual(['administrator', 'reviewer', 'inspector']);
    const as = { accountId: account?.id ?? '', organisationId: membership?.organisationId ?? '' };
    const { body } = await callRoute(getOrganisation, { as });
    expect(body).toMatchObject({ name: 'Heron Alignment', code: 'HAL', timeZone: 'Europe/Oslo', setUpDone: false });
  });

  it('is over afterwards', async () => {
    expect((await callRoute(welcome, { body: form })).status).toBe(409);
  });
});
