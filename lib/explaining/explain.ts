import type { EvaluationInput, EvaluationMethod, EvaluationResult, ResultOf } from '@/lib/evaluation';
import { ruleSet } from '@/lib/evaluation';
import { lostMotionSteps, referenceShiftSteps } from './axes';
import { circularSteps, roundnessSteps } from './circles';
import { conformitySteps } from './conformity';
import { correctionSteps } from './corrections';
import type { ExplainedStep, Explanation } from './explanation';
import { roundingSteps, toleranceSteps, uncertaintySteps } from './helpers';
import { indexingSteps } from './indexing';
import { angularSteps, diameterSteps, driftSteps, twoCollarSteps } from './pieces';
import { flatnessSteps, reversalSteps } from './planes-and-reversals';
import { positioningSteps } from './positioning';
import { rotationSteps } from './rotation';
import { axialSteps, runOutSteps } from './run-outs';
import { parallelismSteps, squarenessSteps, squarenessToAxisSteps } from './slopes';
import { sources } from './sources';
import { fromAnglesSteps, straightnessSteps } from './straight-lines';
import { centreHeightSteps, coaxialitySteps } from './sweeps';

type InputOf<M extends EvaluationMethod> = Extract<EvaluationInput, { method: M }>;
type Explainers = { [M in EvaluationMethod]: (input: InputOf<M>, result: ResultOf<M>) => ExplainedStep[] };

const explainers: Explainers = {
  straightness: straightnessSteps,
  'straightness-from-angles': fromAnglesSteps,
  'straightness-reversal': reversalSteps,
  flatness: flatnessSteps,
  parallelism: parallelismSteps,
  'squareness-to-axis': squarenessToAxisSteps,
  squareness: squarenessSteps,
  'run-out': runOutSteps,
  'axial-run-out': axialSteps,
  coaxiality: coaxialitySteps,
  'centre-height': centreHeightSteps,
  'angular-deviation': angularSteps,
  positioning: positioningSteps,
  circular: circularSteps,
  'axis-of-rotation': rotationSteps,
  indexing: indexingSteps,
  'lost-motion': lostMotionSteps,
  'reference-shift': referenceShiftSteps,
  roundness: roundnessSteps,
  'diameter-consistency': diameterSteps,
  drift: driftSteps,
  'two-collar': twoCollarSteps,
  uncertainty: uncertaintySteps,
  conformity: conformitySteps,
  rounding: roundingSteps,
  tolerance: toleranceSteps,
  correction: correctionSteps,
};

/**
 * How a result came about: formulas with the figures put in, step by step; the last step gives the figure that is judged. Says what
 * was computed elsewhere and decides nothing.
 * @param result what `evaluate` gave for this input
 */
export function explain(input: EvaluationInput, result: EvaluationResult): Explanation {
  const { title, source } = sources[input.method];
  const steps = (explainers[input.method] as (input: unknown, result: unknown) => ExplainedStep[])(input, result);
  return { method: input.method, title, ruleSet, source, steps };
}
