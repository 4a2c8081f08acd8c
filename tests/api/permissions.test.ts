import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import * as archive from '@/app/api/archive/route';
import * as values from '@/app/api/catalogue/[code]/[test]/values/route';
import * as ownTest from '@/app/api/catalogue/own/[id]/route';
import * as versions from '@/app/api/catalogue/own/[id]/versions/route';
import * as withdrawal from '@/app/api/catalogue/own/[id]/withdrawal/route';
import * as ownTests from '@/app/api/catalogue/own/route';
import * as catalogue from '@/app/api/catalogue/route';
import * as agreement from '@/app/api/catalogue/values/[id]/agreement/route';
import * as valuesImport from '@/app/api/catalogue/values/import/route';
import * as valuesCsv from '@/app/api/catalogue/values.csv/route';
import * as customer from '@/app/api/customers/[id]/route';
import * as customers from '@/app/api/customers/route';
import * as calibrations from '@/app/api/instruments/[id]/calibrations/route';
import * as instrument from '@/app/api/instruments/[id]/route';
import * as instruments from '@/app/api/instruments/route';
import * as invitation from '@/app/api/invitations/[id]/route';
import * as invitations from '@/app/api/invitations/route';
import * as job from '@/app/api/jobs/[id]/route';
import * as jobs from '@/app/api/jobs/route';
import * as history from '@/app/api/machines/[id]/history/route';
import * as owners from '@/app/api/machines/[id]/owners/route';
import * as machine from '@/app/api/machines/[id]/route';
import * as machines from '@/app/api/machines/route';
import * as member from '@/app/api/members/[id]/route';
import * as members from '@/app/api/members/route';
import * as organisation from '@/app/api/organisation/route';
import * as planTemplate from '@/app/api/plan-templates/[id]/route';
import * as planTemplates from '@/app/api/plan-templates/route';
import { type Action, can, permissions, type Role, roles } from '@/lib/auth/permissions';
import { newId } from '@/lib/id';
import { callRoute } from '@/tests/helpers/call-route';
import { openTestWorkshop, type TestWorkshop } from '@/tests/helpers/test-workshop';

/** Written a second time, by hand: a change of the table in the program must be a change here too. */
const expected: Record<Action, Role[]> = {
  'organisation.change': ['administrator'],
  'member.list': ['administrator', 'reviewer', 'inspector'],
  'member.manage': ['administrator'],
  'customer.list': ['administrator', 'reviewer', 'inspector'],
  'customer.manage': ['administrator', 'reviewer', 'inspector'],
  'machine.read': ['administrator', 'reviewer', 'inspector', 'customer'],
  'machine.manage': ['administrator', 'reviewer', 'inspector'],
  'machine.transfer': ['administrator', 'reviewer'],
  'instrument.read': ['administrator', 'reviewer', 'inspector'],
  'instrument.manage': ['administrator', 'reviewer', 'inspector'],
  'instrument.override': ['administrator', 'reviewer'],
  'catalogue.read': ['administrator', 'reviewer', 'inspector', 'customer'],
  'catalogue.confirm': ['administrator'],
  'catalogue.agree': ['administrator', 'reviewer'],
  'catalogue.compose': ['administrator'],
  'job.read': ['administrator', 'reviewer', 'inspector'],
  'job.manage': ['administrator', 'reviewer', 'inspector'],
  'sheet.measure': ['inspector', 'reviewer'],
  'report.read': ['administrator', 'reviewer', 'inspector', 'customer'],
  'report.issue': ['reviewer'],
  'report.witness': ['inspector', 'reviewer'],
  'report.sign': ['customer'],
  'archive.search': ['administrator', 'reviewer', 'inspector', 'customer'],
};

describe('every action with every role', () => {
  it('is the same list of actions', () => {
    expect(Object.keys(permissions).sort()).toEqual(Object.keys(expected).sort());
  });

  it.each(Object.keys(expected) as Action[])('%s', (action) => {
    for (const role of roles) expect(can([role], action), `${role}: ${action}`).toBe(expected[action].includes(role));
    for (const one of roles) {
      for (const other of roles) {
        const either = expected[action].includes(one) || expected[action].includes(other);
        expect(can([one, other], action), `${one} and ${other}: ${action}`).toBe(either);
      }
    }
  });

  it('refuses nobody in particular, unknown roles and unknown actions', () => {
    for (const action of Object.keys(expected) as Action[]) {
      expect(can([], action)).toBe(false);
      expect(can(['owner', 'Administrator', ''], action)).toBe(false);
    }
    expect(can([...roles], 'report.delete' as Action)).toBe(false);
    expect(can([...roles], 'toString' as Action)).toBe(false);
  });
});

