import type { CautionId, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { code, edition, source } from './source';

const cautions: CautionId[] = [
  'guards-back-before-cutting',
  'other-channels-at-rest',
  'stored-energy',
  'isolate-before-touching',
  'maker-and-local-rules-first',
];

const eighths = ['0', '45', '90', '135', '180', '225', '270', '315'];

const common = {
  code,
  edition,
  version: 1,
  source,
  machineKinds: { not: ['engine-lathe'] },
  appliesTo: { kind: 'spindle' as const, types: ['main' as const, 'sub' as const] },
  method: 'axis-of-rotation',
  judge: 'total',
  tolerance: null,
  direction: 'either' as const,
  resolution: { valueUm: '0.1', rule: 'half-even' as const },
  instruments: ['contactless sensor', 'master ball or pin'],
  cautions,
  dependsOn: { components: ['spindle' as const], moved: [], positioned: [] },
  workingStep: workingSteps['spindle-error-motion'],
  setUpTogether: 'master ball in {spindle}, sensors at the tool',
  minutes: 45,
  usualMistakes: [
    'Taking run-out for error motion: eccentricity and form of the ball are in the run-out, not in the axis.',
    'Measuring a cold spindle, or only one speed.',
    'Leaving the sensor on a stand that shakes: check it with the spindle off first.',
  ],
};

const before = [
  'Fix the master ball or pin on the spindle, centred as well as you can, and the sensor to what carries the tool. Balance at the speeds that are run; doors closed while it turns.',
  'Warm the spindle up. Measure at about 10, 50 and 100 % of the highest speed, as agreed; one sheet holds one speed, the others are further sets or are named in the remark.',
];
const after = [
  'Record twenty turns or more, at the same angles in every turn, and take them over from the recorder’s text file. Pushing in, or coming nearer, counts positive.',
  'Synchronous is what comes back every turn, asynchronous what does not. The form of the ball is in the synchronous part unless it is separated by turning it.',
  'There is no tolerance unless it is agreed.',
];

export const radialErrorMotion: TestDefinition = {
  ...common,
  id: 'RO-1',
  title: 'Radial error motion at the tool',
  boundTitle: 'Radial error motion of {spindle} at the tool',
  procedure: [
    ...before,
    'In turning the sensitive direction stands still: the sensor looks along X at the tool. The eccentricity of the ball is taken out by calculation.',
    ...after,
  ],
  layout: { kind: 'rotation-turns', turns: 20, anglesDeg: eighths, direction: 'radial' },
  sketch: { scene: 'spindle-sensors', plane: 'ZX', positiveMeans: '+ nearer to the tool' },
  judgedFigure: 'total radial error motion, eccentricity taken out',
};

export const axialErrorMotion: TestDefinition = {
  ...common,
  id: 'RO-2',
  title: 'Axial error motion',
  boundTitle: 'Axial error motion of {spindle}',
  procedure: [
    ...before,
    'The sensor looks along Z at the top of the ball, on the axis. What happens once a turn is real here and stays in; it is given beside the total.',
    ...after,
  ],
  layout: { kind: 'rotation-turns', turns: 20, anglesDeg: eighths, direction: 'axial' },
  sketch: { scene: 'spindle-sensors', plane: 'ZX', positiveMeans: '+ away from the headstock' },
  judgedFigure: 'total axial error motion',
};

export const tiltErrorMotion: TestDefinition = {
  ...common,
  id: 'RO-3',
  title: 'Tilt error motion',
  boundTitle: 'Tilt error motion of {spindle}',
  procedure: [
    ...before,
    'Two sensors look along X at two balls or at two places of a pin, a known distance apart. The tilt at an angle is the difference of both readings over that distance, in µm/m.',
    ...after,
  ],
  layout: { kind: 'rotation-turns', turns: 20, anglesDeg: eighths, direction: 'tilt' },
  shownIn: 'mm/m',
  sketch: { scene: 'spindle-sensors', plane: 'ZX', positiveMeans: '+ outer place nearer to the tool' },
  judgedFigure: 'total tilt error motion, constant part and once a turn taken out',
};

export const definitions: TestDefinition[] = [radialErrorMotion, axialErrorMotion, tiltErrorMotion];
