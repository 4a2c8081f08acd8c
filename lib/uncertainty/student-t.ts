import { Dec } from '@/lib/units/decimal';

const PI = new Dec('3.1415926535897932384626433832795028841971693993751');
/** Above this the asymptotic expansion is right to more than 15 digits. */
const SERIES_LIMIT = 2000;
/** Two-sided normal quantiles, solved from Φ. */
const NORMAL_QUANTILE: Record<Coverage, Dec> = {
  '0.95': new Dec('1.95996398454005423552459443052055152795555'),
  '0.99': new Dec('2.57582930354890076097857674860381411731'),
};

export const COVERAGES = ['0.95', '0.99'] as const;
export type Coverage = (typeof COVERAGES)[number];

/** Two-sided probability that |t| stays below `t` with a whole number ν of degrees of freedom. */
export function studentProbability(t: Dec, degrees: number): Dec {
  const angle = Dec.atan(t.div(new Dec(degrees).sqrt()));
  const cos = angle.cos();
  const sin = angle.sin();
  const isOdd = degrees % 2 === 1;
  let term = isOdd ? cos : new Dec(1);
  let sum = degrees === 1 ? new Dec(0) : term;
  const square = cos.times(cos);
  for (let k = isOdd ? 3 : 2; k <= degrees - 2; k += 2) {
    term = term
      .times(square)
      .times(k - 1)
      .div(k);
    sum = sum.plus(term);
  }
  return isOdd ? angle.plus(sin.times(sum)).times(2).div(PI) : sin.times(sum);
}

/**
 * Two-sided coverage factor of Student's t: the t with P(|T| < t) = coverage.
 *
 * Newton's method on the finite series of the distribution for whole ν, begun at the expansion around the normal
 * quantile z: t = z + (z³ + z)/4ν + (5z⁵ + 16z³ + 3z)/96ν² + (3z⁷ + 19z⁵ + 17z³ − 15z)/384ν³ +
 * (79z⁹ + 776z⁷ + 1482z⁵ − 1920z³ − 945z)/92160ν⁴, which is used alone above ν = 2000.
 * @param degrees whole number ≥ 1
 * @example studentQuantile('0.95', 19) ≈ 2.0930
 * Source: Abramowitz and Stegun 26.7.3, 26.7.4, 26.7.5 (from memory).
 */
export function studentQuantile(coverage: Coverage, degrees: bigint): Dec {
  const z = NORMAL_QUANTILE[coverage];
  const nu = new Dec(degrees.toString());
  if (degrees > SERIES_LIMIT) return expansion(z, nu);
  const count = Number(degrees);
  if (count === 1) return tangentQuantile(coverage);
  let t =
    count === 2
      ? new Dec(coverage).times(Dec.sqrt(new Dec(2).div(new Dec(1).minus(new Dec(coverage).pow(2)))))
      : expansion(z, nu);
  const density = densityAt(count);
  for (let step = 0; step < 60; step++) {
    const change = studentProbability(t, count).minus(coverage).div(density(t).times(2));
    t = t.minus(change);
    if (change.abs().lt('1e-42')) break;
  }
  return t;
}

/** ν = 1 is the Cauchy distribution: t = tan(π·coverage/2). */
function tangentQuantile(coverage: Coverage): Dec {
  return PI.times(coverage).div(2).tan();
}

function expansion(z: Dec, nu: Dec): Dec {
  const polynomial = (...pairs: [number, number][]) =>
    pairs.reduce((sum, [factor, power]) => sum.plus(z.pow(power).times(factor)), new Dec(0));
  return z
    .plus(polynomial([1, 3], [1, 1]).div(nu.times(4)))
    .plus(polynomial([5, 5], [16, 3], [3, 1]).div(nu.pow(2).times(96)))
    .plus(polynomial([3, 7], [19, 5], [17, 3], [-15, 1]).div(nu.pow(3).times(384)))
    .plus(polynomial([79, 9], [776, 7], [1482, 5], [-1920, 3], [-945, 1]).div(nu.pow(4).times(92160)));
}

/** Density of t with ν degrees of freedom; Γ((ν+1)/2)/Γ(ν/2) by its recurrence from ν = 1 or 2. */
function densityAt(degrees: number): (t: Dec) => Dec {
  let ratio = degrees % 2 === 1 ? new Dec(1).div(PI.sqrt()) : PI.sqrt().div(2);
  for (let nu = degrees % 2 === 1 ? 1 : 2; nu < degrees; nu += 2) ratio = ratio.times(nu + 1).div(nu);
  const scale = ratio.div(PI.times(degrees).sqrt());
  return (t) =>
    scale.div(
      t
        .times(t)
        .div(degrees)
        .plus(1)
        .sqrt()
        .pow(degrees + 1),
    );
}
