import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { decimalText } from './decimal-text';
import { directionOf, trigFraction } from './trigonometry';

/** Readings of one sweep round a surface, at all four quarters. */
export const sweepReadings = z.strictObject({
  '0': decimalText,
  '90': decimalText,
  '180': decimalText,
  '270': decimalText,
});
export const sweptSurface = z.enum(['outside', 'bore']);

type Surface = z.output<typeof sweptSurface>;
export type SweptCentre = { ex: Fraction; ey: Fraction; closure: Fraction };

/** +1 outside, −1 bore: a bore pushes the plunger in on the other side. */
export function surfaceSign(surface: Surface): Fraction {
  return Fraction.of(surface === 'outside' ? 1 : -1);
}

/**
 * Place of the swept axis as seen from the sweeping one, from readings at 0, 90, 180, 270°.
 *
 * ex = q(r0 − r180)/2 − s·cos(up), ey = q(r90 − r270)/2 − s·sin(up), q = +1 outside, −1 bore;
 * closure = (r0 + r180) − (r90 + r270), zero on a round, straight, stiff set-up.
 * @param sag true droop s of the bracket, µm ≥ 0 (half of the sag reading on a stiff bar)
 * @param up angle at which the indicator stands on top, °
 * Source: common practice (four-point sweep with sag correction).
 */
export function sweptCentre(
  readings: z.output<typeof sweepReadings>,
  surface: Surface,
  sag: string,
  up: string,
): SweptCentre {
  const [r0, r90, r180, r270] = (['0', '90', '180', '270'] as const).map((angle) => Fraction.from(readings[angle]));
  const half = surfaceSign(surface).times(Fraction.of(1, 2));
  const top = directionOf(Fraction.from(up));
  const droop = Fraction.from(sag);
  return {
    ex: r0!
      .minus(r180!)
      .times(half)
      .minus(droop.times(trigFraction(top.cos))),
    ey: r90!
      .minus(r270!)
      .times(half)
      .minus(droop.times(trigFraction(top.sin))),
    closure: r0!.plus(r180!).minus(r90!.plus(r270!)),
  };
}
