import { plotDrawing } from '@/components/plots/plot-geometry';
import { setUpSketch } from '@/components/sketches/sketch-geometry';
import type { PassBlock, TestBlock } from '@/lib/reporting/report-model';
import { drawingSlab } from '@/templates/report/flow/drawing-slab';
import { beside, type Slab, stack } from '@/templates/report/flow/ops';
import type { Kit } from '@/templates/report/flow/parts';
import { TYPE } from '@/templates/report/theme';

const GAP_PT = 14;

export function sketchSlab(kit: Kit, block: TestBlock): Slab {
  return drawingSlab(
    kit.type,
    setUpSketch(block.sketch, block.component, { widthPx: 360, heightPx: 234 }),
    kit.widthPt,
  );
}

/** Plot as found, as left, or both beside each other; null where no pass has one. */
export function plotsSlab(kit: Kit, block: TestBlock): Slab | null {
  const plotted = block.passes.filter((pass) => pass.plot && pass.kind !== 'adjusting').slice(-2);
  if (!plotted.length) return null;
  const widthPt = (kit.widthPt - GAP_PT * (plotted.length - 1)) / plotted.length;
  const size = plotted.length === 2 ? { widthPx: 300, heightPx: 176 } : { widthPx: 560, heightPx: 160 };
  return beside(
    plotted.map((pass, index) => ({ slab: plotSlab(kit, pass, widthPt, size), x: index * (widthPt + GAP_PT) })),
  );
}

function plotSlab(kit: Kit, pass: PassBlock, widthPt: number, size: { widthPx: number; heightPx: number }): Slab {
  const name = kit.type.line(pass.kindWords, TYPE.columnHead);
  if (!pass.plot) return name;
  const drawing = plotDrawing(pass.plot, {
    ...size,
    heightPx: pass.plot.kind === 'polar' ? size.heightPx + 40 : size.heightPx,
    toleranceUm: pass.judgement?.toleranceUm ?? null,
  });
  return stack([name, drawingSlab(kit.type, drawing, widthPt)], 2);
}
