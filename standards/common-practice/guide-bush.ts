import type { CautionId, Provenance, TestDefinition, ToleranceRule } from '../types';
import { workingSteps } from '../working-order';
import { code, edition, source } from './source';

const cautions: CautionId[] = [
  'isolate-before-touching',
  'turn-spindle-by-hand',
  'other-channels-at-rest',
  'turret-and-sub-spindle-pinch',
  'maker-and-local-rules-first',
];

const base = {
  code,
  edition,
  version: 1,
  source,
  direction: 'either' as const,
  resolution: { valueUm: '0.5', rule: 'half-even' as const },
  cautions,
  workingStep: workingSteps['guide-bush'],
};

const practice = (text: string): Provenance => ({ kind: 'common-practice', text });

const offset: ToleranceRule = {
  by: 'all',
  allUm: '10',
  basis: 'offset',
  provenance: practice('offset of .005 to .010 is aimed at; the larger taken as the limit'),
};

const stroke: ToleranceRule = {
  by: 'all',
  allUm: '10',
  perLength: { baseLengthMm: '100', minimumUm: '5' },
  provenance: practice('.010 per 100'),
};

export const bushCoaxiality: TestDefinition = {
  ...base,
  id: 'GB-1',
  title: 'Guide bush coaxial to the main spindle',
  boundTitle: 'Guide bush {guideBush} coaxial to {spindle}',
  procedure: [
    'Take the bush out and clean its seat; the seat is what is measured, the bush itself only where it cannot be taken out. Bring the headstock to where it works.',
    'Fix the indicator to a short, stiff bracket on the spindle and sweep the bore at the face. Turning by hand, read at 0° (+X), 90° (+Y), 180° and 270°. Pushing the plunger in counts positive.',
    'Write the sag of the bracket: zero it on top of a stiff bar, turn it to the bottom; the sag is half of what it then shows, without its minus.',
    'The readings at 0° and 180° together must equal those at 90° and 270° together. Back at 0° the reading must return within a tenth of the tolerance.',
    'Take the second section at the rear of the bore.',
    'The result is the larger offset of the axes. A machine that also works without bush needs a set for each way of working.',
  ],
  appliesTo: { kind: 'guide-bush-and-spindle' },
  method: 'coaxiality',
  layout: { kind: 'swept-sections', positionsMm: ['0', '30'], surface: 'bore' },
  tolerance: offset,
  instruments: ['indicator', 'indicator bracket'],
  sketch: { scene: 'guide-bush', anglesDeg: ['0', '90', '180', '270'] },
  dependsOn: { components: ['guide-bush', 'spindle'], moved: [], positioned: [] },
  judgedFigure: 'larger offset of the axes at face and rear',
  usualMistakes: [
    'Sweeping a bush that is worn or adjusted too wide.',
    'Taking the whole reading for the offset: it is half of the difference.',
    'Measuring only the face, when the bush stands at an angle.',
  ],
  setUpTogether: 'indicator in {spindle} at {guideBush}',
  minutes: 30,
};

export const bushRunOut: TestDefinition = {
  ...base,
  id: 'GB-2',
  title: 'Rotary guide bush: run-out of its bore',
  boundTitle: 'Guide bush {guideBush}: run-out of its bore',
  procedure: [
    'Only for a bush that turns with the bar. Set it to its working play on a ground bar, then take the bar out.',
    'Indicator on the gang slide, plunger in the bore near the face. Turn the bush slowly by hand through one turn and read at each angle. Pushing the plunger in counts positive.',
    'Back at 0° the first reading must return.',
    'The result is the largest less the smallest reading. There is no tolerance unless it is agreed.',
  ],
  appliesTo: { kind: 'guide-bush-and-spindle' },
  method: 'run-out',
  layout: {
    kind: 'turns',
    insertions: 1,
    anglesDeg: ['0', '45', '90', '135', '180', '225', '270', '315', '360'],
    insertionLabel: 'turn',
  },
  tolerance: null,
  instruments: ['indicator', 'indicator stand'],
  sketch: { scene: 'guide-bush', positiveMeans: '+ plunger pushed in' },
  dependsOn: { components: ['guide-bush'], moved: [], positioned: [] },
  judgedFigure: 'largest less smallest reading over one turn',
  usualMistakes: [
    'Measuring a fixed bush, for which the test means nothing.',
    'Judging the play of the bush as run-out.',
  ],
  setUpTogether: 'indicator in {spindle} at {guideBush}',
  minutes: 10,
};

function headstockStroke(id: string, plane: 'ZX' | 'YZ'): TestDefinition {
  const up = plane === 'YZ';
  return {
    ...base,
    id,
    title: `Headstock stroke parallel to the guide bush, in ${plane}`,
    boundTitle: `{axis} stroke parallel to the axis of {guideBush}, in ${plane}`,
    procedure: [
      'Put a ground mandrel into the seat of the bush so that it reaches toward the headstock.',
      'Fix the indicator to the headstock or its spindle, which does not turn, plunger on the mandrel in this plane. Pushing the plunger in counts positive.',
      'Move the headstock through its stroke, always approaching from the same side, and read at every position.',
      'Turn the mandrel by half a turn in its seat and read again; the mean drops its own error.',
      'Back at the first position the reading must return within a tenth of the tolerance.',
      'The result is the slope of the means over the measuring length.',
    ],
    appliesTo: { kind: 'guide-bush-and-axis', plane },
    method: 'parallelism',
    layout: {
      kind: 'angles-by-position',
      anglesDeg: ['0', '180'],
      positionsMm: ['0', '25', '50', '75', '100'],
      positionName: 'z',
      sag: false,
      turned: 'mandrel',
    },
    tolerance: stroke,
    instruments: ['indicator', 'indicator stand', 'test mandrel'],
    sketch: {
      scene: 'guide-bush',
      plane,
      anglesDeg: ['0', '180'],
      positiveMeans: up ? '+ rises with z' : '+ toward the tool with z',
    },
    dependsOn: { components: ['guide-bush'], moved: ['axis'], positioned: [] },
    judgedFigure: 'least-squares slope over the measuring length',
    positiveMeans: up ? 'the mandrel rises with z' : 'the mandrel leans toward the tool with z',
    negativeMeans: up ? 'the mandrel falls with z' : 'the mandrel leans away from the tool with z',
    usualMistakes: [
      'A mandrel that sits loosely in the seat.',
      'Aligning the bush to the spindle at one place only: bars then bind over the stroke.',
    ],
    setUpTogether: 'mandrel in {guideBush}',
    minutes: 20,
  };
}

export const strokeInZx = headstockStroke('GB-3a', 'ZX');
export const strokeInYz = headstockStroke('GB-3b', 'YZ');
