import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET as getTest } from '@/app/api/catalogue/[code]/[test]/route';
import { POST as postValues } from '@/app/api/catalogue/[code]/[test]/values/route';
import { GET as getOne } from '@/app/api/catalogue/own/[id]/route';
import { POST as postVersion } from '@/app/api/catalogue/own/[id]/versions/route';
import { POST as postWithdrawal } from '@/app/api/catalogue/own/[id]/withdrawal/route';
import { GET as getOwn, POST as postOwn } from '@/app/api/catalogue/own/route';
import { GET as getPlan, POST as postPlan } from '@/app/api/jobs/[id]/plan/route';
import { PATCH as changeOrganisation, GET as getOrganisation } from '@/app/api/organisation/route';
import { POST as takeOperations } from '@/app/api/sheets/[id]/operations/route';
import { GET as getSheet } from '@/app/api/sheets/[id]/route';
import { reportSource } from '@/db/read-models/report-source';
import { newId } from '@/lib/id';
import { newComposition } from '@/lib/planning/new-composition';
import type { OwnDefinitionInput } from '@/lib/schemas/own-definition';
import { buildReport } from '@/lib/services/build-report';
import type { PlannedSheet } from '@/standards/types';
import { ifMatch } from '@/tests/helpers/call-route';
import { type Asked, type Member, Workshop } from './workshop';

const worked = 'LK32-0O81-B';
let workshop: Workshop;
beforeAll(async () => {
  workshop = await Workshop.open();
});
afterAll(() => workshop?.close());

const composition = (change: Partial<OwnDefinitionInput> = {}): OwnDefinitionInput => ({
  ...newComposition('run-out'),
  title: 'Register of the chuck flange',
  boundTitle: 'Register of the flange on {spindle}',
  procedure: ['Clean the register.', 'Turn by hand and read; back at 0° it must show the same.'],
  judgedFigure: 'total reading of the turn',
  tolerance: {
    ...{ by: 'all', allUm: '5', unit: 'µm', perLength: null, local: null, basis: null },
    provenance: { kind: 'builder', text: 'our drawing 4411, sheet 2' },
  },
  layout: { kind: 'turns', insertions: 1, anglesDeg: '0 90 180 270', insertionLabel: 'turn' },
  ...change,
});
const compose = (id: string, form: object = composition(), as: Member = 'administrator') =>
  workshop.call(postOwn, { as, body: { id, form } });
const version = (id: string, basedOn: number, form: object, rest: Asked = {}) =>
  workshop.call(postVersion, {
    ...{ as: 'administrator', params: { id }, body: { form }, headers: ifMatch(basedOn) },
    ...rest,
  });
const withdraw = (id: string, as: Member = 'administrator') =>
  workshop.call(postWithdrawal, { as, method: 'POST', params: { id } });
const read = async (id: string, as: Member = 'inspector') => workshop.call(getOne, { as, params: { id } });
const proposalsOf = async (jobId: string): Promise<PlannedSheet[]> =>
  (await workshop.call(getPlan, { params: { id: jobId } })).body.proposals;

/** A job with this one test, planned; its sheet as the route answers it. */
async function plannedSheet(key: string) {
  const jobId = await workshop.openJob(worked);
  const exclusions = (await proposalsOf(jobId))
    .filter((one) => one.key !== key)
    .map((one) => ({ key: one.key, reason: 'not-agreed', text: null }));
  const made = await workshop.call(postPlan, { params: { id: jobId }, body: { include: [key], exclusions } });
  expect([made.status, made.body]).toEqual([201, { sheets: 1 }]);
  const { body } = await workshop.call(getPlan, { params: { id: jobId } });
  return { jobId, sheetId: body.sheets[0].id as string };
}
const sheetOf = async (sheetId: string) => (await workshop.call(getSheet, { params: { id: sheetId } })).body;
const type = async (sheetId: string, texts: string[]) => {
  const { passes } = await sheetOf(sheetId);
  const operations = texts.map((text, angle) => ({
    ...{ opId: newId(), passId: passes[0].id, cellId: `/insertions/0/readings/${angle}`, baseVersion: 0, text },
    ...{ unit: 'µm', source: 'typed', deviceTime: '2026-03-10T10:10:00Z', seq: angle },
  }));
  return workshop.call(takeOperations, { params: { id: sheetId }, body: { operations } });
};

/** The tests as the report of the job prints them now. */
const blocksOf = (jobId: string) =>
  workshop.as('reviewer', async (trx) => buildReport((await reportSource(trx, jobId))!, null).blocks);

