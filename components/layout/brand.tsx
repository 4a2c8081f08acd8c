import { DrawingSvg } from '@/components/plots/drawing-svg';
import { verdictMark } from '@/components/plots/verdict-mark-geometry';

/** The mark and the name. */
export function Brand() {
  return (
    <span className="inline-flex items-center gap-3 text-lg font-semibold text-blue">
      <DrawingSvg drawing={verdictMark('within-tolerance')} fixed decorative />
      Witnessmark
    </span>
  );
}
