import type { Provenance } from '../types';

export const code = 'ISO 13041-1';
export const edition = '2004';
export const subject =
  'Test conditions for numerically controlled turning machines: geometric tests, horizontal workholding spindle';

/** What is known of this edition, and what is not. */
export const source: Provenance = {
  kind: 'from-memory',
  text: 'test list of ISO 13041-1 as remembered; in what the 2004 edition differs from that of 2020, besides its numbering, is not known: the tolerances are remembered without knowing from which edition; procedure in our own words after common practice',
  confidence: 'low',
};

export const numberSource: Provenance = {
  kind: 'from-memory',
  text: 'number in the 2004 edition as remembered; the 2020 edition is numbered anew',
  confidence: 'low',
};
