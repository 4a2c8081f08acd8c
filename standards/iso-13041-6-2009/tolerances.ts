import type { ToleranceRule } from '../types';

/**
 * Half the difference of the diameters over the distance is the same angle as Z against the spindle axis in ZX (AX-1a), so its
 * tolerance is taken over: 15 µm over 300 mm, floor 5 µm.
 */
export const twoCollars: ToleranceRule = {
  by: 'all',
  allUm: '15',
  perLength: { baseLengthMm: '300', minimumUm: '5' },
  provenance: {
    kind: 'derived',
    text: 'taken from AX-1a (.015 over 300, from memory), because it is the same angle',
    confidence: 'low',
  },
};
