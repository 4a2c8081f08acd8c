import { divideHalfEven, Fraction, integerSquareRoot } from '@/lib/units/fraction';
import { refuse } from './evaluation-error';
import { harmonicFit } from './harmonic-fit';
import { largestOf, type Series, smallestOf } from './series';
import { type Direction, TRIG_ONE } from './trigonometry';

/** Binary places of a coordinate in µm: 2^-160 is below 10^-48 µm. */
const BITS = 160n;
export const ONE_UM = 1n << BITS;
/** The centre counts as found when it moves less than 2^-100 µm, far below the contract's 10^-9 µm. */
export const STILL = 1n << (BITS - 100n);
export const MOST_STEPS = 60;
/** Steps after that, so that a figure that is exactly nothing comes out below the cut-off of the square roots. */
const MORE_STEPS = 3;
export const NO_CIRCLE = 'the points do not determine a circle';

/** Points in the plane of the circle, µm over 2^160. */
export type PlanePoint = { readonly x: bigint; readonly y: bigint };
export type Seen = { directions: Direction[]; radii: Series };
export type CircleFit = { centre: PlanePoint; radius: Fraction; width: Fraction; seen: Seen };

/** (nominal + deviation)·(cos θ, sin θ); `radiusUm` over its series unit. */
export function planePoint(radius: Fraction, { cos, sin }: Direction): PlanePoint {
  const scale = (part: bigint) => divideHalfEven(radius.n * part * ONE_UM, radius.d * TRIG_ONE);
  return { x: scale(cos), y: scale(sin) };
}

/** Radii and directions of the points as seen from a centre. @throws EvaluationError where a point lies in it */
export function seenFrom(points: readonly PlanePoint[], centre: PlanePoint): Seen {
  const values: bigint[] = [];
  const directions: Direction[] = [];
  for (const point of points) {
    const dx = point.x - centre.x;
    const dy = point.y - centre.y;
    const radius = integerSquareRoot(dx * dx + dy * dy);
    if (radius === 0n) return refuse([], NO_CIRCLE);
    values.push(radius);
    directions.push({ cos: (dx * TRIG_ONE) / radius, sin: (dy * TRIG_ONE) / radius });
  }
  return { directions, radii: { values, unit: ONE_UM } };
}

/**
 * Least-squares circle by true geometry: linear fit c + a·cos φ + b·sin φ of the radii seen from the centre, the centre
 * moved by (a, b), again until it stands still (Gauss–Newton; a single fit errs by e²/2R).
 * @throws EvaluationError where it never does: the points lie on no circle
 */
export function leastSquaresCircle(points: readonly PlanePoint[]): CircleFit {
  let centre: PlanePoint = { x: 0n, y: 0n };
  let more = MORE_STEPS;
  for (let step = 0; ; step++) {
    const seen = seenFrom(points, centre);
    const [c, a, b] = harmonicFit(seen.directions, seen.radii, 1)?.coefficients ?? refuse([], NO_CIRCLE);
    const move = { x: toFixed(a!), y: toFixed(b!) };
    const isStill = size(move.x) < STILL && size(move.y) < STILL;
    if (isStill && (more === 0 || (move.x === 0n && move.y === 0n))) {
      return { centre, radius: c!, width: widthOf(seen), seen };
    }
    if (isStill) more -= 1;
    else if (step >= MOST_STEPS) return refuse([], NO_CIRCLE);
    centre = { x: centre.x + move.x, y: centre.y + move.y };
  }
}

export function widthOf({ radii }: Seen): Fraction {
  return Fraction.of(largestOf(radii.values) - smallestOf(radii.values), radii.unit);
}

export function toFixed({ n, d }: Fraction): bigint {
  return (n * ONE_UM) / d;
}

export function size(value: bigint): bigint {
  return value < 0n ? -value : value;
}
