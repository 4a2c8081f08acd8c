import { solveWhole } from './solve-whole';

/** Points of a surface as whole numbers: z over (x, y). */
export type Cloud = { readonly x: readonly bigint[]; readonly y: readonly bigint[]; readonly z: readonly bigint[] };

/** The plane z = (a + b·x + c·y)/d in whole numbers, d > 0, and the height of the slab around it over d. */
export type Slab = { a: bigint; b: bigint; c: bigint; d: bigint; width: bigint };

/** A point under the upper plane (side 1) or over the lower plane (side −1) of the slab. */
type Support = { point: number; side: 1n | -1n };

/** Steps without progress before the slower rule that cannot run in circles takes over. */
const PATIENCE = 12;

/**
 * The narrowest slab, measured in the z direction, that holds all points; `null` where they lie on one line in (x, y).
 *
 * Linear programme: least (u + v) with u + b·x + c·y ≥ z and v − b·x − c·y ≥ −z for every point. Its dual (weights on
 * points, two sides of weight 1 with the same centre of gravity in x, y) is solved by the simplex method on four
 * supporting points; each step takes in the point that stands out most. It ends only when no point stands out, which
 * together with the weights proves the optimum. Every step is in exact whole numbers; Bland's rule after steps without
 * progress keeps it from cycling.
 * Source: linear programming duality (textbook); Chebyshev approximation by a plane.
 */
export function narrowestSlab(cloud: Cloud): Slab | null {
  const start = firstSupports(cloud);
  if (!start) return null;
  let supports = start;
  let stalled = 0;
  for (;;) {
    const planes = planesOf(cloud, supports);
    const entering = standingOut(cloud, planes, stalled > PATIENCE);
    if (!entering) {
      const { u, v, b, c, d } = planes;
      return { a: u - v, b: 2n * b, c: 2n * c, d: 2n * d, width: 2n * (u + v) };
    }
    const { leaving, moves } = exchange(cloud, supports, entering);
    stalled = moves ? 0 : stalled + 1;
    supports = supports.map((support, k) => (k === leaving ? entering : support));
  }
}

/** Three points not on one line, the first of them on both sides: a slab of height nothing to begin with. */
function firstSupports({ x, y }: Cloud): Support[] | null {
  const other = x.findIndex((value, k) => value !== x[0]! || y[k]! !== y[0]!);
  if (other < 0) return null;
  for (let k = other + 1; k < x.length; k++) {
    const cross = (x[other]! - x[0]!) * (y[k]! - y[0]!) - (y[other]! - y[0]!) * (x[k]! - x[0]!);
    if (cross !== 0n) {
      return [
        { point: 0, side: 1n },
        { point: 0, side: -1n },
        { point: other, side: 1n },
        { point: k, side: 1n },
      ];
    }
  }
  return null;
}

/** Coefficients of a support in the dual: (1, 0, x, y) above, (0, 1, −x, −y) below. */
function columnOf({ x, y }: Cloud, { point, side }: Support): bigint[] {
  return [side > 0n ? 1n : 0n, side > 0n ? 0n : 1n, side * x[point]!, side * y[point]!];
}

type Planes = { u: bigint; v: bigint; b: bigint; c: bigint; d: bigint };

/** Upper plane u + b·x + c·y and lower plane −v + b·x + c·y through the supports, over d > 0. */
function planesOf(cloud: Cloud, supports: readonly Support[]): Planes {
  const rows = supports.map((support) => columnOf(cloud, support));
  const heights = supports.map(({ point, side }) => side * cloud.z[point]!);
  const { numerators, determinant } = solveWhole(rows, heights)!;
  const sign = determinant < 0n ? -1n : 1n;
  const [u, v, b, c] = numerators.map((numerator) => numerator * sign);
  return { u: u!, v: v!, b: b!, c: c!, d: determinant * sign };
}

/** The point that stands out of the slab most (or the first that does); null: none, the slab is the narrowest. */
function standingOut({ x, y, z }: Cloud, { u, v, b, c, d }: Planes, first: boolean): Support | null {
  let most = 0n;
  let found: Support | null = null;
  for (let point = 0; point < x.length; point++) {
    const height = d * z[point]! - b * x[point]! - c * y[point]!;
    const above = height - u;
    const below = -height - v;
    if (above > most) {
      most = above;
      found = { point, side: 1n };
    } else if (below > most) {
      most = below;
      found = { point, side: -1n };
    }
    if (first && found) return found;
  }
  return found;
}

/** Which support gives way (index), and whether the slab moves by it. */
function exchange(cloud: Cloud, supports: readonly Support[], entering: Support): { leaving: number; moves: boolean } {
  const columns = supports.map((support) => columnOf(cloud, support));
  const matrix = [0, 1, 2, 3].map((row) => columns.map((column) => column[row]!));
  const weights = solveWhole(matrix, [1n, 1n, 0n, 0n])!;
  const change = solveWhole(matrix, columnOf(cloud, entering))!;
  const sign = weights.determinant < 0n ? -1n : 1n;
  const changeSign = change.determinant < 0n ? -1n : 1n;
  let leaving = -1;
  let bestWeight = 0n;
  let bestChange = 1n;
  for (let k = 0; k < supports.length; k++) {
    const weight = weights.numerators[k]! * sign;
    const rate = change.numerators[k]! * changeSign;
    if (rate <= 0n) continue;
    const difference = leaving < 0 ? -1n : weight * bestChange - bestWeight * rate;
    const isEarlier = leaving >= 0 && rank(supports[k]!) < rank(supports[leaving]!);
    if (difference < 0n || (difference === 0n && isEarlier)) {
      leaving = k;
      bestWeight = weight;
      bestChange = rate;
    }
  }
  return { leaving, moves: bestWeight > 0n };
}

/** Fixed order of all supports, as Bland's rule needs: the same as the scan of `standingOut`. */
function rank({ point, side }: Support): number {
  return 2 * point + (side > 0n ? 0 : 1);
}
