import { describe, expect, it } from 'vitest';
import { evaluate, judge } from '@/lib/evaluation';
import { Fraction } from '@/lib/units/fraction';

/** Small linear congruential generator: the same cases on every machine. */
function generator(seed: number): (below: number) => number {
  let state = seed;
  return (below) => {
    state = (state * 1_103_515_245 + 12_345) % 2_147_483_648;
    return Math.floor((state / 2_147_483_648) * below);
  };
}

const fraction = (n: number, d: number) => Fraction.of(n, d).toText();

describe('verdicts at exact ties with the tolerance', () => {
  const next = generator(7);
  /** Readings whose exact result is the tolerance itself, e.g. a slope over a length that is no binary fraction. */
  const cases = Array.from({ length: 1500 }, (_, k) => {
    const tenths = 1 + next(200);
    const tolerance = fraction(tenths, 10);
    if (k % 3 === 0) {
      const base = next(1000) - 500;
      const readings = [fraction(base, 10), fraction(base + tenths, 10), fraction(base + next(tenths + 1), 10)];
      const [a, b] = readings.map(Number);
      return {
        tolerance,
        deviation: () => evaluate({ method: 'run-out', insertions: [{ readings }] }).deviation,
        inDoubles: Math.abs(b! - a!) > Number(tolerance),
      };
    }
    if (k % 3 === 1) {
      // Three insertions whose total readings have the tolerance as mean.
      const shift = next(tenths + 1);
      const totals = [tenths - shift, tenths, tenths + shift];
      return {
        tolerance,
        deviation: () =>
          evaluate({ method: 'run-out', insertions: totals.map((t) => ({ readings: ['0.3', fraction(3 + t, 10)] })) })
            .deviation,
        inDoubles:
          totals.map((t) => Number(fraction(3 + t, 10)) - 0.3).reduce((sum, t) => sum + t) / 3 > Number(tolerance),
      };
    }
    // A slope of tolerance/length through five points, read over the measuring length.
    const length = 30 + 10 * next(60);
    const step = 10 + next(70);
    const positions = [0, 1, 2, 3, 4].map((i) => i * step);
    const readings = positions.map((p) => Fraction.of(tenths * p, 10 * length));
    const finite = readings.every((r) => Fraction.from(r.toText()).equals(r));
    const texts = finite ? readings.map((r) => r.toText()) : positions.map((p) => fraction(tenths * p, 100));
    const over = finite ? length : 10;
    const mean = positions.reduce((sum, p) => sum + p) / 5;
    const slope =
      positions.reduce((sum, p, i) => sum + (p - mean) * Number(texts[i]), 0) /
      positions.reduce((sum, p) => sum + (p - mean) ** 2, 0);
    return {
      tolerance,
      deviation: () =>
        evaluate({
          method: 'parallelism',
          positions: positions.map(String),
          readings: { '0': texts },
          measuringLength: String(over),
        }).deviation,
      inDoubles: slope * over > Number(tolerance),
    };
  });

  it('none of them is wrong, while doubles get some wrong', () => {
    let wrongInDoubles = 0;
    for (const { tolerance, deviation, inDoubles } of cases) {
      const exact = deviation();
      expect(exact).toBe(tolerance);
      const common = { tolerance, signed: false, direction: 'either', rule: 'simple' } as const;
      expect(judge({ ...common, deviation: exact }).verdict).toBe('within-tolerance');
      const more = Fraction.from(exact)
        .plus(Fraction.of(1, 10n ** 40n))
        .toText();
      expect(judge({ ...common, deviation: more }).verdict).toBe('out-of-tolerance');
      if (inDoubles) wrongInDoubles++;
    }
    expect(cases.length).toBeGreaterThanOrEqual(1000);
    expect(wrongInDoubles).toBeGreaterThan(cases.length / 50);
  });
});
