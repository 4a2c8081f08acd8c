import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluate } from '@/lib/evaluation';
import { Dec } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';

const hundredths = (min: number, max: number) => fc.integer({ min, max }).map((n) => Fraction.of(n, 100).toText());
const reading = hundredths(-5000, 5000);
const plus = (a: string, b: string) => Fraction.from(a).plus(Fraction.from(b)).toText();
const negated = (a: string) => Fraction.from(a).negated().toText();
const compare = (a: string, b: string) => Fraction.from(a).compare(Fraction.from(b));
const near = (a: string, b: string) => new Dec(a).minus(b).abs().lt('1e-24');
/** Different positions in random order, each with a reading. */
const profile = (least: number) =>
  fc
    .uniqueArray(fc.integer({ min: -2000, max: 2000 }), { minLength: least, maxLength: 25 })
    .chain((positions) =>
      fc
        .array(reading, { minLength: positions.length, maxLength: positions.length })
        .map((readings) =>
          positions.map((position, i) => ({ position: Fraction.of(position, 2).toText(), reading: readings[i]! })),
        ),
    );
const LINES = ['end-points', 'least-squares', 'minimum-zone'] as const;
const settings = { numRuns: 300, seed: 41 };

describe('straightness', () => {
  const deviation = (points: { position: string; reading: string }[], reference: (typeof LINES)[number]) =>
    evaluate({ method: 'straightness', reference, points }).deviation;

  it('minimum zone ≤ least squares and ≤ end points', () => {
    fc.assert(
      fc.property(profile(3), (points) => {
        const zone = deviation(points, 'minimum-zone');
        expect(compare(zone, deviation(points, 'least-squares'))).toBeLessThanOrEqual(0);
        expect(compare(zone, deviation(points, 'end-points'))).toBeLessThanOrEqual(0);
      }),
      settings,
    );
  });

  it('stays the same when a constant or a slope is added, the order changes or the sign turns', () => {
    fc.assert(
      fc.property(
        profile(3),
        reading,
        hundredths(-300, 300),
        fc.constantFrom(...LINES),
        (points, constant, slope, reference) => {
          const before = evaluate({ method: 'straightness', reference, points });
          const tilted = points.map(({ position, reading: r }) => ({
            position,
            reading: Fraction.from(r)
              .plus(Fraction.from(constant))
              .plus(Fraction.from(position).times(Fraction.from(slope)))
              .toText(),
          }));
          const after = evaluate({ method: 'straightness', reference, points: tilted });
          expect(after.deviation).toBe(before.deviation);
          if (reference !== 'minimum-zone') {
            expect(near(after.slope, plus(before.slope, Fraction.from(slope).times(Fraction.of(1000)).toText()))).toBe(
              true,
            );
          }
          expect(deviation([...points].reverse(), reference)).toBe(before.deviation);
          expect(
            deviation(
              points.map((p) => ({ ...p, reading: negated(p.reading) })),
              reference,
            ),
          ).toBe(before.deviation);
        },
      ),
      settings,
    );
  });

  it('the minimum zone is proven: three points touch the strip alternately, and all lie in it', () => {
    fc.assert(
      fc.property(profile(3), (points) => {
        const result = evaluate({ method: 'straightness', reference: 'minimum-zone', points });
        const half = new Dec(result.deviation).div(2);
        const touching = result.residuals
          .map((residual, i) => ({ residual: new Dec(residual), position: new Dec(points[i]!.position) }))
          .sort((a, b) => a.position.cmp(b.position))
          .filter(({ residual }) => residual.abs().minus(half).abs().lt('1e-20'))
          .map(({ residual }) => residual.isPositive() || half.isZero());
        expect(result.residuals.every((residual) => new Dec(residual).abs().lte(half.plus('1e-20')))).toBe(true);
        if (half.isZero()) return;
        const changes = touching.filter((side, i) => i > 0 && side !== touching[i - 1]).length;
        expect(changes).toBeGreaterThanOrEqual(2);
      }),
      settings,
    );
  });

  it('local never exceeds the whole about the minimum zone, and is found by trying every window', () => {
    fc.assert(
      fc.property(
        profile(4),
        fc.integer({ min: 1, max: 2000 }),
        fc.constantFrom(...LINES),
        (points, length, reference) => {
          const localLength = String(length);
          const {
            local,
            localAt,
            deviation: whole,
          } = evaluate({ method: 'straightness', reference, points, localLength });
          if (reference === 'minimum-zone') expect(compare(local!, whole)).toBeLessThanOrEqual(0);
          const positions = points.map((p) => Number(p.position));
          const [low, high] = [Math.min(...positions), Math.max(...positions)];
          const inside = (from: number, to: number) =>
            points.filter((p) => Number(p.position) >= from && Number(p.position) <= to);
          const windows =
            length >= high - low
              ? [points]
              : [
                  ...positions.filter((p) => p + length <= high).map((p) => inside(p, p + length)),
                  ...positions.filter((p) => p - length >= low).map((p) => inside(p - length, p)),
                ].filter((window) => window.length >= 3);
          const found = windows.map((window) => ({
            size: deviation(window, reference),
            at: String(Math.min(...window.map((p) => Number(p.position)))),
          }));
          const largest = found.reduce((best, { size }) => (compare(size, best) > 0 ? size : best), '0');
          expect(local).toBe(largest);
          if (windows.length === 0) {
            expect(localAt).toBeUndefined();
            return;
          }
          const places = found.filter(({ size }) => size === largest).map(({ at }) => Number(at));
          expect(Number(localAt)).toBe(Math.min(...places));
        },
      ),
      settings,
    );
  });

  it('angles taken from heights give the heights back', () => {
    fc.assert(
      fc.property(
        fc.array(reading, { minLength: 2, maxLength: 30 }),
        fc.constantFrom(...LINES),
        (angles, reference) => {
          const result = evaluate({
            method: 'straightness-from-angles',
            reference,
            stepLength: '125',
            angles,
            returnAngles: angles,
          });
          expect(result.closure).toBe('0');
          const points = result.heights.map((height, k) => ({ position: String(125 * k), reading: height }));
          expect(deviation(points, reference)).toBe(result.deviation);
        },
      ),
      settings,
    );
  });

  it('reversal: machine and straightedge add up to the runs', () => {
    fc.assert(
      fc.property(profile(3), profile(3), (a, b) => {
        const count = Math.min(a.length, b.length);
        const first = a.slice(0, count).map((p) => p.reading);
        const second = b.slice(0, count).map((p) => p.reading);
        const positions = a.slice(0, count).map((p) => p.position);
        const { machine, straightedge } = evaluate({ method: 'straightness-reversal', positions, first, second });
        machine.forEach((m, i) => {
          expect(compare(plus(straightedge[i]!, m), second[i]!)).toBe(0);
          expect(compare(plus(straightedge[i]!, negated(m)), first[i]!)).toBe(0);
        });
      }),
      settings,
    );
  });
});

