/**
 * The same entries, those with the same words moved up to the first of them; entries without words and entries of another `step` stay
 * where they are. Stable, so that a group keeps its own order; what `leads` stands first in its group.
 */
export function keepTogether<T>(
  entries: readonly T[],
  step: (entry: T) => number,
  words: (entry: T) => string | null,
  leads: (entry: T) => boolean = () => false,
): T[] {
  const groups = new Map<string, T[]>();
  const order: T[][] = [];
  for (const entry of entries) {
    const name = words(entry);
    const key = name === null ? null : `${step(entry)} ${name}`;
    const group = key === null ? undefined : groups.get(key);
    if (group) {
      if (leads(entry)) group.unshift(entry);
      else group.push(entry);
      continue;
    }
    const fresh = [entry];
    order.push(fresh);
    if (key !== null) groups.set(key, fresh);
  }
  return order.flat();
}
