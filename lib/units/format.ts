import { placesToText, splitDecimal } from './fraction';
import { type RoundingRule, roundToDecimals } from './round';

export type FormatOptions = {
  /** Fixed number of decimals; without it the value is shown as it is. */
  decimals?: number;
  rule?: RoundingRule;
  /** Decides the decimal mark only. */
  locale?: string;
  /** A plus in front of a value above zero. */
  signed?: boolean;
  /** `typographic` U+2212 (screen and print), `ascii` U+002D (files for other programs). */
  minus?: 'typographic' | 'ascii';
};

const marks = new Map<string, string>();

/** Decimal mark of a locale, "." where the locale is not known. */
export function decimalMark(locale: string): string {
  let mark = marks.get(locale);
  if (mark === undefined) {
    mark = new Intl.NumberFormat(locale).formatToParts(1.5).find((part) => part.type === 'decimal')?.value ?? '.';
    marks.set(locale, mark);
  }
  return mark;
}

/**
 * The one formatter of decimal strings: no float, no grouping, never minus zero.
 * @example formatDecimal('-0.0042', { decimals: 3, locale: 'de' }) === '−0,004'
 */
export function formatDecimal(value: string, options: FormatOptions = {}): string {
  const { decimals, rule = 'half-even', locale = 'en', signed = false, minus = 'typographic' } = options;
  const split = splitDecimal(value);
  const text =
    decimals === undefined ? placesToText(split.digits, split.places, true) : roundToDecimals(value, decimals, rule);
  const negative = text.startsWith('-');
  const unsigned = (negative ? text.slice(1) : text).replace('.', decimalMark(locale));
  if (negative) return (minus === 'ascii' ? '-' : '\u2212') + unsigned;
  return signed && /[1-9]/.test(unsigned) ? `+${unsigned}` : unsigned;
}
