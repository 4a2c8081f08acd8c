import { Fraction, overCommonDenominator } from '@/lib/units/fraction';
import { minimumZoneLine } from './minimum-zone-line';
import { largestOf, risingOrder, type Series, smallestOf } from './series';

export const LINE_TYPES = ['end-points', 'least-squares', 'minimum-zone'] as const;
export type LineType = (typeof LINE_TYPES)[number];

/** The line y = (rise·x + start) / run in whole numbers of the two series, run > 0. */
export type Line = { readonly rise: bigint; readonly start: bigint; readonly run: bigint };

/** Positions and readings in rising order of position, as whole numbers. */
export type Profile = { readonly x: readonly bigint[]; readonly y: readonly bigint[] };

export type FittedLine = {
  /** Residual = reading − line, in the order given, over `residualUnit`. */
  residuals: readonly bigint[];
  residualUnit: bigint;
  /** Largest minus smallest residual. */
  deviation: Fraction;
  /** Rise over run in units of y per unit of x. */
  slope: Fraction;
  /** Height at position 0. */
  intercept: Fraction;
};

/**
 * Reference line through readings over positions (all different, at least two).
 *
 * end points: through the readings at the smallest and the largest position. Least squares, unweighted and vertical:
 * slope = Σ(x−x̄)(y−ȳ)/Σ(x−x̄)². Minimum zone: middle of the narrowest strip in the reading direction.
 * Common practice; computed in exact whole numbers.
 */
export function fitLine(positions: Series, readings: Series, type: LineType): FittedLine {
  const order = risingOrder(positions.values);
  const profile = { x: order.map((i) => positions.values[i]!), y: order.map((i) => readings.values[i]!) };
  const { rise, start, run } = lineThrough(profile, 0, order.length - 1, type);
  const residuals = readings.values.map((y, i) => run * y - rise * positions.values[i]! - start);
  const residualUnit = run * readings.unit;
  return {
    residuals,
    residualUnit,
    deviation: Fraction.of(largestOf(residuals) - smallestOf(residuals), residualUnit),
    slope: Fraction.of(rise * positions.unit, residualUnit),
    intercept: Fraction.of(start, residualUnit),
  };
}

/** Line of a type through the points first…last of a profile. */
export function lineThrough(profile: Profile, first: number, last: number, type: LineType): Line {
  if (type === 'minimum-zone') return minimumZoneLine(profile, first, last);
  return type === 'end-points' ? endPointLine(profile, first, last) : leastSquaresLine(profile, first, last);
}

function endPointLine({ x, y }: Profile, first: number, last: number): Line {
  const run = x[last]! - x[first]!;
  const rise = y[last]! - y[first]!;
  return { rise, run, start: y[first]! * run - rise * x[first]! };
}

function leastSquaresLine({ x, y }: Profile, first: number, last: number): Line {
  const count = BigInt(last - first + 1);
  let sumX = 0n;
  let sumY = 0n;
  let sumXX = 0n;
  let sumXY = 0n;
  for (let i = first; i <= last; i++) {
    sumX += x[i]!;
    sumY += y[i]!;
    sumXX += x[i]! * x[i]!;
    sumXY += x[i]! * y[i]!;
  }
  const spread = count * sumXX - sumX * sumX;
  const slope = count * sumXY - sumX * sumY;
  return { rise: count * slope, run: count * spread, start: sumY * spread - slope * sumX };
}

/** Residuals as decimal text, in the order given. */
export function residualTexts(line: FittedLine): string[] {
  return overCommonDenominator(line.residuals, line.residualUnit);
}

/** Slope in µm/m of a line whose positions are mm and readings µm. */
export function slopeUmPerM(line: FittedLine): Fraction {
  return line.slope.times(Fraction.of(1000));
}
