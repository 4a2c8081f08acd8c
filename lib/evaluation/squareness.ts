import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { decimalText, positiveDecimal, tooFew } from './decimal-text';
import { refuse } from './evaluation-error';
import { fitLine, slopeUmPerM } from './line';
import { refuseRepeats, seriesFromTexts } from './series';

const arm = z.strictObject({
  slope: decimalText.optional(),
  points: z
    .array(z.strictObject({ position: decimalText, reading: decimalText }))
    .min(2, tooFew(2, 'points'))
    .optional(),
});
const setUp = z.strictObject({ referenceArm: arm.optional(), measuredArm: arm });

export const squarenessInput = z.strictObject({
  method: z.literal('squareness'),
  first: setUp,
  second: setUp.optional(),
  squareError: decimalText.optional(),
  measuringLength: positiveDecimal,
});

/**
 * Squareness of two motions against a square, the square turned by 180° about its measured arm or not.
 *
 * s = slope of the reference arm + slope of the measured arm (least squares of their points, or given). With the
 * square turned: squareness = (s1 + s2)/2, the square's own part (s1 − s2)/2; without: squareness = s1 − squareError.
 * deviation = squareness · measuringLength/1000. Sign by the right-hand rule: + = the angle between the + directions
 * of the two axes is more than 90°.
 *
 * Plungers: against the arm along the first axis in the second axis' minus direction, against the arm along the second
 * axis in the first axis' minus direction; the other way round: slope with the opposite sign.
 *
 * @param first, second referenceArm (default slope 0) and measuredArm: { slope µm/m } or { points: mm, µm; at least 2 }
 * @param squareError µm/m, what the square adds to s1 (90° minus its angle); only without `second`
 * @param measuringLength mm
 * @throws EvaluationError an arm with both or neither of slope and points, a position twice, squareError with second
 * @example s1 92, s2 58 over 70 mm → squareness 75 µm/m, square 17 µm/m, deviation 5.25 µm
 * Source: common practice (reversal); sign after ISO 230-1:2012 (from memory).
 */
export function squareness(input: z.output<typeof squarenessInput>) {
  const { first, second, squareError, measuringLength } = input;
  if (second && squareError !== undefined) {
    refuse(['squareError'], 'is found from the turned square; leave it out where a second set-up is given');
  }
  const s1 = sumOfArms(first, 'first');
  const s2 = second ? sumOfArms(second, 'second') : null;
  const half = Fraction.of(1, 2);
  const machine = s2 ? s1.plus(s2).times(half) : s1.minus(Fraction.from(squareError ?? '0'));
  return {
    method: 'squareness' as const,
    deviation: machine.times(Fraction.from(measuringLength)).dividedBy(Fraction.of(1000)).toText(),
    judgedBy: 'squareness over the measuring length, more than 90° positive',
    signed: true as const,
    s1: s1.toText(),
    ...(s2 && { s2: s2.toText() }),
    squareness: machine.toText(),
    ...(s2 && { squareError: s1.minus(s2).times(half).toText() }),
  };
}

function sumOfArms({ referenceArm, measuredArm }: z.output<typeof setUp>, name: string): Fraction {
  const measured = slopeOf(measuredArm, [name, 'measuredArm']);
  return referenceArm ? slopeOf(referenceArm, [name, 'referenceArm']).plus(measured) : measured;
}

function slopeOf({ slope, points }: z.output<typeof arm>, path: PropertyKey[]): Fraction {
  if ((slope === undefined) === (points === undefined)) return refuse(path, 'either slope or points is needed');
  if (slope !== undefined) return Fraction.from(slope);
  const x = seriesFromTexts(points!.map((p) => p.position));
  refuseRepeats(x, (i) => [...path, 'points', i, 'position'], 'position');
  return slopeUmPerM(fitLine(x, seriesFromTexts(points!.map((p) => p.reading)), 'least-squares'));
}
