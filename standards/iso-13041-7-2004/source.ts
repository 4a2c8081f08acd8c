import type { Provenance } from '../types';

export const code = 'ISO 13041-7';
export const edition = '2004';
export const subject =
  'Test conditions for numerically controlled turning machines: contouring performance in the coordinate planes';

export const source: Provenance = {
  kind: 'from-memory',
  text: 'one place in each coordinate plane, one feed, both directions (published: scope of ISO 13041-7); quantities of ISO 230-4 from memory; procedure in our own words after common practice',
  confidence: 'medium',
};
