import type { Knex } from 'knex';
import { insertTemperature, updateComponentConditions, updateConditions } from '@/db/queries/jobs';
import { listPasses, replacePassInstruments } from '@/db/queries/passes';
import { listSheets, type SheetRow, updateSheet } from '@/db/queries/sheets';
import type { Viewer } from '@/lib/auth/viewer';
import { definitionOf } from '@/lib/planning/definition-of';
import type { ComponentConditions } from '@/lib/schemas/component-conditions';
import type { LeftOutReason } from '@/lib/schemas/job';
import { intentTexts } from '@/lib/schemas/signature';
import { handIn } from '@/lib/services/hand-in';
import { issueReport } from '@/lib/services/issue-report';
import { makePlan, proposalsFor } from '@/lib/services/make-plan';
import { openJob } from '@/lib/services/open-job';
import { signReport } from '@/lib/services/sign-report';
import { startPass } from '@/lib/services/start-pass';
import { sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells, Field } from '@/lib/sheet/types';
import type { Unit } from '@/lib/units/unit';
import worked from './data/worked-job.json';
import type { RegisteredMachine } from './demo-register';
import { typeReadings } from './measure';

interface WorkedPass {
  id: string;
  kind: 'as-found' | 'adjusting' | 'as-left';
  linkTo?: string;
  takenAt: string;
  instruments?: string[];
  setUp?: Record<string, string>;
  readings?: { at: string; text: string; unit: Unit; history?: { text: string; at: string; reason?: string }[] }[];
}

interface WorkedSheet {
  id: string;
  key: string;
  contract: { toleranceUm: string; source: string } | null;
  leftOut?: { reason: LeftOutReason; text: string };
  passes: WorkedPass[];
}

const workedSheets = worked.sheets as unknown as WorkedSheet[];

const origin = { ip: 'not recorded', userAgent: 'demo scenario' };

interface People {
  inspector: Viewer;
  reviewer: Viewer;
  customer: Viewer;
}

/** The worked job: readings as they were typed, adjusted, left, checked, and accepted with a remark. */
export async function addWorkedJob(
  trx: Knex.Transaction,
  machine: RegisteredMachine,
  instruments: Map<string, string>,
  { inspector, reviewer, customer }: People,
): Promise<void> {
  const { job } = worked;
  const jobId = await openJob(trx, inspector, {
    machineId: machine.id,
    customerId: machine.customerId,
    reference: job.number,
    purpose: 'overhaul',
    scope: job.scope,
    customerOrder: worked.customer.order,
    customerEngineer: worked.customer.engineer,
    decisionRule: 'simple',
    startsOn: job.from,
    endsOn: job.to,
    place: worked.conditions.place,
    hours: '38412',
    people: [
      { membershipId: inspector.membershipId, name: inspector.name, role: 'inspector' },
      { membershipId: reviewer.membershipId, name: reviewer.name, role: 'reviewer' },
      { membershipId: null, name: customer.name, role: 'customer' },
    ],
  });
  const { warmUp, compensation, level, coolant } = worked.conditions;
  await updateConditions(trx, jobId, 1, { warmUp, compensation, level, coolant, notes: null });
  for (const row of worked.conditions.log) {
    const figure = (text: string) => ({ value: text, text });
    await insertTemperature(trx, { jobId, measuredAt: row.at, air: figure(row.air), machine: figure(row.machine) });
  }
  await updateComponentConditions(trx, jobId, 2, worked.opened as ComponentConditions);
  await planWorkedJob(trx, jobId, machine);
  const sheets = new Map((await listSheets(trx, jobId)).map((sheet) => [sheet.key, sheet]));
  const passIds = new Map<string, string>();
  for (const source of workedSheets) {
    const sheet = sheets.get(source.key);
    if (!sheet) throw new Error(`the plan has no ${source.key}`);
    if (source.leftOut) {
      await updateSheet(trx, sheet.id, 1, { leftOut: source.leftOut, by: inspector.name });
      continue;
    }
    for (const pass of source.passes) {
      const passId = await beginPass(trx, sheet.id, pass, passIds, inspector);
      passIds.set(pass.id, passId);
      if (pass.linkTo) continue;
      await typeReadings(trx, sheet.id, passId, typedCells(sheet, pass), inspector, new Date(pass.takenAt));
      await nameInstruments(trx, passId, pass, instruments);
    }
  }
  await issueAndSign(trx, jobId, sheets.get('AX-4:Y1:X1')?.id ?? null, { inspector, reviewer, customer });
}

