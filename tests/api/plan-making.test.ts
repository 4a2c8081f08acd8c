import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PUT as putComponents } from '@/app/api/jobs/[id]/components/route';
import { GET as getPlan, POST as postPlan } from '@/app/api/jobs/[id]/plan/route';
import { GET as getJob } from '@/app/api/jobs/[id]/route';
import { DELETE as deleteTemplate } from '@/app/api/plan-templates/[id]/route';
import { GET as getTemplates, POST as postTemplate } from '@/app/api/plan-templates/route';
import { POST as takeOperations } from '@/app/api/sheets/[id]/operations/route';
import { PATCH as patchSheet } from '@/app/api/sheets/[id]/route';
import { setJobState } from '@/db/queries/jobs';
import { reportSource } from '@/db/read-models/report-source';
import { newId } from '@/lib/id';
import { openedWords } from '@/lib/reporting/opened-words';
import { buildReport } from '@/lib/services/build-report';
import type { PlannedSheet } from '@/standards/types';
import { ifMatch } from '@/tests/helpers/call-route';
import { type Asked, Workshop } from './workshop';

const worked = 'LK32-0O81-B';
const lathe = 'HP25-1I10-S5';
const nose = 'SP-1a:S1';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await Workshop.open();
});
afterAll(() => workshop?.close());

const planOf = async (jobId: string) => (await workshop.call(getPlan, { params: { id: jobId } })).body;

/** One set of readings, a reading every so many minutes from a time on. */
async function measure(sheet: { sheetId: string; passId: string }, from: string, everyMinutes: number) {
  const operations = Array.from({ length: 9 }, (_, angle) => ({
    ...{ opId: newId(), passId: sheet.passId, cellId: `/insertions/0/readings/${angle}`, baseVersion: 0 },
    ...{ text: '1', unit: 'µm', source: 'typed', seq: angle },
    deviceTime: new Date(Date.parse(from) + angle * everyMinutes * 60_000).toISOString(),
  }));
  const { status } = await workshop.call(takeOperations, { params: { id: sheet.sheetId }, body: { operations } });
  expect(status).toBe(200);
}

describe('the time that a plan will take', () => {
  it('is each test’s own estimate while there is no past', async () => {
    const { proposals, estimates } = await planOf(await workshop.openJob(worked));
    expect(Object.keys(estimates)).toHaveLength(proposals.length);
    for (const { key, minutes } of proposals) expect(estimates[key]).toEqual({ minutes, fromPasses: null });
  });

  it('is the median of three sets of readings or more, the gap before them counted as setting up', async () => {
    const [first, second] = [nose, 'SP-2a:S1'];
    const jobs = [];
    for (let k = 0; k < 3; k += 1) jobs.push((await workshop.plannedJob(worked, [first, second])).sheets);
    // 8, 16 and 24 min at the nose; the bore begins 10 min, 20 min and 2 h after it and takes 8 min each.
    const days = ['2026-03-10', '2026-03-11', '2026-03-12'];
    const gaps = [10, 20, 120];
    for (const [k, sheets] of jobs.entries()) {
      await measure(sheets.get(first)!, `${days[k]}T08:00:00Z`, k + 1);
      const before = await planOf(await workshop.openJob(worked));
      expect(before.estimates[first].fromPasses).toBe(k < 2 ? null : 3);
      const ended = Date.parse(`${days[k]}T08:00:00Z`) + (8 * (k + 1) + gaps[k]!) * 60_000;
      await measure(sheets.get(second)!, new Date(ended).toISOString(), 1);
    }
    const { estimates, proposals } = await planOf(await workshop.openJob(worked));
    expect(estimates[first]).toEqual({ minutes: 16, fromPasses: 3 });
    // 18, 28, and 8 where two hours lay between.
    expect(estimates[second]).toEqual({ minutes: 18, fromPasses: 3 });
    const third = proposals.find(({ key }: PlannedSheet) => key === 'SP-2b:S1');
    expect(estimates['SP-2b:S1']).toEqual({ minutes: third.minutes, fromPasses: null });
    // Nobody’s past but the own.
    const { body } = await workshop.call(getTemplates, { as: 'stranger', method: 'GET' });
    expect(body).toEqual({ templates: [] });
  });
});

