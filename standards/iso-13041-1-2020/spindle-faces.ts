import type { TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { base, closedTurn, halfMicrometre, handTurned } from './parts';
import { axialSlip, faceRunOut } from './tolerances';

type Which = { spindle: 'main' | 'sub'; id: string };

/** Main and sub-spindle are measured alike. */
function common({ spindle, id }: Which) {
  return {
    ...base,
    id,
    appliesTo: { kind: 'spindle' as const, types: [spindle] },
    method: 'axial-run-out',
    direction: 'either' as const,
    resolution: halfMicrometre,
    cautions: handTurned,
    dependsOn: { components: ['spindle' as const], moved: [], positioned: [] },
    workingStep: workingSteps[spindle === 'main' ? 'spindle-run-out' : 'sub-spindle-run-out'],
    setUpTogether: 'bare nose of {spindle}',
  };
}

const named = (spindle: Which['spindle']) => (spindle === 'main' ? 'Spindle' : 'Sub-spindle');

export function axialSlipOf(which: Which): TestDefinition {
  return {
    ...common(which),
    title: `${named(which.spindle)}: periodic axial slip`,
    boundTitle: 'Periodic axial slip of {spindle}',
    procedure: [
      'Put a short plug with a ground centre into the bore and a clean ball into the centre with a little grease, so that the ball lies on the axis of the spindle.',
      'Where the maker prescribes an axial preload, apply it in the stated direction and leave it on: without it the bearings may only take up their play.',
      'Fix the indicator to the turret, post or bed, flat contact point against the ball, plunger along the spindle axis. Pushing the plunger in counts positive.',
      'Mark 0° on the spindle and set the indicator near zero there; only differences count.',
      'Turn the spindle slowly by hand, always the same way, and read every 45°. A steady rise over several turns is warming or a moving stand, not slip.',
      'Read once more back at 0°: the closing reading must agree with the first within a tenth of the tolerance.',
      'The result is the largest less the smallest reading of the turn.',
    ],
    layout: { kind: 'circles', names: ['ball on the axis'], anglesDeg: closedTurn },
    tolerance: axialSlip,
    instruments: ['indicator', 'indicator stand', 'centre plug with ball'],
    sketch: { scene: 'axial-slip', anglesDeg: ['0', '90', '180', '270'] },
    judgedFigure: 'largest less smallest reading of the turn, on the axis',
    usualMistakes: [
      'A ball that does not lie on the axis: the reading then contains the run-out of its seat.',
      'A pointed contact on the ball, which slides off its highest place; use a flat one.',
      'Pushing or pulling the spindle while turning it, so that the play of the bearings is read.',
    ],
    minutes: 15,
  };
}

export function faceRunOutOf(which: Which): TestDefinition {
  return {
    ...common(which),
    title: `${named(which.spindle)}: run-out of the nose face`,
    boundTitle: 'Nose face of {spindle}: run-out, axial slip included',
    procedure: [
      'Take the chuck off. Wipe the face of the nose clean and stone off burrs. Where the maker prescribes an axial preload, apply it.',
      'Fix the indicator to the turret, post or bed, plunger along the spindle axis, as near to the edge of the face as the holes allow. Pushing the plunger in counts positive.',
      'Mark 0° on the spindle, set the indicator near zero there, turn slowly by hand, always the same way, and read every 45°. Pass the holes with the plunger lifted.',
      'Back at 0° the closing reading must agree with the first within a tenth of the tolerance.',
      'Set the indicator up at the opposite side of the face, half a turn away from the first place, and take a second turn in the same way.',
      'The result is the larger of both total readings. It contains the axial slip; a large figure with little slip points to the face itself.',
    ],
    layout: { kind: 'circles', names: ['first place', 'opposite place'], anglesDeg: closedTurn },
    tolerance: faceRunOut,
    instruments: ['indicator', 'indicator stand'],
    sketch: { scene: 'face-run-out', anglesDeg: ['0', '90', '180', '270'] },
    judgedFigure: 'largest total reading of the two places, axial slip included',
    usualMistakes: [
      'Reading close to the bore: the same tilt of the face shows less there than at the edge.',
      'Letting the plunger drop into a bolt hole, which moves the stand.',
      'Turning the spindle to and fro, so that the play of the bearings is read as run-out.',
    ],
    minutes: 15,
  };
}
