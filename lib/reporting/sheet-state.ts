import type { Verdict } from '@/lib/sheet/types';
import type { StoredPass, StoredSheet } from './stored-job';

export type SheetStateName = 'left-out' | 'not-measured' | 'measuring' | 'found' | 'left';

export interface SheetState<P extends StoredPass = StoredPass> {
  state: SheetStateName;
  asFound: P | null;
  /** The newest set as left that is complete: the one that counts. */
  asLeft: P | null;
  /** As left, or as found while there is nothing newer. */
  final: P | null;
  /** Verdict of the final set; null while there is none, and for a test left out. */
  verdict: Verdict | null;
  /** As left is declared to be as found. */
  linked: boolean;
}

const complete = <P extends StoredPass>(pass: P | undefined): P | null =>
  pass?.result?.state === 'complete' ? pass : null;

/** Where a sheet stands, out of its sets of readings (oldest first). A later, incomplete set does not hide an earlier complete one. */
export function sheetState<P extends StoredPass>(
  sheet: Pick<StoredSheet, 'leftOutReason'> & { passes: P[] },
): SheetState<P> {
  const { passes } = sheet;
  const asFound = complete(passes.find((pass) => pass.kind === 'as-found'));
  const asLeft = passes.filter((pass) => pass.kind === 'as-left' && complete(pass)).at(-1) ?? null;
  const final = asLeft ?? asFound;
  const begun = passes.some((pass) => pass.takenAt !== null || pass.linkedTo !== null);
  const state = sheet.leftOutReason
    ? 'left-out'
    : asLeft
      ? 'left'
      : asFound
        ? 'found'
        : begun
          ? 'measuring'
          : 'not-measured';
  return {
    state,
    asFound,
    asLeft,
    final,
    verdict: sheet.leftOutReason ? null : (final?.result?.verdict ?? null),
    linked: asLeft !== null && asLeft.linkedTo !== null,
  };
}
