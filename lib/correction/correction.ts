import { z } from 'zod';
import { lostMotionChange, lostMotionChangeInput } from './lost-motion-change';
import { mandrelSag, mandrelSagInput } from './mandrel-sag';
import { pitchTable, pitchTableInput } from './pitch-table';
import { referenceShiftAdvice, referenceShiftAdviceInput } from './reference-shift-advice';
import {
  headstockForTaper,
  headstockForTaperInput,
  pivotAndPushScrew,
  pivotAndPushScrewInput,
  shim,
  shimInput,
  turretParallelAndCentre,
  turretParallelAndCentreInput,
  twoJackPoints,
  twoJackPointsInput,
} from './setting-amounts';

/** Every kind of advice, told apart by `kind`. */
export const correctionInput = z.discriminatedUnion('kind', [
  lostMotionChangeInput,
  referenceShiftAdviceInput,
  pitchTableInput,
  twoJackPointsInput,
  pivotAndPushScrewInput,
  shimInput,
  turretParallelAndCentreInput,
  headstockForTaperInput,
  mandrelSagInput,
]);

/** Advice for a correction: amounts, the formula they come from, and how to verify them. */
export function correction(input: z.output<typeof correctionInput>) {
  switch (input.kind) {
    case 'lost-motion':
      return lostMotionChange(input);
    case 'reference-shift':
      return referenceShiftAdvice(input);
    case 'pitch-table':
      return pitchTable(input);
    case 'two-jack-points':
      return twoJackPoints(input);
    case 'pivot-and-push-screw':
      return pivotAndPushScrew(input);
    case 'shim':
      return shim(input);
    case 'turret-parallel-and-centre':
      return turretParallelAndCentre(input);
    case 'headstock-for-taper':
      return headstockForTaper(input);
    case 'mandrel-sag':
      return mandrelSag(input);
  }
}
