import type { TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { base, halfMicrometre, movingSlide } from './parts';
import { zParallelInYz, zParallelInZx } from './tolerances';

const alongMandrel = {
  method: 'parallelism',
  resolution: halfMicrometre,
  direction: 'either' as const,
  dependsOn: { components: ['spindle' as const], moved: ['axis' as const], positioned: [] },
  workingStep: workingSteps['z-parallel-to-spindle'],
  instruments: ['indicator', 'indicator stand', 'test mandrel'],
  cautions: [...movingSlide, 'turn-spindle-by-hand' as const],
};
export const mandrelPositions = ['30', '90', '150', '210', '270'];

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
  usualMistakes: [
    'Reading only at 0°: the run-out and tilt of the mandrel then stand in the result.',
    'Standing the indicator on a part that does not carry the tool, so that another slide is measured.',
    'Leaving chips or oil in the taper, so that the mandrel sits at an angle and the two runs do not agree.',
  ],
  setUpTogether: 'test mandrel in {spindle}',
  minutes: 20,
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
  usualMistakes: [
    'Forgetting the sag of the mandrel, which makes the free end look lower than the axis.',
    'Setting the plunger beside the highest line of the mandrel, so that an error in ZX is read as well.',
    'Turning the spindle with the mandrel still touched, which shifts the indicator.',
  ],
  setUpTogether: 'test mandrel in {spindle}',
  minutes: 20,
};
