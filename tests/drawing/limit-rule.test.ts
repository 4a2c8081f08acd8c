import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { DrawingItem } from '@/components/plots/drawing';
import { type LimitRuleInput, limitRule } from '@/components/plots/limit-rule-geometry';
import { collisions, outside, segmentsOf } from '../helpers/drawing-geometry';

const input = (change: Partial<LimitRuleInput>): LimitRuleInput => ({
  deviationUm: '4.2',
  toleranceUm: '15',
  direction: 'either',
  signed: false,
  verdict: 'within-tolerance',
  shown: '0.0042',
  widthPx: 440,
  ...change,
});

const paths = (items: readonly DrawingItem[]) => items.filter((item) => item.kind === 'path');
const words = (items: readonly DrawingItem[]) => items.flatMap((item) => (item.kind === 'text' ? [item] : []));

/** x of the scribed line: the only stroke of 3 px that stands upright. */
function scribeX(change: Partial<LimitRuleInput>): number {
  const line = paths(limitRule(input(change)).items).find((item) => item.widthPx === 3);
  const [x1, , x2] = segmentsOf(line?.d ?? '')[0] ?? [];
  expect(x1).toBe(x2);
  return x1 as number;
}

/** Lowest points of the rule: the tips of its notches, left to right. */
function notches(change: Partial<LimitRuleInput>): { x: number; depth: number }[] {
  const rule = paths(limitRule(input(change)).items).find((item) => item.widthPx === 2);
  const points = segmentsOf(rule?.d ?? '').map(([, , x, y]) => ({ x, y }));
  const base = Math.min(...points.map((point) => point.y));
  return points.filter((point) => point.y > base).map(({ x, y }) => ({ x, depth: y - base }));
}

const labelX = (change: Partial<LimitRuleInput>, text: string) =>
  words(limitRule(input(change)).items).find((item) => item.text === text)?.x as number;

