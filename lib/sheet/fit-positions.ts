import type { DecimalText } from '@/standards/types';

/** Steps at which a travel is read, mm; the smallest that needs no more than so many positions. */
const STEPS_MM = [5, 10, 20, 25, 50, 100, 200, 250, 500];
const MOST_STEPS = 12;

/**
 * The positions as they stand where the machine reaches; otherwise as many, evenly, over what it reaches.
 * @param reachMm travel, or the length between centres; null: not known, nothing is changed
 */
export function within(positions: DecimalText[], reachMm: DecimalText | null): DecimalText[] {
  const first = Number(positions[0]);
  const reach = reachMm === null ? Number.POSITIVE_INFINITY : Number(reachMm);
  if (Number(positions.at(-1)) - first <= reach) return positions;
  const step = reach / (positions.length - 1);
  const rounded = step >= 10 ? Math.floor(step / 5) * 5 : Math.floor(step * 10) / 10;
  return positions.map((_, row) => String(Math.round((first + row * rounded) * 10) / 10));
}

/** Evenly over the whole travel of a slide whose own motion is measured, its far end included. */
export function alongTravel(positionsMm: DecimalText[], travelMm: DecimalText | null): DecimalText[] {
  if (travelMm === null) return positionsMm;
  const travel = Number(travelMm);
  const step = STEPS_MM.find((candidate) => travel / candidate <= MOST_STEPS) ?? STEPS_MM.at(-1)!;
  const count = Math.floor(travel / step);
  const positions = Array.from({ length: count + 1 }, (_, row) => String(row * step));
  return count * step < travel ? [...positions, travelMm] : positions;
}

/** The shortest of several lengths; null where none is known. */
export function shortest(lengths: (DecimalText | null)[]): DecimalText | null {
  const known = lengths.filter((length) => length !== null);
  return known.sort((a, b) => Number(a) - Number(b))[0] ?? null;
}
