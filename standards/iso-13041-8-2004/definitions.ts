import type { CautionId, DecimalText, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { code, edition, source } from './source';

const cautions: CautionId[] = [
  'guards-back-before-cutting',
  'other-channels-at-rest',
  'isolate-before-touching',
  'stored-energy',
  'maker-and-local-rules-first',
];

const common = {
  code,
  edition,
  version: 1,
  source,
  machineKinds: { not: ['engine-lathe'] },
  method: 'drift',
  tolerance: null,
  direction: 'either' as const,
  resolution: { valueUm: '0.2', rule: 'half-even' as const },
  instruments: ['indicator', 'indicator stand', 'test mandrel', 'thermometer'],
  cautions,
  workingStep: workingSteps.thermal,
  judgedFigure: 'range over all readings',
};

const atTool = {
  appliesTo: { kind: 'turret-and-spindle' as const },
  sketch: { scene: 'drift-at-tool' as const },
  dependsOn: { components: ['turret' as const, 'spindle' as const], moved: [], positioned: [] },
  setUpTogether: 'indicator on {turret} at a mandrel in {spindle}',
};

export const environment: TestDefinition = {
  ...common,
  ...atTool,
  id: 'TH-1',
  title: 'Drift of the tool against the spindle at rest',
  boundTitle: 'Drift of {turret} against {spindle} at rest',
  procedure: [
    'Drives on, nothing moves, coolant and hydraulics as agreed. A mandrel stands in the spindle, the indicator on the turret at its free end, looking along X.',
    'Fix a thermometer to the machine near the spindle and one in the air; note which of them is written here.',
    'Set the indicator to zero and read it together with the temperature, every ten minutes first, later less often. Nobody touches the machine meanwhile.',
    'Doors, gates and heating stay as they are in daily work: the surroundings are what is tested.',
    'The result says how far the surroundings move the tool. It must not be used to compare machines; the supplier states which surroundings are acceptable, the user provides them.',
  ],
  layout: {
    kind: 'time-series',
    minutes: ['0', '10', '20', '30', '40', '50', '60', '80', '100', '120'],
    temperature: true,
  },
  usualMistakes: [
    'Beginning before mandrel and indicator have taken the temperature of the machine.',
    'Opening the door to look: the first readings after that belong to the door.',
    'Judging the machine by it, when it says something of the hall.',
  ],
  minutes: 130,
};

const hours: DecimalText[] = [
  ...['0', '5', '10', '15', '20', '30', '40', '50', '60', '75', '90', '120', '150', '180', '210', '240'],
  ...['250', '260', '270', '300', '330', '360'],
];

const way = { x: 'X', y: 'Y', z: 'Z' } as const;
const senses = { x: 'along X, on the tool side', y: 'along Y, on top', z: 'along Z, at the end face' } as const;

function rotatingSpindle(direction: keyof typeof way): TestDefinition {
  return {
    ...common,
    ...atTool,
    id: `TH-2${direction}`,
    title: `Heat of the turning spindle, along ${way[direction]}`,
    boundTitle: `Heat of {spindle}, at {turret} along ${way[direction]}`,
    procedure: [
      'A mandrel turns in the spindle; contactless sensors on the turret look at it, two along X, two along Y and one along Z, so that tilts can be seen. Doors closed while it turns.',
      `This sheet holds the sensor ${senses[direction]}; the other directions have sheets of their own, read at the same times.`,
      'Set to zero with the machine at the temperature of the hall. Then run the agreed speed, or the agreed sequence of speeds, for four hours.',
      'Read at the times given, with the temperature of the spindle housing. After four hours stop the spindle and read on while it cools.',
      'The result is the range over all; the range of the first hour and the rate are given beside it. There is no tolerance unless it is agreed.',
    ],
    layout: { kind: 'time-series', minutes: hours, temperature: true },
    instruments: ['contactless sensor', 'test mandrel', 'thermometer'],
    usualMistakes: [
      'Beginning with a spindle that is warm from the tests before.',
      'Leaving out the first minutes, in which it moves fastest.',
      'Stopping at the end of the run: how it cools tells whether growth or bearing play was seen.',
    ],
    minutes: 370,
  };
}

export const movingAxis: TestDefinition = {
  ...common,
  id: 'TH-3',
  title: 'Heat of a moving linear axis',
  boundTitle: 'Heat of {axis} when it moves',
  procedure: [
    'Choose two targets near the ends of the travel (at most 2000 mm apart) and an indicator or the interferometer at one of them. This sheet holds one target; the other is a further set or a sheet of its own.',
    'Read the deviation at the target with the machine at the temperature of the hall, and set to zero.',
    'Run the axis to and fro over the agreed way at the agreed feed. Stop at the target at the times given and read, with the temperature of the nut or scale.',
    'After four hours let the axis stand at the target and read while it cools.',
    'The result is the range over all readings. There is no tolerance unless it is agreed.',
  ],
  appliesTo: { kind: 'linear-axis' },
  layout: { kind: 'time-series', minutes: hours, temperature: true },
  instruments: ['laser interferometer', 'thermometer'],
  sketch: { scene: 'laser-along-motion' },
  dependsOn: { components: [], moved: ['axis'], positioned: [] },
  usualMistakes: [
    'Moving over so short a way that only a part of the screw gets warm, when the agreed way is longer.',
    'Correcting the length for temperature: what is sought is the growth itself.',
  ],
  setUpTogether: 'interferometer along {axis}',
  minutes: 370,
};

export const definitions: TestDefinition[] = [
  environment,
  rotatingSpindle('x'),
  rotatingSpindle('y'),
  rotatingSpindle('z'),
  movingAxis,
];
