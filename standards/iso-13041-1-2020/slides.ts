import type { CautionId, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { code, edition, source } from './source';
import { straightness, xSquareToSpindle, ySquareToX, zParallelInYz, zParallelInZx } from './tolerances';

const movingSlide: CautionId[] = [
  'isolate-before-touching',
  'reduced-speed-enabling-device',
  'other-channels-at-rest',
  'support-heavy-parts',
  'maker-and-local-rules-first',
];
const base = { code, edition, version: 1, source };
const halfMicrometre = { valueUm: '0.5', rule: 'half-even' as const };

const alongMandrel = {
  method: 'parallelism',
  resolution: halfMicrometre,
  direction: 'either' as const,
  dependsOn: { components: ['spindle' as const], moved: ['axis' as const], positioned: [] },
  workingStep: workingSteps['z-parallel-to-spindle'],
  instruments: ['indicator', 'indicator stand', 'test mandrel'],
  cautions: [...movingSlide, 'turn-spindle-by-hand' as const],
};
const mandrelPositions = ['30', '90', '150', '210', '270'];

export const zParallelZx: TestDefinition = {
  ...base,
  ...alongMandrel,
  id: 'AX-1a',
  title: 'Z motion parallel to the spindle axis, in ZX',
  boundTitle: '{axis} motion parallel to the axis of {spindle}, in ZX',
  procedure: [
    'Put the clean mandrel into the spindle and mark 0°. Positions count from the spindle nose along the mandrel.',
    'Fix the indicator to what carries the tool, plunger in the ZX plane on the tool side, pointing to the mandrel and square to it. With a moving headstock the indicator stands on the tool slide and the mandrel moves past it.',
    'At the first position set the indicator near zero. Pushing the plunger in counts positive: a rising reading means that the free end leans toward the tool.',
    'Move in Z only, always approaching from the same side, and read at every position.',
    'Come back to the first position: the reading must return within a tenth of the tolerance.',
    'Turn the spindle by 180° by hand and read the same positions again. The mean of both drops run-out and tilt of the mandrel.',
    'The result is the least-squares slope of the means times the measuring length.',
  ],
  appliesTo: { kind: 'longitudinal-axis-and-spindle', plane: 'ZX' },
  layout: {
    kind: 'angles-by-position',
    anglesDeg: ['0', '180'],
    positionsMm: mandrelPositions,
    positionName: 'z',
    sag: false,
  },
  tolerance: zParallelInZx,
  sketch: {
    scene: 'mandrel-along-motion',
    anglesDeg: ['0', '180'],
    plane: 'ZX',
    positiveMeans: '+ free end leans toward the tool',
  },
  judgedFigure: 'least-squares slope over the measuring length',
  positiveMeans: 'free end leans toward the tool',
  negativeMeans: 'free end leans away from the tool',
};

export const zParallelYz: TestDefinition = {
  ...base,
  ...alongMandrel,
  id: 'AX-1b',
  title: 'Z motion parallel to the spindle axis, in YZ',
  boundTitle: '{axis} motion parallel to the axis of {spindle}, in YZ',
  procedure: [
    'Put the clean mandrel into the spindle and mark 0°. Positions count from the spindle nose along the mandrel.',
    'Fix the indicator to what carries the tool, on top of the mandrel (+Y side), plunger pointing to the mandrel in the YZ plane.',
    'At the first position set the indicator near zero. Pushing the plunger in counts positive: a rising reading means that the free end rises.',
    'Move in Z only, always approaching from the same side, and read at every position. Back at the first position the reading must return within a tenth of the tolerance.',
    'Turn the spindle by 180° by hand and read the same positions again.',
    'Write the sag of the mandrel at each position: it hangs down by its own weight and the fall is added to the means. On a slant bed only the share along the plunger counts.',
    'The result is the least-squares slope of the means, sag added, times the measuring length.',
  ],
  appliesTo: { kind: 'longitudinal-axis-and-spindle', plane: 'YZ' },
  layout: {
    kind: 'angles-by-position',
    anglesDeg: ['0', '180'],
    positionsMm: mandrelPositions,
    positionName: 'z',
    sag: true,
  },
  tolerance: zParallelInYz,
  sketch: { scene: 'mandrel-along-motion', anglesDeg: ['0', '180'], plane: 'YZ', positiveMeans: '+ free end rises' },
  judgedFigure: 'least-squares slope over the measuring length, mandrel sag added',
  positiveMeans: 'free end rises',
  negativeMeans: 'free end falls',
};

export const xSquare: TestDefinition = {
  ...base,
  id: 'AX-2',
  title: 'X motion square to the spindle axis',
  boundTitle: '{axis} motion square to the axis of {spindle}',
  procedure: [
    'Hold a flat disc or a straightedge on the spindle, face across the axis, and mark 0°. Small run-out of the face does no harm.',
    'Fix the indicator to what carries the tool, plunger toward the spindle nose (along Z) and square to the face.',
    'Positions are distances from the spindle axis along X (slide values, not diameters), all on one side or through the centre.',
    'At the innermost position set the indicator near zero. Pushing the plunger in counts positive.',
    'Move in X only, approaching from the same side, and read at every position. Back at the innermost position the reading must return within a tenth of the tolerance.',
    'Turn the spindle by 180° by hand and read the same positions again.',
    'Readings that fall going outward mean a concave face, which is allowed: the tool then cuts the middle deeper than the rim. A convex face is not allowed.',
  ],
  appliesTo: { kind: 'cross-axis-and-spindle' },
  method: 'squareness-to-axis',
  layout: {
    kind: 'angles-by-position',
    anglesDeg: ['0', '180'],
    positionsMm: ['20', '50', '80', '110'],
    positionName: 'radius',
    sag: false,
  },
  tolerance: xSquareToSpindle,
  direction: 'concave-only',
  resolution: halfMicrometre,
  instruments: ['indicator', 'indicator stand', 'face disc'],
  cautions: [...movingSlide, 'turn-spindle-by-hand'],
  sketch: { scene: 'disc-across-motion', anglesDeg: ['0', '180'], plane: 'ZX', positiveMeans: '+ concave' },
  dependsOn: { components: ['spindle'], moved: ['axis'], positioned: [] },
  workingStep: workingSteps['x-square-to-spindle'],
  judgedFigure: 'fall of the means going outward, by the least-squares slope over the measuring length',
  positiveMeans: 'concave',
  negativeMeans: 'convex',
};

export const ySquare: TestDefinition = {
  ...base,
  id: 'AX-4',
  title: 'Y motion square to X motion',
  boundTitle: '{axis} motion square to {reference} motion',
  procedure: [
    'Set a square up in the XY plane, one arm about along X. Let it come to the temperature of the machine.',
    'Plunger against the arm along X, pointing in the −Y direction: move in X and read along this reference arm.',
    'Plunger against the arm along Y, pointing in the −X direction: move in Y and read along this measured arm. Pushing the plunger in counts positive on both; a plunger set the other way round changes the sign.',
    'Check the first position of each arm again at its end: within a tenth of the tolerance.',
    'Turn the square over by 180° about the measured arm and read both arms again, at the same positions. The mean of both settings drops the error of the square.',
    'The result is the squareness over the measuring length of Y. Positive: the angle between the plus directions is more than 90°.',
  ],
  appliesTo: { kind: 'y-and-x' },
  method: 'squareness',
  layout: {
    kind: 'square-reversed',
    referencePositionsMm: ['0', '40', '80', '120'],
    measuredPositionsMm: ['0', '35', '70'],
  },
  tolerance: ySquareToX,
  direction: 'either',
  resolution: { valueUm: '1', rule: 'half-even' },
  instruments: ['indicator', 'indicator stand', 'square'],
  cautions: movingSlide,
  sketch: { scene: 'square-two-motions', plane: 'XY', positiveMeans: '+ more than 90°' },
  dependsOn: { components: [], moved: ['reference', 'axis'], positioned: [] },
  workingStep: workingSteps['y-square'],
  judgedFigure: 'squareness over the measuring length, mean of the square and the square turned over',
  positiveMeans: 'angle between the + directions more than 90°',
  negativeMeans: 'angle between the + directions less than 90°',
};

export const zStraightness: TestDefinition = {
  ...base,
  id: 'AX-5',
  title: 'Straightness of Z motion',
  boundTitle: 'Straightness of the {axis} motion, in {plane}',
  procedure: [
    'Set the straightedge up along Z, supported at its stated points, and let it come to the temperature of the machine. Its working face looks along X for the ZX plane, along Y for the YZ plane.',
    'Fix the indicator to the moving part, plunger square to the straightedge. Level the straightedge roughly so that both ends read alike; what is left drops out with the reference line.',
    'At the first position set the indicator to zero. Pushing the plunger in counts positive.',
    'Move along the whole travel, always approaching from the same side, and read at every position. A laser with straightness optics or a taut wire (not for the vertical) may stand in for the straightedge.',
    'Come back to the first position: the reading must return within a tenth of the tolerance.',
    'The result is the width about the minimum-zone line. The local limit over any 300 mm must hold too.',
  ],
  appliesTo: { kind: 'longitudinal-axis', planes: ['ZX', 'YZ'] },
  method: 'straightness',
  layout: {
    kind: 'profile',
    positionsMm: ['0', '50', '100', '150', '200', '250', '300', '350', '400', '450', '500'],
    localLengthMm: '300',
    reference: 'minimum-zone',
  },
  tolerance: straightness,
  direction: 'either',
  resolution: { valueUm: '0.1', rule: 'half-even' },
  instruments: ['indicator', 'indicator stand', 'straightedge'],
  cautions: movingSlide,
  sketch: { scene: 'straightedge-along-motion', positiveMeans: '+ plunger pushed in' },
  dependsOn: { components: ['bed'], moved: ['axis'], positioned: [] },
  workingStep: workingSteps.straightness,
  judgedFigure: 'width about the minimum-zone line; also the local width over any 300 mm',
};
