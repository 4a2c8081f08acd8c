import { Fraction } from '@/lib/units/fraction';
import type { DecimalText } from '@/standards/types';

/** Digits of a figure that could not be kept in full: seconds of arc in µm/m, a third of a length. */
const KEPT_DIGITS = 28;
const TWENTY_DIGITS = Fraction.from('1e20');

/**
 * A deviation as it is compared with its tolerance. Where the tolerance itself could only be kept rounded, the two are compared to 20
 * digits: 9″ typed against a limit of 9″ is at the limit, whatever the 29th digit of either conversion says. Every other figure is
 * compared as it stands.
 * @returns the deviation, or the tolerance with the deviation's sign
 */
export function atLimit(deviation: DecimalText, tolerance: DecimalText): DecimalText {
  if (tolerance.replace(/^[^1-9]*|[^0-9]/g, '').length < KEPT_DIGITS) return deviation;
  const limit = Fraction.from(tolerance);
  const apart = Fraction.from(deviation).abs().minus(limit).abs();
  if (apart.times(TWENTY_DIGITS).compare(limit) > 0) return deviation;
  return deviation.startsWith('-') ? `-${tolerance}` : tolerance;
}
