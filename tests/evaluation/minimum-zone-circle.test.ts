import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluate } from '@/lib/evaluation';
import { leastSquaresCircle, ONE_UM, type PlanePoint, planePoint } from '@/lib/evaluation/circle-geometry';
import { minimumZoneCircle, takeTurns } from '@/lib/evaluation/minimum-zone-circle';
import { directionOf, TRIG_ONE } from '@/lib/evaluation/trigonometry';
import { Dec } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';

const settings = { numRuns: 120, seed: 97 };
const hundredths = (n: number) => Fraction.of(n, 100).toText();

interface Trace {
  radiusMm: string;
  points: { angle: string; radius: string }[];
}

/** Traces of a circle: full or part, on centre or well off, fine or whole micrometres. */
const trace: fc.Arbitrary<Trace> = fc
  .record({
    radiusMm: fc.constantFrom('0.5', '5', '50', '150'),
    arc: fc.constantFrom(360, 270, 180, 90, 30),
    coarse: fc.constantFrom(1, 100),
    off: fc.integer({ min: -200, max: 200 }),
    radii: fc.array(fc.integer({ min: -800, max: 800 }), { minLength: 5, maxLength: 30 }),
  })
  .map(({ radiusMm, arc, coarse, off, radii }) => ({
    radiusMm,
    points: radii.map((radius, i) => {
      const angle = Fraction.of(arc * i, radii.length);
      const lean = off * Math.cos((angle.toDec().toNumber() * Math.PI) / 180);
      return {
        angle: angle.toDec().toFixed(6),
        radius: hundredths(Math.round((radius + lean * 100) / coarse) * coarse),
      };
    }),
  }));

const pointsOf = ({ radiusMm, points }: Trace): PlanePoint[] =>
  points.map(({ angle, radius }) => {
    const nominal = Fraction.from(radiusMm).times(Fraction.of(1000));
    return planePoint(nominal.plus(Fraction.from(radius)), directionOf(Fraction.from(angle)));
  });

const distance = (a: PlanePoint, b: PlanePoint) => {
  const [x, y] = [new Dec((a.x - b.x).toString()), new Dec((a.y - b.y).toString())];
  return x.times(x).plus(y.times(y)).sqrt().div(ONE_UM.toString());
};

/**
 * The optimum proven from outside, in decimals: points that touch the outer and the inner circle take turns, and their weights (both
 * sides of weight 1, with the same mean direction) say that no small move of the centre makes the zone narrower.
 */
function expectProven(points: readonly PlanePoint[]): void {
  const { centre, width, outer, inner } = minimumZoneCircle(points, leastSquaresCircle(points).centre);
  const radii = points.map((point) => distance(point, centre));
  const [most, least] = [Dec.max(...radii), Dec.min(...radii)];
  expect(most.minus(least).minus(width.toDec()).abs().lt('1e-30')).toBe(true);
  for (const index of outer) expect(most.minus(radii[index]!).lt('1e-15')).toBe(true);
  for (const index of inner) expect(radii[index]!.minus(least).lt('1e-15')).toBe(true);
  if (width.toDec().lt('1e-15')) return;
  const angleOf = (index: number) =>
    Math.atan2(
      Number((points[index]!.y - centre.y) / (ONE_UM >> 40n)),
      Number((points[index]!.x - centre.x) / (ONE_UM >> 40n)),
    );
  const round = [
    ...outer.map((index) => ({ at: angleOf(index), side: 'outer' })),
    ...inner.map((index) => ({ at: angleOf(index), side: 'inner' })),
  ]
    .sort((a, b) => a.at - b.at)
    .map(({ side }) => side);
  const changes = round.filter((side, k) => side !== round[(k + 1) % round.length]).length;
  expect(changes).toBeGreaterThanOrEqual(4);
}