describe('an own test', () => {
  it('is composed by the quality manager and stands beside the codes', async () => {
    const { status, body, headers } = await compose('own-1');
    expect([status, headers.get('location')]).toEqual([201, '/api/catalogue/own/OWN-1']);
    expect(body.definition).toMatchObject({
      ...{ id: 'OWN-1', code: 'own tests', edition: '', version: 1, method: 'run-out' },
      layout: { kind: 'turns', insertions: 1, anglesDeg: ['0', '90', '180', '270'] },
      cautions: ['isolate-before-touching', 'maker-and-local-rules-first'],
    });
    const { body: found } = await workshop.call(getTest, { params: { code: 'own', test: 'OWN-1' } });
    expect(found.definition).toEqual(body.definition);
    const { body: list } = await workshop.call(getOwn, { as: 'customer' });
    expect(list.items.map(({ id, version: at }: Record<string, unknown>) => [id, at])).toEqual([['OWN-1', 1]]);
  });

  it('is refused at the field, by schema and by what does not hold together', async () => {
    for (const [id, form, pointer] of [
      ['OWN 2', composition(), '/id'],
      ['OWN-2', composition({ title: '' }), '/form/title'],
      ['OWN-2', composition({ measurement: 'tasting' }), '/form/measurement'],
      ['OWN-2', composition({ layout: { kind: 'diameters', positionsMm: '0 50' } }), '/form/layout/kind'],
      ['OWN-2', composition({ direction: 'convex-only' }), '/form/direction'],
      ['OWN-2', composition({ boundTitle: 'Flange on {turret}' }), '/form/boundTitle'],
      ['OWN-2', { ...composition(), colour: 'green' }, '/form'],
      [
        'OWN-2',
        composition({ layout: { ...composition().layout, anglesDeg: '0 0 90' } as never }),
        '/form/layout/anglesDeg',
      ],
      [
        'OWN-2',
        composition({ tolerance: { ...composition().tolerance, allUm: '5,5' } as never }),
        '/form/tolerance/allUm',
      ],
    ] as const) {
      const { status, body } = await compose(id, form);
      expect([status, body.errors?.[0]?.pointer], pointer).toEqual([422, pointer]);
    }
    const again = await compose('OWN-1');
    expect([again.status, again.body.errors[0].pointer]).toEqual([409, '/id']);
    expect((await read('OWN-2')).status).toBe(404);
  });

  it('is the administrator’s to compose, everybody’s to read, and of one organisation only', async () => {
    for (const as of ['inspector', 'reviewer', 'customer'] as const) {
      expect((await compose('OWN-3', composition(), as)).status).toBe(403);
      expect((await version('OWN-1', 1, composition(), { as })).status).toBe(403);
      expect((await withdraw('OWN-1', as)).status).toBe(403);
      expect((await read('OWN-1', as)).status).toBe(200);
    }
    expect((await read('OWN-1', 'stranger')).status).toBe(404);
    expect((await version('OWN-1', 1, composition(), { as: 'stranger' })).status).toBe(404);
    expect((await withdraw('OWN-1', 'stranger')).status).toBe(404);
    expect((await workshop.call(getOwn, { as: 'stranger' })).body.items).toEqual([]);
    // The same id is free there, and is another test.
    expect((await compose('OWN-1', composition({ title: 'Something of theirs' }), 'stranger')).status).toBe(201);
    expect((await read('OWN-1')).body.definition.title).toBe('Register of the chuck flange');
  });

  it('does not change once it is written', async () => {
    const change = (columns: object) => workshop.as('administrator', (trx) => trx('own_definitions').update(columns));
    await expect(change({ version: 9 })).rejects.toMatchObject({ code: '42501' });
    await expect(workshop.as('administrator', (trx) => trx('own_definitions').delete())).rejects.toMatchObject({
      code: '42501',
    });
  });
});

