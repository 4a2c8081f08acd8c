import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET as getPlan, POST as postPlan } from '@/app/api/jobs/[id]/plan/route';
import { POST as postJob } from '@/app/api/jobs/route';
import { POST as takeOperations } from '@/app/api/sheets/[id]/operations/route';
import { GET as getSheet, PATCH as patchSheet } from '@/app/api/sheets/[id]/route';
import { setJobState } from '@/db/queries/jobs';
import { newId } from '@/lib/id';
import type { PlannedSheet } from '@/standards/types';
import { ifMatch } from '@/tests/helpers/call-route';
import { type Asked, Workshop } from './workshop';

const lathe = 'HP25-1I10-S5';
const worked = 'LK32-0O81-B';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await Workshop.open();
});
afterAll(() => workshop?.close());

const planOf = async (jobId: string) => (await workshop.call(getPlan, { params: { id: jobId } })).body;
const make = (jobId: string, body: object, asked: Asked = {}) =>
  workshop.call(postPlan, { params: { id: jobId }, body, ...asked });

const notTaken = (proposals: PlannedSheet[], taken: string[]) =>
  proposals.filter(({ key }) => !taken.includes(key)).map(({ key }) => ({ key, reason: 'not-agreed', text: null }));

const events = (jobOrSheet: string) =>
  workshop.as('inspector', (trx) =>
    trx('audit_events').where({ subject_id: jobOrSheet }).orderBy('sequence').select('action', 'detail'),
  );

describe('proposals', () => {
  it('are every test that fits the make-up, in mechanical working order, until the plan is made', async () => {
    const jobId = await workshop.openJob(worked);
    const { made, proposals, sheets, exclusions } = await planOf(jobId);
    expect([made, sheets, exclusions]).toEqual([false, [], []]);
    const keys = proposals.map(({ key }: PlannedSheet) => key);
    expect(new Set(keys).size).toBe(keys.length);
    const place = (key: string) => keys.indexOf(key);
    // Spindle before what is measured against it, slides before turrets, the work piece last.
    for (const [before, after] of [
      ['SP-1a:S1', 'AX-1a:Z1:S1'],
      ['AX-1a:Z1:S1', 'TU-3:T1:S1'],
      ['SS-3a:S2', 'SS-1:S2:S1'],
      ['TU-3:T2:S1', 'PO-B:X1'],
      ['PO-B:Z2', 'WP-1:T1:Z1:S1'],
    ] as const) {
      expect(place(before), before).toBeGreaterThanOrEqual(0);
      expect(place(before), `${before} before ${after}`).toBeLessThan(place(after));
    }
    expect((await planOf(await workshop.openJob(worked))).proposals).toEqual(proposals);
  });

  it('follow the machine: no sub-spindle, no test of one', async () => {
    const { proposals } = await planOf(await workshop.openJob(lathe));
    const ids = proposals.map(({ definition }: PlannedSheet) => definition.id);
    expect(ids.some((id: string) => id.startsWith('SS-'))).toBe(false);
    expect(ids).toEqual(expect.arrayContaining(['SP-1a', 'AX-1a', 'AX-1b']));
  });

  it('stay those of the make-up that the job began with', async () => {
    const jobId = await workshop.openJob('QT-10-0DB1');
    const before = await planOf(jobId);
    const { id } = workshop.machines.get('QT-10-0DB1')!;
    const { makeUp } = workshop.machines.get(worked)!;
    await workshop.as('inspector', (trx) =>
      trx('machines')
        .where({ id })
        .update({ make_up: JSON.stringify(makeUp) }),
    );
    expect(await planOf(jobId)).toEqual(before);
  });
});

