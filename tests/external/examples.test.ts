import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { evaluate, judge } from '@/lib/evaluation';
import { leastSquaresPlane } from '@/lib/evaluation/flatness';
import { fitLine, slopeUmPerM } from '@/lib/evaluation/line';
import { seriesFromTexts } from '@/lib/evaluation/series';
import { studentQuantile } from '@/lib/uncertainty/student-t';
import { Dec } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import { round } from '@/lib/units/round';
import circleLeastSquares from './data/circle-ls-full.json';
import temperature from './data/gum-4-4-3-temperature.json';
import endGauge from './data/gum-h1-end-gauge.json';
import studentTable from './data/gum-table-g2-t-factors.json';
import essAxis from './data/iso230-2-ess-x-8a.json';
import psiStage from './data/iso230-2-psi-stage.json';
import acceptanceZone from './data/iso14253-acceptance-zone.json';
import zener from './data/jcgm106-zener.json';
import trees from './data/ls-plane-trees.json';
import exponential from './data/minimax-exp-line-analytic.json';
import williams from './data/minimax-line-williams.json';
import noInt1 from './data/nist-linear-noint1.json';
import norris from './data/nist-linear-norris.json';
import lew from './data/nist-univariate-lew.json';
import lottery from './data/nist-univariate-lottery.json';
import mavro from './data/nist-univariate-mavro.json';
import numAcc1 from './data/nist-univariate-numacc1.json';
import numAcc2 from './data/nist-univariate-numacc2.json';
import e29 from './data/rounding-e29-examples.json';
import onceOnly from './data/rounding-once-only.json';
import autocollimator from './data/straightness-autocollimator-7row.json';
import kessel from './data/straightness-endpoint-kessel-sensor.json';
import npl from './data/thermal-npl-faq.json';

/**
 * Worked examples from outside the project. Each data file keeps its source and whether that text was read or is
 * recalled; both stand beside the check too. Two more examples were looked at and do not fit: a minimum circumscribed
 * circle (Rosetta Code; no method here gives one) and a list of typical expansion coefficients (Swyt 1994; nothing is computed).
 */
function expectNear(actual: string | undefined, expected: Dec | string | number, within: Dec | string | number): void {
  const difference = new Dec(actual!).minus(expected).abs();
  expect(difference.lte(within), `${actual} against ${expected}, within ${within}`).toBe(true);
}

/** Leading digits that agree, at least this many. */
function expectDigits(actual: string, expected: string, digits: number): void {
  expectNear(actual, expected, new Dec(expected).abs().times(`1e-${digits}`));
}

const texts = (numbers: number[]) => numbers.map(String);

