import type { Drawing, DrawingItem } from '@/components/plots/drawing';
import { wordWidth } from '@/components/plots/drawing-parts';

export interface Box {
  left: number;
  top: number;
  right: number;
  bottom: number;
  what: string;
}

type Segment = [x1: number, y1: number, x2: number, y2: number];

/** Straight pieces of a path of M, L, A and Z in absolute coordinates; an arc is taken in 5° pieces. */
export function segmentsOf(d: string): Segment[] {
  const segments: Segment[] = [];
  let [x, y, startX, startY] = [0, 0, 0, 0];
  const lineTo = (toX: number, toY: number) => {
    segments.push([x, y, toX, toY]);
    [x, y] = [toX, toY];
  };
  for (const [, command, rest] of d.matchAll(/([MLAZ])([^MLAZ]*)/g)) {
    const numbers = (rest?.match(/-?\d+(?:\.\d+)?(?:e-?\d+)?/g) ?? []).map(Number);
    if (command === 'M') [x, y, startX, startY] = [numbers[0]!, numbers[1]!, numbers[0]!, numbers[1]!];
    if (command === 'L') for (let i = 0; i < numbers.length; i += 2) lineTo(numbers[i]!, numbers[i + 1]!);
    if (command === 'Z') lineTo(startX, startY);
    if (command === 'A') for (const [px, py] of arcPoints([x, y], numbers)) lineTo(px, py);
  }
  if (/[^MLAZ\d\s.,e-]/.test(d)) throw new Error(`A command that this helper does not know: ${d}`);
  return segments;
}

function arcPoints([x1, y1]: [number, number], numbers: number[]): [number, number][] {
  const [r = 0, , , large = 0, sweep = 0, x2 = 0, y2 = 0] = numbers;
  const half = Math.hypot(x2 - x1, y2 - y1) / 2;
  const height = Math.sqrt(Math.max(0, r * r - half * half));
  const side = large === sweep ? -1 : 1;
  const [ux, uy] = half ? [(x2 - x1) / (2 * half), (y2 - y1) / (2 * half)] : [1, 0];
  const [cx, cy] = [(x1 + x2) / 2 - side * uy * height, (y1 + y2) / 2 + side * ux * height];
  const from = Math.atan2(y1 - cy, x1 - cx);
  let turn = Math.atan2(y2 - cy, x2 - cx) - from;
  if (sweep && turn <= 0) turn += 2 * Math.PI;
  if (!sweep && turn >= 0) turn -= 2 * Math.PI;
  const steps = Math.max(2, Math.ceil(Math.abs(turn) / (Math.PI / 36)));
  return Array.from({ length: steps }, (_, i): [number, number] => {
    const angle = from + (turn * (i + 1)) / steps;
    return [cx + r * Math.cos(angle), cy + r * Math.sin(angle)];
  });
}

/** Box of a word as it is set; `tight` leaves out the room for descenders and accents. */
export function textBox(item: Extract<DrawingItem, { kind: 'text' }>): Box {
  const width = wordWidth(item.text, item.sizePx, item.mono) * (item.mono ? 1 : 0.92);
  const left = item.anchor === 'start' ? item.x : item.anchor === 'end' ? item.x - width : item.x - width / 2;
  return {
    left,
    right: left + width,
    top: item.y - item.sizePx * 0.72,
    bottom: item.y + item.sizePx * 0.05,
    what: item.text,
  };
}

export function textBoxes(drawing: Drawing): Box[] {
  return drawing.items.flatMap((item) => (item.kind === 'text' ? [textBox(item)] : []));
}

export const overlap = (a: Box, b: Box) => a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

/** Words that lie on one another or on a stroked line; background lines of the given inks are not counted. */
export function collisions(drawing: Drawing, background: readonly string[] = []): string[] {
  const boxes = textBoxes(drawing);
  const found: string[] = [];
  boxes.forEach((box, index) => {
    for (const other of boxes.slice(index + 1)) if (overlap(box, other)) found.push(`“${box.what}” on “${other.what}”`);
  });
  for (const item of drawing.items) {
    if (item.kind !== 'path' || item.stroke === 'none' || background.includes(item.stroke)) continue;
    for (const segment of segmentsOf(item.d)) {
      for (const box of boxes)
        if (crosses(segment, box)) found.push(`“${box.what}” on a ${item.stroke} line ${segment.join(' ')}`);
    }
  }
  return found;
}

/** Liang and Barsky: whether a straight piece passes through a box. */
function crosses([x1, y1, x2, y2]: Segment, box: Box): boolean {
  let [from, to] = [0, 1];
  const [dx, dy] = [x2 - x1, y2 - y1];
  for (const [p, q] of [
    [-dx, x1 - box.left],
    [dx, box.right - x1],
    [-dy, y1 - box.top],
    [dy, box.bottom - y1],
  ] as const) {
    if (p === 0) {
      if (q < 0) return false;
    } else if (p < 0) from = Math.max(from, q / p);
    else to = Math.min(to, q / p);
  }
  return from <= to;
}

/** Everything that is not inside the drawing, and every figure that is not a number. */
export function outside(drawing: Drawing, marginPx = 0.5): string[] {
  const found: string[] = [];
  const check = (x: number, y: number, what: string) => {
    const inside =
      x >= -marginPx && y >= -marginPx && x <= drawing.widthPx + marginPx && y <= drawing.heightPx + marginPx;
    if (!inside) found.push(`${what} at ${x} ${y}`);
  };
  for (const item of drawing.items) {
    if (item.kind === 'path') {
      if (/NaN|Infinity|undefined/.test(item.d)) found.push(item.d);
      for (const [x1, y1, x2, y2] of segmentsOf(item.d)) {
        check(x1, y1, 'line');
        check(x2, y2, 'line');
      }
    } else {
      const box = textBox(item);
      check(box.left, box.top, item.text);
      check(box.right, box.bottom, item.text);
    }
  }
  return found;
}
