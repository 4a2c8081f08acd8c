import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EvaluationError, type EvaluationInput, evaluateUnknown } from '@/lib/evaluation';
import { explain } from '@/lib/explaining/explain';
import type { Explanation } from '@/lib/explaining/explanation';
import { fig } from '@/lib/explaining/figures';
import { allGuides } from '@/lib/explaining/methods/all-guides';
import { checkArithmetic } from './check-arithmetic';
import { exampleInputs } from './example-inputs';
import { agree, isArithmetic, leadingFigure, readArithmetic } from './read-arithmetic';

const explained = (input: EvaluationInput) => {
  const result = evaluateUnknown(input);
  return { result, explanation: explain(input, result) };
};

/** The figure that is judged comes last; advice ends with what is to be done. */
function checkLast({ method, steps }: Explanation, result: object): void {
  if (!('deviation' in result) || !('signed' in result) || method === 'correction') return;
  const last = steps.at(-1)!;
  expect(last.value.split(' ')[0], last.what).toBe(fig(String(result.deviation)));
}

describe('the reader of the test', () => {
  it.each([
    ['(14 + (−2)) / 2', 6],
    ['√(4² + (−3)²)', 5],
    ['−(2 − 5) · 2 / 3', 2],
    ['max(2 · 1 + |−3|; 4)', 5],
    ['3 − 1 · cos(60°) − (−2) · sin(30°)', 3.5],
    ['−2²', -4],
    ['Φ((20 − 18) / 1)', 0.9772498680518208],
  ])('%s', (text, figure) => {
    expect(isArithmetic(text)).toBe(true);
    expect(readArithmetic(text).low).toBeCloseTo(figure, 9);
  });

  it('takes a cut figure for what it may be, and no more', () => {
    expect(agree(readArithmetic('2 / 3'), leadingFigure('0.666667… µm')!)).toBe(true);
    expect(agree(readArithmetic('2 / 3'), leadingFigure('0.66667 µm')!)).toBe(false);
    expect(isArithmetic('over 5 targets')).toBe(false);
  });
});

describe('worked examples', () => {
  const inputs = [...allGuides.map(({ example }) => example.input), ...exampleInputs].map(
    (input, k) => [`${k} ${input.method}${'kind' in input ? ` ${input.kind}` : ''}`, input] as const,
  );
  it.each(inputs)('%s: figures put into the formulas give what is said, the last one what is judged', (_, input) => {
    const { result, explanation } = explained(input);
    const checked = checkArithmetic(explanation.steps);
    checkLast(explanation, result);
    expect(explanation.ruleSet).toMatch(/^witnessmark-\d+$/);
    const last = explanation.steps.at(-1)!;
    // A minimum zone of circles is no plain arithmetic; everything else shows at least one sum.
    if (input.method !== 'circular' && input.method !== 'rounding') expect(checked, last.what).toBeGreaterThan(0);
  });

  it('the lost motion of the contract’s example can be followed from the first pair to the figure', () => {
    const { explanation } = explained({
      method: 'lost-motion',
      places: [
        {
          feed: 'cutting-feed',
          pairs: [
            { forward: '0', backward: '4' },
            { forward: '1', backward: '4' },
          ],
        },
      ],
    });
    expect(explanation.steps.map(({ withNumbers, value }) => `${withNumbers} = ${value}`)).toEqual([
      '0 − 4 = −4 µm',
      '1 − 4 = −3 µm',
      '(−4 + (−3)) / 2 = −3.5 µm',
      '−((−3.5) / 1) = 3.5 µm',
      '|−3.5| = 3.5 µm',
    ]);
  });

  it('A of ISO 230-2 names the two targets that decide and puts their readings in', () => {
    const { example } = allGuides.find(({ slug }) => slug === 'positioning')!;
    const { explanation } = explained(example.input);
    const said = explanation.steps.map(({ what, withNumbers }) => `${what}: ${withNumbers}`).join('\n');
    expect(said).toContain('Mean at 402 mm, + direction: (4.1 + 3.8 + 4.4 + 4 + 4.2) / 5');
    expect(said).toContain('Mean at 0 mm, − direction: (−1.9 + (−2.2) + (−1.8) + (−2.1) + (−2)) / 5');
    expect(explanation.steps.at(-1)!.value).toBe('6.863441… µm');
  });
});

