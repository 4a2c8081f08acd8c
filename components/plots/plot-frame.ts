import type { DrawingItem } from '@/components/plots/drawing';
import { type Point, polyline } from '@/components/plots/drawing-parts';
import { coordinate } from '@/components/plots/number';
import type { PlotSeries } from '@/lib/sheet/types';

export interface PlotOptions {
  /** Tolerance that is drawn beside the readings, µm; null: none is given. */
  toleranceUm: string | null;
  widthPx: number;
  heightPx: number;
}

export interface Reading {
  x: number;
  y: number;
  xText: string;
}

/** Lines of one plot are told apart by dash and marker, never by colour alone: sixteen pairs before one comes again. */
const MARKERS: Marker[] = ['plus', 'cross', 'square', 'triangle'];
const DASHES: (number[] | undefined)[] = [undefined, [7, 3], [2, 3], [7, 3, 2, 3]];

type Marker = 'plus' | 'cross' | 'square' | 'triangle';

export const LABEL_PX = 13;

/** Readings by the name of their series, in the order of the input. */
export function readingsBySeries(series: PlotSeries): { name: string | null; readings: Reading[] }[] {
  const groups = new Map<string | null, Reading[]>();
  for (const point of series.points) {
    const name = point.series ?? null;
    const group = groups.get(name) ?? [];
    group.push({ x: coordinate(point.x), y: coordinate(point.y), xText: point.x });
    groups.set(name, group);
  }
  return [...groups].map(([name, readings]) => ({ name, readings }));
}

export function styleOf(index: number): { marker: Marker; dash?: number[] } {
  const dash = DASHES[(index + Math.floor(index / MARKERS.length)) % DASHES.length];
  return { marker: MARKERS[index % MARKERS.length] as Marker, ...(dash ? { dash } : {}) };
}

/** A small mark at a reading. */
export function marker(kind: Marker, [x, y]: Point, size = 4): DrawingItem[] {
  const style = { stroke: 'blue' as const, widthPx: 1.5 };
  if (kind === 'plus')
    return [
      polyline(
        [
          [x - size, y],
          [x + size, y],
        ],
        style,
      ),
      polyline(
        [
          [x, y - size],
          [x, y + size],
        ],
        style,
      ),
    ];
  if (kind === 'cross') {
    const s = size * 0.8;
    return [
      polyline(
        [
          [x - s, y - s],
          [x + s, y + s],
        ],
        style,
      ),
      polyline(
        [
          [x - s, y + s],
          [x + s, y - s],
        ],
        style,
      ),
    ];
  }
  const s = size * 0.8;
  const corners: Point[] =
    kind === 'square'
      ? [
          [x - s, y - s],
          [x + s, y - s],
          [x + s, y + s],
          [x - s, y + s],
        ]
      : [
          [x, y - s],
          [x + s, y + s],
          [x - s, y + s],
        ];
  return [polyline(corners, { ...style, fill: 'leaf', closed: true })];
}

/** Smallest and largest of some numbers; [0, 0] of none. */
export function extentOf(values: number[]): [number, number] {
  let [low, high] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
  for (const value of values) {
    if (value < low) low = value;
    if (value > high) high = value;
  }
  return values.length ? [low, high] : [0, 0];
}

/** A typographic minus, as everywhere else on screen and paper. */
export const figure = (words: string) => words.replace('-', '−');
