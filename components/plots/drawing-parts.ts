import type { DrawingItem, Ink } from '@/components/plots/drawing';

export type Point = readonly [x: number, y: number];

export interface Stroke {
  stroke?: Ink;
  fill?: Ink;
  widthPx?: number;
  dash?: number[];
  closed?: boolean;
}

export interface Lettering {
  sizePx?: number;
  ink?: Ink;
  anchor?: 'start' | 'middle' | 'end';
  mono?: boolean;
  weight?: 400 | 500 | 600;
}

/** Hundredths of a pixel are finer than any screen or printer; shorter paths keep the PDF small. */
export const rounded = (value: number): number => {
  const hundredths = Math.round(value * 100) / 100;
  return Object.is(hundredths, -0) ? 0 : hundredths;
};

/** A polyline through the points. */
export function polyline(points: readonly Point[], style: Stroke = {}): DrawingItem {
  const d = points.map(([x, y], index) => `${index ? 'L' : 'M'}${rounded(x)} ${rounded(y)}`).join('');
  return { kind: 'path', d: style.closed ? `${d}Z` : d, ...strokeOf(style) };
}

/** A full circle, as two arcs: the one form that the browser and the PDF both draw. */
export function circle(cx: number, cy: number, r: number, style: Stroke = {}): DrawingItem {
  const [left, right, y, radius] = [cx - r, cx + r, cy, r].map(rounded);
  const d = `M${left} ${y}A${radius} ${radius} 0 1 1 ${right} ${y}A${radius} ${radius} 0 1 1 ${left} ${y}Z`;
  return { kind: 'path', d, ...strokeOf(style) };
}

/** Arc from one angle to another, ° clockwise on the page from the right-hand side. */
export function arc(
  cx: number,
  cy: number,
  r: number,
  fromDeg: number,
  toDeg: number,
  style: Stroke = {},
): DrawingItem {
  const at = (deg: number) => onCircle(cx, cy, r, deg).map(rounded).join(' ');
  const large = Math.abs(toDeg - fromDeg) > 180 ? 1 : 0;
  const sweep = toDeg > fromDeg ? 1 : 0;
  return {
    kind: 'path',
    d: `M${at(fromDeg)}A${rounded(r)} ${rounded(r)} 0 ${large} ${sweep} ${at(toDeg)}`,
    ...strokeOf(style),
  };
}

export function onCircle(cx: number, cy: number, r: number, deg: number): [number, number] {
  const radians = (deg * Math.PI) / 180;
  return [cx + r * Math.cos(radians), cy + r * Math.sin(radians)];
}

export function text(x: number, y: number, words: string, style: Lettering = {}): DrawingItem {
  return {
    kind: 'text',
    x: rounded(x),
    y: rounded(y),
    text: words,
    sizePx: rounded(style.sizePx ?? 14),
    ink: style.ink ?? 'ink',
    anchor: style.anchor ?? 'start',
    ...(style.mono ? { mono: true } : {}),
    ...(style.weight ? { weight: style.weight } : {}),
  };
}

/** Hatching under 45° inside an upright rectangle, as drawing offices mark cut material. */
export function hatching(
  x: number,
  y: number,
  width: number,
  height: number,
  step: number,
  style: Stroke = {},
): DrawingItem {
  const d: string[] = [];
  for (let c = step; c < width + height; c += step) {
    const [x1, y1] = c <= height ? [x, y + c] : [x + c - height, y + height];
    const [x2, y2] = c <= width ? [x + c, y] : [x + width, y + c - width];
    d.push(`M${rounded(x1)} ${rounded(y1)}L${rounded(x2)} ${rounded(y2)}`);
  }
  return { kind: 'path', d: d.join(''), ...strokeOf({ stroke: 'ink2', widthPx: 0.75, ...style }) };
}

/** An open arrow head at the end of a line that comes from `from`. */
export function arrowHead(from: Point, tip: Point, size: number, style: Stroke = {}): DrawingItem {
  const angle = Math.atan2(tip[1] - from[1], tip[0] - from[0]);
  const wing = (turn: number): Point => [
    tip[0] - size * Math.cos(angle + turn),
    tip[1] - size * Math.sin(angle + turn),
  ];
  return polyline([wing(0.5), tip, wing(-0.5)], style);
}

/** Width of a word as it will be set: Plex Mono is 0.6 em wide; Plex Sans seldom above 0.56 em. */
export function wordWidth(words: string, sizePx: number, mono = false): number {
  return [...words].length * sizePx * (mono ? 0.6 : 0.56);
}

function strokeOf(style: Stroke) {
  return {
    stroke: style.stroke ?? 'ink',
    fill: style.fill ?? ('none' as Ink),
    widthPx: rounded(style.widthPx ?? 1.5),
    ...(style.dash ? { dash: style.dash.map(rounded) } : {}),
  };
}
