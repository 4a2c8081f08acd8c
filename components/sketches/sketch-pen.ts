import type { DrawingItem } from '@/components/plots/drawing';
import {
  arc,
  arrowHead,
  circle,
  hatching,
  type Lettering,
  onCircle,
  type Point,
  polyline,
  type Stroke,
  text,
} from '@/components/plots/drawing-parts';

/** Every scene is drawn in this box and scaled to its place. */
export const SCENE_BOX = { width: 360, height: 234 };

const LETTER_PX = 14;

/**
 * Draws a set-up in scene units with one line weight, and puts the scaled items into a list. Signs that belong to the motion and the
 * spindle's angles are blue; everything else is ink.
 */
export class SketchPen {
  readonly items: DrawingItem[] = [];

  constructor(
    private readonly scale: number,
    private readonly offset: Point,
  ) {}

  line(points: readonly Point[], style: Stroke = {}): void {
    this.items.push(polyline(points.map(this.place), this.weighted(style)));
  }

  shape(points: readonly Point[], style: Stroke = {}): void {
    this.line(points, { closed: true, ...style });
  }

  box(x: number, y: number, width: number, height: number, style: Stroke = {}): void {
    this.shape(
      [
        [x, y],
        [x + width, y],
        [x + width, y + height],
        [x, y + height],
      ],
      style,
    );
  }

  /** Cut material: a box with hatching. */
  material(x: number, y: number, width: number, height: number, step = 9): void {
    const [left, top] = this.place([x, y]);
    this.items.push(
      hatching(left, top, width * this.scale, height * this.scale, step * this.scale, { widthPx: 0.75 * this.scale }),
    );
    this.box(x, y, width, height);
  }

  circle(cx: number, cy: number, r: number, style: Stroke = {}): void {
    this.items.push(circle(...this.at(cx, cy), r * this.scale, this.weighted(style)));
  }

  arc(cx: number, cy: number, r: number, fromDeg: number, toDeg: number, style: Stroke = {}): void {
    this.items.push(arc(...this.at(cx, cy), r * this.scale, fromDeg, toDeg, this.weighted(style)));
  }

  /** Line with an open head at its end. */
  arrow(from: Point, to: Point, style: Stroke = {}, size = 9): void {
    this.line([from, to], style);
    this.items.push(arrowHead(this.place(from), this.place(to), size * this.scale, this.weighted(style)));
  }

  /** Arc with an open head at its end: turning. */
  turnArrow(cx: number, cy: number, r: number, fromDeg: number, toDeg: number, style: Stroke = {}): void {
    this.arc(cx, cy, r, fromDeg, toDeg, style);
    const end = onCircle(cx, cy, r, toDeg);
    const before = onCircle(cx, cy, r, toDeg - Math.sign(toDeg - fromDeg) * 24);
    this.items.push(arrowHead(this.place(before), this.place(end), 8 * this.scale, this.weighted(style)));
  }

  /** Dash-dot line of an axis of rotation. */
  axis(from: Point, to: Point): void {
    this.line([from, to], { widthPx: 0.75, dash: [12, 3, 2, 3] });
  }

  /** Dimension line with a head at both ends and its figure above. */
  dimension(x1: number, x2: number, y: number, words: string): void {
    const thin = { widthPx: 1 };
    this.line(
      [
        [x1, y - 6],
        [x1, y + 6],
      ],
      thin,
    );
    this.line(
      [
        [x2, y - 6],
        [x2, y + 6],
      ],
      thin,
    );
    this.arrow([(x1 + x2) / 2, y], [x1, y], thin, 6);
    this.arrow([(x1 + x2) / 2, y], [x2, y], thin, 6);
    this.text((x1 + x2) / 2, y - 5, words, { anchor: 'middle' });
  }

  text(x: number, y: number, words: string, style: Lettering = {}): void {
    if (!words) return;
    this.items.push(
      text(...this.at(x, y), words, { mono: true, ...style, sizePx: (style.sizePx ?? LETTER_PX) * this.scale }),
    );
  }

  private readonly place = (point: Point): [number, number] => this.at(point[0], point[1]);

  private at(x: number, y: number): [number, number] {
    return [this.offset[0] + x * this.scale, this.offset[1] + y * this.scale];
  }

  private weighted(style: Stroke): Stroke {
    return {
      ...style,
      widthPx: (style.widthPx ?? 1.5) * this.scale,
      dash: style.dash?.map((length) => length * this.scale),
    };
  }
}
