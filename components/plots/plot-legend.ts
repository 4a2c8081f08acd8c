import type { DrawingItem } from '@/components/plots/drawing';
import { polyline, text, wordWidth } from '@/components/plots/drawing-parts';
import { LABEL_PX, marker, styleOf } from '@/components/plots/plot-frame';
import { seriesWords } from '@/lib/reporting/drawing-text';

const ROW_PX = 18;
/** One row has room in the height that a plot is given; for more rows the plot grows. */
const ONE_ROW_PX = ROW_PX + 2;
const SAMPLE_PX = 22;
/** More traces than this cannot be told apart one by one: the legend says how many there are. */
const MOST_NAMED = 12;

/** Names of the series of a plot with their dash and marker, in as many rows as it takes, below the unit. */
export function plotLegend(
  names: (string | null)[],
  left: number,
  right: number,
): { items: DrawingItem[]; heightPx: number } {
  if (names.length < 2) return { items: [], heightPx: 0 };
  if (names.length > MOST_NAMED) {
    const words = seriesWords(names.length, names[0] ?? '', names.at(-1) ?? '');
    return { items: [text(left, 32.5, words, { sizePx: LABEL_PX, ink: 'ink2' })], heightPx: ONE_ROW_PX };
  }
  const items: DrawingItem[] = [];
  let [x, y] = [left, 28];
  names.forEach((name, index) => {
    const width = SAMPLE_PX + 6 + wordWidth(name ?? '', LABEL_PX);
    if (x > left && x + width > right) [x, y] = [left, y + ROW_PX];
    const { dash, marker: kind } = styleOf(index);
    items.push(
      polyline(
        [
          [x, y],
          [x + SAMPLE_PX, y],
        ],
        { stroke: 'blue', dash },
      ),
      ...marker(kind, [x + SAMPLE_PX / 2, y]),
    );
    items.push(text(x + SAMPLE_PX + 6, y + 4.5, name ?? '', { sizePx: LABEL_PX, ink: 'ink2' }));
    x += width + 14;
  });
  return { items, heightPx: y - 28 + ROW_PX + 2 };
}

/** By how much a plot has to be higher than asked, so that a legend of several rows takes nothing from what is drawn. */
export function legendGrowth(names: (string | null)[], widthPx: number): number {
  return Math.max(0, plotLegend(names, 0, widthPx).heightPx - ONE_ROW_PX);
}
