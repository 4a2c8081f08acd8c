import type { TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { base, movingSlide } from './parts';
import { straightnessWhole } from './tolerances';

/** Ways to measure AX-5 without a straightedge that is known to be straight. */
const common = {
  ...base,
  insteadOf: 'AX-5',
  appliesTo: { kind: 'longitudinal-axis' as const, planes: ['ZX' as const, 'YZ' as const] },
  tolerance: straightnessWhole,
  direction: 'either' as const,
  resolution: { valueUm: '0.1', rule: 'half-even' as const },
  cautions: movingSlide,
  dependsOn: { components: ['bed' as const], moved: ['axis' as const], positioned: [] },
  workingStep: workingSteps.straightness,
};

export const zStraightnessBySteps: TestDefinition = {
  ...common,
  id: 'AX-5s',
  title: 'Straightness of Z motion, by level or autocollimator foot by foot',
  boundTitle: 'Straightness of the {axis} motion foot by foot, in {plane}',
  procedure: [
    'Choose the instrument by the plane: a level sees only tilt against the vertical, so it serves the plane that stands upright; an autocollimator with its mirror on the carriage serves both. A level cannot see rotation about the vertical, an autocollimator cannot see roll about its line of sight.',
    'Put the instrument or mirror on a foot of known length, or on the carriage, and make the step equal to the length of the foot: each foot must land where the one before it ended.',
    'Fix the sign: an angle counts positive when the foot ahead, in the plus direction of the axis, is the higher one.',
    'Take the first step as zero or note the instrument as it stands; a constant tilt drops out with the reference line.',
    'Go out step by step, always from the same side, wait until the level stands still, and read each step. Then go back over the same steps and read each of them again; they are written beside the readings on the way out.',
    'Back at the first step the reading must return within a tenth of what the tolerance comes to over one step. If the two runs do not close, repeat.',
    'The angles are added up to heights, and the result is the width about the minimum-zone line.',
  ],
  method: 'straightness-from-angles',
  layout: { kind: 'angle-steps', stepLengthMm: '100', steps: 6, returnRun: true, reference: 'minimum-zone' },
  instruments: ['precision level', 'autocollimator', 'foot of known length'],
  sketch: { scene: 'level-steps', positiveMeans: '+ next foot higher' },
  judgedFigure: 'width about the minimum-zone line of the heights added up',
  usualMistakes: [
    'Steps that are longer or shorter than the foot, so that the heights do not follow one another.',
    'Reading a level before its bubble has come to rest, or after breathing on it.',
    'Letting the whole machine rock on its feet as the carriage moves; a second level on the bed shows it.',
  ],
  setUpTogether: 'level or autocollimator along {axis}',
  minutes: 40,
};

export const zStraightnessTurnedOver: TestDefinition = {
  ...common,
  id: 'AX-5r',
  title: 'Straightness of Z motion, straightedge turned over',
  boundTitle: 'Straightness of the {axis} motion with the straightedge turned over, in {plane}',
  procedure: [
    'Set the straightedge up along Z at its stated supports and mark the positions on it. Let it come to the temperature of the machine.',
    'Fix the indicator to the moving part, plunger square to the working face. Pushing the plunger in counts positive, in both runs.',
    'First run: set the indicator to zero at the first position, move along the travel, always from the same side, and read at every position.',
    'Come back to the first position: the reading must return within a tenth of the tolerance.',
    'Turn the straightedge by 180° about its length, so that the same face looks the other way, set the indicator up on its other side and read the same positions in a second run.',
    'Half the difference of the runs is the motion, half their sum the straightedge. The result is the width of the motion about the minimum-zone line.',
    'In the upright plane the straightedge sags both times to the same side, and the sag does not drop out: add it by calculation or use the test for the plane that lies flat.',
  ],
  method: 'straightness-reversal',
  layout: {
    kind: 'two-runs',
    positionsMm: ['0', '50', '100', '150', '200', '250', '300', '350', '400', '450', '500'],
    reference: 'minimum-zone',
  },
  instruments: ['indicator', 'indicator stand', 'straightedge'],
  sketch: { scene: 'straightedge-turned-over', positiveMeans: '+ away from the edge in the first run' },
  judgedFigure: 'width of the motion about the minimum-zone line, the straightedge taken out',
  usualMistakes: [
    'Turning the straightedge end for end instead of about its length, so that positions no longer match.',
    'Changing the sign in the second run because the plunger points the other way: pushing in stays positive.',
    'Reading at positions that are not the same places of the straightedge.',
  ],
  setUpTogether: 'straightedge along {axis}',
  minutes: 60,
};
