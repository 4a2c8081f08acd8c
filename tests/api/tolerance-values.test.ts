import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET as getValues, POST as postValues } from '@/app/api/catalogue/[code]/[test]/values/route';
import { POST as postAgreement } from '@/app/api/catalogue/values/[id]/agreement/route';
import { POST as postImport } from '@/app/api/catalogue/values/import/route';
import { GET as getCsv } from '@/app/api/catalogue/values.csv/route';
import { GET as getPlan, POST as postPlan } from '@/app/api/jobs/[id]/plan/route';
import { PATCH as patchJob } from '@/app/api/jobs/[id]/route';
import { POST as postJob } from '@/app/api/jobs/route';
import { PATCH as changeOrganisation, GET as getOrganisation } from '@/app/api/organisation/route';
import { readCsv } from '@/lib/csv/read-csv';
import { newId } from '@/lib/id';
import type { PlannedSheet } from '@/standards/types';
import { ifMatch } from '@/tests/helpers/call-route';
import { type Asked, type Member, Workshop } from './workshop';

const worked = 'LK32-0O81-B';
const nose = 'SP-1a:S1';
let workshop: Workshop;
beforeAll(async () => {
  workshop = await Workshop.open();
});
afterAll(() => workshop?.close());

const of = (test: string) => ({ params: { code: 'iso-13041-1-2020', test } });
const copy = { ofEdition: '2020, own copy 3', clause: 'p. 14, table 2' };
const say = (test: string, body: object, as: Member = 'administrator', rest: Asked = {}) =>
  workshop.call(postValues, { as, ...of(test), body, ...rest });
const confirm = (test: string, cell: string, rest: object = {}) =>
  say(test, { state: 'confirmed', cells: [{ cell }], ...copy, remark: null, ...rest });
const read = async (test: string, as: Member = 'inspector') =>
  (await workshop.call(getValues, { as, ...of(test) })).body;
const cellOf = async (test: string, cell: string) =>
  (await read(test)).cells.find((one: { cell: string }) => one.cell === cell);
const set = async (change: object) => {
  const { body } = await workshop.call(getOrganisation, { as: 'administrator' });
  const answer = await workshop.call(changeOrganisation, {
    ...{ as: 'administrator', method: 'PATCH', body: change, headers: ifMatch(body.version) },
  });
  expect(answer.status).toBe(200);
};
const proposalsOf = async (jobId: string): Promise<PlannedSheet[]> =>
  (await workshop.call(getPlan, { params: { id: jobId } })).body.proposals;
const toleranceOf = async (key: string) =>
  (await proposalsOf(await workshop.openJob(worked))).find((one) => one.key === key)!.tolerance!;

