import { z } from 'zod';
import { referenceShift, referenceShiftFields } from '@/lib/evaluation/reference-shift';

export const referenceShiftAdviceInput = z.strictObject({
  method: z.literal('correction'),
  kind: z.literal('reference-shift'),
  ...referenceShiftFields,
});

/**
 * Advice for the shift of a reference, figures as the method `reference-shift`.
 * @param input target, found mm as shown; basis, controlFactor as the method
 * @throws EvaluationError another factor than 1 or 2
 * @example target 39.998, found 40.058 on diameter, factor 2 → shift −30, controlShift −60 µm
 * Source: common practice.
 */
export function referenceShiftAdvice(input: z.output<typeof referenceShiftAdviceInput>) {
  const { method: _, kind, ...fields } = input;
  return {
    ...referenceShift(fields),
    method: 'correction' as const,
    kind,
    formula: `shift = 1000 · (target − found)${input.basis === 'diameter' ? ' / 2' : ''}; entered in the control: shift · factor`,
    verify:
      'Try a small amount first, reference again and measure. Then check the software limits and the tool and pallet change positions.',
  };
}
