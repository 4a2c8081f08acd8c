import { Dec } from '@/lib/units/decimal';

const PI = new Dec('3.1415926535897932384626433832795028841971693993751');
const ROOT_TWO_PI = PI.times(2).sqrt();
const SERIES_LIMIT = 7;
const VANISHING = 40;

/**
 * Standard normal distribution Φ(z) = ½(1 + erf(z/√2)), to 30 digits and more.
 *
 * |z| ≤ 7: ½ + φ(z)·Σ z^(2k+1)/(1·3·5…(2k+1)); beyond: φ(z) times the continued fraction of the tail
 * 1/(z + 1/(z + 2/(z + 3/(z + …)))). Beyond 40 the tail is below 10^-340 and given as 0.
 * Source: Abramowitz and Stegun, 26.2.11 and 26.2.14 (from memory).
 */
export function normalDistribution(z: Dec): Dec {
  if (z.isNegative()) return tail(z.negated());
  return new Dec(1).minus(tail(z));
}

/** 1 − Φ(z) for z ≥ 0. */
function tail(z: Dec): Dec {
  if (z.gt(VANISHING)) return new Dec(0);
  const density = z.times(z).div(-2).exp().div(ROOT_TWO_PI);
  if (z.gt(SERIES_LIMIT)) {
    let fraction = new Dec(0);
    for (let k = 120; k >= 1; k--) fraction = new Dec(k).div(z.plus(fraction));
    return density.div(z.plus(fraction));
  }
  let term = z;
  let sum = z;
  for (let k = 3; term.gt('1e-55'); k += 2) {
    term = term.times(z).times(z).div(k);
    sum = sum.plus(term);
  }
  return new Dec('0.5').minus(density.times(sum));
}