describe('flatness', () => {
  const places = fc.uniqueArray(fc.tuple(fc.integer({ min: 0, max: 8 }), fc.integer({ min: 0, max: 8 })), {
    minLength: 5,
    maxLength: 30,
    selector: ([x, y]) => `${x} ${y}`,
  });
  const surface = places
    .filter((list) =>
      list.some(
        ([x, y]) => (list[1]![0] - list[0]![0]) * (y - list[0]![1]) !== (list[1]![1] - list[0]![1]) * (x - list[0]![0]),
      ),
    )
    .chain((list) =>
      fc
        .array(reading, { minLength: list.length, maxLength: list.length })
        .map((readings) => list.map(([x, y], i) => ({ x: String(x * 25), y: String(y * 25), reading: readings[i]! }))),
    );

  it('minimum zone ≤ least squares, and no plane through three points does better', () => {
    fc.assert(
      fc.property(surface, fc.integer({ min: 0, max: 1000 }), (points, pick) => {
        const zone = evaluate({ method: 'flatness', reference: 'minimum-zone', points }).deviation;
        expect(
          compare(zone, evaluate({ method: 'flatness', reference: 'least-squares', points }).deviation),
        ).toBeLessThanOrEqual(0);
        const three: [number, number, number] = [
          pick % points.length,
          (pick * 7 + 1) % points.length,
          (pick * 3 + 2) % points.length,
        ];
        try {
          const plane = evaluate({ method: 'flatness', reference: 'three-points', three, points });
          expect(compare(zone, plane.deviation)).toBeLessThanOrEqual(0);
        } catch (error) {
          expect((error as { issues: { pointer: string }[] }).issues[0]!.pointer).toBe('/three');
        }
      }),
      settings,
    );
  });

  it('stays the same when a plane is added, axes are exchanged or the sign turns', () => {
    fc.assert(
      fc.property(surface, hundredths(-100, 100), hundredths(-100, 100), (points, b, c) => {
        for (const reference of ['minimum-zone', 'least-squares'] as const) {
          const { deviation } = evaluate({ method: 'flatness', reference, points });
          const tilted = points.map((p) => ({
            x: p.y,
            y: p.x,
            reading: Fraction.from(p.reading)
              .plus(Fraction.from(b).times(Fraction.from(p.x)))
              .plus(Fraction.from(c).times(Fraction.from(p.y)))
              .negated()
              .toText(),
          }));
          expect(evaluate({ method: 'flatness', reference, points: tilted.reverse() }).deviation).toBe(deviation);
        }
      }),
      settings,
    );
  });
});

