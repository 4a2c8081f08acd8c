import type { Fraction } from '@/lib/units/fraction';
import {
  MOST_STEPS,
  NO_CIRCLE,
  ONE_UM,
  type PlanePoint,
  type Seen,
  STILL,
  seenFrom,
  size,
  toFixed,
  widthOf,
} from './circle-geometry';
import { refuse } from './evaluation-error';
import { minimumZone } from './roundness';
import { largestOf, smallestOf } from './series';

/** Points no further than this from a circle lie on it: 2^-60 µm, far above the cut-off of the roots and below any reading. */
const CONTACT = ONE_UM >> 60n;

/** Two concentric circles that hold all points, and the points that lie on the outer and on the inner one (indices). */
export type ZoneCircle = { width: Fraction; centre: PlanePoint; outer: number[]; inner: number[] };

/**
 * Two concentric circles of least radial distance that hold all points, by true geometry.
 *
 * The linear programme of `minimumZone` on the radii seen from the centre, itself solved by exchanging supporting points; the
 * centre moved by its a, b, a step that does not help halved, again until it stands still. Then the optimum is checked: going
 * round, points on the outer and on the inner circle take turns at least four times (outer, inner, outer, inner), so that every
 * move of the centre brings an outer point further out or an inner one further in.
 *
 * @param points µm over 2^160, at least 4; @param start a centre near by, best that of least squares
 * @throws EvaluationError where the check fails: the points determine no circle
 * Source: the alternation condition is that of Chebyshev approximation (textbook); common practice.
 */
export function minimumZoneCircle(points: readonly PlanePoint[], start: PlanePoint): ZoneCircle {
  let centre = start;
  let seen = seenFrom(points, centre);
  let width = widthOf(seen);
  for (let step = 0; step < MOST_STEPS; step++) {
    const zone = minimumZone(seen.directions, seen.radii);
    let move = { x: toFixed(zone.a), y: toFixed(zone.b) };
    let isBetter = false;
    while (!isBetter && (size(move.x) >= STILL || size(move.y) >= STILL)) {
      const nextCentre = { x: centre.x + move.x, y: centre.y + move.y };
      const nextSeen = seenFrom(points, nextCentre);
      const nextWidth = widthOf(nextSeen);
      isBetter = nextWidth.compare(width) < 0;
      if (isBetter) [centre, seen, width] = [nextCentre, nextSeen, nextWidth];
      else move = { x: move.x / 2n, y: move.y / 2n };
    }
    if (!isBetter) break;
  }
  const contacts = contactsOf(seen);
  return takeTurns(points, centre, contacts) ? { width, centre, ...contacts } : refuse([], NO_CIRCLE);
}

function contactsOf({ radii }: Seen): { outer: number[]; inner: number[] } {
  const [most, least] = [largestOf(radii.values), smallestOf(radii.values)];
  const indices = radii.values.map((_, index) => index);
  return {
    outer: indices.filter((index) => most - radii.values[index]! <= CONTACT),
    inner: indices.filter((index) => radii.values[index]! - least <= CONTACT),
  };
}

/**
 * Whether outer and inner contacts change at least four times on the way round. All on one circle: nothing is left to improve.
 * One of each in the same direction: no move brings them nearer to one another.
 */
export function takeTurns(
  points: readonly PlanePoint[],
  centre: PlanePoint,
  { outer, inner }: Pick<ZoneCircle, 'outer' | 'inner'>,
): boolean {
  if (outer.length === points.length && inner.length === points.length) return true;
  const round = [
    ...outer.map((index) => ({ index, isOuter: true })),
    ...inner.map((index) => ({ index, isOuter: false })),
  ]
    .map(({ index, isOuter }) => ({ isOuter, x: points[index]!.x - centre.x, y: points[index]!.y - centre.y }))
    .sort((a, b) => half(a) - half(b) || sign(b.x * a.y - a.x * b.y));
  const pairs = round.map((contact, k) => [contact, round[(k + 1) % round.length]!] as const);
  const changes = pairs.filter(([a, b]) => a.isOuter !== b.isOuter);
  return changes.length >= 4 || changes.some(([a, b]) => half(a) === half(b) && a.x * b.y === a.y * b.x);
}

/** 0 for angles from 0 up to 180°, 1 from there on. */
function half({ x, y }: PlanePoint): number {
  return y > 0n || (y === 0n && x > 0n) ? 0 : 1;
}

function sign(value: bigint): number {
  return value > 0n ? 1 : value < 0n ? -1 : 0;
}