describe('a plan', () => {
  it('wants a reason for each test that is not taken, and stores nothing without', async () => {
    const jobId = await workshop.openJob(lathe);
    const { proposals } = await planOf(jobId);
    const [first, second, third] = proposals as PlannedSheet[];
    const exclusions = notTaken(proposals, [first!.key]).filter(({ key }) => key !== second!.key && key !== third!.key);
    const { status, body } = await make(jobId, { include: [first!.key, 'XX-9:Q7'], exclusions });
    expect(status).toBe(422);
    expect(body.errors).toEqual([
      { pointer: '/include/1', detail: expect.stringContaining('XX-9:Q7') },
      { pointer: '/exclusions', detail: expect.stringContaining(second!.title) },
      { pointer: '/exclusions', detail: expect.stringContaining(third!.title) },
    ]);
    const after = await planOf(jobId);
    expect([after.made, after.sheets]).toEqual([false, []]);
    expect(await events(jobId)).toMatchObject([{ action: 'job.opened' }]);
  });

  it('takes no reason but those of the list', async () => {
    const jobId = await workshop.openJob(lathe);
    const { proposals } = await planOf(jobId);
    const exclusions = notTaken(proposals, [proposals[0].key]);
    const bad = exclusions.map((entry, index) => (index === 1 ? { ...entry, reason: 'no time' } : entry));
    const { status, body } = await make(jobId, { include: [proposals[0].key], exclusions: bad });
    expect([status, body.errors[0].pointer]).toEqual([422, '/exclusions/1/reason']);
    expect((await make(jobId, { include: [], exclusions })).status).toBe(422);
  });

  it('is a sheet for each test taken, in working order whatever the order of choice, each with its first set of readings', async () => {
    const jobId = await workshop.openJob(worked);
    const { proposals } = await planOf(jobId);
    const wanted = ['WP-1:T1:Z1:S1', 'AX-4:Y1:X1', 'SP-1a:S1', 'AX-1a:Z1:S1'];
    const exclusions = notTaken(proposals, wanted).map((entry, index) =>
      index === 0 ? { ...entry, reason: 'not-possible', text: 'no mandrel of this taper on site' } : entry,
    );
    const answer = await make(jobId, { include: wanted, exclusions });
    expect([answer.status, answer.body]).toEqual([201, { sheets: 4 }]);
    const plan = await planOf(jobId);
    expect(plan.made).toBe(true);
    expect(plan.proposals).toEqual([]);
    expect(plan.sheets.map(({ position, key }: { position: number; key: string }) => [position, key])).toEqual([
      [1, 'SP-1a:S1'],
      [2, 'AX-1a:Z1:S1'],
      [3, 'AX-4:Y1:X1'],
      [4, 'WP-1:T1:Z1:S1'],
    ]);
    expect(plan.exclusions).toHaveLength(exclusions.length);
    expect(plan.exclusions).toContainEqual(
      expect.objectContaining({ reason: 'not-possible', text: 'no mandrel of this taper on site' }),
    );
    for (const sheet of plan.sheets) {
      const proposed = proposals.find(({ key }: PlannedSheet) => key === sheet.key);
      const { definition, component, dependsOn, tolerance, direction, title, setUp } = sheet;
      expect({ definition, component, dependsOn, tolerance, direction, title, setUp }).toMatchObject({
        definition: proposed.definition,
        component: proposed.component,
        dependsOn: proposed.dependsOn,
        tolerance: proposed.tolerance,
        direction: proposed.direction,
        title: proposed.title,
        setUp: proposed.setUp,
      });
      const { body } = await workshop.call(getSheet, { method: 'GET', params: { id: sheet.id } });
      expect(body).toMatchObject({ state: 'not-measured', result: null, passes: [{ kind: 'as-found', number: 1 }] });
      const cells = Object.entries(body.passes[0].cells as Record<string, { text: string }>);
      expect(Object.fromEntries(cells.map(([pointer, { text }]) => [pointer, text]))).toEqual(
        Object.fromEntries(
          Object.entries(setUp as PlannedSheet['setUp']).map(([pointer, { text }]) => [pointer, text]),
        ),
      );
    }
    expect(await events(jobId)).toMatchObject([
      { action: 'job.opened' },
      { action: 'plan.made', detail: { sheets: 4 } },
    ]);
  });

  it('is made once, also when two people press at the same moment', async () => {
    const jobId = await workshop.openJob(lathe);
    const { proposals } = await planOf(jobId);
    const form = { include: [proposals[0].key], exclusions: notTaken(proposals, [proposals[0].key]) };
    const both = await Promise.all([make(jobId, form), make(jobId, form, { as: 'reviewer' })]);
    expect(both.map(({ status }) => status).sort()).toEqual([201, 409]);
    const again = await make(jobId, form);
    expect([again.status, again.body.detail]).toEqual([409, expect.stringMatching(/has a plan already/)]);
    expect((await planOf(jobId)).sheets).toHaveLength(1);
  });

  it('is not there for a customer, and not found by another organisation', async () => {
    const jobId = await workshop.openJob(lathe);
    const { proposals } = await planOf(jobId);
    const form = { include: [proposals[0].key], exclusions: notTaken(proposals, [proposals[0].key]) };
    expect((await make(jobId, form, { as: 'customer' })).status).toBe(403);
    expect((await make(jobId, form, { as: 'stranger' })).status).toBe(404);
    expect((await workshop.call(getPlan, { as: 'stranger', params: { id: jobId } })).status).toBe(404);
    expect((await make(newId(), form)).status).toBe(404);
    expect((await planOf(jobId)).made).toBe(false);
  });
});

