import type { CautionId } from './types';

/**
 * Short cautions, in our own words, shown before the first reading of a sheet. General: the machine maker's instructions and
 * local rules govern. None of them ever tells how to get round a guard.
 */
export const cautions: Record<CautionId, string> = {
  'isolate-before-touching':
    'Isolate and lock out before you reach in to mount, tighten or adjust anything, and prove that nothing can move.',
  'turn-spindle-by-hand':
    'Turn the spindle by hand. No gloves, no loose cloth near the mandrel; take the key or bar out before anything turns.',
  'reduced-speed-enabling-device':
    'Where the machine itself must move: set-up mode only, reduced speed, enabling device in hand, nobody else inside.',
  'other-channels-at-rest':
    'Keep every other channel stopped and superimposed axes off; another path must not start while you read.',
  'support-heavy-parts':
    'Long bars, squares and straightedges are heavy: support them until they are held, and lift the heavy ones with two people or a hoist.',
  'guards-back-before-cutting': 'All guards back in place, doors closed and interlocks proved before the machine cuts.',
  'stored-energy':
    'Pressure, springs, raised slides and charged drives hold energy after switching off: release or prop it, and wait the time the maker states.',
  'turret-and-sub-spindle-pinch':
    'Turret indexing and sub-spindle travel leave pinch points: keep hands out until both stand still and are held.',
  'maker-and-local-rules-first':
    "The machine maker's instructions, local rules and the licensed or authorised persons on site come first.",
};

export function cautionText(id: CautionId): string {
  return cautions[id];
}
