import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { decimalText, positiveDecimal, tooFew } from './decimal-text';
import { fitLine } from './line';
import { refuseRepeats, risingOrder, seriesFromTexts } from './series';
import { taperDirection } from './two-collar';

export const diameterConsistencyInput = z.strictObject({
  method: z.literal('diameter-consistency'),
  sections: z.array(z.strictObject({ position: decimalText, diameter: positiveDecimal })).min(2, tooFew(2, 'sections')),
});

/**
 * Consistency of turned diameters along a workpiece.
 *
 * deviation = 1000(max − min); taper = 1000(D(nearest the headstock) − D(farthest)); slope = −½ of the least-squares
 * slope of D, the sign as `two-collar`: + = the free end leans toward the tool.
 *
 * @param sections position mm from the headstock (all different), diameter mm; at least 2
 * @returns deviation, taper µm; slope µm/m; direction
 * @throws EvaluationError a position twice
 * @example 30.010 at 20 mm, 30.004 at 120 mm → deviation 6, taper 6 µm, slope 30 µm/m, larger near the headstock
 * Source: common practice; test after ISO 13041-6:2009 (from memory).
 */
export function diameterConsistency(input: z.output<typeof diameterConsistencyInput>) {
  const { sections } = input;
  const x = seriesFromTexts(sections.map((s) => s.position));
  refuseRepeats(x, (i) => ['sections', i, 'position'], 'position');
  const diameters = sections.map((s) => Fraction.from(s.diameter));
  const order = risingOrder(x.values);
  const taper = diameters[order[0]!]!.minus(diameters[order.at(-1)!]!).times(Fraction.of(1000));
  const line = fitLine(x, seriesFromTexts(sections.map((s) => s.diameter)), 'least-squares');
  return {
    method: 'diameter-consistency' as const,
    deviation: Fraction.range(diameters).times(Fraction.of(1000)).toText(),
    judgedBy: 'largest minus smallest diameter',
    signed: false as const,
    taper: taper.toText(),
    slope: line.slope.times(Fraction.of(-500_000)).toText(),
    direction: taperDirection(taper),
  };
}
