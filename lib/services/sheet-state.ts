import type { ResultRow } from '@/db/queries/results';
import type { SheetRow } from '@/db/queries/sheets';
import type { PassView } from '@/db/read-models/sheet-view';
import type { Verdict } from '@/lib/sheet/types';

export type SheetStateName = 'left-out' | 'not-measured' | 'measuring' | 'found' | 'left';

export interface SheetState {
  state: SheetStateName;
  asFound: ResultRow | null;
  /** The newest as-left result; the one that counts. */
  asLeft: ResultRow | null;
  /** As left, or as found while there is nothing newer. */
  final: ResultRow | null;
  verdict: Verdict | null;
  /** As left is declared to be as found. */
  linked: boolean;
}

const completed = (pass: PassView | undefined) => (pass?.result?.state === 'complete' ? pass.result : null);

/** Where a sheet stands, out of its sets of readings (oldest first). */
export function sheetState(sheet: Pick<SheetRow, 'leftOutReason'>, passes: PassView[]): SheetState {
  const asFound = completed(passes.find((pass) => pass.kind === 'as-found'));
  const lastLeft = passes.filter((pass) => pass.kind === 'as-left').at(-1);
  const asLeft = completed(lastLeft);
  const final = asLeft ?? asFound;
  const touched = passes.some((pass) => pass.takenAt !== null || pass.linkedTo !== null);
  const state: SheetStateName = sheet.leftOutReason
    ? 'left-out'
    : asLeft
      ? 'left'
      : asFound
        ? 'found'
        : touched
          ? 'measuring'
          : 'not-measured';
  return {
    state,
    asFound,
    asLeft,
    final,
    verdict: sheet.leftOutReason ? null : (final?.verdict ?? null),
    linked: lastLeft?.linkedTo !== null && lastLeft !== undefined,
  };
}
