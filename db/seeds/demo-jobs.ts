import type { Knex } from 'knex';
import { insertTemperature, updateComponentConditions, updateConditions } from '@/db/queries/jobs';
import { listSheets } from '@/db/queries/sheets';
import type { Viewer } from '@/lib/auth/viewer';
import type { ComponentConditions } from '@/lib/schemas/component-conditions';
import type { Purpose } from '@/lib/schemas/job';
import { intentTexts, type Outcome } from '@/lib/schemas/signature';
import { handIn } from '@/lib/services/hand-in';
import { issueReport } from '@/lib/services/issue-report';
import { linkAsLeft } from '@/lib/services/link-as-left';
import { makePlan, proposalsFor } from '@/lib/services/make-plan';
import { openJob } from '@/lib/services/open-job';
import { signReport } from '@/lib/services/sign-report';
import type { RegisteredMachine } from './demo-register';
import { simulatePass } from './measure';
import { noise } from './simulated-readings';

export interface DemoJob {
  machine: RegisteredMachine;
  reference: string;
  purpose: Purpose;
  scope: string | null;
  order: string | null;
  engineer: string;
  startsOn: string;
  /** Only these definitions; absent: every proposal. */
  only?: string[];
  /** What the work did to components of the machine. */
  opened?: ComponentConditions;
  /** How large the deviations are, as a part of the tolerance; keyed by definition, `*` for all others. */
  shares: Record<string, number>;
  /** Out of tolerance as found and put right: share as left. */
  putRight?: Record<string, number>;
  progress: 'no-plan' | 'half' | 'in-check' | 'issued' | Outcome;
  answer?: { reason?: string; remark?: string };
}

interface People {
  inspector: Viewer;
  reviewer: Viewer;
}

const origin = { ip: 'not recorded', userAgent: 'demo scenario' };
const at = (day: string, hours: number, minutes = 0) =>
  new Date(`${day}T${String(hours).padStart(2, '0')}:${String(minutes).padStart(2, '0')}:00Z`);

/** One job of the demo scenario, through the same services that a person's clicks go through. */
export async function addDemoJob(
  trx: Knex.Transaction,
  demo: DemoJob,
  instruments: Map<string, string>,
  { inspector, reviewer }: People,
): Promise<void> {
  const jobId = await openDemoJob(trx, demo, { inspector, reviewer });
  if (demo.progress === 'no-plan') return;
  const { makeUp, codes } = await trx('jobs').where({ id: jobId }).first({ makeUp: 'make_up', codes: 'codes' });
  const proposals = proposalsFor({ makeUp, codes });
  const takes = (key: string) => !demo.only || demo.only.includes(key.split(':')[0] ?? '');
  await makePlan(trx, jobId, {
    include: proposals.filter(({ key }) => takes(key)).map(({ key }) => key),
    exclusions: proposals
      .filter(({ key }) => !takes(key))
      .map(({ key }) => ({ key, reason: 'not-agreed', text: null })),
    contractTolerances: proposals
      .filter(({ key, tolerance }) => takes(key) && !tolerance && key.startsWith('PO-B'))
      .map(({ key }) => ({
        key,
        toleranceUm: '6',
        source: `${demo.engineer}, order of ${demo.startsOn}: lost motion up to 0.006 mm`,
      })),
  });
  await measureJob(trx, jobId, demo, instruments, inspector);
  if (demo.progress === 'half') return;
  await linkAsLeft(
    trx,
    inspector,
    jobId,
    (await listSheets(trx, jobId)).map((sheet) => sheet.id),
  );
  await handIn(trx, inspector, jobId, at(demo.startsOn, 14, 45));
  if (demo.progress === 'in-check') return;
  const report = await issueReport(
    trx,
    reviewer,
    jobId,
    { confirmed: true, annex: false },
    origin,
    at(demo.startsOn, 15, 30),
  );
  if (demo.progress === 'issued') return;
  const outcome = demo.progress;
  await signReport(
    trx,
    inspector,
    report.id,
    {
      outcome,
      name: demo.engineer,
      functionTitle: 'production engineer',
      company: demo.machine.customer,
      place: demo.machine.site,
      typed: demo.engineer,
      strokes: null,
      reason: outcome === 'refuse' ? (demo.answer?.reason ?? null) : null,
      remarks:
        outcome === 'accept-with-remarks'
          ? [{ text: demo.answer?.remark ?? '', sheetId: null, owner: demo.machine.customer, due: null }]
          : [],
      intentConfirmed: true,
      intentText: intentTexts[outcome],
      deviceTimeZone: null,
    },
    origin,
    at(demo.startsOn, 16, 10),
  );
}

