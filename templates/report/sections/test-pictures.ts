import { plotDrawing } from '@/components/plots/plot-geometry';
import { setUpSketch } from '@/components/sketches/sketch-geometry';
import type { PassBlock, TestBlock } from '@/lib/reporting/report-model';
import { drawingSlab } from '@/templates/report/flow/drawing-slab';
import { beside, type Slab, stack } from '@/templates/report/flow/ops';
import type { Kit } from '@/templates/report/flow/parts';
import { TYPE } from '@/templates/report/theme';

const GAP_PT = 16;

/** The set-up at the left; beside it the plot as left, or as found and as left where both were measured. */
export function testPictures(kit: Kit, block: TestBlock): Slab {
  const plotted = block.passes.filter((pass) => pass.plot && pass.kind !== 'adjusting').slice(-2);
  const sketchPt = 165;
  const sketch = setUpSketch(block.sketch, block.component, { widthPx: 360, heightPx: 234 });
  const pictures = [{ slab: drawingSlab(kit.type, sketch, sketchPt), x: 0 }];
  const widthPt = (kit.widthPt - sketchPt - GAP_PT * plotted.length) / Math.max(1, plotted.length);
  const size = plotted.length === 2 ? { widthPx: 300, heightPx: 190 } : { widthPx: 560, heightPx: 184 };
  plotted.forEach((pass, index) => {
    pictures.push({ slab: plotSlab(kit, pass, widthPt, size), x: sketchPt + GAP_PT + index * (widthPt + GAP_PT) });
  });
  return beside(pictures);
}

function plotSlab(kit: Kit, pass: PassBlock, widthPt: number, size: { widthPx: number; heightPx: number }): Slab {
  const name = kit.type.line(pass.kindWords, TYPE.columnHead);
  if (!pass.plot) return name;
  const drawing = plotDrawing(pass.plot, { ...size, toleranceUm: pass.judgement?.toleranceUm ?? null });
  return stack([name, drawingSlab(kit.type, drawing, widthPt)], 2);
}
