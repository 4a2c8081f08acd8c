import { DIRECTION_WORDS } from '@/lib/reporting/words';
import { convert } from '@/lib/units/convert';
import type { Direction, PlannedTolerance } from '@/standards/types';

/** `T 0.015 mm over 300 mm, concave only`. */
export function toleranceWords(tolerance: PlannedTolerance | null, direction: Direction): string {
  if (!tolerance) return 'No tolerance is given: for information.';
  const parts = [`T ${convert(tolerance.baseUm, 'µm', 'mm')} mm`];
  if (tolerance.perLength) parts[0] += ` over ${tolerance.perLength.baseLengthMm} mm`;
  if (direction !== 'either') parts.push(DIRECTION_WORDS[direction]);
  if (tolerance.local) {
    parts.push(`${convert(tolerance.local.toleranceUm, 'µm', 'mm')} mm over any ${tolerance.local.lengthMm} mm`);
  }
  return parts.join(', ');
}
