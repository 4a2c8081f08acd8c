import { z } from 'zod';
import { nonNegativeDecimal, positiveDecimal } from '@/lib/evaluation/decimal-text';
import { refuse } from '@/lib/evaluation/evaluation-error';
import { Fraction } from '@/lib/units/fraction';

/** Standard acceleration of free fall, m/s² (ISO 80000-3, published). */
const GRAVITY = Fraction.from('9.80665');

export const mandrelSagInput = z.strictObject({
  method: z.literal('correction'),
  kind: z.literal('mandrel-sag'),
  length: positiveDecimal,
  diameter: positiveDecimal,
  density: positiveDecimal.optional(),
  modulus: positiveDecimal.optional(),
  at: nonNegativeDecimal.optional(),
});

/**
 * Sag of a solid round mandrel clamped at one end, by its own weight:
 * sag = (2ρg/(3·E·d²))·(x⁴ − 4Lx³ + 6L²x²).
 *
 * @param length L, diameter d, at x (default L) mm; density ρ kg/m³ (7850); modulus E GPa (206)
 * @returns sag µm
 * @throws EvaluationError `at` beyond the length
 * @example ⌀40 × 300 → 3.7837 µm at the end
 * Source: Euler–Bernoulli beam under its own weight (textbook).
 */
export function mandrelSag(input: z.output<typeof mandrelSagInput>) {
  const L = Fraction.from(input.length);
  const d = Fraction.from(input.diameter);
  const x = Fraction.from(input.at ?? input.length);
  if (x.compare(L) > 0) refuse(['at'], 'lies beyond the length');
  const shape = x.squared().times(
    x
      .squared()
      .minus(L.times(x).times(Fraction.of(4)))
      .plus(L.squared().times(Fraction.of(6))),
  );
  const load = Fraction.from(input.density ?? '7850')
    .times(GRAVITY)
    .times(Fraction.of(2));
  const stiffness = Fraction.from(input.modulus ?? '206')
    .times(d.squared())
    .times(Fraction.of(3));
  // mm⁴/mm² and GPa: 10⁻⁶ m² / 10⁹ Pa, times 10⁶ for µm.
  const sag = load.dividedBy(stiffness).times(shape).dividedBy(Fraction.of(1_000_000_000));
  return {
    method: 'correction' as const,
    kind: 'mandrel-sag' as const,
    sag: sag.toText(),
    formula: 'sag = 2ρg / (3 E d²) · (x⁴ − 4 L x³ + 6 L² x²)',
    verify:
      'Solid round bar clamped at one end; a hollow or stepped mandrel sags otherwise: turn it by half a turn and compare.',
  };
}
