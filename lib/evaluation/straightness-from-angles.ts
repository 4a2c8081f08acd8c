import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { decimals, decimalText, positiveDecimal } from './decimal-text';
import { refuse } from './evaluation-error';
import { fitLine, LINE_TYPES, residualTexts, slopeUmPerM } from './line';
import { seriesFromFractions } from './series';
import { STRAIGHTNESS_JUDGED_BY } from './straightness';

export const straightnessFromAnglesInput = z.strictObject({
  method: z.literal('straightness-from-angles'),
  reference: z.enum(LINE_TYPES),
  stepLength: positiveDecimal,
  angles: decimals(2, 'angles'),
  returnAngles: z.array(decimalText).optional(),
});

/**
 * Straightness from the angles of a carriage set foot behind foot (level, autocollimator).
 *
 * h0 = 0, hk = h(k−1) + step·angle/1000, out and return run averaged; closure = h_n(out) − h_n(return); then as
 * `straightness` on the points (k·step, hk).
 *
 * @param stepLength mm > 0, the distance of the feet; @param angles µm/m, one a step, + = next foot higher; at least 2
 * @param returnAngles µm/m, listed by step 1…n as `angles`, same sign
 * @returns heights µm (n + 1), closure µm, deviation µm, slope µm/m, intercept µm, residuals µm
 * @throws EvaluationError fewer than 2 steps, lists of different length
 * @example 30, 20, −10, 20, −10 µm/m over 100 mm → heights 0, 3, 5, 4, 6, 5 µm
 * Source: common practice.
 */
export function straightnessFromAngles(input: z.output<typeof straightnessFromAnglesInput>) {
  const { reference, stepLength, angles, returnAngles } = input;
  if (returnAngles && returnAngles.length !== angles.length) {
    refuse(['returnAngles'], `${returnAngles.length} angles for ${angles.length} steps: one a step is needed`);
  }
  const step = Fraction.from(stepLength);
  const out = angles.map(Fraction.from);
  const back = returnAngles?.map(Fraction.from);
  const mean = back ? out.map((angle, k) => angle.plus(back[k]!).times(Fraction.of(1, 2))) : out;
  const heights = heightsOf(mean, step);
  const positions = heights.map((_, k) => step.times(Fraction.of(k)));
  const line = fitLine(seriesFromFractions(positions), seriesFromFractions(heights), reference);
  return {
    method: 'straightness-from-angles' as const,
    deviation: line.deviation.toText(),
    judgedBy: STRAIGHTNESS_JUDGED_BY[reference],
    signed: false as const,
    heights: heights.map((height) => height.toText()),
    ...(back && { closure: heightsOf(out, step).at(-1)!.minus(heightsOf(back, step).at(-1)!).toText() }),
    slope: slopeUmPerM(line).toText(),
    intercept: line.intercept.toText(),
    residuals: residualTexts(line),
  };
}

function heightsOf(angles: readonly Fraction[], step: Fraction): Fraction[] {
  const heights = [Fraction.zero];
  for (const angle of angles) heights.push(heights.at(-1)!.plus(angle.times(step).dividedBy(Fraction.of(1000))));
  return heights;
}
