import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { POST as linkAsLeft } from '@/app/api/jobs/[id]/as-left-links/route';
import { POST as takeOperations } from '@/app/api/sheets/[id]/operations/route';
import { PATCH as patchPass } from '@/app/api/sheets/[id]/passes/[passId]/route';
import { POST as postPass } from '@/app/api/sheets/[id]/passes/route';
import { GET as getSheet } from '@/app/api/sheets/[id]/route';
import { closeJob, findJob, setJobState } from '@/db/queries/jobs';
import { newId } from '@/lib/id';
import { ifMatch } from '@/tests/helpers/call-route';
import { type Asked, Workshop } from './workshop';

const machine = 'LK32-0O81-B';
const nose = 'SP-1a:S1';
const straightness = 'AX-5:Z1:ZX';

let workshop: Workshop;
let sheetId: string;
let passId: string;
let seq = 0;

beforeAll(async () => {
  const instrument = (number: string, calibrated: string, due: string) => ({
    ...{ number, name: 'dial indicator', kind: 'dial indicator', resolution: '1', resolutionUnit: 'µm' },
    ...{ certificate: `HR-${number}`, calibrated, due, uncertainty: '1', uncertaintyUnit: 'µm', keptUp: false },
  });
  workshop = await Workshop.open([
    instrument('IN-01', '2025-09-29', '2026-09-30'),
    instrument('IN-04', '2024-03-11', '2026-03-10'),
  ]);
});
afterAll(() => workshop?.close());

async function freshSheet(key: string): Promise<void> {
  const planned = await workshop.plannedJob(machine, [key]);

  ({ sheetId, passId } = planned.sheets.get(key)!);
}
beforeEach(() => freshSheet(nose));

async function type(pass: string, cells: Record<string, string>, deviceTime = '2026-03-10T10:10:00+01:00') {
  const operations = Object.entries(cells).map(([cellId, text]) => {
    seq += 1;
    const operation = { opId: newId(), passId: pass, cellId, baseVersion: 0, text, unit: 'µm', source: 'typed' };
    return { ...operation, deviceTime, seq };
  });
  const { body } = await workshop.call(takeOperations, { params: { id: sheetId }, body: { operations } });
  return body.results.map(({ outcome }: { outcome: string }) => outcome) as string[];
}

const turn = (texts: string[]) =>
  Object.fromEntries(texts.map((text, angle) => [`/insertions/0/readings/${angle}`, text]));
const found = turn(['0', '1', '2', '3', '2', '1', '0', '0', '0']);
const start = (kind: string, linkTo: string | null = null) =>
  workshop.call(postPass, { params: { id: sheetId }, body: { kind, linkTo } });
const read = async () => (await workshop.call(getSheet, { method: 'GET', params: { id: sheetId } })).body;

describe('sets of readings', () => {
  it('begin with as found, once, and count up after that', async () => {
    expect((await start('as-found')).status).toBe(409);
    await type(passId, found);
    for (const kind of ['adjusting', 'adjusting', 'as-left']) expect((await start(kind)).status).toBe(201);
    const { passes } = await read();
    expect(passes.map((pass: { kind: string; number: number }) => [pass.kind, pass.number])).toEqual([
      ['as-found', 1],
      ['adjusting', 1],
      ['adjusting', 2],
      ['as-left', 1],
    ]);
  });

  it('carry the set-up over, with what was changed in it, and never a reading', async () => {
    await freshSheet(straightness);
    const { passes } = await read();
    const positions = Object.keys(passes[0].cells);
    await type(passId, { '/points/0/reading': '0', '/points/1/reading': '1,2' });
    const moved = { opId: newId(), passId, cellId: '/points/1/position', baseVersion: 1, text: '60', unit: 'mm' };
    await workshop.call(takeOperations, {
      params: { id: sheetId },
      body: { operations: [{ ...moved, source: 'typed', deviceTime: '2026-03-10T10:12:00Z', seq: ++seq }] },
    });
    await start('as-left');
    const cells = (await read()).passes[1].cells as Record<string, { text: string }>;
    expect(Object.keys(cells).sort()).toEqual(positions.sort());
    expect(cells['/points/1/position']?.text).toBe('60');
    expect(Object.keys(cells).filter((pointer) => pointer.endsWith('/reading'))).toEqual([]);
  });
});

describe('as left = as found', () => {
  it('wants complete readings as found, takes none itself, and shows their result', async () => {
    expect((await start('as-left', passId)).status).toBe(409);
    await type(passId, found);
    const { status, body } = await start('as-left', passId);
    expect(status).toBe(201);
    const sheet = await read();
    expect(sheet).toMatchObject({ state: 'left', result: { deviationUm: '3' } });
    expect(sheet.passes[1]).toMatchObject({ linkedTo: passId, cells: {}, result: sheet.passes[0].result });
    expect(await type(body.id, found)).toEqual(Array(9).fill('rejected'));
    expect((await start('as-left', passId)).status).toBe(409);
  });

  it('cannot be said of another sheet, nor after something was measured again', async () => {
    await type(passId, found);
    const other = (await workshop.plannedJob(machine, [nose])).sheets.get(nose)!;
    expect((await start('as-left', other.passId)).status).toBe(409);
    const { body } = await start('adjusting');
    await type(body.id, turn(['0', '1', '1', '1', '1', '1', '0', '0', '0']));
    const refused = await start('as-left', passId);
    expect([refused.status, refused.body.detail]).toEqual([409, expect.stringMatching(/taken after those as found/)]);
  });

  it('is said of many sheets at once, of those only that have nothing newer', async () => {
    const include = [nose, straightness, 'AX-1a:Z1:S1'];
    const planned = await workshop.plannedJob(machine, include);
    const sheetIds = [...planned.sheets.values()].map((sheet) => sheet.sheetId);
    ({ sheetId, passId } = planned.sheets.get(nose)!);
    await type(passId, found);
    const link = () => workshop.call(linkAsLeft, { params: { id: planned.jobId }, body: { sheetIds } });
    expect((await link()).body).toEqual({ linked: 1 });
    expect((await link()).body).toEqual({ linked: 0 });
    expect((await read()).state).toBe('left');
  });
});

