import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET as getHistory } from '@/app/api/machines/[id]/history/route';
import { POST as transfer } from '@/app/api/machines/[id]/owners/route';
import { PATCH as changeMachine, GET as getMachine } from '@/app/api/machines/[id]/route';
import { GET as listMachines, POST as register } from '@/app/api/machines/route';
import { inScope } from '@/db/client';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { addReport } from '@/tests/helpers/add-report';
import { callRoute, ifMatch } from '@/tests/helpers/call-route';
import { openTestWorkshop, type TestWorkshop } from '@/tests/helpers/test-workshop';

interface Problem {
  title: string;
  errors: { pointer: string; detail: string }[];
}
interface Machine {
  id: string;
  manufacturer: string;
  serialNumber: string;
  year: number | null;
  site: string | null;
  version: number;
  customer: { id: string; name: string } | null;
  makeUp: { linearAxes: { travelMm: string }[] };
}

let workshop: TestWorkshop;
beforeAll(async () => {
  workshop = await openTestWorkshop();
});
afterAll(() => workshop.close());

const machine = (serialNumber: string, more: object = {}) => ({
  manufacturer: 'Larkfield',
  model: 'SL-32 II',
  serialNumber,
  year: '2011',
  site: ' hall 2 ',
  makeUp: startingMakeUps[1]?.makeUp,
  ...more,
});
const inspector = () => workshop.people.inspector;
const registered = async (serialNumber: string, more: object = {}) => {
  const answer = await callRoute<Machine>(register, { as: inspector(), body: machine(serialNumber, more) });
  expect(answer.status).toBe(201);
  return answer.body;
};

describe('registering a machine', () => {
  it('keeps what stands on the plate, and makes the customer its first owner', async () => {
    const made = await registered('LK32-0O81-B', { customerId: workshop.customerId });
    expect(made).toMatchObject({
      manufacturer: 'Larkfield',
      serialNumber: 'LK32-0O81-B',
      year: 2011,
      site: 'hall 2',
      customer: { id: workshop.customerId, name: 'Aldery Turned Parts' },
    });
    const again = await callRoute<Machine>(getMachine, { as: inspector(), params: { id: made.id } });
    expect(again.body).toEqual(made);
    expect(again.version).toBe(1);
  });

  it('is refused a second time for the same maker, and possible for another maker', async () => {
    await registered('TWICE-1');
    const again = await callRoute<Problem>(register, { as: inspector(), body: machine('TWICE-1') });
    expect(again.status).toBe(409);
    expect(again.headers.get('content-type')).toBe('application/problem+json');
    expect(again.body.errors[0]?.pointer).toBe('/serialNumber');
    await registered('TWICE-1', { manufacturer: 'Stennick' });
  });

  it('happens once when it is sent twice with one key', async () => {
    const headers = { 'idempotency-key': 'one-press' };
    const body = machine('ONCE-1');
    const first = await callRoute<Machine>(register, { as: inspector(), body, headers });
    const second = await callRoute<Machine>(register, { as: inspector(), body, headers });
    expect(second.status).toBe(201);
    expect(second.body.id).toBe(first.body.id);
    const other = await callRoute(register, { as: inspector(), body: machine('ONCE-2'), headers });
    expect(other.status).toBe(422);
  });

  it('names the field that does not fit, by pointer', async () => {
    const base = startingMakeUps[0]?.makeUp;
    const broken = { ...base, linearAxes: base?.linearAxes.map((axis) => ({ ...axis, carries: 'T9' })) };
    const answer = await callRoute<Problem>(register, {
      as: inspector(),
      body: machine('', { year: 'eleven', makeUp: broken }),
    });
    expect(answer.status).toBe(422);
    const pointers = answer.body.errors.map(({ pointer }) => pointer);
    expect(pointers).toContain('/serialNumber');
    expect(pointers).toContain('/year');
    const alone = await callRoute<Problem>(register, { as: inspector(), body: machine('X-1', { makeUp: broken }) });
    expect(alone.body.errors[0]).toMatchObject({ pointer: '/makeUp/linearAxes/0/carries' });
    expect(alone.body.errors[0]?.detail).toContain('T9');
  });

  it('refuses an owner that is not a customer here', async () => {
    const body = machine('X-2', { customerId: workshop.stranger.memberId });
    const answer = await callRoute<Problem>(register, { as: inspector(), body });
    expect(answer.status).toBe(422);
    expect(answer.body.errors[0]?.pointer).toBe('/customerId');
  });
});

