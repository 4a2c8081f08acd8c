import { z } from 'zod';
import { Fraction, overCommonDenominator } from '@/lib/units/fraction';
import { decimalOrNumber, decimalText, tooFew } from './decimal-text';
import { refuse } from './evaluation-error';
import { type Cloud, narrowestSlab } from './narrowest-slab';
import { largestOf, type Series, seriesFromTexts, smallestOf } from './series';
import { solveWhole } from './solve-whole';

const REFERENCES = ['three-points', 'least-squares', 'minimum-zone'] as const;

export const flatnessInput = z.strictObject({
  method: z.literal('flatness'),
  points: z.array(z.strictObject({ x: decimalText, y: decimalText, reading: decimalText })).min(4, tooFew(4, 'points')),
  reference: z.enum(REFERENCES),
  three: z.tuple([decimalOrNumber, decimalOrNumber, decimalOrNumber]).optional(),
});

type Input = z.output<typeof flatnessInput>;

/** z = (a + b·x + c·y)/d in whole numbers, d > 0. */
type Plane = { a: bigint; b: bigint; c: bigint; d: bigint };

/**
 * Flatness of a surface from readings at points of it.
 *
 * deviation = max − min of (reading − a − b·x − c·y); the plane through three of the points, by least squares, or in the
 * middle of the narrowest slab in the reading direction (exact optimum).
 *
 * @param points x, y mm (no place twice), reading µm; at least 4, not on one line
 * @param three indices from 0 of three points not on one line; only with `three-points`
 * @returns deviation µm, a µm, b and c µm/m, residuals µm; where the best plane is not unique only deviation is defined
 * @throws EvaluationError fewer than 4 points, a place twice, all points or the three on one line, a wrong index
 * @example corners 0, 0, 0, 4 of a square: minimum zone 2, three points 4, least squares 2 µm
 * Source: ISO 230-1:2012 (reference planes, from memory); arithmetic common practice.
 */
export function flatness(input: Input) {
  const { points, reference } = input;
  const x = seriesFromTexts(points.map((p) => p.x));
  const y = seriesFromTexts(points.map((p) => p.y));
  const readings = seriesFromTexts(points.map((p) => p.reading));
  refuseSamePlace(x, y);
  const cloud = { x: x.values, y: y.values, z: readings.values };
  const { a, b, c, d } = planeThrough(cloud, input);
  const residuals = cloud.z.map((z, i) => d * z - a - b * cloud.x[i]! - c * cloud.y[i]!);
  const unit = d * readings.unit;
  return {
    method: 'flatness' as const,
    deviation: Fraction.of(largestOf(residuals) - smallestOf(residuals), unit).toText(),
    judgedBy: `flatness about the ${reference === 'three-points' ? 'plane through three points' : `${reference} plane`}`,
    signed: false as const,
    a: Fraction.of(a, unit).toText(),
    b: Fraction.of(1000n * b * x.unit, unit).toText(),
    c: Fraction.of(1000n * c * y.unit, unit).toText(),
    residuals: overCommonDenominator(residuals, unit),
  };
}

function planeThrough(cloud: Cloud, { reference, three, points }: Input): Plane {
  if (reference !== 'three-points' && three) refuse(['three'], 'belongs to the reference three-points only');
  if (reference === 'three-points') {
    if (!three) refuse(['three'], 'is needed for the reference three-points');
    return planeOfThree(
      cloud,
      three!.map((text, k) => indexOf(text, k, points.length)),
    );
  }
  const plane = reference === 'minimum-zone' ? narrowestSlab(cloud) : leastSquaresPlane(cloud);
  return plane ?? refuse(['points'], 'all points lie on one line');
}

function indexOf(text: string, k: number, count: number): number {
  const index = decimalText.safeParse(text).success ? Fraction.from(text).reduced() : null;
  if (index?.d !== 1n || index.n < 0n || index.n >= BigInt(count)) {
    return refuse(['three', k], `must be a whole number from 0 to ${count - 1}`);
  }
  return Number(index.n);
}

function planeOfThree({ x, y, z }: Cloud, three: readonly number[]): Plane {
  const solution = solveWhole(
    three.map((i) => [1n, x[i]!, y[i]!]),
    three.map((i) => z[i]!),
  );
  return solution ? positive(solution) : refuse(['three'], 'the three points lie on one line');
}

/** Unweighted least squares in the reading direction; null where all points lie on one line. */
export function leastSquaresPlane({ x, y, z }: Cloud): Plane | null {
  const sum = (of: (i: number) => bigint) => x.reduce((total, _, i) => total + of(i), 0n);
  const [sx, sy] = [sum((i) => x[i]!), sum((i) => y[i]!)];
  const sxy = sum((i) => x[i]! * y[i]!);
  const solution = solveWhole(
    [
      [BigInt(x.length), sx, sy],
      [sx, sum((i) => x[i]! * x[i]!), sxy],
      [sy, sxy, sum((i) => y[i]! * y[i]!)],
    ],
    [sum((i) => z[i]!), sum((i) => x[i]! * z[i]!), sum((i) => y[i]! * z[i]!)],
  );
  return solution && positive(solution);
}

function positive({ numerators, determinant }: { numerators: bigint[]; determinant: bigint }): Plane {
  const sign = determinant < 0n ? -1n : 1n;
  const [a, b, c] = numerators.map((numerator) => numerator * sign);
  return { a: a!, b: b!, c: c!, d: determinant * sign };
}

function refuseSamePlace(x: Series, y: Series): void {
  const seen = new Set<string>();
  x.values.forEach((value, i) => {
    const place = `${value} ${y.values[i]!}`;
    if (seen.has(place)) refuse(['points', i], 'the same place stands twice; average repeated readings before');
    seen.add(place);
  });
}
