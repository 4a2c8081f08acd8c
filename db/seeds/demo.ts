import createKnex from 'knex';
import { appDb, inScope } from '@/db/client';
import type { Viewer } from '@/lib/auth/viewer';
import { env } from '@/lib/env';
import { newId } from '@/lib/id';
import worked from './data/worked-job.json';
import { addCatalogueWork } from './demo-catalogue';
import { addDemoJob, type DemoJob } from './demo-jobs';
import { addPeople, brackwaterMembers, type DemoOrganisation, quillmereMembers } from './demo-people';
import { addInstruments, addMachines, type DemoInstrument } from './demo-register';
import { addWorkedJob } from './worked-job';

const quillmere: DemoOrganisation = {
  organisationId: newId(),
  name: worked.job.serviceCompany,
  code: 'QMF',
  timeZone: 'Europe/Berlin',
  addressLines: ['Unit 4, Tarn Road', 'Quillmere'],
  contact: 'office@quillmere.example',
  customers: ['Ashdown Turned Parts', 'Millbrook Hydraulics', 'Tolland Medical Fittings'],
  members: quillmereMembers,
};
const brackwater: DemoOrganisation = {
  organisationId: newId(),
  name: 'Brackwater Spindle Service',
  code: 'BSS',
  timeZone: 'Europe/Berlin',
  addressLines: ['Quay Lane 11', 'Brackwater'],
  contact: 'office@brackwater.example',
  customers: ['Ferrand & Daughter'],
  members: brackwaterMembers,
};

/** What a whole acceptance takes of a machine with several channels; the long thermal runs are not agreed. */
const acceptance = [
  ...['FC-01', 'FC-02', 'FC-04', 'FC-10', 'FC-11', 'FC-12', 'FC-13', 'LV-1', 'LV-2', 'MT-1'],
  ...['SP-1a', 'SP-1b', 'SP-1c', 'SP-2a', 'SP-2b', 'AX-5', 'AX-5x', 'AX-1a', 'AX-1b', 'AX-2', 'AX-3', 'AX-4'],
  ...['TU-1', 'TU-2a', 'TU-2b', 'TU-3', 'TU-4', 'SS-1', 'SS-2a', 'SS-2b', 'SS-3a', 'SS-3b', 'SS-3c', 'GT-1'],
  ...['PO-B', 'TU-3x', 'PO-A', 'C-1', 'CI-1', 'WP-1', 'WP-1b', 'WP-7'],
];

/** Organisations are founded by the owner's role; everything after that goes through the application's own. */
async function foundOrganisations(): Promise<boolean> {
  const owner = createKnex({ client: 'pg', connection: env.OWNER_DATABASE_URL });
  try {
    if (await owner('organisations').first('organisation_id')) return false;
    for (const organisation of [quillmere, brackwater]) {
      await owner('organisations').insert({
        organisation_id: organisation.organisationId,
        name: organisation.name,
        code: organisation.code,
        time_zone: organisation.timeZone,
        address_lines: organisation.addressLines,
        contact: organisation.contact,
        set_up_done: true,
      });
    }
    return true;
  } finally {
    await owner.destroy();
  }
}

const daysAgo = (days: number) => new Date(Date.now() - days * 86_400_000).toISOString().slice(0, 10);

function demoInstruments(): DemoInstrument[] {
  const kinds: Record<string, string> = {
    'IN-01': 'dial indicator',
    'IN-02': 'dial indicator',
    'IN-03': 'test mandrel',
    'IN-04': 'square',
    'IN-05': 'laser interferometer',
    'IN-06': 'micrometer',
  };
  const fromJob = worked.instruments.map((instrument) => ({
    number: instrument.id,
    name: instrument.name,
    kind: kinds[instrument.id] ?? 'other',
    resolution: instrument.resolution,
    resolutionUnit: instrument.unit,
    certificate: instrument.certificate,
    calibrated: instrument.calibrated,
    due: instrument.due,
    uncertainty: instrument.expandedUncertainty,
    uncertaintyUnit: ('expandedUncertaintyUnit' in instrument ? instrument.expandedUncertaintyUnit : undefined) ?? 'µm',
    keptUp: instrument.id !== 'IN-04' && instrument.id !== 'IN-05',
  }));
  const square: DemoInstrument = {
    number: 'IN-07',
    name: 'granite square 300 × 200',
    kind: 'square',
    resolution: null,
    resolutionUnit: null,
    certificate: 'HR-5610',
    calibrated: daysAgo(120),
    due: daysAgo(-245),
    uncertainty: '1.4',
    uncertaintyUnit: 'µm',
    keptUp: true,
  };
  return [...fromJob, square];
}

const yearly = ['SP-1a', 'SP-2a', 'SP-2b', 'AX-1a', 'AX-1b', 'AX-2', 'PO-B'];

