import { describe, expect, it } from 'vitest';
import { normalDistribution } from '@/lib/conformity/normal-distribution';
import { evaluate, judge, type PermissibleDirection } from '@/lib/evaluation';
import { studentProbability, studentQuantile } from '@/lib/uncertainty/student-t';
import { Dec } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';

const base = { signed: true, tolerance: '10', direction: 'either', rule: 'simple' } as const;

describe('verdict', () => {
  it.each([
    ['10', 'either', 'within-tolerance', '0'],
    ['-10', 'either', 'within-tolerance', '0'],
    ['10.0000000000000000000000000000000000000000001', 'either', 'out-of-tolerance', undefined],
    ['-10.1', 'either', 'out-of-tolerance', '-0.1'],
    ['3', 'concave-only', 'within-tolerance', '3'],
    ['8', 'concave-only', 'within-tolerance', '2'],
    ['0', 'concave-only', 'within-tolerance', '0'],
    ['-0', 'concave-only', 'within-tolerance', '0'],
    ['-0.001', 'concave-only', 'out-of-tolerance', '-0.001'],
    ['-3', 'convex-only', 'within-tolerance', '3'],
    ['3', 'convex-only', 'out-of-tolerance', '-3'],
    ['3', 'rising-to-free-end', 'within-tolerance', '3'],
    ['3', 'toward-tool', 'within-tolerance', '3'],
    ['-3', 'tailstock-high', 'out-of-tolerance', '-3'],
  ] as [string, PermissibleDirection, string, string | undefined][])(
    '%s %s: %s',
    (deviation, direction, verdict, margin) => {
      const result = judge({ ...base, deviation, direction });
      expect(result.verdict).toBe(verdict);
      if (margin !== undefined) expect(result.margin).toBe(margin);
      expect(result).not.toHaveProperty('probability');
    },
  );

  it.each([
    ['8.35', '1.65u', 'within-tolerance'],
    ['8.351', '1.65u', 'undecided'],
    ['11.65', '1.65u', 'undecided'],
    ['11.651', '1.65u', 'out-of-tolerance'],
    ['8', 'U', 'within-tolerance'],
    ['8.001', 'U', 'undecided'],
    ['12.001', 'U', 'out-of-tolerance'],
  ] as const)('guarded, u 1: %s by %s is %s', (deviation, guard, verdict) => {
    const input = { ...base, deviation, rule: 'guarded', guard, standardUncertainty: '1' } as const;
    expect(judge(input).verdict).toBe(verdict);
    expect(judge({ ...input, deviation: `-${deviation}` }).verdict).toBe(verdict);
  });

  it('does not guard the zero side of a one-sided test', () => {
    const input = { ...base, direction: 'concave-only', rule: 'guarded', standardUncertainty: '1' } as const;
    expect(judge({ ...input, deviation: '0.1' }).verdict).toBe('within-tolerance');
    expect(judge({ ...input, deviation: '-0.1' }).verdict).toBe('out-of-tolerance');
  });

  it('accepts nothing where the guard is wider than the tolerance', () => {
    const result = judge({ ...base, deviation: '0', rule: 'guarded', guard: 'U', standardUncertainty: '6' });
    expect(result).toMatchObject({ verdict: 'undecided', limit: '-2', margin: '-2' });
  });

  it('gives probabilities by kind of figure', () => {
    const one = { ...base, tolerance: '20', standardUncertainty: '1' };
    expect(judge({ ...one, signed: false, deviation: '18' }).probability).toBe('0.977249868051820792799717362833');
    expect(judge({ ...one, deviation: '0', tolerance: '1' }).probability).toMatch(/^0\.68268949213708589717/);
    expect(judge({ ...one, deviation: '0', direction: 'concave-only' }).probability).toMatch(/^0\.5/);
    expect(judge({ ...one, deviation: '1e6' }).probability).toBe('0');
    expect(judge({ ...one, deviation: '0', tolerance: '1e6' }).probability).toBe('1');
  });
});

describe('distributions', () => {
  // Worked out a second way: 120-digit sum of the alternating series of erf.
  it.each([
    ['0', '0.5'],
    ['1', '0.841344746068542948585232545632037922'],
    ['-1', '0.158655253931457051414767454367962078'],
    ['2', '0.977249868051820792799717362833466563'],
    ['3', '0.998650101968369905473348185232405023'],
    ['-5', '0.000000286651571879193911673752332874645354'],
    ['-8', '0.000000000000000622096057427178412351599517'],
  ])('Φ(%s) = %s', (z, expected) => {
    const difference = normalDistribution(new Dec(z)).minus(expected).abs();
    expect(difference.lt(new Dec(expected).times('1e-25'))).toBe(true);
  });

  it('Φ runs smoothly where the series hands over to the continued fraction', () => {
    for (const z of ['-7', '7']) {
      const [below, above] = [new Dec(z).minus('1e-15'), new Dec(z).plus('1e-15')].map(normalDistribution);
      const slope = above!.minus(below!).div('2e-15');
      const density = new Dec(z)
        .pow(2)
        .div(-2)
        .exp()
        .div(new Dec(Dec.acos(-1)).times(2).sqrt());
      expect(slope.div(density).minus(1).abs().lt('1e-13')).toBe(true);
    }
  });

  it.each(['0.95', '0.99'] as const)('the quantile of Student t gives back its probability, %s', (coverage) => {
    for (const degrees of [1, 2, 3, 4, 5, 10, 19, 55, 200, 999, 2000]) {
      const t = studentQuantile(coverage, BigInt(degrees));
      expect(studentProbability(t, degrees).minus(coverage).abs().lt('1e-35'), String(degrees)).toBe(true);
    }
    for (const degrees of [2001, 5000]) {
      const t = studentQuantile(coverage, BigInt(degrees));
      expect(studentProbability(t, degrees).minus(coverage).abs().lt('1e-13'), String(degrees)).toBe(true);
    }
  });

  it('falls with the degrees of freedom to the normal factor', () => {
    let previous = new Dec(1000);
    for (const degrees of [1n, 2n, 3n, 50n, 1999n, 2000n, 2001n, 2002n, 100_000n, 10n ** 12n]) {
      const t = studentQuantile('0.95', degrees);
      expect(t.lt(previous)).toBe(true);
      previous = t;
    }
    expect(previous.toFixed(6)).toBe('1.959964');
  });
});

describe('uncertainty', () => {
  it('divides half-widths by the distribution and weighs by sensitivity', () => {
    const result = evaluate({
      method: 'uncertainty',
      coverage: 0.95,
      components: [
        { name: 'certificate', value: '1.6', distribution: 'normal', divisor: '2' },
        { name: 'resolution', value: '3', distribution: 'rectangular' },
        { name: 'triangle', value: '6', distribution: 'triangular', sensitivity: '-0.5' },
        { name: 'swing', value: '2', distribution: 'u-shaped' },
      ],
    });
    // 0.64 + 3 + 1.5 + 2 = 7.14
    expect(new Dec(result.standard).pow(2).minus('7.14').abs().lt('1e-27')).toBe(true);
    expect(result.coverageFactor).toBe('1.959964');
    expect(result).not.toHaveProperty('degreesOfFreedom');
  });

  it('effective degrees of freedom of two equal parts are twice those of one', () => {
    const part = { name: 'part', value: '1', distribution: 'normal', degreesOfFreedom: 7 } as const;
    const result = evaluate({ method: 'uncertainty', coverage: '0.99', components: [part, part] });
    expect(result.degreesOfFreedom).toBe('14');
    expect(Fraction.from(result.degreesOfFreedom!).d).toBe(1n);
  });
});
