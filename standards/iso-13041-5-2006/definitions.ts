import { circular, circularSteps } from '../iso-13041-7-2004/circular';
import type { CautionId, CheckItem, TestDefinition, ToleranceRule } from '../types';
import { workingSteps } from '../working-order';
import { code, edition, remembered, source } from './source';

const base = { code, edition, version: 1, source, machineKinds: { not: ['engine-lathe'] } };

const running: CautionId[] = [
  'guards-back-before-cutting',
  'other-channels-at-rest',
  'stored-energy',
  'maker-and-local-rules-first',
];

const fivePercent = (id: string, question: string): CheckItem => ({
  id,
  question,
  value: { label: 'deviation from the programmed value', unit: '%', lower: '-5', upper: '5' },
});

const percent = {
  ...base,
  method: 'function-check',
  tolerance: null,
  direction: 'either' as const,
  shownIn: 'items' as const,
  resolution: { valueUm: '1', rule: 'half-even' as const },
  cautions: running,
  sketch: { scene: 'checklist' as const },
  judgedFigure: 'items not in order; each deviation within ±5 % (from memory, low confidence)',
};

export const spindleSpeeds: TestDefinition = {
  ...percent,
  id: 'K-1',
  testNumber: 'K1',
  testNumberSource: remembered('number as in the sister code'),
  title: 'Spindle speeds',
  boundTitle: 'Speeds of {spindle}',
  procedure: [
    'Doors closed, nothing in the chuck that could fly off, warm spindle. The maker’s highest speed and the chuck’s are not passed.',
    'Run a low, a middle and the highest permitted speed in both directions of rotation and read each with a tachometer that is calibrated.',
    'Write how far each is from the programmed speed in per cent, sign included; the larger of both directions counts.',
  ],
  appliesTo: { kind: 'spindle', types: ['main', 'sub'] },
  layout: {
    kind: 'check-list',
    items: [
      fivePercent('low', 'Low speed is held'),
      fivePercent('middle', 'Middle speed is held'),
      fivePercent('highest', 'Highest permitted speed is held'),
    ],
  },
  instruments: ['tachometer'],
  dependsOn: { components: ['spindle'], moved: [], positioned: [] },
  workingStep: workingSteps['spindle-error-motion'],
  usualMistakes: [
    'Reading the control’s own display instead of the spindle.',
    'Running a chuck faster than its own limit: the smaller of both limits holds.',
  ],
  setUpTogether: 'machine running without tools',
  minutes: 10,
};

export const feeds: TestDefinition = {
  ...percent,
  id: 'K-2',
  testNumber: 'K2',
  testNumberSource: remembered('number as in the sister code'),
  title: 'Feeds of a linear axis',
  boundTitle: 'Feeds of {axis}',
  procedure: [
    'Program a long straight way at a low, a middle and the highest feed; feed override at 100 %.',
    'Time the way between two marks that lie inside the part with steady feed, or take the feed from the interferometer.',
    'Write how far each is from the programmed feed in per cent, sign included; the larger of both directions counts.',
  ],
  appliesTo: { kind: 'linear-axis' },
  layout: {
    kind: 'check-list',
    items: [
      fivePercent('low', 'Low feed is held'),
      fivePercent('middle', 'Middle feed is held'),
      fivePercent('highest', 'Highest feed is held'),
    ],
  },
  instruments: ['laser interferometer'],
  dependsOn: { components: [], moved: ['axis'], positioned: [] },
  workingStep: workingSteps.positioning,
  usualMistakes: [
    'Timing a way that is so short that starting and stopping are most of it.',
    'Feed override left at another value than 100 %.',
  ],
  setUpTogether: 'interferometer along {axis}',
  minutes: 10,
};

const interpolated: ToleranceRule = {
  by: 'all',
  allUm: '20',
  perLength: { baseLengthMm: '300', minimumUm: '5' },
  provenance: remembered('.020 per 300'),
};

export const interpolatedLine: TestDefinition = {
  ...base,
  id: 'K-3',
  testNumber: 'K3',
  testNumberSource: remembered('number as in the sister code'),
  title: 'Straightness of an interpolated line',
  boundTitle: 'Straightness of a line interpolated by {axis} and {reference}',
  procedure: [
    'Set a straightedge up at a small angle to the longitudinal axis, such as 3°, in the plane of both axes, and find its angle with the machine.',
    'Program a straight line parallel to it in which both axes move together, at a feed that is agreed.',
    'Fix the indicator to what carries the tool, plunger square to the straightedge. Pushing the plunger in counts positive.',
    'Move along the line and read at every position; positions count along the straightedge. Back at the first position the reading must return within a tenth of the tolerance.',
    'The result is the width about the minimum-zone line.',
  ],
  appliesTo: { kind: 'axis-pair', plane: 'ZX' },
  method: 'straightness',
  layout: {
    kind: 'profile',
    positionsMm: ['0', '30', '60', '90', '120', '150', '180', '210', '240', '270', '300'],
    reference: 'minimum-zone',
  },
  tolerance: interpolated,
  direction: 'either',
  resolution: { valueUm: '0.5', rule: 'half-even' },
  instruments: ['indicator', 'indicator stand', 'straightedge'],
  cautions: [
    'reduced-speed-enabling-device',
    'other-channels-at-rest',
    'support-heavy-parts',
    'maker-and-local-rules-first',
  ],
  sketch: { scene: 'straightedge-along-motion', plane: 'ZX', positiveMeans: '+ plunger pushed in' },
  dependsOn: { components: [], moved: ['axis', 'reference'], positioned: [] },
  workingStep: workingSteps.circular,
  judgedFigure: 'width about the minimum-zone line',
  usualMistakes: [
    'Taking an angle at which one axis hardly moves, so that only the other is tested.',
    'Lost motion not yet set: every reversal of the slow axis then shows as a step.',
  ],
  setUpTogether: 'straightedge at an angle in ZX',
  minutes: 30,
};

function contouring(id: string, feed: 'low' | 'high', toleranceUm: string): TestDefinition {
  return {
    ...base,
    ...circular,
    id,
    testNumber: 'K4',
    testNumberSource: {
      kind: 'published',
      text: 'ISO 13041-7 names K4 of ISO 13041-5 as the circular test at two feeds',
    },
    title: `Circular test at ${feed} feed`,
    boundTitle: `Circular test {axis}/{reference} at ${feed} feed`,
    procedure: [
      ...circularSteps,
      `This is the path at the ${feed} feed; the same diameter is run at the other feed too, and both are compared. What grows with the feed comes from the drives, what stays from the geometry.`,
      'Judged is the larger width of the two directions, each between two concentric circles of least separation.',
    ],
    appliesTo: { kind: 'axis-pair', plane: 'ZX' },
    judge: 'G',
    tolerance: {
      by: 'all',
      allUm: toleranceUm,
      provenance: remembered(`about .0${toleranceUm} at the ${feed} feed`),
    },
    workingStep: workingSteps.circular,
    judgedFigure: 'G, the larger of the two directions',
    setUpTogether: 'circular-test gauge at {axis}/{reference}',
  };
}

export const definitions: TestDefinition[] = [
  spindleSpeeds,
  feeds,
  interpolatedLine,
  contouring('K-4a', 'low', '30'),
  contouring('K-4b', 'high', '50'),
];
