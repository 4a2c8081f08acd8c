import { closedTurn, handTurned } from '../iso-13041-1-2020/parts';
import { axialSlipOf, faceRunOutOf } from '../iso-13041-1-2020/spindle-faces';
import { boreRunOutAt300Of, boreRunOutAtNoseOf, noseRunOutOf } from '../iso-13041-1-2020/spindle-run-outs';
import type { TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { asEngineLathe, base } from './as-engine-lathe';
import * as tolerance from './tolerances';

const main = (id: string) => ({ spindle: 'main' as const, id });

const centreRunOut: TestDefinition = {
  ...base,
  id: 'SP-3',
  title: 'Run-out of the centre in the spindle',
  boundTitle: 'Run-out of the centre in {spindle}',
  procedure: [
    'Wipe taper, sleeve and centre clean, put the centre in and draw or push it home. Mark 0° on the spindle.',
    'Fix the indicator to the carriage or the bed and set the stylus square to the cone of the centre, not to the spindle axis. Pushing the plunger in counts positive.',
    'Set the indicator near zero at 0°; only differences count.',
    'Turn the spindle slowly by hand, always the same way, and read every 45°.',
    'Read once more back at 0°: the closing reading must agree with the first within a tenth of the tolerance.',
    'The result is the largest less the smallest reading of the turn.',
  ],
  appliesTo: { kind: 'spindle', types: ['main'] },
  method: 'run-out',
  layout: { kind: 'turns', insertions: 1, anglesDeg: closedTurn, insertionLabel: 'turn' },
  tolerance: tolerance.centreRunOut,
  direction: 'either',
  resolution: { valueUm: '0.5', rule: 'half-even' },
  instruments: ['indicator', 'indicator stand'],
  cautions: handTurned,
  sketch: { scene: 'spindle-nose', anglesDeg: ['0', '90', '180', '270'] },
  dependsOn: { components: ['spindle'], moved: [], positioned: [] },
  workingStep: workingSteps['spindle-run-out'],
  judgedFigure: 'largest less smallest reading of the turn, square to the cone',
  usualMistakes: [
    'Taking a worn or knocked centre and blaming the spindle.',
    'Setting the stylus square to the axis: on a cone of 60° it then shows too much.',
  ],
  setUpTogether: 'centre in {spindle}',
  minutes: 10,
};

export const spindleTests: TestDefinition[] = [
  asEngineLathe(noseRunOutOf(main('SP-1a')), { tolerance: tolerance.noseRunOut }),
  asEngineLathe(axialSlipOf(main('SP-1b')), { tolerance: tolerance.axialSlip }),
  asEngineLathe(faceRunOutOf(main('SP-1c')), { tolerance: tolerance.faceRunOut }),
  asEngineLathe(boreRunOutAtNoseOf(main('SP-2a')), { tolerance: tolerance.boreRunOutAtNose }),
  asEngineLathe(boreRunOutAt300Of(main('SP-2b')), { tolerance: tolerance.boreRunOutAt300 }),
  centreRunOut,
];
