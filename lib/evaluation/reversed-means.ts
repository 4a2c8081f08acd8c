import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { decimals, decimalText, positiveDecimal } from './decimal-text';
import { refuse } from './evaluation-error';
import { fitLine, slopeUmPerM } from './line';
import { fractionAt, largestOf, refuseRepeats, seriesFromFractions, seriesFromTexts, smallestOf } from './series';

/** Fields that parallelism and squareness to an axis share. */
export const reversedReadings = {
  positions: decimals(2, 'positions'),
  readings: z.record(z.string(), z.array(decimalText)),
  measuringLength: positiveDecimal.optional(),
  sag: z.array(decimalText).optional(),
};

type Input = z.output<z.ZodObject<typeof reversedReadings>>;

export type ReversedMeans = {
  means: Fraction[];
  /** Least-squares slope of the means, µm/m. */
  fitSlope: Fraction;
  /** Least-squares slope over the measuring length, µm. */
  rise: Fraction;
  /** Reading mean at the largest minus that at the smallest position, µm. */
  difference: Fraction;
  range: Fraction;
  reversed: boolean;
};

/**
 * Mean readings over the angular positions of the spindle at each position, and their least-squares line.
 *
 * m(z) = Σ readings / number of angles + sag(z); the angles stand equally spaced in pairs, so that the mandrel's own
 * lean cancels. One angle: no reversal. fitSlope = Σ(z−z̄)(m−m̄)/Σ(z−z̄)².
 * @throws EvaluationError an odd number of angles, unequal steps, lists of different length, a position twice
 */
export function reversedMeans(input: Input): ReversedMeans {
  const { positions, readings, measuringLength, sag } = input;
  const angles = Object.keys(readings);
  checkAngles(angles);
  for (const angle of angles) checkLength(['readings', angle], readings[angle]!, positions.length);
  if (sag) checkLength(['sag'], sag, positions.length);
  const x = seriesFromTexts(positions);
  refuseRepeats(x, (i) => ['positions', i], 'position');
  const runs = angles.map((angle) => seriesFromTexts(readings[angle]!));
  const means = positions.map((_, i) => {
    const mean = Fraction.mean(runs.map((run) => fractionAt(run, i)));
    return sag ? mean.plus(Fraction.from(sag[i]!)) : mean;
  });
  const line = fitLine(x, seriesFromFractions(means), 'least-squares');
  const [low, high] = [smallestOf(x.values), largestOf(x.values)];
  const length = measuringLength ? Fraction.from(measuringLength) : Fraction.of(high - low, x.unit);
  return {
    means,
    fitSlope: slopeUmPerM(line),
    rise: line.slope.times(length),
    difference: means[x.values.indexOf(high)]!.minus(means[x.values.indexOf(low)]!),
    range: Fraction.range(means),
    reversed: angles.length > 1,
  };
}

function checkAngles(angles: readonly string[]): void {
  if (angles.length === 0) refuse(['readings'], 'readings at one angle at least are needed');
  for (const angle of angles) {
    if (!decimalText.safeParse(angle).success) refuse(['readings', angle], 'the key must be an angle in degrees');
  }
  if (angles.length === 1) return;
  if (angles.length % 2 === 1) refuse(['readings'], 'one angle, or an even number of angles, is needed');
  const { values, unit } = seriesFromTexts(angles);
  const turn = 360n * unit;
  const sorted = values.map((value) => ((value % turn) + turn) % turn).sort((a, b) => (a < b ? -1 : 1));
  const count = BigInt(angles.length);
  const isEqual = sorted.every((value, k) => (value - sorted[0]!) * count === turn * BigInt(k));
  if (!isEqual) refuse(['readings'], 'the angles must divide the turn into equal steps, for example 0 and 180');
}

function checkLength(path: PropertyKey[], list: readonly string[], length: number): void {
  if (list.length !== length) refuse(path, `${list.length} figures for ${length} positions: one a position is needed`);
}
