import { Dec, RESULT_DIGITS } from './decimal';

const DECIMAL = /^([+-]?)(\d*)(?:\.(\d*))?(?:[eE]([+-]?\d+))?$/;
const powersOfTen: bigint[] = [1n];

/** 10 to a non-negative whole power, remembered because scaling asks for the same few again and again. */
export function powerOfTen(exponent: number): bigint {
  for (let k = powersOfTen.length; k <= exponent; k++) powersOfTen.push(powersOfTen[k - 1]! * 10n);
  return powersOfTen[exponent]!;
}

/** Whole number and decimal places of a decimal string: "-1.50" → { digits: -150n, places: 2 }. */
export function splitDecimal(text: string): { digits: bigint; places: number } {
  const match = DECIMAL.exec(text);
  if (!match || !(match[2] || match[3])) throw new RangeError(`not a decimal number: ${text}`);
  const fraction = match[3] ?? '';
  const digits = BigInt(match[2] + fraction);
  const places = fraction.length - Number(match[4] ?? 0);
  const signed = match[1] === '-' ? -digits : digits;
  return places < 0 ? { digits: signed * powerOfTen(-places), places: 0 } : { digits: signed, places };
}

/** Integer square root, rounded down. */
export function integerSquareRoot(value: bigint): bigint {
  if (value < 2n) return value;
  let root = 1n << BigInt((value.toString(16).length * 4 + 1) >> 1);
  for (;;) {
    const next = (root + value / root) >> 1n;
    if (next >= root) return root;
    root = next;
  }
}

function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  let x = a < 0n ? -a : a;
  let y = b;
  while (y !== 0n) [x, y] = [y, x % y];
  return x;
}

/** Half-even quotient of whole numbers, divisor > 0. */
export function divideHalfEven(dividend: bigint, divisor: bigint): bigint {
  const negative = dividend < 0n;
  const size = negative ? -dividend : dividend;
  let quotient = size / divisor;
  const twice = (size - quotient * divisor) * 2n;
  if (twice > divisor || (twice === divisor && (quotient & 1n) === 1n)) quotient += 1n;
  return negative ? -quotient : quotient;
}

/** Whole number times 10^-places as plain text; trailing zeros are dropped unless `keep`. */
export function placesToText(digits: bigint, places: number, keep = false): string {
  if (places <= 0) return (digits * powerOfTen(-places)).toString();
  const negative = digits < 0n;
  const text = (negative ? -digits : digits).toString().padStart(places + 1, '0');
  let fraction = text.slice(-places);
  if (!keep) {
    let end = fraction.length;
    while (end > 0 && fraction.charCodeAt(end - 1) === 48) end--;
    fraction = fraction.slice(0, end);
  }
  const whole = text.slice(0, -places);
  return `${negative ? '-' : ''}${whole}${fraction ? `.${fraction}` : ''}`;
}

/**
 * Texts of many numerators over one denominator. A finite decimal is written in full, any other to 30
 * significant digits, half-even. One denominator is taken apart once, which is what makes 200 residuals cheap.
 */
export function overCommonDenominator(numerators: readonly bigint[], denominator: bigint): string[] {
  let rest = denominator;
  let twos = 0;
  let fives = 0;
  while ((rest & 1n) === 0n) {
    rest >>= 1n;
    twos++;
  }
  while (rest % 5n === 0n) {
    rest /= 5n;
    fives++;
  }
  const places = Math.max(twos, fives);
  const raise = 2n ** BigInt(places - twos) * 5n ** BigInt(places - fives);
  return numerators.map((numerator) =>
    numerator % rest === 0n
      ? placesToText((numerator / rest) * raise, places)
      : toSignificantDigits(numerator, denominator),
  );
}

function toSignificantDigits(numerator: bigint, denominator: bigint): string {
  const size = (numerator < 0n ? -numerator : numerator).toString().length - denominator.toString().length;
  let places = RESULT_DIGITS - size;
  for (;;) {
    const quotient =
      places >= 0
        ? divideHalfEven(numerator * powerOfTen(places), denominator)
        : divideHalfEven(numerator, denominator * powerOfTen(-places));
    const digits = (quotient < 0n ? -quotient : quotient).toString().length;
    if (digits <= RESULT_DIGITS) return placesToText(quotient, places);
    places -= digits - RESULT_DIGITS;
  }
}