describe('statistics', () => {
  // NIST/ITL Statistical Reference Datasets, certified values. READ.
  it.each([
    ['Lew', lew],
    ['Lottery', lottery],
    ['Mavro', mavro],
    ['NumAcc1', numAcc1],
    ['NumAcc2', numAcc2],
  ])('NIST StRD univariate %s: mean and standard deviation', (_, { data, expected }) => {
    const run = data.y_decimal_strings;
    const { positions } = evaluate({ method: 'positioning', kind: 'linear', targets: ['0', '1'], forward: [run, run] });
    expectDigits(positions[0]!.meanForward, expected.mean, 14);
    expectDigits(positions[0]!.sForward!, expected.sample_sd_n_minus_1, 14);
  });

  // NIST/ITL StRD linear regression, file Norris.dat, certified values. READ.
  it('NIST StRD Norris: least-squares line', () => {
    const pairs = norris.data.y_x_decimal_strings;
    const line = fitLine(
      seriesFromTexts(pairs.map(([, x]) => x!)),
      seriesFromTexts(pairs.map(([y]) => y!)),
      'least-squares',
    );
    expectDigits(slopeUmPerM(line).dividedBy(Fraction.of(1000)).toText(), norris.expected.B1, 13);
    expectDigits(line.intercept.toText(), norris.expected.B0, 13);
  });

  // NIST/ITL StRD linear regression, file NoInt1.dat, certified value. READ. A line through the origin is the line through the points
  // and their mirror images in the origin.
  it('NIST StRD NoInt1: least-squares line through the origin', () => {
    const pairs = noInt1.data.y_x_decimal_strings as [string, string][];
    const mirrored = [...pairs, ...pairs.map(([y, x]) => [`-${y}`, `-${x}`] as [string, string])];
    const line = fitLine(
      seriesFromTexts(mirrored.map(([, x]) => x)),
      seriesFromTexts(mirrored.map(([y]) => y)),
      'least-squares',
    );
    expectDigits(slopeUmPerM(line).dividedBy(Fraction.of(1000)).toText(), noInt1.expected.B1, 14);
    expect(line.intercept.sign()).toBe(0);
  });

  // JCGM 100:2008, 4.4.3 and Table 1. RECALLED.
  it('GUM 4.4.3: twenty temperatures', () => {
    const run = texts(temperature.data.t);
    const { positions } = evaluate({ method: 'positioning', kind: 'linear', targets: ['0', '1'], forward: [run, run] });
    const s = positions[0]!.sForward!;
    expectNear(positions[0]!.meanForward, temperature.expected.mean, temperature.tolerance.mean);
    expectNear(s, temperature.expected.s, temperature.tolerance.s);
    const { standard } = evaluate({
      method: 'uncertainty',
      coverage: '0.95',
      components: [{ name: 'mean of 20', value: s, distribution: 'normal', divisor: new Dec(20).sqrt().toString() }],
    });
    expectNear(standard, temperature.expected.u_mean, temperature.tolerance.u_mean);
  });
});

describe('uncertainty and decision rules', () => {
  // JCGM 100:2008, Annex H.1. READ (inputs, combined uncertainty), RECALLED (degrees of freedom 16, 2.92, 93 nm).
  it('GUM H.1: end gauge', () => {
    const { ls, d, delta_alpha, delta_theta, theta, alpha_s } = endGauge.data;
    const result = evaluate({
      method: 'uncertainty',
      coverage: '0.99',
      components: [
        { name: 'standard', value: String(ls.u), distribution: 'normal', degreesOfFreedom: ls.nu },
        ...d.map(({ name, u, nu }) => ({
          name,
          value: String(u),
          distribution: 'normal' as const,
          degreesOfFreedom: nu,
        })),
        {
          name: 'difference of expansion coefficients',
          value: String(delta_alpha.halfwidth_rect),
          distribution: 'rectangular',
          sensitivity: new Dec(ls.x).times(theta.mean).toString(),
          degreesOfFreedom: delta_alpha.nu,
        },
        {
          name: 'difference of temperatures',
          value: String(delta_theta.halfwidth_rect),
          distribution: 'rectangular',
          sensitivity: new Dec(ls.x).times(alpha_s.x).toString(),
          degreesOfFreedom: delta_theta.nu,
        },
      ],
    });
    expectNear(result.standard, endGauge.recomputed.u_c, 0.0001);
    expectNear(result.standard, endGauge.expected.u_c_nm, endGauge.tolerance.u_c_nm);
    expect(new Dec(result.degreesOfFreedom!).floor().toString()).toBe(String(endGauge.expected.nu_eff));
    expectNear(result.coverageFactor, endGauge.expected.t99, 0.005);
    expectNear(result.expanded, endGauge.expected.U99_nm, endGauge.tolerance.U99_nm);
  });

  // JCGM 100:2008, Table G.2, columns 95 % and 99 %. RECALLED.
  it('GUM table G.2: Student t', () => {
    for (const [degrees, row] of Object.entries(studentTable.expected)) {
      expectNear(studentQuantile('0.95', BigInt(degrees)).toString(), row[2]!, studentTable.tolerance.abs);
      expectNear(studentQuantile('0.99', BigInt(degrees)).toString(), row[4]!, studentTable.tolerance.abs);
    }
  });

  // JCGM 106:2012, 7.3. RECALLED. Both figures are shifted by 6 V: only their difference enters.
  it('JCGM 106: probability of conformity of a breakdown voltage', () => {
    const { y, u, T_U } = zener.data;
    const { probability } = judge({
      deviation: new Dec(y).plus(6).toString(),
      tolerance: new Dec(T_U).plus(6).toString(),
      standardUncertainty: String(u),
      signed: false,
      direction: 'either',
      rule: 'simple',
    });
    expectNear(probability, zener.expected.p_c, zener.tolerance.p);
    expectNear(probability, zener.recomputed.p_c, 1e-7);
  });

  // Web summary of ISO 14253-1, author unknown: arithmetic only. READ.
  it('ISO 14253-1: acceptance zone is the specification less U', () => {
    const { LSL, USL, U } = acceptanceZone.data;
    const middle = new Dec(LSL).plus(USL).div(2);
    const verdict = (figure: number) =>
      judge({
        deviation: new Dec(figure).minus(middle).toString(),
        tolerance: new Dec(USL).minus(LSL).div(2).toString(),
        standardUncertainty: new Dec(U).div(2).toString(),
        guard: 'U',
        signed: true,
        direction: 'either',
        rule: 'guarded',
      }).verdict;
    const [low, high] = acceptanceZone.expected.accept as [number, number];
    expect([verdict(low), verdict(high)]).toEqual(['within-tolerance', 'within-tolerance']);
    expect([verdict(10.0199), verdict(10.0801)]).toEqual(['undecided', 'undecided']);
    const { reject_below, reject_above } = acceptanceZone.expected;
    expect([verdict(reject_below - 0.0001), verdict(reject_above + 0.0001)]).toEqual([
      'out-of-tolerance',
      'out-of-tolerance',
    ]);
  });
});

