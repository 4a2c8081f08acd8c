import { formatDecimal } from '@/lib/units/format';
import { Fraction } from '@/lib/units/fraction';
import { round } from '@/lib/units/round';

const MOST_DECIMALS = 6;
const MOST_IN_A_SUM = 8;

/** A figure as it is put into a formula: in full where it is short, else to six decimals with an ellipsis. */
export function fig(text: string): string {
  const plain = Fraction.from(text).toText();
  const decimals = plain.split('.')[1]?.length ?? 0;
  if (decimals <= MOST_DECIMALS) return formatDecimal(plain);
  return `${formatDecimal(round(plain, '0.000001', 'half-even'))}…`;
}

/** In brackets where it is negative, so that it may follow an operator. */
export const negative = (text: string): string => (text.startsWith('-') ? `(${fig(text)})` : fig(text));

/** `a, b, c … 7 more … z`: the first three and the last. */
export function listed(values: readonly string[]): string {
  if (values.length <= 5) return values.map(fig).join(', ');
  return `${values.slice(0, 3).map(fig).join(', ')} … ${values.length - 4} more … ${fig(values.at(-1)!)}`;
}

/** Places of the largest and the smallest, and both as they are put into `largest − smallest`. */
export function extremes(values: readonly string[]) {
  const numbers = values.map((value) => Fraction.from(value));
  const largest = Fraction.max(numbers);
  const smallest = Fraction.min(numbers);
  const at = (wanted: Fraction) => numbers.findIndex((number) => number.equals(wanted));
  return {
    largest: values[at(largest)]!,
    smallest: values[at(smallest)]!,
    atLargest: at(largest),
    atSmallest: at(smallest),
  };
}

/** Place of the largest amount, whatever its sign. */
export const atLargestAmount = (values: readonly string[]): number =>
  extremes(values.map((value) => Fraction.from(value).abs().toText())).atLargest;

/** `8 − (−1)`. */
export function rangeOf(values: readonly string[]): string {
  const { largest, smallest } = extremes(values);
  return `${fig(largest)} − ${negative(smallest)}`;
}

export const sumOf = (values: readonly string[]): string =>
  Fraction.sum(values.map((value) => Fraction.from(value))).toText();
export const meanOf = (values: readonly string[]): string =>
  Fraction.mean(values.map((value) => Fraction.from(value))).toText();
export const spanOf = (values: readonly string[]): string =>
  Fraction.range(values.map((value) => Fraction.from(value))).toText();

/** `(a + b + (−c)) / 3`; of many the sum, which is exact. */
export function meanText(values: readonly string[]): string {
  if (values.length > MOST_IN_A_SUM) return `${negative(sumOf(values))} / ${values.length}`;
  return `(${values.map((value, k) => (k === 0 ? fig(value) : negative(value))).join(' + ')}) / ${values.length}`;
}

/** By rising figure, with the place where each stood. */
export const rising = (values: readonly string[]): number[] =>
  values.map((_, k) => k).sort((a, b) => Fraction.from(values[a]!).compare(Fraction.from(values[b]!)));

export const um = (text: string): string => `${fig(text)} µm`;
export const umPerM = (text: string): string => `${fig(text)} µm/m`;

/** `… 7 more alike`: stands in for steps that are done like the ones before. */
export const alike = (count: number) =>
  count > 0 ? [{ what: `… ${count} more alike`, formula: '', withNumbers: '', value: '' }] : [];
