import { MARK_INK, type MarkKind } from '@/components/plots/verdict-ink';
import { verdictMark } from '@/components/plots/verdict-mark-geometry';
import { drawingSlab } from '@/templates/report/flow/drawing-slab';
import { type FlowItem, moved, type Op, ruleLine, type Slab, slabItem, space } from '@/templates/report/flow/ops';
import { lineMiddle } from '@/templates/report/flow/table';
import type { Typesetter } from '@/templates/report/flow/typesetter';
import { type TextStyle, TYPE } from '@/templates/report/theme';

/** What every section gets. */
export interface Kit {
  type: Typesetter;
  widthPt: number;
}

const MARK_PT = 22;

/** A section's heading under a line over the whole width; stays with what follows. */
export function heading(kit: Kit, words: string, more: { bookmark?: string; right?: string } = {}): FlowItem[] {
  const right = more.right ? kit.type.line(more.right, TYPE.code, kit.widthPt, 'end') : null;
  const room = right && more.right ? kit.widthPt - kit.type.width(more.right, TYPE.code) - 14 : kit.widthPt;
  const title = kit.type.paragraph(words, TYPE.heading, room);
  const ops: Op[] = [...ruleLine(kit.widthPt).ops, moved(title, 0, 8), ...(right ? [moved(right, 0, 10)] : [])];
  const slab = { heightPt: title.heightPt + 13, ops };
  return [space(18), slabItem(slab, { keepWithNext: true, bookmark: more.bookmark ?? words })];
}

/** Words that may go over several pages. */
export function flowingText(kit: Kit, text: string, style: TextStyle = TYPE.body, widthPt = kit.widthPt): FlowItem {
  const rows = kit.type.lines(text, style, widthPt).map((line) => kit.type.line(line, style));
  return { kind: 'rows', header: null, rows };
}

/** The verdict's mark and, beside it, its word and whatever follows the word, broken to the width. */
export function markedWords(kit: Kit, kind: MarkKind, words: string, style: TextStyle, widthPt: number): Slab {
  const { ink } = MARK_INK[kind];
  const mark = drawingSlab(kit.type, verdictMark(kind), MARK_PT);
  const text = kit.type.paragraph(words, { ...style, ink: ink === 'none' ? 'ink' : ink }, widthPt - MARK_PT - 7);
  const top = lineMiddle(style) - mark.heightPt * 0.55;
  return { heightPt: text.heightPt, ops: [moved(mark, 0, top), moved(text, MARK_PT + 7, 0)] };
}

/** Pairs of a name and what it is, in columns; values broken to their column. */
export function pairs(
  kit: Kit,
  entries: readonly { label: string; value: string }[],
  options: { columns: number; labelPt: number },
): FlowItem {
  const gap = 18;
  const columnPt = (kit.widthPt - gap * (options.columns - 1)) / options.columns;
  const slabs = entries.map(({ label, value }): Slab => {
    const name = kit.type.paragraph(label, TYPE.quiet, options.labelPt - 6);
    const words = kit.type.paragraph(value, TYPE.body, columnPt - options.labelPt);
    return {
      heightPt: Math.max(name.heightPt, words.heightPt) + 1.5,
      ops: [moved(name, 0, 0), moved(words, options.labelPt, 0)],
    };
  });
  const rows: Slab[] = [];
  for (let at = 0; at < slabs.length; at += options.columns) {
    const row = slabs.slice(at, at + options.columns);
    rows.push({
      heightPt: Math.max(...row.map((slab) => slab.heightPt)),
      ops: row.map((slab, index) => moved(slab, index * (columnPt + gap), 0)),
    });
  }
  return { kind: 'rows', header: null, rows };
}
