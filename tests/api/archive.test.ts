import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET as archive } from '@/app/api/archive/route';
import { POST as register } from '@/app/api/machines/route';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { addReport } from '@/tests/helpers/add-report';
import { callRoute } from '@/tests/helpers/call-route';
import { openTestWorkshop, type TestPerson, type TestWorkshop } from '@/tests/helpers/test-workshop';

interface Hit {
  machine: { id: string; serialNumber: string; customerName: string | null };
  match: string;
  matchedOn: string;
  reports: { id: string; number: string; state: string }[];
}

const serials = [
  'LK32-0O81-B',
  'LK32-0081-8X',
  'AX-LK32-0081-8',
  'HP25-1I10-S5',
  'SW20Z-2Z7O',
  '17/S508 B',
  'QT.10.0DB1',
  'MM-774-4411',
];

let workshop: TestWorkshop;
const ids = new Map<string, string>();
beforeAll(async () => {
  workshop = await openTestWorkshop();
  for (const [index, serialNumber] of serials.entries()) {
    const customerId = index % 2 ? workshop.otherCustomerId : workshop.customerId;
    const body = {
      manufacturer: 'Larkfield',
      model: 'SL-32',
      serialNumber,
      customerId,
      makeUp: startingMakeUps[0]?.makeUp,
    };
    const { body: made } = await callRoute<{ id: string }>(register, { as: workshop.people.inspector, body });
    ids.set(serialNumber, made.id);
  }
});
afterAll(() => workshop.close());

const look = async (q: string, as: TestPerson = workshop.people.inspector) => {
  const answer = await callRoute<{ items: Hit[]; next: string | null }>(archive, {
    as,
    path: `/api/archive?${new URLSearchParams({ q })}`,
  });
  expect(answer.status).toBe(200);
  return answer.body.items;
};
const found = async (q: string) => (await look(q)).map(({ machine, match }) => [machine.serialNumber, match]);

describe('by serial number', () => {
  it('puts exact before folded before the beginning before a part', async () => {
    expect(await found('LK32-0O81-B')).toEqual([
      ['LK32-0O81-B', 'exact'],
      ['LK32-0081-8X', 'prefix'],
      ['AX-LK32-0081-8', 'part'],
    ]);
    expect((await found('lk32 0081 8'))[0]).toEqual(['LK32-0O81-B', 'folded']);
    expect(await found('ax')).toEqual([['AX-LK32-0081-8', 'prefix']]);
  });

  it.each([
    ['without dashes', 'HP251I10S5', 'HP25-1I10-S5'],
    ['in lower case with look-alikes', 'hp25-lil0-55', 'HP25-1I10-S5'],
    ['O for 0 and Z for 2', 'sw2o2 zz70', 'SW20Z-2Z7O'],
    ['with other separators', '17 5508-8', '17/S508 B'],
    ['a part from the middle', '10s5', 'HP25-1I10-S5'],
    ['the last signs', '4411', 'MM-774-4411'],
  ])('finds it %s', async (_, typed, serial) => {
    expect((await found(typed))[0]?.[0]).toBe(serial);
  });

  it.each([
    ['one sign substituted', 'MM-774-4511'],
    ['one missing', 'MM-74-4411'],
    ['one added', 'MM-7734-4411'],
    ['two swapped', 'MM-747-4411'],
  ])('calls a hit similar when it is one slip away: %s', async (_, typed) => {
    expect(await found(typed)).toEqual([['MM-774-4411', 'slip']]);
  });

  it('does not call two slips similar', async () => {
    expect(await found('MX-774-4511')).toEqual([]);
  });

  it('keeps signs that mean something to the database apart from what they mean there', async () => {
    expect(await found('%')).toEqual([]);
    expect(await found('_')).toEqual([]);
    expect(await found("'; drop table machines; --")).toEqual([]);
  });
});

describe('by something else', () => {
  it('finds the machine by report, job, order, maker and owner, with all its reports', async () => {
    const machineId = ids.get('MM-774-4411') ?? '';
    const first = await addReport(workshop, {
      machineId,
      customerId: workshop.otherCustomerId,
      state: 'signed',
      order: 'M-77/3',
    });
    await addReport(workshop, {
      machineId,
      customerId: workshop.otherCustomerId,
      state: 'issued',
      startsOn: '2026-06-01',
    });
    for (const [typed, matchedOn] of [
      [first.number, 'report'],
      [first.reference.toLowerCase(), 'job'],
      ['m-77/3', 'order'],
    ] as const) {
      const [hit] = await look(typed);
      expect(hit, typed).toMatchObject({ matchedOn, match: 'exact', machine: { id: machineId } });
      expect(hit?.reports.map(({ state }) => state)).toEqual(['issued', 'signed']);
    }
    expect(await look('larkfield sl')).toHaveLength(serials.length);
    const owned = await look('benn');
    expect(new Set(owned.map(({ machine }) => machine.customerName))).toEqual(new Set(['Benn Valves']));
  });
});

describe('who may see what', () => {
  it('a customer finds its own machines only, another organisation none', async () => {
    const own = await look('larkfield', workshop.people.customer);
    expect(own.map(({ machine }) => machine.serialNumber).sort()).toEqual(
      serials.filter((_, index) => index % 2 === 0).sort(),
    );
    expect(await look('HP25-1I10-S5', workshop.people.customer)).toEqual([]);
    expect(await look('larkfield', workshop.stranger)).toEqual([]);
  });

  it('a customer does not see a report that has not gone out', async () => {
    const machineId = ids.get('LK32-0O81-B') ?? '';
    await addReport(workshop, { machineId, customerId: workshop.customerId, state: 'checked' });
    const [office] = await look('LK32-0O81-B');
    expect(office?.reports).toHaveLength(1);
    const [outside] = await look('LK32-0O81-B', workshop.people.customer);
    expect(outside?.reports).toEqual([]);
  });
});

describe('pages', () => {
  it('go on by keyset', async () => {
    for (let index = 0; index < 25; index++) {
      const body = {
        manufacturer: 'Stennick',
        model: 'T',
        serialNumber: `PGX-${index}`,
        makeUp: startingMakeUps[0]?.makeUp,
      };
      await callRoute(register, { as: workshop.people.inspector, body });
    }
    const seen: string[] = [];
    let after: string | null = null;
    do {
      const query: string = new URLSearchParams({ q: 'PGX', ...(after ? { after } : {}) }).toString();
      const page: { body: { items: Hit[]; next: string | null } } = await callRoute(archive, {
        as: workshop.people.inspector,
        path: `/api/archive?${query}`,
      });
      seen.push(...page.body.items.map(({ machine }) => machine.serialNumber));
      after = page.body.next;
    } while (after);
    expect(seen).toHaveLength(25);
    expect(new Set(seen).size).toBe(25);
  });

  it('an empty search is refused in words', async () => {
    const answer = await callRoute<{ detail: string }>(archive, {
      as: workshop.people.inspector,
      path: '/api/archive?q=%20',
    });
    expect(answer.status).toBe(422);
    expect(answer.body.detail).toBe('Write what you look for.');
  });
});
