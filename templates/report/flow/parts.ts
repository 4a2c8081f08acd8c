import { MARK_INK, type MarkKind } from '@/components/plots/verdict-ink';
import { verdictMark } from '@/components/plots/verdict-mark-geometry';
import { drawingSlab } from '@/templates/report/flow/drawing-slab';
import {
  beside,
  type FlowItem,
  moved,
  type Op,
  ruleLine,
  type Slab,
  slabItem,
  space,
  stack,
} from '@/templates/report/flow/ops';
import { lineMiddle } from '@/templates/report/flow/table';
import type { Typesetter } from '@/templates/report/flow/typesetter';
import { type TextStyle, TYPE } from '@/templates/report/theme';

/** What every section gets. */
export interface Kit {
  type: Typesetter;
  widthPt: number;
}

const MARK_PT = 22;

/**
 * A section's heading under a line over the whole width; stays with what follows. `after` stands behind the title where it fits, else
 * below it; `right` at the right end.
 */
export function heading(kit: Kit, words: string, more: { after?: string; right?: string } = {}): FlowItem[] {
  const { type, widthPt } = kit;
  const code = more.right ?? '';
  const room = code ? widthPt - type.width(code, TYPE.code) - 14 : widthPt;
  const title = type.paragraph(words, TYPE.heading, room);
  const ops: Op[] = [...ruleLine(widthPt).ops, moved(title, 0, 8)];
  if (code) ops.push(moved(type.line(code, TYPE.code, widthPt, 'end'), 0, 10));
  let heightPt = title.heightPt + 12;
  if (more.after) {
    const behind = type.width(words, TYPE.heading) + 10;
    const fits = behind + type.width(more.after, TYPE.quiet) <= room;
    const after = type.paragraph(more.after, TYPE.quiet, fits ? room - behind : widthPt);
    ops.push(moved(after, fits ? behind : 0, fits ? 10.4 : heightPt - 3));
    if (!fits) heightPt += after.heightPt;
  }
  return [space(13), slabItem({ heightPt, ops }, { keepWithNext: true, bookmark: words })];
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

/** Pairs of a name and what it is, in columns; values broken to their column. In one column a value may go over several pages. */
export function pairs(
  kit: Kit,
  entries: readonly { label: string; value: string }[],
  options: { columns: number; labelPt: number; small?: boolean },
): FlowItem {
  const gap = 18;
  const [quiet, body] = options.small ? [TYPE.small, { ...TYPE.small, ink: 'ink' as const }] : [TYPE.quiet, TYPE.body];
  const columnPt = (kit.widthPt - gap * (options.columns - 1)) / options.columns;
  const slabs = entries.map(({ label, value }): Slab[] => {
    const name = kit.type.paragraph(label, quiet, options.labelPt - 6);
    const lines = kit.type.lines(value, body, columnPt - options.labelPt).map((line): Slab => {
      const set = kit.type.line(line, body);
      return { ...set, ops: [moved(set, options.labelPt, 0)] };
    });
    const first: Slab = {
      heightPt: Math.max(name.heightPt, body.leadPt),
      ops: [...name.ops, ...(lines[0]?.ops ?? [])],
    };
    return [first, ...lines.slice(1), { heightPt: 1.5, ops: [] }];
  });
  if (options.columns === 1) return { kind: 'rows', header: null, rows: slabs.flatMap(joinLast) };
  const rows: Slab[] = [];
  for (let at = 0; at < slabs.length; at += options.columns) {
    const row = slabs
      .slice(at, at + options.columns)
      .map((lines, index) => ({ slab: stack(lines), x: index * (columnPt + gap) }));
    rows.push(beside(row));
  }
  return { kind: 'rows', header: null, rows };
}

/** The room below an entry belongs to its last line. */
function joinLast(lines: readonly Slab[]): Slab[] {
  return [...lines.slice(0, -2), stack(lines.slice(-2))];
}
