import { z } from 'zod';
import {
  decimalOrNumber,
  decimalText,
  label,
  nonNegativeDecimal,
  positiveDecimal,
  tooFew,
} from '@/lib/evaluation/decimal-text';
import { refuse } from '@/lib/evaluation/evaluation-error';
import { Dec, plain } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import { COVERAGES, type Coverage, studentQuantile } from './student-t';

const component = z.strictObject({
  name: label,
  value: nonNegativeDecimal,
  distribution: z.enum(['normal', 'rectangular', 'triangular', 'u-shaped']),
  divisor: positiveDecimal.optional(),
  sensitivity: decimalText.optional(),
  degreesOfFreedom: decimalOrNumber.optional(),
});

export const uncertaintyInput = z.strictObject({
  method: z.literal('uncertainty'),
  components: z.array(component).min(1, tooFew(1, 'component')),
  coverage: decimalOrNumber,
});

export type UncertaintyComponent = z.output<typeof component>;

/** Squares of the divisors of a half-width: √3, √6, √2; a normal component is a standard uncertainty already. */
const SQUARED_DIVISOR = { normal: 1, rectangular: 3, triangular: 6, 'u-shaped': 2 } as const;

/** Coverage factors with infinitely many degrees of freedom, as the contract prints them. */
const NORMAL_FACTOR: Record<Coverage, string> = { '0.95': '1.959964', '0.99': '2.575829' };

/**
 * Combined and expanded uncertainty of uncorrelated components.
 *
 * u_i = value/divisor; standard = √Σ(c_i·u_i)²; effective degrees of freedom (Welch–Satterthwaite)
 * ν = u⁴/Σ((c_i·u_i)⁴/ν_i), left out where all are infinite; coverage factor = two-sided Student t at ν rounded to one
 * decimal and then cut down to a whole number, at least 1; expanded = factor · standard.
 *
 * @param components value (one unit for all, µm as a rule): half-width (rectangular √3, triangular √6, u-shaped √2) or, normal, the standard uncertainty
 *   (a certificate's U at k = 2: divisor 2); sensitivity (1); degreesOfFreedom (infinite)
 * @param coverage 0.95 | 0.99
 * @throws EvaluationError a negative value, a divisor or degrees of freedom not above zero, another coverage
 * @example ν 18.9987 → 19 → 2.093; 16.76 → 16 → 2.921 (0.99)
 * Source: JCGM 100:2008 (GUM), 5.1, G.4.1, G.4.2, H.1 (from memory).
 */
export function uncertainty(input: z.output<typeof uncertaintyInput>) {
  const coverage = COVERAGES.find((known) => Fraction.from(known).equals(fractionOf(input.coverage, ['coverage'])));
  if (!coverage) return refuse(['coverage'], '0.95 or 0.99 is needed');
  const squares = input.components.map(squaredContribution);
  const variance = Fraction.sum(squares);
  const perDegree = Fraction.sum(
    input.components.map(({ degreesOfFreedom: nu }, i) =>
      nu === undefined
        ? Fraction.zero
        : squares[i]!.squared().dividedBy(fractionOf(nu, ['components', i, 'degreesOfFreedom'])),
    ),
  );
  const degrees = perDegree.sign() === 0 ? null : variance.squared().dividedBy(perDegree);
  const standard = variance.squareRoot();
  const factor = degrees ? studentQuantile(coverage, usableDegrees(degrees)) : new Dec(NORMAL_FACTOR[coverage]);
  return {
    method: 'uncertainty' as const,
    standard: plain(standard),
    ...(degrees && { degreesOfFreedom: degrees.toText() }),
    coverageFactor: plain(factor),
    expanded: plain(factor.times(standard)),
  };
}

function squaredContribution(part: UncertaintyComponent, index: number): Fraction {
  const { value, distribution, divisor, sensitivity = '1', degreesOfFreedom } = part;
  if (degreesOfFreedom !== undefined) {
    const path = ['components', index, 'degreesOfFreedom'];
    if (fractionOf(degreesOfFreedom, path).sign() <= 0) refuse(path, 'must be above zero');
  }
  const squaredDivisor =
    divisor === undefined ? Fraction.of(SQUARED_DIVISOR[distribution]) : Fraction.from(divisor).squared();
  return Fraction.from(value).times(Fraction.from(sensitivity)).squared().dividedBy(squaredDivisor);
}

/** ν to one decimal (half-even), then cut down to a whole number, at least 1. */
function usableDegrees(degrees: Fraction): bigint {
  const tenths = Fraction.of(nearestTenths(degrees), 10n);
  const whole = tenths.n / tenths.d;
  return whole < 1n ? 1n : whole;
}

function nearestTenths({ n, d }: Fraction): bigint {
  const scaled = n * 10n;
  const floor = scaled / d;
  const twice = (scaled - floor * d) * 2n;
  return twice > d || (twice === d && floor % 2n === 1n) ? floor + 1n : floor;
}

function fractionOf(text: string, path: PropertyKey[]): Fraction {
  return decimalText.safeParse(text).success ? Fraction.from(text) : refuse(path, 'not a number that can be used here');
}
