import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { POST as addCertificate, GET as listCertificates } from '@/app/api/instruments/[id]/calibrations/route';
import { PATCH as change, GET as getInstrument } from '@/app/api/instruments/[id]/route';
import { POST as add, GET as list } from '@/app/api/instruments/route';
import { daysLater, todayIn } from '@/lib/dates';
import { calibrationState } from '@/lib/schemas/calibration-state';
import { callRoute, ifMatch } from '@/tests/helpers/call-route';
import { openTestWorkshop, type TestWorkshop } from '@/tests/helpers/test-workshop';

interface Instrument {
  id: string;
  number: string;
  resolution: string | null;
  state: string;
  dueOn: string | null;
  retired: boolean;
}
interface Problem {
  errors: { pointer: string }[];
}

let workshop: TestWorkshop;
beforeAll(async () => {
  workshop = await openTestWorkshop();
});
afterAll(() => workshop.close());

const as = () => workshop.people.inspector;
const today = todayIn('Europe/Berlin');
const added = async (number: string, more: object = {}) => {
  const body = {
    number,
    name: 'lever indicator',
    kind: 'indicator',
    resolution: '0,20',
    resolutionUnit: 'µm',
    ...more,
  };
  return (await callRoute<Instrument>(add, { as: as(), body })).body;
};
const certify = (id: string, more: object = {}) =>
  callRoute<Problem>(addCertificate, {
    as: as(),
    params: { id },
    body: {
      certificate: 'C-1',
      calibratedOn: '2024-01-01',
      dueOn: today,
      expandedUncertainty: '1.60',
      uncertaintyUnit: 'µm',
      ...more,
    },
  });

describe('the state of a calibration', () => {
  it.each([
    [null, 'no-certificate'],
    ['2026-03-09', 'overdue'],
    ['2026-03-10', 'due-soon'],
    ['2026-04-09', 'due-soon'],
    ['2026-04-10', 'in-date'],
  ])('due %s on 10 March 2026: %s', (dueOn, state) => {
    expect(calibrationState(dueOn, '2026-03-10')).toBe(state);
  });

  it('counts a leap day', () => {
    expect(daysLater('2028-02-28', 2)).toBe('2028-03-01');
    expect(daysLater('2026-02-28', 1)).toBe('2026-03-01');
  });
});

describe('instruments', () => {
  it('keep their figures exactly as precise as they were written', async () => {
    const made = await added('D-14');
    expect(made).toMatchObject({ resolution: '0.20', state: 'no-certificate' });
    await certify(made.id);
    const { body } = await callRoute<{ items: { expandedUncertainty: string }[] }>(listCertificates, {
      as: as(),
      params: { id: made.id },
    });
    expect(body.items[0]?.expandedUncertainty).toBe('1.60');
  });

  it('are in date on their last valid day; the certificate with the latest due date counts', async () => {
    const made = await added('D-15');
    await certify(made.id, { dueOn: daysLater(today, -1) });
    const state = async () =>
      (await callRoute<Instrument>(getInstrument, { as: as(), params: { id: made.id } })).body.state;
    expect(await state()).toBe('overdue');
    await certify(made.id, { certificate: 'C-2', dueOn: today });
    expect(await state()).toBe('due-soon');
    await certify(made.id, { certificate: 'C-3', dueOn: daysLater(today, 365) });
    await certify(made.id, { certificate: 'C-0', dueOn: '2024-06-01' });
    expect(await state()).toBe('in-date');
  });

  it('are refused at the field that does not fit', async () => {
    const pointerOf = async (body: object) => {
      const whole = { number: 'D-16', name: 'n', kind: 'k', resolution: '1', resolutionUnit: 'µm', ...body };
      return (await callRoute<Problem>(add, { as: as(), body: whole })).body.errors?.[0]?.pointer;
    };
    expect(await pointerOf({ resolution: '-1' })).toBe('/resolution');
    expect(await pointerOf({ resolution: '0.0' })).toBe('/resolution');
    expect(await pointerOf({ resolution: '1.000,5' })).toBe('/resolution');
    expect(await pointerOf({ resolutionUnit: '' })).toBe('/resolutionUnit');
    expect(await pointerOf({ number: 'D-14' })).toBe('/number');
    const made = await added('D-17');
    const early = await certify(made.id, { dueOn: '2023-12-31' });
    expect(early.body.errors[0]?.pointer).toBe('/dueOn');
  });

  it('go out of use and stand last in the list', async () => {
    const made = await added('A-01');
    const call = { as: as(), method: 'PATCH', params: { id: made.id } };
    expect((await callRoute(change, { ...call, body: { retired: true }, headers: ifMatch(1) })).status).toBe(200);
    const { body } = await callRoute<{ items: Instrument[] }>(list, { as: as() });
    expect(body.items.at(-1)).toMatchObject({ number: 'A-01', retired: true });
    expect(body.items[0]?.retired).toBe(false);
    await callRoute(change, { ...call, body: { name: 'still here' }, headers: ifMatch(2) });
    const after = await callRoute<Instrument>(getInstrument, { as: as(), params: { id: made.id } });
    expect(after.body).toMatchObject({ name: 'still here', resolution: '0.20' });
  });

  it('of one organisation are unknown in another', async () => {
    const made = await added('D-20');
    const stranger = { as: workshop.stranger, params: { id: made.id } };
    expect((await callRoute(getInstrument, stranger)).status).toBe(404);
    expect(
      (await callRoute(addCertificate, { ...stranger, body: { certificate: 'X', calibratedOn: today, dueOn: today } }))
        .status,
    ).toBe(404);
  });
});
