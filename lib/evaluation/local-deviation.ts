import { Fraction } from '@/lib/units/fraction';
import { type LineType, lineThrough, type Profile } from './line';

export type Window = { first: number; last: number };
export type LocalDeviation = { size: bigint; unit: bigint; at: number };

/**
 * Largest deviation over any window of the length `length` (same whole numbers as the profile's positions): windows
 * begin or end at a measured point, nothing is interpolated, the line is fitted anew in each, windows of fewer than
 * three points are left out.
 * @returns size/unit in whole numbers of y, and the index of the worst window's smallest position; null: no window
 */
export function localDeviation(profile: Profile, length: bigint, type: LineType): LocalDeviation | null {
  const windows = windowsOf(profile.x, length);
  const bounds = type === 'minimum-zone' && windows.length > 8 ? stripBounds(profile, windows) : null;
  if (bounds) {
    const rank = new Map(windows.map((window, k) => [window, bounds.sizes[k]!]));
    windows.sort((a, b) => compare(rank.get(b)!, rank.get(a)!));
    return worstOf(profile, windows, type, (window) => ({ size: rank.get(window)!, unit: bounds.unit }));
  }
  return worstOf(profile, windows, type, () => null);
}

function worstOf(
  profile: Profile,
  windows: readonly Window[],
  type: LineType,
  boundOf: (window: Window) => { size: bigint; unit: bigint } | null,
): LocalDeviation | null {
  let worst: LocalDeviation | null = null;
  for (const window of windows) {
    const bound = worst && boundOf(window);
    if (worst && bound && bound.size * worst.unit < worst.size * bound.unit) break;
    const { size, unit } = deviationWithin(profile, window, type);
    const difference: number = worst ? compare(size * worst.unit, worst.size * unit) : 1;
    if (!worst || difference > 0 || (difference === 0 && window.first < worst.at))
      worst = { size, unit, at: window.first };
  }
  return worst;
}

function windowsOf(x: readonly bigint[], length: bigint): Window[] {
  const end = x.length - 1;
  const seen = new Map<number, Window>();
  const add = (first: number, last: number) => {
    if (last - first >= 2) seen.set(first * x.length + last, { first, last });
  };
  for (let first = 0, last = 0; first <= end && x[first]! + length <= x[end]!; first++) {
    while (last < end && x[last + 1]! <= x[first]! + length) last++;
    add(first, last);
  }
  for (let last = end, first = end; last >= 0 && x[last]! - length >= x[0]!; last--) {
    while (first > 0 && x[first - 1]! >= x[last]! - length) first--;
    add(first, last);
  }
  return [...seen.values()];
}

function deviationWithin(profile: Profile, { first, last }: Window, type: LineType): { size: bigint; unit: bigint } {
  const { rise, start, run } = lineThrough(profile, first, last, type);
  let most = run * profile.y[first]! - rise * profile.x[first]! - start;
  let least = most;
  for (let i = first + 1; i <= last; i++) {
    const residual = run * profile.y[i]! - rise * profile.x[i]! - start;
    if (residual > most) most = residual;
    else if (residual < least) least = residual;
  }
  return { size: most - least, unit: run };
}

/**
 * No window's minimum zone is wider than the spread of its residuals from the line of the whole profile; sorting by
 * this bound leaves only few windows to be fitted.
 */
function stripBounds(profile: Profile, windows: readonly Window[]): { sizes: bigint[]; unit: bigint } {
  const { rise, start, run } = lineThrough(profile, 0, profile.x.length - 1, 'minimum-zone');
  const residuals = profile.y.map((y, i) => run * y - rise * profile.x[i]! - start);
  const highs = rangeTable(residuals, 1n);
  const lows = rangeTable(residuals, -1n);
  return { unit: run, sizes: windows.map(({ first, last }) => highs(first, last) - lows(first, last)) };
}

/** Largest (sign 1) or smallest (sign −1) value of any stretch, in O(1) after O(n log n). */
function rangeTable(values: readonly bigint[], sign: 1n | -1n) {
  const better = (a: bigint, b: bigint) => ((a - b) * sign > 0n ? a : b);
  const levels: (readonly bigint[])[] = [values];
  for (let width = 1; width * 2 <= values.length; width *= 2) {
    const below = levels[levels.length - 1]!;
    levels.push(below.slice(0, below.length - width).map((value, i) => better(value, below[i + width]!)));
  }
  return (first: number, last: number): bigint => {
    const level = 31 - Math.clz32(last - first + 1);
    return better(levels[level]![first]!, levels[level]![last + 1 - (1 << level)]!);
  };
}

function compare(a: bigint, b: bigint): number {
  return a > b ? 1 : a < b ? -1 : 0;
}

/** The figure in µm of a local deviation whose readings carry `readingUnit` whole numbers to the µm. */
export function localDeviationUm(local: LocalDeviation, readingUnit: bigint): Fraction {
  return Fraction.of(local.size, local.unit * readingUnit);
}
