import type { Drawing, DrawingItem } from '@/components/plots/drawing';
import { shortLimit } from '@/components/plots/number';
import type { PlotOptions } from '@/components/plots/plot-frame';
import { legendGrowth } from '@/components/plots/plot-legend';
import { linePlot } from '@/components/plots/plot-line';
import { pairsPlot } from '@/components/plots/plot-pairs';
import { polarPlot } from '@/components/plots/plot-polar';
import { axisUnit, plotWords } from '@/lib/reporting/drawing-text';
import type { PlotSeries } from '@/lib/sheet/types';
import { convert } from '@/lib/units/convert';
import { round } from '@/lib/units/round';

const PLOTS: Record<PlotSeries['kind'], (series: PlotSeries, options: PlotOptions) => DrawingItem[]> = {
  line: linePlot,
  polar: polarPlot,
  pairs: pairsPlot,
};

/**
 * The plot of one pass: a profile over a length, a trace round a turn, or pairs of approaches. It is higher than asked where a legend
 * takes several rows. Without readings: an empty drawing.
 * @throws where a figure of the series is not a decimal
 */
export function plotDrawing(series: PlotSeries, asked: PlotOptions): Drawing {
  const { widthPx } = asked;
  const names = [...new Set(series.points.map((point) => point.series ?? null))];
  const heightPx = asked.heightPx + legendGrowth(names, widthPx);
  const toleranceUm = asked.toleranceUm === null ? null : toleranceOnAxis(asked.toleranceUm, series.yLabel);
  const items = series.points.length ? PLOTS[series.kind](series, { widthPx, heightPx, toleranceUm }) : [];
  return { widthPx, heightPx, description: plotWords(series, toleranceUm && shortLimit(toleranceUm)), items };
}

/** Tolerances are kept in µm, of angles in µm/m; on an axis in another unit they are drawn and named in that one. */
function toleranceOnAxis(toleranceUm: string, yLabel: string): string {
  const unit = axisUnit(yLabel);
  if (unit === 'mm') return convert(toleranceUm, 'µm', 'mm');
  if (unit === 'mm/m') return convert(toleranceUm, 'µm/m', 'mm/m');
  // To 30 digits and back again: what is beyond a thousandth of a second is not in the rule.
  return unit === '″' ? round(convert(toleranceUm, 'µm/m', 'arcsec'), '0.001', 'half-even') : toleranceUm;
}
