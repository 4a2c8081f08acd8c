import type { ResultOf } from '@/lib/evaluation';
import type { ExplainedStep } from './explanation';
import { extremes, fig, listed, negative, rangeOf, um, umPerM } from './figures';

const lineWords: Record<string, string> = {
  'end-points': 'line through the end points',
  'least-squares': 'least-squares line',
  'minimum-zone': 'line of the minimum zone: its slope is that of an edge of the convex hull',
};
const slopeFormula: Record<string, string> = {
  'end-points': 'b = (z last − z first)/(x last − x first)',
  'least-squares': 'b = Σ(x − x̄)(z − z̄)/Σ(x − x̄)²',
  'minimum-zone': 'b: that slope for which max(z − b·x) − min(z − b·x) is least',
};

interface Line {
  slope: string;
  intercept: string;
  residuals: readonly string[];
  deviation: string;
}

/** Reference line, residuals at the two places that decide, width. */
export function lineSteps(
  line: Line,
  reference: string,
  positions: readonly string[],
  readings: readonly string[],
): ExplainedStep[] {
  const { atLargest, atSmallest } = extremes(line.residuals);
  const residual = (at: number): ExplainedStep => ({
    what: `Distance from the line at ${fig(positions[at]!)} mm, ${at === atLargest ? 'the largest' : 'the smallest'}`,
    formula: 'd = z − (a + b·x/1000)',
    withNumbers: `${fig(readings[at]!)} − (${fig(line.intercept)} + ${negative(line.slope)} · ${negative(positions[at]!)} / 1000)`,
    value: um(line.residuals[at]!),
  });
  return [
    {
      what: `Reference: ${lineWords[reference] ?? reference}`,
      formula: slopeFormula[reference] ?? 'b',
      withNumbers: `x: ${listed(positions)} mm; z: ${listed(readings)} µm`,
      value: `b = ${umPerM(line.slope)}, a = ${um(line.intercept)}`,
    },
    residual(atLargest),
    ...(atSmallest === atLargest ? [] : [residual(atSmallest)]),
    {
      what: 'Width about the line',
      formula: 'S = max d − min d',
      withNumbers: rangeOf(line.residuals),
      value: um(line.deviation),
    },
  ];
}

type Points = { position: string; reading: string }[];

export function straightnessSteps(
  input: { reference: string; points: Points },
  result: ResultOf<'straightness'>,
): ExplainedStep[] {
  const steps = lineSteps(
    result,
    input.reference,
    input.points.map(({ position }) => position),
    input.points.map(({ reading }) => reading),
  );
  if (result.local === undefined) return steps;
  const local: ExplainedStep = {
    what: 'Largest width over any window of the local length, a line of the same kind fitted anew in each',
    formula: 'S local = max over windows of (max d − min d)',
    withNumbers:
      result.localAt === undefined ? 'no window holds three points' : `worst window from ${fig(result.localAt)} mm on`,
    value: um(result.local),
  };
  return [...steps.slice(0, -1), local, steps.at(-1)!];
}

export function fromAnglesSteps(
  input: { reference: string; stepLength: string; angles: string[]; returnAngles?: string[] },
  result: ResultOf<'straightness-from-angles'>,
): ExplainedStep[] {
  const [first, second] = result.heights;
  const angle = input.returnAngles
    ? `(${fig(input.angles[0]!)} + ${negative(input.returnAngles[0]!)}) / 2`
    : fig(input.angles[0]!);
  const positions = result.heights.map((_, k) => String(Number(input.stepLength) * k));
  return [
    {
      what: `Height of each foot over the last${input.returnAngles ? ', out and back averaged' : ''}`,
      formula: 'h(k) = h(k−1) + step · angle / 1000',
      withNumbers: `first step: ${fig(first!)} + ${fig(input.stepLength)} · ${angle} / 1000`,
      value: um(second!),
    },
    ...(result.closure === undefined
      ? []
      : [
          {
            what: 'Closure of both runs',
            formula: 'h(n) out − h(n) back',
            withNumbers: 'each run alone',
            value: um(result.closure),
          },
        ]),
    ...lineSteps(result, input.reference, positions, result.heights),
  ];
}

export function reversalSteps(
  input: { positions: string[]; first: string[]; second: string[]; reference?: string },
  result: ResultOf<'straightness-reversal'>,
): ExplainedStep[] {
  return [
    {
      what: `Profile of the motion, at ${fig(input.positions[0]!)} mm`,
      formula: 's = (second − first)/2',
      withNumbers: `(${fig(input.second[0]!)} − ${negative(input.first[0]!)}) / 2`,
      value: um(result.machine[0]!),
    },
    {
      what: 'The straightedge’s own profile, at the same place',
      formula: 'e = (first + second)/2',
      withNumbers: `(${fig(input.first[0]!)} + ${negative(input.second[0]!)}) / 2`,
      value: um(result.straightedge[0]!),
    },
    {
      what: `Straightness of the motion about the ${lineWords[input.reference ?? 'minimum-zone']}`,
      formula: 'S = max d − min d',
      withNumbers: `s: ${listed(result.machine)} µm`,
      value: um(result.deviation),
    },
  ];
}

export function flatnessSteps(
  input: { reference: string; points: { x: string; y: string; reading: string }[] },
  result: ResultOf<'flatness'>,
): ExplainedStep[] {
  const { atLargest, atSmallest } = extremes(result.residuals);
  const at = (k: number) => `x ${fig(input.points[k]!.x)}, y ${fig(input.points[k]!.y)}`;
  return [
    {
      what: `Reference plane: ${input.reference === 'least-squares' ? 'least squares' : input.reference === 'minimum-zone' ? 'middle of the two parallel planes of least separation' : 'through three points'}`,
      formula: 'z = a + b·x/1000 + c·y/1000',
      withNumbers: `${input.points.length} points`,
      value: `a = ${um(result.a)}, b = ${umPerM(result.b)}, c = ${umPerM(result.c)}`,
    },
    {
      what: `Distance of the planes: largest at ${at(atLargest)}, smallest at ${at(atSmallest)}`,
      formula: 'max d − min d',
      withNumbers: rangeOf(result.residuals),
      value: um(result.deviation),
    },
  ];
}
