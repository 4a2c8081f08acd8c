import { POST as postReports } from '@/app/api/jobs/[id]/reports/route';
import { POST as postSignatures } from '@/app/api/reports/[id]/signatures/route';
import { insertTemperature, updateConditions } from '@/db/queries/jobs';
import { listSheets } from '@/db/queries/sheets';
import type { DemoInstrument } from '@/db/seeds/demo-register';
import { simulatePass } from '@/db/seeds/measure';
import { intentTexts, type Outcome } from '@/lib/schemas/signature';
import { linkAsLeft } from '@/lib/services/link-as-left';
import type { Asked, Workshop } from './workshop';

export const indicator: DemoInstrument = {
  number: 'IN-11',
  name: 'digital lever indicator',
  kind: 'dial indicator',
  resolution: '1',
  resolutionUnit: 'µm',
  certificate: 'HR-1101',
  calibrated: '2026-01-12',
  due: '2027-01-12',
  uncertainty: '1.6',
  uncertaintyUnit: 'µm',
  keptUp: false,
};

/** Machines of the two customers: the first one's engineer is the member `customer`. */
export const ashdowns = 'LK32-0O81-B';
export const millbrooks = 'HP25-I110-55';

/**
 * A job with these tests, measured as found by the real services; `share` is the deviation as a part of the tolerance. What is within
 * tolerance is declared as left = as found, all others are adjusted and measured again unless `onlyFound`.
 */
export async function measuredJob(
  workshop: Workshop,
  serialNumber: string,
  shares: Record<string, number | null>,
  { onlyFound = false, described = true } = {},
): Promise<{ jobId: string; sheets: Map<string, { sheetId: string; passId: string }> }> {
  const planned = await workshop.plannedJob(serialNumber, Object.keys(shares));
  const inspector = workshop.viewer('inspector');
  const instrumentIds = [workshop.instruments.get(indicator.number)!];
  await workshop.as('inspector', async (trx) => {
    if (described) {
      const { version } = await trx('jobs').where({ id: planned.jobId }).first('version');
      await updateConditions(trx, planned.jobId, version, {
        warmUp: '45 min of axis and spindle exercise',
        compensation: null,
        level: null,
        coolant: null,
        notes: null,
      });
      const figure = (text: string) => ({ value: text, text });
      await insertTemperature(trx, {
        jobId: planned.jobId,
        measuredAt: '2026-03-10T08:00:00Z',
        air: figure('20.4'),
        machine: figure('20.1'),
      });
    }
    const at = new Date('2026-03-10T09:00:00Z');
    const sheets = await listSheets(trx, planned.jobId);
    for (const sheet of sheets) {
      const share = shares[sheet.key];
      if (typeof share !== 'number') continue;
      await simulatePass(trx, sheet, { kind: 'as-found', share, at, instrumentIds }, inspector);
      if (share >= 1 && !onlyFound) {
        await simulatePass(trx, sheet, { kind: 'as-left', share, at, instrumentIds }, inspector);
      }
    }
    if (!onlyFound) {
      const ids = sheets.filter(({ key }) => (shares[key] ?? 1) < 1).map(({ id }) => id);
      await linkAsLeft(trx, inspector, planned.jobId, ids);
    }
  });
  return planned;
}

export const issue = (workshop: Workshop, jobId: string, confirmed: boolean, asked: Asked = {}) =>
  workshop.call(postReports, {
    as: 'reviewer',
    params: { id: jobId },
    path: `/api/jobs/${jobId}/reports`,
    body: { confirmed },
    ...asked,
  });

/** A report that is out and waits for its customer's answer. */
export async function issuedReport(workshop: Workshop, serialNumber: string, shares: Record<string, number>) {
  const job = await measuredJob(workshop, serialNumber, shares);
  const { status, body } = await issue(workshop, job.jobId, true);
  if (status !== 201) throw new Error(JSON.stringify(body));
  return { ...job, reportId: body.id as string, number: body.number as string };
}

/** What the page sends for an answer, filled in rightly. */
export const answer = (outcome: Outcome, change: object = {}) => ({
  outcome,
  name: 'C. Vale',
  functionTitle: 'production engineer',
  company: 'Ashdown Turned Parts',
  place: 'bay 3',
  typed: 'C. Vale',
  strokes: null,
  reason: outcome === 'refuse' ? 'The turret is to be aligned again.' : null,
  remarks: outcome === 'accept-with-remarks' ? [{ text: 'Cover of T1 is missing.' }] : [],
  intentConfirmed: true,
  intentText: intentTexts[outcome],
  deviceTimeZone: 'Europe/Berlin',
  ...change,
});

export const sign = (workshop: Workshop, reportId: string, body: object, asked: Asked = {}) =>
  workshop.call(postSignatures, {
    as: 'customer',
    params: { id: reportId },
    path: `/api/reports/${reportId}/signatures`,
    body,
    ...asked,
  });
