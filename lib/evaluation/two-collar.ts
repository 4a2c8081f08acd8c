import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { positiveDecimal } from './decimal-text';

export const twoCollarInput = z.strictObject({
  method: z.literal('two-collar'),
  D1: positiveDecimal,
  D2: positiveDecimal,
  distance: positiveDecimal,
});

export const TAPER_DIRECTIONS = { '1': 'larger-near-headstock', '0': 'none', '-1': 'larger-far-end' } as const;

export function taperDirection(taper: Fraction) {
  return TAPER_DIRECTIONS[String(taper.sign()) as keyof typeof TAPER_DIRECTIONS];
}

/**
 * Two-collar cutting test: parallelism of the spindle axis to the longitudinal motion, shown on a turned workpiece.
 *
 * slope = 10⁶(D1 − D2)/(2L), + = the free end leans toward the tool; deviation = 1000(D1 − D2)/2 over the distance.
 *
 * @param D1 diameter near the headstock, mm; @param D2 far collar, mm; @param distance collar to collar, mm
 * @returns slope µm/m, diameterDifference µm, direction, deviation µm (signed)
 * @throws EvaluationError a diameter or distance not above zero
 * @example D1 30.012, D2 30.007, L 100 → slope 25 µm/m, deviation 2.5 µm
 * Source: common practice; test after ISO 13041-6:2009 (from memory).
 */
export function twoCollar(input: z.output<typeof twoCollarInput>) {
  const difference = Fraction.from(input.D1).minus(Fraction.from(input.D2)).times(Fraction.of(1000));
  const half = difference.times(Fraction.of(1, 2));
  return {
    method: 'two-collar' as const,
    deviation: half.toText(),
    judgedBy: 'half the difference of the diameters over the distance',
    signed: true as const,
    slope: half.times(Fraction.of(1000)).dividedBy(Fraction.from(input.distance)).toText(),
    diameterDifference: difference.toText(),
    direction: taperDirection(difference),
  };
}
