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
  const { readings: sorted, whole } = inOneTurn(readings);
  const points = sorted.map((reading) => onCircle(cx, cy, r(reading.y), -reading.x));
  const marks = points.length > MARKED_READINGS ? [] : points.flatMap((point) => marker(style.marker, point));
  return [polyline(points, { stroke: 'blue', widthPx: 2, dash: style.dash, closed: whole }), ...marks];
}

/** More readings than this are a line only: markers would hide it. */
const MARKED_READINGS = 40;
/** A gap between two angles so many times as wide as any other: the trace is an arc that begins behind it. */
const GAP = 1.5;

/** Readings of one turn in the order of their angles, each angle once; of an arc from its beginning to its end. */
function inOneTurn(readings: Reading[]): { readings: Reading[]; whole: boolean } {
  const byAngle = new Map<number, Reading>();
  for (const reading of readings) {
    const angle = ((reading.x % 360) + 360) % 360;
    if (!byAngle.has(angle)) byAngle.set(angle, reading);
  }
  const turn = [...byAngle].sort((a, b) => a[0] - b[0]);
  const gaps = turn.map(([angle], at) => (turn[at + 1]?.[0] ?? (turn[0]?.[0] ?? 0) + 360) - angle);
  const widest = gaps.indexOf(Math.max(...gaps));
  const others = gaps.filter((_, at) => at !== widest);
  const whole = turn.length < 3 || (gaps[widest] ?? 0) <= GAP * Math.max(...others);
  const ordered = whole ? turn : [...turn.slice(widest + 1), ...turn.slice(0, widest + 1)];
  return { readings: ordered.map(([, reading]) => reading), whole };
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
