import { scaleLinear } from 'd3-scale';
import type { DrawingItem } from '@/components/plots/drawing';
import { polyline, text, wordWidth } from '@/components/plots/drawing-parts';
import {
  extentOf,
  figure,
  LABEL_PX,
  marker,
  type PlotOptions,
  readingsBySeries,
  styleOf,
} from '@/components/plots/plot-frame';
import { plotLegend } from '@/components/plots/plot-legend';
import type { PlotSeries } from '@/lib/sheet/types';

/**
 * Pairs of readings at one target, approached from both sides: the readings of a series joined, and for every place the gap between
 * lowest and highest as an upright line. The gap is what is judged.
 */
export function pairsPlot(series: PlotSeries, options: PlotOptions): DrawingItem[] {
  const groups = readingsBySeries(series);
  const all = groups.flatMap((group) => group.readings);
  const [low, high] = extentOf(all.map((reading) => reading.y));
  const y = scaleLinear()
    .domain(low === high ? [low - 1, high + 1] : [low, high])
    .nice(4);
  const labels = y.ticks(4);
  const left = Math.max(...labels.map((value) => wordWidth(String(value), LABEL_PX, true)), 12) + 12;
  const legend = plotLegend(
    groups.map((group) => group.name),
    2,
    options.widthPx,
  );
  const [top, bottom, right] = [26 + legend.heightPx, options.heightPx - 42, options.widthPx - 16];
  y.range([bottom, top]);
  const places = [...new Set(all.map((reading) => reading.x))].sort((a, b) => a - b);
  const step = (right - left) / places.length;
  const x = (place: number) => left + step * (places.indexOf(place) + 0.5);

  const items: DrawingItem[] = [text(2, 12, series.yLabel, { sizePx: LABEL_PX, ink: 'ink2' })];
  for (const value of labels) {
    items.push(
      polyline(
        [
          [left, y(value)],
          [right, y(value)],
        ],
        { stroke: 'hair', widthPx: 1 },
      ),
    );
    items.push(
      text(left - 6, y(value) + 4.5, figure(String(value)), {
        sizePx: LABEL_PX,
        ink: 'ink2',
        anchor: 'end',
        mono: true,
      }),
    );
  }
  const every = Math.ceil((wordWidth('000', LABEL_PX, true) + 8) / step);
  places.forEach((place, index) => {
    const here = all.filter((reading) => reading.x === place);
    const [from, to] = extentOf(here.map((reading) => reading.y));
    items.push(
      polyline(
        [
          [x(place), y(from)],
          [x(place), y(to)],
        ],
        { stroke: 'ink', widthPx: 1 },
      ),
    );
    if (index % every) return;
    const words = figure(here[0]?.xText ?? '');
    items.push(text(x(place), bottom + 19, words, { sizePx: LABEL_PX, ink: 'ink2', anchor: 'middle', mono: true }));
  });
  items.push(text((left + right) / 2, bottom + 36, series.xLabel, { sizePx: LABEL_PX, ink: 'ink2', anchor: 'middle' }));
  groups.forEach((group, index) => {
    const style = styleOf(index);
    const points = group.readings.map((reading) => [x(reading.x), y(reading.y)] as const);
    items.push(polyline(points, { stroke: 'blue', widthPx: 1, dash: style.dash ?? [1, 3] }));
    items.push(...points.flatMap((point) => marker(style.marker, point)));
  });
  items.push(...legend.items);
  return items;
}
