import { DIRECTION_WORDS } from '@/lib/reporting/words';
import { convert } from '@/lib/units/convert';
import { Dec } from '@/lib/units/decimal';
import type { DecimalText, Direction, PlannedTolerance, ShownIn } from '@/standards/types';

/** `T 0.015 mm over 300 mm, concave only`; angles of slides in mm/m, of rotary axes in ″. */
export function toleranceWords(
  tolerance: PlannedTolerance | null,
  direction: Direction,
  shownIn: ShownIn = 'mm',
): string {
  if (shownIn === 'items') return 'Every item must be in order.';
  if (!tolerance) return 'No tolerance is given: for information.';
  const parts = [`T ${figure(tolerance.baseUm, shownIn)}`];
  if (tolerance.perLength) parts[0] += ` over ${tolerance.perLength.baseLengthMm} mm`;
  if (direction !== 'either') parts.push(DIRECTION_WORDS[direction]);
  if (tolerance.local) {
    parts.push(`${figure(tolerance.local.toleranceUm, shownIn)} over any ${tolerance.local.lengthMm} mm`);
  }
  for (const { label, toleranceUm } of tolerance.also ?? []) parts.push(`${label} ${figure(toleranceUm, shownIn)}`);
  return parts.join(', ');
}

function figure(um: DecimalText, shownIn: Exclude<ShownIn, 'items'>): string {
  if (shownIn === 'mm') return `${convert(um, 'µm', 'mm')} mm`;
  if (shownIn === 'mm/m') return `${convert(um, 'µm/m', 'mm/m')} mm/m`;
  // Kept in µm/m to 30 digits; the figure of the rule comes back when what is beyond them is rounded off.
  return `${new Dec(convert(um, 'µm/m', 'arcsec')).toDecimalPlaces(6).toString()}″`;
}
