import { Fraction } from '@/lib/units/fraction';
import type { ExplainedStep } from './explanation';
import { fig, meanOf, negative } from './figures';

/** Above this the sums are not worked out again for the reader. */
const MOST_POINTS = 200;

/**
 * Slope of the least-squares line with its two sums, which are exact; `factor` brings it to the unit of the result.
 * @param value the slope as the method gave it, with its unit
 */
export function leastSquaresStep(options: {
  what: string;
  x: readonly string[];
  y: readonly string[];
  names: [x: string, y: string];
  factor: string;
  value: string;
}): ExplainedStep {
  const { what, x, y, names, factor, value } = options;
  const [nx, ny] = names;
  const formula = `b = Σ(${nx} − ${nx}̄)(${ny} − ${ny}̄) / Σ(${nx} − ${nx}̄)²${factor === '1' ? '' : ` · ${factor}`}`;
  if (x.length > MOST_POINTS) return { what, formula, withNumbers: `sums over ${x.length} points`, value };
  const { product, square } = sums(x, y);
  const means = `${nx}̄ = ${fig(meanOf(x))}, ${ny}̄ = ${fig(meanOf(y))}`;
  const times = factor === '1' ? '' : ` · ${factor}`;
  return { what: `${what}; ${means}`, formula, withNumbers: `${negative(product)} / ${fig(square)}${times}`, value };
}

/** Σ(x − x̄)(y − ȳ) and Σ(x − x̄)². */
function sums(x: readonly string[], y: readonly string[]): { product: string; square: string } {
  const xs = x.map((text) => Fraction.from(text));
  const ys = y.map((text) => Fraction.from(text));
  const [middle, height] = [Fraction.mean(xs), Fraction.mean(ys)];
  const away = xs.map((value) => value.minus(middle));
  return {
    product: Fraction.sum(away.map((value, k) => value.times(ys[k]!.minus(height)))).toText(),
    square: Fraction.sum(away.map((value) => value.squared())).toText(),
  };
}
