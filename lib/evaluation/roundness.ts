import { z } from 'zod';
import { plain } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import { circleDirections } from './circle-angles';
import { decimalText, tooFew } from './decimal-text';
import { refuse } from './evaluation-error';
import { harmonicFit, residualRange } from './harmonic-fit';
import { narrowestSlab } from './narrowest-slab';
import { type Series, seriesFromTexts } from './series';
import { surfaceSign, sweptSurface } from './sweep';
import { type Direction, TRIG_BITS } from './trigonometry';

export const roundnessInput = z.strictObject({
  method: z.literal('roundness'),
  points: z.array(z.strictObject({ angle: decimalText, reading: decimalText })).min(4, tooFew(4, 'points')),
  reference: z.enum(['minimum-zone', 'least-squares']).optional(),
  surface: sweptSurface.optional(),
});

/** Binary places of the cosines in the linear programme: 2^-140 is below 10^-42. */
const ZONE_BITS = 140n;

/**
 * Roundness from readings round a section whose radius is not known.
 *
 * r(θ) − a·cos θ − b·sin θ is what remains beside the eccentricity. Least squares: a, b of c + a·cos θ + b·sin θ, width =
 * max − min of the residuals. Minimum zone: the a, b of least max − min, a linear programme solved to its proven optimum.
 *
 * @param points angle ° (all different modulo 360), reading µm; at least 4
 * @param reference which width is judged, default minimum-zone
 * @param surface a bore turns the sign of the centres only
 * @returns minimumZone, leastSquares µm; centre, centreMinimumZone { x, y } µm
 * @throws EvaluationError fewer than 4 points, an angle twice
 * @example 0/90/180/270 = 1, −1, 1, −1 → 2 µm both ways, centre 0, 0
 * Source: ISO 12181-1 (reference circles, from memory); linear form common practice for small deviations.
 */
export function roundness(input: z.output<typeof roundnessInput>) {
  const { points, reference = 'minimum-zone', surface = 'outside' } = input;
  const directions = circleDirections(
    points.map((p) => p.angle),
    (i) => ['points', i, 'angle'],
  );
  const readings = seriesFromTexts(points.map((p) => p.reading));
  const fit = harmonicFit(directions, readings, 1) ?? tooClose();
  const zone = minimumZone(directions, readings);
  const leastSquares = text(residualRange(fit, directions, readings, 1));
  const minimum = text(zone.width);
  const turn = surfaceSign(surface);
  const place = (a: Fraction, b: Fraction) => ({ x: text(a.times(turn)), y: text(b.times(turn)) });
  return {
    method: 'roundness' as const,
    deviation: reference === 'minimum-zone' ? minimum : leastSquares,
    judgedBy: `roundness about the ${reference} circle`,
    signed: false as const,
    minimumZone: minimum,
    leastSquares,
    centre: place(fit.coefficients[1]!, fit.coefficients[2]!),
    centreMinimumZone: place(zone.a, zone.b),
  };
}

/** Least max − min of r − a·cos θ − b·sin θ, and its a and b, in the unit of the readings. */
export function minimumZone(directions: readonly Direction[], readings: Series) {
  const shift = TRIG_BITS - ZONE_BITS;
  const slab = narrowestSlab({
    x: directions.map(({ cos }) => cos >> shift),
    y: directions.map(({ sin }) => sin >> shift),
    z: readings.values,
  });
  if (!slab) return tooClose();
  const unit = slab.d * readings.unit;
  return {
    width: Fraction.of(slab.width, unit),
    a: Fraction.of(slab.b << ZONE_BITS, unit),
    b: Fraction.of(slab.c << ZONE_BITS, unit),
  };
}

/** Angles that differ by less than the last place of their cosines. */
function tooClose(): never {
  return refuse([], 'the angles stand too close together');
}

/** Cosines are cut off, so a result is given to 30 digits even where it would be a finite decimal of many more. */
function text(value: Fraction): string {
  return plain(value.toDec());
}
