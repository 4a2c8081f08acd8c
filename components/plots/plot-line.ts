import { type ScaleLinear, scaleLinear } from 'd3-scale';
import { line } from 'd3-shape';
import type { DrawingItem } from '@/components/plots/drawing';
import { arrowHead, polyline, text, wordWidth } from '@/components/plots/drawing-parts';
import { coordinate, shortLimit } from '@/components/plots/number';
import {
  extentOf,
  figure,
  LABEL_PX,
  marker,
  type PlotOptions,
  type Reading,
  readingsBySeries,
  styleOf,
} from '@/components/plots/plot-frame';
import { plotLegend } from '@/components/plots/plot-legend';
import type { PlotSeries } from '@/lib/sheet/types';

interface Axes {
  x: ScaleLinear<number, number>;
  y: ScaleLinear<number, number>;
  left: number;
  right: number;
  top: number;
  bottom: number;
}

/** More readings than this are a line only: markers would hide it. */
const MARKED_READINGS = 60;

/** Readings over a length: a line with a + at each, the fitted line dashed, the tolerance as a bracket at the right. */
export function linePlot(series: PlotSeries, options: PlotOptions): DrawingItem[] {
  const groups = readingsBySeries(series);
  const all = groups.flatMap((group) => group.readings);
  const names = groups.map((group) => group.name);
  const axes = axesOf(series, all, options, plotLegend(names, 0, options.widthPx).heightPx);
  const items = [...grid(axes, series), ...bottomLabels(axes, series, all)];
  if (series.fit) items.push(fitLine(axes, series.fit));
  groups.forEach((group, index) => {
    items.push(...readingLine(axes, group.readings, index));
  });
  if (options.toleranceUm !== null) items.push(...bracket(axes, all, options.toleranceUm));
  items.push(...plotLegend(names, 2, options.widthPx).items);
  return items;
}

/** y reaches so far that the tolerance stands beside the readings, but never so far that these become a flat line. */
export function axesOf(series: PlotSeries, readings: Reading[], options: PlotOptions, legendPx: number): Axes {
  const fitY = series.fit ? [coordinate(series.fit.y1), coordinate(series.fit.y2)] : [];
  const [low, high] = extentOf([...readings.map((reading) => reading.y), ...fitY]);
  const span = high - low || 1;
  const tolerance = options.toleranceUm === null ? 0 : coordinate(options.toleranceUm);
  const reach = Math.max(high, low + Math.min(tolerance, span * 6));
  const y = scaleLinear()
    .domain([low, reach === low ? low + 1 : reach])
    .nice(4);
  const labels = y.ticks(4).map(String);
  const left = Math.max(...labels.map((label) => wordWidth(label, LABEL_PX, true)), 12) + 8;
  const right = options.widthPx - (options.toleranceUm === null ? 16 : 34);
  const top = 26 + legendPx;
  const bottom = options.heightPx - 42;
  const [from, to] = extentOf(readings.map((reading) => reading.x));
  const x = scaleLinear()
    .domain(from === to ? [from - 1, to + 1] : [from, to])
    .range([left, right]);
  return { x, y: y.range([bottom, top]), left, right, top, bottom };
}

function grid(axes: Axes, series: PlotSeries): DrawingItem[] {
  const label = { sizePx: LABEL_PX, ink: 'ink2' as const, mono: true };
  const lines = axes.y.ticks(4).flatMap((value) => [
    polyline(
      [
        [axes.left, axes.y(value)],
        [axes.right, axes.y(value)],
      ],
      { stroke: 'hair', widthPx: 1 },
    ),
    text(axes.left - 6, axes.y(value) + 4.5, figure(String(value)), { ...label, anchor: 'end' }),
  ]);
  return [text(2, 12, series.yLabel, { sizePx: LABEL_PX, ink: 'ink2' }), ...lines];
}

/** As many of the readings' places as fit side by side, always the first and the last. */
function bottomLabels(axes: Axes, series: PlotSeries, readings: Reading[]): DrawingItem[] {
  const places = [...new Map(readings.map((reading) => [reading.x, figure(reading.xText)]))].sort(
    (a, b) => a[0] - b[0],
  );
  const chosen: [number, string][] = [];
  const last = places.at(-1);
  const gap = 10;
  const edges = ([x, words]: [number, string]) => {
    const half = wordWidth(words, LABEL_PX, true) / 2;
    return [axes.x(x) - half, axes.x(x) + half] as const;
  };
  for (const place of places) {
    const previous = chosen.at(-1);
    const clearLeft = !previous || edges(previous)[1] + gap <= edges(place)[0];
    const clearRight = !last || place === last || edges(place)[1] + gap <= edges(last)[0];
    if (clearLeft && clearRight) chosen.push(place);
  }
  const y = axes.bottom + 19;
  const labels = chosen.map(([x, words]) =>
    text(axes.x(x), y, words, { sizePx: LABEL_PX, ink: 'ink2', anchor: 'middle', mono: true }),
  );
  const middle = (axes.left + axes.right) / 2;
  return [...labels, text(middle, y + 17, series.xLabel, { sizePx: LABEL_PX, ink: 'ink2', anchor: 'middle' })];
}

function fitLine(axes: Axes, fit: NonNullable<PlotSeries['fit']>): DrawingItem {
  const end = (x: string, y: string) => [axes.x(coordinate(x)), axes.y(coordinate(y))] as const;
  return polyline([end(fit.x1, fit.y1), end(fit.x2, fit.y2)], { stroke: 'ink2', widthPx: 1, dash: [5, 4] });
}

function readingLine(axes: Axes, readings: Reading[], index: number): DrawingItem[] {
  const style = styleOf(index);
  const sorted = [...readings].sort((a, b) => a.x - b.x);
  const d = line<Reading>(
    (r) => axes.x(r.x),
    (r) => axes.y(r.y),
  ).digits(2)(sorted);
  if (!d) return [];
  const stroke: DrawingItem = {
    kind: 'path',
    d,
    stroke: 'blue',
    fill: 'none',
    widthPx: 2,
    ...(style.dash ? { dash: style.dash } : {}),
  };
  const marked = sorted.length > MARKED_READINGS ? [] : sorted;
  return [stroke, ...marked.flatMap((r) => marker(style.marker, [axes.x(r.x), axes.y(r.y)]))];
}

/** The tolerance to scale, from the lowest reading up; where it is far larger than the plot it leaves at the top with an arrow. */
function bracket(axes: Axes, readings: Reading[], toleranceUm: string): DrawingItem[] {
  const [low] = extentOf(readings.map((reading) => reading.y));
  const x = axes.right + 12;
  const foot = axes.y(low);
  const head = axes.y(low + coordinate(toleranceUm));
  const top = Math.max(head, axes.top - 4);
  const bar = { stroke: 'ink' as const, widthPx: 1.25 };
  const cap = (y: number) =>
    polyline(
      [
        [x - 4, y],
        [x + 4, y],
      ],
      bar,
    );
  const end = head < top - 0.5 ? arrowHead([x, foot], [x, top], 7, bar) : cap(top);
  const words = `T ${figure(shortLimit(toleranceUm))}`;
  return [
    polyline(
      [
        [x, foot],
        [x, top],
      ],
      bar,
    ),
    cap(foot),
    end,
    text(axes.right + 32, 12, words, { sizePx: LABEL_PX, anchor: 'end', mono: true }),
  ];
}
