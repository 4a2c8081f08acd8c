import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET as getCheck } from '@/app/api/jobs/[id]/check/route';
import { POST as handIn } from '@/app/api/jobs/[id]/hand-in/route';
import { POST as reopen } from '@/app/api/jobs/[id]/reopen/route';
import { GET as listReports } from '@/app/api/jobs/[id]/reports/route';
import { GET as getData } from '@/app/api/reports/[id]/data/route';
import { GET as getPdf } from '@/app/api/reports/[id]/pdf/route';
import { GET as getReport } from '@/app/api/reports/[id]/route';
import { POST as takeOperations } from '@/app/api/sheets/[id]/operations/route';
import { POST as beginPass } from '@/app/api/sheets/[id]/passes/route';
import { PATCH as patchSheet } from '@/app/api/sheets/[id]/route';
import { findReport, listSignatures } from '@/db/queries/reports';
import { jobBoard } from '@/db/read-models/job-board';
import { newId } from '@/lib/id';
import { sheetState } from '@/lib/reporting/sheet-state';
import { formatDecimal } from '@/lib/units/format';
import { renderReportPdf } from '@/templates/report/render';
import { ifMatch } from '@/tests/helpers/call-route';
import { flat, pdfText } from '@/tests/helpers/pdf-text';
import { answer, ashdowns, indicator, issue, issuedReport, measuredJob, millbrooks, sign } from './measured-job';
import { Workshop } from './workshop';

const within = { 'SP-1a:S1': 0.4, 'SP-2a:S1': 0.4 };
const oneOut = { 'SP-1a:S1': 0.4, 'SP-2a:S1': 1.6 };

let workshop: Workshop;
beforeAll(async () => {
  workshop = await Workshop.open([indicator]);
});
afterAll(() => workshop?.close());

const reportOf = (reportId: string) => workshop.as('inspector', (trx) => findReport(trx, reportId));
const answersTo = (reportId: string) =>
  workshop.as('inspector', async (trx) =>
    (await listSignatures(trx, reportId)).filter(({ role }) => role === 'customer'),
  );
const reportsOf = async (jobId: string) => (await workshop.call(listReports, { params: { id: jobId } })).body.items;

describe('the check', () => {
  it('finds what is missing, in working order, and what has to be confirmed', async () => {
    const { jobId } = await measuredJob(
      workshop,
      ashdowns,
      { 'SP-1a:S1': 0.4, 'SP-2a:S1': 1.6, 'SP-2b:S1': null },
      { onlyFound: true, described: false },
    );
    const { body } = await workshop.call(getCheck, { params: { id: jobId } });
    const found = body.findings.map(({ position, kind, weight }: Record<string, unknown>) => [position, kind, weight]);
    expect(found).toEqual([
      [1, 'no-as-left', 'blocks'],
      [2, 'no-as-left', 'blocks'],
      [2, 'out-of-tolerance', 'confirm'],
      [3, 'not-measured', 'blocks'],
      [null, 'no-temperature', 'confirm'],
      [null, 'no-conditions', 'confirm'],
      [null, 'tolerance-unconfirmed', 'note'],
    ]);
  });

  it('hands a job in once, and only with a plan', async () => {
    const unplanned = await workshop.openJob(ashdowns);
    expect((await workshop.call(handIn, { method: 'POST', params: { id: unplanned } })).status).toBe(409);
    const { jobId } = await measuredJob(workshop, ashdowns, within);
    const hand = () => workshop.call(handIn, { method: 'POST', params: { id: jobId } });
    expect((await hand()).body).toEqual({ state: 'in-check' });
    expect((await hand()).status).toBe(409);
  });

  it('takes the annex of calculations in only on demand, and freezes it', async () => {
    const made = async (annex: boolean | undefined) => {
      const { jobId } = await measuredJob(workshop, ashdowns, {
        ...{ 'SP-1a:S1': 0.4, 'AX-1a:Z1:S1': 0.4, 'PO-A:Z1': 0.4, 'CI-1:T1:X1:Z1': 0.4, 'LV-3': 0.4 },
      });
      const body = annex === undefined ? { confirmed: true } : { confirmed: true, annex };
      const { body: issued } = await issue(workshop, jobId, true, { body });
      return (await reportOf(issued.id))!.model;
    };
    expect((await made(undefined)).annex).toBeUndefined();
    expect((await made(false)).annex).toBeUndefined();
    const model = await made(true);
    expect(model.annex!.map(({ sheetOrder }) => sheetOrder)).toEqual([1, 2, 3, 4, 5]);
    const mandrel = model.annex!.find(({ title }) => title.startsWith('Z1 motion parallel'))!;
    const steps = mandrel.explanation.steps.map(({ withNumbers, value }) => `${withNumbers} = ${value}`);
    const pdf = flat((await pdfText(await renderReportPdf(model))).text);
    expect(pdf).toContain('Annex: how each figure came about');
    expect(pdf.replace(/ /g, '')).toContain(flat(steps[0]!.split(' = ')[0]!).replace(/ /g, ''));
    const { text } = await pdfText(await renderReportPdf({ ...model, annex: undefined }));
    expect(text).not.toContain('Annex: how each');
  });

  it('prints as done only what somebody did', async () => {
    const blocks = async (jobId: string, number: number) => {
      const { body } = await issue(workshop, jobId, true);
      expect(body.revision).toBe(number);
      const report = await workshop.as('inspector', (trx) => findReport(trx, body.id));
      return Object.fromEntries(report!.model.signatures.map((block) => [block.role, block]));
    };
    const { jobId } = await measuredJob(workshop, ashdowns, within);
    // Issued without having been handed in: nobody's act is made up.
    const without = await blocks(jobId, 1);
    expect(without.inspector).toMatchObject({ signedAt: null, outcome: null, typed: null, strokes: null });
    expect(without.reviewer).toMatchObject({ name: 'J. Penhale', outcome: 'checked and issued', typed: 'J. Penhale' });
    expect(without.customer).toMatchObject({ name: '', signedAt: null, outcome: null, typed: null });

    const reopened = { as: 'reviewer' as const, params: { id: jobId }, body: { reason: 'Order number was wrong.' } };
    expect((await workshop.call(reopen, reopened)).status).toBe(200);
    await workshop.call(handIn, { method: 'POST', params: { id: jobId } });
    const handed = await blocks(jobId, 2);
    expect(handed.inspector).toMatchObject({
      name: 'T. Orrell',
      outcome: 'handed in for the check, signed in',
      typed: null,
    });
    expect(handed.inspector!.signedAt).toMatch(/^\d{4}-\d{2}-\d{2} \d{2}:\d{2}/);

    // A hand-in before the job was opened again says nothing about what was measured after it.
    await workshop.call(reopen, reopened);
    expect((await blocks(jobId, 3)).inspector).toMatchObject({ signedAt: null, outcome: null });
  });
});