describe('a set’s conditions', () => {
  const patch = (body: object, version: number, asked: Asked = {}) =>
    workshop.call(patchPass, {
      ...{ method: 'PATCH', params: { id: sheetId, passId }, body, headers: ifMatch(version) },
      ...asked,
    });
  const id = (number: string) => workshop.instruments.get(number)!;

  it('temperature as typed and as figure', async () => {
    expect((await patch({ temperature: '20,4' }, 1)).status).toBe(200);
    const row = await workshop.as('inspector', (trx) => trx('passes').where({ id: passId }).first());
    expect(row).toMatchObject({ temperature: '20.4', temperature_text: '20,4', version: 2 });
    for (const temperature of ['warm', '20.4 mm', '2.0,4']) {
      const { status, body } = await patch({ temperature }, 2);
      expect([status, body.errors[0].pointer]).toEqual([422, '/temperature']);
    }
    expect((await patch({ temperature: '21' }, 1)).status).toBe(412);
    expect((await patch({ temperature: '' }, 2)).status).toBe(200);
  });

  it('an instrument on its last valid day is in date; a day later it wants a reason and a name, judged in the workshop’s zone', async () => {
    const square = { instrumentId: id('IN-04'), overrideReason: null, overrideBy: null };
    // 2026-03-10 23:30 in Berlin is still the last valid day; half an hour later it is not, though it is 23:30 in London.
    const onDay = await patch({ takenAt: '2026-03-10T22:30:00Z', instruments: [square] }, 1);
    expect(onDay.status).toBe(200);
    const late = { takenAt: '2026-03-10T23:30:00Z' };
    const refused = await patch({ ...late, instruments: [square] }, 2);
    expect([refused.status, refused.body.errors[0].pointer]).toEqual([422, '/instruments/0/overrideReason']);
    const halfSaid = { ...square, overrideReason: 'turned square: its own error cancels' };
    expect((await patch({ ...late, instruments: [halfSaid] }, 2)).status).toBe(422);
    // An inspector may not allow it, and a name that is nobody's neither.
    const byHimself = await patch({ ...late, instruments: [{ ...halfSaid, overrideBy: 'T. Orrell' }] }, 2);
    expect([byHimself.status, byHimself.body.errors[0].pointer]).toEqual([422, '/instruments/0/overrideBy']);
    const allowed = { ...halfSaid, overrideBy: 'J. Penhale' };
    expect((await patch({ ...late, instruments: [{ ...square, instrumentId: id('IN-01') }, allowed] }, 2)).status).toBe(
      200,
    );
    const events = await workshop.as('inspector', (trx) =>
      trx('audit_events').where({ subject_id: sheetId, action: 'instrument.overridden' }).select('detail'),
    );
    expect(events).toMatchObject([{ detail: { by: 'J. Penhale', instrumentId: id('IN-04') } }]);
  });

  it('an instrument of the register, named once', async () => {
    const named = (instrumentId: string) => ({ instrumentId, overrideReason: null, overrideBy: null });
    const takenAt = '2026-03-09T10:00:00Z';
    for (const [instruments, pointer] of [
      [[named(newId())], '/instruments/0'],
      [[named(id('IN-01')), named(id('IN-01'))], '/instruments/1'],
    ] as const) {
      const { status, body } = await patch({ takenAt, instruments }, 1);
      expect([status, body.errors?.[0]?.pointer]).toEqual([422, pointer]);
    }
  });

  it('belong to a set of this sheet, of the own organisation', async () => {
    const other = (await workshop.plannedJob(machine, [nose])).sheets.get(nose)!;
    const params = { id: sheetId, passId: other.passId };
    expect((await patch({ temperature: '20' }, 1, { params })).status).toBe(404);
    expect((await patch({ temperature: '20' }, 1, { as: 'stranger' })).status).toBe(404);
    expect((await patch({ temperature: '20' }, 1, { as: 'customer' })).status).toBe(403);
  });
});

it('the answer to a report closes its job, but not one that was opened again meanwhile', async () => {
  const { jobId } = await workshop.plannedJob(machine, [nose]);
  const afterClosing = () =>
    workshop.as('inspector', async (trx) => {
      await closeJob(trx, jobId);
      return (await findJob(trx, jobId))?.state;
    });
  expect(await afterClosing()).toBe('open');
  await workshop.as('reviewer', (trx) => setJobState(trx, jobId, 'issued'));
  expect(await afterClosing()).toBe('closed');
});