describe('in a plan', () => {
  it('an own test is proposed by default, bound to what it is done on, and judges by its own tolerance', async () => {
    const found = (await proposalsOf(await workshop.openJob(worked))).filter(
      ({ definition }) => definition.id === 'OWN-1',
    );
    expect(found.map(({ key, title }) => [key, title])).toEqual([
      ['OWN-1:S1', 'Register of the flange on main spindle S1'],
    ]);
    expect(found[0]).toMatchObject({
      tolerance: { baseUm: '5', provenance: { kind: 'builder', text: 'our drawing 4411, sheet 2' } },
      ownDefinition: { id: 'OWN-1', version: 1 },
    });
    const { sheetId } = await plannedSheet('OWN-1:S1');
    const { body } = await type(sheetId, ['0', '2', '6', '1']);
    expect(body.passes[0].outcome.judgement).toMatchObject({ verdict: 'out-of-tolerance', toleranceUm: '5' });
  });

  it('an old sheet reads its old definition to the digit after a new version, in operations and in the report too', async () => {
    const old = await plannedSheet('OWN-1:S1');
    const before = await sheetOf(old.sheetId);
    const measuredBefore = await plannedSheet('OWN-1:S1');
    await type(measuredBefore.sheetId, ['0', '1', '4.5', '1']);
    const [printed] = await blocksOf(measuredBefore.jobId);
    expect(JSON.stringify(printed)).toContain('4.5');
    const next = composition({
      title: 'Register of the chuck flange, eight angles',
      layout: { ...composition().layout, anglesDeg: '0 45 90 135 180 225 270 315' } as never,
      tolerance: { ...composition().tolerance, allUm: '3' } as never,
      procedure: ['Another way.', 'And another step.'],
    });
    const { status, body, version: made } = await version('OWN-1', 1, next);
    expect([status, made, body.definition.version]).toEqual([201, 2, 2]);

    // Planned with the first version, measured after the second was made.
    const typed = await type(old.sheetId, ['0', '1', '4.5', '1']);
    expect(typed.body.passes[0].outcome).toMatchObject({
      state: 'complete',
      judgement: { verdict: 'within-tolerance' },
    });
    const after = await sheetOf(old.sheetId);
    expect(after.definition).toEqual(before.definition);
    expect(after.tolerance).toEqual(before.tolerance);
    expect((await blocksOf(measuredBefore.jobId))[0]).toEqual(printed);

    const fresh = await plannedSheet('OWN-1:S1');
    const measured = await type(fresh.sheetId, ['0', '1', '4.5', '1', '0', '0', '0', '0']);
    expect(measured.body.passes[0].outcome).toMatchObject({ state: 'complete', judgement: { toleranceUm: '3' } });
  });

  it('a version is made from the one that was seen', async () => {
    expect((await version('OWN-1', 1, composition())).status).toBe(412);
    expect((await version('OWN-1', 2, composition(), { headers: {} })).status).toBe(428);
    const both = await Promise.all([version('OWN-1', 2, composition()), version('OWN-1', 2, composition())]);
    expect(both.map(({ status }) => status).sort()).toEqual([201, 412]);
    const { body } = await read('OWN-1');
    expect(body.history.map((row: { version: number }) => row.version)).toEqual([3, 2, 1]);
    expect(body.history[2].definition.layout.anglesDeg).toEqual(['0', '90', '180', '270']);
  });

  it('a tolerance of an own test can be confirmed, for that version', async () => {
    const body = {
      ...{ state: 'confirmed', cells: [{ cell: 'all' }], ofEdition: 'drawing 4411', clause: 'sheet 2', remark: null },
    };
    const said = await workshop.call(postValues, { as: 'administrator', params: { code: 'own', test: 'OWN-1' }, body });
    expect([said.status, said.body.cells[0].state]).toEqual([201, 'confirmed']);
    const planned = async () =>
      (await proposalsOf(await workshop.openJob(worked))).find(({ key }) => key === 'OWN-1:S1')?.tolerance
        ?.confirmation;
    expect(await planned()).toMatchObject({ edition: 'drawing 4411', clause: 'sheet 2' });
    expect((await version('OWN-1', 3, composition())).status).toBe(201);
    expect(await planned()).toBeUndefined();
  });

  it('a withdrawn test is not proposed any more, its sheets keep it, and a new version brings it back', async () => {
    const kept = await plannedSheet('OWN-1:S1');
    expect((await withdraw('OWN-1')).body).toEqual({ version: 4 });
    expect((await withdraw('OWN-1')).status).toBe(409);
    const ids = async () => (await proposalsOf(await workshop.openJob(worked))).map(({ definition }) => definition.id);
    expect(await ids()).not.toContain('OWN-1');
    expect((await read('OWN-1')).body).toMatchObject({ withdrawn: true, version: 4, definition: { version: 4 } });
    expect((await type(kept.sheetId, ['0', '1', '2', '1'])).body.passes[0].outcome.state).toBe('complete');
    expect((await version('OWN-1', 4, composition())).status).toBe(201);
    expect(await ids()).toContain('OWN-1');
  });

  it('an organisation that has chosen its codes gets its own tests beside them, and a job can do without', async () => {
    const theirs = async () => (await workshop.call(getOrganisation, { as: 'administrator' })).body;
    const chosen = [{ code: 'ISO 13041-1', edition: '2020' }];
    expect((await withdraw('OWN-1')).status).toBe(201);
    const { version: at } = await theirs();
    const set = await workshop.call(changeOrganisation, {
      ...{ as: 'administrator', method: 'PATCH', body: { codes: chosen }, headers: ifMatch(at) },
    });
    expect(set.status).toBe(200);
    const codesOf = async () => [
      ...new Set((await proposalsOf(await workshop.openJob(worked))).map(({ definition }) => definition.code)),
    ];
    expect(await codesOf()).toEqual(['ISO 13041-1']);
    expect((await compose('OWN-7')).status).toBe(201);
    expect((await theirs()).codes).toEqual([...chosen, { code: 'own tests', edition: '' }]);
    expect((await codesOf()).sort()).toEqual(['ISO 13041-1', 'own tests']);
  });
});
