import { Fraction } from './fraction';
import type { Unit } from './unit';

/** π to 30 digits (published constant), enough for 30 digits of a converted angle. */
const PI = Fraction.from('3.14159265358979323846264338328');

/** Length in µm and slope in µm/m of one unit. An inch is 25.4 mm exactly; µm/m and µrad are one for small angles. */
const LENGTH_UM: Partial<Record<Unit, Fraction>> = {
  µm: Fraction.of(1),
  mm: Fraction.of(1000),
  in: Fraction.of(25400),
};
const SLOPE_UM_PER_M: Partial<Record<Unit, Fraction>> = {
  'µm/m': Fraction.of(1),
  'mm/m': Fraction.of(1000),
  arcsec: PI.times(Fraction.of(1_000_000n, 648_000n)),
};

/** Whether a value in one unit can be given in the other. */
export function convertible(from: Unit, to: Unit): boolean {
  return from === to || [LENGTH_UM, SLOPE_UM_PER_M].some((table) => table[from] && table[to]);
}

/**
 * Exact conversion between mm, µm and in, and between µm/m, mm/m and arcsec.
 * @param value decimal string in `from`
 * @returns decimal string in `to`: in full where finite, else 30 significant digits
 * @throws RangeError where the units measure different things
 * @example convert('0.0136', 'mm', 'µm') === '13.6'; convert('1', 'in', 'mm') === '25.4'
 */
export function convert(value: string, from: Unit, to: Unit): string {
  if (from === to) return Fraction.from(value).toText();
  for (const table of [LENGTH_UM, SLOPE_UM_PER_M]) {
    const source = table[from];
    const target = table[to];
    if (source && target) return Fraction.from(value).times(source).dividedBy(target).toText();
  }
  throw new RangeError(`${from} cannot be given in ${to}`);
}