describe('what was opened', () => {
  const say = (jobId: string, version: number, body: object, asked: Asked = {}) =>
    workshop.call(putComponents, {
      ...{ method: 'PUT', params: { id: jobId }, body, headers: ifMatch(version) },
      ...asked,
    });
  const versionOf = async (jobId: string) =>
    (await workshop.call(getJob, { method: 'GET', params: { id: jobId } })).version ?? 0;

  it('proposes what rests on it, with the reason in words', async () => {
    const jobId = await workshop.openJob(worked);
    expect((await planOf(jobId)).follows).toEqual({});
    const said = {
      T2: { condition: 'refitted', text: 'after the collision' },
      S1: { condition: 'untouched', text: null },
    };
    const answer = await say(jobId, await versionOf(jobId), said);
    expect([answer.status, answer.version]).toEqual([200, answer.body.version]);
    const { follows, proposals } = await planOf(jobId);
    expect(follows['TU-3:T2:S1']).toEqual(['turret T2 was removed and refitted']);
    expect(follows['AX-1a:Z2:S1']).toEqual(['Z2 carries turret T2, which was removed and refitted']);
    for (const key of [nose, 'AX-1a:Z1:S1', 'TU-3:T1:S1', 'AX-4:Y1:X1']) {
      expect(proposals.some((sheet: PlannedSheet) => sheet.key === key)).toBe(true);
      expect(follows[key], key).toBeUndefined();
    }
    // Every axis moves on the bed.
    await say(jobId, await versionOf(jobId), { bed: { condition: 'repaired', text: null } });
    const bed = (await planOf(jobId)).follows;
    expect(bed['AX-1a:Z1:S1']).toEqual(['Z1 moves on the bed, which was repaired']);
    expect(bed[nose]).toBeUndefined();
  });

  it('prints beside the component', async () => {
    const { jobId } = await workshop.plannedJob(worked, [nose]);
    const draft = async () => {
      const source = await workshop.as('inspector', (trx) => reportSource(trx, jobId));
      return buildReport(source!, null).machine.components;
    };
    expect((await draft()).every((component) => !('condition' in component))).toBe(true);
    await say(jobId, await versionOf(jobId), {
      T2: { condition: 'refitted', text: 'after the collision' },
      C1: { condition: 'untouched', text: null },
      bed: { condition: 'repaired', text: 'scraped' },
    });
    const printed = await draft();
    expect(printed.find(({ id }) => id === 'T2')).toMatchObject({
      what: expect.stringContaining('turret'),
      condition: 'removed and refitted, after the collision',
    });
    expect(openedWords(printed)).toBe(
      'T2 removed and refitted, after the collision · C1 untouched · bed repaired, scraped',
    );
    expect(printed.find(({ id }) => id === 'S1')).not.toHaveProperty('condition');
  });

  it('is of a component that the machine has, said over the version that was seen, until the report is out', async () => {
    const jobId = await workshop.openJob(worked);
    const version = await versionOf(jobId);
    const said = { T1: { condition: 'replaced', text: null } };
    const unknown = await say(jobId, version, { ...said, TS1: { condition: 'repaired', text: null } });
    expect([unknown.status, unknown.body.errors]).toEqual([
      422,
      [{ pointer: '/TS1', detail: expect.stringContaining('TS1') }],
    ]);
    expect((await say(jobId, version, { T1: { condition: 'opened', text: null } })).status).toBe(422);
    expect((await say(jobId, version + 5, said)).status).toBe(412);
    expect((await say(jobId, version, said, { as: 'customer' })).status).toBe(403);
    expect((await say(jobId, version, said, { as: 'stranger' })).status).toBe(404);
    expect((await say(jobId, version, said)).status).toBe(200);
    await workshop.as('inspector', (trx) => setJobState(trx, jobId, 'issued'));
    expect((await say(jobId, await versionOf(jobId), {})).status).toBe(409);
  });
});