async function fillQuillmere(viewers: Map<string, Viewer>, customers: Map<string, string>): Promise<void> {
  const member = (email: string) => {
    const viewer = viewers.get(email);
    if (!viewer) throw new Error(`no member ${email}`);
    return viewer;
  };
  const inspector = member('inspector@quillmere.example');
  const reviewer = member('reviewer@quillmere.example');
  const customer = member('customer@ashdown.example');
  const scope = { organisationId: quillmere.organisationId, accountId: inspector.accountId, customerId: null };

  await inScope(scope, async (trx) => {
    const instruments = await addInstruments(trx, demoInstruments());
    const machines = await addMachines(trx, customers);
    const machine = (serialNumber: string) => {
      const found = machines.get(serialNumber);
      if (!found) throw new Error(`no machine ${serialNumber}`);
      return found;
    };
    const thisYear = new Date().getUTCFullYear();
    const drifting: DemoJob[] = [6, 5, 4, 3, 2, 1].map((yearsAgo, step) => ({
      machine: machine('HP25-1I10-S5'),
      reference: `QMF-${1200 + step * 140 + 7}`,
      purpose: 'periodic',
      scope: 'yearly check of spindle and slides',
      order: `${6100 + step * 90}`,
      engineer: 'C. Vale',
      startsOn: `${thisYear - yearsAgo}-10-${String(8 + step).padStart(2, '0')}`,
      only: yearly,
      // The spindle wears a little every year; the slides stay where they are.
      shares: { 'SP-1a': 0.25 + step * 0.1, 'SP-2a': 0.3 + step * 0.09, 'SP-2b': 0.3 + step * 0.08, '*': 0.35 },
      progress: step === 3 ? 'accept-with-remarks' : 'accept',
      answer: { remark: 'Spindle run-out has grown again. Please watch it at the next check.' },
    }));
    const jobs: DemoJob[] = [
      ...drifting,
      {
        machine: machine('SW20Z-2Z7O'),
        reference: 'QMF-2066',
        purpose: 'collision',
        scope: 'after a collision of gang slide and sub-spindle',
        order: '70-118',
        engineer: 'A. Lindqvist',
        startsOn: daysAgo(41),
        only: ['SP-1a', 'AX-1a', 'AX-1b', 'AX-2', 'SS-1', 'TU-3', 'PO-B'],
        shares: { 'SS-1': 1.7, 'TU-3': 1.4, '*': 0.4 },
        putRight: { 'SS-1': 1.15, 'TU-3': 0.3 },
        progress: 'refuse',
        answer: { reason: 'Main and sub-spindle are still further apart than agreed. Align again, then we sign.' },
      },
      {
        machine: machine('LK65-B8I0-2'),
        reference: 'QMF-2079',
        purpose: 'new-machine',
        scope: 'acceptance at the customer’s, new machine',
        order: '70-131',
        engineer: 'A. Lindqvist',
        startsOn: daysAgo(19),
        only: ['SP-1a', 'SP-2a', 'SP-2b', 'AX-1a', 'AX-1b', 'AX-2', 'AX-4', 'SS-1', 'TU-3'],
        shares: { '*': 0.45, 'AX-4': 1.3 },
        putRight: { 'AX-4': 0.4 },
        progress: 'in-check',
      },
      {
        machine: machine('LK32-0081-8'),
        reference: 'QMF-2083',
        purpose: 'overhaul',
        scope: 'turret T1 refitted, guideways scraped',
        order: '7790',
        engineer: 'C. Vale',
        startsOn: daysAgo(8),
        only: [
          ...['FC-01', 'SP-1a', 'SP-2a', 'AX-5', 'AX-1a', 'AX-1b', 'AX-2', 'AX-4', 'TU-3', 'TU-4'],
          ...['PO-A', 'CI-1', 'WP-1', 'TH-1', 'FC-10', 'FC-13'],
        ],
        opened: {
          T1: { condition: 'refitted', text: null },
          bed: { condition: 'repaired', text: 'guideways scraped' },
          S1: { condition: 'untouched', text: null },
        },
        shares: { '*': 0.4, 'TU-3': 1.5 },
        putRight: { 'TU-3': 0.2 },
        progress: 'issued',
      },
      {
        machine: machine('HP25-I110-55'),
        reference: 'QMF-2087',
        purpose: 'move',
        scope: 'machine moved to the new hall, levelled again',
        order: 'M-440',
        engineer: 'P. Ostrander',
        startsOn: daysAgo(1),
        only: ['SP-1a', 'SP-2a', 'SP-2b', 'AX-5', 'AX-1a', 'AX-1b', 'AX-2', 'TU-3', 'PO-B', 'WP-1'],
        shares: { '*': 0.4 },
        progress: 'half',
      },
      {
        machine: machine('CT52-3Q0G-17'),
        reference: 'QMF-2090',
        purpose: 'new-machine',
        scope: 'acceptance of a machine with three channels',
        order: '70-140',
        engineer: 'A. Lindqvist',
        startsOn: daysAgo(2),
        only: acceptance,
        shares: { '*': 0.45, 'AX-3': 1.2 },
        progress: 'half',
      },
      {
        machine: machine('17-S5O8B'),
        reference: 'QMF-2088',
        purpose: 'periodic',
        scope: null,
        order: 'M-441',
        engineer: 'P. Ostrander',
        startsOn: daysAgo(0),
        shares: { '*': 0.5 },
        progress: 'no-plan',
      },
    ];
    for (const job of drifting) await addDemoJob(trx, job, instruments, { inspector, reviewer });
    await addWorkedJob(trx, machine('LK32-0O81-B'), instruments, { inspector, reviewer, customer });
    for (const job of jobs.slice(drifting.length)) await addDemoJob(trx, job, instruments, { inspector, reviewer });
    // After the jobs: what is confirmed today does not speak for a plan that was made before.
    await addCatalogueWork(trx, member('admin@quillmere.example'));
  });
}

/** Fills an empty database with the demo scenario; does nothing when there is any organisation. */
async function main(): Promise<void> {
  if (env.WITNESSMARK_DEMO !== '1' || !(await foundOrganisations())) return;
  const { viewers, customers } = await addPeople(quillmere);
  await fillQuillmere(viewers, customers);
  await addPeople(brackwater);
  console.log('The demo scenario is in place.');
}

try {
  await main();
} finally {
  await appDb().destroy();
}
