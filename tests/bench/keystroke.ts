import { evaluate, judge } from '@/lib/evaluation';
import { parseNumber } from '@/lib/units/parse-number';

/** A typed sheet: what stands in the reading fields, 50 mm apart. */
export function typedSheet(count: number, seed: number): string[] {
  let state = seed;
  return Array.from({ length: count }, (_, i) => {
    state = (state * 1_103_515_245 + 12_345) % 2_147_483_648;
    const text = (8 * Math.sin(i / 30) + (state / 2_147_483_648) * 4 - 2).toFixed(2);
    return i % 2 === 0 ? text.replace('.', ',') : text.replace('-', '\u2212');
  });
}

/** Everything a keystroke on a straightness sheet asks for: all texts read, both lines, the verdict. */
export function keystroke(texts: readonly string[]): string {
  const points = texts.map((text, i) => {
    const parsed = parseNumber(text, { defaultUnit: 'µm' });
    if (!parsed.ok) throw new Error(parsed.problem);
    return { position: String(50 * i), reading: parsed.value };
  });
  evaluate({ method: 'straightness', reference: 'least-squares', points });
  const zone = evaluate({ method: 'straightness', reference: 'minimum-zone', points });
  return judge({ deviation: zone.deviation, signed: false, tolerance: '12', direction: 'either', rule: 'simple' })
    .verdict;
}

/** Times in ms of `runs` keystrokes, one reading changed each time. */
export function timeKeystrokes(count: number, runs: number): number[] {
  const texts = typedSheet(count, 5);
  const times: number[] = [];
  for (let run = 0; run < runs; run++) {
    texts[run % count] = `${run % 9},${run % 10}`;
    const start = performance.now();
    keystroke(texts);
    times.push(performance.now() - start);
  }
  return times;
}

export function percentile(times: readonly number[], part: number): number {
  const sorted = [...times].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * part))]!;
}
