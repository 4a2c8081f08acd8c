import { Dec } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import { largestOf, type Series, smallestOf } from './series';
import { solveWhole } from './solve-whole';
import { angleOf, type Direction, TRIG_ONE } from './trigonometry';

export type Harmonic = { a: Dec; b: Dec };

/** Bits below which a figure is the last bit of the cosines, not a figure: 2^-160 of the range of the readings. */
const NOISE_BITS = 160n;

export type HarmonicFit = {
  /** [c, a, b] or [c, a, b, p, q] in the unit of the readings. */
  coefficients: Fraction[];
  /** Whole-number coefficients over the determinant, for exact residuals. */
  numerators: readonly bigint[];
  determinant: bigint;
};

function rowOf({ cos, sin }: Direction, order: 1 | 2): bigint[] {
  if (order === 1) return [TRIG_ONE, cos, sin];
  return [TRIG_ONE, cos, sin, (cos * cos - sin * sin) / TRIG_ONE, (2n * sin * cos) / TRIG_ONE];
}

/**
 * Least-squares fit c + a·cos θ + b·sin θ (+ p·cos 2θ + q·sin 2θ) at any angles, not only equal steps.
 * @param order 1 or 2: highest harmonic
 * @returns null where the angles do not determine the coefficients (fewer different angles than coefficients)
 */
export function harmonicFit(directions: readonly Direction[], readings: Series, order: 1 | 2): HarmonicFit | null {
  const size = order === 1 ? 3 : 5;
  const matrix = Array.from({ length: size }, () => new Array<bigint>(size).fill(0n));
  const right = new Array<bigint>(size).fill(0n);
  directions.forEach((direction, i) => {
    const row = rowOf(direction, order);
    for (let r = 0; r < size; r++) {
      right[r]! += row[r]! * readings.values[i]!;
      for (let c = r; c < size; c++) matrix[r]![c]! += row[r]! * row[c]!;
    }
  });
  for (let r = 0; r < size; r++) for (let c = 0; c < r; c++) matrix[r]![c] = matrix[c]![r]!;
  const solution = solveWhole(matrix, right);
  if (!solution) return null;
  const { numerators, determinant } = solution;
  const coefficients = numerators.map((numerator, k) => {
    const value = Fraction.of(numerator * TRIG_ONE, determinant * readings.unit);
    return k > 0 ? withoutNoise(value, readings) : value;
  });
  return { coefficients, numerators, determinant };
}

/** Largest minus smallest of (reading − fit); the readings may be others than the fitted ones, over the same unit. */
export function residualRange(
  fit: HarmonicFit,
  directions: readonly Direction[],
  readings: Series,
  order: 1 | 2,
): Fraction {
  const { numerators, determinant } = fit;
  const residuals = readings.values.map((value, i) => {
    const fitted = rowOf(directions[i]!, order).reduce((sum, part, k) => sum + part * numerators[k]!, 0n);
    return value * determinant - fitted;
  });
  return withoutNoise(
    Fraction.of(largestOf(residuals) - smallestOf(residuals), determinant * readings.unit).abs(),
    readings,
  );
}

function withoutNoise(value: Fraction, readings: Series): Fraction {
  const range = largestOf(readings.values) - smallestOf(readings.values);
  const isNoise = value.abs().compare(Fraction.of(range, readings.unit << NOISE_BITS)) < 0;
  return isNoise ? Fraction.zero : value;
}

/** Amplitude and angle (0 ≤ φ < 360, 0 without amplitude) of a·cos θ + b·sin θ. */
export function polar({ a, b }: Harmonic): { amplitude: Dec; phase: Dec } {
  const amplitude = a.times(a).plus(b.times(b)).sqrt();
  return { amplitude, phase: amplitude.isZero() ? new Dec(0) : angleOf(a, b) };
}

export function meanHarmonic(harmonics: readonly Harmonic[]): Harmonic {
  const sum = harmonics.reduce((total, h) => ({ a: total.a.plus(h.a), b: total.b.plus(h.b) }));
  return { a: sum.a.div(harmonics.length), b: sum.b.div(harmonics.length) };
}
