import type { Drawing, DrawingItem, Ink } from '@/components/plots/drawing';
import { arrowHead, hatching, type Point, polyline, text, wordWidth } from '@/components/plots/drawing-parts';
import { allowedSign, type RuleScale, ruleScale } from '@/components/plots/limit-rule-scale';
import { coordinate, decimalsOf, micrometresAsMm, shortLimit } from '@/components/plots/number';
import { MARK_INK } from '@/components/plots/verdict-ink';
import { limitRuleWords } from '@/lib/reporting/drawing-text';
import { toleranceShown } from '@/lib/sheet/shown-unit';
import type { Verdict } from '@/lib/sheet/types';
import { formatDecimal } from '@/lib/units/format';
import type { Direction, ShownIn } from '@/standards/types';

export interface LimitRuleInput {
  /** Result, µm; null: nothing measured yet, the rule stands empty. */
  deviationUm: string | null;
  /** Limit that applied, µm; null: none is given (for information). */
  toleranceUm: string | null;
  direction: Direction;
  /** The figure carries a sign (a slope, an offset) and is judged both ways where the direction is `either`. */
  signed: boolean;
  verdict: Verdict | null;
  /** The deviation as it is printed, in `unit`. */
  shown: string | null;
  /** Unit of what is printed: mm where absent. The tolerance is kept in µm, of angles in µm/m. */
  unit?: ShownIn;
  expandedUncertaintyUm?: string | null;
  /** Guarded acceptance: g, or the limit T − g itself. */
  guardUm?: string | null;
  limitUm?: string | null;
  widthPx: number;
  /** Without figures, for a row of a table. */
  compact?: boolean;
}

const FIGURE_PX = 15;
const LABEL_PX = 14;

/**
 * The limit rule: zero at the left, ticks each tenth of the tolerance, the tolerance a notch cut into the rule, the deviation a
 * scribed line whose breadth is the expanded uncertainty. Signed figures judged both ways: zero in the middle, a notch each side.
 * One-sided directions: the forbidden side hatched. Beyond the end: an arrow at the end, the figure kept.
 */
export function limitRule(input: LimitRuleInput): Drawing {
  const scale = ruleScale(input);
  const { ink, wash } = MARK_INK[input.verdict ?? 'not-measured'];
  const value = input.deviationUm === null ? null : coordinate(input.deviationUm) * allowedSign(input.direction);
  const breadthUm = input.expandedUncertaintyUm ? Math.abs(coordinate(input.expandedUncertaintyUm)) : 0;
  const items: DrawingItem[] = [];
  if (scale.oneSided) items.push(forbiddenSide(scale));
  if (value !== null && breadthUm > 0) items.push(...band(scale, value, breadthUm, ink, wash));
  items.push(polyline(ruleLine(scale, input), { widthPx: 2 }), ...ticks(scale));
  if (value !== null) items.push(...scribe(scale, value, ink));
  if (!input.compact) items.push(...figures(scale, input, value, ink));
  return {
    widthPx: input.widthPx,
    heightPx: scale.heightPx,
    description: limitRuleWords({
      ...input,
      toleranceUm: input.toleranceUm && (input.unit === '″' ? input.toleranceUm : shortLimit(input.toleranceUm)),
    }),
    items,
  };
}

function forbiddenSide(scale: RuleScale): DrawingItem {
  return hatching(scale.left, scale.baseY - scale.bandPx, scale.x(0) - scale.left, scale.bandPx, 6, { stroke: 'ink2' });
}

/** Breadth of the scribe: ± expanded uncertainty, kept on the rule. */
function band(scale: RuleScale, value: number, breadthUm: number, ink: Ink, wash: Ink): DrawingItem[] {
  const [left, right] = [scale.x(value - breadthUm), scale.x(value + breadthUm)].map((x) => onRule(scale, x)) as [
    number,
    number,
  ];
  if (right - left < 0.5) return [];
  const [top, bottom] = [scale.baseY - scale.bandPx, scale.baseY - 1];
  const edge = { stroke: ink, widthPx: 0.75 };
  const box: Point[] = [
    [left, bottom],
    [left, top],
    [right, top],
    [right, bottom],
  ];
  const sides = [left, right].map((x) =>
    polyline(
      [
        [x, bottom],
        [x, top],
      ],
      edge,
    ),
  );
  return [polyline(box, { stroke: 'none', fill: wash, closed: true }), ...sides];
}

