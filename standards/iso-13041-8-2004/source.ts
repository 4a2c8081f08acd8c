import type { Provenance } from '../types';

export const code = 'ISO 13041-8';
export const edition = '2004';
export const subject =
  'Test conditions for numerically controlled turning machines: thermal distortions, with ISO 230-3 for the method';

export const source: Provenance = {
  kind: 'from-memory',
  text: 'kinds of test of ISO 230-3:2020 and what the drift test is for: published introductions; year, durations and results from memory, medium confidence; procedure in our own words',
  confidence: 'medium',
};