describe('circles', () => {
  const round = fc
    .uniqueArray(fc.integer({ min: 0, max: 359 }), { minLength: 5, maxLength: 24 })
    .chain((angles) =>
      fc
        .array(reading, { minLength: angles.length, maxLength: angles.length })
        .map((readings) => angles.map((angle, i) => ({ angle: String(angle), reading: readings[i]! }))),
    );

  it('roundness: minimum zone ≤ least squares; a constant and an eccentricity change neither', () => {
    fc.assert(
      fc.property(round, reading, (points, constant) => {
        const before = evaluate({ method: 'roundness', points });
        expect(new Dec(before.minimumZone).lte(new Dec(before.leastSquares).plus('1e-25'))).toBe(true);
        const moved = points.map((p) => ({ ...p, reading: plus(p.reading, constant) }));
        const after = evaluate({ method: 'roundness', points: moved });
        expect(near(after.minimumZone, before.minimumZone)).toBe(true);
        expect(near(after.leastSquares, before.leastSquares)).toBe(true);
        const turned = evaluate({
          method: 'roundness',
          points: points.map((p) => ({ ...p, angle: plus(p.angle, '-137') })),
        });
        expect(near(turned.minimumZone, before.minimumZone)).toBe(true);
        expect(near(turned.leastSquares, before.leastSquares)).toBe(true);
      }),
      { ...settings, numRuns: 120 },
    );
  });

  it('run-out: a constant changes nothing, turning the angles turns the phase', () => {
    fc.assert(
      fc.property(round, reading, fc.integer({ min: 1, max: 359 }), (points, constant, turn) => {
        const angles = points.map((p) => p.angle);
        const readings = points.map((p) => p.reading);
        const before = evaluate({ method: 'run-out', angles, insertions: [{ readings }] });
        const after = evaluate({
          method: 'run-out',
          angles: angles.map((angle) => plus(angle, String(turn))),
          insertions: [{ readings: readings.map((r) => plus(r, constant)) }],
        });
        expect(after.deviation).toBe(before.deviation);
        expect(new Dec(after.eccentricity!).minus(before.eccentricity!).abs().lt('1e-20')).toBe(true);
        const phase = new Dec(before.phase!).plus(before.eccentricity === '0' ? 0 : turn).mod(360);
        const apart = phase.minus(after.phase!).abs();
        expect(apart.lt('1e-18') || apart.minus(360).abs().lt('1e-18')).toBe(true);
        expect(new Dec(after.phase!).gte(0) && new Dec(after.phase!).lt(360)).toBe(true);
      }),
      { ...settings, numRuns: 120 },
    );
  });

  it('circular test: minimum zone ≤ least squares ≤ the readings as set; Gb ≥ each G', () => {
    fc.assert(
      fc.property(round, round, (a, b) => {
        const way = (points: typeof a) => points.map((p) => ({ angle: p.angle, radius: p.reading }));
        const result = evaluate({
          method: 'circular',
          nominalRadius: '50',
          clockwise: way(a),
          counterclockwise: way(b),
        });
        for (const one of [result.clockwise!, result.counterclockwise!]) {
          expect(new Dec(one.G).lte(new Dec(one.GLeastSquares).plus('1e-25'))).toBe(true);
          expect(new Dec(one.G).lte(new Dec(one.Fmax).minus(one.Fmin).plus('1e-25'))).toBe(true);
          expect(new Dec(result.Gb!).plus('1e-25').gte(one.G)).toBe(true);
        }
      }),
      { ...settings, numRuns: 40 },
    );
  });

  it('axis of rotation: total ≥ synchronous and asynchronous; an eccentricity of the mandrel drops out', () => {
    const turns = fc.array(fc.array(reading, { minLength: 12, maxLength: 12 }), { minLength: 2, maxLength: 6 });
    const wave = [10, 8, 5, 0, -5, -8, -10, -8, -5, 0, 5, 8].map(String);
    fc.assert(
      fc.property(turns, (list) => {
        for (const direction of ['radial', 'axial'] as const) {
          const one = evaluate({ method: 'axis-of-rotation', direction, turns: list });
          expect(new Dec(one.total).plus('1e-25').gte(one.synchronous)).toBe(true);
          expect(new Dec(one.total).plus('1e-25').gte(one.asynchronous)).toBe(true);
          const two = evaluate({
            method: 'axis-of-rotation',
            direction,
            turns: list.map((turn) => turn.map((r, k) => plus(r, wave[k]!))),
          });
          expect(two.asynchronous).toBe(one.asynchronous);
        }
      }),
      { ...settings, numRuns: 60 },
    );
  });
});

