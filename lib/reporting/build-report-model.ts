import { componentName, componentWords } from '@/lib/planning/component-words';
import { definitionOf } from '@/lib/planning/definition-of';
import { partConditions } from '@/lib/schemas/component-conditions';
import { type CalibrationFacts, calibrationOn } from '@/lib/schemas/instrument-state';
import { decisionRules, leftOutReasons, purposes } from '@/lib/schemas/job';
import { drivenToolWords, machineKinds } from '@/lib/schemas/make-up';
import { toleranceShown } from '@/lib/sheet/shown-unit';
import { Dec } from '@/lib/units/decimal';
import { formatDecimal } from '@/lib/units/format';
import type { ShownIn } from '@/standards/types';
import type { CellChangeText } from './corrected-readings';
import { countChecks, countVerdicts } from './count-verdicts';
import { formatDay, formatTime } from './format-time';
import {
  checkCountWords,
  conditionLabels,
  criterionWords,
  headlineWords,
  roleWords,
  signedOutcomeWords,
  statementWords,
} from './record-words';
import type { ReportModel, SignatureBlock, SummaryRow } from './report-model';
import { sheetState } from './sheet-state';
import type { StoredJob, StoredPass } from './stored-job';
import { editionWords, sheetUnit, testBlock } from './test-block';
import { countToleranceSources } from './tolerance-source';

type StoredResult = NonNullable<StoredPass['result']>;

export interface ReportInput {
  stored: StoredJob;
  changes: CellChangeText[];
  machine: {
    manufacturer: string;
    model: string;
    serialNumber: string;
    year: number | null;
    control: string | null;
    site: string | null;
  };
  customerName: string;
  organisation: {
    name: string;
    addressLines: string[];
    contact: string | null;
    timeZone: string;
    paper: 'A4' | 'Letter';
  };
  document: ReportModel['document'];
  /** `at`: when the job was handed in; null: named for the job, has handed nothing in. */
  inspector: { name: string; at: string | null } | null;
  reviewer: { name: string; function: string | null; at: string } | null;
  remarks: ReportModel['remarks'];
}

