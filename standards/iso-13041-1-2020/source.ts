import type { Provenance } from '../types';

export const code = 'ISO 13041-1';
export const edition = '2020';
export const subject =
  'Test conditions for numerically controlled turning machines: geometric tests, horizontal workholding spindle';

/** What is known of the code itself, and how. */
export const source: Provenance = {
  kind: 'from-memory',
  text: 'test list of ISO 13041-1 as remembered (numbering of the 2020 edition not known); procedure in our own words after common practice',
  confidence: 'low',
};

/** A tolerance remembered, never checked against the text. */
export function remembered(text: string, confidence: 'low' | 'medium'): Provenance {
  return { kind: 'from-memory', text: `starter value: ${text}`, confidence };
}
