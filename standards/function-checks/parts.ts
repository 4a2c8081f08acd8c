import type { CautionId } from '../types';
import { code, edition, source } from './source';

/** What every function check shares; its layout is a list of items, yes is what should be. */
export const check = {
  code,
  edition,
  version: 1,
  source,
  method: 'function-check',
  tolerance: null,
  direction: 'either' as const,
  shownIn: 'items' as const,
  resolution: { valueUm: '1', rule: 'half-even' as const },
  instruments: [],
  sketch: { scene: 'checklist' as const },
  judgedFigure: 'items not in order',
};

export const atRest: CautionId[] = ['isolate-before-touching', 'stored-energy', 'maker-and-local-rules-first'];

export const moving: CautionId[] = [
  'reduced-speed-enabling-device',
  'other-channels-at-rest',
  'turret-and-sub-spindle-pinch',
  'maker-and-local-rules-first',
];

export const guarded: CautionId[] = [
  'guards-back-before-cutting',
  'other-channels-at-rest',
  'stored-energy',
  'maker-and-local-rules-first',
];

export const answerSteps = [
  'Answer each item as it was found: yes where it is in order, no where it is not, not fitted where the machine has none.',
  'Write a remark at every no, and add a photo where it shows more than words.',
];
