import { coordinate } from '@/components/plots/number';
import type { Direction } from '@/standards/types';

/** Where things stand on a limit rule, px. */
export interface RuleScale {
  /** x of a deviation, µm (already turned so that the allowed side is positive). Not limited to the rule. */
  x: (valueUm: number) => number;
  left: number;
  right: number;
  baseY: number;
  bandPx: number;
  heightPx: number;
  /** A tenth of the tolerance, µm; without a tolerance a tenth of a round figure above the deviation. */
  tenthUm: number;
  firstTenth: number;
  lastTenth: number;
  /** Places of the notches in tenths: none, +10, or −10 and +10. */
  notches: number[];
  oneSided: boolean;
  bothWays: boolean;
}

/** The rule reaches this many tenths beyond zero; room to see by how much something is out. */
const REACH_TENTHS = { oneWay: 16, bothWays: 14, forbidden: -4 };

/** s of the rule 0 ≤ s·e ≤ T: maps the stored sign on the allowed side. */
export function allowedSign(direction: Direction): 1 | -1 {
  return direction === 'convex-only' ? -1 : 1;
}

export function ruleScale(input: {
  deviationUm: string | null;
  toleranceUm: string | null;
  direction: Direction;
  signed: boolean;
  widthPx: number;
  compact?: boolean;
}): RuleScale {
  const oneSided = input.direction !== 'either';
  const deviation = input.deviationUm === null ? 0 : coordinate(input.deviationUm);
  const bothWays = !oneSided && (input.signed || deviation < 0);
  const tolerance = input.toleranceUm === null ? null : coordinate(input.toleranceUm);
  const tenthUm = (tolerance && tolerance > 0 ? tolerance : roundAbove(Math.abs(deviation))) / 10;
  const lastTenth = bothWays ? REACH_TENTHS.bothWays : REACH_TENTHS.oneWay;
  const firstTenth = bothWays ? -lastTenth : oneSided ? REACH_TENTHS.forbidden : 0;
  const inset = input.compact ? 3 : 14;
  const [left, right] = [inset, input.widthPx - inset];
  const x = (valueUm: number) => left + ((valueUm / tenthUm - firstTenth) / (lastTenth - firstTenth)) * (right - left);
  const notches = tolerance === null ? [] : bothWays ? [-10, 10] : [10];
  const [baseY, bandPx, heightPx] = input.compact ? [14, 12, 22] : [46, 22, 78];
  return { x, left, right, baseY, bandPx, heightPx, tenthUm, firstTenth, lastTenth, notches, oneSided, bothWays };
}

/** 1, 2 or 5 times a power of ten, at or above the value. */
function roundAbove(value: number): number {
  if (value <= 0) return 10;
  const power = 10 ** Math.floor(Math.log10(value));
  return ([1, 2, 5, 10].find((step) => step * power >= value) ?? 10) * power;
}