describe('straightness and flatness', () => {
  // H. P. Williams, Model Building in Mathematical Programming, 5th ed., problem 11. READ.
  it('Williams: minimax line through 19 points', () => {
    const points = williams.data.x.map((x, i) => ({ position: String(x), reading: String(williams.data.y[i]) }));
    const zone = evaluate({ method: 'straightness', reference: 'minimum-zone', points });
    expect(zone.slope).toBe(new Dec(williams.expected.minimax_slope).times(1000).toString());
    expect(zone.intercept).toBe(String(williams.expected.minimax_intercept));
    expect(zone.deviation).toBe(String(williams.expected.min_zone_width_vertical));
    const squares = evaluate({ method: 'straightness', reference: 'least-squares', points });
    expectNear(squares.deviation, williams.recomputed.ls_range, 1e-8);
    expectNear(squares.slope, new Dec(williams.recomputed.ls_slope).times(1000), 1e-5);
    expectNear(squares.intercept, williams.recomputed.ls_intercept, 1e-8);
    const ends = evaluate({ method: 'straightness', reference: 'end-points', points });
    expect(ends.deviation).toBe(String(williams.recomputed.end_point_range));
  });

  // K. E. Atkinson, An Introduction to Numerical Analysis, 2nd ed., ch. 4. RECALLED; closed form.
  it.each([
    [-1, exponential.recomputed],
    [0, exponential.expected['[0,1] own closed form']],
  ])('Atkinson: best line to exp from %d to 1', (from, { slope, intercept, max_error }) => {
    const points = Array.from({ length: 2001 }, (_, k) => {
      const position = new Dec(1).minus(from).times(k).div(2000).plus(from);
      return { position: position.toString(), reading: position.exp().toDecimalPlaces(30).toString() };
    });
    const zone = evaluate({ method: 'straightness', reference: 'minimum-zone', points });
    expectNear(zone.deviation, new Dec(max_error).times(2), 2e-6);
    expectNear(zone.slope, new Dec(slope).times(1000), 1e-2);
    expectNear(zone.intercept, intercept, 1e-5);
  });

  // Lecture slides on straightness by autocollimator, slides 12 to 15, author not shown. READ. Seven readings for seven
  // positions are six steps: rows 1 to 6. The slides take 0.5 µm per second of arc over 100 mm (5 µm/m per second).
  it('autocollimator, out and return run', () => {
    const { rows, step_mm } = autocollimator.data;
    const seconds = (text: string) => {
      const [minutes, rest] = text.split(':').map(Number);
      return minutes! * 60 + rest!;
    };
    const steps = rows.slice(1);
    const straight = (factor: string) =>
      evaluate({
        method: 'straightness-from-angles',
        reference: 'end-points',
        stepLength: String(step_mm),
        angles: steps.map((row) => new Dec(factor).times(seconds(row.forward) - 130).toString()),
        returnAngles: steps.map((row) => new Dec(factor).times(seconds(row.backward) - 130).toString()),
      });
    const result = straight('5');
    expect(result.heights).toEqual(texts(autocollimator.expected.cumulative_um));
    expect(result.residuals).toEqual(texts(autocollimator.expected.deviation_end_point_um));
    expect(result.deviation).toBe(String(autocollimator.expected.straightness_um));
    expectNear(straight('4.84813681109536').deviation, 2.909, 0.0005);
  });

  // Kessel, Eng. Sci. Educ. J. 7 (1998) 201-207, Table 4. READ.
  it('Kessel: line through the end points of a sensor', () => {
    const { x, y } = kessel.data;
    const points = x.map((position, i) => ({ position: String(position), reading: String(y[i]) }));
    const result = evaluate({ method: 'straightness', reference: 'end-points', points });
    expectNear(result.slope, new Dec(kessel.expected.slope).times(1000), '1e-9');
    expect(result.intercept).toBe('0');
    result.residuals.forEach((residual, i) => {
      expectNear(residual, kessel.expected.residual[i]!, kessel.tolerance.residual);
    });
  });

  // Minitab Student Handbook (1976), R data set trees. RECALLED, first rows READ. One place stands twice, which the
  // method refuses, so the fit itself is asked.
  it('plane through the 31 trees', () => {
    const series = [trees.data.x, trees.data.y, trees.data.z].map((list) => seriesFromTexts(texts(list)));
    const [x, y, z] = series as [(typeof series)[0], (typeof series)[0], (typeof series)[0]];
    const plane = leastSquaresPlane({ x: x.values, y: y.values, z: z.values })!;
    const over = (n: bigint, unit: bigint) => Fraction.of(n * unit, plane.d * z.unit).toText();
    expectNear(over(plane.a, 1n), trees.expected.c, trees.tolerance.coef);
    expectNear(over(plane.b, x.unit), trees.expected.a_x, trees.tolerance.coef);
    expectNear(over(plane.c, y.unit), trees.expected.b_y, trees.tolerance.coef);
  });
});