/**
 * An exact rational number. Every sum, mean, slope and difference of a result is carried as one, so that a reading
 * exactly at the tolerance stays exactly there.
 */
export class Fraction {
  static readonly zero = new Fraction(0n, 1n);
  static readonly one = new Fraction(1n, 1n);

  private constructor(
    readonly n: bigint,
    readonly d: bigint,
  ) {}

  /** numerator / denominator; throws on denominator zero. */
  static of(numerator: bigint | number, denominator: bigint | number = 1n): Fraction {
    const n = BigInt(numerator);
    const d = BigInt(denominator);
    if (d === 0n) throw new RangeError('division by zero');
    return d < 0n ? new Fraction(-n, -d) : new Fraction(n, d);
  }

  /** Exact value of a decimal string. */
  static from(text: string): Fraction {
    const { digits, places } = splitDecimal(text);
    return new Fraction(digits, powerOfTen(places));
  }

  static sum(values: readonly Fraction[]): Fraction {
    return values.reduce((total, value) => total.plus(value), Fraction.zero);
  }

  static mean(values: readonly Fraction[]): Fraction {
    return Fraction.sum(values).dividedBy(Fraction.of(values.length));
  }

  static max(values: readonly Fraction[]): Fraction {
    return values.reduce((best, value) => (value.compare(best) > 0 ? value : best));
  }

  static min(values: readonly Fraction[]): Fraction {
    return values.reduce((best, value) => (value.compare(best) < 0 ? value : best));
  }

  /** Largest minus smallest. */
  static range(values: readonly Fraction[]): Fraction {
    return Fraction.max(values).minus(Fraction.min(values));
  }

  plus(other: Fraction): Fraction {
    if (this.d === other.d) return new Fraction(this.n + other.n, this.d);
    // Decimal denominators divide one another: taking the larger keeps long sums from growing.
    if (this.d > other.d && this.d % other.d === 0n) return new Fraction(this.n + other.n * (this.d / other.d), this.d);
    if (other.d % this.d === 0n) return new Fraction(this.n * (other.d / this.d) + other.n, other.d);
    return new Fraction(this.n * other.d + other.n * this.d, this.d * other.d);
  }

  minus(other: Fraction): Fraction {
    return this.plus(other.negated());
  }

  times(other: Fraction): Fraction {
    return new Fraction(this.n * other.n, this.d * other.d);
  }

  dividedBy(other: Fraction): Fraction {
    return Fraction.of(this.n * other.d, this.d * other.n);
  }

  negated(): Fraction {
    return new Fraction(-this.n, this.d);
  }

  abs(): Fraction {
    return this.n < 0n ? this.negated() : this;
  }

  squared(): Fraction {
    return this.times(this);
  }

  /** −1, 0 or 1. */
  sign(): number {
    return this.n > 0n ? 1 : this.n < 0n ? -1 : 0;
  }

  compare(other: Fraction): number {
    const difference = this.n * other.d - other.n * this.d;
    return difference > 0n ? 1 : difference < 0n ? -1 : 0;
  }

  equals(other: Fraction): boolean {
    return this.compare(other) === 0;
  }

  reduced(): Fraction {
    const divisor = greatestCommonDivisor(this.n, this.d);
    return divisor > 1n ? new Fraction(this.n / divisor, this.d / divisor) : this;
  }

  /** Exact where 50 digits hold it, else rounded to them. */
  toDec(): Dec {
    return new Dec(this.n.toString()).div(this.d.toString());
  }

  /** Square root: exact where it is rational, otherwise to the working precision. Throws below zero. */
  squareRoot(): Dec {
    const { n, d } = this.reduced();
    if (n < 0n) throw new RangeError('square root of a negative number');
    const rootN = integerSquareRoot(n);
    const rootD = integerSquareRoot(d);
    if (rootN * rootN === n && rootD * rootD === d) return new Fraction(rootN, rootD).toDec();
    return new Dec(n.toString()).div(d.toString()).sqrt();
  }

  /** Plain decimal text: in full where finite, else 30 significant digits. */
  toText(): string {
    const { n, d } = this.reduced();
    return overCommonDenominator([n], d)[0]!;
  }
}
