import { Fraction } from '@/lib/units/fraction';
import { risingOrder, seriesFromFractions, seriesFromTexts } from './series';

/**
 * Largest difference of two figures whose positions lie no further apart than a length; over the whole length or more it is the
 * range itself, and 0 where no two positions lie so close.
 *
 * max |m_i − m_j| over all i, j with |z_i − z_j| ≤ l. Source: common practice (a local tolerance over any length l).
 * @param positions mm, any order, all different
 * @param figures µm, one a position
 * @param lengthMm mm > 0
 */
export function localRange(positions: readonly string[], figures: readonly Fraction[], lengthMm: string): Fraction {
  const { values } = seriesFromTexts([...positions, lengthMm]);
  const length = values[positions.length]!;
  const { values: m, unit } = seriesFromFractions(figures);
  const order = risingOrder(values.slice(0, positions.length));
  const high: number[] = [];
  const low: number[] = [];
  let widest = 0n;
  for (const i of order) {
    keepExtremes(high, i, (other) => m[other]! <= m[i]!);
    keepExtremes(low, i, (other) => m[other]! >= m[i]!);
    for (const queue of [high, low]) while (values[i]! - values[queue[0]!]! > length) queue.shift();
    const width = m[high[0]!]! - m[low[0]!]!;
    if (width > widest) widest = width;
  }
  return Fraction.of(widest, unit);
}

/** The window's extreme stands first; what a later figure outdoes can never be the extreme again. */
function keepExtremes(queue: number[], index: number, isOutdone: (other: number) => boolean): void {
  while (queue.length > 0 && isOutdone(queue[queue.length - 1]!)) queue.pop();
  queue.push(index);
}
