import type { ResultOf } from '@/lib/evaluation';
import { Fraction } from '@/lib/units/fraction';
import type { ExplainedStep } from './explanation';
import { alike, fig, negative, um } from './figures';
import { lineSteps } from './line-steps';

export function straightnessSteps(
  input: { reference: string; points: { position: string; reading: string }[]; localLength?: string },
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
    what: `Largest width over any ${fig(input.localLength ?? '0')} mm, a line of the same kind fitted anew in each window`,
    formula: 'S local = max over windows of (max d − min d)',
    withNumbers:
      result.localAt === undefined ? 'no window holds three points' : `worst window from ${fig(result.localAt)} mm on`,
    value: um(result.local),
  };
  return [local, ...steps];
}

export function fromAnglesSteps(
  input: { reference: string; stepLength: string; angles: string[]; returnAngles?: string[] },
  result: ResultOf<'straightness-from-angles'>,
): ExplainedStep[] {
  const back = input.returnAngles;
  const { heights } = result;
  const step = Fraction.from(input.stepLength);
  const x = heights.map((_, k) => step.times(Fraction.of(k)).toText());
  const angle = (k: number) =>
    back ? `(${fig(input.angles[k]!)} + ${negative(back[k]!)}) / 2` : negative(input.angles[k]!);
  const height = (k: number): ExplainedStep => ({
    what: `Height after step ${k + 1}${back ? ', out and back averaged' : ''}`,
    formula: `h(${k + 1}) = h(${k}) + step · angle / 1000`,
    withNumbers: `${fig(heights[k]!)} + ${fig(input.stepLength)} · ${angle(k)} / 1000`,
    value: um(heights[k + 1]!),
    readings: [`/angles/${k}`, ...(back ? [`/returnAngles/${k}`] : [])],
  });
  const count = input.angles.length;
  const shown = count <= 5 ? input.angles.map((_, k) => height(k)) : [0, 1, 2].map(height);
  return [
    ...shown,
    ...(count <= 5 ? [] : [...alike(count - 4), height(count - 1)]),
    ...(back && result.closure !== undefined ? [closure(input.stepLength, input.angles, back, result.closure)] : []),
    ...lineSteps(result, input.reference, x, heights, 'h'),
  ];
}

function closure(step: string, out: string[], back: string[], value: string): ExplainedStep {
  const sum = (angles: string[]) => Fraction.sum(angles.map((text) => Fraction.from(text))).toText();
  return {
    what: 'Closure: end height by the way out less that by the way back, for information',
    formula: 'step · (Σ out − Σ back) / 1000',
    withNumbers: `${fig(step)} · (${fig(sum(out))} − ${negative(sum(back))}) / 1000`,
    value: um(value),
  };
}