describe('changing a machine', () => {
  it('wants the version, keeps what is not named, and refuses an old version', async () => {
    const made = await registered('CHANGE-1');
    const params = { id: made.id };
    const change = (body: object, headers = {}) =>
      callRoute<Machine>(changeMachine, { as: inspector(), method: 'PATCH', params, body, headers });
    expect((await change({ site: 'hall 3' })).status).toBe(428);
    const changed = await change({ site: 'hall 3' }, ifMatch(1));
    expect(changed.status).toBe(200);
    expect(changed.body).toMatchObject({ site: 'hall 3', year: 2011, serialNumber: 'CHANGE-1', version: 2 });
    expect((await change({ site: 'hall 4' }, ifMatch(1))).status).toBe(412);
    expect((await change({ site: 'hall 4' }, ifMatch(2))).body).toMatchObject({ site: 'hall 4', version: 3 });
  });

  it('folds the serial number anew', async () => {
    const made = await registered('OLD-1');
    const params = { id: made.id };
    const body = { serialNumber: 'Neu-ZS 8' };
    await callRoute(changeMachine, { as: inspector(), method: 'PATCH', params, body, headers: ifMatch(1) });
    const row = await inScope(workshop.scope, (trx) => trx('machines').where({ id: made.id }).first('serial_folded'));
    expect(row.serial_folded).toBe('NEU258');
  });
});

describe('who sees a machine', () => {
  it('another organisation does not, nor does another customer', async () => {
    const made = await registered('HIDDEN-1', { customerId: workshop.otherCustomerId });
    for (const as of [workshop.stranger, workshop.people.customer]) {
      for (const handler of [getMachine, getHistory]) {
        expect((await callRoute(handler, { as, params: { id: made.id } })).status).toBe(404);
      }
      const list = await callRoute<{ items: Machine[] }>(listMachines, { as });
      expect(list.body.items.map(({ id }) => id)).not.toContain(made.id);
    }
  });

  it('the customer sees its own, without the names of other owners', async () => {
    const made = await registered('SOLD-1', { customerId: workshop.otherCustomerId });
    const { customer } = workshop.people;
    const answer = await callRoute(transfer, {
      as: workshop.people.reviewer,
      params: { id: made.id },
      body: { customerId: workshop.customerId, fromDate: '2099-01-01' },
    });
    expect(answer.status).toBe(201);
    const seen = await callRoute<Machine & { owners: { customerName: string }[] }>(getMachine, {
      as: customer,
      params: { id: made.id },
    });
    expect(seen.body.owners.map(({ customerName }) => customerName)).toEqual(['Aldery Turned Parts']);
  });
});

describe('handing a machine on', () => {
  it('shows the reports of the years before only when the transfer grants them', async () => {
    const { customer, reviewer } = workshop.people;
    for (const seesHistory of [false, true]) {
      const made = await registered(`GRANT-${seesHistory}`, { customerId: workshop.otherCustomerId });
      const params = { id: made.id };
      await addReport(workshop, { machineId: made.id, customerId: workshop.otherCustomerId, state: 'signed' });
      const body = { customerId: workshop.customerId, fromDate: '2099-01-01', seesHistory };
      expect((await callRoute(transfer, { as: reviewer, params, body })).status).toBe(201);
      const history = await callRoute<{ reports: unknown[] }>(getHistory, { as: customer, params });
      expect(history.body.reports).toHaveLength(seesHistory ? 1 : 0);
    }
  });

  it('refuses the owner that it has, a day before the ownership began, and somebody without the right', async () => {
    const made = await registered('STAY-1', { customerId: workshop.customerId });
    const give = (body: object, as = workshop.people.reviewer) =>
      callRoute<Problem>(transfer, { as, params: { id: made.id }, body });
    const same = await give({ customerId: workshop.customerId, fromDate: '2099-01-01' });
    expect(same.body.errors[0]?.pointer).toBe('/customerId');
    const early = await give({ customerId: workshop.otherCustomerId, fromDate: '1999-01-01' });
    expect(early.body.errors[0]?.pointer).toBe('/fromDate');
    expect((await give({ customerId: workshop.otherCustomerId, fromDate: '2099-01-01' }, inspector())).status).toBe(
      403,
    );
  });
});

