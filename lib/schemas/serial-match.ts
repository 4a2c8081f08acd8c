import { foldSerial } from './serial-number';

/** How well a machine fits what was looked for, best first. */
export const matches = ['exact', 'folded', 'prefix', 'part', 'slip'] as const;
export type Match = (typeof matches)[number];

export interface SerialPiece {
  text: string;
  /** Found (or, for a slip, differing) signs. */
  marked: boolean;
}

/**
 * The serial number in pieces: those signs marked that the search found; for a slip those that differ. Dashes and spaces within
 * the found part are marked with it.
 */
export function markSerial(serialNumber: string, query: string, match: Match): SerialPiece[] {
  const signs = [...serialNumber];
  const folded = signs.map((sign) => foldSerial(sign));
  const whole = folded.join('');
  const wanted = foldSerial(query);
  const [from, to] = match === 'slip' ? differing(whole, wanted) : found(whole, wanted);
  if (from >= to) return [{ text: serialNumber, marked: false }];
  // Place in the folded text of each printed sign.
  let place = 0;
  const marks = folded.map((sign) => {
    const at = place;
    place += sign.length;
    return sign.length > 0 ? at >= from && at < to : at > from && at < to;
  });
  return signs.reduce<SerialPiece[]>((pieces, sign, index) => {
    const marked = marks[index] ?? false;
    const last = pieces.at(-1);
    if (last && last.marked === marked) last.text += sign;
    else pieces.push({ text: sign, marked });
    return pieces;
  }, []);
}

function found(whole: string, wanted: string): [number, number] {
  const at = wanted ? whole.indexOf(wanted) : -1;
  return at < 0 ? [0, 0] : [at, at + wanted.length];
}

/** What is left of the serial number when the common beginning and end are taken away. */
function differing(whole: string, wanted: string): [number, number] {
  const shorter = Math.min(whole.length, wanted.length);
  let start = 0;
  while (start < shorter && whole[start] === wanted[start]) start++;
  let end = 0;
  while (end < shorter - start && whole.at(-1 - end) === wanted.at(-1 - end)) end++;
  const to = whole.length - end;
  // A sign is missing in the serial number: its neighbour shows where.
  return start < to ? [start, to] : [Math.max(0, start - 1), start];
}

/**
 * LIKE patterns of everything that is one slip away from a folded serial number: a sign substituted, missing, added, or two swapped.
 * @param folded letters and digits only, so that nothing needs escaping
 */
export function slipPatterns(folded: string): string[] {
  const patterns = new Set<string>();
  const at = (index: number) => [folded.slice(0, index), folded.slice(index)] as const;
  for (let index = 0; index <= folded.length; index++) {
    const [head, tail] = at(index);
    patterns.add(`${head}_${tail}`);
    if (tail.length === 0) continue;
    patterns.add(`${head}_${tail.slice(1)}`);
    patterns.add(head + tail.slice(1));
    if (tail.length > 1) patterns.add(`${head}${tail[1]}${tail[0]}${tail.slice(2)}`);
  }
  patterns.delete(folded);
  return [...patterns];
}
