import { formatDecimal } from '@/lib/units/format';
import { Fraction } from '@/lib/units/fraction';
import { round } from '@/lib/units/round';

const MOST_DECIMALS = 6;

/** A figure as it is put into a formula: in full where it is short, else to six decimals with an ellipsis. */
export function fig(text: string): string {
  const decimals = text.split('.')[1]?.length ?? 0;
  if (decimals <= MOST_DECIMALS) return formatDecimal(text);
  return `${formatDecimal(round(text, '0.000001', 'half-even'))}…`;
}

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

/** `8 − (−1)`. */
export function rangeOf(values: readonly string[]): string {
  const { largest, smallest } = extremes(values);
  return `${fig(largest)} − ${negative(smallest)}`;
}

export const um = (text: string): string => `${fig(text)} µm`;
export const umPerM = (text: string): string => `${fig(text)} µm/m`;
