import type { Provenance, ToleranceRule } from '../types';
import { printed, remembered, rememberedAndPrinted, rememberedBesides } from './source';

/** Tolerances for engine lathes, µm. Floor for tolerances recalculated for another length: 10 µm, remembered, medium confidence. */
const minimumUm = '10';

const fixed = (allUm: string, provenance: Provenance): ToleranceRule => ({ by: 'all', allUm, provenance });
const over = (allUm: string, baseLengthMm: string, provenance: Provenance): ToleranceRule => ({
  by: 'all',
  allUm,
  perLength: { baseLengthMm, minimumUm },
  provenance,
});

export const noseRunOut = fixed('10', rememberedAndPrinted('.01'));
export const axialSlip = fixed('10', remembered('.01 as remembered for ISO 1708', 'high'));
export const faceRunOut = fixed('20', rememberedBesides('.02', '.015'));
export const boreRunOutAtNose = fixed('10', printed('.01'));
export const boreRunOutAt300 = fixed('20', printed('.02 at 300 mm'));
export const centreRunOut = fixed('15', printed('.015'));

export const zParallelInZx = over('15', '300', printed('.015 over 300'));
export const zParallelInYz = over('20', '300', printed('.020 over 300'));
export const xSquareToSpindle = over(
  '20',
  '300',
  rememberedBesides('.02 over 300', '.02 on a diameter of 160, concave only'),
);

export const carriageStraightness: ToleranceRule = {
  by: 'centre-distance',
  steps: [
    { overMm: '0', upToMm: '500', toleranceUm: '15' },
    { overMm: '500', upToMm: '1000', toleranceUm: '20' },
    { overMm: '1000', upToMm: '2000', toleranceUm: '25' },
    { overMm: '2000', upToMm: null, toleranceUm: '30' },
  ],
  provenance: remembered('.015 up to 500, .020 up to 1000, .005 more for each further 1000, .030 at most', 'high'),
};

/** Nothing of the table of heights along the bed is known well enough to judge by. */
export const levelAlong: ToleranceRule | null = null;
export const levelAcross: ToleranceRule = {
  by: 'all',
  unit: 'µm/m',
  allUm: '40',
  provenance: rememberedAndPrinted('0.04/1000'),
};

const tailstockLocal = {
  toleranceUm: '20',
  lengthMm: '500',
  provenance: printed('.02 over 500'),
};
export const tailstockMotion: ToleranceRule = {
  ...fixed('30', remembered('.03 as remembered for ISO 1708, up to which length is not', 'high')),
  local: tailstockLocal,
};
export const quillMotionZx = over('15', '100', rememberedAndPrinted('.015 over 100'));
export const quillMotionYz = over('20', '100', rememberedAndPrinted('.020 over 100'));
export const quillTaper = over('30', '300', rememberedAndPrinted('.030 over 300'));
export const centresYz = fixed('40', rememberedAndPrinted('.040, tailstock higher only'));

export const leadscrewSlip = fixed('15', remembered('.015 as remembered for ISO 1708', 'high'));
export const leadscrewLead = fixed('40', remembered('.04 over any 300 as remembered for ISO 1708', 'high'));
