import solver from 'javascript-lp-solver';
import { jStat } from 'jstat';
import { SimpleLinearRegression } from 'ml-regression-simple-linear';
import { linearRegression, mean, sampleStandardDeviation } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { evaluate, judge } from '@/lib/evaluation';
import { studentQuantile } from '@/lib/uncertainty/student-t';

/**
 * General-purpose libraries asked the same question, on random readings from a fixed seed. They compute in doubles,
 * so agreement is asked to about their precision. Not used: the normal quantile of simple-statistics, which is wrong in the
 * fourth digit.
 */
function generator(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 1_103_515_245 + 12_345) % 2_147_483_648;
    return state / 2_147_483_648;
  };
}

const hundredths = (value: number) => (Math.round(value * 100) / 100).toString();

/** Least upper − lower with lower ≤ reading − Σ terms ≤ upper, as a linear programme. */
function narrowest(rows: { terms: Record<string, number>; reading: number }[]): number {
  const names = Object.keys(rows[0]!.terms);
  const constraints: Record<string, { min?: number; max?: number }> = {};
  const columns: Record<string, Record<string, number>> = { upper: { width: 1 }, lower: { width: -1 } };
  for (const name of names) columns[name] = {};
  rows.forEach(({ terms, reading }, i) => {
    constraints[`above${i}`] = { min: reading };
    constraints[`below${i}`] = { max: reading };
    columns.upper![`above${i}`] = 1;
    columns.lower![`below${i}`] = 1;
    for (const name of names) {
      columns[name]![`above${i}`] = terms[name]!;
      columns[name]![`below${i}`] = terms[name]!;
    }
  });
  // The solver's own unrestricted variables found no solution of solvable cases, so each is a difference of two.
  const variables = Object.fromEntries(
    Object.entries(columns).flatMap(([name, column]) => [
      [`${name}Plus`, column],
      [`${name}Minus`, Object.fromEntries(Object.entries(column).map(([key, value]) => [key, -value]))],
    ]),
  );
  const answer = solver.Solve({ optimize: 'width', opType: 'min', constraints, variables } as never) as {
    feasible: boolean;
    result: number;
  };
  expect(answer.feasible).toBe(true);
  return answer.result;
}

describe('linear programming (javascript-lp-solver)', () => {
  it('straightness, minimum zone', () => {
    const random = generator(101);
    for (let run = 0; run < 40; run++) {
      const points = Array.from({ length: 5 + Math.floor(random() * 20) }, (_, i) => ({
        position: hundredths(i * 10 + random() * 9),
        reading: hundredths(random() * 40 - 20),
      }));
      const ours = evaluate({ method: 'straightness', reference: 'minimum-zone', points }).deviation;
      const theirs = narrowest(
        points.map((p) => ({ terms: { slope: Number(p.position) / 100 }, reading: Number(p.reading) })),
      );
      expect(Number(ours)).toBeCloseTo(theirs, 6);
    }
  });

  it('flatness, minimum zone', () => {
    const random = generator(102);
    for (let run = 0; run < 25; run++) {
      const points = Array.from({ length: 25 }, (_, i) => ({
        x: hundredths((i % 5) * 50 + random() * 20),
        y: hundredths(Math.floor(i / 5) * 40 + random() * 20),
        reading: hundredths(random() * 30 - 15),
      }));
      const ours = evaluate({ method: 'flatness', reference: 'minimum-zone', points }).deviation;
      const theirs = narrowest(
        points.map((p) => ({ terms: { b: Number(p.x) / 100, c: Number(p.y) / 100 }, reading: Number(p.reading) })),
      );
      expect(Number(ours)).toBeCloseTo(theirs, 6);
    }
  });

  it('roundness, minimum zone', () => {
    const random = generator(103);
    for (let run = 0; run < 25; run++) {
      const points = Array.from({ length: 4 + Math.floor(random() * 20) }, (_, i) => ({
        angle: hundredths(i * 14 + random() * 10),
        reading: hundredths(random() * 10 - 5),
      }));
      const ours = evaluate({ method: 'roundness', points }).minimumZone;
      const theirs = narrowest(
        points.map((p) => {
          const angle = (Number(p.angle) * Math.PI) / 180;
          return { terms: { a: Math.cos(angle), b: Math.sin(angle) }, reading: Number(p.reading) };
        }),
      );
      expect(Number(ours)).toBeCloseTo(theirs, 6);
    }
  });
});

