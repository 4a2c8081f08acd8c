import { definitionOf } from '@/lib/planning/definition-of';
import { isSettled } from '@/lib/planning/is-settled';
import { calibrationOn, isOverdue } from '@/lib/schemas/instrument-state';
import { shownUnit, withUnit } from '@/lib/sheet/shown-unit';
import { Dec } from '@/lib/units/decimal';
import { checkedItems } from './checked-items';
import { formatDay } from './format-time';
import { sheetState } from './sheet-state';
import type { StoredInstrument, StoredJob, StoredPass, StoredSheet } from './stored-job';

export interface CheckFinding {
  kind:
    | 'no-plan'
    | 'not-measured'
    | 'no-as-left'
    | 'out-of-tolerance'
    | 'undecided'
    | 'no-instrument'
    | 'instrument-overdue'
    | 'instrument-overdue-allowed'
    | 'no-temperature'
    | 'temperature-far-off'
    | 'tolerance-unconfirmed'
    | 'no-conditions';
  /** blocks: the report cannot be issued; confirm: the reviewer says that it is seen; note: prints, nothing to do. */
  weight: 'blocks' | 'confirm' | 'note';
  sheetId: string | null;
  position: number | null;
  text: string;
}

/** More than this off 20 °C gets a remark: common practice. */
const farOffKelvin = 5;

/** What the reviewer must see before a report goes out, in working order. Pure: the same findings on the page and in the route. */
export function checkFindings(stored: StoredJob, timeZone: string): CheckFinding[] {
  if (stored.sheets.length === 0) {
    return [{ kind: 'no-plan', weight: 'blocks', sheetId: null, position: null, text: 'The plan has not been made.' }];
  }
  const findings = stored.sheets.flatMap((sheet) => sheetFindings(sheet, stored.instruments, timeZone));
  return [...findings, ...conditionFindings(stored)];
}

function sheetFindings(sheet: StoredSheet, instruments: StoredInstrument[], timeZone: string): CheckFinding[] {
  const state = sheetState(sheet);
  const found: CheckFinding[] = [];
  const add = (kind: CheckFinding['kind'], weight: CheckFinding['weight'], text: string) =>
    found.push({ kind, weight, sheetId: sheet.id, position: sheet.position, text });
  if (state.state === 'left-out') return [];
  const check = isCheck(sheet);
  if (!state.final) {
    const words = check ? 'Not every item is answered. Answer them' : 'Not measured. Measure it';
    add('not-measured', 'blocks', `${words}, or leave it out with a reason.`);
    return found;
  }
  if (!state.asLeft)
    add(
      'no-as-left',
      'blocks',
      check
        ? 'Not checked as left. Check again, or declare as left = as found.'
        : 'No readings as left. Measure again, or declare as left = as found.',
    );
  if (check) {
    if (state.verdict === 'out-of-tolerance') add('out-of-tolerance', 'confirm', notInOrderWords(sheet, state.final));
    return found;
  }
  const { result } = state.final;
  const figure = result ? withUnit(result.displayedMm, shownUnit(result.outcome.displayed)) : '';
  if (state.verdict === 'out-of-tolerance') add('out-of-tolerance', 'confirm', `Out of tolerance: ${figure}.`);
  if (state.verdict === 'undecided') add('undecided', 'confirm', `Undecided: ${figure}.`);
  for (const pass of judgedPasses(sheet)) found.push(...instrumentFindings(sheet, pass, instruments, timeZone));
  return found;
}

const layoutOf = (sheet: StoredSheet) => definitionOf(sheet.definition, sheet.ownDefinition).layout;

const isCheck = (sheet: StoredSheet): boolean => layoutOf(sheet).kind === 'check-list';

/** A check that is not in order names its items; one that stands for another set reads that one's. */
function notInOrderWords(sheet: StoredSheet, final: StoredPass): string {
  const layout = layoutOf(sheet);
  const read = sheet.passes.find(({ id }) => id === final.linkedTo) ?? final;
  const items = layout.kind === 'check-list' ? checkedItems(layout, read.cells) : [];
  const bad = items.filter(({ inOrder }) => inOrder === false).map(({ question }) => question);
  return `Not in order: ${bad.join('; ')}`;
}

const judgedPasses = (sheet: StoredSheet) =>
  sheet.passes.filter((pass) => pass.linkedTo === null && pass.kind !== 'adjusting' && pass.result);

const passWords: Record<StoredPass['kind'], string> = {
  'as-found': 'As found',
  adjusting: 'Adjusting',
  'as-left': 'As left',
};

function instrumentFindings(
  sheet: StoredSheet,
  pass: StoredPass,
  instruments: StoredInstrument[],
  timeZone: string,
): CheckFinding[] {
  const at = { sheetId: sheet.id, position: sheet.position };
  const when = passWords[pass.kind];
  if (pass.instruments.length === 0) {
    return [{ kind: 'no-instrument', weight: 'blocks', ...at, text: `${when}: no instrument is named.` }];
  }
  const measuredOn = pass.takenAt ? formatDay(pass.takenAt, timeZone) : '';
  return pass.instruments.flatMap((used): CheckFinding[] => {
    const instrument = instruments.find((candidate) => candidate.id === used.instrumentId);
    if (!instrument) return [];
    const held = calibrationOn(instrument.calibrations, measuredOn);
    if (!isOverdue(held?.dueOn ?? null, measuredOn)) return [];
    const since = `${instrument.number} was due on ${held?.dueOn ?? 'no date (no certificate)'}, used on ${measuredOn}`;
    return used.overrideReason
      ? [
          {
            kind: 'instrument-overdue-allowed',
            weight: 'note',
            ...at,
            text: `${when}: ${since}; allowed by ${used.overrideBy}: ${used.overrideReason}`,
          },
        ]
      : [
          {
            kind: 'instrument-overdue',
            weight: 'blocks',
            ...at,
            text: `${when}: ${since}. Say why it may stand, or measure again.`,
          },
        ];
  });
}

function conditionFindings(stored: StoredJob): CheckFinding[] {
  const found: CheckFinding[] = [];
  const add = (kind: CheckFinding['kind'], weight: CheckFinding['weight'], text: string) =>
    found.push({ kind, weight, sheetId: null, position: null, text });
  const airs = stored.temperatures.map((row) => row.air).filter((air) => air !== null);
  if (airs.length === 0) add('no-temperature', 'confirm', 'No air temperature is recorded.');
  else if (airs.some((air) => new Dec(air).minus(20).abs().gt(farOffKelvin))) {
    add('temperature-far-off', 'confirm', `The air was more than ${farOffKelvin} K away from 20 °C.`);
  }
  if (!stored.job.conditions.warmUp) add('no-conditions', 'confirm', 'The warm-up is not described.');
  const unconfirmed = stored.sheets.filter(
    (sheet) =>
      !sheet.leftOutReason && sheet.tolerance?.provenance.kind === 'from-memory' && !isSettled(sheet.tolerance),
  ).length;
  if (unconfirmed > 0) {
    add(
      'tolerance-unconfirmed',
      'note',
      unconfirmed === 1
        ? '1 tolerance is from memory, to be confirmed against your own copy; it says so on the report.'
        : `${unconfirmed} tolerances are from memory, to be confirmed against your own copy; each says so on the report.`,
    );
  }
  return found;
}
