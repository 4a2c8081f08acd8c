import type { ToleranceRule } from '../types';
import { remembered } from './source';

/**
 * Tolerances of the geometric tests, µm. No public text could be read that contains the tables of the code: all of these are
 * remembered starter values, to be confirmed against one's own copy or replaced by the contract's.
 * Floor of 5 µm for tolerances recalculated for another length: remembered, medium confidence.
 */
export const minimumUm = '5';

/** Run-out is never scaled with a length. */
export const noseRunOut: ToleranceRule = {
  by: 'size-class',
  byClassUm: ['5', '8', '12'],
  provenance: remembered('.005 / .008 / .012 by size class', 'medium'),
};

export const axialSlip: ToleranceRule = {
  by: 'all',
  allUm: '5',
  provenance: remembered('.005 for all sizes', 'low'),
};

export const faceRunOut: ToleranceRule = {
  by: 'size-class',
  byClassUm: ['8', '10', '15'],
  provenance: remembered('.008 / .010 / .015 by size class', 'medium'),
};

export const boreRunOutAtNose: ToleranceRule = {
  by: 'size-class',
  byClassUm: ['8', '10', '15'],
  provenance: remembered('.008 to .015 by size class; the middle class set to .010 between them', 'low'),
};

export const boreRunOutAt300: ToleranceRule = {
  by: 'size-class',
  byClassUm: ['15', '20', '25'],
  provenance: remembered('.015 to .025 at 300 mm by size class; a shorter mandrel needs a value of its own', 'low'),
};

export const zParallelInZx: ToleranceRule = {
  by: 'all',
  allUm: '15',
  perLength: { baseLengthMm: '300', minimumUm },
  provenance: remembered('.015 over 300', 'low'),
};

export const zParallelInYz: ToleranceRule = {
  by: 'all',
  allUm: '20',
  perLength: { baseLengthMm: '300', minimumUm },
  provenance: remembered('.020 over 300', 'low'),
};

export const xSquareToSpindle: ToleranceRule = {
  by: 'all',
  allUm: '20',
  perLength: { baseLengthMm: '300', minimumUm },
  provenance: remembered('.020 over 300', 'medium'),
};

export const ySquareToX: ToleranceRule = {
  by: 'all',
  allUm: '20',
  perLength: { baseLengthMm: '300', minimumUm },
  provenance: remembered('.020 over 300', 'medium'),
};

export const ySquareToSpindle: ToleranceRule = {
  by: 'all',
  allUm: '20',
  perLength: { baseLengthMm: '300', minimumUm },
  provenance: remembered('.020 over 300', 'medium'),
};

/** Steps by travel; beyond the last step nothing is remembered: the sheet is then for information unless the contract says. */
export const straightness: ToleranceRule = {
  by: 'travel',
  steps: [
    { overMm: '0', upToMm: '500', toleranceUm: '10' },
    { overMm: '500', upToMm: '1000', toleranceUm: '15' },
  ],
  local: { toleranceUm: '6', lengthMm: '300', provenance: remembered('.006 over any 300', 'low') },
  provenance: remembered('.010 up to 500; .015 to .020 up to 1000, lower end taken', 'low'),
};

/**
 * As straightness, for methods that read foot by foot or with the straightedge turned over: these give no local figure, so the
 * local limit is left to the straightedge test.
 */
export const straightnessWhole: ToleranceRule = {
  by: straightness.by,
  steps: straightness.steps,
  provenance: remembered(
    '.010 up to 500; .015 to .020 up to 1000, lower end taken; the local .006 over any 300 is not evaluated by this method',
    'low',
  ),
};

/** Pitch, yaw and roll, largest less smallest over the travel; figures in µm/m. */
export const zAngular: ToleranceRule = {
  by: 'travel',
  unit: 'µm/m',
  steps: [
    { overMm: '0', upToMm: '500', toleranceUm: '40' },
    { overMm: '500', upToMm: '1000', toleranceUm: '60' },
    { overMm: '1000', upToMm: '2000', toleranceUm: '80' },
  ],
  provenance: remembered('.040/1000 (8″) up to 500, .060/1000 (12″) up to 1000, .080/1000 (16″) up to 2000', 'medium'),
};

export const xAngular: ToleranceRule = {
  by: 'all',
  unit: 'µm/m',
  allUm: '60',
  provenance: remembered('.060/1000 for X', 'low'),
};

export const yAngular: ToleranceRule = {
  by: 'all',
  unit: 'µm/m',
  allUm: '60',
  provenance: remembered('.060/1000 for Y', 'low'),
};

/** The offset of the axes, not the total reading, which is twice as large. */
export const coaxiality: ToleranceRule = {
  by: 'size-class',
  byClassUm: ['10', '15', '20'],
  basis: 'offset',
  provenance: remembered('.010 / .015 / .020 by size class, offset of the axes at 100 mm', 'low'),
};

export const toolHoleHeight: ToleranceRule = {
  by: 'all',
  allUm: '30',
  provenance: remembered('.030 to .040, lower end taken', 'low'),
};