/** The rule as one line, with the notches cut into it; guarded acceptance has a second, shallower notch at T − g. */
function ruleLine(scale: RuleScale, input: LimitRuleInput): Point[] {
  const deep = scale.heightPx < 30 ? 5 : 12;
  const cuts = scale.notches.map((tenth) => ({ x: scale.x(tenth * scale.tenthUm), depth: deep }));
  const toleranceUm = 10 * scale.tenthUm;
  const limitUm = input.limitUm ? coordinate(input.limitUm) : toleranceUm - coordinate(input.guardUm ?? '0');
  // A guard too small to be seen is none; a tenth times ten need not be the tolerance to the last bit.
  if (limitUm > 0 && limitUm < toleranceUm * 0.999) {
    for (const tenth of scale.notches) cuts.push({ x: scale.x(Math.sign(tenth) * limitUm), depth: deep / 2 });
  }
  cuts.sort((a, b) => a.x - b.x);
  const points: Point[] = [[scale.left, scale.baseY]];
  for (const { x, depth } of cuts) {
    const half = depth * 0.6;
    const last = points[points.length - 1] as Point;
    points.push([Math.max(x - half, last[0]), scale.baseY], [x, scale.baseY + depth], [x + half, scale.baseY]);
  }
  return [...points, [scale.right, scale.baseY]];
}

function ticks(scale: RuleScale): DrawingItem[] {
  const compact = scale.heightPx < 30;
  const items: DrawingItem[] = [];
  for (let tenth = scale.firstTenth; tenth <= scale.lastTenth; tenth += 1) {
    if (scale.notches.includes(tenth) || (compact && tenth !== 0)) continue;
    const x = scale.x(tenth * scale.tenthUm);
    const length = compact ? 4 : tenth % 5 === 0 ? 9 : 5;
    items.push(
      polyline(
        [
          [x, scale.baseY],
          [x, scale.baseY + length],
        ],
        { stroke: 'ink', widthPx: tenth === 0 ? 1.5 : 1 },
      ),
    );
  }
  return items;
}

/** The scribed line; beyond the rule's end an arrow stands there instead. */
function scribe(scale: RuleScale, value: number, ink: Ink): DrawingItem[] {
  const x = scale.x(value);
  const style = { stroke: ink, widthPx: 3 };
  const top = scale.baseY - scale.bandPx - 2;
  if (x >= scale.left && x <= scale.right)
    return [
      polyline(
        [
          [x, scale.baseY],
          [x, top],
        ],
        style,
      ),
    ];
  const outward = x > scale.right ? 1 : -1;
  const end: Point = [outward > 0 ? scale.right : scale.left, scale.baseY - scale.bandPx / 2];
  const start: Point = [end[0] - outward * Math.min(30, (scale.right - scale.left) / 4), end[1]];
  return [polyline([start, end], style), arrowHead(start, end, Math.min(9, scale.bandPx / 2), style)];
}

/** The deviation's figure above its line, zero and the limits below theirs. */
function figures(scale: RuleScale, input: LimitRuleInput, value: number | null, ink: Ink): DrawingItem[] {
  const items: DrawingItem[] = [];
  const labelY = scale.baseY + 27;
  if (value !== null && input.shown) {
    const x = keepInside(onRule(scale, scale.x(value)), wordWidth(input.shown, FIGURE_PX, true), input.widthPx);
    items.push(
      text(x, scale.baseY - scale.bandPx - 7, input.shown, {
        sizePx: FIGURE_PX,
        ink,
        anchor: 'middle',
        mono: true,
        weight: 500,
      }),
    );
  }
  const label = { sizePx: LABEL_PX, ink: 'ink2' as Ink, anchor: 'middle' as const, mono: true };
  items.push(text(scale.x(0), labelY, '0', label));
  if (input.toleranceUm === null) return items;
  const places = input.shown ? decimalsOf(input.shown) : 0;
  for (const tenth of scale.notches) {
    const words = `T ${limitFigure(input.toleranceUm, tenth < 0, places, scale.bothWays, input.unit)}`;
    const x = keepInside(scale.x(tenth * scale.tenthUm), wordWidth(words, LABEL_PX, true), input.widthPx);
    items.push(text(x, labelY, words, { ...label, ink: 'ink' }));
  }
  return items;
}

/** A limit beside its notch, cut off and never rounded up, in the unit of the result. */
function limitFigure(
  toleranceUm: string,
  negative: boolean,
  places: number,
  signed: boolean,
  unit: ShownIn = 'mm',
): string {
  const limit = unit === '″' ? shortLimit(toleranceShown(toleranceUm, unit)) : shortLimit(toleranceUm);
  const text = negative ? `-${limit}` : limit;
  if (unit === 'mm' || unit === 'mm/m') return micrometresAsMm(text, places, signed);
  return formatDecimal(text, { decimals: Math.max(decimalsOf(text), places), signed });
}

const onRule = (scale: RuleScale, x: number) => Math.min(Math.max(x, scale.left), scale.right);

const keepInside = (x: number, width: number, widthPx: number) =>
  Math.min(Math.max(x, width / 2 + 1), widthPx - width / 2 - 1);
