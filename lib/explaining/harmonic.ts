import { Dec, plain } from '@/lib/units/decimal';
import type { ExplainedStep } from './explanation';
import { extremes, fig, negative, rangeOf } from './figures';

const radians = (degrees: string) => new Dec(degrees).times(Dec.acos(-1)).div(180);

/**
 * What is left of readings round a circle when a · cos θ + b · sin θ is taken off, at the two angles that decide, and its range.
 * @param where words for the place of a reading
 * @returns makes the steps of a figure: its words, and the value that the method gave
 */
export function harmonic(options: {
  values: readonly string[];
  angles: readonly string[];
  a: string;
  b: string;
  name: string;
  where: (k: number) => string;
  unit: (text: string) => string;
}): (what: string, value: string) => ExplainedStep[] {
  const { values, angles, a, b, name, where, unit } = options;
  const turned = angles.map((degrees) => ({ cos: radians(degrees).cos(), sin: radians(degrees).sin() }));
  const rests = values.map((value, k) =>
    plain(new Dec(value).minus(turned[k]!.cos.times(a)).minus(turned[k]!.sin.times(b)).toSignificantDigits(30)),
  );
  const { atLargest, atSmallest } = extremes(rests);
  const rest = (k: number): ExplainedStep => ({
    what: `What is left at ${where(k)}, the ${k === atLargest ? 'largest' : 'smallest'}`,
    formula: `q = ${name} − a · cos θ − b · sin θ`,
    withNumbers: `${fig(values[k]!)} − ${negative(a)} · cos(${fig(angles[k]!)}°) − ${negative(b)} · sin(${fig(angles[k]!)}°)`,
    value: unit(rests[k]!),
  });
  return (what, value) => [
    rest(atLargest),
    ...(atSmallest === atLargest ? [] : [rest(atSmallest)]),
    { what, formula: 'max q − min q', withNumbers: rangeOf(rests), value: unit(value) },
  ];
}