describe('a value of a tolerance', () => {
  it('is the catalogue’s until somebody has looked it up', async () => {
    const { definition, cells, history } = await read('SP-1a');
    expect(definition).toEqual({ id: 'SP-1a', code: 'ISO 13041-1', edition: '2020', version: 1 });
    expect(cells.map(({ cell, state, holding }: Record<string, unknown>) => [cell, state, holding])).toEqual([
      ['class-1', 'unconfirmed', null],
      ['class-2', 'unconfirmed', null],
      ['class-3', 'unconfirmed', null],
    ]);
    expect(history).toEqual([]);
    expect((await toleranceOf(nose)).confirmation).toBeUndefined();
  });

  it('is confirmed with edition and clause, and goes into the next plan with who and when', async () => {
    const { status, body } = await confirm('SP-1a', 'class-2');
    expect(status).toBe(201);
    expect(body.cells[1]).toMatchObject({
      state: 'confirmed',
      holding: { accountName: workshop.viewer('administrator').name, ...copy, needsSecond: false },
    });
    const tolerance = await toleranceOf(nose);
    expect(tolerance.confirmation).toMatchObject({
      state: 'confirmed',
      by: workshop.viewer('administrator').name,
      on: expect.stringMatching(/^\d{4}-\d\d-\d\d$/),
      edition: copy.ofEdition,
      clause: copy.clause,
      secondBy: null,
    });
    expect(tolerance.provenance.kind).toBe('from-memory');
  });

  it('is replaced by a figure of one’s own, to the digit; a plan that was made keeps what it was made with', async () => {
    const before = await workshop.plannedJob(worked, ['SP-2a:S1']);
    const replaced = {
      state: 'replaced',
      cells: [{ cell: 'class-2', figure: '7.50' }],
      ...copy,
      remark: 'corrected in 2022',
    };
    expect((await say('SP-2a', replaced)).status).toBe(201);
    expect(await cellOf('SP-2a', 'class-2')).toMatchObject({ state: 'replaced', figure: '7.50' });
    expect(await toleranceOf('SP-2a:S1')).toMatchObject({ baseUm: '7.50', confirmation: { state: 'replaced' } });
    const { body } = await workshop.call(getPlan, { params: { id: before.jobId } });
    expect(body.sheets[0].tolerance.baseUm).not.toBe('7.50');
    expect(body.sheets[0].tolerance.confirmation).toBeUndefined();
  });

  it('is withdrawn again, and its history stays', async () => {
    await confirm('SP-2b', 'class-2');
    await say('SP-2b', { state: 'replaced', cells: [{ cell: 'class-2', figure: '9' }], ...copy, remark: null });
    const { status, body } = await say('SP-2b', {
      state: 'withdrawn',
      cells: [{ cell: 'class-2' }],
      remark: 'wrong page',
    });
    expect(status).toBe(201);
    expect(body.cells[1]).toMatchObject({ state: 'unconfirmed', holding: null, waiting: null });
    expect(body.cells[1].figure).toBe(body.cells[1].toleranceUm);
    expect(body.history.map(({ state, figure }: Record<string, unknown>) => [state, figure])).toEqual([
      ['withdrawn', null],
      ['replaced', '9'],
      ['confirmed', body.cells[1].toleranceUm],
    ]);
    const again = await say('SP-2b', { state: 'withdrawn', cells: [{ cell: 'class-2' }], remark: null });
    expect([again.status, again.body.errors[0].pointer]).toEqual([422, '/cells/0/cell']);
  });

  it('is refused without its place, with another figure than a decimal above 0, or for no figure of the test', async () => {
    for (const [body, pointer] of [
      [{ state: 'confirmed', cells: [{ cell: 'class-1' }], ofEdition: '2020', clause: ' ' }, '/clause'],
      [{ state: 'confirmed', cells: [{ cell: 'class-1' }], ofEdition: '', clause: 'p. 3' }, '/ofEdition'],
      [{ state: 'confirmed', cells: [], ...copy }, '/cells'],
      [{ state: 'confirmed', cells: [{ cell: 'class-1', figure: '8' }], ...copy }, '/cells/0'],
      [{ state: 'replaced', cells: [{ cell: 'class-1', figure: '0,5' }], ...copy }, '/cells/0/figure'],
      [{ state: 'replaced', cells: [{ cell: 'class-1', figure: '0.0' }], ...copy }, '/cells/0/figure'],
      [{ state: 'replaced', cells: [{ cell: 'class-1', figure: 8 }], ...copy }, '/cells/0/figure'],
      [{ state: 'confirmed', cells: [{ cell: 'class-9' }], ...copy }, '/cells/0/cell'],
      [{ state: 'confirmed', cells: [{ cell: 'class-1' }, { cell: 'class-1' }], ...copy }, '/cells/1/cell'],
      [{ state: 'believed', cells: [{ cell: 'class-1' }], ...copy }, '/state'],
    ] as const) {
      const answer = await say('SP-1a', body);
      expect([answer.status, answer.body.errors?.[0]?.pointer], JSON.stringify(body)).toEqual([422, pointer]);
    }
    expect((await confirm('XX-1', 'class-1')).status).toBe(404);
    expect(await cellOf('SP-1a', 'class-1')).toMatchObject({ state: 'unconfirmed' });
  });

  it('is the quality manager’s to say, everybody’s to read, and nobody else’s company’s', async () => {
    const body = { state: 'confirmed', cells: [{ cell: 'class-1' }], ...copy, remark: null };
    for (const as of ['inspector', 'reviewer', 'customer'] as const)
      expect((await say('SP-1a', body, as)).status).toBe(403);
    for (const as of ['inspector', 'reviewer', 'customer', 'administrator'] as const)
      expect((await read('SP-1a', as)).cells[1].state).toBe('confirmed');
    const theirs = await read('SP-1a', 'stranger');
    expect([theirs.cells[1].state, theirs.history]).toEqual(['unconfirmed', []]);
    const { history } = await read('SP-1a');
    expect(
      (await workshop.call(postAgreement, { as: 'stranger', method: 'POST', params: { id: history[0].id } })).status,
    ).toBe(404);
  });

  it('does not change once it is written', async () => {
    const { history } = await read('SP-1a');
    const change = (columns: object) =>
      workshop.as('administrator', (trx) => trx('tolerance_values').where({ id: history[0].id }).update(columns));
    await expect(change({ figure: '99' })).rejects.toMatchObject({ code: '42501' });
    await expect(
      workshop.as('administrator', (trx) => trx('tolerance_values').where({ id: history[0].id }).delete()),
    ).rejects.toMatchObject({ code: '42501' });
    // Nobody was to agree to it: agreeing afterwards is refused by the table itself.
    const someone = { second_account_id: newId(), second_account_name: 'A. Body', second_at: new Date() };
    await expect(change(someone)).rejects.toMatchObject({ code: '23514' });
    await expect(
      workshop.owner('tolerance_values').where({ id: history[0].id }).update({ clause: 'p. 1' }),
    ).rejects.toBeDefined();
  });
});

