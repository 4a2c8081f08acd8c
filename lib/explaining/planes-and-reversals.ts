import { evaluate, type ResultOf } from '@/lib/evaluation';
import type { ExplainedStep } from './explanation';
import { alike, extremes, fig, negative, rangeOf, um, umPerM } from './figures';
import { lineSteps } from './line-steps';

type LineType = 'end-points' | 'least-squares' | 'minimum-zone';

export function reversalSteps(
  input: { positions: string[]; first: string[]; second: string[]; reference?: LineType },
  result: ResultOf<'straightness-reversal'>,
): ExplainedStep[] {
  const { positions, first, second, reference = 'minimum-zone' } = input;
  const slide = (k: number): ExplainedStep => ({
    what: `Profile of the slide at ${fig(positions[k]!)} mm`,
    formula: 's = (second − first) / 2',
    withNumbers: `(${fig(second[k]!)} − ${negative(first[k]!)}) / 2`,
    value: um(result.machine[k]!),
    readings: [`/first/${k}`, `/second/${k}`],
  });
  const edge: ExplainedStep = {
    what: `The straightedge’s own profile at ${fig(positions[0]!)} mm, for information`,
    formula: 'e = (first + second) / 2',
    withNumbers: `(${fig(first[0]!)} + ${negative(second[0]!)}) / 2`,
    value: um(result.straightedge[0]!),
  };
  const points = positions.map((position, k) => ({ position, reading: result.machine[k]! }));
  const line = evaluate({ method: 'straightness', reference, points });
  return [
    ...positions.slice(0, 3).map((_, k) => slide(k)),
    ...alike(positions.length - 3),
    edge,
    ...lineSteps(line, reference, positions, result.machine, 's'),
  ];
}

export function flatnessSteps(
  input: {
    reference: string;
    three?: readonly (string | number)[];
    points: { x: string; y: string; reading: string }[];
  },
  result: ResultOf<'flatness'>,
): ExplainedStep[] {
  const { points } = input;
  const { atLargest, atSmallest } = extremes(result.residuals);
  const distance = (k: number): ExplainedStep => ({
    what: `Distance from the plane at x ${fig(points[k]!.x)}, y ${fig(points[k]!.y)}, ${k === atLargest ? 'the largest' : 'the smallest'}`,
    formula: 'd = z − (a + b · x / 1000 + c · y / 1000)',
    withNumbers: `${fig(points[k]!.reading)} − (${fig(result.a)} + ${negative(result.b)} · ${negative(points[k]!.x)} / 1000 + ${negative(result.c)} · ${negative(points[k]!.y)} / 1000)`,
    value: um(result.residuals[k]!),
    readings: [`/points/${k}/reading`],
  });
  return [
    {
      what: planeWords(input.reference, input.three),
      formula: 'z = a + b · x / 1000 + c · y / 1000',
      withNumbers: `${points.length} points`,
      value: `a = ${um(result.a)}, b = ${umPerM(result.b)}, c = ${umPerM(result.c)}`,
    },
    distance(atLargest),
    ...(atSmallest === atLargest ? [] : [distance(atSmallest)]),
    {
      what: 'Width about the plane',
      formula: 'max d − min d',
      withNumbers: rangeOf(result.residuals),
      value: um(result.deviation),
    },
  ];
}

function planeWords(reference: string, three: readonly (string | number)[] | undefined): string {
  if (reference === 'least-squares') return 'Reference plane by least squares';
  if (reference === 'minimum-zone') return 'Reference plane in the middle of the narrowest slab';
  return `Reference plane through the points ${three?.join(', ') ?? ''}, counted from 0`;
}