describe('what a plan can begin from', () => {
  it('is the plan of an earlier job of this machine, with its reasons and contract tolerances', async () => {
    const contract = { key: 'PO-B:X1', toleranceUm: '4.5', source: 'order 7714, item 3.2' };
    const { jobId, sheets } = await workshop.plannedJob(lathe, [nose, 'PO-B:X1', 'PO-B:Z1'], [contract]);
    const { sheetId } = sheets.get('PO-B:Z1')!;
    await workshop.call(patchSheet, {
      ...{ method: 'PATCH', params: { id: sheetId }, headers: ifMatch(1) },
      body: { leftOut: { reason: 'not-possible', text: 'no room for the stand' } },
    });
    const next = await workshop.openJob(lathe);
    const { starts, proposals } = await planOf(next);
    expect(starts).toMatchObject([{ kind: 'same-machine', id: jobId, serialNumber: null }]);
    const { choices } = starts[0];
    expect(choices.include).toEqual([nose, 'PO-B:X1']);
    expect(choices.exclusions).toContainEqual({
      key: 'PO-B:Z1',
      reason: 'not-possible',
      text: 'no room for the stand',
    });
    expect(choices.exclusions).toHaveLength(proposals.length - 2);
    expect(choices.contractTolerances).toEqual([contract]);
    // It is a form that makes the same plan.
    const made = await workshop.call(postPlan, { params: { id: next }, body: choices });
    expect([made.status, made.body]).toEqual([201, { sheets: 2 }]);
    expect((await planOf(next)).starts).toEqual([]);
  });

  it('is a template of the machine’s model, kept by name, newest in the old one’s place', async () => {
    const { jobId } = await workshop.plannedJob(worked, [nose]);
    const keep = (job: string, name: string, asked: Asked = {}) =>
      workshop.call(postTemplate, { body: { jobId: job, name }, ...asked });
    const unplanned = await workshop.openJob(worked);
    expect((await keep(unplanned, 'Yearly')).status).toBe(409);
    expect((await keep(jobId, '  ')).body.errors[0].pointer).toBe('/name');
    expect((await keep(jobId, 'Yearly', { as: 'customer' })).status).toBe(403);
    expect((await keep(jobId, 'Yearly', { as: 'stranger' })).status).toBe(404);
    const first = await keep(jobId, 'Yearly');
    expect(first.status).toBe(201);
    const { jobId: other } = await workshop.plannedJob(worked, [nose, 'SP-2a:S1']);
    expect((await keep(other, 'yearly')).body.id).toBe(first.body.id);

    const { starts } = await planOf(unplanned);
    expect(starts[0]).toMatchObject({ kind: 'template', name: 'Yearly', choices: { include: [nose, 'SP-2a:S1'] } });
    // Not for another model.
    const others = (await planOf(await workshop.openJob(lathe))).starts;
    expect(others.filter(({ kind }: { kind: string }) => kind === 'template')).toEqual([]);
    const { body } = await workshop.call(getTemplates, { method: 'GET', path: '/api/plan-templates?model=nothing' });
    expect(body.templates).toEqual([]);

    const { id } = first.body;
    expect((await workshop.call(deleteTemplate, { as: 'stranger', method: 'DELETE', params: { id } })).status).toBe(
      404,
    );
    expect((await workshop.call(deleteTemplate, { method: 'DELETE', params: { id } })).status).toBe(204);
    const after = (await planOf(unplanned)).starts;
    expect(after.some(({ kind }: { kind: string }) => kind === 'template')).toBe(false);
  });
});