async function planWorkedJob(trx: Knex.Transaction, jobId: string, machine: RegisteredMachine): Promise<void> {
  const include = workedSheets.map((sheet) => sheet.key);
  const proposals = proposalsFor({
    makeUp: machine.makeUp,
    codes: (await trx('jobs').where({ id: jobId }).first('codes')).codes,
  });
  await makePlan(trx, jobId, {
    include,
    exclusions: proposals
      .filter((proposal) => !include.includes(proposal.key))
      .map((proposal) => ({ key: proposal.key, reason: 'not-touched', text: null })),
    contractTolerances: workedSheets.flatMap(({ key, contract }) =>
      contract ? [{ key, toleranceUm: contract.toleranceUm, source: contract.source }] : [],
    ),
  });
}

async function beginPass(
  trx: Knex.Transaction,
  sheetId: string,
  pass: WorkedPass,
  passIds: Map<string, string>,
  inspector: Viewer,
): Promise<string> {
  if (pass.kind === 'as-found') {
    const [first] = await listPasses(trx, [sheetId]);
    if (!first) throw new Error('a sheet begins with its readings as found');
    return first.id;
  }
  const linkTo = pass.linkTo ? (passIds.get(pass.linkTo) ?? null) : null;
  return startPass(trx, sheetId, { kind: pass.kind, linkTo }, inspector);
}

const isPlace = /^\/(positions|points|targets|sections)\//;

/** Set-up as it was, then the readings in the order in which they were taken; a slip stands before what put it right. */
function typedCells(sheet: Pick<SheetRow, 'definition' | 'setUp'>, pass: WorkedPass) {
  const setUp = pass.setUp ?? {};
  const cells: Cells = Object.fromEntries(
    Object.entries(setUp).map(([pointer, text]) => [pointer, { text, unit: null }]),
  );
  const fields = sheetFields(definitionOf(sheet.definition), cells);
  const known = new Map<string, Field>(fields.setUp.map((field) => [field.pointer, field]));
  for (const table of fields.tables) {
    for (const row of table.rows) {
      for (const cell of row.cells) if (cell && 'field' in cell) known.set(cell.field.pointer, cell.field);
    }
  }
  const set = Object.entries(setUp).flatMap(([pointer, text]) => {
    const field = known.get(pointer);
    return field && field.role !== 'reading' ? [{ pointer, text, unit: field.unit, at: pass.takenAt }] : [];
  });
  const readings = (pass.readings ?? []).flatMap(({ at, text, unit, history }) =>
    history
      ? history.map((entry) => ({
          pointer: at,
          text: entry.text,
          unit,
          at: entry.at,
          reason: entry.reason ?? null,
        }))
      : [{ pointer: at, text, unit, at: pass.takenAt }],
  );
  // Rows that the plan proposed and nobody used: their place is emptied, so that nothing is expected there.
  const unused =
    pass.kind === 'as-found'
      ? Object.keys(sheet.setUp).filter((pointer) => isPlace.test(pointer) && !(pointer in setUp))
      : [];
  const emptied = unused.map((pointer) => ({ pointer, text: '', unit: null, at: pass.takenAt }));
  return [...set, ...emptied, ...readings];
}

async function nameInstruments(
  trx: Knex.Transaction,
  passId: string,
  pass: WorkedPass,
  instruments: Map<string, string>,
): Promise<void> {
  await replacePassInstruments(
    trx,
    passId,
    (pass.instruments ?? []).map((number) => {
      const override = worked.overrides.find((entry) => entry.pass === pass.id && entry.instrument === number);
      const instrumentId = instruments.get(number);
      if (!instrumentId) throw new Error(`no instrument ${number}`);
      return { instrumentId, overrideReason: override?.reason ?? null, overrideBy: override?.approvedBy ?? null };
    }),
  );
}

async function issueAndSign(
  trx: Knex.Transaction,
  jobId: string,
  remarkedSheet: string | null,
  { reviewer, customer, inspector }: People,
): Promise<void> {
  await handIn(trx, inspector, jobId, new Date('2026-03-12T11:00:00+01:00'));
  const report = await issueReport(
    trx,
    reviewer,
    jobId,
    { confirmed: true, annex: false },
    origin,
    new Date('2026-03-12T11:30:00+01:00'),
  );
  await signReport(
    trx,
    inspector,
    report.id,
    {
      outcome: 'accept-with-remarks',
      name: customer.name,
      functionTitle: customer.functionTitle,
      company: worked.customer.name,
      place: worked.conditions.place,
      typed: customer.name,
      strokes: null,
      reason: null,
      remarks: [
        {
          text: worked.remark.text,
          sheetId: remarkedSheet,
          owner: worked.remark.pointsList.who,
          due: worked.remark.pointsList.due,
        },
      ],
      intentConfirmed: true,
      intentText: intentTexts['accept-with-remarks'],
      deviceTimeZone: null,
    },
    origin,
    new Date('2026-03-12T11:45:00+01:00'),
  );
}