describe('with two people', () => {
  const agree = (id: string, as: Member) => workshop.call(postAgreement, { as, method: 'POST', params: { id } });

  it('a value waits, and holds when a second one has looked it up', async () => {
    await set({ fourEyes: true });
    const first = await confirm('AX-1a', (await read('AX-1a')).cells[0].cell);
    const [cell] = first.body.cells;
    expect(cell).toMatchObject({
      state: 'waiting',
      holding: null,
      waiting: { needsSecond: true, secondAccountName: null },
    });
    expect((await toleranceOf('AX-1a:Z1:S1')).confirmation).toBeUndefined();

    const { id } = cell.waiting;
    expect((await agree(id, 'inspector')).status).toBe(403);
    expect((await agree(id, 'customer')).status).toBe(403);
    const own = await agree(id, 'administrator');
    expect([own.status, own.body.detail]).toEqual([403, expect.stringMatching(/yourself/)]);
    const both = await Promise.all([agree(id, 'reviewer'), agree(id, 'reviewer')]);
    expect(both.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect(await cellOf('AX-1a', cell.cell)).toMatchObject({
      state: 'confirmed',
      waiting: null,
      holding: { secondAccountName: workshop.viewer('reviewer').name },
    });
    const { confirmation } = await toleranceOf('AX-1a:Z1:S1');
    expect(confirmation).toMatchObject({ secondBy: workshop.viewer('reviewer').name });
  });

  it('a value that held goes on holding while its successor waits, and an overtaken one cannot be agreed to', async () => {
    const { cell } = (await read('AX-1a')).cells[0];
    const replaced = (figure: string) =>
      say('AX-1a', { state: 'replaced', cells: [{ cell, figure }], ...copy, remark: null });
    const overtaken = (await replaced('11')).body.cells[0].waiting.id;
    const { body } = await replaced('12');
    expect(body.cells[0]).toMatchObject({ state: 'confirmed', waiting: { figure: '12' } });
    expect((await agree(overtaken, 'reviewer')).status).toBe(409);
    expect((await agree(body.cells[0].waiting.id, 'reviewer')).status).toBe(201);
    expect(await cellOf('AX-1a', cell)).toMatchObject({ state: 'replaced', figure: '12', waiting: null });
    const withdrawn = await say('AX-1a', { state: 'withdrawn', cells: [{ cell }], remark: null });
    expect(withdrawn.body.cells[0]).toMatchObject({ state: 'unconfirmed', holding: null });
    expect((await agree(withdrawn.body.history[0].id, 'reviewer')).status).toBe(409);
  });

  it('what was confirmed by one person before keeps holding', async () => {
    expect(await cellOf('SP-1a', 'class-2')).toMatchObject({ state: 'confirmed' });
    await set({ fourEyes: false });
  });
});

describe('a job that takes confirmed tolerances only', () => {
  const job = async (refuseUnconfirmed?: boolean) => {
    const { id, customerId } = workshop.machines.get(worked)!;
    const { status, body } = await workshop.call(postJob, {
      body: {
        ...{
          machineId: id,
          customerId,
          reference: `QMF-${newId().slice(-8)}`,
          purpose: 'periodic',
          startsOn: '2026-03-10',
        },
        ...(refuseUnconfirmed === undefined ? {} : { refuseUnconfirmed }),
      },
    });
    expect(status).toBe(201);
    return body.id as string;
  };
  const plan = async (jobId: string, include: string[], rest: object = {}) => {
    const exclusions = (await proposalsOf(jobId))
      .filter(({ key }) => !include.includes(key))
      .map(({ key }) => ({ key, reason: 'not-agreed', text: null }));
    return workshop.call(postPlan, { params: { id: jobId }, body: { include, exclusions, ...rest } });
  };

  it('refuses each test that is not confirmed, by name, and makes no plan', async () => {
    const jobId = await job(true);
    const { status, body } = await plan(jobId, [nose, 'AX-1b:Z1:S1', 'PO-B:X1']);
    expect(status).toBe(422);
    expect(body.errors).toEqual([{ pointer: '/include/1', detail: expect.stringMatching(/not confirmed/) }]);
    const title = (await proposalsOf(jobId)).find(({ key }) => key === 'AX-1b:Z1:S1')!.title;
    expect(body.errors[0].detail).toContain(title);
  });

  it('takes it with the contract’s tolerance, without the test, or after it was confirmed', async () => {
    const contractTolerances = [{ key: 'AX-1b:Z1:S1', toleranceUm: '9', source: 'order 7714, item 2' }];
    expect((await plan(await job(true), [nose, 'AX-1b:Z1:S1'], { contractTolerances })).status).toBe(201);
    expect((await plan(await job(true), [nose])).status).toBe(201);
    for (const { cell } of (await read('AX-1b')).cells) expect((await confirm('AX-1b', cell)).status).toBe(201);
    expect((await plan(await job(true), [nose, 'AX-1b:Z1:S1'])).status).toBe(201);
  });

  it('can become one, or stop being one, until its plan is made', async () => {
    const jobId = await job(false);
    const change = (version: number, refuseUnconfirmed: boolean, as: Member = 'inspector') =>
      workshop.call(patchJob, {
        as,
        method: 'PATCH',
        params: { id: jobId },
        headers: ifMatch(version),
        body: { refuseUnconfirmed },
      });
    const unconfirmed = (await proposalsOf(jobId)).find(({ key }) => key.startsWith('SS-1'))!.key;
    expect((await change(1, true, 'customer')).status).toBe(403);
    expect((await change(1, true)).body).toEqual({ version: 2 });
    expect((await change(1, false)).status).toBe(412);
    expect((await plan(jobId, [unconfirmed])).status).toBe(422);
    expect((await change(2, false)).status).toBe(200);
    expect((await plan(jobId, [unconfirmed])).status).toBe(201);
    expect((await change(4, true)).status).toBe(409);
    const kept = await workshop.as('inspector', (trx) => trx('jobs').where({ id: jobId }).first('refuse_unconfirmed'));
    expect(kept).toEqual({ refuse_unconfirmed: false });
  });

  it('is what the organisation wants of a new job, unless the job says otherwise', async () => {
    await set({ refuseUnconfirmed: true });
    const refused = 'AX-2:X1:S1';
    const keys = (await proposalsOf(await job())).map(({ key }) => key);
    const unconfirmed = keys.includes(refused) ? refused : keys.find((key) => key.startsWith('SS-'))!;
    expect((await plan(await job(), [unconfirmed])).status).toBe(422);
    expect((await plan(await job(false), [unconfirmed])).status).toBe(201);
    await set({ refuseUnconfirmed: false });
    expect((await plan(await job(), [unconfirmed])).status).toBe(201);
  });
});

describe('the table of values', () => {
  const csv = async (as: Member = 'administrator'): Promise<string> => (await workshop.call(getCsv, { as })).body;
  const take = (text: string, preview: boolean, as: Member = 'administrator') =>
    workshop.call(postImport, { as, body: { csv: text, preview } });
  const head =
    'code,edition,test,version,title,cell,figure,unit,state,confirmedBy,confirmedOn,ofEdition,clause,secondBy,remark';
  const line = (change: Record<string, string> = {}) => {
    const row: Record<string, string> = {
      ...{
        code: 'ISO 13041-1',
        edition: '2020',
        test: 'SP-1a',
        version: '1',
        title: '',
        cell: 'class-1',
        figure: '6.25',
      },
      ...{ unit: 'µm', state: 'replaced', confirmedBy: '', confirmedOn: '', ofEdition: '2020', clause: 'p. 9' },
      ...{ secondBy: '', remark: '' },
      ...change,
    };
    return head
      .split(',')
      .map((column) => row[column])
      .join(',');
  };
  const file = (...lines: string[]) => [head, ...lines].join('\r\n');

  it('goes out with every figure of the catalogue, and comes in again without a change', async () => {
    await say('SP-1a', {
      ...{
        state: 'replaced',
        cells: [{ cell: 'class-3', figure: '10.0' }],
        ofEdition: '=2020',
        clause: 'p. 14, "table" 2',
      },
      remark: '-see also\np. 15',
    });
    const answer = await workshop.call(getCsv, { as: 'inspector' });
    expect(answer.headers.get('content-type')).toContain('text/csv');
    expect(answer.body.split('\r\n')[0]).toBe(head);
    const rows = readCsv(answer.body).map(({ cells }) => cells);
    const exported = rows.find(
      ([code, , test, , , cell]) => code === 'ISO 13041-1' && test === 'SP-1a' && cell === 'class-3',
    )!;
    // A figure goes out as it is; what a spreadsheet would calculate is guarded.
    expect(exported.slice(6)).toEqual([
      ...['10.0', 'µm', 'replaced', workshop.viewer('administrator').name, expect.stringMatching(/^\d{4}-/)],
      ...["'=2020", 'p. 14, "table" 2', '', "'-see also\np. 15"],
    ]);
    for (const preview of [true, false]) {
      const { status, body } = await take(answer.body, preview);
      expect([status, body.problems, body.changes]).toEqual([200, [], []]);
      expect(body.unchanged).toBe(rows.length - 1);
    }
    expect(await csv()).toBe(answer.body);
  });

  it('says what would change and changes nothing, then takes it over as the importing person’s word', async () => {
    const text = file(
      line({ confirmedBy: 'Somebody Else', confirmedOn: '2001-01-01', secondBy: 'Another' }),
      line({ cell: 'class-2' }),
    );
    const preview = await take(text, true);
    expect(preview.body).toMatchObject({ preview: true, lines: 2, unchanged: 0, problems: [] });
    expect(
      preview.body.changes.map(({ line: at, figure, state }: Record<string, unknown>) => [at, figure, state]),
    ).toEqual([
      [2, '6.25', 'replaced'],
      [3, '6.25', 'replaced'],
    ]);
    expect(await cellOf('SP-1a', 'class-1')).toMatchObject({ state: 'unconfirmed' });
    expect((await take(text, false)).status).toBe(200);
    expect(await cellOf('SP-1a', 'class-1')).toMatchObject({
      ...{ state: 'replaced', figure: '6.25' },
      holding: { accountName: workshop.viewer('administrator').name, secondAccountName: null },
    });
    expect((await take(text, false)).body).toMatchObject({ unchanged: 2, changes: [] });
  });

  it('waits for the second person where the organisation wants two', async () => {
    await set({ fourEyes: true });
    expect((await take(file(line({ figure: '6.5' })), false)).status).toBe(200);
    expect(await cellOf('SP-1a', 'class-1')).toMatchObject({
      state: 'replaced',
      figure: '6.25',
      waiting: { figure: '6.5' },
    });
    // What waits goes out as it waits, and comes back without a change.
    expect((await take(await csv(), false)).body).toMatchObject({ changes: [], problems: [] });
    await set({ fourEyes: false });
  });

  it('names every problem by line and column, and takes over nothing of a file that has one', async () => {
    const problems = async (text: string) =>
      (await take(text, true)).body.problems.map(({ line: at, column }: Record<string, unknown>) => [at, column]);
    expect(
      await problems(
        file(
          line({ code: 'ISO 0', cell: 'class-2' }),
          line({ edition: '1887' }),
          line({ test: 'SP-99' }),
          line({ version: '7' }),
          line({ cell: 'class-7' }),
          line({ cell: 'class-2', figure: '"6,25"' }),
          line({ cell: 'class-2' }),
          line({ cell: 'class-3', unit: 'mm', clause: '', ofEdition: '' }),
          line({ test: 'SP-2a', state: 'seen' }),
          line({ test: 'SP-2b', state: 'confirmed' }),
          line({ test: 'AX-5' }).split(',').slice(1).join(','),
          line({ test: 'SP-2a', cell: 'class-2', state: 'unconfirmed' }),
        ),
      ),
    ).toEqual([
      [2, 'code'],
      [3, 'edition'],
      [4, 'test'],
      [5, 'version'],
      [6, 'cell'],
      [7, 'figure'],
      [8, 'cell'],
      [9, 'unit'],
      [9, 'ofEdition'],
      [9, 'clause'],
      [10, 'state'],
      [11, 'figure'],
      [12, ''],
      [13, 'state'],
    ]);
    expect(await problems('code;edition;test\r\n')).toEqual([[1, '']]);
    expect(await problems(file('"not closed'))).toEqual([[2, '']]);
    expect(await problems(head.replace(',clause', ''))).toEqual([[1, '']]);
    expect(await problems(`${head},colour`)).toEqual([[1, '']]);
    const before = await read('SP-1a');
    const refused = await take(file(line({ cell: 'class-1', figure: '1.5' }), line({ cell: 'class-9' })), false);
    expect([refused.status, refused.body.errors]).toEqual([
      422,
      [{ pointer: '/csv', detail: expect.stringMatching(/^Line 3, cell: /) }],
    ]);
    expect(await read('SP-1a')).toEqual(before);
  });

  it('is read by everybody of the organisation and taken over by the quality manager only', async () => {
    expect(await csv('stranger')).not.toContain('6.25');
    for (const as of ['inspector', 'reviewer', 'customer'] as const) {
      expect((await workshop.call(getCsv, { as })).status).toBe(200);
      expect((await take(file(line()), true, as)).status).toBe(403);
    }
  });
});
