import type { Provenance } from '../types';

export const code = 'ISO 13041-6';
export const edition = '2009';
export const subject = 'Test conditions for numerically controlled turning machines: accuracy of a finished test piece';

export const source: Provenance = {
  kind: 'common-practice',
  text: 'two-collar cutting test as the trade makes it; that it belongs with the test pieces of ISO 13041-6 is from memory',
};
