import type { DrawingItem } from '@/components/plots/drawing';
import { circle, onCircle, polyline, text } from '@/components/plots/drawing-parts';
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

/** The smallest reading lies at this part of the radius: far enough out to be seen as a circle. */
const INNER = 0.5;

/**
 * Readings round a turn of the spindle, 0° at the right, counted anticlockwise. Two dashed circles stand a tolerance apart: a trace
 * that fits between them has a total reading within it.
 */
export function polarPlot(series: PlotSeries, options: PlotOptions): DrawingItem[] {
  const groups = readingsBySeries(series);
  const all = groups.flatMap((group) => group.readings);
  const legend = plotLegend(
    groups.map((group) => group.name),
    2,
    options.widthPx,
  );
  const top = 18 + legend.heightPx + (legend.heightPx ? 10 : 0);
  const radius = Math.max(20, Math.min(options.widthPx / 2 - 44, (options.heightPx - top - 24) / 2 - 4));
  const centre = [options.widthPx / 2, top + 10 + radius] as const;
  const [low, high] = extentOf(all.map((reading) => reading.y));
  const tolerance = options.toleranceUm === null ? 0 : coordinate(options.toleranceUm);
  const span = Math.max(high - low, Math.min(tolerance, (high - low || 1) * 4)) || 1;
  const r = (value: number) => radius * (INNER + ((1 - INNER) * (value - low)) / span);

  const items: DrawingItem[] = [text(2, 12, series.yLabel, { sizePx: LABEL_PX, ink: 'ink2' })];
  for (const deg of [0, 45, 90, 135]) {
    const ends = [onCircle(...centre, radius + 3, -deg), onCircle(...centre, radius + 3, 180 - deg)];
    items.push(polyline(ends, { stroke: 'hair', widthPx: 1 }));
  }
  items.push(circle(...centre, r(low), { stroke: 'ink2', widthPx: 1, dash: [5, 4] }));
  if (tolerance > 0 && tolerance <= span)
    items.push(circle(...centre, r(low + tolerance), { stroke: 'ink2', widthPx: 1, dash: [5, 4] }));
  items.push(...angleNames(centre, radius));
  groups.forEach((group, index) => {
    items.push(...trace(group.readings, index, centre, r));
  });
  if (options.toleranceUm !== null) {
    items.push(
      text(options.widthPx - 2, 12, `T ${figure(shortLimit(options.toleranceUm))}`, {
        sizePx: LABEL_PX,
        anchor: 'end',
        mono: true,
      }),
    );
  }
  items.push(...legend.items);
  return items;
}

function trace(
  readings: Reading[],
  index: number,
  [cx, cy]: readonly [number, number],
  r: (value: number) => number,
): DrawingItem[] {
  const style = styleOf(index);
  const turn = readings.filter(
    (reading, at) => readings.findIndex((other) => (other.x - reading.x) % 360 === 0) === at,
  );
  const sorted = [...turn].sort((a, b) => a.x - b.x);
  const points = sorted.map((reading) => onCircle(cx, cy, r(reading.y), -reading.x));
  const marks = points.length > 40 ? [] : points.flatMap((point) => marker(style.marker, point));
  return [polyline(points, { stroke: 'blue', widthPx: 2, dash: style.dash, closed: true }), ...marks];
}

function angleNames([cx, cy]: readonly [number, number], radius: number): DrawingItem[] {
  const style = { sizePx: LABEL_PX, ink: 'ink2' as const, mono: true };
  return [
    text(cx + radius + 8, cy + 4.5, '0°', style),
    text(cx, cy - radius - 8, '90°', { ...style, anchor: 'middle' }),
    text(cx - radius - 8, cy + 4.5, '180°', { ...style, anchor: 'end' }),
    text(cx, cy + radius + 17, '270°', { ...style, anchor: 'middle' }),
  ];
}
