import { Fraction, powerOfTen, splitDecimal } from '@/lib/units/fraction';
import { refuse } from './evaluation-error';

/** Many figures over one denominator: figure i is values[i] / unit. Whole numbers keep every comparison exact. */
export type Series = { readonly values: readonly bigint[]; readonly unit: bigint };

/** Decimal strings brought to the same number of decimals. */
export function seriesFromTexts(texts: readonly string[]): Series {
  const parts = texts.map(splitDecimal);
  const places = parts.reduce((most, part) => Math.max(most, part.places), 0);
  return { values: parts.map((part) => part.digits * powerOfTen(places - part.places)), unit: powerOfTen(places) };
}

export function seriesFromFractions(fractions: readonly Fraction[]): Series {
  let unit = 1n;
  for (const { d } of fractions) if (unit % d !== 0n) unit = leastCommonMultiple(unit, d);
  return { values: fractions.map(({ n, d }) => n * (unit / d)), unit };
}

export function fractionAt(series: Series, index: number): Fraction {
  return Fraction.of(series.values[index]!, series.unit);
}

function leastCommonMultiple(a: bigint, b: bigint): bigint {
  let x = a;
  let y = b;
  while (y !== 0n) [x, y] = [y, x % y];
  return (a / x) * b;
}

/** Indices in rising order of value. */
export function risingOrder(values: readonly bigint[]): number[] {
  const order = values.map((_, index) => index);
  const isRising = values.every((value, index) => index === 0 || values[index - 1]! <= value);
  return isRising ? order : order.sort((a, b) => (values[a]! < values[b]! ? -1 : values[a]! > values[b]! ? 1 : a - b));
}

/** Refuses equal figures; `pathOf` gives the field of the later one. */
export function refuseRepeats(series: Series, pathOf: (index: number) => PropertyKey[], what: string): void {
  const order = risingOrder(series.values);
  for (let k = 1; k < order.length; k++) {
    const [earlier, later] = [order[k - 1]!, order[k]!];
    if (series.values[earlier] === series.values[later]) {
      refuse(pathOf(Math.max(earlier, later)), `the same ${what} stands twice; average repeated readings before`);
    }
  }
}

export function smallestOf(values: readonly bigint[]): bigint {
  let best = values[0]!;
  for (const value of values) if (value < best) best = value;
  return best;
}

export function largestOf(values: readonly bigint[]): bigint {
  let best = values[0]!;
  for (const value of values) if (value > best) best = value;
  return best;
}
