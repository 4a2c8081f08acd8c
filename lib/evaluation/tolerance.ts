import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { nonNegativeDecimal, positiveDecimal } from './decimal-text';

export const toleranceInput = z.strictObject({
  method: z.literal('tolerance'),
  base: positiveDecimal,
  baseLength: positiveDecimal,
  length: positiveDecimal,
  minimum: nonNegativeDecimal.optional(),
  maximum: positiveDecimal.optional(),
});

/**
 * Tolerance for another measuring length: T(L) = min(max(T0·L/L0, Tmin), Tmax). Only for tests given per length, never
 * for run-out, indexing, or an offset at a fixed place.
 * @param base, minimum (0), maximum µm; baseLength, length mm
 * @throws EvaluationError a base, length, base length or maximum not above zero, a minimum below zero
 * @example base 15 over 300, length 240, minimum 5 → 12 µm
 * Source: ISO 230-1:2012 (from memory); floor of 5 µm for turning machines from memory, given by the caller.
 */
export function tolerance(input: z.output<typeof toleranceInput>) {
  const { base, baseLength, length, minimum = '0', maximum } = input;
  const scaled = Fraction.from(base).times(Fraction.from(length)).dividedBy(Fraction.from(baseLength));
  const raised = Fraction.max([scaled, Fraction.from(minimum)]);
  const capped = maximum === undefined ? raised : Fraction.min([raised, Fraction.from(maximum)]);
  return { method: 'tolerance' as const, tolerance: capped.toText() };
}
