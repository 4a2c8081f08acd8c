import type { ResultOf } from '@/lib/evaluation';
import type { ExplainedStep } from './explanation';
import { fig, listed, negative, rangeOf, um, umPerM } from './figures';

interface Turned {
  positions: string[];
  readings: Record<string, string[]>;
  measuringLength?: string;
  judge?: string;
  sag?: string[];
}

/** Means over the angles at which the mandrel or disc stood. */
function meanSteps(input: Turned, means: readonly string[]): ExplainedStep[] {
  const angles = Object.keys(input.readings).sort((a, b) => Number(a) - Number(b));
  const sum = angles.map((angle, k) =>
    k === 0 ? fig(input.readings[angle]![0]!) : negative(input.readings[angle]![0]!),
  );
  const sag = input.sag ? ` + ${negative(input.sag[0]!)}` : '';
  return [
    {
      what: `Mean at ${fig(input.positions[0]!)} mm over ${angles.map((angle) => `${fig(angle)}°`).join(', ')}${input.sag ? ', sag of the mandrel added' : ''}`,
      formula: `m = (${angles.map((angle) => `r${fig(angle)}`).join(' + ')})/${angles.length}${input.sag ? ' + sag' : ''}`,
      withNumbers: `(${sum.join(' + ')}) / ${angles.length}${sag}`,
      value: um(means[0]!),
      readings: angles.map((angle) => `/readings/${angle}/0`),
    },
    {
      what: 'All means',
      formula: 'm(z)',
      withNumbers: `at ${listed(input.positions)} mm`,
      value: `${listed(means)} µm`,
    },
  ];
}

const length = (input: Turned): string => {
  if (input.measuringLength !== undefined) return input.measuringLength;
  const numbers = input.positions.map(Number);
  return String(Math.max(...numbers) - Math.min(...numbers));
};

const fitStep = (slope: string): ExplainedStep => ({
  what: 'Slope of the least-squares line through the means',
  formula: 'b = Σ(z − z̄)(m − m̄)/Σ(z − z̄)²',
  withNumbers: 'z in m, m in µm',
  value: umPerM(slope),
});

export function parallelismSteps(input: Turned, result: ResultOf<'parallelism'>): ExplainedStep[] {
  const means = meanSteps(input, result.means);
  if (input.judge === 'range') {
    const range = {
      what: 'Range of the means',
      formula: 'max m − min m',
      withNumbers: rangeOf(result.means),
      value: um(result.deviation),
    };
    return [...means, range];
  }
  return [
    ...means,
    fitStep(result.fitSlope),
    {
      what: 'Over the measuring length',
      formula: 'e = b · L / 1000',
      withNumbers: `${fig(result.fitSlope)} · ${fig(length(input))} / 1000`,
      value: um(result.deviation),
    },
  ];
}

export function squarenessToAxisSteps(input: Turned, result: ResultOf<'squareness-to-axis'>): ExplainedStep[] {
  return [
    ...meanSteps(input, result.means),
    fitStep(result.fitSlope),
    {
      what: 'Over the measuring length; falling readings are positive: concave',
      formula: 'e = −b · L / 1000',
      withNumbers: `−${negative(result.fitSlope)} · ${fig(length(input))} / 1000`,
      value: um(result.deviation),
    },
  ];
}

export function squarenessSteps(
  input: { measuringLength: string; squareError?: string },
  result: ResultOf<'squareness'>,
): ExplainedStep[] {
  const machine: ExplainedStep =
    result.s2 === undefined
      ? {
          what: 'Squareness, the square’s own error taken off',
          formula: 's1 − error of the square',
          withNumbers: `${fig(result.s1)} − ${negative(input.squareError ?? '0')}`,
          value: umPerM(result.squareness),
        }
      : {
          what: 'Squareness, mean of the square and the square turned over',
          formula: '(s1 + s2)/2',
          withNumbers: `(${fig(result.s1)} + ${negative(result.s2)}) / 2`,
          value: umPerM(result.squareness),
        };
  return [
    {
      what: 'Slopes of both arms together, square as first set up',
      formula: 's1 = slope of the reference arm + slope of the measured arm',
      withNumbers: 'least-squares lines through the readings of each arm',
      value: umPerM(result.s1),
    },
    ...(result.s2 === undefined
      ? []
      : [
          {
            what: 'The same with the square turned over',
            formula: 's2 = slope of the reference arm + slope of the measured arm',
            withNumbers: 'least-squares lines through the readings of each arm',
            value: umPerM(result.s2),
          },
        ]),
    machine,
    {
      what: 'Over the measuring length; positive: more than 90°',
      formula: 'squareness · L / 1000',
      withNumbers: `${fig(result.squareness)} · ${fig(input.measuringLength)} / 1000`,
      value: um(result.deviation),
    },
  ];
}

export function angularSteps(
  input: { positions: string[]; forward: string[]; backward?: string[] },
  result: ResultOf<'angular-deviation'>,
): ExplainedStep[] {
  return [
    {
      what: `Largest less smallest reading${input.backward ? ', both directions together' : ''}`,
      formula: 'max − min',
      withNumbers: rangeOf([...input.forward, ...(input.backward ?? [])]),
      value: umPerM(result.deviation),
    },
  ];
}

export function twoCollarSteps(
  input: { D1: string; D2: string; distance: string },
  result: ResultOf<'two-collar'>,
): ExplainedStep[] {
  return [
    {
      what: 'Slope of the spindle axis in the plane of the tool; positive: the free end leans toward the tool',
      formula: '1000000 · (D1 − D2)/(2·L)',
      withNumbers: `1000000 · (${fig(input.D1)} − ${fig(input.D2)}) / (2 · ${fig(input.distance)})`,
      value: umPerM(result.slope),
    },
    {
      what: 'Half the difference of the diameters, over the distance',
      formula: '1000 · (D1 − D2)/2',
      withNumbers: `1000 · (${fig(input.D1)} − ${fig(input.D2)}) / 2`,
      value: um(result.deviation),
    },
  ];
}
