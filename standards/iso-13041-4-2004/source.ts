import type { Provenance } from '../types';

export const code = 'ISO 13041-4';
export const edition = '2004';
export const subject =
  'Test conditions for numerically controlled turning machines: accuracy and repeatability of positioning of linear and rotary axes';

export const source: Provenance = {
  kind: 'from-memory',
  text: 'method and figures of ISO 230-2:2014 (formulas from memory, high confidence; runs over 2000 mm or 360°: published, ISO 230-2 6.2); procedure in our own words after common practice',
  confidence: 'medium',
};

/** Figures believed equal to those of ISO 10791-4:1998; that they are equal is remembered with low confidence. */
export const remembered = (text: string): Provenance => ({
  kind: 'from-memory',
  text: `starter value: ${text} (ISO 10791-4:1998 as remembered; that ISO 13041-4 has the same is of low confidence)`,
  confidence: 'low',
});
