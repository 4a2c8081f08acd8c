import type { PlannedSheet } from '@/standards/types';

/** What a test took so far: median over its sets of readings, set-up counted. */
export interface PastDuration {
  minutes: number;
  /** Sets of readings that it is the median of. */
  passes: number;
}

/** A median of fewer says little. */
export const FEWEST_PASSES = 3;

export interface Estimate {
  minutes: number;
  /** Sets of readings of the organisation's own past; null: our own estimate for the test. */
  fromPasses: number | null;
}

const pastKey = ({ code, id }: { code: string; id: string }): string => `${code} ${id}`;

/** By code and id, editions of a code together; whole minutes, upwards. */
export const pastDurations = (
  durations: readonly (PastDuration & { code: string; id: string })[],
): ReadonlyMap<string, PastDuration> =>
  new Map(durations.map((one) => [pastKey(one), { minutes: Math.max(1, Math.ceil(one.minutes)), passes: one.passes }]));

/** Minutes that a sheet will take: from the organisation's past where it is long enough, else the estimate of the definition. */
export function estimateOf(
  sheet: Pick<PlannedSheet, 'definition' | 'minutes'>,
  past: ReadonlyMap<string, PastDuration>,
): Estimate {
  const own = past.get(pastKey(sheet.definition));
  if (own && own.passes >= FEWEST_PASSES) return { minutes: own.minutes, fromPasses: own.passes };
  return { minutes: sheet.minutes, fromPasses: null };
}

/** `45 min`, `3 h`, `3 h 20 min`; above an hour to the nearest 5 min, because nobody knows it better. */
export function minutesWords(minutes: number): string {
  if (minutes < 60) return `${minutes} min`;
  const rounded = Math.round(minutes / 5) * 5;
  const rest = rounded % 60;
  return `${Math.floor(rounded / 60)} h${rest === 0 ? '' : ` ${rest} min`}`;
}
