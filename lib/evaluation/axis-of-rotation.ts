import { z } from 'zod';
import { plain } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import { circleDirections } from './circle-angles';
import { decimals, decimalText, tooFew } from './decimal-text';
import { refuse } from './evaluation-error';
import { harmonicFit, polar, residualRange } from './harmonic-fit';
import { largestOf, seriesFromTexts, smallestOf } from './series';
import { type Direction, directionOf } from './trigonometry';

export const axisOfRotationInput = z.strictObject({
  method: z.literal('axis-of-rotation'),
  turns: z.array(decimals(4, 'readings a turn')).min(2, tooFew(2, 'turns')),
  angles: z.array(decimalText).optional(),
  direction: z.enum(['radial', 'axial', 'tilt']),
  judge: z.enum(['total', 'synchronous', 'asynchronous']).optional(),
});

type Input = z.output<typeof axisOfRotationInput>;

/**
 * Error motion of an axis of rotation from several turns.
 *
 * m(k) mean over the turns, fit = c + a·cos θ + b·sin θ on m. Radial and tilt: synchronous = range(m − fit), total = range
 * over all of (r − fit), eccentricity = √(a² + b²). Axial keeps the once-per-turn part: synchronous = range(m), total =
 * range(r); apart from it fundamental = 2√(a² + b²), residualSynchronous = range(m − fit). All: asynchronous = largest
 * spread over the turns at one angle.
 *
 * @param turns readings µm (tilt: µm/m), at least 2 turns of the same number of readings, at least 4
 * @param angles ° (default 360k/K), all different modulo 360
 * @param judge which figure is judged, default total
 * @throws EvaluationError turns of different length, an angle twice
 * @example turns 0, 1, 0, −1 and 0, 1, 0, −1 radial → all zero, eccentricity 1
 * Source: ISO 230-7 (terms, from memory); arithmetic common practice.
 */
export function axisOfRotation(input: Input) {
  const { turns, direction, judge = 'total' } = input;
  const directions = directionsOf(input);
  const count = directions.length;
  const { values: all, unit } = seriesFromTexts(turns.flat());
  const columns = directions.map((_, k) => turns.map((_, i) => all[i * count + k]!));
  const means = { values: columns.map((column) => column.reduce((a, b) => a + b)), unit: unit * BigInt(turns.length) };
  const fit = harmonicFit(directions, means, 1) ?? refuse(['angles'], 'the angles stand too close together');
  const [, a, b] = fit.coefficients;
  const { amplitude } = polar({ a: a!.toDec(), b: b!.toDec() });
  const residual = plain(residualRange(fit, directions, means, 1).toDec());
  const scaled = { values: all.map((value) => value * BigInt(turns.length)), unit: means.unit };
  const repeated = turns.flatMap(() => directions);
  const asynchronous = Fraction.of(largestOf(columns.map((c) => largestOf(c) - smallestOf(c))), unit).toText();
  const rangeOf = (values: readonly bigint[], over: bigint) =>
    Fraction.of(largestOf(values) - smallestOf(values), over).toText();
  const figures =
    direction === 'axial'
      ? { synchronous: rangeOf(means.values, means.unit), total: rangeOf(all, unit) }
      : { synchronous: residual, total: plain(residualRange(fit, repeated, scaled, 1).toDec()) };
  return {
    method: 'axis-of-rotation' as const,
    deviation: { ...figures, asynchronous }[judge],
    judgedBy: `${judge} ${direction} error motion`,
    signed: false as const,
    ...figures,
    asynchronous,
    ...(direction === 'axial'
      ? { fundamental: plain(amplitude.times(2)), residualSynchronous: residual }
      : { eccentricity: plain(amplitude) }),
  };
}

function directionsOf({ turns, angles }: Input): Direction[] {
  const count = turns[0]!.length;
  turns.forEach((turn, i) => {
    if (turn.length !== count) refuse(['turns', i], `${turn.length} readings where the first turn has ${count}`);
  });
  if (!angles) return turns[0]!.map((_, k) => directionOf(Fraction.of(360 * k, count)));
  if (angles.length !== count) refuse(['angles'], `${angles.length} angles for ${count} readings a turn`);
  return circleDirections(angles, (i) => ['angles', i]);
}