describe('circle', () => {
  // SciPy Cookbook, "Least squares circle", summary table. READ. Seen from the set centre (10, 10), nominal radius 23.
  it('least-squares circle of six points', () => {
    const { x, y } = circleLeastSquares.data;
    const points = x.map((px, i) => {
      const [dx, dy] = [new Dec(px).minus(10), new Dec(y[i]!).minus(10)];
      const angle = Dec.atan2(dy, dx).times(180).div(Dec.acos(-1));
      const radius = dx.pow(2).plus(dy.pow(2)).sqrt().minus(23);
      return { angle: angle.toDecimalPlaces(40).toString(), radius: radius.toDecimalPlaces(40).toString() };
    });
    const result = evaluate({
      method: 'circular',
      nominalRadius: '0.023',
      clockwise: points,
      counterclockwise: points,
    });
    const { xc, yc, R } = circleLeastSquares.expected;
    expectNear(result.centre.x, new Dec(xc).minus(10), circleLeastSquares.tolerance.abs);
    expectNear(result.centre.y, new Dec(yc).minus(10), circleLeastSquares.tolerance.abs);
    expectNear(result.D, new Dec(R).minus(23), circleLeastSquares.tolerance.abs);
    // The file's recomputed centre is an optimiser's: good to 2e-8 only.
    expectNear(result.centre.x, new Dec(circleLeastSquares.recomputed.xc).minus(10), 2e-8);
  });
});

