import { Fraction } from '@/lib/units/fraction';
import { refuse } from './evaluation-error';
import { seriesFromTexts } from './series';
import { type Direction, directionOf } from './trigonometry';

/**
 * Cosines and sines of the angles of one circle, in degrees.
 * @throws EvaluationError two angles equal modulo 360 (a closing reading is left out or averaged before)
 */
export function circleDirections(angles: readonly string[], pathOf: (index: number) => PropertyKey[]): Direction[] {
  const { values, unit } = seriesFromTexts(angles);
  const turn = 360n * unit;
  const seen = new Set<bigint>();
  values.forEach((value, i) => {
    const reduced = ((value % turn) + turn) % turn;
    if (seen.has(reduced))
      refuse(pathOf(i), 'the same angle stands twice on this circle; average repeated readings before');
    seen.add(reduced);
  });
  return values.map((value) => directionOf(Fraction.of(value, unit)));
}
