import type { Provenance } from '../types';

export const code = 'ISO 13041-5';
export const edition = '2006';
export const subject =
  'Test conditions for numerically controlled turning machines: accuracy of feeds, speeds and interpolations';

export const source: Provenance = {
  kind: 'from-memory',
  text: 'test list K1 to K4 as remembered from the sister code for machining centres (K4 as circular test: published); procedure in our own words after common practice',
  confidence: 'low',
};

export const remembered = (text: string): Provenance => ({
  kind: 'from-memory',
  text: `starter value: ${text}`,
  confidence: 'low',
});
