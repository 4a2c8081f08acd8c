import type { Plane, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { base, halfMicrometre, indexedTurret } from './parts';
import { toolHoleAxis, turretFace } from './tool-tolerances';

const common = {
  ...base,
  method: 'parallelism',
  direction: 'either' as const,
  resolution: halfMicrometre,
  cautions: indexedTurret,
  workingStep: workingSteps.turret,
};

export const turretFaceToX: TestDefinition = {
  ...common,
  id: 'TU-1',
  title: 'Turret face parallel to X motion',
  boundTitle: 'Face of {turret} parallel to the {axis} motion',
  procedure: [
    'Index and clamp the turret. Wipe the reference face of the disc clean and stone off burrs; where the maker names a reference face for the holders, take that one.',
    'Fix the indicator to the spindle or the bed, plunger along Z, square against the face. Pushing the plunger in counts positive.',
    'Positions are places on the face, counted in the plus direction of X. At the first one set the indicator near zero.',
    'Move the turret in X only, always approaching from the same side, and read at every position. Back at the first position the reading must return within a tenth of the tolerance.',
    'Index the turret by half a turn and read the same positions again. The mean of both drops the run-out of the disc; what is left is the place of the turret itself.',
    'The result is the least-squares slope of the means times the measuring length. A rising reading means that the face comes nearer to the headstock going in + of X.',
  ],
  appliesTo: { kind: 'turret-and-axis', role: 'cross', plane: 'ZX', types: ['turret'] },
  layout: {
    kind: 'angles-by-position',
    anglesDeg: ['0', '180'],
    positionsMm: ['0', '25', '50', '75', '100'],
    positionName: 'along the face',
    sag: false,
    turned: 'turret',
  },
  tolerance: turretFace,
  instruments: ['indicator', 'indicator stand'],
  sketch: { scene: 'turret-face', plane: 'ZX', positiveMeans: '+ nearer to the headstock in + of X' },
  dependsOn: { components: ['turret'], moved: ['axis'], positioned: [] },
  judgedFigure: 'least-squares slope over the measuring length, mean of the face and the face half a turn on',
  positiveMeans: 'face comes nearer to the headstock in + of X',
  negativeMeans: 'face goes away from the headstock in + of X',
  usualMistakes: [
    'Counting the positions along the slide instead of on the face: the place on the face goes the other way.',
    'Reading one place of the disc only, so that its run-out is taken for the place of the turret.',
    'Reading before the turret is clamped, or with the clamping pressure off.',
  ],
  setUpTogether: 'indicator on the bed at {turret}',
  minutes: 20,
};

export function toolHoleParallel(plane: Extract<Plane, 'ZX' | 'YZ'>): TestDefinition {
  const zx = plane === 'ZX';
  return {
    ...common,
    id: zx ? 'TU-2a' : 'TU-2b',
    title: `Tool hole parallel to Z motion, in ${plane}`,
    boundTitle: `Tool hole of {turret} parallel to the {axis} motion, in ${plane}`,
    procedure: [
      'Index the turret to the station that is measured and let it clamp. Put a clean mandrel into the tool hole, hold it as a tool is held, and mark 0°. Note the station.',
      zx
        ? 'Fix the indicator to the spindle or the bed, on the side of the mandrel that looks away from the spindle axis (+X), plunger in the ZX plane, square to the mandrel.'
        : 'Fix the indicator to the spindle or the bed, on top of the mandrel (+Y side), plunger pointing down to it in the YZ plane.',
      `Positions count from the mouth of the hole to the free end of the mandrel. At the first one set the indicator near zero. Pushing the plunger in counts positive: a rising reading means that the free end ${zx ? 'leans toward +X' : 'rises'}.`,
      'Move in Z only, always approaching from the same side, and read at every position. Back at the first position the reading must return within a tenth of the tolerance.',
      'Release the mandrel, turn it by 180° in the hole, hold it again and read the same positions. The mean of both drops its run-out.',
      zx
        ? 'The result is the least-squares slope of the means times the measuring length.'
        : 'Write the sag of the mandrel where it is long. The result is the least-squares slope of the means times the measuring length.',
    ],
    appliesTo: { kind: 'turret-and-axis', role: 'longitudinal', plane },
    layout: {
      kind: 'angles-by-position',
      anglesDeg: ['0', '180'],
      positionsMm: ['10', '35', '60', '85', '110'],
      positionName: 'along the mandrel',
      sag: !zx,
      turned: 'mandrel',
    },
    tolerance: toolHoleAxis,
    instruments: ['indicator', 'indicator stand', 'test mandrel'],
    sketch: {
      scene: 'mandrel-in-turret',
      anglesDeg: ['0', '180'],
      plane,
      positiveMeans: zx ? '+ free end leans toward +X' : '+ free end rises',
    },
    dependsOn: { components: ['turret'], moved: ['axis'], positioned: [] },
    judgedFigure: `least-squares slope over the measuring length${zx ? '' : ', mandrel sag added'}`,
    positiveMeans: zx ? 'free end leans toward +X' : 'free end rises',
    negativeMeans: zx ? 'free end leans toward −X' : 'free end falls',
    usualMistakes: [
      'Holding the mandrel by a screw from one side, which tips it in a hole with play.',
      'Measuring one station and believing the others to be alike.',
      'Chips behind the holder or in the hole.',
    ],
    setUpTogether: 'test mandrel in {turret}',
    minutes: 20,
  };
}