describe('a contract tolerance', () => {
  const lostMotion = 'PO-B:X1';

  it('stands in place of the catalogue’s, names its item, and judges', async () => {
    const contract = [{ key: lostMotion, toleranceUm: '4.5', source: 'order 7714, item 3.2' }];
    const { jobId, sheets } = await workshop.plannedJob(
      worked,
      [lostMotion, 'PO-B:Z1', 'SP-1a:S1'],
      [...contract, { key: 'SP-1a:S1', toleranceUm: '2', source: 'order 7714, item 1.1' }],
    );
    const { sheets: planned } = await planOf(jobId);
    const toleranceOf = (key: string) => planned.find((sheet: { key: string }) => sheet.key === key).tolerance;
    expect(toleranceOf(lostMotion)).toMatchObject({
      baseUm: '4.5',
      foundBy: 'contract',
      provenance: { kind: 'contract', text: 'order 7714, item 3.2' },
    });
    // Nobody has agreed on one: for information, never a figure of ours.
    expect(toleranceOf('PO-B:Z1')).toBeNull();
    const { sheetId, passId } = sheets.get('SP-1a:S1')!;
    const operations = ['0', '1', '2', '2.2', '2', '1', '0', '0', '0'].map((text, angle) => ({
      ...{ opId: newId(), passId, cellId: `/insertions/0/readings/${angle}`, baseVersion: 0, text, unit: 'µm' },
      ...{ source: 'typed', deviceTime: '2026-03-10T10:10:00Z', seq: angle },
    }));
    const { body } = await workshop.call(takeOperations, { params: { id: sheetId }, body: { operations } });
    expect(body.passes[0].outcome.judgement).toMatchObject({
      verdict: 'out-of-tolerance',
      toleranceUm: '2',
      limitUm: '2',
      marginUm: '-0.2',
    });
  });

  it('is a decimal in µm with its item, for a test of this machine', async () => {
    const jobId = await workshop.openJob(worked);
    const { proposals } = await planOf(jobId);
    const form = (contract: object) => ({
      include: [lostMotion],
      exclusions: notTaken(proposals, [lostMotion]),
      contractTolerances: [{ key: lostMotion, toleranceUm: '5', source: 'order 7714', ...contract }],
    });
    for (const [contract, pointer] of [
      [{ toleranceUm: '4,5' }, '/contractTolerances/0/toleranceUm'],
      [{ toleranceUm: '-5' }, '/contractTolerances/0/toleranceUm'],
      [{ toleranceUm: 5 }, '/contractTolerances/0/toleranceUm'],
      [{ source: '  ' }, '/contractTolerances/0/source'],
      [{ key: 'PO-B:W9' }, '/contractTolerances/0/key'],
    ] as const) {
      const { status, body } = await make(jobId, form(contract));
      expect([status, body.errors?.[0]?.pointer]).toEqual([422, pointer]);
    }
    expect((await make(jobId, form({}))).status).toBe(201);
  });
});

