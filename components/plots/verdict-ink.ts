import type { Ink } from '@/components/plots/drawing';
import type { Verdict } from '@/lib/sheet/types';

/** What a line of a plan can be: a verdict, or the reason why there is none. */
export type MarkKind = Verdict | 'disturbed' | 'not-measured' | 'left-out';

/** Blue and red oxide are the scraper's two marking colours; brass waits for somebody. Colour only repeats what shape and word say. */
export const MARK_INK: Record<MarkKind, { ink: Ink; wash: Ink }> = {
  'within-tolerance': { ink: 'blue', wash: 'blue-wash' },
  'out-of-tolerance': { ink: 'oxide', wash: 'oxide-wash' },
  undecided: { ink: 'brass', wash: 'brass-wash' },
  disturbed: { ink: 'brass', wash: 'brass-wash' },
  'for-information': { ink: 'ink', wash: 'hair' },
  'not-measured': { ink: 'ink2', wash: 'hair' },
  'left-out': { ink: 'ink2', wash: 'hair' },
};
