import type { MeasuredResult } from '@/lib/evaluation';
import { circularFigures, lostMotionFigures, positioningFigures, referenceShiftFigures } from './axis-figures';
import type { CheckResult } from './check-result';
import { type Figure, slope, um } from './figure-text';
import { diameterFigures, driftFigures, roundnessFigures, twoCollarFigures } from './piece-figures';
import {
  angularFigures,
  fromAnglesFigures,
  parallelismFigures,
  reversalFigures,
  squarenessFigures,
} from './slide-figures';
import { axialRunOutFigures, coaxialityFigures, rotationFigures, runOutFigures } from './spindle-figures';
import { centreHeightFigures, indexingFigures } from './turret-figures';
import type { Judgement, SheetOutcome } from './types';

/** Further figures of the method for sheet and report, rounded once for the reader, in words. Empty while there is no result. */
export function figures(outcome: SheetOutcome): Figure[] {
  if (outcome.state !== 'partial' && outcome.state !== 'complete') return [];
  const { result, judgement, input } = outcome;
  if (result.method === 'function-check') return checkFigures(result);
  const own = figuresOf(result, judgement, input);
  const local = judgement.local;
  if (!local) return own;
  return [
    ...own,
    {
      label: `largest over any ${local.lengthMm} mm`,
      value: `${um(local.deviationUm)} (limit ${um(local.toleranceUm, '0.1')})`,
    },
  ];
}

function figuresOf(result: MeasuredResult, judgement: Judgement, input: unknown): Figure[] {
  switch (result.method) {
    case 'run-out':
      return runOutFigures(result, judgement);
    case 'parallelism':
      return parallelismFigures(result);
    case 'squareness-to-axis':
      return [{ label: 'slope of the means', value: slope(result.fitSlope) }];
    case 'squareness':
      return squarenessFigures(result);
    case 'straightness':
      return [{ label: 'slope of the reference line', value: slope(result.slope) }];
    case 'coaxiality':
      return coaxialityFigures(result, input);
    case 'centre-height':
      return centreHeightFigures(result, input);
    case 'lost-motion':
      return lostMotionFigures(result);
    case 'two-collar':
      return twoCollarFigures(result);
    case 'positioning':
      return positioningFigures(result, (input as { kind: string }).kind === 'rotary');
    case 'circular':
      return circularFigures(result);
    case 'axis-of-rotation':
      return rotationFigures(result, (input as { direction: string }).direction === 'tilt');
    case 'indexing':
      return indexingFigures(result, input);
    case 'straightness-from-angles':
      return fromAnglesFigures(result);
    case 'straightness-reversal':
      return reversalFigures(result);
    case 'flatness':
      return [{ label: 'slope of the plane', value: `x ${slope(result.b)}, y ${slope(result.c)}` }];
    case 'angular-deviation':
      return angularFigures(result);
    case 'roundness':
      return roundnessFigures(result);
    case 'diameter-consistency':
      return diameterFigures(result);
    case 'drift':
      return driftFigures(result);
    case 'reference-shift':
      return referenceShiftFigures(result);
    case 'axial-run-out':
      return axialRunOutFigures(result, input);
    default:
      return [];
  }
}

function checkFigures({ items, notFitted }: CheckResult): Figure[] {
  const inOrder = items.filter((item) => item.inOrder).length;
  return [
    { label: 'items in order', value: `${inOrder} of ${items.length - notFitted}` },
    ...(notFitted > 0 ? [{ label: 'not fitted', value: String(notFitted) }] : []),
  ];
}
