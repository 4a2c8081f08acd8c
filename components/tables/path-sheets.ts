import { estimateOf, type PastDuration } from '@/lib/planning/estimate-minutes';
import { USUAL_MINUTES } from '@/lib/planning/plan-sheets';
import { passKindWords } from '@/lib/reporting/record-words';
import { verdictText } from '@/lib/reporting/result-text';
import { sheetState } from '@/lib/reporting/sheet-state';
import type { StoredSheet } from '@/lib/reporting/stored-job';
import { leftOutReasons } from '@/lib/schemas/job';
import { shownUnit, withUnit } from '@/lib/sheet/shown-unit';
import type { BoundComponent } from '@/standards/types';
import { workingStepTitle } from '@/standards/working-order';
import type { PathSheet } from './plan-path';

/** A sheet as it is stored; one that was planned before step, set-up and minutes were kept has none of the three. */
export interface PlannedLine extends StoredSheet {
  workingStep?: number | null;
  setUpTogether?: string | null;
  minutes?: number | null;
}

/**
 * Lines of the path out of the stored sheets, in working order. Pure.
 * @param past what tests took so far, for the time that is still needed
 */
export function pathSheets(sheets: PlannedLine[], past: ReadonlyMap<string, PastDuration> = new Map()): PathSheet[] {
  const next = nextSheet(sheets);
  return sheets.map((sheet) => ({
    id: sheet.id,
    position: sheet.position,
    title: sheet.title,
    component: componentIds(sheet.component, sheet.title),
    isNext: sheet.id === next?.id,
    step: typeof sheet.workingStep === 'number' ? workingStepTitle(sheet.workingStep) : null,
    setUp: sheet.setUpTogether ?? null,
    minutesLeft: waits(sheet)
      ? estimateOf({ definition: sheet.definition, minutes: sheet.minutes ?? USUAL_MINUTES }, past).minutes
      : 0,
    ...lineOf(sheet),
  }));
}

/** Minutes of all lines that wait for their readings as found. */
export const minutesLeft = (lines: readonly PathSheet[]): number =>
  lines.reduce((sum, line) => sum + line.minutesLeft, 0);

const waits = (sheet: StoredSheet): boolean => sheetState(sheet).state === 'not-measured';

/** The first sheet in working order that waits for readings; after these the first that has none as left. */
export function nextSheet(sheets: StoredSheet[]): StoredSheet | null {
  const inState = (...states: string[]) => sheets.find((sheet) => states.includes(sheetState(sheet).state));
  return inState('not-measured', 'measuring') ?? inState('found') ?? null;
}

function lineOf(sheet: StoredSheet): Pick<PathSheet, 'mark' | 'words' | 'result'> {
  const state = sheetState(sheet);
  if (sheet.leftOutReason)
    return { mark: 'left-out', result: sheet.leftOutText ?? leftOutReasons[sheet.leftOutReason] };
  if (state.state === 'measuring') {
    const newest = sheet.passes.filter(({ takenAt }) => takenAt !== null).at(-1);
    return { mark: 'not-measured', words: 'begun', result: newest ? passKindWords(newest) : '' };
  }
  const result = state.final?.result;
  if (!result) return { mark: 'not-measured', result: '' };
  const unit = shownUnit(result.outcome.displayed);
  const found = state.state === 'found' ? ', as found' : '';
  if (unit === 'items')
    return { mark: result.verdict, words: verdictText(result.verdict, unit), result: found.slice(2) };
  const shown = result.displayedMm.replace('-', '−');
  const figure = unit === 'mm' ? shown : withUnit(shown, unit);
  const words = result.outcome.directionWords;
  return {
    mark: result.verdict,
    result: `${words && words.length < 12 ? `${words} ` : ''}${figure}${found}`,
  };
}

/** `T1 · S1 · Z1`: the ids that the title does not name. */
export function componentIds(component: BoundComponent, title: string): string {
  const named = new Set(title.split(/[^A-Za-z0-9]+/));
  const { turret, axis, spindle, reference, tailstock, guideBush, toolChanger, rotary } = component;
  return [turret, axis, spindle, reference, tailstock, guideBush, toolChanger, rotary]
    .filter((id) => id !== undefined && !named.has(id))
    .join(' · ');
}
