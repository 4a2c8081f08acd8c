import type { Drawing, DrawingItem } from '@/components/plots/drawing';
import { type Point, polyline } from '@/components/plots/drawing-parts';
import { MARK_INK, type MarkKind } from '@/components/plots/verdict-ink';
import { VERDICT_WORDS } from '@/lib/reporting/words';

/** The mark is drawn once in this box and scaled. */
const BOX = { width: 32, height: 18, base: 12 };

/**
 * The limit rule in small, to stand before a verdict's word. One shape each, so that black-and-white print loses nothing:
 * scribe before the notch, beyond it, on it with its breadth; the rule broken and slipped (disturbed); no notch (for information);
 * no scribe on a dotted rule (not measured), the same struck through (left out).
 */
export function verdictMark(kind: MarkKind, options: { widthPx?: number } = {}): Drawing {
  const widthPx = options.widthPx ?? BOX.width;
  const scale = widthPx / BOX.width;
  return {
    widthPx,
    heightPx: BOX.height * scale,
    description: VERDICT_WORDS[kind],
    items: SHAPES[kind](new Marker(kind, scale)),
  };
}

class Marker {
  constructor(
    private readonly kind: MarkKind,
    private readonly scale: number,
  ) {}

  line(points: readonly Point[], widthPx = 1.5, dash?: number[]): DrawingItem {
    return polyline(this.scaled(points), {
      stroke: MARK_INK[this.kind].ink,
      widthPx: widthPx * this.scale,
      dash: dash?.map((length) => length * this.scale),
    });
  }

  band(left: number, right: number, top: number): DrawingItem {
    const corners: Point[] = [
      [left, BOX.base - 1],
      [left, top],
      [right, top],
      [right, BOX.base - 1],
    ];
    const { ink, wash } = MARK_INK[this.kind];
    return polyline(this.scaled(corners), { stroke: ink, fill: wash, widthPx: this.scale, closed: true });
  }

  /** The rule with its notch at `notch`; without one: a plain line. */
  rule(notch: number | null, dash?: number[]): DrawingItem {
    const { base, width } = BOX;
    const cut: Point[] =
      notch === null
        ? []
        : [
            [notch - 3.5, base],
            [notch, base + 4],
            [notch + 3.5, base],
          ];
    return this.line([[0, base], ...cut, [width, base]], 1.5, dash);
  }

  scribe(x: number, dash?: number[]): DrawingItem {
    return this.line(
      [
        [x, BOX.base],
        [x, 1.5],
      ],
      2.5,
      dash,
    );
  }

  private scaled(points: readonly Point[]): Point[] {
    return points.map(([x, y]) => [x * this.scale, y * this.scale]);
  }
}

const SHAPES: Record<MarkKind, (mark: Marker) => DrawingItem[]> = {
  'within-tolerance': (mark) => [mark.rule(21), mark.scribe(10)],
  'out-of-tolerance': (mark) => [mark.rule(19), mark.scribe(27.5)],
  undecided: (mark) => [mark.band(15.5, 26.5, 3.5), mark.rule(21), mark.scribe(21)],
  disturbed: (mark) => [
    mark.line([
      [0, 9],
      [16, 9],
    ]),
    mark.line([
      [13, 13],
      [17.5, 13],
      [21, 17],
      [24.5, 13],
      [32, 13],
    ]),
    mark.line(
      [
        [9, 9],
        [9, 1.5],
      ],
      2.5,
    ),
    mark.line(
      [
        [13, 16.5],
        [17, 4.5],
      ],
      1,
    ),
  ],
  'for-information': (mark) => [
    mark.rule(null),
    mark.scribe(13),
    mark.line([
      [0, 8.5],
      [0, 15.5],
    ]),
    mark.line([
      [32, 8.5],
      [32, 15.5],
    ]),
  ],
  'not-measured': (mark) => [mark.rule(21, [2.5, 2.5])],
  'left-out': (mark) => [
    mark.rule(21, [2.5, 2.5]),
    mark.line([
      [7, 17],
      [16, 4],
    ]),
  ],
};