describe('the minimum zone of a circle is proven', () => {
  it('random traces, full and partial, centred and not, with ties', () => {
    fc.assert(
      fc.property(trace, (one) => expectProven(pointsOf(one))),
      settings,
    );
  });

  it('no other centre does better, wherever the search begins', () => {
    fc.assert(
      fc.property(trace, fc.integer({ min: -40, max: 40 }), fc.integer({ min: -40, max: 40 }), (one, dx, dy) => {
        const points = pointsOf(one);
        const start = leastSquaresCircle(points).centre;
        const here = minimumZoneCircle(points, start);
        const other = {
          x: here.centre.x + (BigInt(dx) * ONE_UM) / 10n,
          y: here.centre.y + (BigInt(dy) * ONE_UM) / 10n,
        };
        const radii = points.map((point) => distance(point, other));
        expect(
          Dec.max(...radii)
            .minus(Dec.min(...radii))
            .gte(here.width.toDec().minus('1e-30')),
        ).toBe(true);
        const again = minimumZoneCircle(points, other);
        expect(again.width.minus(here.width).toDec().abs().lt('1e-20')).toBe(true);
      }),
      { ...settings, numRuns: 60 },
    );
  });

  it('all radii equal: nothing between the circles', () => {
    const points = Array.from({ length: 12 }, (_, i) => ({ angle: String(i * 30), radius: '3' }));
    expectProven(pointsOf({ radiusMm: '50', points }));
    expect(evaluate({ method: 'circular', nominalRadius: '50', clockwise: points }).clockwise).toMatchObject({
      G: '0',
      GLeastSquares: '0',
    });
  });

  it('exact ties: a square of high and low points, by hand 2', () => {
    const points = Array.from({ length: 8 }, (_, i) => ({ angle: String(i * 45), radius: i % 2 ? '-1' : '1' }));
    expectProven(pointsOf({ radiusMm: '50', points }));
    expect(evaluate({ method: 'circular', nominalRadius: '50', clockwise: points }).deviation).toBe('2');
  });

  it('four contacts, two and two, and a fifth point between', () => {
    const points = [
      { angle: '0', radius: '1' },
      { angle: '90', radius: '-1' },
      { angle: '180', radius: '1' },
      { angle: '270', radius: '-1' },
      { angle: '45', radius: '0' },
    ];
    const found = minimumZoneCircle(pointsOf({ radiusMm: '50', points }), { x: 0n, y: 0n });
    expect([found.outer, found.inner, found.width.toText()]).toEqual([[0, 2], [1, 3], '2']);
  });

  it('the proof refuses what is not the optimum', () => {
    const points = pointsOf({
      radiusMm: '50',
      points: [0, 60, 120, 180, 240, 300].map((angle, i) => ({ angle: String(angle), radius: i < 3 ? '2' : '-2' })),
    });
    const centre = { x: 0n, y: 0n };
    expect(takeTurns(points, centre, { outer: [0, 1, 2], inner: [3, 4, 5] })).toBe(false);
    expect(takeTurns(points, centre, { outer: [0, 2], inner: [1, 4] })).toBe(true);
  });
});

describe('the minimum zone of roundness is proven', () => {
  const contacts = (points: { angle: string; reading: string }[]) => {
    const { minimumZone, centreMinimumZone } = evaluate({ method: 'roundness', points });
    const residuals = points.map(({ angle, reading }) => {
      const { cos, sin } = directionOf(Fraction.from(angle));
      const part = (figure: string, of: bigint) => new Dec(figure).times(of.toString()).div(TRIG_ONE.toString());
      return new Dec(reading).minus(part(centreMinimumZone.x, cos)).minus(part(centreMinimumZone.y, sin));
    });
    const [most, least] = [Dec.max(...residuals), Dec.min(...residuals)];
    expect(most.minus(least).minus(minimumZone).abs().lt('1e-25')).toBe(true);
    const sides = points
      .map(({ angle }, i) => ({
        angle: Number(angle),
        high: most.minus(residuals[i]!).lt('1e-25'),
        low: residuals[i]!.minus(least).lt('1e-25'),
      }))
      .filter(({ high, low }) => high || low)
      .sort((a, b) => a.angle - b.angle);
    return {
      width: minimumZone,
      changes: sides.filter(({ high }, k) => high !== sides[(k + 1) % sides.length]!.high).length,
    };
  };

  it('high and low points take turns at least four times', () => {
    const round = fc
      .uniqueArray(fc.integer({ min: 0, max: 35_999 }), { minLength: 4, maxLength: 30 })
      .chain((angles) =>
        fc
          .array(fc.integer({ min: -50, max: 50 }), { minLength: angles.length, maxLength: angles.length })
          .map((readings) =>
            angles.map((angle, i) => ({ angle: hundredths(angle), reading: Fraction.of(readings[i]!, 10).toText() })),
          ),
      );
    fc.assert(
      fc.property(round, (points) => {
        const { width, changes } = contacts(points);
        expect(new Dec(width).lt('1e-25') || changes >= 4).toBe(true);
      }),
      { numRuns: 300, seed: 98 },
    );
  });

  it('four points, equal readings, ties', () => {
    const quarter = (readings: string[]) =>
      readings.map((reading, i) => ({ angle: String((i * 360) / readings.length), reading }));
    expect(contacts(quarter(['1', '-1', '1', '-1']))).toEqual({ width: '2', changes: 4 });
    expect(contacts(quarter(['5', '5', '5', '5'])).width).toBe('0');
    expect(contacts(quarter(['1', '0', '0', '0', '0', '0', '0', '0'])).changes).toBeGreaterThanOrEqual(4);
  });
});
