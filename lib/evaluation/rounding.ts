import { z } from 'zod';
import { ROUNDING_RULES, round } from '@/lib/units/round';
import { decimalText, positiveDecimal } from './decimal-text';

export const roundingInput = z.strictObject({
  method: z.literal('rounding'),
  value: decimalText,
  resolution: positiveDecimal,
  rule: z.enum(ROUNDING_RULES).optional(),
});

/**
 * Nearest multiple of a resolution, see `round`.
 * @param value, resolution decimal strings in the same unit; rule half-even (default) | half-away-from-zero
 * @throws EvaluationError a resolution not above zero
 * @example 0.0125 at 0.001: half-even 0.012, half-away-from-zero 0.013
 * Source: ISO 80000-1 Annex B, rules A and B (from memory).
 */
export function rounding(input: z.output<typeof roundingInput>) {
  return { method: 'rounding' as const, rounded: round(input.value, input.resolution, input.rule) };
}
