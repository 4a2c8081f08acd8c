import type { CautionId } from '../types';
import { code, edition, source } from './source';

/**
 * What all geometric tests of this code share. Engine lathes have a code of their own (ISO 1708), so that such a machine gets each
 * test once.
 */
export const base = { code, edition, version: 1, source, machineKinds: { not: ['engine-lathe'] } };

export const halfMicrometre = { valueUm: '0.5', rule: 'half-even' as const };
export const wholeMicrometre = { valueUm: '1', rule: 'half-even' as const };

/** Eight places of a turn, and the closing reading back at the first. */
export const eighths = ['0', '45', '90', '135', '180', '225', '270', '315'];
export const closedTurn = [...eighths, '360'];

export const movingSlide: CautionId[] = [
  'isolate-before-touching',
  'reduced-speed-enabling-device',
  'other-channels-at-rest',
  'support-heavy-parts',
  'maker-and-local-rules-first',
];

export const handTurned: CautionId[] = [
  'isolate-before-touching',
  'turn-spindle-by-hand',
  'other-channels-at-rest',
  'maker-and-local-rules-first',
];

export const indexedTurret: CautionId[] = [
  'isolate-before-touching',
  'turret-and-sub-spindle-pinch',
  'reduced-speed-enabling-device',
  'other-channels-at-rest',
  'stored-energy',
  'maker-and-local-rules-first',
];

export const sagNote =
  'Write the sag of the bracket: zero it on top of a stiff bar, turn it to the bottom; the sag is half of what it then shows, without its minus.';

export const returns = 'the reading must return within a tenth of the tolerance';
