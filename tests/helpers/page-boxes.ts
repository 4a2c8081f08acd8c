import type { Op } from '@/templates/report/flow/ops';
import type { ReportPages } from '@/templates/report/report-pages';
import { type Box, overlap } from './drawing-geometry';

/** Boxes of everything that is written on a page, drawings included, draft mark left out. */
export function boxesOf(made: ReportPages, ops: readonly Op[], x = 0, y = 0): Box[] {
  return ops.flatMap((op): Box[] => {
    if (op.op === 'group') return boxesOf(made, op.ops, x + op.x, y + op.y);
    if (op.op === 'text') {
      const [left, base, width] = [x + op.x, y + op.y, made.type.width(op.text, op.style)];
      if (op.text.trim() === '') return [];
      return [
        {
          left,
          right: left + width,
          top: base - op.style.sizePt * 0.72,
          bottom: base + op.style.sizePt * 0.05,
          what: op.text,
        },
      ];
    }
    if (op.op !== 'drawing') return [];
    return op.items.flatMap((item): Box[] => {
      if (item.kind !== 'text') return [];
      const style = {
        face: item.mono ? ('mono' as const) : ('sans' as const),
        sizePt: item.sizePx * op.scale,
        ink: 'ink' as const,
        leadPt: 0,
      };
      const width = made.type.width(item.text, style);
      const left =
        x + op.x + item.x * op.scale - (item.anchor === 'end' ? width : item.anchor === 'middle' ? width / 2 : 0);
      const base = y + op.y + item.y * op.scale;
      return [{ left, right: left + width, top: base - style.sizePt * 0.72, bottom: base, what: item.text }];
    });
  });
}

/** Words that leave the printable page of a report, and words that lie on others. */
export function misplacedWords(made: ReportPages): string[] {
  const problems: string[] = [];
  made.pages.forEach((page, index) => {
    const boxes = boxesOf(made, page.ops);
    for (const box of boxes) {
      const inside =
        box.left >= 28.3 &&
        box.right <= made.paper.widthPt - 28.3 &&
        box.top >= 28.3 &&
        box.bottom <= made.paper.heightPt - 20;
      if (!inside) problems.push(`page ${index + 1}: “${box.what}” leaves the page`);
    }
    const sorted = boxes.sort((a, b) => a.top - b.top);
    sorted.forEach((box, at) => {
      for (const other of sorted.slice(at + 1)) {
        if (other.top >= box.bottom) break;
        // Half a point is less than a stroke.
        if (overlap({ ...box, right: box.right - 0.5, bottom: box.bottom - 0.5 }, other))
          problems.push(`page ${index + 1}: “${box.what}” on “${other.what}”`);
      }
    });
  });
  return problems;
}
