import solver from 'javascript-lp-solver';
import { jStat } from 'jstat';
import { lusolve, multiply, transpose } from 'mathjs';
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
function narrowest(rows: Row[]): number {
  return narrowestWith(rows).width!;
}

type Row = { terms: Record<string, number>; reading: number };

/** The same with the factors of the terms. */
function narrowestWith(rows: Row[]): Record<string, number> {
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
  } & Record<string, number | undefined>;
  expect(answer.feasible).toBe(true);
  const factor = (name: string) => (answer[`${name}Plus`] ?? 0) - (answer[`${name}Minus`] ?? 0);
  return { width: answer.result, ...Object.fromEntries(names.map((name) => [name, factor(name)])) };
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

  // The circle is not linear: the programme is solved for the radii seen from a centre, the centre moved, until it stands still.
  it('circular test, minimum zone by true geometry', () => {
    const random = generator(107);
    for (let run = 0; run < 20; run++) {
      const nominal = [20, 50, 150][run % 3]!;
      const arc = run % 4 === 3 ? 120 : 360;
      const count = 6 + Math.floor(random() * 14);
      const trace = Array.from({ length: count }, (_, i) => ({
        angle: hundredths(((i + random() * 0.8) * arc) / count),
        radius: hundredths(random() * 12 - 6),
      }));
      const ours = evaluate({
        method: 'circular',
        nominalRadius: String(nominal),
        arc: String(arc),
        clockwise: trace,
      }).clockwise!.G;
      const points = trace.map(({ angle, radius }) => {
        const [at, r] = [(Number(angle) * Math.PI) / 180, nominal * 1000 + Number(radius)];
        return { x: r * Math.cos(at), y: r * Math.sin(at) };
      });
      let centre = { x: 0, y: 0 };
      let theirs = Number.POSITIVE_INFINITY;
      for (let step = 0; step < 6; step++) {
        const seen = points.map(({ x, y }) => ({
          angle: Math.atan2(y - centre.y, x - centre.x),
          r: Math.hypot(x - centre.x, y - centre.y),
        }));
        const rows = seen.map(({ angle, r }) => ({
          terms: { a: Math.cos(angle), b: Math.sin(angle) },
          reading: r - nominal * 1000,
        }));
        const { width, a, b } = narrowestWith(rows);
        centre = { x: centre.x + a!, y: centre.y + b! };
        theirs = width!;
      }
      expect(Number(ours)).toBeCloseTo(theirs, 5);
    }
  });
});

describe('least squares with more coefficients (mathjs)', () => {
  /** Solution of the normal equations. */
  const solve = (rows: number[][], right: number[]): number[] => {
    const across = transpose(rows);
    const answer = lusolve(multiply(across, rows), multiply(across, right)) as number[][];
    return answer.map(([value]) => value!);
  };

  it('plane of a flatness', () => {
    const random = generator(108);
    for (let run = 0; run < 40; run++) {
      const points = Array.from({ length: 4 + Math.floor(random() * 30) }, (_, i) => ({
        x: hundredths((i % 6) * 40 + random() * 20),
        y: hundredths(Math.floor(i / 6) * 40 + random() * 20 + (i % 2)),
        reading: hundredths(random() * 30 - 15),
      }));
      const ours = evaluate({ method: 'flatness', reference: 'least-squares', points });
      const [a, b, c] = solve(
        points.map((p) => [1, Number(p.x), Number(p.y)]),
        points.map((p) => Number(p.reading)),
      ) as [number, number, number];
      expect(Number(ours.a)).toBeCloseTo(a, 7);
      expect(Number(ours.b) / 1000).toBeCloseTo(b, 8);
      expect(Number(ours.c) / 1000).toBeCloseTo(c, 8);
      const residuals = points.map((p) => Number(p.reading) - a - b * Number(p.x) - c * Number(p.y));
      expect(Number(ours.deviation)).toBeCloseTo(Math.max(...residuals) - Math.min(...residuals), 7);
    }
  });

  it('first harmonic of a run-out, at any angles', () => {
    const random = generator(109);
    for (let run = 0; run < 40; run++) {
      const count = 3 + Math.floor(random() * 20);
      const angles = Array.from({ length: count }, (_, i) => hundredths(((i + random() * 0.7) * 360) / count));
      const readings = angles.map(() => hundredths(random() * 20 - 10));
      const { perInsertion, eccentricity, phase } = evaluate({ method: 'run-out', angles, insertions: [{ readings }] });
      const radians = angles.map((angle) => (Number(angle) * Math.PI) / 180);
      const [, a, b] = solve(
        radians.map((angle) => [1, Math.cos(angle), Math.sin(angle)]),
        readings.map(Number),
      ) as [number, number, number];
      expect(Number(eccentricity)).toBeCloseTo(Math.hypot(a, b), 8);
      const turned = Math.abs(Number(phase) - (Math.atan2(b, a) * 180) / Math.PI);
      expect(Math.min(turned, Math.abs(turned - 360))).toBeLessThan(1e-7);
      expect(perInsertion[0]!.eccentricity).toBe(eccentricity);
      const roundness = evaluate({
        method: 'roundness',
        reference: 'least-squares',
        points: [...angles.map((angle, i) => ({ angle, reading: readings[i]! })), { angle: '359.995', reading: '0' }],
      });
      const all = [...radians, (359.995 * Math.PI) / 180];
      const rows = all.map((angle) => [1, Math.cos(angle), Math.sin(angle)]);
      const values = [...readings.map(Number), 0];
      const fit = solve(rows, values);
      const residuals = rows.map((row, i) => values[i]! - row.reduce((sum, part, k) => sum + part * fit[k]!, 0));
      expect(Number(roundness.leastSquares)).toBeCloseTo(Math.max(...residuals) - Math.min(...residuals), 7);
      expect(Number(roundness.centre.x)).toBeCloseTo(fit[1]!, 7);
      expect(Number(roundness.centre.y)).toBeCloseTo(fit[2]!, 7);
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
