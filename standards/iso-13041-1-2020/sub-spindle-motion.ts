import type { Plane, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { base, halfMicrometre, movingSlide } from './parts';
import { zParallelInYz, zParallelInZx } from './tolerances';

function subSpindleParallel(plane: Extract<Plane, 'ZX' | 'YZ'>): TestDefinition {
  const zx = plane === 'ZX';
  return {
    ...base,
    id: zx ? 'SS-2a' : 'SS-2b',
    title: `Sub-spindle axis parallel to its own motion, in ${plane}`,
    boundTitle: `Axis of {spindle} parallel to the {axis} motion, in ${plane}`,
    procedure: [
      'Put the clean mandrel into the sub-spindle and mark 0°. Positions count from its nose along the mandrel to the free end.',
      zx
        ? 'Fix the indicator to a part that stands still while the sub-spindle moves, on the tool side of the mandrel (+X), plunger in the ZX plane pointing to the mandrel and square to it.'
        : 'Fix the indicator to a part that stands still while the sub-spindle moves, on top of the mandrel (+Y side), plunger pointing to the mandrel in the YZ plane.',
      `At the first position set the indicator near zero. Pushing the plunger in counts positive: a rising reading means that the free end ${zx ? 'leans toward +X' : 'rises'}.`,
      'Move the sub-spindle along its own axis only, always approaching from the same side, and read at every position.',
      'Come back to the first position: the reading must return within a tenth of the tolerance.',
      'Turn the sub-spindle by 180° by hand and read the same positions again. The mean of both drops run-out and tilt of the mandrel.',
      zx
        ? 'The result is the least-squares slope of the means times the measuring length.'
        : 'Write the sag of the mandrel at each position; it is added to the means. The result is the least-squares slope of the means times the measuring length.',
    ],
    appliesTo: { kind: 'sub-spindle-and-its-axis', plane },
    method: 'parallelism',
    layout: {
      kind: 'angles-by-position',
      anglesDeg: ['0', '180'],
      positionsMm: ['20', '80', '140', '200', '260'],
      positionName: 'along the mandrel',
      sag: !zx,
    },
    tolerance: zx ? zParallelInZx : zParallelInYz,
    direction: 'either',
    resolution: halfMicrometre,
    instruments: ['indicator', 'indicator stand', 'test mandrel'],
    cautions: [...movingSlide, 'turn-spindle-by-hand', 'turret-and-sub-spindle-pinch'],
    sketch: {
      scene: 'mandrel-along-motion',
      anglesDeg: ['0', '180'],
      plane,
      positiveMeans: zx ? '+ free end leans toward +X' : '+ free end rises',
    },
    dependsOn: { components: ['spindle'], moved: ['axis'], positioned: [] },
    workingStep: workingSteps['sub-spindle-run-out'],
    judgedFigure: `least-squares slope over the measuring length${zx ? '' : ', mandrel sag added'}`,
    positiveMeans: zx ? 'free end leans toward +X' : 'free end rises',
    negativeMeans: zx ? 'free end leans toward −X' : 'free end falls',
    usualMistakes: [
      'Counting the positions from the free end, so that the sign comes out the other way round.',
      'Standing the indicator on a turret that moves with the sub-spindle or is superimposed on it.',
      'Correcting the offset to the main spindle before this angle is right.',
    ],
    setUpTogether: 'test mandrel in {spindle}',
    minutes: 20,
  };
}

export const subSpindleParallelZx = subSpindleParallel('ZX');
export const subSpindleParallelYz = subSpindleParallel('YZ');