describe('a planned test', () => {
  const nose = 'SP-1a:S1';
  const patch = (sheetId: string, body: object, version: number | null, asked: Asked = {}) =>
    workshop.call(patchSheet, {
      ...{ method: 'PATCH', params: { id: sheetId }, body },
      ...(version === null ? {} : { headers: ifMatch(version) }),
      ...asked,
    });
  const read = async (sheetId: string) =>
    (await workshop.call(getSheet, { method: 'GET', params: { id: sheetId } })).body;

  it('is left out only with a reason of the list, and can be taken in again', async () => {
    const { sheetId } = (await workshop.plannedJob(worked, [nose])).sheets.get(nose)!;
    for (const leftOut of [{}, { reason: '' }, { reason: 'no time' }, { text: 'no mandrel' }]) {
      const { status, body } = await patch(sheetId, { leftOut }, 1);
      expect([status, body.errors[0].pointer]).toEqual([422, '/leftOut/reason']);
    }
    expect(await read(sheetId)).toMatchObject({ state: 'not-measured', sheet: { version: 1 } });

    const out = await patch(sheetId, { leftOut: { reason: 'not-possible', text: 'chuck cannot come off' } }, 1);
    expect([out.status, out.version]).toEqual([200, 2]);
    expect(await read(sheetId)).toMatchObject({
      state: 'left-out',
      sheet: { leftOutReason: 'not-possible', leftOutText: 'chuck cannot come off', leftOutBy: 'T. Orrell' },
    });

    expect((await patch(sheetId, { leftOut: null }, 2)).status).toBe(200);
    expect(await read(sheetId)).toMatchObject({
      state: 'not-measured',
      sheet: { leftOutReason: null, leftOutText: null, leftOutBy: null, leftOutAt: null },
    });
    expect(await events(sheetId)).toMatchObject([
      { action: 'sheet.left-out', detail: { reason: 'not-possible' } },
      { action: 'sheet.taken-in' },
    ]);
  });

  it('keeps its remark when it is left out, and its reason when it is remarked', async () => {
    const { sheetId } = (await workshop.plannedJob(worked, [nose])).sheets.get(nose)!;
    await patch(sheetId, { remark: 'Cone re-ground in 2019.' }, 1);
    await patch(sheetId, { leftOut: { reason: 'not-touched', text: null } }, 2);
    expect((await read(sheetId)).sheet).toMatchObject({
      remark: 'Cone re-ground in 2019.',
      leftOutReason: 'not-touched',
    });
    await patch(sheetId, { remark: '' }, 3);
    expect((await read(sheetId)).sheet).toMatchObject({ remark: null, leftOutReason: 'not-touched' });
  });

  it('is changed over the version that was seen, by whoever may', async () => {
    const { sheetId } = (await workshop.plannedJob(worked, [nose])).sheets.get(nose)!;
    const leftOut = { reason: 'not-agreed', text: null };
    expect((await patch(sheetId, { leftOut }, null)).status).toBe(428);
    expect((await patch(sheetId, { leftOut }, 7)).status).toBe(412);
    expect((await patch(sheetId, { leftOut }, 1, { as: 'customer' })).status).toBe(403);
    expect((await patch(sheetId, { leftOut }, 1, { as: 'stranger' })).status).toBe(404);
    expect((await patch(sheetId, { leftOut }, 1, { as: null })).status).toBe(401);
    const both = await Promise.all([patch(sheetId, { leftOut }, 1), patch(sheetId, { remark: 'seen' }, 1)]);
    expect(both.map(({ status }) => status).sort()).toEqual([200, 412]);
  });

  it('of an issued report is not left out any more', async () => {
    const { jobId, sheets } = await workshop.plannedJob(worked, [nose]);
    await workshop.as('inspector', (trx) => setJobState(trx, jobId, 'issued'));
    const { status } = await patch(sheets.get(nose)!.sheetId, { leftOut: { reason: 'not-agreed', text: null } }, 1);
    expect(status).toBe(409);
  });
});

describe('opening a job', () => {
  const form = () => {
    const { id, customerId } = workshop.machines.get(worked)!;
    const reference = `QMF-${newId().slice(-8)}`;
    return { machineId: id, customerId, reference, purpose: 'periodic', startsOn: '2026-03-10' };
  };

  it('wants a machine, a customer, a purpose, days in order, and a reference of its own', async () => {
    for (const [change, pointer] of [
      [{ machineId: newId() }, '/machineId'],
      [{ customerId: newId() }, '/customerId'],
      [{ purpose: 'because' }, '/purpose'],
      [{ endsOn: '2026-03-09' }, '/endsOn'],
      [{ startsOn: '2026-02-30' }, '/startsOn'],
      [{ reference: ' ' }, '/reference'],
    ] as const) {
      const { status, body } = await workshop.call(postJob, { body: { ...form(), ...change } });
      expect([status, body.errors?.[0]?.pointer]).toEqual([422, pointer]);
    }
    const first = form();
    const answer = await workshop.call(postJob, { body: first });
    expect([answer.status, answer.headers.get('location')]).toEqual([201, `/api/jobs/${answer.body.id}`]);
    const again = await workshop.call(postJob, { body: first });
    expect([again.status, again.body.errors[0].pointer]).toEqual([409, '/reference']);
  });

  it('twice with one key opens one job', async () => {
    const call = { body: form(), headers: { 'idempotency-key': newId() } };
    const [one, two] = [await workshop.call(postJob, call), await workshop.call(postJob, call)];
    expect([two.status, two.body]).toEqual([one.status, one.body]);
  });
});
