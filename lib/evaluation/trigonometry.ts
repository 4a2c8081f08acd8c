import { Dec } from '@/lib/units/decimal';
import { divideHalfEven, Fraction } from '@/lib/units/fraction';

/** Binary places of a cosine or sine held as a whole number: 2^-200 is about 6·10^-61. */
export const TRIG_BITS = 200n;
export const TRIG_ONE = 1n << TRIG_BITS;
const GUARD_BITS = 32n;
const WORK_BITS = TRIG_BITS + GUARD_BITS;
const WORK_ONE = 1n << WORK_BITS;

/** Cosine and sine as whole numbers over 2^200. */
export type Direction = { readonly cos: bigint; readonly sin: bigint };

/** arctan(1/n) over 2^232. */
function arctanOfInverse(n: bigint): bigint {
  let power = WORK_ONE / n;
  let sum = power;
  for (let k = 3n; power !== 0n; k += 2n) {
    power = -power / (n * n);
    sum += power / k;
  }
  return sum;
}

/** π by Machin's formula, over 2^232. */
const PI_FIXED = 4n * (4n * arctanOfInverse(5n) - arctanOfInverse(239n));

/** π as a decimal of 50 digits. */
export const PI = new Dec(PI_FIXED.toString()).div(WORK_ONE.toString());

/**
 * Cosine and sine of an angle in degrees. The angle is reduced exactly first, so multiples of 30° and 90° are exact
 * and opposite angles give opposite values to the last bit; all others are right to 2^-200.
 */
export function directionOf(degrees: Fraction): Direction {
  const { n, d } = degrees;
  const turn = 360n * d;
  const angle = ((n % turn) + turn) % turn;
  const quadrant = angle / (90n * d);
  const { cos, sin } = withinQuadrant(angle - quadrant * 90n * d, d);
  if (quadrant === 0n) return { cos, sin };
  if (quadrant === 1n) return { cos: -sin, sin: cos };
  return quadrant === 2n ? { cos: -cos, sin: -sin } : { cos: sin, sin: -cos };
}

function withinQuadrant(angle: bigint, d: bigint): Direction {
  if (angle * 2n > 90n * d) {
    const { cos, sin } = withinHalf(90n * d - angle, d);
    return { cos: sin, sin: cos };
  }
  return withinHalf(angle, d);
}

function withinHalf(angle: bigint, d: bigint): Direction {
  if (angle === 0n) return { cos: TRIG_ONE, sin: 0n };
  const radians = (angle * PI_FIXED) / (180n * d);
  const square = (radians * radians) >> WORK_BITS;
  const sum = (start: bigint, from: bigint) => {
    let term = start;
    let total = start;
    for (let k = from; term !== 0n; k += 2n) {
      term = -((term * square) >> WORK_BITS) / (k * (k + 1n));
      total += term;
    }
    return divideHalfEven(total, 1n << GUARD_BITS);
  };
  const cos = sum(WORK_ONE, 1n);
  if (angle === 30n * d) return { cos, sin: TRIG_ONE / 2n };
  return { cos, sin: sum(radians, 2n) };
}

/** A cosine or sine as an exact fraction where it is one, else to 45 decimals. */
export function trigFraction(value: bigint): Fraction {
  for (const exact of [0n, TRIG_ONE, -TRIG_ONE, TRIG_ONE / 2n, -TRIG_ONE / 2n]) {
    if (value === exact) return Fraction.of(value, TRIG_ONE).reduced();
  }
  const scale = 10n ** 45n;
  return Fraction.of(divideHalfEven(value * scale, TRIG_ONE), scale);
}

/**
 * Angle in degrees, 0 ≤ φ < 360, of the vector (a, b) of length > 0. Begun at a coarse angle; what is left of it after
 * turning the vector back, below 10^-10, is taken by the series of the arc tangent, so nothing of the start remains.
 */
export function angleOf(a: Dec, b: Dec): Dec {
  const length = a.times(a).plus(b.times(b)).sqrt();
  const coarse = (Math.atan2(b.div(length).toNumber(), a.div(length).toNumber()) * 180) / Math.PI;
  const start = coarse.toFixed(10);
  const { cos, sin } = directionOf(Fraction.from(start));
  const [c, s] = [new Dec(cos.toString()), new Dec(sin.toString())];
  const rest = b
    .times(c)
    .minus(a.times(s))
    .div(a.times(c).plus(b.times(s)));
  const cube = rest.times(rest).times(rest);
  const radians = rest.minus(cube.div(3)).plus(cube.times(rest).times(rest).div(5));
  const degrees = radians.times(180).div(PI).plus(start);
  const turned = degrees.isNegative() && !degrees.isZero() ? degrees.plus(360) : degrees;
  return turned.toSignificantDigits(40).gte(360) ? new Dec(0) : turned;
}
