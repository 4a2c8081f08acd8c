import { evaluate } from '@/lib/evaluation';
import { formatDecimal } from '@/lib/units/format';
import { Fraction, splitDecimal } from '@/lib/units/fraction';
import type { DecimalText, PlannedTolerance } from '@/standards/types';

export interface ScaledTolerance {
  toleranceUm: DecimalText;
  /** `15·240/300 = 12, above the floor of 5`; null where nothing is scaled. */
  arithmetic: string | null;
}

/**
 * Tolerance for the length really measured: T(L) = min(max(T0·L/L0, minimum), maximum), only where it is given per length.
 * @param lengthMm length really measured; null where the method has none
 */
export function scaleTolerance(tolerance: PlannedTolerance, lengthMm: DecimalText | null): ScaledTolerance {
  const { baseUm, perLength } = tolerance;
  if (!perLength || lengthMm === null) return { toleranceUm: baseUm, arithmetic: null };
  const { baseLengthMm, minimumUm, maximumUm } = perLength;
  const { tolerance: toleranceUm } = evaluate({
    method: 'tolerance',
    base: baseUm,
    baseLength: baseLengthMm,
    length: lengthMm,
    minimum: minimumUm,
    ...(maximumUm === undefined ? {} : { maximum: maximumUm }),
  });
  const scaled = Fraction.from(baseUm).times(Fraction.from(lengthMm)).dividedBy(Fraction.from(baseLengthMm));
  const sum = `${baseUm}·${lengthMm}/${baseLengthMm} = ${shortened(scaled.toText())}`;
  return { toleranceUm, arithmetic: `${sum}, ${limitWords(scaled, minimumUm, maximumUm)}` };
}

function limitWords(scaled: Fraction, minimumUm: string, maximumUm: string | undefined): string {
  if (maximumUm !== undefined && scaled.compare(Fraction.from(maximumUm)) > 0) return `cut to the most of ${maximumUm}`;
  const side = scaled.compare(Fraction.from(minimumUm));
  if (side === 0) return 'equal to the floor';
  return side > 0 ? `above the floor of ${minimumUm}` : `raised to the floor of ${minimumUm}`;
}

/** Three decimals and an ellipsis where more follow: 6.666…. Cut, not rounded, because it is no result. */
function shortened(text: string): string {
  const { places } = splitDecimal(text);
  return places <= 3 ? formatDecimal(text) : `${text.slice(0, text.length - (places - 3))}…`;
}
