import type { Verdict } from '@/lib/sheet/types';
import type { CheckCounts, Counts } from './report-model';
import type { SheetState } from './sheet-state';

/** planned = within + out + undecided + for information + left out + not measured; judged = within + out + undecided. */
export function countVerdicts(states: SheetState[], which: 'asFound' | 'asLeft'): Counts {
  const verdicts: (Verdict | 'left-out' | 'not-measured')[] = states.map((state) => {
    if (state.state === 'left-out') return 'left-out';
    return state[which]?.result?.verdict ?? 'not-measured';
  });
  const count = (wanted: (typeof verdicts)[number]) => verdicts.filter((verdict) => verdict === wanted).length;
  const within = count('within-tolerance');
  const out = count('out-of-tolerance');
  const undecided = count('undecided');
  return {
    planned: states.length,
    within,
    out,
    undecided,
    forInformation: count('for-information'),
    leftOut: count('left-out'),
    notMeasured: count('not-measured'),
    judged: within + out + undecided,
  };
}

/** Function checks by how they stand in the end; null where none is planned. An incomplete one is not done. */
export function countChecks(states: SheetState[]): CheckCounts | null {
  if (states.length === 0) return null;
  const of = (verdict: Verdict) => states.filter((state) => state.verdict === verdict).length;
  const leftOut = states.filter(({ state }) => state === 'left-out').length;
  const [inOrder, notInOrder] = [of('within-tolerance'), of('out-of-tolerance')];
  const notDone = states.length - leftOut - inOrder - notInOrder;
  return { planned: states.length, inOrder, notInOrder, notDone, leftOut };
}
