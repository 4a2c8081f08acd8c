import { passKindWords } from '@/lib/reporting/record-words';
import { sheetState } from '@/lib/reporting/sheet-state';
import type { StoredSheet } from '@/lib/reporting/stored-job';
import { leftOutReasons } from '@/lib/schemas/job';
import type { BoundComponent } from '@/standards/types';
import type { PathSheet } from './plan-path';

/** Lines of the path out of the stored sheets, in working order. Pure. */
export function pathSheets(sheets: StoredSheet[]): PathSheet[] {
  const next = nextSheet(sheets);
  return sheets.map((sheet) => ({
    id: sheet.id,
    position: sheet.position,
    title: sheet.title,
    component: componentIds(sheet.component, sheet.title),
    isNext: sheet.id === next?.id,
    ...lineOf(sheet),
  }));
}

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
  const figure = result.displayedMm.replace('-', '−');
  const words = result.outcome.directionWords;
  const found = state.state === 'found' ? ', as found' : '';
  return {
    mark: result.verdict,
    result: `${words && words.length < 12 ? `${words} ` : ''}${figure}${found}`,
  };
}

/** `T1 · S1 · Z1`: the ids that the title does not name. */
export function componentIds(component: BoundComponent, title: string): string {
  const { turret, axis, spindle, reference, tailstock } = component;
  const named = new Set(title.split(/[^A-Za-z0-9]+/));
  return [turret, axis, spindle, reference, tailstock].filter((id) => id !== undefined && !named.has(id)).join(' · ');
}
