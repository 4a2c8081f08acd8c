import { z } from 'zod';
import { decimalText, nonNegativeDecimal, positiveDecimal } from '@/lib/evaluation/decimal-text';
import { refuse } from '@/lib/evaluation/evaluation-error';
import { divideHalfEven, Fraction } from '@/lib/units/fraction';

const feed = z.strictObject({ present: decimalText, lostMotion: decimalText });

export const lostMotionChangeInput = z.strictObject({
  method: z.literal('correction'),
  kind: z.literal('lost-motion'),
  unit: positiveDecimal,
  basis: z.enum(['radius', 'diameter']),
  cuttingFeed: feed.optional(),
  rapid: feed.optional(),
  limit: nonNegativeDecimal.optional(),
});

/**
 * New lost-motion value of a control: new = present + lostMotion·(2 if the value counts on diameter)/unit.
 *
 * @param unit µm per count; @param basis what the control's value counts in
 * @param cuttingFeed, rapid present counts, lostMotion µm at the slide, + = uncompensated; at least one of the two
 * @param limit µm: above it the mechanics are looked at first
 * @returns per feed change and newValue (unrounded counts), newCount (half-even); mechanicsFirst where a limit is given
 * @throws EvaluationError neither feed given, a unit not above zero
 * @example present 19, lostMotion −8 µm, 1 µm per count on diameter → change −16, new 3
 * Source: common practice; the sign of a control's value is verified by measuring again.
 */
export function lostMotionChange(input: z.output<typeof lostMotionChangeInput>) {
  const { cuttingFeed, rapid, limit } = input;
  if (!cuttingFeed && !rapid) refuse([], 'cuttingFeed or rapid is needed');
  const perUnit = Fraction.of(input.basis === 'diameter' ? 2 : 1).dividedBy(Fraction.from(input.unit));
  const part = ({ present, lostMotion }: z.output<typeof feed>) => {
    const change = Fraction.from(lostMotion).times(perUnit);
    const newValue = Fraction.from(present).plus(change);
    return {
      change: change.toText(),
      newValue: newValue.toText(),
      newCount: divideHalfEven(newValue.n, newValue.d).toString(),
    };
  };
  const amounts = [cuttingFeed, rapid].flatMap((given) => (given ? [Fraction.from(given.lostMotion).abs()] : []));
  return {
    method: 'correction' as const,
    kind: 'lost-motion' as const,
    ...(cuttingFeed && { cuttingFeed: part(cuttingFeed) }),
    ...(rapid && { rapid: part(rapid) }),
    ...(limit !== undefined && { mechanicsFirst: Fraction.max(amounts).compare(Fraction.from(limit)) > 0 }),
    formula: `new = present + lost motion${input.basis === 'diameter' ? ' · 2' : ''} / unit`,
    verify:
      'Enter the value, measure the lost motion again; if it has grown, the sign of this control is the other one.',
  };
}
