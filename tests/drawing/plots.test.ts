import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { plotDrawing } from '@/components/plots/plot-geometry';
import type { PlotSeries } from '@/lib/sheet/types';
import { collisions, outside, segmentsOf } from '../helpers/drawing-geometry';

const size = { widthPx: 420, heightPx: 260 };
const line: PlotSeries = {
  kind: 'line',
  xLabel: 'z, mm',
  yLabel: 'reading, µm',
  points: [
    ['0', '0'],
    ['75', '1'],
    ['150', '2.5'],
    ['225', '3'],
    ['300', '4'],
  ].map(([x, y]) => ({ x: x!, y: y! })),
  fit: { x1: '0', y1: '0.1', x2: '300', y2: '4.1' },
};

const pathsOf = (series: PlotSeries, toleranceUm: string | null) =>
  plotDrawing(series, { ...size, toleranceUm }).items.flatMap((item) => (item.kind === 'path' ? [item] : []));

describe('plot of a profile', () => {
  it('puts readings in proportion along and across', () => {
    const trace = pathsOf(line, '15').find((item) => item.stroke === 'blue' && segmentsOf(item.d).length === 4);
    const points = segmentsOf(trace!.d);
    const [first, last] = [points[0]!, points[3]!];
    expect((points[1]![0] - first[0]) / (last[2] - first[0])).toBeCloseTo(75 / 300, 2);
    expect((first[1] - points[1]![1]) / (first[1] - last[3])).toBeCloseTo(1 / 4, 2);
  });

  it('draws the tolerance to the scale of the readings', () => {
    const drawn = pathsOf(line, '8');
    const trace = segmentsOf(drawn.find((item) => item.stroke === 'blue' && segmentsOf(item.d).length === 4)!.d);
    const bracket = drawn
      .flatMap((item) => segmentsOf(item.d))
      .find(([x1, , x2]) => x1 === x2 && x1 > size.widthPx - 34)!;
    const perUm = (trace[0]![1] - trace[3]![3]) / 4;
    expect(Math.abs(bracket[1] - bracket[3])).toBeCloseTo(8 * perUm, 1);
  });

  it('dashes the fitted line and leaves the markers out of a long series', () => {
    expect(pathsOf(line, null).filter((item) => item.dash && item.stroke === 'ink2')).toHaveLength(1);
    const many: PlotSeries = { ...line, points: Array.from({ length: 200 }, (_, i) => ({ x: `${i}`, y: `${i % 7}` })) };
    expect(pathsOf(many, null).filter((item) => item.stroke === 'blue')).toHaveLength(1);
  });

  it('tells several series apart by dash and marker, and names them', () => {
    const two = {
      ...line,
      points: line.points.flatMap((p) => [
        { ...p, series: '0°' },
        { x: p.x, y: '1', series: '180°' },
      ]),
    };
    const drawing = plotDrawing(two, { ...size, toleranceUm: null });
    const texts = drawing.items.flatMap((item) => (item.kind === 'text' ? [item.text] : []));
    expect(texts).toEqual(expect.arrayContaining(['0°', '180°']));
    const traces = drawing.items.filter(
      (item) =>
        item.kind === 'path' && segmentsOf(item.d).length === 4 && item.stroke === 'blue' && item.fill === 'none',
    );
    expect(new Set(traces.map((item) => (item.kind === 'path' ? String(item.dash) : ''))).size).toBe(2);
  });
});

