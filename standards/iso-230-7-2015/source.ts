import type { Provenance } from '../types';

export const code = 'ISO 230-7';
export const edition = '2015';
export const subject = 'Test code for machine tools: geometric accuracy of axes of rotation';

export const source: Provenance = {
  kind: 'from-memory',
  text: 'contents of ISO 230-7 published; definitions from memory, high confidence; speeds and number of turns from memory, medium confidence; procedure in our own words',
  confidence: 'medium',
};