describe('positioning', () => {
  // European Spallation Source, report of 20 Oct 2022; Paul Scherrer Institute, report of 8 Dec 2023. Both READ. The
  // reports print E of the forward run as E, and R as the larger of the two directions: E and R are checked against
  // the figures of ISO 230-2 that were worked out again from the printed readings.
  it.each([
    ['ESS X axis', essAxis, '6e-3'],
    ['PSI stage', psiStage, '6e-6'],
  ])('%s', (_, { data, expected }, half) => {
    const run = (list: number[][]) =>
      list.map((row, i) => row.map((mm) => new Dec(mm).minus(data.target[i]!).times(1000).toString()));
    const result = evaluate({
      method: 'positioning',
      kind: 'linear',
      targets: texts(data.target),
      forward: run(data.forward_positions),
      backward: run(data.reverse_positions),
    });
    const um = (mm: number) => new Dec(mm).times(1000).toString();
    expectNear(result.B, um(expected.B), half);
    expectNear(result.Rforward, um(expected.R_fwd), half);
    expectNear(result.Rbackward, um(expected.R_rev), half);
    expectNear(result.M, um(expected.M), half);
    expectNear(result.Aforward, um(expected.A_fwd), half);
    expectNear(result.Abackward, um(expected.A_rev), half);
    expectNear(result.A, um(expected.A), half);
    expectNear(result.Eforward, um(expected.E_fwd), half);
    expectNear(result.Ebackward, um(expected.E_rev), half);
    expectNear(result.E, um(expected.E_bidirectional_ISO), '1e-9');
    expectNear(result.R, um(expected.R_bidirectional_ISO), '1e-9');
  });

  // National Physical Laboratory, FAQ on length, 25 Mar 2010. READ.
  it('NPL: a length brought to 20 °C', () => {
    const { L_measured, T, alpha } = npl.data;
    const { positions } = evaluate({
      method: 'positioning',
      kind: 'linear',
      targets: ['0', String(L_measured)],
      forward: [['0'], ['0']],
      temperature: { celsius: String(T), alpha: new Dec(alpha).times('1e6').toString() },
    });
    const corrected = new Dec(L_measured).plus(new Dec(positions[1]!.meanForward).div(1000));
    expectNear(corrected.toString(), npl.expected.L20, npl.tolerance.mm);
    expectNear(corrected.toString(), npl.recomputed.L20_linear, '1e-10');
  });
});

describe('rounding', () => {
  // Field sampling and testing manual, after ASTM E29. READ.
  it.each(e29.data.cases as [string, string][])('ASTM E29: %s is %s', (value, expected) => {
    expect(round(value, e29.data.step, 'half-even')).toBe(expected);
  });

  // Ministry of Transportation Ontario, LS-100 rev. 16 (1995), 3.3. READ.
  it.each(onceOnly.data.cases as [string, string, string][])('in one step: %s at %s is %s', (value, step, expected) => {
    expect(round(value, step)).toBe(expected);
  });

  // General Decimal Arithmetic test cases (M. Cowlishaw), quantize.decTest, rows with a finite result. READ.
  // Half-up of that suite is half away from zero; a minus zero of its results is a plain zero here.
  it('decTest quantize', () => {
    const file = readFileSync(new URL('./data/dectest-quantize.csv', import.meta.url), 'utf8');
    const [, ...rows] = file.trim().split('\n');
    let checked = 0;
    for (const row of rows) {
      const [id, , , rule, value, like, result] = row.split(',');
      expect(rule).toBe('half_up');
      const exponent = exponentOf(like!);
      const rounded = round(value!, `1e${exponent}`, 'half-away-from-zero');
      const expected = Fraction.from(result!);
      expect(Fraction.from(rounded).equals(expected), `${id}: ${value} like ${like} is ${result}, not ${rounded}`).toBe(
        true,
      );
      expect(rounded.split('.')[1]?.length ?? 0, id).toBe(Math.max(0, -exponent));
      expect(rounded, id).not.toMatch(/^-[0.]*$/);
      checked++;
    }
    expect(checked).toBeGreaterThan(400);
  });
});

/** Power of ten of the last digit of a decimal text. */
function exponentOf(text: string): number {
  const [mantissa, exponent = '0'] = text.toLowerCase().split('e');
  return Number(exponent) - (mantissa!.split('.')[1]?.length ?? 0);
}
