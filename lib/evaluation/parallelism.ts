import { z } from 'zod';
import { positiveDecimal } from './decimal-text';
import { localRange } from './local-range';
import { reversedMeans, reversedReadings } from './reversed-means';

export const parallelismInput = z.strictObject({
  method: z.literal('parallelism'),
  ...reversedReadings,
  judge: z.enum(['slope', 'range']).optional(),
  localLength: positiveDecimal.optional(),
});

/**
 * Parallelism of a motion to an axis, by a mandrel read at two (or more) angular positions, or to a face.
 *
 * m(z) = mean of the readings over the angles (+ sag of the mandrel); judged by `slope`: least-squares slope of m times
 * measuringLength/1000, signed, + = reading grows with z (the free end leans toward the plunger); by `range`: max − min
 * of m, never scaled.
 *
 * @param positions mm, any order, all different, at least 2
 * @param readings µm per angle °, one key or an even number of equally spaced keys, each over the same positions
 * @param measuringLength mm, default the span of the positions
 * @param sag µm per position: fall of the mandrel along the reading direction, added to m
 * @param localLength mm > 0: `local` is then the largest difference of two means no further apart than that
 * @throws EvaluationError see `reversedMeans`
 * @example L 300: 0° 0, 12; 180° 4, −2 → means 2, 5; deviation +3 µm
 * Source: ISO 230-1:2012 (from memory); reversal and slope common practice.
 */
export function parallelism(input: z.output<typeof parallelismInput>) {
  const { means, fitSlope, rise, difference, range, reversed } = reversedMeans(input);
  const bySlope = (input.judge ?? 'slope') === 'slope';
  return {
    method: 'parallelism' as const,
    deviation: (bySlope ? rise : range).toText(),
    judgedBy: bySlope ? 'least-squares slope over the measuring length' : 'largest minus smallest mean reading',
    signed: bySlope,
    means: means.map((mean) => mean.toText()),
    fitSlope: fitSlope.toText(),
    difference: difference.toText(),
    range: range.toText(),
    reversed,
    ...(input.localLength === undefined
      ? {}
      : { local: localRange(input.positions, means, input.localLength).toText() }),
  };
}