describe('issuing', () => {
  it('is refused while something is missing, naming each test, and leaves nothing behind', async () => {
    const { jobId } = await measuredJob(workshop, ashdowns, { 'SP-1a:S1': 0.4, 'SP-2a:S1': null });
    const { status, body } = await issue(workshop, jobId, true);
    expect(status).toBe(422);
    expect(body.errors).toEqual([
      { pointer: '', detail: 'Test 2: Not measured. Measure it, or leave it out with a reason.' },
    ]);
    expect(await reportsOf(jobId)).toEqual([]);
  });

  it('wants what is to be confirmed to be confirmed', async () => {
    const { jobId } = await measuredJob(workshop, ashdowns, oneOut);
    const refused = await issue(workshop, jobId, false);
    expect(refused.status).toBe(422);
    expect(refused.body.errors).toHaveLength(1);
    expect(refused.body.errors[0].pointer).toBe('/confirmed');
    expect(refused.body.errors[0].detail).toMatch(/^Test 2: Out of tolerance: \d\.\d+ mm\.$/);
    expect((await issue(workshop, jobId, true)).status).toBe(201);
  });

  it('is the reviewer’s alone', async () => {
    const { jobId } = await measuredJob(workshop, ashdowns, within);
    for (const as of ['inspector', 'administrator', 'customer'] as const)
      expect((await issue(workshop, jobId, true, { as })).status, as).toBe(403);
    expect((await issue(workshop, jobId, true, { as: 'stranger' })).status).toBe(404);
    expect(await reportsOf(jobId)).toEqual([]);
  });

  it('happens once: a repeated press is answered the same, another one refused', async () => {
    const { jobId } = await measuredJob(workshop, ashdowns, within);
    const key = { headers: { 'idempotency-key': newId() } };
    const answers = await Promise.all([1, 2, 3].map(() => issue(workshop, jobId, true, key)));
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201]);
    expect(new Set(answers.map(({ body }) => body.id)).size).toBe(1);
    expect((await issue(workshop, jobId, true)).status).toBe(409);
    expect(await reportsOf(jobId)).toHaveLength(1);
  });

  it('numbers without a gap, however many go out at the same time', async () => {
    const jobs = await Promise.all([1, 2, 3].map(() => measuredJob(workshop, ashdowns, within)));
    const answers = await Promise.all(jobs.map(({ jobId }) => issue(workshop, jobId, true)));
    const numbers = answers.map(({ body }) => body.number).sort();
    expect(numbers.every((number) => /^QMF-\d{4}-\d{6}$/.test(number))).toBe(true);
    const last = numbers.map((number) => Number(number.slice(-6)));
    expect(last.map((number) => number - (last[0] ?? 0))).toEqual([0, 1, 2]);
  });

  it('prints the stored results', async () => {
    const { jobId, reportId } = await issuedReport(workshop, ashdowns, { ...oneOut, 'AX-1a:Z1:S1': 0.5 });
    const report = (await reportOf(reportId))!;
    const board = (await workshop.as('inspector', (trx) => jobBoard(trx, jobId)))!;
    expect(report.model.summary).toHaveLength(3);
    for (const [index, sheet] of board.sheets.entries()) {
      const { asFound, asLeft } = sheetState(sheet);
      const row = report.model.summary[index]!;
      expect(row.asFound).toBe(formatDecimal(asFound!.result!.displayedMm));
      expect(row.asLeft).toBe(formatDecimal(asLeft!.result!.displayedMm));
      expect(row.asLeftVerdict).toBe(asLeft!.result!.verdict);
      const printed = report.model.blocks[index]!.passes;
      expect(printed).toHaveLength(sheet.passes.length);
      for (const [at, pass] of sheet.passes.entries()) {
        expect(printed[at]!.resultMm).toBe(formatDecimal(pass.result!.displayedMm));
        expect(printed[at]!.judgement).toEqual(pass.result!.outcome.judgement);
      }
    }
    expect(report.model.counts.asLeft).toMatchObject({ planned: 3, judged: 3, within: 2, out: 1 });
    expect(report.model.headline).toBe('2 of 3 judged tests within tolerance; 1 out of tolerance.');
  });
});

