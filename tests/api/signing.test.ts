import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { POST as reopen } from '@/app/api/jobs/[id]/reopen/route';
import { GET as listReports } from '@/app/api/jobs/[id]/reports/route';
import { GET as getReport } from '@/app/api/reports/[id]/route';
import { POST as beginPass } from '@/app/api/sheets/[id]/passes/route';
import { findReport, listSignatures } from '@/db/queries/reports';
import { newId } from '@/lib/id';
import { intentTexts, type Outcome } from '@/lib/schemas/signature';
import { signedModel } from '@/lib/services/signed-model';
import { answer, ashdowns, indicator, issue, issuedReport, sign } from './measured-job';
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

describe('the answer', () => {
  it('is one, whoever else signs in the same moment', async () => {
    const { reportId } = await issuedReport(workshop, ashdowns, within);
    const outcomes: Outcome[] = ['accept', 'accept-with-remarks', 'refuse'];
    const answers = await Promise.all(
      Array.from({ length: 20 }, (_, index) =>
        sign(workshop, reportId, answer(outcomes[index % 3]!), { as: index % 2 ? 'customer' : 'inspector' }),
      ),
    );
    const won = answers.filter(({ status }) => status === 201);
    expect(won).toHaveLength(1);
    const lost = answers.filter(({ status }) => status === 409);
    expect(lost).toHaveLength(19);
    expect(new Set(lost.map(({ body }) => body.report))).toEqual(new Set([`/reports/${reportId}`]));
    const [kept, ...more] = await answersTo(reportId);
    expect(more).toEqual([]);
    const states = { accept: 'signed', 'accept-with-remarks': 'signed-with-remarks', refuse: 'refused' } as const;
    expect((await reportOf(reportId))!.state).toBe(states[kept!.outcome as Outcome]);
    expect(won[0]!.body.state).toBe(states[kept!.outcome as Outcome]);
    const remarks = await workshop.as('inspector', (trx) => trx('remarks').where({ report_id: reportId }));
    expect(remarks).toHaveLength(kept!.outcome === 'accept-with-remarks' ? 1 : 0);
  });

  it('is answered the same when it is sent again with its key', async () => {
    const { reportId } = await issuedReport(workshop, ashdowns, within);
    const key = { headers: { 'idempotency-key': newId() } };
    const first = await sign(workshop, reportId, answer('accept'), key);
    const second = await sign(workshop, reportId, answer('accept'), key);
    expect([first.status, second.status]).toEqual([201, 201]);
    expect(second.body).toEqual(first.body);
    expect((await sign(workshop, reportId, answer('refuse'), key)).status).toBe(422);
    expect(await answersTo(reportId)).toHaveLength(1);
  });

  it.each([
    ['a refusal without a reason', answer('refuse', { reason: ' ' }), '/reason'],
    ['remarks without a remark', answer('accept-with-remarks', { remarks: [] }), '/remarks'],
    ['an empty remark', answer('accept-with-remarks', { remarks: [{ text: '  ' }] }), '/remarks/0/text'],
    ['remarks with a plain acceptance', answer('accept', { remarks: [{ text: 'but' }] }), '/remarks'],
    ['neither drawn nor typed', answer('accept', { typed: '', strokes: [] }), '/typed'],
    ['strokes that are none', answer('accept', { strokes: ['<script>'] }), '/strokes/0'],
    ['a sentence not confirmed', answer('accept', { intentConfirmed: false }), '/intentConfirmed'],
    ['another sentence', answer('accept', { intentText: intentTexts.refuse }), '/intentText'],
    ['nobody’s name', answer('accept', { name: '' }), '/name'],
    ['no answer', answer('accept', { outcome: 'perhaps' }), '/outcome'],
  ])('is refused with %s, at its field', async (_what, body, pointer) => {
    const { reportId } = await waiting();
    const refused = await sign(workshop, reportId, body);
    expect(refused.status).toBe(422);
    expect(refused.body.errors.map((error: { pointer: string }) => error.pointer)).toContain(pointer);
    expect(await answersTo(reportId)).toEqual([]);
    expect((await reportOf(reportId))!.state).toBe('issued');
  });

  let shared: ReturnType<typeof issuedReport> | undefined;
  const waiting = () => {
    shared ??= issuedReport(workshop, ashdowns, within);
    return shared;
  };

  it('of a customer signed in is kept with what it was given for', async () => {
    const { reportId } = await waiting();
    const asked = { headers: { 'user-agent': 'a browser', 'x-forwarded-for': '192.0.2.7' } };
    expect((await sign(workshop, reportId, answer('accept'), asked)).status).toBe(201);
    const [kept] = await answersTo(reportId);
    expect(kept).toMatchObject({
      ...{ outcome: 'accept', name: 'C. Vale', company: 'Ashdown Turned Parts', place: 'bay 3', typed: 'C. Vale' },
      ...{ method: 'signed-in', witness: null, ip: '192.0.2.7', userAgent: 'a browser' },
      ...{ deviceTimeZone: 'Europe/Berlin', intentText: intentTexts.accept },
      modelSha256: (await reportOf(reportId))!.modelSha256,
    });
    const { body } = await workshop.call(getReport, { as: 'customer', params: { id: reportId } });
    expect(body.state).toBe('signed');
    expect(JSON.stringify(body.signatures)).not.toContain('192.0.2.7');
  });

  it('on the tablet names the inspector as witness, with drawn strokes', async () => {
    const { reportId } = await issuedReport(workshop, ashdowns, within);
    const strokes = ['M100 100L140.5 60L180 120', 'M300 80L300 80'];
    const drawn = answer('accept', { typed: null, strokes });
    expect((await sign(workshop, reportId, drawn, { as: 'administrator' })).status).toBe(403);
    expect((await sign(workshop, reportId, drawn, { as: 'inspector' })).status).toBe(201);
    const [kept] = await answersTo(reportId);
    expect(kept).toMatchObject({
      ...{ method: 'on-tablet', witness: 'T. Orrell', typed: null, strokes },
      ...{ ip: 'not recorded', userAgent: 'not recorded' },
    });
    const model = await workshop.as('inspector', async (trx) => signedModel(trx, (await findReport(trx, reportId))!));
    const block = model.signatures.find(({ role }) => role === 'customer')!;
    expect(block.outcome).toBe('accepted (on the inspector’s tablet, witnessed by T. Orrell)');
    expect(block.strokes).toEqual(strokes);
  });

  it('with a remark for a test stands beside that test, and changes no figure', async () => {
    const { reportId, sheets } = await issuedReport(workshop, ashdowns, oneOut);
    const remark = { text: 'Accepted for this year.', sheetId: sheets.get('SP-2a:S1')!.sheetId, due: '2027-03-31' };
    const signed = await sign(workshop, reportId, answer('accept-with-remarks', { remarks: [remark] }));
    expect(signed.status).toBe(201);
    const report = (await reportOf(reportId))!;
    const model = await workshop.as('inspector', (trx) => signedModel(trx, report));
    expect(model.remarks).toMatchObject([{ no: 1, sheetOrder: 2, text: remark.text, due: '2027-03-31', closed: null }]);
    expect(model.summary.map(({ remarkNo }) => remarkNo)).toEqual([null, 1]);
    expect(model.headline).toBe('1 of 2 judged tests within tolerance; 1 out of tolerance, accepted with remark.');
    expect({ ...model.blocks }).toEqual({ ...report.model.blocks });
    expect(model.counts).toEqual(report.model.counts);
  });
});