/** A stored job as the document that the customer signs. Pure; every figure is a stored result or a reading as typed. */
export function buildReportModel(input: ReportInput): ReportModel {
  const { stored, machine, organisation } = input;
  const { job } = stored;
  const sheets = stored.sheets.map((sheet) => {
    const definition = definitionOf(sheet.definition, sheet.ownDefinition);
    return { sheet, state: sheetState(sheet), unit: sheetUnit(sheet, definition) };
  });
  const measured = sheets.filter(({ unit }) => unit !== 'items');
  const states = measured.map(({ state }) => state);
  const checks = countChecks(sheets.filter(({ unit }) => unit === 'items').map(({ state }) => state));
  const counts = { asFound: countVerdicts(states, 'asFound'), asLeft: countVerdicts(states, 'asLeft') };
  const outRemarked = measured.filter(
    ({ sheet, state }) => state.verdict === 'out-of-tolerance' && sheet.remark,
  ).length;
  const context = { timeZone: organisation.timeZone, changes: input.changes };
  return {
    schemaVersion: 1,
    language: 'en',
    paper: organisation.paper,
    document: input.document,
    letterhead: { name: organisation.name, addressLines: organisation.addressLines, contact: organisation.contact },
    machine: {
      ...machine,
      hours: job.hours,
      kind: machineKinds[job.makeUp.kind],
      sizeClass: `${criterionWords[job.makeUp.sizeClass.criterion]} ${formatDecimal(job.makeUp.sizeClass.valueMm)} mm`,
      components: componentList(stored),
    },
    customer: { name: input.customerName, engineer: job.customerEngineer, order: job.customerOrder },
    job: {
      reference: job.reference,
      purpose: purposes[job.purpose],
      scope: job.scope,
      from: job.startsOn,
      to: job.endsOn,
      codes: [...new Set(stored.sheets.map((sheet) => editionWords(sheet.definition)))],
      decisionRule: decisionRules[job.decisionRule],
      people: stored.people.map((person) => ({ name: person.name, role: person.role })),
    },
    conditions: conditions(stored, organisation.timeZone),
    instruments: usedInstruments(stored, organisation.timeZone),
    headline: measured.length === 0 && checks ? checkCountWords(checks) : headlineWords(counts.asLeft, outRemarked),
    counts,
    ...(checks ? { checks } : {}),
    toleranceSources: countToleranceSources(
      stored.sheets.filter((sheet) => !sheet.leftOutReason).map((sheet) => sheet.tolerance),
    ),
    summary: sheets.map(({ sheet, state, unit }): SummaryRow => {
      const figure = (result: StoredResult | null | undefined) =>
        result && unit !== 'items' ? formatDecimal(result.displayedMm) : null;
      const tolerance = (state.final?.result?.outcome.judgement.toleranceUm ?? sheet.tolerance?.baseUm) || null;
      return {
        order: sheet.position,
        key: sheet.key,
        title: sheet.title,
        component: componentWords(sheet.component, job.makeUp),
        asFound: figure(state.asFound?.result),
        asFoundUm: state.asFound?.result?.outcome.result.deviation ?? null,
        asFoundVerdict: state.asFound?.result?.verdict ?? null,
        asLeft: figure(state.asLeft?.result),
        asLeftUm: state.asLeft?.result?.outcome.result.deviation ?? null,
        asLeftVerdict: state.asLeft?.result?.verdict ?? null,
        linked: state.linked,
        toleranceMm: tolerance && unit !== 'items' ? toleranceText(tolerance, unit) : null,
        ...(unit === 'mm' ? {} : { unit }),
        leftOut: sheet.leftOutReason ? leftOutReasons[sheet.leftOutReason] : null,
        remarkNo: input.remarks.find((remark) => remark.sheetOrder === sheet.position)?.no ?? null,
      };
    }),
    notInPlan: stored.exclusions.map((entry) => ({
      title: entry.title,
      reason: entry.text ? `${leftOutReasons[entry.reason]}: ${entry.text}` : leftOutReasons[entry.reason],
    })),
    blocks: stored.sheets.map((sheet) => testBlock(sheet, stored, context)),
    remarks: input.remarks,
    signatures: signatures(input),
    statement: statementWords,
  };
}

/** At most four decimals, cut off downward, so that a scaled tolerance never looks wider than it is. */
function toleranceText(um: string, unit: ShownIn): string {
  const shown = new Dec(toleranceShown(um, unit));
  return formatDecimal(shown.toDecimalPlaces(4, Dec.ROUND_DOWN).toString());
}

function componentList({ job: { makeUp, componentConditions = {} } }: StoredJob): ReportModel['machine']['components'] {
  const programmed = { radius: 'programmed on radius', diameter: 'programmed on diameter' } as const;
  // The id stands in front already: `T1 turret, 12 stations`.
  const words = (id: string, ...rest: (string | null)[]) => ({
    id,
    what: [componentName(id, makeUp).replace(new RegExp(` ?${id}$`), ''), ...rest].filter(Boolean).join(', '),
    ...condition(id),
  });
  const condition = (id: string) => {
    const said = componentConditions[id];
    return said ? { condition: [partConditions[said.condition], said.text].filter(Boolean).join(', ') } : {};
  };
  return [
    ...makeUp.spindles.map((spindle) => words(spindle.id, `channel ${spindle.channel}`)),
    ...makeUp.turrets.map((turret) =>
      words(
        turret.id,
        `${turret.stations} stations`,
        turret.axes.join(' '),
        turret.drivenTools && turret.drivenTools !== 'none'
          ? `driven tools ${drivenToolWords[turret.drivenTools]}`
          : null,
        `channel ${turret.channel}`,
      ),
    ),
    ...makeUp.linearAxes.map((axis) =>
      words(axis.id, `travel ${formatDecimal(axis.travelMm)} mm`, programmed[axis.programmedOn]),
    ),
    ...makeUp.rotaryAxes.map((axis) => words(axis.id, `rotary axis of ${axis.carries}`, `channel ${axis.channel}`)),
    ...[makeUp.tailstock, makeUp.guideBush, makeUp.toolChanger].flatMap((part) =>
      part ? [words(part.id, `channel ${part.channel}`)] : [],
    ),
    ...(componentConditions.bed ? [{ id: 'bed', what: 'of the machine', ...condition('bed') }] : []),
  ];
}

