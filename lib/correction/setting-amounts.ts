import { z } from 'zod';
import { decimalText, positiveDecimal } from '@/lib/evaluation/decimal-text';
import { refuse } from '@/lib/evaluation/evaluation-error';
import { Fraction } from '@/lib/units/fraction';

const THOUSAND = Fraction.of(1000);
const bySign = <P, Z, N>(value: Fraction, plus: P, none: Z, minus: N) =>
  value.sign() > 0 ? plus : value.sign() < 0 ? minus : none;

export const twoJackPointsInput = z.strictObject({
  method: z.literal('correction'),
  kind: z.literal('two-jack-points'),
  slopeChange: decimalText,
  span: positiveDecimal,
});

/**
 * Difference to raise between two jack points A and B: raise = |slopeChange|·span/1000.
 * @param slopeChange µm/m wanted, + = B must rise against A; @param span mm between the points
 * @throws EvaluationError a span not above zero
 * @example 50 µm/m over 400 mm → raise B by 20 µm
 * Source: common practice.
 */
export function twoJackPoints(input: z.output<typeof twoJackPointsInput>) {
  const change = Fraction.from(input.slopeChange);
  return {
    method: 'correction' as const,
    kind: 'two-jack-points' as const,
    raise: change.abs().times(Fraction.from(input.span)).dividedBy(THOUSAND).toText(),
    point: bySign(change, 'B' as const, 'none' as const, 'A' as const),
    formula: 'raise = |slope change| · span / 1000',
    verify:
      'Read the amount on an indicator over the jack point, tighten crosswise to final torque, measure the slope again.',
  };
}

export const pivotAndPushScrewInput = z.strictObject({
  method: z.literal('correction'),
  kind: z.literal('pivot-and-push-screw'),
  slope: decimalText,
  distance: positiveDecimal,
});

/**
 * Movement at a push screw about a pivot that takes a slope out: movement = −slope·distance/1000.
 * @param slope µm/m, the error; @param distance mm from pivot to screw
 * @returns movement µm at the screw, + in the direction of a positive slope
 * @throws EvaluationError a distance not above zero
 * @example slope 40 µm/m, 500 mm → −20 µm, minus
 * Source: common practice.
 */
export function pivotAndPushScrew(input: z.output<typeof pivotAndPushScrewInput>) {
  const movement = turnedBack(Fraction.from(input.slope), input.distance);
  return {
    method: 'correction' as const,
    kind: 'pivot-and-push-screw' as const,
    movement: movement.toText(),
    direction: bySign(movement, 'plus' as const, 'none' as const, 'minus' as const),
    formula: 'movement = −slope · distance / 1000',
    verify: 'Watch the amount on an indicator at the screw, tighten, measure the slope again.',
  };
}

function turnedBack(slope: Fraction, distanceMm: string): Fraction {
  return slope.negated().times(Fraction.from(distanceMm)).dividedBy(THOUSAND);
}

export const shimInput = z.strictObject({
  method: z.literal('correction'),
  kind: z.literal('shim'),
  heightError: decimalText,
});

/**
 * Shim under a base: thickness = −heightError.
 * @param heightError µm, + = too high
 * @returns thickness µm, + add, − remove
 * @throws EvaluationError an error that is no figure
 * @example heightError −22.5 → add 22.5 µm
 * Source: common practice.
 */
export function shim(input: z.output<typeof shimInput>) {
  const thickness = Fraction.from(input.heightError).negated();
  return {
    method: 'correction' as const,
    kind: 'shim' as const,
    thickness: thickness.toText(),
    action: bySign(thickness, 'add' as const, 'none' as const, 'remove' as const),
    formula: 'thickness = −height error',
    verify: 'One piece, free of burrs, over the whole seat; tighten to final torque and measure the height again.',
  };
}

export const turretParallelAndCentreInput = z.strictObject({
  method: z.literal('correction'),
  kind: z.literal('turret-parallel-and-centre'),
  slope: decimalText,
  height: decimalText,
  heightPosition: decimalText,
  jackA: decimalText,
  jackB: decimalText,
});

/**
 * Both jack amounts that bring a turret parallel and on centre in one setting:
 * raise = −height + slope·(heightPosition − jack)/1000.
 * @param slope µm/m, the error, rising with z; @param height µm, the error at heightPosition mm; jackA, jackB mm
 * @throws EvaluationError jack points at one place
 * @example slope −245, height −52 at 250, jacks 310 and 490 → 66.7 and 110.8 µm
 * Source: derived (straight line through both errors).
 */
export function turretParallelAndCentre(input: z.output<typeof turretParallelAndCentreInput>) {
  const [slope, height, at] = [input.slope, input.height, input.heightPosition].map(Fraction.from);
  const [a, b] = [Fraction.from(input.jackA), Fraction.from(input.jackB)];
  if (a.equals(b)) refuse(['jackB'], 'must lie at another place than jackA');
  const raise = (jack: Fraction) => slope!.times(at!.minus(jack)).dividedBy(THOUSAND).minus(height!).toText();
  return {
    method: 'correction' as const,
    kind: 'turret-parallel-and-centre' as const,
    raiseA: raise(a),
    raiseB: raise(b),
    formula: 'raise = −height + slope · (height position − jack position) / 1000',
    verify: 'Read both amounts on indicators over the jack points, tighten crosswise, measure slope and height again.',
  };
}

export const headstockForTaperInput = z.strictObject({
  method: z.literal('correction'),
  kind: z.literal('headstock-for-taper'),
  D1: positiveDecimal,
  D2: positiveDecimal,
  length: positiveDecimal,
  distance: positiveDecimal,
});

/**
 * Movement of a headstock about its pivot that takes a turned taper out: slope = 10⁶(D1 − D2)/(2·length),
 * movement = −slope·distance/1000.
 * @param D1 near the headstock, D2 far, length collar to collar, distance pivot to screw, all mm
 * @returns slope µm/m, movement µm at the screw, direction the free end must go
 * @throws EvaluationError a diameter or length not above zero
 * @example D1 30.012, D2 30.007, length 100, distance 400 → slope 25 µm/m, movement −10 µm, away from the tool
 * Source: common practice.
 */
export function headstockForTaper(input: z.output<typeof headstockForTaperInput>) {
  const difference = Fraction.from(input.D1).minus(Fraction.from(input.D2));
  const slope = difference.times(Fraction.of(500_000)).dividedBy(Fraction.from(input.length));
  return {
    method: 'correction' as const,
    kind: 'headstock-for-taper' as const,
    slope: slope.toText(),
    movement: turnedBack(slope, input.distance).toText(),
    direction: bySign(slope, 'away-from-tool' as const, 'none' as const, 'toward-tool' as const),
    formula: 'slope = 10⁶ · (D1 − D2) / (2 · length); movement = −slope · distance / 1000',
    verify: 'Tighten, turn both collars again with the same tool and measure them.',
  };
}