async function openDemoJob(trx: Knex.Transaction, demo: DemoJob, { inspector, reviewer }: People): Promise<string> {
  const jobId = await openJob(trx, inspector, {
    machineId: demo.machine.id,
    customerId: demo.machine.customerId,
    reference: demo.reference,
    purpose: demo.purpose,
    scope: demo.scope,
    customerOrder: demo.order,
    customerEngineer: demo.engineer,
    decisionRule: 'simple',
    startsOn: demo.startsOn,
    endsOn: null,
    place: demo.machine.site,
    hours: null,
    people: [
      { membershipId: inspector.membershipId, name: inspector.name, role: 'inspector' },
      { membershipId: reviewer.membershipId, name: reviewer.name, role: 'reviewer' },
      { membershipId: null, name: demo.engineer, role: 'customer' },
    ],
  });
  await updateConditions(trx, jobId, 1, {
    warmUp: '45 min of axis and spindle exercise at half speed',
    compensation: 'lost-motion and pitch values active',
    level: 'within 0.04 mm/m',
    coolant: 'off',
    notes: null,
  });
  if (demo.opened) await updateComponentConditions(trx, jobId, 2, demo.opened);
  const random = noise(demo.reference);
  for (const hour of [7, 10, 13]) {
    const figure = (value: number) => ({ value: value.toFixed(1), text: value.toFixed(1) });
    const air = 19.4 + hour * 0.12 + random();
    await insertTemperature(trx, {
      jobId,
      measuredAt: at(demo.startsOn, hour).toISOString(),
      air: figure(air),
      machine: figure(air - 0.3),
    });
  }
  return jobId;
}

async function measureJob(
  trx: Knex.Transaction,
  jobId: string,
  demo: DemoJob,
  instruments: Map<string, string>,
  inspector: Viewer,
): Promise<void> {
  const random = noise(`${demo.reference} spread`);
  const sheets = await listSheets(trx, jobId);
  const stop = demo.progress === 'half' ? Math.ceil(sheets.length / 2) : sheets.length;
  for (const [index, sheet] of sheets.slice(0, stop).entries()) {
    const share = (demo.shares[sheet.definition.id] ?? demo.shares['*'] ?? 0.4) * (1 + random() * 0.2);
    const instrumentIds = instrumentsFor(sheet.definition.id, instruments);
    const taken = at(demo.startsOn, 7 + Math.floor(index / 6), (index % 6) * 9);
    const last = index === stop - 1 && demo.progress === 'half';
    await simulatePass(
      trx,
      sheet,
      { kind: 'as-found', share, at: taken, instrumentIds, part: last ? 0.6 : 1, slip: index === 3 },
      inspector,
    );
    const left = demo.putRight?.[sheet.definition.id];
    if (left !== undefined) {
      await simulatePass(
        trx,
        sheet,
        { kind: 'as-left', share: left, at: at(demo.startsOn, 13, index), instrumentIds },
        inspector,
      );
    }
  }
}

function instrumentsFor(definitionId: string, instruments: Map<string, string>): string[] {
  const wanted: Record<string, string[]> = {
    'SP-2a': ['IN-02', 'IN-03'],
    'SP-2b': ['IN-01', 'IN-03'],
    'AX-1a': ['IN-01', 'IN-03'],
    'AX-1b': ['IN-01', 'IN-03'],
    'AX-4': ['IN-02', 'IN-07'],
    'WP-1': ['IN-06'],
  };
  return (wanted[definitionId] ?? ['IN-02']).map((number) => {
    const id = instruments.get(number);
    if (!id) throw new Error(`no instrument ${number}`);
    return id;
  });
}
