import { z } from 'zod';
import { plain } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import { decimals, tooFew } from './decimal-text';
import { refuse } from './evaluation-error';
import { type Harmonic, harmonicFit, meanHarmonic, polar } from './harmonic-fit';
import { largestOf, seriesFromTexts, smallestOf } from './series';
import { directionOf } from './trigonometry';

const insertion = z.strictObject({ readings: decimals(2, 'readings'), angles: decimals(0, 'angles').optional() });

export const runOutInput = z.strictObject({
  method: z.literal('run-out'),
  insertions: z.array(insertion).min(1, tooFew(1, 'insertion')),
  angles: decimals(0, 'angles').optional(),
  judge: z.enum(['mean', 'largest']).optional(),
});

/**
 * Radial run-out, directly or by a mandrel put in several times (four times, a quarter turn apart).
 *
 * Per insertion: total indicator reading = max − min. Judged: their mean, or the largest. Where angles are given, the
 * first harmonic c + a·cos θ + b·sin θ by least squares: eccentricity = √(a² + b²) (half of its total reading), phase
 * = angle of (a, b). Over the insertions the vectors are averaged; angles count on the spindle, so the mandrel's
 * own part cancels over four quarter turns.
 *
 * @param insertions readings µm (at least 2), angles ° one per reading (own or common; 360 may repeat 0)
 * @returns perInsertion, mean, largest, spread (largest − smallest of the insertions), eccentricity µm, phase °
 * @throws EvaluationError lists of different length, fewer than 3 different angles
 * @example readings 0, 3, −1 → total indicator reading 4 µm
 * Source: ISO 230-1:2012 (run-out, from memory); averaging of four insertions and the harmonic are common practice.
 */
export function runOut(input: z.output<typeof runOutInput>) {
  const { insertions, judge = 'mean' } = input;
  const harmonics = insertions.map((_, i) => firstHarmonic(input, i));
  const totals = insertions.map(({ readings }) => totalReading(readings));
  const mean = Fraction.mean(totals);
  const largest = Fraction.max(totals);
  const known = harmonics.filter((harmonic) => harmonic !== null);
  return {
    method: 'run-out' as const,
    deviation: (judge === 'mean' ? mean : largest).toText(),
    judgedBy: judge === 'mean' ? 'mean total indicator reading of the insertions' : 'largest total indicator reading',
    signed: false as const,
    perInsertion: totals.map((total, i) => ({
      totalIndicatorReading: total.toText(),
      ...(harmonics[i] && polarTexts(harmonics[i])),
    })),
    mean: mean.toText(),
    largest: largest.toText(),
    spread: Fraction.range(totals).toText(),
    ...(known.length === insertions.length && polarTexts(meanHarmonic(known))),
  };
}

function totalReading(readings: readonly string[]): Fraction {
  const { values, unit } = seriesFromTexts(readings);
  return Fraction.of(largestOf(values) - smallestOf(values), unit);
}

function firstHarmonic(input: z.output<typeof runOutInput>, i: number): Harmonic | null {
  const { readings, angles: own } = input.insertions[i]!;
  const angles = own ?? input.angles;
  if (!angles) return null;
  const path = own ? ['insertions', i, 'angles'] : ['angles'];
  if (angles.length !== readings.length) {
    refuse(
      path,
      `${angles.length} angles for the ${readings.length} readings of insertion ${i + 1}: one angle a reading is needed`,
    );
  }
  const fit = harmonicFit(
    angles.map((angle) => directionOf(Fraction.from(angle))),
    seriesFromTexts(readings),
    1,
  );
  if (!fit) return refuse(path, tooFew(3, 'different angles'));
  const [, a, b] = fit.coefficients;
  return { a: a!.toDec(), b: b!.toDec() };
}

function polarTexts(harmonic: Harmonic): { eccentricity: string; phase: string } {
  const { amplitude, phase } = polar(harmonic);
  return { eccentricity: plain(amplitude), phase: plain(phase) };
}
