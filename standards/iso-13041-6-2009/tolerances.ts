import type { Provenance, ToleranceRule } from '../types';

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

/** Figures of the finished test piece: a list remembered with medium, figures with low confidence. */
const remembered = (text: string): Provenance => ({
  kind: 'from-memory',
  text: `starter value: ${text}`,
  confidence: 'low',
});

export const roundness: ToleranceRule = {
  by: 'size-class',
  byClassUm: ['3', '5', '7'],
  provenance: remembered('.003 / .005 / .007 by size class'),
};

export const diameters: ToleranceRule = {
  by: 'size-class',
  byClassUm: ['20', '25', '30'],
  perLength: { baseLengthMm: '300', minimumUm: '5' },
  provenance: remembered('.020 / .025 / .030 per 300 by size class'),
};

export const facedFlatness: ToleranceRule = {
  by: 'all',
  allUm: '25',
  perLength: { baseLengthMm: '300', minimumUm: '5' },
  provenance: remembered('.025 on 300, scaled'),
};

/** A distance of planes is not worked out for another size: the figure is that of a disc of 300 mm. */
export const faceOverGrid: ToleranceRule = {
  by: 'all',
  allUm: '25',
  provenance: remembered('.025 on 300; a smaller disc needs a figure of its own'),
};

export const threadLead: ToleranceRule = {
  by: 'all',
  allUm: '25',
  provenance: remembered('.025 over 50'),
};

export const contour: ToleranceRule = {
  by: 'size-class',
  byClassUm: ['20', '28', '35'],
  provenance: remembered('.020 to .035; by size class, the middle one set between them'),
};

export const transferPart: ToleranceRule = {
  by: 'all',
  allUm: '10',
  provenance: { kind: 'common-practice', text: 'run-out between the diameters .010 to .015; the smaller taken' },
};