describe('positioning', () => {
  const test = fc.tuple(fc.integer({ min: 2, max: 8 }), fc.integer({ min: 2, max: 5 })).chain(([targets, cycles]) => {
    const run = fc.array(fc.array(reading, { minLength: cycles, maxLength: cycles }), {
      minLength: targets,
      maxLength: targets,
    });
    return fc.record({
      forward: run,
      backward: run,
      targets: fc.constant(Array.from({ length: targets }, (_, i) => String(i * 50))),
    });
  });

  it('E ≥ M, A ≥ E, A ≥ A of each direction, R ≥ B, |mean B| ≤ B', () => {
    fc.assert(
      fc.property(test, (input) => {
        const r = evaluate({ method: 'positioning', kind: 'linear', ...input });
        const atLeast = (large: string, small: string) => new Dec(large).plus('1e-25').gte(small);
        expect(atLeast(r.E!, r.M!)).toBe(true);
        expect(atLeast(r.A!, r.E!)).toBe(true);
        expect(atLeast(r.A!, r.Aforward!) && atLeast(r.A!, r.Abackward!)).toBe(true);
        expect(atLeast(r.E!, r.Eforward!) && atLeast(r.E!, r.Ebackward!)).toBe(true);
        expect(atLeast(r.R!, r.B!)).toBe(true);
        expect(atLeast(r.R!, r.Rforward!) && atLeast(r.R!, r.Rbackward!)).toBe(true);
        expect(atLeast(r.B!, new Dec(r.meanB!).abs().toString())).toBe(true);
      }),
      settings,
    );
  });

  it('a constant added to every reading changes no figure; exchanging the directions exchanges theirs', () => {
    fc.assert(
      fc.property(test, reading, (input, constant) => {
        const before = evaluate({ method: 'positioning', kind: 'linear', ...input });
        const add = (run: string[][]) => run.map((row) => row.map((r) => plus(r, constant)));
        const after = evaluate({
          method: 'positioning',
          kind: 'linear',
          targets: input.targets,
          forward: add(input.forward),
          backward: add(input.backward),
        });
        const swapped = evaluate({
          method: 'positioning',
          kind: 'linear',
          targets: input.targets,
          forward: input.backward,
          backward: input.forward,
        });
        for (const key of ['A', 'Aforward', 'Abackward', 'E', 'R', 'Rforward', 'B', 'meanB', 'M'] as const) {
          expect(near(after[key]!, before[key]!), key).toBe(true);
        }
        for (const key of ['A', 'E', 'R', 'B', 'M'] as const) expect(near(swapped[key]!, before[key]!), key).toBe(true);
        expect(swapped.Aforward).toBe(before.Abackward);
        expect(compare(swapped.meanB!, negated(before.meanB!))).toBe(0);
      }),
      settings,
    );
  });
});

