import Decimal from 'decimal.js';

/**
 * The one decimal type of the product: 50 significant digits, never an exponent in its text.
 * Sums, quotients and verdicts that can be exact use `Fraction`; `Dec` serves roots, angles and distributions.
 */
export const Dec = Decimal.clone({ precision: 50, toExpNeg: -9e15, toExpPos: 9e15, rounding: Decimal.ROUND_HALF_EVEN });
export type Dec = Decimal;

/** Digits given where a result has no finite decimal form (the contract asks for at least 20). */
export const RESULT_DIGITS = 30;

/** Above this many digits a `Dec` holds a cut-off irrational number, not a finite one. */
const FINITE_DIGITS = 40;

/**
 * Plain notation: no exponent, no minus zero, irrational results cut to 30 significant digits.
 * @example plain(new Dec('-0')) === '0'; plain(new Dec(2).sqrt()) === '1.41421356237309504880168872421'
 */
export function plain(value: Dec): string {
  const shown = value.precision() > FINITE_DIGITS ? value.toSignificantDigits(RESULT_DIGITS) : value;
  return shown.isZero() ? '0' : shown.toFixed();
}
