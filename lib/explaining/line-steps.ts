import type { ExplainedStep } from './explanation';
import { extremes, fig, meanOf, negative, rangeOf, rising, um, umPerM } from './figures';
import { leastSquaresStep } from './least-squares';

const lineWords: Record<string, string> = {
  'end-points': 'line through the end points',
  'least-squares': 'least-squares line',
  'minimum-zone': 'line in the middle of the narrowest strip',
};

interface Line {
  slope: string;
  intercept: string;
  residuals: readonly string[];
  deviation: string;
}

/** Reference line, distances at the two places that decide, width. */
export function lineSteps(
  line: Line,
  reference: string,
  x: readonly string[],
  z: readonly string[],
  name = 'z',
): ExplainedStep[] {
  const { atLargest, atSmallest } = extremes(line.residuals);
  const distance = (at: number): ExplainedStep => ({
    what: `Distance from the line at ${fig(x[at]!)} mm, ${at === atLargest ? 'the largest' : 'the smallest'}`,
    formula: `d = ${name} − (a + b · x / 1000)`,
    withNumbers: `${fig(z[at]!)} − (${fig(line.intercept)} + ${negative(line.slope)} · ${negative(x[at]!)} / 1000)`,
    value: um(line.residuals[at]!),
  });
  return [
    slopeStep(line, reference, x, z, name),
    interceptStep(line, reference, x, z, name),
    distance(atLargest),
    ...(atSmallest === atLargest ? [] : [distance(atSmallest)]),
    {
      what: 'Width about the line',
      formula: 'S = max d − min d',
      withNumbers: rangeOf(line.residuals),
      value: um(line.deviation),
    },
  ];
}

function slopeStep(line: Line, reference: string, x: readonly string[], z: readonly string[], name: string) {
  const what = `Slope of the ${lineWords[reference] ?? reference}`;
  if (reference === 'least-squares') {
    return leastSquaresStep({ what, x, y: z, names: ['x', name], factor: '1000', value: umPerM(line.slope) });
  }
  const through = reference === 'end-points' ? ends(x) : edge(line.residuals, x);
  if (!through) {
    return {
      what,
      formula: 'b: that slope for which max d − min d is least',
      withNumbers: `over ${x.length} points`,
      value: umPerM(line.slope),
    };
  }
  const [first, last] = through;
  const where = `${fig(x[first]!)} and ${fig(x[last]!)} mm`;
  return {
    what:
      reference === 'end-points'
        ? `${what}, at ${where}`
        : `${what}; its edge touches the readings at ${where}, so it has their slope`,
    formula: `b = (${name}2 − ${name}1) / (x2 − x1) · 1000`,
    withNumbers: `(${fig(z[last]!)} − ${negative(z[first]!)}) / (${fig(x[last]!)} − ${negative(x[first]!)}) · 1000`,
    value: umPerM(line.slope),
  };
}

function interceptStep(line: Line, reference: string, x: readonly string[], z: readonly string[], name: string) {
  const slope = negative(line.slope);
  const value = um(line.intercept);
  if (reference === 'least-squares') {
    return {
      what: 'Height of the line at x = 0',
      formula: `a = ${name}̄ − b · x̄ / 1000`,
      withNumbers: `${fig(meanOf(z))} − ${slope} · ${negative(meanOf(x))} / 1000`,
      value,
    };
  }
  if (reference === 'end-points') {
    const [first] = ends(x);
    return {
      what: 'Height of the line at x = 0',
      formula: `a = ${name}1 − b · x1 / 1000`,
      withNumbers: `${fig(z[first]!)} − ${slope} · ${negative(x[first]!)} / 1000`,
      value,
    };
  }
  const { atLargest, atSmallest } = extremes(line.residuals);
  const part = (at: number) => `${fig(z[at]!)} − ${slope} · ${negative(x[at]!)} / 1000`;
  return {
    what: 'Height of the line at x = 0: half-way between both edges of the strip',
    formula: `a = ((${name}u − b · xu / 1000) + (${name}l − b · xl / 1000)) / 2`,
    withNumbers: `((${part(atLargest)}) + (${part(atSmallest)})) / 2`,
    value,
  };
}

function ends(x: readonly string[]): [number, number] {
  const order = rising(x);
  return [order[0]!, order.at(-1)!];
}

/** Two readings on the same edge of the strip, the furthest apart; null where rounding of the last digit hides them. */
function edge(residuals: readonly string[], x: readonly string[]): [number, number] | null {
  const { largest, smallest } = extremes(residuals);
  for (const side of [largest, smallest]) {
    const touching = rising(x).filter((k) => residuals[k] === side);
    if (touching.length > 1) return [touching[0]!, touching.at(-1)!];
  }
  return null;
}
