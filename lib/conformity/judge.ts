import { z } from 'zod';
import { decimalText, positiveDecimal } from '@/lib/evaluation/decimal-text';
import { refuse } from '@/lib/evaluation/evaluation-error';
import { type Dec, plain } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import { normalDistribution } from './normal-distribution';

export const PERMISSIBLE_DIRECTIONS = [
  'either',
  'concave-only',
  'convex-only',
  'rising-to-free-end',
  'toward-tool',
  'tailstock-high',
] as const;
export type PermissibleDirection = (typeof PERMISSIBLE_DIRECTIONS)[number];

export const conformityInput = z.strictObject({
  method: z.literal('conformity'),
  deviation: decimalText,
  signed: z.boolean(),
  tolerance: positiveDecimal,
  direction: z.enum(PERMISSIBLE_DIRECTIONS),
  rule: z.enum(['simple', 'guarded']),
  standardUncertainty: positiveDecimal.optional(),
  guard: z.enum(['1.65u', 'U']).optional(),
});

export type ConformityInput = z.output<typeof conformityInput>;
export type Verdict = 'within-tolerance' | 'out-of-tolerance' | 'undecided';
export type Judgement = { verdict: Verdict; limit: string; margin: string; probability?: string };

/** Sign s of a one-sided direction: 0 ≤ s·e ≤ T is permitted; 0: both sides, |e| ≤ T. */
export function directionSign(direction: PermissibleDirection): -1 | 0 | 1 {
  return direction === 'either' ? 0 : direction === 'convex-only' ? -1 : 1;
}

/**
 * Verdict on a deviation e against a tolerance T.
 *
 * y = e (not signed), |e| (either side), s·e (one-sided). g = 0 (`simple`), 1.65·u or U = 2·u (`guarded`).
 * within tolerance: y ≤ T − g; out of tolerance: y > T + g, or one-sided y < 0 (the 0 side is never guarded); between:
 * undecided. limit = T − g, margin = limit − y, one-sided the smaller of that and y.
 * Probability of conformity with u: Φ((T−y)/u); either side Φ((T−e)/u) − Φ((−T−e)/u); one-sided Φ((T−y)/u) − Φ(−y/u).
 * The unrounded figures are compared exactly.
 *
 * @param deviation, tolerance, standardUncertainty in one unit (µm or µm/m)
 * @throws EvaluationError a figure that cannot be negative below zero or judged one-sided; `guarded` without u
 * @example y 18, T 20, u 1 → probability 0.97725; guarded with U = 2: within tolerance
 * Source: ISO 14253-1 (guard bands) and JCGM 106:2012 (probability), from memory.
 */
export function judge(input: Omit<ConformityInput, 'method'>): Judgement {
  const { signed, direction, rule, standardUncertainty: u, guard = '1.65u' } = input;
  const e = Fraction.from(input.deviation);
  const T = Fraction.from(input.tolerance);
  if (!signed && e.sign() < 0) refuse(['deviation'], 'a figure without sign cannot be below zero');
  if (!signed && direction !== 'either') refuse(['direction'], 'a figure without sign is judged to either side');
  if (rule === 'guarded' && u === undefined) refuse(['standardUncertainty'], 'is needed for guarded acceptance');
  const s = directionSign(direction);
  const y = s === 0 ? e.abs() : s > 0 ? e : e.negated();
  const g = rule === 'simple' ? Fraction.zero : Fraction.from(u!).times(Fraction.from(guard === 'U' ? '2' : '1.65'));
  const limit = T.minus(g);
  const room = limit.minus(y);
  return {
    verdict: verdictOf(y, T, g, s !== 0),
    limit: limit.toText(),
    margin: (s === 0 ? room : Fraction.min([room, y])).toText(),
    ...(u !== undefined && { probability: plain(probability(signed, s, e, y, T, Fraction.from(u))) }),
  };
}

function verdictOf(y: Fraction, T: Fraction, g: Fraction, oneSided: boolean): Verdict {
  if (oneSided && y.sign() < 0) return 'out-of-tolerance';
  if (y.compare(T.minus(g)) <= 0) return 'within-tolerance';
  return y.compare(T.plus(g)) > 0 ? 'out-of-tolerance' : 'undecided';
}

function probability(signed: boolean, s: number, e: Fraction, y: Fraction, T: Fraction, u: Fraction): Dec {
  const below = (bound: Fraction) => normalDistribution(bound.dividedBy(u).toDec());
  if (!signed) return below(T.minus(y));
  if (s === 0) return below(T.minus(e)).minus(below(T.negated().minus(e)));
  return below(T.minus(y)).minus(below(y.negated()));
}

/** The verdict as an answer of `evaluate`. */
export function conformity(input: ConformityInput) {
  return { method: 'conformity' as const, ...judge(input) };
}
