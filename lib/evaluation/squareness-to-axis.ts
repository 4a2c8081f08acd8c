import { z } from 'zod';
import { reversedMeans, reversedReadings } from './reversed-means';

export const squarenessToAxisInput = z.strictObject({ method: z.literal('squareness-to-axis'), ...reversedReadings });

const DIRECTIONS = { '1': 'concave', '0': 'none', '-1': 'convex' } as const;

/**
 * Squareness of a cross motion to an axis of rotation, by a straightedge or disc read in two angular positions.
 *
 * e = −(least-squares slope of the mean readings over the radius) · measuringLength/1000; e > 0: a face turned so is
 * concave, e < 0: convex.
 *
 * @param positions signed distance from the axis along the motion, mm, all different, at least 2
 * @param readings µm per angle °, as parallelism
 * @param measuringLength mm, default the span of the positions
 * @throws EvaluationError see `reversedMeans`
 * @example means 0 at 20 mm, −8 at 170 mm → e = +8 µm over 150 mm, concave
 * Source: ISO 230-1:2012 and ISO 13041-1:2020 (from memory).
 */
export function squarenessToAxis(input: z.output<typeof squarenessToAxisInput>) {
  const { means, fitSlope, rise } = reversedMeans(input);
  const e = rise.negated();
  return {
    method: 'squareness-to-axis' as const,
    deviation: e.toText(),
    judgedBy: 'e over the measuring length, concave positive',
    signed: true as const,
    means: means.map((mean) => mean.toText()),
    fitSlope: fitSlope.toText(),
    e: e.toText(),
    direction: DIRECTIONS[String(e.sign()) as keyof typeof DIRECTIONS],
  };
}