describe('an issued report', () => {
  let out: Awaited<ReturnType<typeof issuedReport>>;
  beforeAll(async () => {
    out = await issuedReport(workshop, ashdowns, within);
  });

  it('cannot be changed or deleted by the application’s own role', async () => {
    const change = (statement: string) => workshop.as('reviewer', (trx) => trx.raw(statement, [out.reportId]));
    await expect(change(`update reports set model = '{}' where id = ?`)).rejects.toThrow('does not change');
    await expect(change(`update reports set number = 'X-1' where id = ?`)).rejects.toThrow('does not change');
    await expect(change(`update reports set issued_at = now() where id = ?`)).rejects.toThrow('does not change');
    await expect(change('delete from reports where id = ?')).rejects.toThrow('permission denied');
    await expect(change(`update signatures set name = 'X' where report_id = ?`)).rejects.toThrow('permission denied');
    await expect(change('delete from signatures where report_id = ?')).rejects.toThrow('permission denied');
  });

  it('is told by the hash of its data, to the letter', async () => {
    const report = (await reportOf(out.reportId))!;
    const { body, headers } = await workshop.call(getData, { as: 'customer', params: { id: out.reportId } });
    const { rows } = await workshop.as('inspector', (trx) =>
      trx.raw('select model::text as text from reports where id = ?', [out.reportId]),
    );
    expect(createHash('sha256').update(rows[0].text).digest('hex')).toBe(report.modelSha256);
    expect(headers.get('x-content-sha256')).toBe(report.modelSha256);
    expect(body).toEqual(report.model);
  });

  it('closes the sheets of its job', async () => {
    const { sheetId, passId } = out.sheets.get('SP-1a:S1')!;
    const operation = {
      ...{ opId: newId(), passId, cellId: '/readings/0', baseVersion: 1, text: '7', unit: 'µm', source: 'typed' },
      ...{ deviceTime: '2026-03-11T09:00:00Z', seq: 0 },
    };
    const before = await workshop.as('inspector', (trx) => trx('readings').where({ pass_id: passId }).select('*'));
    const taken = await workshop.call(takeOperations, { params: { id: sheetId }, body: { operations: [operation] } });
    expect(taken.body.results).toMatchObject([{ opId: operation.opId, outcome: 'rejected' }]);
    expect(taken.body.results[0].problem).toMatch(/has been issued/);
    const again = await workshop.call(beginPass, { params: { id: sheetId }, body: { kind: 'as-left' } });
    expect(again.status).toBe(409);
    const sheet = await workshop.as('inspector', (trx) => trx('sheets').where({ id: sheetId }).first('version'));
    const leftOut = await workshop.call(patchSheet, {
      method: 'PATCH',
      params: { id: sheetId },
      headers: ifMatch(sheet.version),
      body: { leftOut: { reason: 'not-agreed', text: null } },
    });
    expect(leftOut.status).toBe(409);
    expect(await workshop.as('inspector', (trx) => trx('readings').where({ pass_id: passId }).select('*'))).toEqual(
      before,
    );
  });

  it('is read by its customer, and by nobody of another customer or organisation', async () => {
    const other = await issuedReport(workshop, millbrooks, within);
    const asks = [getReport, getData, getPdf];
    for (const ask of asks) {
      const mine = await workshop.call(ask, { as: 'customer', params: { id: out.reportId } });
      expect(mine.status).toBe(ask === getPdf ? 503 : 200);
      expect((await workshop.call(ask, { as: 'customer', params: { id: other.reportId } })).status).toBe(404);
      expect((await workshop.call(ask, { as: 'stranger', params: { id: out.reportId } })).status).toBe(404);
      expect((await workshop.call(ask, { as: null, params: { id: out.reportId } })).status).toBe(401);
    }
    for (const [as, reportId] of [
      ['customer', other.reportId],
      ['stranger', other.reportId],
      ['stranger', out.reportId],
    ] as const)
      expect((await sign(workshop, reportId, answer('accept'), { as })).status, `${as} signs`).toBe(404);
    expect(await answersTo(other.reportId)).toEqual([]);
    expect((await workshop.call(getCheck, { as: 'customer', params: { id: out.jobId } })).status).toBe(403);
  });
});