describe('least squares and standard deviation (simple-statistics, ml-regression-simple-linear)', () => {
  it('line', () => {
    const random = generator(104);
    for (let run = 0; run < 50; run++) {
      const points = Array.from({ length: 3 + Math.floor(random() * 40) }, (_, i) => ({
        position: hundredths(i * 25 + random() * 20),
        reading: hundredths(random() * 60 - 30),
      }));
      const result = evaluate({ method: 'straightness', reference: 'least-squares', points });
      const [x, y] = [points.map((p) => Number(p.position)), points.map((p) => Number(p.reading))];
      const { m, b } = linearRegression(x.map((value, i) => [value, y[i]!]));
      expect(Number(result.slope) / 1000).toBeCloseTo(m, 9);
      expect(Number(result.intercept)).toBeCloseTo(b, 8);
      const other = new SimpleLinearRegression(x, y);
      expect(Number(result.slope) / 1000).toBeCloseTo(other.slope, 9);
      const residuals = x.map((value, i) => y[i]! - other.predict(value));
      expect(Number(result.deviation)).toBeCloseTo(Math.max(...residuals) - Math.min(...residuals), 8);
      const drift = evaluate({
        method: 'drift',
        points: points.map((p) => ({ minutes: p.position, reading: p.reading })),
      });
      expect(Number(drift.rate)).toBeCloseTo(m * 60, 7);
    }
  });

  it('mean and standard deviation of positioning', () => {
    const random = generator(105);
    for (let run = 0; run < 50; run++) {
      const rows = [0, 1, 2].map(() => Array.from({ length: 2 + (run % 9) }, () => hundredths(random() * 20 - 10)));
      const result = evaluate({ method: 'positioning', kind: 'linear', targets: ['0', '10', '20'], forward: rows });
      rows.forEach((row, i) => {
        expect(Number(result.positions[i]!.meanForward)).toBeCloseTo(mean(row.map(Number)), 10);
        expect(Number(result.positions[i]!.sForward)).toBeCloseTo(sampleStandardDeviation(row.map(Number)), 10);
      });
    }
  });
});

describe('distributions (jstat)', () => {
  it('Student t', () => {
    for (const degrees of [1, 2, 3, 4, 5, 7, 10, 16, 19, 25, 55, 100, 500, 2500]) {
      expect(studentQuantile('0.95', BigInt(degrees)).toNumber()).toBeCloseTo(jStat.studentt.inv(0.975, degrees), 6);
      expect(studentQuantile('0.99', BigInt(degrees)).toNumber()).toBeCloseTo(jStat.studentt.inv(0.995, degrees), 6);
    }
  });

  it('probability of conformity', () => {
    const random = generator(106);
    for (let run = 0; run < 100; run++) {
      const [deviation, tolerance, u] = [
        hundredths(random() * 30 - 15),
        hundredths(5 + random() * 10),
        hundredths(0.5 + random() * 4),
      ];
      const { probability } = judge({
        deviation,
        tolerance,
        standardUncertainty: u,
        signed: true,
        direction: 'either',
        rule: 'simple',
      });
      const below = (bound: number) => jStat.normal.cdf(bound, Number(deviation), Number(u));
      expect(Number(probability)).toBeCloseTo(below(Number(tolerance)) - below(-Number(tolerance)), 9);
    }
  });
});
