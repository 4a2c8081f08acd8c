import type { Line, Profile } from './line';

/**
 * Middle of the narrowest strip, measured in the reading direction, that holds the points first…last.
 *
 * The strip is as wide as the convex hull is high where it is highest; one of its sides lies on a hull edge, the other
 * touches the opposite hull at a corner. Exact: every comparison is a cross product of whole numbers.
 * O(n) for points in rising order of position (all different). Common practice.
 */
export function minimumZoneLine({ x, y }: Profile, first: number, last: number): Line {
  const upper = hull(x, y, first, last, -1n);
  const lower = hull(x, y, first, last, 1n);
  let best: Strip = { gap: -1n, run: 1n, edgeFrom: first, edgeTo: last, corner: first };
  best = highest(x, y, upper, lower, best);
  best = highest(x, y, lower, upper, best);
  const { run, edgeFrom, edgeTo, corner } = best;
  const rise = y[edgeTo]! - y[edgeFrom]!;
  const startEdge = y[edgeFrom]! * run - rise * x[edgeFrom]!;
  const startCorner = y[corner]! * run - rise * x[corner]!;
  return { rise: 2n * rise, run: 2n * run, start: startEdge + startCorner };
}

type Strip = { gap: bigint; run: bigint; edgeFrom: number; edgeTo: number; corner: number };

/** Lower (side 1) or upper (side −1) hull, left to right, as indices. */
function hull(x: readonly bigint[], y: readonly bigint[], first: number, last: number, side: bigint): number[] {
  const kept: number[] = [];
  for (let i = first; i <= last; i++) {
    while (kept.length >= 2) {
      const b = kept[kept.length - 1]!;
      const a = kept[kept.length - 2]!;
      const turn = (x[b]! - x[a]!) * (y[i]! - y[a]!) - (y[b]! - y[a]!) * (x[i]! - x[a]!);
      if (side > 0n ? turn > 0n : turn < 0n) break;
      kept.pop();
    }
    kept.push(i);
  }
  return kept;
}

/** Largest height between the corners of one hull and the edges of the other. */
function highest(
  x: readonly bigint[],
  y: readonly bigint[],
  corners: readonly number[],
  edges: readonly number[],
  known: Strip,
): Strip {
  let best = known;
  let edge = 0;
  for (const corner of corners) {
    while (edge < edges.length - 2 && x[edges[edge + 1]!]! < x[corner]!) edge++;
    const edgeFrom = edges[edge]!;
    const edgeTo = edges[edge + 1]!;
    const run = x[edgeTo]! - x[edgeFrom]!;
    const signed = (y[corner]! - y[edgeFrom]!) * run - (y[edgeTo]! - y[edgeFrom]!) * (x[corner]! - x[edgeFrom]!);
    const gap = signed < 0n ? -signed : signed;
    if (gap * best.run > best.gap * run) best = { gap, run, edgeFrom, edgeTo, corner };
  }
  return best;
}
