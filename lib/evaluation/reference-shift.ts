import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { decimalOrNumber, decimalText } from './decimal-text';

export const referenceShiftFields = {
  target: decimalText,
  found: decimalText,
  basis: z.enum(['radius', 'diameter']),
  controlFactor: decimalOrNumber
    .refine(
      (text) => decimalText.safeParse(text).success && ['1', '2'].includes(Fraction.from(text).toText()),
      '1 or 2 is needed',
    )
    .optional(),
};

export const referenceShiftInput = z.strictObject({ method: z.literal('reference-shift'), ...referenceShiftFields });

/**
 * Shift of an axis' reference so that what is found becomes the target.
 *
 * shift = 1000(target − found), half of it where the figures are diameters: the way the slide lacks in +;
 * controlShift = shift · controlFactor, what is entered in the control. Judged: |shift|.
 *
 * @param target, found mm as shown; @param controlFactor 1 | 2 (1)
 * @returns shift, controlShift µm (signed), deviation µm
 * @throws EvaluationError another factor than 1 or 2
 * @example target 39.998, found 40.046 on diameter, factor 2 → shift −24, controlShift −48 µm
 * Source: common practice.
 */
export function referenceShift(input: Omit<z.output<typeof referenceShiftInput>, 'method'>) {
  const difference = Fraction.from(input.target).minus(Fraction.from(input.found)).times(Fraction.of(1000));
  const shift = input.basis === 'diameter' ? difference.times(Fraction.of(1, 2)) : difference;
  return {
    method: 'reference-shift' as const,
    deviation: shift.abs().toText(),
    judgedBy: 'amount of the shift at the slide',
    signed: false as const,
    shift: shift.toText(),
    controlShift: shift.times(Fraction.from(input.controlFactor ?? '1')).toText(),
  };
}
