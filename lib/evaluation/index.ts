import { z } from 'zod';
import { conformity, conformityInput } from '@/lib/conformity/judge';
import { correction, correctionInput } from '@/lib/correction/correction';
import { uncertainty, uncertaintyInput } from '@/lib/uncertainty/uncertainty';
import { angularDeviation, angularDeviationInput } from './angular-deviation';
import { axialRunOut, axialRunOutInput } from './axial-run-out';
import { axisOfRotation, axisOfRotationInput } from './axis-of-rotation';
import { centreHeight, centreHeightInput } from './centre-height';
import { circular, circularInput } from './circular';
import { coaxiality, coaxialityInput } from './coaxiality';
import { diameterConsistency, diameterConsistencyInput } from './diameter-consistency';
import { drift, driftInput } from './drift';
import { EvaluationError, pointerOf } from './evaluation-error';
import { flatness, flatnessInput } from './flatness';
import { indexing, indexingInput } from './indexing';
import { lostMotion, lostMotionInput } from './lost-motion';
import { parallelism, parallelismInput } from './parallelism';
import { positioning, positioningInput } from './positioning';
import { referenceShift, referenceShiftInput } from './reference-shift';
import { rounding, roundingInput } from './rounding';
import { roundness, roundnessInput } from './roundness';
import { runOut, runOutInput } from './run-out';
import { squareness, squarenessInput } from './squareness';
import { squarenessToAxis, squarenessToAxisInput } from './squareness-to-axis';
import { straightness, straightnessInput } from './straightness';
import { straightnessFromAngles, straightnessFromAnglesInput } from './straightness-from-angles';
import { straightnessReversal, straightnessReversalInput } from './straightness-reversal';
import { tolerance, toleranceInput } from './tolerance';
import { twoCollar, twoCollarInput } from './two-collar';

export {
  directionSign,
  type Judgement,
  judge,
  PERMISSIBLE_DIRECTIONS,
  type PermissibleDirection,
  type Verdict,
} from '@/lib/conformity/judge';
export { EvaluationError, type EvaluationIssue } from './evaluation-error';
export { assertKnownRuleSet, ruleSet } from './rule-set';

/** Input of every method, told apart by `method` (corrections also by `kind`); unknown fields are refused. */
export const evaluationInput = z.discriminatedUnion('method', [
  straightnessInput,
  parallelismInput,
  squarenessToAxisInput,
  squarenessInput,
  runOutInput,
  coaxialityInput,
  centreHeightInput,
  lostMotionInput,
  referenceShiftInput,
  twoCollarInput,
  angularDeviationInput,
  axialRunOutInput,
  axisOfRotationInput,
  circularInput,
  diameterConsistencyInput,
  driftInput,
  flatnessInput,
  indexingInput,
  positioningInput,
  roundnessInput,
  straightnessFromAnglesInput,
  straightnessReversalInput,
  uncertaintyInput,
  conformityInput,
  roundingInput,
  toleranceInput,
  correctionInput,
]);

export type EvaluationInput = z.input<typeof evaluationInput>;
export type EvaluationMethod = EvaluationInput['method'];
export type EvaluationResult = ReturnType<typeof calculate>;
export type ResultOf<M extends EvaluationMethod> = Extract<EvaluationResult, { method: M }>;
/** Methods whose result is judged; the helpers have no deviation. */
export type MeasuredResult = Extract<EvaluationResult, { deviation: string; signed: boolean }>;

/**
 * The one door to all arithmetic: readings in, result out. Pure: no database, clock or environment; the browser and
 * the server run the same code. Decimal strings in and out, exact on the way.
 *
 * @param input see the schema of each method; it is checked here, so JSON of unknown origin may be passed
 * @returns the method's result; fields that are not evaluated are left out
 * @throws EvaluationError with a JSON pointer and plain words for every field that is refused
 * @example evaluate({ method: 'two-collar', D1: '30.012', D2: '30.007', distance: '100' }).deviation === '2.5'
 */
export function evaluate<const I extends EvaluationInput>(input: I): ResultOf<I['method']> {
  return calculate(parseEvaluationInput(input)) as ResultOf<I['method']>;
}

/** As `evaluate`, for JSON whose method is not known at compile time. */
export function evaluateUnknown(input: unknown): EvaluationResult {
  return calculate(parseEvaluationInput(input));
}

/** Checks an input against its method's schema. @throws EvaluationError */
export function parseEvaluationInput(input: unknown): z.output<typeof evaluationInput> {
  const parsed = evaluationInput.safeParse(input);
  if (parsed.success) return parsed.data;
  throw new EvaluationError(
    parsed.error.issues.flatMap((issue) =>
      issue.code === 'unrecognized_keys'
        ? issue.keys.map((key) => ({ pointer: pointerOf([...issue.path, key]), detail: 'unknown field' }))
        : [{ pointer: pointerOf(issue.path), detail: issue.message }],
    ),
  );
}

function calculate(input: z.output<typeof evaluationInput>) {
  switch (input.method) {
    case 'straightness':
      return straightness(input);
    case 'parallelism':
      return parallelism(input);
    case 'squareness-to-axis':
      return squarenessToAxis(input);
    case 'squareness':
      return squareness(input);
    case 'run-out':
      return runOut(input);
    case 'coaxiality':
      return coaxiality(input);
    case 'centre-height':
      return centreHeight(input);
    case 'lost-motion':
      return lostMotion(input);
    case 'reference-shift':
      return referenceShift(input);
    case 'two-collar':
      return twoCollar(input);
    case 'angular-deviation':
      return angularDeviation(input);
    case 'axial-run-out':
      return axialRunOut(input);
    case 'axis-of-rotation':
      return axisOfRotation(input);
    case 'circular':
      return circular(input);
    case 'diameter-consistency':
      return diameterConsistency(input);
    case 'drift':
      return drift(input);
    case 'flatness':
      return flatness(input);
    case 'indexing':
      return indexing(input);
    case 'positioning':
      return positioning(input);
    case 'roundness':
      return roundness(input);
    case 'straightness-from-angles':
      return straightnessFromAngles(input);
    case 'straightness-reversal':
      return straightnessReversal(input);
    case 'uncertainty':
      return uncertainty(input);
    case 'conformity':
      return conformity(input);
    case 'rounding':
      return rounding(input);
    case 'tolerance':
      return tolerance(input);
    case 'correction':
      return correction(input);
  }
}
