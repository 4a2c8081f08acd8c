import type { Provenance } from '../types';

export const code = 'function checks';
export const edition = '';
export const subject =
  'Function checks of service practice: switches, clamping, indexing, interlocks, supplies, backup, dry run';

export const source: Provenance = {
  kind: 'common-practice',
  text: 'what service engineers look at before and after their work; maker’s instructions and local rules govern, no single source',
};
