import type { ToleranceRule } from '../types';
import { remembered } from './source';

/**
 * Tolerances of the geometric tests, µm. No public text could be read that contains the tables of the code: all of these are
 * remembered starter values, to be confirmed against one's own copy or replaced by the contract's.
 * Floor of 5 µm for tolerances recalculated for another length: remembered, medium confidence.
 */
const minimumUm = '5';

/** Run-out is never scaled with a length. */
export const noseRunOut: ToleranceRule = {
  by: 'size-class',
  byClassUm: ['5', '8', '12'],
  provenance: remembered('.005 / .008 / .012 by size class', 'medium'),
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
