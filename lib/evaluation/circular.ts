import { z } from 'zod';
import { plain } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import { circleDirections } from './circle-angles';
import { leastSquaresCircle, ONE_UM, type PlanePoint, planePoint, type Seen } from './circle-geometry';
import { decimalText, positiveDecimal, tooFew } from './decimal-text';
import { refuse } from './evaluation-error';
import { harmonicFit } from './harmonic-fit';
import { minimumZoneCircle } from './minimum-zone-circle';

const circle = z.array(z.strictObject({ angle: decimalText, radius: decimalText })).min(5, tooFew(5, 'points'));

export const circularInput = z.strictObject({
  method: z.literal('circular'),
  clockwise: circle.optional(),
  counterclockwise: circle.optional(),
  nominalRadius: positiveDecimal,
  arc: positiveDecimal.optional(),
  judge: z.enum(['Gb', 'G']).optional(),
});

type Input = z.output<typeof circularInput>;
type Way = 'clockwise' | 'counterclockwise';

/**
 * Circular test of two axes moving together.
 *
 * Points (R + ρ)(cos θ, sin θ), true geometry (see `leastSquaresCircle`). Per direction: G minimum zone, GLeastSquares =
 * max − min radius about the least-squares centre, Fmax and Fmin about the centre as set. Both: Gb minimum zone over
 * all, D = mean of the two least-squares radii − nominal. Full circle: c + a·cos θ + b·sin θ + p·cos 2θ + q·sin 2θ over all
 * readings as seen from their least-squares centre: squareness = −2q/R·1000 = (D135 − D45)/Dnominal, + = the angle
 * between the + directions is more than 90°; scaleDifference = 2p/R·1000, + = the first axis travels too far;
 * lagDifference = (q counterclockwise − q clockwise)/R·1000.
 *
 * @param clockwise, counterclockwise angle ° from the first axis to the second (all different modulo 360 within each),
 *   radius µm = actual − nominal about the centre as set; at least 5 points, at least one direction
 * @param nominalRadius mm; @param arc ° measured, default 360
 * @param judge Gb (default where both directions are given) | G, the larger of both
 * @returns lengths µm, squareness, scaleDifference, lagDifference µm/m, centre of the least-squares circle of all µm
 * @throws EvaluationError no direction, an angle twice, an arc above 360, a radius not above zero, Gb of one direction
 * @example a true circle 3 µm too large → G 0, D 3, centre 0, 0
 * Source: ISO 230-4 (terms, from memory); formulas derived.
 */
export function circular(input: Input) {
  const { clockwise, counterclockwise, nominalRadius, arc = '360', judge } = input;
  if (!clockwise && !counterclockwise) refuse([], 'clockwise or counterclockwise is needed');
  const isPartial = checkArc(arc);
  const radius = Fraction.from(nominalRadius).times(Fraction.of(1000));
  const ways = (['clockwise', 'counterclockwise'] as const).flatMap((way) => {
    const readings = input[way];
    return readings ? [{ way, readings, ...oneWay(pointsOf(readings, radius, way), readings) }] : [];
  });
  const figuresOf = (name: Way) => ways.find((way) => way.way === name)?.figures;
  const allPoints = ways.flatMap((way) => way.points);
  const all = leastSquaresCircle(allPoints);
  const isBoth = ways.length === 2;
  if (judge === 'Gb' && !isBoth) refuse(['judge'], 'Gb needs both directions');
  const Gb = isBoth ? text(minimumZoneCircle(allPoints, all.centre).width) : null;
  const byGb = Gb !== null && judge !== 'G';
  const largestG = text(Fraction.max(ways.map((way) => way.G)));
  const deviations = ways.flatMap((way) => way.readings.map((reading) => Fraction.from(reading.radius)));
  const meanRadius = Fraction.mean(ways.map((way) => way.fit.radius));
  return {
    method: 'circular' as const,
    deviation: byGb ? Gb : largestG,
    judgedBy: byGb ? 'Gb, bidirectional circular deviation, minimum zone' : 'G, circular deviation, minimum zone',
    signed: false as const,
    ...(figuresOf('clockwise') && { clockwise: figuresOf('clockwise') }),
    ...(figuresOf('counterclockwise') && { counterclockwise: figuresOf('counterclockwise') }),
    ...(Gb !== null && { Gb, D: text(meanRadius.minus(radius)) }),
    Fmax: Fraction.max(deviations).toText(),
    Fmin: Fraction.min(deviations).toText(),
    centre: { x: text(Fraction.of(all.centre.x, ONE_UM)), y: text(Fraction.of(all.centre.y, ONE_UM)) },
    ...(!isPartial && secondHarmonics(all.seen, ways, Fraction.from(nominalRadius))),
    partialArc: isPartial,
  };
}

function checkArc(arc: string): boolean {
  const difference = Fraction.from(arc).compare(Fraction.of(360));
  if (difference > 0) refuse(['arc'], 'must not be above 360');
  return difference < 0;
}

function pointsOf(readings: NonNullable<Input[Way]>, nominal: Fraction, way: Way): PlanePoint[] {
  const directions = circleDirections(
    readings.map((reading) => reading.angle),
    (i) => [way, i, 'angle'],
  );
  return readings.map((reading, i) => {
    const radius = nominal.plus(Fraction.from(reading.radius));
    if (radius.sign() <= 0) refuse([way, i, 'radius'], 'takes the radius to zero or below');
    return planePoint(radius, directions[i]!);
  });
}

function oneWay(points: PlanePoint[], readings: NonNullable<Input[Way]>) {
  const fit = leastSquaresCircle(points);
  const G = minimumZoneCircle(points, fit.centre).width;
  const deviations = readings.map((reading) => Fraction.from(reading.radius));
  const figures = {
    G: text(G),
    GLeastSquares: text(fit.width),
    Fmax: Fraction.max(deviations).toText(),
    Fmin: Fraction.min(deviations).toText(),
  };
  return { points, fit, G, figures };
}

type FittedWay = { way: Way; fit: { seen: Seen } };

function secondHarmonics(all: Seen, ways: readonly FittedWay[], radiusMm: Fraction) {
  const perRadius = (figure: Fraction, factor: number) =>
    text(figure.times(Fraction.of(1000 * factor)).dividedBy(radiusMm));
  const [p, q] = secondHarmonic(all);
  const lags = ways.map(({ fit }) => secondHarmonic(fit.seen)[1]);
  return {
    squareness: perRadius(q, -2),
    scaleDifference: perRadius(p, 2),
    ...(lags.length === 2 && { lagDifference: perRadius(lags[1]!.minus(lags[0]!), 1) }),
  };
}

function secondHarmonic({ directions, radii }: Seen): [Fraction, Fraction] {
  const { coefficients } = harmonicFit(directions, radii, 2) ?? refuse([], 'the angles stand too close together');
  return [coefficients[3]!, coefficients[4]!];
}

/** Square roots and cosines are cut off near 10^-48 µm; anything below 10^-40 is nothing. */
function text(value: Fraction): string {
  const figure = value.toDec();
  return figure.abs().lt('1e-40') ? '0' : plain(figure.toDecimalPlaces(42));
}