describe('a new revision', () => {
  const open = (jobId: string, body: object, as: 'reviewer' | 'inspector' = 'reviewer') =>
    workshop.call(reopen, { as, params: { id: jobId }, path: `/api/jobs/${jobId}/reopen`, body });

  it('replaces the one before; signatures do not carry over', async () => {
    const first = await issuedReport(workshop, ashdowns, oneOut);
    await sign(workshop, first.reportId, answer('refuse'));
    expect((await open(first.jobId, { reason: 'Align again.' }, 'inspector')).status).toBe(403);
    expect((await open(first.jobId, { reason: '' })).status).toBe(422);
    expect((await open(first.jobId, { reason: 'Refused: align again.' })).status).toBe(200);
    expect((await open(first.jobId, { reason: 'Twice.' })).status).toBe(409);

    const { sheetId } = first.sheets.get('SP-2a:S1')!;
    expect((await workshop.call(beginPass, { params: { id: sheetId }, body: { kind: 'as-left' } })).status).toBe(201);
    const again = await issue(workshop, first.jobId, true);
    expect(again.body).toMatchObject({ number: first.number, revision: 2 });

    const [newest, before] = await reportsOf(first.jobId);
    expect([newest.revision, newest.state]).toEqual([2, 'issued']);
    expect([before.revision, before.state]).toEqual([1, 'superseded']);
    expect((await reportOf(newest.id))!.supersedes).toBe(first.reportId);
    expect(await answersTo(newest.id)).toEqual([]);
    expect((await answersTo(first.reportId)).map(({ outcome }) => outcome)).toEqual(['refuse']);
    expect((await sign(workshop, first.reportId, answer('accept'))).status).toBe(409);
    expect((await sign(workshop, newest.id, answer('accept'))).status).toBe(201);
    expect((await reportOf(first.reportId))!.state).toBe('superseded');
  });

  it('takes the place of one that nobody has answered yet', async () => {
    const first = await issuedReport(workshop, ashdowns, within);
    await open(first.jobId, { reason: 'Wrong order number.' });
    // From the moment when the job is open again, the revision that will be replaced takes no answer.
    const late = await sign(workshop, first.reportId, answer('accept'));
    expect(late.status).toBe(409);
    const second = await issue(workshop, first.jobId, true);
    expect(second.body.revision).toBe(2);
    expect(await answersTo(first.reportId)).toEqual([]);
    expect(await answersTo(second.body.id)).toEqual([]);
    expect((await reportOf(first.reportId))!.state).toBe('superseded');
  });
});
