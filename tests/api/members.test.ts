import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DELETE as revoke } from '@/app/api/invitations/[id]/route';
import { POST as accept } from '@/app/api/invitations/accept/route';
import { POST as invite, GET as listInvitations } from '@/app/api/invitations/route';
import { PATCH as changeMember } from '@/app/api/members/[id]/route';
import { GET as listMembers } from '@/app/api/members/route';
import { PATCH as changeOrganisation, GET as getOrganisation } from '@/app/api/organisation/route';
import { appDb, inScope } from '@/db/client';
import { accountByEmail, accountMemberships, endSessions } from '@/db/queries/accounts';
import { passwordMatches } from '@/lib/auth/password';
import { callRoute, ifMatch } from '@/tests/helpers/call-route';
import { addPerson, openTestWorkshop, type TestWorkshop, testPassword } from '@/tests/helpers/test-workshop';

interface Problem {
  detail: string;
  errors: { pointer: string; detail: string }[];
}
interface Member {
  id: string;
  email: string;
  roles: string[];
  disabledAt: string | null;
  version: number;
}

let workshop: TestWorkshop;
beforeAll(async () => {
  workshop = await openTestWorkshop();
});
afterAll(() => workshop.close());

const admin = () => workshop.people.administrator;
const members = async () => (await callRoute<{ items: Member[] }>(listMembers, { as: admin() })).body.items;

/** The link is only in the mail; the database keeps its hash. */
async function invited(email: string, more: object = {}) {
  const body = { email, name: 'New Person', roles: ['inspector'], ...more };
  const answer = await callRoute<{ id: string }>(invite, { as: admin(), body });
  expect(answer.status).toBe(201);
  const mail = await inScope(workshop.scope, (trx) =>
    trx('outbox').where({ recipient: email }).orderBy('id', 'desc').first('text_body', 'html_body', 'subject', 'state'),
  );
  const token = /\/invitation\/([\w-]{40,})/.exec(mail.text_body)?.[1] ?? '';
  return { id: answer.body.id, token, mail };
}
const answer = (token: string, more: object = {}) =>
  callRoute<Problem & { email: string }>(accept, {
    body: { token, name: 'New Person', functionTitle: 'fitter', password: 'tarn water over stones', ...more },
    headers: { 'x-forwarded-for': token.slice(0, 12) },
  });

describe('inviting', () => {
  it('queues one mail with the link, in the same transaction, and leads to a member who can sign in', async () => {
    const { token, mail } = await invited('first@tarn.example', { roles: ['inspector', 'reviewer'] });
    expect(mail.subject).toBe('Tarn Fitting invites you to Witnessmark');
    expect(mail.html_body).toContain(token);
    expect(mail.state).toBe('waiting');
    const { rows } = await ownerRows(`select task_identifier from graphile_worker.jobs`);
    expect(rows.map((row) => row.task_identifier)).toContain('send-mail');
    expect((await answer(token)).status).toBe(201);
    const account = await accountByEmail(appDb(), 'first@tarn.example');
    expect(await passwordMatches(account?.passwordHash, 'tarn water over stones')).toBe(true);
    const [membership] = await accountMemberships(appDb(), account?.id ?? '');
    expect(membership).toMatchObject({ organisationName: 'Tarn Fitting', roles: ['inspector', 'reviewer'] });
  });

  it('can be accepted once, also when two answers arrive at the same moment', async () => {
    const { token } = await invited('twice@tarn.example');
    const statuses = (await Promise.all([answer(token), answer(token)])).map(({ status }) => status);
    expect(statuses.filter((status) => status === 201)).toHaveLength(1);
    expect((await answer(token)).status).toBe(404);
    expect((await members()).filter(({ email }) => email === 'twice@tarn.example')).toHaveLength(1);
  });

  it('cannot be accepted after it was taken back, or when a newer one was sent', async () => {
    const first = await invited('again@tarn.example');
    const second = await invited('again@tarn.example');
    expect((await answer(first.token)).status).toBe(404);
    const taken = await callRoute(revoke, { as: admin(), method: 'DELETE', params: { id: second.id } });
    expect(taken.status).toBe(204);
    expect((await answer(second.token)).status).toBe(404);
    const open = await callRoute<{ items: { email: string }[] }>(listInvitations, { as: admin() });
    expect(open.body.items.map(({ email }) => email)).not.toContain('again@tarn.example');
  });

  it('refuses a short or common password and takes any other without rules', async () => {
    const { token } = await invited('rules@tarn.example');
    for (const password of ['seven77', 'Password123!', 'witnessmark1', '12345678', 'aaaaaaaa']) {
      const refused = await answer(token, { password });
      expect(refused.status, password).toBe(422);
      expect(refused.body.errors[0]?.pointer, password).toBe('/password');
    }
    expect((await answer(token, { password: 'only small letters' })).status).toBe(201);
  });

  it('wants the password of an account that exists, and leaves it as it was', async () => {
    const elsewhere = await addPerson(workshop.stranger.organisationId, 'both@moss.example', ['inspector'], null);
    const { token } = await invited('both@moss.example');
    const wrong = await answer(token, { password: 'not the right one' });
    expect(wrong.body.errors[0]?.pointer).toBe('/password');
    expect((await answer(token, { password: testPassword })).status).toBe(201);
    const organisations = (await accountMemberships(appDb(), elsewhere.accountId)).map((each) => each.organisationName);
    expect(organisations.sort()).toEqual(['Moss Spindles', 'Tarn Fitting']);
  });

  it('ties a customer’s person to its customer, and nobody else to one', async () => {
    const send = (body: object) => callRoute<Problem>(invite, { as: admin(), body: { name: 'P', ...body } });
    const without = await send({ email: 'c@aldery.example', roles: ['customer'] });
    expect(without.body.errors[0]?.pointer).toBe('/customerId');
    const both = await send({
      email: 'c@aldery.example',
      roles: ['customer', 'reviewer'],
      customerId: workshop.customerId,
    });
    expect(both.status).toBe(422);
    const { token } = await invited('c@aldery.example', { roles: ['customer'], customerId: workshop.customerId });
    expect((await answer(token)).status).toBe(201);
  });

  it('slows somebody down who tries tokens', async () => {
    const headers = { 'x-forwarded-for': '192.0.2.77' };
    const body = { token: 'x'.repeat(43), name: 'N', password: 'a long enough try' };
    const statuses: number[] = [];
    for (let index = 0; index < 12; index++) statuses.push((await callRoute(accept, { body, headers })).status);
    expect(statuses[0]).toBe(404);
    expect(statuses.at(-1)).toBe(429);
  });
});

