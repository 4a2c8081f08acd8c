import { convert } from '@/lib/units/convert';
import { round } from '@/lib/units/round';
import type { DecimalText, ShownIn } from '@/standards/types';

/** Unit in which a result is shown; results from before there were others have none and are in mm. */
export const shownUnit = (displayed: { unit?: ShownIn } | null | undefined): ShownIn => displayed?.unit ?? 'mm';

/**
 * A figure of a tolerance or a judgement in the unit in which its result is shown. Lengths are kept in µm, angles in µm/m. Nothing is
 * lost, except of seconds of arc: what a plan keeps of them is a rounded conversion, so they are given to a thousandth of a second.
 * @returns plain decimal string
 */
export function toleranceShown(toleranceUm: DecimalText, unit: ShownIn): DecimalText {
  if (unit === 'mm') return convert(toleranceUm, 'µm', 'mm');
  if (unit === 'mm/m') return convert(toleranceUm, 'µm/m', 'mm/m');
  if (unit === 'items') return toleranceUm;
  const seconds = round(convert(toleranceUm, 'µm/m', 'arcsec'), '0.001', 'half-even');
  return seconds.replace(/\.?0+$/, '');
}

/** `0.012 mm`, `0.02 mm/m`, `5″`; a count of items stands alone. */
export const withUnit = (figure: string, unit: ShownIn): string => {
  if (unit === 'items') return figure;
  return unit === '″' ? `${figure}″` : `${figure} ${unit}`;
};
