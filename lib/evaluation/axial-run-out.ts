import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { decimals, label, tooFew } from './decimal-text';

export const axialRunOutInput = z.strictObject({
  method: z.literal('axial-run-out'),
  circles: z
    .array(z.strictObject({ name: label.optional(), readings: decimals(2, 'readings') }))
    .min(1, tooFew(1, 'circle')),
});

/**
 * Axial or face run-out on one or more circles: max − min of each, the largest is judged.
 * @param circles readings µm of one turn each, at least 2
 * @returns perCircle µm in the order given, largest = deviation µm
 * @throws EvaluationError no circle, fewer than 2 readings of one
 * @example readings 0, 2, 1 → 2 µm
 * Source: ISO 230-1:2012 (from memory).
 */
export function axialRunOut(input: z.output<typeof axialRunOutInput>) {
  const ranges = input.circles.map(({ readings }) => Fraction.range(readings.map(Fraction.from)));
  const largest = Fraction.max(ranges).toText();
  return {
    method: 'axial-run-out' as const,
    deviation: largest,
    judgedBy: 'largest total reading of the circles',
    signed: false as const,
    perCircle: ranges.map((range) => range.toText()),
    largest,
  };
}
