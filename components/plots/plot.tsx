import { DrawingSvg } from '@/components/plots/drawing-svg';
import { plotDrawing } from '@/components/plots/plot-geometry';
import type { PlotSeries } from '@/lib/sheet/types';

/** Plot of a pass, redrawn with every reading. */
export function Plot(props: {
  series: PlotSeries;
  toleranceUm: string | null;
  widthPx?: number;
  heightPx?: number;
  className?: string;
}) {
  const { series, toleranceUm, widthPx = 420, heightPx = 260, className } = props;
  return <DrawingSvg drawing={plotDrawing(series, { toleranceUm, widthPx, heightPx })} className={className} />;
}
