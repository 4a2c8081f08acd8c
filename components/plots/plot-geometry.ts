import type { Drawing, DrawingItem } from '@/components/plots/drawing';
import { shortLimit } from '@/components/plots/number';
import type { PlotOptions } from '@/components/plots/plot-frame';
import { linePlot } from '@/components/plots/plot-line';
import { pairsPlot } from '@/components/plots/plot-pairs';
import { polarPlot } from '@/components/plots/plot-polar';
import { plotWords } from '@/lib/reporting/drawing-text';
import type { PlotSeries } from '@/lib/sheet/types';

const PLOTS: Record<PlotSeries['kind'], (series: PlotSeries, options: PlotOptions) => DrawingItem[]> = {
  line: linePlot,
  polar: polarPlot,
  pairs: pairsPlot,
};

/**
 * The plot of one pass: a profile over a length, a trace round a turn, or pairs of approaches. Without readings: an empty drawing.
 * @throws where a figure of the series is not a decimal
 */
export function plotDrawing(series: PlotSeries, options: PlotOptions): Drawing {
  const { widthPx, heightPx } = options;
  const items = series.points.length ? PLOTS[series.kind](series, options) : [];
  return {
    widthPx,
    heightPx,
    description: plotWords(series, options.toleranceUm && shortLimit(options.toleranceUm)),
    items,
  };
}
