import type { CautionId, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { code, edition, source } from './source';

const cautions: CautionId[] = [
  'isolate-before-touching',
  'turn-spindle-by-hand',
  'reduced-speed-enabling-device',
  'other-channels-at-rest',
  'turret-and-sub-spindle-pinch',
  'maker-and-local-rules-first',
];

const common = {
  code,
  edition,
  version: 1,
  source,
  method: 'reference-shift',
  tolerance: null,
  direction: 'either' as const,
  resolution: { valueUm: '0.5', rule: 'half-even' as const },
  instruments: ['indicator', 'indicator stand', 'test mandrel'],
  cautions,
  sketch: { scene: 'target-and-found' as const },
  workingStep: workingSteps['reference-points'],
  judgedFigure: 'amount of the shift at the slide',
  minutes: 20,
};

const backup =
  'Back the parameters up first, and note the value that stands there now. Whoever changes a parameter must be allowed to, and locks it again afterwards.';
const trial =
  'After a change: a small trial first, because the sign and the factor differ between controls. Then reference again and measure again.';
const recheck =
  'A new reference moves soft limits, change and transfer positions and tool offsets: check them before the machine runs.';

const mistakes = [
  'Entering the whole amount at once with a sign that was guessed.',
  'Mixing radius and diameter: an indicator sees the way of the slide, the display may show the diameter.',
  'Correcting the reference while lost motion is still to be set: it moves the place by half of it.',
];

export const crossReference: TestDefinition = {
  ...common,
  id: 'TU-3x',
  title: 'Reference of the cross axis against a mandrel in the spindle',
  boundTitle: 'Reference of {axis} against a mandrel in {spindle}',
  procedure: [
    backup,
    'Measure the mandrel in the spindle with a micrometer: its diameter is where the tool should be, on diameter.',
    'Bring a tool of known length, or the indicator at the place of its edge, to the mandrel, always from the same side, and read the position that the control shows.',
    'Turn the spindle by half a turn by hand and read again: the mean takes the mandrel’s run-out out.',
    'Write where it should be and where it was found, and whether both are diameters. What the slide lacks in + is the shift.',
    trial,
    recheck,
  ],
  appliesTo: { kind: 'turret-axis-and-spindle', role: 'cross' },
  layout: { kind: 'target-and-found', basis: null },
  dependsOn: { components: ['turret', 'spindle'], moved: [], positioned: ['axis'] },
  usualMistakes: mistakes,
  setUpTogether: 'test mandrel in {spindle}',
};

export const longitudinalReference: TestDefinition = {
  ...common,
  id: 'RP-Z',
  title: 'Reference of the longitudinal axis against the spindle nose',
  boundTitle: 'Reference of {axis} against the nose of {spindle}',
  procedure: [
    backup,
    'Hold a gauge block of known length against the clean nose face of the spindle.',
    'Bring the tool’s edge, or the indicator at its place, to the block in small steps, always from the same side, and read the position that the control shows.',
    'Write where it should be, from the drawing of the working space, and where it was found. What the slide lacks in + is the shift.',
    trial,
    recheck,
  ],
  appliesTo: { kind: 'turret-axis-and-spindle', role: 'longitudinal' },
  layout: { kind: 'target-and-found', basis: 'radius' },
  instruments: ['indicator', 'gauge block'],
  dependsOn: { components: ['turret', 'spindle'], moved: [], positioned: ['axis'] },
  usualMistakes: [
    ...mistakes.slice(0, 1),
    'Measuring against a nose face that was not cleaned, or against the chuck.',
    mistakes[2]!,
  ],
  setUpTogether: 'gauge block at the nose of {spindle}',
};

export const verticalReference: TestDefinition = {
  ...common,
  id: 'RP-Y',
  title: 'Reference of the Y axis against the spindle axis',
  boundTitle: 'Reference of {axis} against the axis of {spindle}',
  procedure: [
    backup,
    'Sweep the tool hole with an indicator on the spindle, or compare the heights of two mandrels, as for the height of a tool hole.',
    'Write where Y should be for a tool on centre, and where it was found. What the slide lacks in + is the shift.',
    trial,
    recheck,
  ],
  appliesTo: { kind: 'turret-axis-and-spindle', role: 'vertical' },
  layout: { kind: 'target-and-found', basis: 'radius' },
  dependsOn: { components: ['turret', 'spindle'], moved: [], positioned: ['axis'] },
  usualMistakes: mistakes
    .slice(0, 1)
    .concat(
      'Setting Y so that one hole is on centre when the holes differ: look at several stations first.',
      'Forgetting the sag of the bracket, which reads as height.',
    ),
  setUpTogether: 'indicator in {spindle} at {turret}',
};

export const transferPosition: TestDefinition = {
  ...common,
  id: 'RP-S',
  title: 'Transfer position of the sub-spindle',
  boundTitle: 'Transfer position of {spindle} at {reference}',
  procedure: [
    backup,
    'Bring the sub-spindle to its transfer position in small steps with both spindles at rest and nothing clamped.',
    'Measure the distance of both nose faces with gauge blocks or an inside micrometer.',
    'Write where it should be, from the drawing, and where it was found.',
    trial,
    'Check the transfer at rest first, then slowly with both spindles turning in step, doors closed.',
  ],
  appliesTo: { kind: 'main-and-sub-spindle' },
  layout: { kind: 'target-and-found', basis: 'radius' },
  instruments: ['gauge block', 'inside micrometer'],
  dependsOn: { components: ['reference', 'spindle'], moved: [], positioned: ['spindle-axis'] },
  usualMistakes: [
    'Closing both chucks on a piece before the position is known: one spindle then pushes the other.',
    'Leaving the old position in a second parameter or in the part program.',
  ],
  setUpTogether: 'main and sub-spindle at their transfer position',
};
