import type { SketchSpec, TestDefinition, ToleranceRule } from '../types';
import { workingSteps } from '../working-order';
import { base, closedTurn, eighths, halfMicrometre, handTurned } from './parts';
import { boreRunOutAt300, boreRunOutAtNose, noseRunOut } from './tolerances';

type Which = { spindle: 'main' | 'sub'; id: string };

/** Main and sub-spindle are measured alike; only the id, the spindle and the place in the working order differ. */
function common(which: Which) {
  return {
    ...base,
    id: which.id,
    appliesTo: { kind: 'spindle' as const, types: [which.spindle] },
    method: 'run-out',
    direction: 'either' as const,
    resolution: halfMicrometre,
    dependsOn: { components: ['spindle' as const], moved: [], positioned: [] },
    workingStep: which.spindle === 'main' ? workingSteps['spindle-run-out'] : workingSteps['sub-spindle-run-out'],
  };
}

export function noseRunOutOf(which: Which): TestDefinition {
  return {
    ...common(which),
    title: 'Spindle nose: radial run-out of the centring diameter',
    boundTitle: 'Nose of {spindle}: radial run-out of the centring diameter',
    procedure: [
      'Take the chuck off. Wipe the centring cone or diameter clean and stone off burrs. Where the maker prescribes an axial preload, apply it.',
      'Fix the indicator to the turret, post or bed, as short as possible. Set the stylus square to the surface: on a cone that is square to the cone, not to the spindle axis.',
      'Mark 0° on the spindle. Set the indicator near zero at 0°; only differences count. Pushing the plunger in counts positive.',
      'Turn the spindle slowly by hand, always the same way, and read every 45°.',
      'Read once more when the spindle is back at 0°: this closing reading should agree with the first within a tenth of the tolerance. If not, look for a loose stand or a drift and take the turn again.',
      'The result is the largest less the smallest reading of the turn.',
    ],
    layout: { kind: 'turns', insertions: 1, anglesDeg: closedTurn, insertionLabel: 'turn' },
    tolerance: noseRunOut,
    instruments: ['indicator', 'indicator stand'],
    cautions: handTurned,
    sketch: { scene: 'spindle-nose', anglesDeg: ['0', '90', '180', '270'] },
    judgedFigure: 'largest less smallest reading of the turn, taken directly on the nose',
    usualMistakes: [
      'A burr or a chip on the centring diameter, which shows as one sharp peak.',
      'On a cone, setting the stylus square to the spindle axis instead of to the cone.',
      'A long, soft stand that swings while the spindle is turned.',
    ],
    setUpTogether: 'bare nose of {spindle}',
    minutes: 12,
  };
}

function boreRunOut(
  which: Which,
  place: { words: string; sketch: SketchSpec; tolerance: ToleranceRule; at: string; minutes: number },
) {
  return {
    ...common(which),
    title: `Spindle bore: radial run-out ${place.words}`,
    boundTitle: `Bore of {spindle}: radial run-out ${place.words}`,
    procedure: [
      'Wipe the taper and the mandrel clean and run a finger round both. Put the mandrel in and draw it home; mark 0° on spindle and mandrel.',
      `Fix the indicator to the turret, post or bed and set the stylus square to the mandrel ${place.at}. Set it near zero at 0°; pushing the plunger in counts positive.`,
      'Turn the spindle slowly by hand, always the same way, and read every 45°. Back at 0° the indicator must show the first value again within a tenth of the tolerance.',
      'Draw the mandrel, turn it 90° against the spindle, put it in again and take the next turn. Four insertions: 0°, 90°, 180°, 270°. Count the angles on the spindle, not on the mandrel.',
      'The result is the mean of the four total readings. Insertions that differ by more than a quarter of the tolerance call for another cleaning.',
    ],
    layout: { kind: 'turns' as const, insertions: 4, anglesDeg: eighths, insertionLabel: 'insertion' as const },
    tolerance: place.tolerance,
    instruments: ['indicator', 'indicator stand', 'test mandrel'],
    cautions: ['support-heavy-parts' as const, ...handTurned],
    sketch: place.sketch,
    judgedFigure: 'mean of the total readings of four insertions',
    usualMistakes: [
      'Turning the mandrel in the taper without drawing it out and cleaning both again.',
      'Counting the angles on the mandrel instead of on the spindle, so that its own error does not cancel.',
      'Drawing the mandrel home differently hard each time.',
    ],
    setUpTogether: 'test mandrel in {spindle}',
    minutes: place.minutes,
  } satisfies TestDefinition;
}

export function boreRunOutAtNoseOf(which: Which): TestDefinition {
  return boreRunOut(which, {
    words: 'at the nose',
    at: 'close to the nose, or directly in the bore where the taper can be reached',
    tolerance: boreRunOutAtNose,
    minutes: 20,
    sketch: { scene: 'spindle-bore-mandrel', anglesDeg: ['0', '90', '180', '270'], atMm: '0' },
  });
}

export function boreRunOutAt300Of(which: Which): TestDefinition {
  return boreRunOut(which, {
    words: 'at 300 mm',
    at: '300 mm from the nose; run-out is never worked out for another length, so a shorter mandrel needs a tolerance of its own by contract',
    tolerance: boreRunOutAt300,
    minutes: 25,
    sketch: { scene: 'spindle-bore-mandrel', anglesDeg: ['0', '90', '180', '270'], atMm: '300' },
  });
}