describe('random readings', () => {
  const figure = fc.integer({ min: -400, max: 400 }).map((n) => String(n / 10));
  const some = (least: number, most = 9) => fc.array(figure, { minLength: least, maxLength: most });
  const of = (count: number) => fc.array(figure, { minLength: count, maxLength: count });
  const places = (count: number, step: number) => Array.from({ length: count }, (_, k) => String(k * step));
  const reference = fc.constantFrom('end-points' as const, 'least-squares' as const, 'minimum-zone' as const);
  const quarters = fc
    .tuple(figure, figure, figure, figure)
    .map(([a, b, c, d]) => ({ '0': a, '90': b, '180': c, '270': d }));
  const surface = fc.constantFrom('outside' as const, 'bore' as const);
  const optional = <T>(arbitrary: fc.Arbitrary<T>) => fc.option(arbitrary, { nil: undefined });
  const arm = some(2, 4).map((readings) => ({
    points: readings.map((reading, k) => ({ position: String(k * 35), reading })),
  }));
  const setting = fc.record({ referenceArm: arm, measuredArm: arm });
  const round = (count: number) => Array.from({ length: count }, (_, k) => String((k * 360) / count));

  const inputs: Record<string, fc.Arbitrary<unknown>> = {
    straightness: fc.record({
      reference,
      points: some(3).map((readings) =>
        readings.map((reading, k) => ({ position: String(k * 70 + (k % 3)), reading })),
      ),
      localLength: optional(fc.constant('200')),
    }),
    'straightness-from-angles': some(2).chain((angles) =>
      fc.record({
        reference,
        stepLength: fc.constantFrom('100', '125.5'),
        angles: fc.constant(angles),
        returnAngles: optional(of(angles.length)),
      }),
    ),
    'straightness-reversal': some(3).chain((first) =>
      fc.record({
        reference,
        positions: fc.constant(places(first.length, 50)),
        first: fc.constant(first),
        second: of(first.length),
      }),
    ),
    flatness: fc.record({
      reference: fc.constantFrom('least-squares', 'minimum-zone'),
      points: of(9).map((readings) =>
        readings.map((reading, k) => ({ x: String((k % 3) * 110), y: String(Math.floor(k / 3) * 90), reading })),
      ),
    }),
    parallelism: some(2, 7).chain((first) =>
      fc.record({
        positions: fc.constant(places(first.length, 45)),
        readings: fc.record({ '0': fc.constant(first), '180': of(first.length) }),
        judge: fc.constantFrom('slope', 'range'),
        measuringLength: optional(fc.constant('300')),
        sag: optional(of(first.length)),
      }),
    ),
    'squareness-to-axis': some(2, 7).chain((first) =>
      fc.record({
        positions: fc.constant(places(first.length, 25)),
        readings: fc.record({ '0': fc.constant(first), '180': of(first.length) }),
        measuringLength: optional(fc.constant('150')),
      }),
    ),
    squareness: fc.record({ first: setting, second: optional(setting), measuringLength: fc.constant('70') }),
    'run-out': fc.record({
      insertions: fc.array(
        some(2).map((readings) => ({ readings })),
        { minLength: 1, maxLength: 6 },
      ),
      judge: fc.constantFrom('mean', 'largest'),
    }),
    'axial-run-out': fc.record({
      circles: fc.array(
        some(2).map((readings) => ({ readings })),
        { minLength: 1, maxLength: 9 },
      ),
    }),
    coaxiality: fc.record({
      sections: fc
        .array(quarters, { minLength: 1, maxLength: 5 })
        .map((all) => all.map((readings, k) => ({ position: String(k * 60), readings }))),
      surface,
      sag: optional(fc.constantFrom('0', '2.5')),
      up: optional(fc.constantFrom('90', '80', '270')),
      basis: fc.constantFrom('offset', 'total-indicator-reading'),
      plane: fc.constantFrom('both', 'x', 'y'),
    }),
    'centre-height': fc.record({
      sweep: quarters,
      surface,
      sag: optional(fc.constantFrom('0', '1.5')),
      up: optional(fc.constantFrom('90', '75')),
      radii: optional(fc.constant(['1', '25'])),
    }),
    'angular-deviation': some(2).chain((forward) =>
      fc.record({
        positions: fc.constant(places(forward.length, 100)),
        forward: fc.constant(forward),
        backward: optional(of(forward.length)),
      }),
    ),
    positioning: fc.tuple(fc.integer({ min: 2, max: 5 }), fc.integer({ min: 1, max: 4 })).chain(([targets, cycles]) =>
      fc.record({
        kind: fc.constant('linear'),
        targets: fc.constant(places(targets, 101)),
        forward: fc.array(of(cycles), { minLength: targets, maxLength: targets }),
        backward: fc.array(of(cycles), { minLength: targets, maxLength: targets }),
        judge: fc.constantFrom(
          ...(cycles > 1 ? ['A', 'Aforward', 'Abackward', 'R', 'Rforward', 'Rbackward'] : []),
          ...['E', 'Eforward', 'Ebackward', 'B', 'meanB', 'M'],
        ),
        temperature: optional(fc.constant({ celsius: '22.5', alpha: '11.5', zero: '50' })),
      }),
    ),
    circular: fc.record({
      nominalRadius: fc.constant('100'),
      clockwise: of(8).map((all) => all.map((radius, k) => ({ angle: String(k * 45), radius }))),
      counterclockwise: optional(of(8).map((all) => all.map((radius, k) => ({ angle: String(k * 45), radius })))),
    }),
    'axis-of-rotation': fc.record({
      turns: fc.array(of(6), { minLength: 2, maxLength: 4 }),
      direction: fc.constantFrom('radial', 'axial', 'tilt'),
      judge: fc.constantFrom('total', 'synchronous', 'asynchronous'),
      angles: optional(fc.constant(['0', '50', '130', '175', '240', '310'])),
    }),
    indexing: fc.record({
      stations: fc
        .array(some(2), { minLength: 2, maxLength: 10 })
        .map((all) => all.map((readings, k) => ({ name: `T${k}`, readings }))),
      radius: optional(fc.constant('120')),
      judge: fc.constantFrom('repeatability', 'accuracy'),
    }),
    'lost-motion': fc.record({
      sense: fc.constantFrom('plus-pushes-in', 'plus-releases'),
      places: fc.array(
        fc.record({
          feed: fc.constantFrom('cutting-feed', 'rapid'),
          pairs: fc.array(fc.record({ forward: figure, backward: figure }), { minLength: 1, maxLength: 9 }),
        }),
        { minLength: 1, maxLength: 4 },
      ),
    }),
    'reference-shift': fc.record({
      target: figure,
      found: figure,
      basis: fc.constantFrom('radius', 'diameter'),
      controlFactor: optional(fc.constantFrom('1', '2')),
    }),
    roundness: fc.integer({ min: 4, max: 9 }).chain((count) =>
      fc.record({
        reference: fc.constantFrom('minimum-zone', 'least-squares'),
        surface,
        points: of(count).map((all) => all.map((reading, k) => ({ angle: round(count)[k], reading }))),
      }),
    ),
    'diameter-consistency': some(2).map((all) => ({
      sections: all.map((more, k) => ({
        position: String(k * 30),
        diameter: String((50_000 + Number(more) * 10) / 1000),
      })),
    })),
    drift: some(2).map((all) => ({ points: all.map((reading, k) => ({ minutes: String(k * 17), reading })) })),
    'two-collar': fc.record({
      D1: fc.constantFrom('30.012', '30.0005'),
      D2: fc.constantFrom('30.007', '30.02'),
      distance: fc.constantFrom('100', '137.5'),
    }),
  };

  it('are made for every method that measures', () => {
    const helpers = ['uncertainty', 'conformity', 'rounding', 'tolerance', 'correction'];
    const measuring = new Set(exampleInputs.map(({ method }) => method).filter((method) => !helpers.includes(method)));
    expect(Object.keys(inputs).sort()).toEqual([...measuring].sort());
  });

  it.each(Object.entries(inputs))('%s', (method, arbitrary) => {
    let seen = 0;
    fc.assert(
      fc.property(arbitrary, (fields) => {
        const input = JSON.parse(JSON.stringify({ method, ...(fields as object) })) as EvaluationInput;
        try {
          const { result, explanation } = explained(input);
          checkArithmetic(explanation.steps);
          checkLast(explanation, result);
          seen++;
        } catch (error) {
          // Readings that lie on no circle are refused.
          if (!(error instanceof EvaluationError)) throw error;
        }
      }),
      { numRuns: 150, seed: 230 },
    );
    expect(seen).toBeGreaterThan(100);
  });
});