const params = { id: newId() };
const routes: [string, unknown, Action, { method: string; path?: string; body?: unknown; params?: typeof params }][] = [
  ['GET /api/archive', archive.GET, 'archive.search', { method: 'GET', path: '/api/archive?q=x' }],
  ['GET /api/catalogue', catalogue.GET, 'catalogue.read', { method: 'GET' }],
  ['GET values', values.GET, 'catalogue.read', { method: 'GET', params }],
  ['POST values', values.POST, 'catalogue.confirm', { method: 'POST', body: {}, params }],
  ['POST agreement', agreement.POST, 'catalogue.agree', { method: 'POST', params }],
  ['GET values.csv', valuesCsv.GET, 'catalogue.read', { method: 'GET' }],
  ['POST import of values', valuesImport.POST, 'catalogue.confirm', { method: 'POST', body: {} }],
  ['GET own tests', ownTests.GET, 'catalogue.read', { method: 'GET' }],
  ['POST own tests', ownTests.POST, 'catalogue.compose', { method: 'POST', body: {} }],
  ['GET own test', ownTest.GET, 'catalogue.read', { method: 'GET', params: { id: 'OWN-1' } }],
  ['POST version', versions.POST, 'catalogue.compose', { method: 'POST', body: {}, params: { id: 'OWN-1' } }],
  ['POST withdrawal', withdrawal.POST, 'catalogue.compose', { method: 'POST', params: { id: 'OWN-1' } }],
  ['GET /api/customers', customers.GET, 'customer.list', { method: 'GET' }],
  ['POST /api/customers', customers.POST, 'customer.manage', { method: 'POST', body: {} }],
  ['GET /api/customers/{id}', customer.GET, 'customer.list', { method: 'GET', params }],
  ['PATCH /api/customers/{id}', customer.PATCH, 'customer.manage', { method: 'PATCH', body: {}, params }],
  ['GET /api/instruments', instruments.GET, 'instrument.read', { method: 'GET' }],
  ['POST /api/instruments', instruments.POST, 'instrument.manage', { method: 'POST', body: {} }],
  ['GET /api/instruments/{id}', instrument.GET, 'instrument.read', { method: 'GET', params }],
  ['PATCH /api/instruments/{id}', instrument.PATCH, 'instrument.manage', { method: 'PATCH', body: {}, params }],
  ['GET calibrations', calibrations.GET, 'instrument.read', { method: 'GET', params }],
  ['POST calibrations', calibrations.POST, 'instrument.manage', { method: 'POST', body: {}, params }],
  ['GET /api/invitations', invitations.GET, 'member.manage', { method: 'GET' }],
  ['POST /api/invitations', invitations.POST, 'member.manage', { method: 'POST', body: {} }],
  ['DELETE /api/invitations/{id}', invitation.DELETE, 'member.manage', { method: 'DELETE', params }],
  ['GET /api/jobs', jobs.GET, 'job.read', { method: 'GET' }],
  ['POST /api/jobs', jobs.POST, 'job.manage', { method: 'POST', body: {} }],
  ['PATCH /api/jobs/{id}', job.PATCH, 'job.manage', { method: 'PATCH', params, body: {} }],
  ['GET /api/machines', machines.GET, 'machine.read', { method: 'GET' }],
  ['POST /api/machines', machines.POST, 'machine.manage', { method: 'POST', body: {} }],
  ['GET /api/machines/{id}', machine.GET, 'machine.read', { method: 'GET', params }],
  ['PATCH /api/machines/{id}', machine.PATCH, 'machine.manage', { method: 'PATCH', body: {}, params }],
  ['GET history', history.GET, 'machine.read', { method: 'GET', params }],
  ['POST owners', owners.POST, 'machine.transfer', { method: 'POST', body: {}, params }],
  ['GET /api/members', members.GET, 'member.list', { method: 'GET' }],
  ['GET /api/members/{id}', member.GET, 'member.list', { method: 'GET', params }],
  ['PATCH /api/members/{id}', member.PATCH, 'member.manage', { method: 'PATCH', body: {}, params }],
  ['GET /api/plan-templates', planTemplates.GET, 'job.read', { method: 'GET' }],
  ['POST /api/plan-templates', planTemplates.POST, 'job.manage', { method: 'POST', body: {} }],
  ['DELETE /api/plan-templates/{id}', planTemplate.DELETE, 'job.manage', { method: 'DELETE', params }],
  ['GET /api/organisation', organisation.GET, 'member.list', { method: 'GET' }],
  ['PATCH /api/organisation', organisation.PATCH, 'organisation.change', { method: 'PATCH', body: {} }],
];

describe('every route', () => {
  let workshop: TestWorkshop;
  beforeAll(async () => {
    workshop = await openTestWorkshop();
  });
  afterAll(() => workshop.close());

  it.each(routes)('%s lets in whom the action lets in', async (_, handler, action, call) => {
    expect((await callRoute(handler, call)).status, 'without a session').toBe(401);
    for (const role of roles) {
      const { status, body } = await callRoute<{ title?: string }>(handler, { ...call, as: workshop.people[role] });
      if (expected[action].includes(role)) expect(status, role).not.toBe(403);
      else expect([status, body.title], role).toEqual([403, 'Not allowed']);
      expect(status, role).toBeLessThan(500);
    }
  });

  it('refuses a page of another site, and a session that was not signed by us', async () => {
    const call = { as: workshop.people.administrator, body: {}, headers: { origin: 'https://elsewhere.example' } };
    expect((await callRoute(customers.POST, call)).status).toBe(403);
    const forged = await callRoute(customers.GET, {
      headers: { cookie: 'next-auth.session-token=eyJhbGciOiJub25lIn0..x.y.z' },
    });
    expect(forged.status).toBe(401);
    const elsewhere = { ...workshop.people.administrator, organisationId: workshop.stranger.organisationId };
    expect((await callRoute(customers.GET, { as: elsewhere })).status).toBe(401);
  });
});
