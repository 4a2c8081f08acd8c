import type { ResultOf } from '@/lib/evaluation';
import type { ExplainedStep } from './explanation';
import { alike, fig, meanText, negative, rangeOf, rising, spanOf, um, umPerM } from './figures';
import { leastSquaresStep } from './least-squares';
import { type ArmSlopes, armSlopes, type Setting } from './square-arms';

interface Turned {
  positions: string[];
  readings: Record<string, string[]>;
  measuringLength?: string;
  judge?: string;
  sag?: string[];
  localLength?: string;
}

/** Means over the angles at which the mandrel or disc stood. */
function meanSteps(input: Turned, means: readonly string[]): ExplainedStep[] {
  const { positions, readings, sag } = input;
  const order = rising(Object.keys(readings));
  const angles = order.map((k) => Object.keys(readings)[k]!);
  const step = (k: number): ExplainedStep => ({
    what: `Mean at ${fig(positions[k]!)} mm${sag ? ', sag of the mandrel added' : ''}`,
    formula: `m = (${angles.map((angle) => `r${fig(angle)}`).join(' + ')}) / ${angles.length}${sag ? ' + sag' : ''}`,
    withNumbers: `${meanText(angles.map((angle) => readings[angle]![k]!))}${sag ? ` + ${negative(sag[k]!)}` : ''}`,
    value: um(means[k]!),
    readings: angles.map((angle) => `/readings/${angle}/${k}`),
  });
  const count = positions.length;
  if (count <= 4) return positions.map((_, k) => step(k));
  return [step(0), step(1), step(2), ...alike(count - 4), step(count - 1)];
}

const fitStep = (input: Turned, means: readonly string[], slope: string): ExplainedStep =>
  leastSquaresStep({
    what: 'Slope of the least-squares line through the means',
    x: input.positions,
    y: means,
    names: ['z', 'm'],
    factor: '1000',
    value: umPerM(slope),
  });

const lengthOf = (input: Turned): string => input.measuringLength ?? spanOf(input.positions);

export function parallelismSteps(input: Turned, result: ResultOf<'parallelism'>): ExplainedStep[] {
  const means = meanSteps(input, result.means);
  const local: ExplainedStep[] =
    result.local === undefined
      ? []
      : [
          {
            what: `Largest range of the means over any ${fig(input.localLength ?? '0')} mm, for the local limit`,
            formula: 'max over windows of (max m − min m)',
            withNumbers: `over ${result.means.length} means`,
            value: um(result.local),
          },
        ];
  if (input.judge === 'range') {
    const range = {
      what: 'Range of the means',
      formula: 'max m − min m',
      withNumbers: rangeOf(result.means),
      value: um(result.deviation),
    };
    return [...means, ...local, range];
  }
  return [
    ...means,
    ...local,
    fitStep(input, result.means, result.fitSlope),
    {
      what: 'Over the measuring length',
      formula: 'e = b · L / 1000',
      withNumbers: `${fig(result.fitSlope)} · ${fig(lengthOf(input))} / 1000`,
      value: um(result.deviation),
    },
  ];
}

export function squarenessToAxisSteps(input: Turned, result: ResultOf<'squareness-to-axis'>): ExplainedStep[] {
  return [
    ...meanSteps(input, result.means),
    fitStep(input, result.means, result.fitSlope),
    {
      what: 'Over the measuring length; readings that fall outwards are positive: concave',
      formula: 'e = −b · L / 1000',
      withNumbers: `−${negative(result.fitSlope)} · ${fig(lengthOf(input))} / 1000`,
      value: um(result.deviation),
    },
  ];
}

const armWords = { referenceArm: 'reference arm', measuredArm: 'measured arm' } as const;

/** Slopes of both arms of one setting, and their sum. */
function settingSteps(setting: Setting, name: 's1' | 's2', sum: string, slopes: ArmSlopes): ExplainedStep[] {
  const where = name === 's1' ? 'square as first set up' : 'square turned over';
  const arms = (['referenceArm', 'measuredArm'] as const).flatMap((arm) => {
    const points = setting[arm]?.points;
    if (!points) return [];
    return [
      leastSquaresStep({
        what: `Slope of the ${armWords[arm]}, ${where}`,
        x: points.map(({ position }) => position),
        y: points.map(({ reading }) => reading),
        names: ['x', 'r'],
        factor: '1000',
        value: umPerM(slopes[arm]),
      }),
    ];
  });
  return [
    ...arms,
    {
      what: `Both arms together, ${where}`,
      formula: `${name} = slope of the reference arm + slope of the measured arm`,
      withNumbers: `${fig(slopes.referenceArm)} + ${negative(slopes.measuredArm)}`,
      value: umPerM(sum),
    },
  ];
}

export function squarenessSteps(
  input: { first: Setting; second?: Setting; measuringLength: string; squareError?: string },
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
          what: 'Squareness: mean of the square and the square turned over',
          formula: '(s1 + s2) / 2',
          withNumbers: `(${fig(result.s1)} + ${negative(result.s2)}) / 2`,
          value: umPerM(result.squareness),
        };
  return [
    ...settingSteps(input.first, 's1', result.s1, armSlopes(input.first)),
    ...(input.second && result.s2 !== undefined
      ? settingSteps(input.second, 's2', result.s2, armSlopes(input.second))
      : []),
    machine,
    {
      what: 'Over the measuring length; positive: more than 90°',
      formula: 'squareness · L / 1000',
      withNumbers: `${fig(result.squareness)} · ${fig(input.measuringLength)} / 1000`,
      value: um(result.deviation),
    },
  ];
}