describe('helpers', () => {
  const positive = fc.integer({ min: 1, max: 400 }).map((n) => String(n / 10));
  const figure = fc.integer({ min: -400, max: 400 }).map((n) => String(n / 10));

  it('conformity shows limit, distance and probability for every rule and side', () => {
    const input = fc.record({
      deviation: figure,
      signed: fc.constant(true),
      tolerance: positive,
      direction: fc.constantFrom('either', 'concave-only', 'convex-only'),
      rule: fc.constantFrom('simple', 'guarded'),
      standardUncertainty: fc.constantFrom('0.7', '2', '13'),
      guard: fc.constantFrom('1.65u', 'U'),
    });
    fc.assert(
      fc.property(input, (fields) => {
        const { explanation } = explained({ method: 'conformity', ...fields } as EvaluationInput);
        expect(checkArithmetic(explanation.steps)).toBeGreaterThanOrEqual(4);
      }),
      { numRuns: 300, seed: 14253 },
    );
  });

  it('uncertainty puts every component into the sum', () => {
    const component = fc.record({
      name: fc.constant('part'),
      value: positive,
      distribution: fc.constantFrom('normal', 'rectangular', 'triangular', 'u-shaped'),
      sensitivity: figure,
    });
    fc.assert(
      fc.property(fc.array(component, { minLength: 1, maxLength: 8 }), (components) => {
        const { explanation } = explained({ method: 'uncertainty', coverage: '0.95', components } as EvaluationInput);
        expect(checkArithmetic(explanation.steps)).toBe(components.length + 2);
      }),
      { numRuns: 150, seed: 98 },
    );
  });
});
