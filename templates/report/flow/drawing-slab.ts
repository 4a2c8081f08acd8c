import type { Drawing } from '@/components/plots/drawing';
import type { Slab } from '@/templates/report/flow/ops';
import type { Typesetter } from '@/templates/report/flow/typesetter';

/** A drawing of the screen on paper, scaled to a width; its height follows. */
export function drawingSlab(type: Typesetter, drawing: Drawing, widthPt: number): Slab {
  for (const item of drawing.items) if (item.kind === 'text') type.runs(item.text, item.mono ? 'mono' : 'sans');
  const scale = widthPt / drawing.widthPx;
  return { heightPt: drawing.heightPx * scale, ops: [{ op: 'drawing', x: 0, y: 0, scale, items: drawing.items }] };
}
