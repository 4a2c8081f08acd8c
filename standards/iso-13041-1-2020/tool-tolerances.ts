import type { ToleranceRule } from '../types';
import { remembered } from './source';
import { minimumUm } from './tolerances';

/** Tolerances of turrets, tool spindles and swivel axes, µm; remembered starter values like all of this code. */
const over = (
  allUm: string,
  baseLengthMm: string,
  text: string,
  confidence: 'low' | 'medium' = 'low',
): ToleranceRule => ({
  by: 'all',
  allUm,
  perLength: { baseLengthMm, minimumUm },
  provenance: remembered(text, confidence),
});
const fixed = (allUm: string, text: string): ToleranceRule => ({
  by: 'all',
  allUm,
  provenance: remembered(text, 'low'),
});

export const turretFace = over('20', '100', '.020 over 100', 'medium');
export const toolHoleAxis = over('20', '100', '.020 to .030 over 100, lower end taken');

/** Indexing is never worked out for another radius. */
export const turretRepeatability: ToleranceRule = {
  by: 'size-class',
  byClassUm: ['5', '8', '10'],
  provenance: remembered('.005 / .008 / .010 by size class', 'low'),
};
export const turretAccuracy = fixed('20', '.020 at a radius of 100 mm; another radius needs a value of its own');

export const toolSpindleAtNose = fixed('10', '.010 at the mouth of the taper');
export const toolSpindleAt100 = fixed(
  '15',
  '.015 to .020 at 100 to 300 mm, lower end taken for 100 mm; a longer mandrel needs a value of its own',
);
export const toolSpindleAxis = over('20', '100', '.020 over 100 to .020 over 300; the wider one, over 100, taken');
export const toolSpindleHeight = fixed('30', '.030 to .040, lower end taken');
export const toolSpindleSlip = fixed('5', '.005 to .010 for face and slip, lower end taken for the slip');
export const toolSpindleFace = fixed('10', '.005 to .010 for face and slip, upper end taken for the face');

export const swivelPlane = fixed('20', '.020 to .030 over the swivel, lower end taken');
export const swivelAtStops = over('20', '300', '.020 over 300');
/** By contract only: nothing is remembered. */
export const pivotPlace: ToleranceRule | null = null;
