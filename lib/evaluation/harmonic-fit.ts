import { Dec } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import { largestOf, type Series, smallestOf } from './series';
import { solveWhole } from './solve-whole';
import { angleOf, type Direction, TRIG_ONE } from './trigonometry';

export type Harmonic = { a: Dec; b: Dec };

/**
 * Least-squares fit c + a·cos θ + b·sin θ (+ p·cos 2θ + q·sin 2θ) at any angles, not only equal steps.
 * @param order 1 or 2: highest harmonic
 * @returns coefficients [c, a, b] or [c, a, b, p, q] in the unit of the readings, null where the angles do not
 *   determine them (fewer different angles than coefficients)
 */
export function harmonicFit(directions: readonly Direction[], readings: Series, order: 1 | 2): Dec[] | null {
  const size = order === 1 ? 3 : 5;
  const matrix = Array.from({ length: size }, () => new Array<bigint>(size).fill(0n));
  const right = new Array<bigint>(size).fill(0n);
  directions.forEach(({ cos, sin }, i) => {
    const row = [TRIG_ONE, cos, sin];
    if (order === 2) row.push((cos * cos - sin * sin) / TRIG_ONE, (2n * sin * cos) / TRIG_ONE);
    for (let r = 0; r < size; r++) {
      right[r]! += row[r]! * readings.values[i]!;
      for (let c = r; c < size; c++) matrix[r]![c]! += row[r]! * row[c]!;
    }
  });
  for (let r = 0; r < size; r++) for (let c = 0; c < r; c++) matrix[r]![c] = matrix[c]![r]!;
  const solution = solveWhole(matrix, right);
  if (!solution) return null;
  const range = largestOf(readings.values) - smallestOf(readings.values);
  return solution.numerators.map((numerator, k) => {
    const value = Fraction.of(numerator * TRIG_ONE, solution.determinant * readings.unit);
    // What is left of a vanishing coefficient is the last bit of the cosines, not a figure.
    const noise = k > 0 && value.abs().compare(Fraction.of(range, readings.unit << 160n)) < 0;
    return noise ? new Dec(0) : value.toDec();
  });
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