describe('plot round a turn', () => {
  const polar: PlotSeries = {
    kind: 'polar',
    xLabel: 'spindle angle, °',
    yLabel: 'reading, µm',
    points: ['0', '90', '180', '270'].map((x, i) => ({ x, y: `${i}` })),
  };

  it('has 0° at the right and counts anticlockwise', () => {
    const trace = segmentsOf(
      pathsOf(polar, null).find((item) => item.stroke === 'blue' && segmentsOf(item.d).length === 4)!.d,
    );
    const [right, up, left] = [trace[0]!, trace[1]!, trace[2]!];
    expect(right[0]).toBeGreaterThan(up[0]);
    expect(up[1]).toBeLessThan(right[1]);
    expect(left[0]).toBeLessThan(up[0]);
  });

  it('draws two circles a tolerance apart, to the scale of the readings', () => {
    const radii = pathsOf(polar, '4')
      .filter((item) => item.dash && item.stroke === 'ink2')
      .map((item) => {
        const xs = segmentsOf(item.d).map(([x]) => x);
        return (Math.max(...xs) - Math.min(...xs)) / 2;
      });
    expect(radii).toHaveLength(2);
    const trace = segmentsOf(
      pathsOf(polar, '4').find((item) => item.stroke === 'blue' && segmentsOf(item.d).length === 4)!.d,
    );
    const centre = trace[1]![0];
    const perUm = (centre - trace[2]![0] - (trace[0]![0] - centre)) / 2;
    expect(Math.abs(radii[1]! - radii[0]!)).toBeCloseTo(4 * perUm, 0);
  });
});

it('draws the gap of a pair as an upright line of its own length', () => {
  const pairs: PlotSeries = {
    kind: 'pairs',
    xLabel: 'place',
    yLabel: 'µm',
    points: [
      { x: '1', y: '0', series: 'approach in +' },
      { x: '1', y: '-8', series: 'approach in −' },
      { x: '2', y: '0', series: 'approach in +' },
      { x: '2', y: '-4', series: 'approach in −' },
    ],
  };
  const gaps = pathsOf(pairs, '5')
    .filter((item) => item.stroke === 'ink')
    .flatMap((item) => segmentsOf(item.d).map(([, y1, , y2]) => Math.abs(y1 - y2)));
  expect(gaps).toHaveLength(2);
  expect(gaps[0]! / gaps[1]!).toBeCloseTo(2, 2);
});

it('stays inside its box, with labels clear of one another, for any readings', () => {
  const reading = fc.integer({ min: -50_000, max: 50_000 }).map((n) => (n / 10).toFixed(1));
  fc.assert(
    fc.property(
      fc.array(reading, { minLength: 1, maxLength: 40 }),
      fc.constantFrom<PlotSeries['kind']>('line', 'polar', 'pairs'),
      fc.option(fc.integer({ min: 1, max: 4000 }).map(String)),
      fc.integer({ min: 1, max: 4 }),
      (ys, kind, toleranceUm, names) => {
        const points = ys.map((y, i) => ({
          x: `${kind === 'polar' ? (i * 30) % 360 : i * 25}`,
          y,
          ...(names > 1 ? { series: `insertion ${(i % names) + 1}` } : {}),
        }));
        const drawing = plotDrawing({ kind, xLabel: 'z, mm', yLabel: 'reading, µm', points }, { ...size, toleranceUm });
        expect(outside(drawing, 6)).toEqual([]);
        expect(collisions({ ...drawing, items: drawing.items.filter((item) => item.kind === 'text') })).toEqual([]);
      },
    ),
  );
});

it('draws nothing without readings and refuses what is not a figure', () => {
  expect(plotDrawing({ ...line, points: [] }, { ...size, toleranceUm: null }).items).toEqual([]);
  expect(() => plotDrawing({ ...line, points: [{ x: '0', y: '' }] }, { ...size, toleranceUm: null })).toThrow(
    /Not a figure/,
  );
});

