import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { decimalText, positiveDecimal, tooFew } from './decimal-text';
import { fitLine, LINE_TYPES, type LineType, residualTexts, slopeUmPerM } from './line';
import { localDeviation, localDeviationUm } from './local-deviation';
import { refuseRepeats, risingOrder, seriesFromTexts } from './series';

const point = z.strictObject({ position: decimalText, reading: decimalText });

export const straightnessInput = z.strictObject({
  method: z.literal('straightness'),
  reference: z.enum(LINE_TYPES),
  points: z.array(point).min(3, tooFew(3, 'points')),
  localLength: positiveDecimal.optional(),
});

/** The judged figure in words, by reference line. */
export const STRAIGHTNESS_JUDGED_BY: Record<LineType, string> = {
  'end-points': 'straightness about the line through the end points',
  'least-squares': 'straightness about the least-squares line',
  'minimum-zone': 'straightness about the minimum-zone line',
};

/**
 * Straightness of a motion or surface from readings along it.
 *
 * deviation = max − min of (reading − reference line); the line through the end points, by least squares, or in the
 * middle of the minimum zone in the reading direction. `local`: the same over any window of `localLength`.
 *
 * @param points position mm (any order, all different), reading µm, pushing the plunger in positive; at least 3
 * @param localLength mm > 0; at or above the span `local` is the deviation itself, without any window 0
 * @returns deviation µm, slope µm/m, intercept µm at position 0, residuals µm in the order given, local µm, localAt mm
 * @throws EvaluationError fewer than 3 points, a position twice
 * @example 0…500 mm step 100, readings 0, 3, 5, 4, 6, 5: end points 3, least squares 3.114…, minimum zone 3 µm
 * Source: ISO 230-1:2012 (definitions, from memory); arithmetic common practice.
 */
export function straightness(input: z.output<typeof straightnessInput>) {
  const { reference, points, localLength } = input;
  const pathOf = (i: number) => ['points', i, 'position'];
  const positions = seriesFromTexts([...points.map((p) => p.position), ...(localLength ? [localLength] : [])]);
  const length = localLength ? positions.values[points.length]! : null;
  const x = { values: positions.values.slice(0, points.length), unit: positions.unit };
  const y = seriesFromTexts(points.map((p) => p.reading));
  refuseRepeats(x, pathOf, 'position');
  const line = fitLine(x, y, reference);
  return {
    method: 'straightness' as const,
    deviation: line.deviation.toText(),
    judgedBy: STRAIGHTNESS_JUDGED_BY[reference],
    signed: false as const,
    slope: slopeUmPerM(line).toText(),
    intercept: line.intercept.toText(),
    residuals: residualTexts(line),
    ...(length !== null && localPart(x, y, length, reference, line.deviation)),
  };
}

type WholeNumbers = { values: readonly bigint[]; unit: bigint };

function localPart(
  x: WholeNumbers,
  y: WholeNumbers,
  length: bigint,
  type: LineType,
  whole: Fraction,
): { local: string; localAt?: string } {
  const order = risingOrder(x.values);
  const profile = { x: order.map((i) => x.values[i]!), y: order.map((i) => y.values[i]!) };
  const at = (index: number) => Fraction.of(profile.x[index]!, x.unit).toText();
  if (length >= profile.x[order.length - 1]! - profile.x[0]!) return { local: whole.toText(), localAt: at(0) };
  const worst = localDeviation(profile, length, type);
  if (!worst) return { local: '0' };
  return { local: localDeviationUm(worst, y.unit).toText(), localAt: at(worst.at) };
}