describe('reversal of mandrel and square', () => {
  it('parallelism: a lean of the mandrel that turns with it drops out', () => {
    fc.assert(
      fc.property(profile(2), hundredths(-50, 50), (points, lean) => {
        const positions = points.map((p) => p.position);
        const readings = (factor: string) =>
          points.map((p) =>
            Fraction.from(p.reading)
              .plus(Fraction.from(factor).times(Fraction.from(p.position)))
              .toText(),
          );
        const straight = evaluate({
          method: 'parallelism',
          positions,
          readings: { '0': readings('0') },
          measuringLength: '300',
        });
        const turned = evaluate({
          method: 'parallelism',
          positions,
          readings: { '0': readings(lean), '180': readings(negated(lean)) },
          measuringLength: '300',
        });
        expect(turned.deviation).toBe(straight.deviation);
        expect(turned.means).toEqual(straight.means);
        const square = evaluate({
          method: 'squareness-to-axis',
          positions,
          readings: { '0': readings('0') },
          measuringLength: '300',
        });
        expect(square.e).toBe(negated(straight.deviation));
      }),
      settings,
    );
  });

  it('squareness: machine and square are told apart', () => {
    fc.assert(
      fc.property(reading, reading, (machine, square) => {
        const result = evaluate({
          method: 'squareness',
          first: { measuredArm: { slope: plus(machine, square) } },
          second: { measuredArm: { slope: plus(machine, negated(square)) } },
          measuringLength: '1000',
        });
        expect(result.squareness).toBe(machine);
        expect(result.squareError).toBe(square);
        expect(result.deviation).toBe(machine);
      }),
      settings,
    );
  });

  it('coaxiality: twice the offset is the total reading; a bore is the mirror of an outside without sag', () => {
    const four = fc.record({ '0': reading, '90': reading, '180': reading, '270': reading });
    fc.assert(
      fc.property(four, four, (a, b) => {
        const sections = [
          { position: '0', readings: a },
          { position: '80', readings: b },
        ];
        const offset = evaluate({ method: 'coaxiality', surface: 'outside', sections });
        const total = evaluate({
          method: 'coaxiality',
          surface: 'outside',
          basis: 'total-indicator-reading',
          sections,
        });
        expect(near(total.deviation, new Dec(offset.deviation).times(2).toString())).toBe(true);
        const bore = evaluate({ method: 'coaxiality', surface: 'bore', sections });
        expect(bore.deviation).toBe(offset.deviation);
        bore.sections.forEach(({ ex }, i) => {
          expect(ex).toBe(negated(offset.sections[i]!.ex));
        });
      }),
      settings,
    );
  });
});
