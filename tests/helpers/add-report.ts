import { createHash } from 'node:crypto';
import { inScope } from '@/db/client';
import { newId } from '@/lib/id';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import type { TestWorkshop } from './test-workshop';

let count = 0;

/** A job with one report of one test, straight in the tables: for what reads reports, not for what makes them. */
export async function addReport(
  workshop: TestWorkshop,
  report: {
    machineId: string;
    customerId: string;
    state: 'checked' | 'issued' | 'signed' | 'signed-with-remarks' | 'refused' | 'superseded';
    startsOn?: string;
    asLeft?: string;
    reference?: string;
    order?: string;
  },
): Promise<{ reportId: string; number: string; reference: string }> {
  count += 1;
  const { startsOn = '2026-03-10', asLeft = '0.004', reference = `TFT-${1000 + count}` } = report;
  const number = `TFT-${startsOn.slice(0, 4)}-${String(count).padStart(6, '0')}`;
  const row = {
    title: 'Nose run-out',
    component: 'main spindle S1',
    asLeft,
    asLeftVerdict: 'within-tolerance',
    toleranceMm: '0.008',
  };
  const model = JSON.stringify({ headline: '1 of 1 within tolerance.', summary: [row] });
  const [jobId, reportId] = [newId(), newId()];
  await inScope(workshop.scope, async (trx) => {
    await trx('jobs').insert({
      organisation_id: workshop.organisationId,
      id: jobId,
      reference,
      machine_id: report.machineId,
      customer_id: report.customerId,
      customer_order: report.order ?? null,
      purpose: 'periodic',
      codes: '[]',
      starts_on: startsOn,
      make_up: JSON.stringify(startingMakeUps[0]?.makeUp),
      state: 'issued',
    });
    await trx('reports').insert({
      organisation_id: workshop.organisationId,
      id: reportId,
      job_id: jobId,
      number,
      state: report.state,
      model,
      model_sha256: createHash('sha256').update(model).digest('hex'),
      issued_at: `${startsOn}T12:00:00Z`,
      signed_at: report.state.startsWith('signed') ? `${startsOn}T14:00:00Z` : null,
    });
  });
  return { reportId, number, reference };
}