function conditions(stored: StoredJob, timeZone: string): ReportModel['conditions'] {
  const airs = stored.temperatures.flatMap((row) => (row.air === null ? [] : [new Dec(row.air)]));
  const lines = (Object.keys(conditionLabels) as (keyof typeof conditionLabels)[]).flatMap((key) => {
    const value = stored.job.conditions[key];
    return value ? [{ label: conditionLabels[key], value }] : [];
  });
  return {
    place: stored.job.place,
    lines,
    temperatures: stored.temperatures.map((row) => ({
      at: formatTime(row.measuredAt, timeZone),
      air: row.air && formatDecimal(row.air),
      machine: row.machine && formatDecimal(row.machine),
    })),
    airRange:
      airs.length > 0
        ? `air ${formatDecimal(Dec.min(...airs).toString())} to ${formatDecimal(Dec.max(...airs).toString())} °C`
        : null,
  };
}

/** Each instrument once, with the certificate that held on the day when it was first used on this job. */
function usedInstruments(stored: StoredJob, timeZone: string): ReportModel['instruments'] {
  const uses = stored.sheets
    .filter((sheet) => !sheet.leftOutReason)
    .flatMap((sheet) =>
      sheet.passes.flatMap((pass) =>
        pass.instruments.map((used) => ({
          ...used,
          position: sheet.position,
          day: pass.takenAt ? formatDay(pass.takenAt, timeZone) : stored.job.startsOn,
        })),
      ),
    );
  return stored.instruments.flatMap((instrument) => {
    const mine = uses.filter((use) => use.instrumentId === instrument.id);
    const firstDay = mine.map((use) => use.day).sort()[0];
    if (!firstDay) return [];
    const held = calibrationOn(instrument.calibrations, firstDay);
    const overrides = mine.filter((use) => use.overrideReason);
    return {
      number: instrument.number,
      name: instrument.name,
      resolution:
        instrument.resolution && `${formatDecimal(instrument.resolution)} ${instrument.resolutionUnit ?? ''}`.trim(),
      certificate: held?.certificate ?? null,
      calibrated: held?.calibratedOn ?? null,
      due: held?.dueOn ?? null,
      uncertainty: held && uncertaintyWords(held),
      override:
        overrides
          .map(
            (use) =>
              `test ${use.position}: used after its due date, allowed by ${use.overrideBy}: ${use.overrideReason}`,
          )
          .join('; ') || null,
    };
  });
}

function uncertaintyWords(held: CalibrationFacts): string | null {
  if (!held.expandedUncertainty) return null;
  const factor = held.coverageFactor ? `, k = ${formatDecimal(held.coverageFactor)}` : '';
  return `U = ${formatDecimal(held.expandedUncertainty)} ${held.uncertaintyUnit ?? ''}${factor}`;
}

/** Only acts that were done print as done: handing in has its time, issuing has its signature, the customer's place is empty. */
function signatures({ inspector, reviewer, organisation }: ReportInput): SignatureBlock[] {
  const block = (role: SignatureBlock['role'], done: Partial<SignatureBlock>): SignatureBlock => ({
    role,
    roleWords: roleWords[role],
    name: '',
    function: null,
    company: role === 'customer' ? null : organisation.name,
    signedAt: null,
    outcome: null,
    reason: null,
    typed: null,
    strokes: null,
    ...done,
  });
  return [
    block('inspector', {
      name: inspector?.name ?? '',
      signedAt: inspector?.at ?? null,
      outcome: inspector?.at ? signedOutcomeWords['handed-in']! : null,
    }),
    block(
      'reviewer',
      reviewer
        ? {
            name: reviewer.name,
            function: reviewer.function,
            signedAt: reviewer.at,
            outcome: signedOutcomeWords.checked!,
            typed: reviewer.name,
          }
        : {},
    ),
    block('customer', {}),
  ];
}