describe('plots of new kinds of readings', () => {
  const round = (angles: number[], y: (deg: number) => string, series?: string): PlotSeries['points'] =>
    angles.map((deg) => ({ x: `${deg}`, y: y(deg), ...(series ? { series } : {}) }));
  const angles = (count: number, over = 360) => Array.from({ length: count }, (_, k) => (k * over) / count);
  const polar = (points: PlotSeries['points']): PlotSeries => ({
    kind: 'polar',
    xLabel: 'angle, °',
    yLabel: 'radius, µm',
    points,
  });
  const closed = (series: PlotSeries) =>
    pathsOf(series, null).filter((item) => item.widthPx === 2 && item.stroke === 'blue' && item.d.endsWith('Z')).length;

  it.each([4, 36, 360])('closes a whole turn of %i readings', (count) => {
    expect(closed(polar(round(angles(count), (deg) => `${deg % 7}`)))).toBe(1);
  });

  it('leaves an arc open, and begins it behind the gap also where it goes over 0°', () => {
    expect(closed(polar(round(angles(12, 100), (deg) => `${deg % 7}`)))).toBe(0);
    const over = polar(round([300, 330, 0, 30, 60], () => '-3'));
    expect(closed(over)).toBe(0);
    const trace = segmentsOf(pathsOf(over, null).find((item) => item.widthPx === 2)!.d);
    // 300° lies low at the right, 60° high: four pieces in a row, none across the middle.
    expect(trace).toHaveLength(4);
    expect(trace[0]![1]).toBeGreaterThan(trace[3]![3]);
  });

  it('draws two traces of 360 readings with negative figures inside the box, told apart by dash', () => {
    const points = [
      ...round(angles(360), (deg) => (-5 + 3 * Math.sin(deg)).toFixed(2), 'clockwise'),
      ...round(angles(360), (deg) => (-5 - 3 * Math.sin(deg)).toFixed(2), 'counterclockwise'),
    ];
    const drawing = plotDrawing(polar(points), { ...size, toleranceUm: '10' });
    expect(outside(drawing)).toEqual([]);
    const traces = drawing.items.filter((item) => item.kind === 'path' && item.widthPx === 2);
    expect(new Set(traces.map((item) => (item.kind === 'path' ? String(item.dash) : ''))).size).toBe(2);
  });

  it('grows with its legend: twelve series leave what is drawn as high as two', () => {
    const of = (count: number): PlotSeries => ({
      ...line,
      points: Array.from({ length: count }, (_, row) =>
        line.points.map((point) => ({ ...point, series: `y ${row * 50} mm` })),
      ).flat(),
    });
    const drawn = (count: number) => plotDrawing(of(count), { widthPx: 270, heightPx: 190, toleranceUm: '10' });
    const extent = (count: number) => {
      const ys = drawn(count).items.flatMap((item) =>
        item.kind === 'path' && item.stroke === 'hair' ? segmentsOf(item.d).map(([, y]) => y) : [],
      );
      return Math.max(...ys) - Math.min(...ys);
    };
    expect(extent(12)).toBeCloseTo(extent(2), 5);
    expect(drawn(12).heightPx).toBeGreaterThan(190);
    expect(outside(drawn(12))).toEqual([]);
    const texts = { ...drawn(12), items: drawn(12).items.filter((item) => item.kind === 'text') };
    expect(collisions(texts)).toEqual([]);
    const styles = drawn(12)
      .items.filter((item) => item.kind === 'path' && item.widthPx === 2)
      .map((item) => (item.kind === 'path' ? String(item.dash) : ''));
    expect(new Set(styles).size).toBe(4);
  });

  it('draws and names the tolerance in the unit of the axis', () => {
    const seconds: PlotSeries = { ...line, yLabel: 'deviation, ″' };
    const drawing = plotDrawing(seconds, { ...size, toleranceUm: '24.2406840554767604' });
    const texts = drawing.items.flatMap((item) => (item.kind === 'text' ? [item.text] : []));
    expect(texts).toContain('T 5');
    expect(drawing.description).toContain('tolerance 5 ″');
    const slopes = plotDrawing({ ...line, yLabel: 'pitch, mm/m' }, { ...size, toleranceUm: '40' });
    expect(slopes.description).toContain('tolerance 0.04 mm/m');
    expect(slopes.items.some((item) => item.kind === 'text' && item.text === 'T 0.04')).toBe(true);
  });

  it('says how many traces there are where they are too many to be named', () => {
    const points = Array.from({ length: 20 }, (_, k) =>
      round(angles(8), (deg) => `${(deg + k) % 7}`, `turn ${k + 1}`),
    ).flat();
    const drawing = plotDrawing(polar(points), { widthPx: 300, heightPx: 216, toleranceUm: null });
    const texts = drawing.items.flatMap((item) => (item.kind === 'text' ? [item.text] : []));
    expect(texts).toContain('20 traces, turn 1 to turn 20');
    expect(drawing.heightPx).toBe(216);
    expect(outside(drawing)).toEqual([]);
    expect(collisions({ ...drawing, items: drawing.items.filter((item) => item.kind === 'text') })).toEqual([]);
  });
});