describe('history', () => {
  it('lists jobs and reports newest first and follows each test over the signed reports', async () => {
    const made = await registered('DRIFT-1', { customerId: workshop.customerId });
    const figures = [
      ['2024-05-02', 'signed', '0.004'],
      ['2025-05-02', 'signed-with-remarks', '0.0055'],
      ['2026-05-02', 'issued', '0.019'],
    ] as const;
    for (const [startsOn, state, asLeft] of figures) {
      await addReport(workshop, { machineId: made.id, customerId: workshop.customerId, state, startsOn, asLeft });
    }
    const { body } = await callRoute<{
      reports: { number: string; revision: number; state: string; issuedAt: string; signedAt: string | null }[];
      jobs: { startsOn: string }[];
      drift: { title: string; toleranceMm: string; points: { asLeftMm: string; measuredOn: string }[] }[];
    }>(getHistory, { as: workshop.people.customer, params: { id: made.id } });
    expect(body.reports.map(({ state }) => state)).toEqual(['issued', 'signed-with-remarks', 'signed']);
    expect(body.jobs.map(({ startsOn }) => startsOn)).toEqual(['2026-05-02', '2025-05-02', '2024-05-02']);
    expect(body.drift).toHaveLength(1);
    expect(body.drift[0]).toMatchObject({ title: 'Nose run-out', toleranceMm: '0.008' });
    expect(body.drift[0]?.points.map(({ measuredOn, asLeftMm }) => [measuredOn, asLeftMm])).toEqual([
      ['2024-05-02', '0.004'],
      ['2025-05-02', '0.0055'],
    ]);
  });
});

describe('the list', () => {
  it('goes on by keyset without losing or doubling a machine when one is added in between', async () => {
    for (let index = 0; index < 55; index++)
      await registered(`PAGE-${String(index).padStart(3, '0')}`, { manufacturer: 'Pagemaker' });
    const seen: string[] = [];
    let path: string | null = '/api/machines';
    while (path) {
      const page: { body: { items: Machine[]; next: string | null }; headers: Headers } = await callRoute(
        listMachines,
        {
          as: inspector(),
          path,
        },
      );
      seen.push(...page.body.items.map(({ serialNumber }) => serialNumber));
      const link: string | undefined = /^<([^>]+)>; rel="next"$/.exec(page.headers.get('link') ?? '')?.[1];
      expect(Boolean(link)).toBe(page.body.next !== null);
      if (!seen.includes('PAGE-000a')) await registered('PAGE-000a', { manufacturer: 'Aaa' }).catch(() => undefined);
      path = link ?? null;
    }
    const pages = seen.filter((serial) => serial.startsWith('PAGE-') && serial !== 'PAGE-000a');
    expect(pages).toHaveLength(55);
    expect(new Set(seen).size).toBe(seen.length - duplicatesByMaker(seen));
  });

  it('refuses the mark of another list', async () => {
    const answer = await callRoute<Problem>(listMachines, { as: inspector(), path: '/api/machines?after=nonsense' });
    expect(answer.status).toBe(422);
  });
});

/** TWICE-1 stands there for two makers. */
const duplicatesByMaker = (serials: string[]) => serials.filter((serial) => serial === 'TWICE-1').length - 1;