describe('limit rule', () => {
  it('puts zero at the left, the notch at the tolerance and the scribe in proportion between', () => {
    const zero = labelX({}, '0');
    const [notch] = notches({});
    expect(zero).toBeLessThan(20);
    expect((scribeX({}) - zero) / (notch!.x - zero)).toBeCloseTo(4.2 / 15, 3);
    expect(labelX({}, 'T 0.0150')).toBeCloseTo(notch!.x, 1);
  });

  it('lets a deviation at the limit stand exactly in the notch', () => {
    expect(scribeX({ deviationUm: '15', shown: '0.0150' })).toBeCloseTo(notches({})[0]!.x, 2);
  });

  it('has a tick at each tenth of the tolerance', () => {
    const ticks = paths(limitRule(input({})).items)
      .flatMap((item) => segmentsOf(item.d))
      .filter(([x1, y1, x2, y2]) => x1 === x2 && y2 > y1 && y1 === 46);
    const tenth = (notches({})[0]!.x - labelX({}, '0')) / 10;
    const places = ticks.map(([x]) => x).sort((a, b) => a - b);
    places.slice(1).forEach((x, index) => {
      const steps = (x - places[index]!) / tenth;
      // The notch stands where the tenth tick would.
      expect([1, 2]).toContain(Math.round(steps * 100) / 100);
    });
  });

  it('has zero in the middle and a notch on each side for signed figures judged both ways', () => {
    const signed = { signed: true, deviationUm: '-4.2', shown: '−0.0042' };
    const zero = labelX(signed, '0');
    expect(zero).toBeCloseTo(220, 1);
    const [left, right] = notches(signed);
    expect(zero - left!.x).toBeCloseTo(right!.x - zero, 1);
    expect(scribeX(signed)).toBeLessThan(zero);
    expect(words(limitRule(input(signed)).items).map((item) => item.text)).toEqual([
      '−0.0042',
      '0',
      'T −0.0150',
      'T +0.0150',
    ]);
  });

  it('hatches the forbidden side of a one-sided direction and puts the allowed side at the right', () => {
    const concave = { direction: 'concave-only' as const, signed: true };
    const hatched = paths(limitRule(input(concave)).items).find((item) => (item.d.match(/M/g) ?? []).length > 4);
    const zero = labelX(concave, '0');
    for (const [x1, , x2] of segmentsOf(hatched?.d ?? '')) expect(Math.max(x1, x2)).toBeLessThanOrEqual(zero + 0.02);
    expect(scribeX(concave)).toBeGreaterThan(zero);
    expect(scribeX({ ...concave, deviationUm: '-2', shown: '−0.002' })).toBeLessThan(zero);
    // A convex result is negative and allowed: it stands on the allowed side too.
    expect(scribeX({ direction: 'convex-only', signed: true, deviationUm: '-4.2' })).toBeCloseTo(scribeX(concave), 2);
    expect(paths(limitRule(input({})).items).some((item) => (item.d.match(/M/g) ?? []).length > 4)).toBe(false);
  });

  it('makes the scribe as broad as the expanded uncertainty', () => {
    const filled = paths(limitRule(input({ expandedUncertaintyUm: '1.5' })).items).find(
      (item) => item.fill === 'blue-wash',
    );
    const xs = segmentsOf(filled?.d ?? '').map(([x]) => x);
    const tenth = (notches({})[0]!.x - labelX({}, '0')) / 10;
    expect(Math.max(...xs) - Math.min(...xs)).toBeCloseTo(2 * tenth, 1);
    expect(paths(limitRule(input({})).items).some((item) => item.fill === 'blue-wash')).toBe(false);
  });

  it('cuts a second, shallower notch at the guarded limit', () => {
    const [guard, limit] = notches({ guardUm: '3' });
    const zero = labelX({}, '0');
    expect((guard!.x - zero) / (limit!.x - zero)).toBeCloseTo(0.8, 3);
    expect(guard!.depth).toBeLessThan(limit!.depth);
    expect(notches({ limitUm: '12' })).toEqual(notches({ guardUm: '3' }));
    expect(notches({ limitUm: '15' })).toHaveLength(1);
    const third = '6.66666666666666666666666666667';
    expect(notches({ toleranceUm: third, limitUm: third })).toHaveLength(1);
  });

  it('puts an arrow at the end for a deviation beyond it and keeps the figure', () => {
    const far = limitRule(input({ deviationUm: '400', shown: '0.400', verdict: 'out-of-tolerance' }));
    expect(words(far.items)[0]?.text).toBe('0.400');
    const arrow = paths(far.items).filter((item) => item.widthPx === 3);
    expect(arrow).toHaveLength(2);
    for (const item of arrow) for (const [, y1, , y2] of segmentsOf(item.d)) expect(Math.max(y1, y2)).toBeLessThan(46);
    expect(outside(far)).toEqual([]);
  });

  it('draws an empty rule while nothing is measured, and one without notch where no tolerance is given', () => {
    expect(
      paths(limitRule(input({ deviationUm: null, shown: null, verdict: null })).items).some(
        (item) => item.widthPx === 3,
      ),
    ).toBe(false);
    expect(notches({ toleranceUm: null, verdict: 'for-information' })).toEqual([]);
  });

  it('shows a scaled tolerance cut off, never wider than it is', () => {
    const texts = words(
      limitRule(input({ toleranceUm: '6.66666666666666666666666666667', shown: '0.0042' })).items,
    ).map((item) => item.text);
    expect(texts).toContain('T 0.0066');
  });

  it('says in words what it shows', () => {
    expect(limitRule(input({ expandedUncertaintyUm: '1.2' })).description).toBe(
      'Deviation 0.0042 mm, tolerance 15 µm, either way, expanded uncertainty 1.2 µm, within tolerance',
    );
  });

  it('stays inside its box with legible words for any figures', () => {
    const decimal = fc
      .tuple(fc.integer({ min: -999_999, max: 999_999 }), fc.integer({ min: 0, max: 2 }))
      .map(([n, d]) => (n / 10 ** d).toFixed(d));
    const tolerance = fc.integer({ min: 1, max: 90_000 }).map((n) => (n / 10).toFixed(1));
    fc.assert(
      fc.property(
        decimal,
        fc.option(tolerance),
        fc.constantFrom('either', 'concave-only', 'convex-only', 'tailstock-high'),
        fc.boolean(),
        fc.integer({ min: 320, max: 1200 }),
        (deviationUm, toleranceUm, direction, signed, widthPx) => {
          const shown = (Number(deviationUm) / 1000).toFixed(4).replace('-', '−');
          const drawing = limitRule(
            input({ deviationUm, toleranceUm, direction, signed, widthPx, shown, expandedUncertaintyUm: '1.6' }),
          );
          expect(outside(drawing)).toEqual([]);
          expect(collisions(drawing, ['blue', 'oxide', 'ink2'])).toEqual([]);
        },
      ),
    );
  });
});

describe('limit rule of angles', () => {
  const texts = (change: Partial<LimitRuleInput>) => words(limitRule(input(change)).items).map(({ text }) => text);

  it('writes its limit in the unit of the result', () => {
    expect(texts({ toleranceUm: '60', deviationUm: '18', shown: '0.018', unit: 'mm/m' })).toContain('T 0.060');
    // Five seconds of arc are kept as µm/m to 30 digits.
    const seconds = { toleranceUm: '24.2406840554768022', deviationUm: '12.12', shown: '2.5', unit: '″' as const };
    expect(texts(seconds)).toContain('T 5.0');
    expect(limitRule(input(seconds)).description).toContain('Deviation 2.5″, tolerance 5″');
    expect(texts({ ...seconds, signed: true })).toEqual(expect.arrayContaining(['T +5.0', 'T −5.0']));
  });

  it('stands where half the limit is, whatever the unit', () => {
    const mm = scribeX({ toleranceUm: '10', deviationUm: '5' });
    expect(scribeX({ toleranceUm: '24.2406840554768022', deviationUm: '12.1203420277384011', unit: '″' })).toBe(mm);
  });

  it('says mm where no other unit is named', () => {
    expect(limitRule(input({})).description).toContain('Deviation 0.0042 mm, tolerance 15 µm');
  });
});
