import { DrawingSvg } from '@/components/plots/drawing-svg';
import { setUpSketch } from '@/components/sketches/sketch-geometry';
import type { BoundComponent, SketchSpec } from '@/standards/types';

/** Set-up sketch of a sheet. */
export function SetUpSketch(props: {
  spec: SketchSpec;
  component: BoundComponent;
  widthPx?: number;
  heightPx?: number;
  className?: string;
}) {
  const { spec, component, widthPx = 360, heightPx = 234, className } = props;
  return <DrawingSvg drawing={setUpSketch(spec, component, { widthPx, heightPx })} className={className} />;
}
