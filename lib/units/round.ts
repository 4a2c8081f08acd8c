import { divideHalfEven, Fraction, placesToText, splitDecimal } from './fraction';

export const ROUNDING_RULES = ['half-even', 'half-away-from-zero'] as const;
export type RoundingRule = (typeof ROUNDING_RULES)[number];

/**
 * Nearest multiple of the resolution, with exactly as many decimals as the resolution is written with.
 *
 * Ties: `half-even` takes the even multiple, `half-away-from-zero` the larger amount (ISO 80000-1 Annex B, rules A
 * and B, from memory). Rounds once, never minus zero.
 * @param value decimal string
 * @param resolution decimal string > 0, same unit
 * @throws RangeError where the resolution is not above zero
 * @example round('0.0125', '0.001', 'half-even') === '0.012'; round('2.25', '0.5') === '2.0'
 */
export function round(value: string, resolution: string, rule: RoundingRule = 'half-even'): string {
  const step = splitDecimal(resolution);
  if (step.digits <= 0n) throw new RangeError('the resolution must be above zero');
  const { n, d } = Fraction.from(value).dividedBy(Fraction.from(resolution));
  return placesToText(nearest(n, d, rule) * step.digits, step.places, true);
}

/** n/d to the nearest whole number, d > 0. */
export function nearest(n: bigint, d: bigint, rule: RoundingRule): bigint {
  if (rule === 'half-even') return divideHalfEven(n, d);
  const size = ((n < 0n ? -n : n) * 2n + d) / (2n * d);
  return n < 0n ? -size : size;
}

/** A decimal string with a fixed number of decimals. */
export function roundToDecimals(value: string, decimals: number, rule: RoundingRule = 'half-even'): string {
  return round(value, placesToText(1n, decimals), rule);
}

export type DisplayInput = {
  value: string;
  resolution: string;
  rule?: RoundingRule;
  /** The value may lie between −limit and +limit. */
  limit?: string;
  /** Bounds of the signed value, for one-sided tests (0 ≤ value ≤ T: lower '0', upper T). */
  lower?: string;
  upper?: string;
};

/**
 * The figure as shown: rounded to the resolution, with as many more digits as it takes to show that a limit is
 * passed, because the verdict uses the unrounded value.
 * @returns text, and how many digits were added (0: none)
 * @example displayRounded({ value: '5.04', resolution: '1', limit: '5' }) → { text: '5.04', extraDigits: 2 }
 */
export function displayRounded(input: DisplayInput): { text: string; extraDigits: number } {
  const { value, resolution, rule = 'half-even', limit } = input;
  const upper = input.upper ?? limit;
  const lower = input.lower ?? (limit === undefined ? undefined : Fraction.from(limit).negated().toText());
  const text = round(value, resolution, rule);
  const hides = (shown: string) =>
    (upper !== undefined && exceeds(value, upper) && !exceeds(shown, upper)) ||
    (lower !== undefined && exceeds(lower, value) && !exceeds(lower, shown));
  if (!hides(text)) return { text, extraDigits: 0 };
  const decimals = splitDecimal(resolution).places;
  for (let extraDigits = 1; ; extraDigits++) {
    const finer = roundToDecimals(value, decimals + extraDigits, rule);
    if (!hides(finer)) return { text: finer, extraDigits };
  }
}

function exceeds(a: string, b: string): boolean {
  return Fraction.from(a).compare(Fraction.from(b)) > 0;
}
