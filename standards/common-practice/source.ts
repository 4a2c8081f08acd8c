import type { Provenance } from '../types';

export const code = 'common practice';
/** What the trade does without a published code has no edition. */
export const edition = '';
export const subject = 'Tests that the trade makes without a published code';

export const source: Provenance = {
  kind: 'common-practice',
  text: 'common practice in the trade, no single source; the formal kin is the reversal error of ISO 230-2',
};