describe('members', () => {
  it('are refused from their next request on when they are disabled', async () => {
    const person = await addPerson(workshop.organisationId, 'leaver@tarn.example', ['inspector'], null);
    expect((await callRoute(listMembers, { as: person })).status).toBe(200);
    const params = { id: person.memberId };
    const call = { as: admin(), method: 'PATCH', params };
    const off = await callRoute<Member>(changeMember, { ...call, body: { disabled: true }, headers: ifMatch(1) });
    expect(off.body.disabledAt).not.toBeNull();
    expect((await callRoute(listMembers, { as: person })).status).toBe(401);
    await callRoute(changeMember, { ...call, body: { disabled: false }, headers: ifMatch(2) });
    expect((await callRoute(listMembers, { as: person })).status).toBe(200);
  });

  it('are refused when their sessions were ended', async () => {
    const person = await addPerson(workshop.organisationId, 'ended@tarn.example', ['inspector'], null);
    await endSessions(appDb(), person.accountId);
    expect((await callRoute(listMembers, { as: person })).status).toBe(401);
    expect((await callRoute(listMembers, { as: { ...person, sessionVersion: 2 } })).status).toBe(200);
  });

  it('have the rights of their roles from the next request on', async () => {
    const person = await addPerson(workshop.organisationId, 'rising@tarn.example', ['inspector'], null);
    expect((await callRoute(listInvitations, { as: person })).status).toBe(403);
    const call = { as: admin(), method: 'PATCH', params: { id: person.memberId } };
    await callRoute(changeMember, { ...call, body: { roles: ['administrator'] }, headers: ifMatch(1) });
    expect((await callRoute(listInvitations, { as: person })).status).toBe(200);
    await callRoute(changeMember, { ...call, body: { disabled: true }, headers: ifMatch(2) });
  });

  it('always keep one administrator', async () => {
    const call = { as: admin(), method: 'PATCH', params: { id: admin().memberId } };
    for (const body of [{ disabled: true }, { roles: ['inspector'] }]) {
      const refused = await callRoute<Problem>(changeMember, { ...call, body, headers: ifMatch(1) });
      expect(refused.status).toBe(409);
      expect(refused.body.detail).toContain('last administrator');
    }
  });

  it('do not turn from a customer’s person into staff, nor belong to another organisation', async () => {
    const { customer } = workshop.people;
    const call = { method: 'PATCH', body: { roles: ['reviewer'] }, headers: ifMatch(1) };
    const turned = await callRoute<Problem>(changeMember, { ...call, as: admin(), params: { id: customer.memberId } });
    expect(turned.body.errors[0]?.pointer).toBe('/roles');
    const stranger = await callRoute(changeMember, {
      ...call,
      as: workshop.stranger,
      params: { id: customer.memberId },
    });
    expect(stranger.status).toBe(404);
  });

  it('cannot set what is not theirs to set', async () => {
    const body = { organisationId: workshop.stranger.organisationId };
    const call = { as: admin(), method: 'PATCH', params: { id: admin().memberId }, headers: ifMatch(1) };
    expect((await callRoute(changeMember, { ...call, body })).status).toBe(422);
  });
});

describe('letterhead', () => {
  it('changes with its version, an address a line each', async () => {
    const before = await callRoute<{ version: number }>(getOrganisation, { as: admin() });
    const call = { as: admin(), method: 'PATCH', headers: ifMatch(before.version) };
    const body = { addressLines: 'Mill Lane 2\n\n Tarn ', code: 'tf2' };
    const changed = await callRoute(changeOrganisation, { ...call, body });
    expect(changed.body).toMatchObject({ addressLines: ['Mill Lane 2', 'Tarn'], code: 'TF2', name: 'Tarn Fitting' });
    expect((await callRoute(changeOrganisation, { ...call, body })).status).toBe(412);
    const zone = await callRoute<Problem>(changeOrganisation, { ...call, body: { timeZone: 'Moon/Base' } });
    expect(zone.body.errors[0]?.pointer).toBe('/timeZone');
  });
});

async function ownerRows(sql: string): Promise<{ rows: { task_identifier: string }[] }> {
  const { default: createKnex } = await import('knex');
  const owner = createKnex({ client: 'pg', connection: workshop.ownerUrl });
  try {
    return await owner.raw(sql);
  } finally {
    await owner.destroy();
  }
}
