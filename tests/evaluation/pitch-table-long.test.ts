import { expect, it } from 'vitest';
import { evaluate } from '@/lib/evaluation';

it('a pitch table over 2,000 targets: every target gives its own mean back, between them the line', () => {
  const positions = Array.from({ length: 2000 }, (_, i) => String(i * 2));
  const means = positions.map((_, i) => String(((i * 7919) % 41) - 20));
  const table = evaluate({
    method: 'correction',
    kind: 'pitch-table',
    positions: [...positions].reverse(),
    means: [...means].reverse(),
    referencePosition: '40',
    start: '-1',
    end: '4001',
    interval: '1',
    unit: '0.5',
    form: 'absolute',
  }) as { points: string[]; values: string[] };
  const reference = Number(means[20]);
  const at = (position: number) => Number(table.values[table.points.indexOf(String(position))]);
  for (const [i, mean] of means.entries()) {
    expect(at(i * 2) + 2 * (Number(mean) - reference)).toBe(0);
    // Half way: whole counts of half a micrometre, nothing to round.
    const next = Number(means[i + 1] ?? mean);
    expect(at(i * 2 + 1) + Number(mean) + next - 2 * reference).toBe(0);
  }
  expect(at(-1)).toBe(at(0));
});
