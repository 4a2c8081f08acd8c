import type { CautionId, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { code, edition, source } from './source';
import { linearA, linearAlso, rotaryA, rotaryAlso } from './tolerances';

const cautions: CautionId[] = [
  'isolate-before-touching',
  'reduced-speed-enabling-device',
  'other-channels-at-rest',
  'stored-energy',
  'maker-and-local-rules-first',
];

const base = {
  code,
  edition,
  version: 1,
  source,
  machineKinds: { not: ['engine-lathe'] },
  method: 'positioning',
  judge: 'A',
  direction: 'either' as const,
  resolution: { valueUm: '0.1', rule: 'half-even' as const },
  cautions,
  workingStep: workingSteps.positioning,
};

export const linearPositioning: TestDefinition = {
  ...base,
  id: 'PO-A',
  title: 'Positioning of a linear axis',
  boundTitle: 'Positioning of {axis}',
  procedure: [
    'Warm the machine up by the agreed cycle and let the instrument come to its temperature. Compensation stays as it will be in use; write which is active.',
    'Set the laser or the scale up along the axis between the place of the tool and that of the workpiece. A laser beam is dangerous to eyes: nobody looks into it, and its class is on the instrument.',
    'Note where the line lies in the working space, the other axes’ positions and the feed.',
    'Targets: at least five per metre and five in all, at uneven distances, so that a periodic error is not met at the same place each time. They are proposed from the travel; change them as you need.',
    'Run past both ends, so that the end targets too are approached from both sides. Stand still at each target long enough to read.',
    'Five runs: up through all targets in the + direction, then down in the − direction. Deviation is the actual position less the target.',
    'Where the instrument did not bring the length to 20 °C itself, write the temperature of the scale or screw and its expansion; never both.',
    'Axes over 2000 mm: one run each way at an average pitch of 250 mm at most, or five runs over an agreed part of 2000 mm. From one run no repeatability and no A are worked out.',
  ],
  appliesTo: { kind: 'linear-axis' },
  layout: { kind: 'target-cycles', quantity: 'linear', cycles: 5, targets: [] },
  tolerance: linearA,
  also: linearAlso,
  instruments: ['laser interferometer'],
  sketch: { scene: 'laser-along-motion', positiveMeans: '+ further than the target' },
  dependsOn: { components: [], moved: ['axis'], positioned: [] },
  judgedFigure: 'A, bidirectional accuracy',
  usualMistakes: [
    'Measuring a cold machine, or a warm one with a cold instrument: the scale error is then mostly temperature.',
    'Correcting for temperature twice, once in the instrument and once here.',
    'Leaving the laser standing at an angle to the axis: every length then reads too short.',
    'Reading before the slide has settled, or not running past the end targets.',
  ],
  setUpTogether: 'interferometer along {axis}',
  minutes: 60,
};

const rotary = {
  ...base,
  shownIn: '″' as const,
  tolerance: rotaryA,
  also: rotaryAlso,
  instruments: ['polygon and autocollimator', 'rotary calibrator'],
  dependsOn: { components: [], moved: ['rotary' as const], positioned: [] },
  judgedFigure: 'A, bidirectional accuracy',
  minutes: 60,
};

const rotaryProcedure = [
  'Mount the polygon or the rotary calibrator on the axis, centred and square to it, and let it come to the temperature of the machine.',
  'Targets at uneven angles: three at least up to 90°, five up to 180°, eight up to 360°. Turn past both ends so that each target is approached from both sides.',
  'Clamp or brake the axis as it is when it cuts, and note it. Stand still at each target before reading.',
  'Five runs in the + direction and five back. Deviation is the actual angle less the target; seconds of arc may be typed with their unit.',
  'Axes that turn more than 360°: one run each way over the whole, three targets a turn, or five runs over an agreed 360°.',
];

const rotaryMistakes = [
  'Mounting the polygon out of centre or out of square, which adds an error once a turn.',
  'Measuring unclamped what cuts clamped, or the other way round.',
  'Taking targets that are all whole steps of the worm wheel or encoder, so that its periodic error never shows.',
];

export const cAxisPositioning: TestDefinition = {
  ...rotary,
  id: 'C-1',
  title: 'Positioning of a C axis',
  boundTitle: 'Positioning of {rotary}',
  procedure: rotaryProcedure,
  appliesTo: { kind: 'rotary-axis', letters: ['C'] },
  layout: {
    kind: 'target-cycles',
    quantity: 'rotary',
    cycles: 5,
    targets: ['0', '47', '88', '136', '181', '223', '271', '316'],
  },
  sketch: { scene: 'rotary-axis', positiveMeans: '+ further than the target' },
  usualMistakes: rotaryMistakes,
  setUpTogether: 'polygon on {rotary}',
};

export const bAxisPositioning: TestDefinition = {
  ...rotary,
  id: 'B-4',
  title: 'Positioning of a swivel axis',
  boundTitle: 'Positioning of {rotary}',
  procedure: rotaryProcedure,
  appliesTo: { kind: 'rotary-axis', letters: ['A', 'B'] },
  layout: {
    kind: 'target-cycles',
    quantity: 'rotary',
    cycles: 5,
    targets: ['-91', '-44', '-13', '0', '17', '46', '89'],
  },
  sketch: { scene: 'swivel-axis', positiveMeans: '+ further than the target' },
  usualMistakes: rotaryMistakes,
  setUpTogether: 'polygon on {rotary}',
};

export const definitions: TestDefinition[] = [linearPositioning, cAxisPositioning, bAxisPositioning];
