import type { TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { answerSteps, atRest, check, guarded, moving } from './parts';

const nothing = { components: [], moved: [], positioned: [] };

export const backup: TestDefinition = {
  ...check,
  id: 'FC-01',
  title: 'Identity, photos and parameter backup',
  boundTitle: 'Identity, photos and parameter backup',
  procedure: [
    'Before anything is touched: read the nameplate, take photos of the machine as it stands, and save parameters, programs and offsets of every channel to a medium that leaves the machine.',
    ...answerSteps,
  ],
  appliesTo: { kind: 'machine' },
  layout: {
    kind: 'check-list',
    items: [
      { id: 'nameplate', question: 'Serial number on the nameplate agrees with the job' },
      { id: 'photos', question: 'Photos of nameplate, working space and cabinet are taken' },
      { id: 'parameters', question: 'Parameters of every channel are saved and the file can be read' },
      { id: 'programs', question: 'Programs and offsets are saved' },
      { id: 'compensation', question: 'Lost-motion and pitch values that stand now are written down' },
      { id: 'hours', question: 'Operating hours are noted', value: { label: 'hours', unit: 'h' } },
    ],
  },
  cautions: atRest,
  dependsOn: nothing,
  workingStep: workingSteps.preparation,
  usualMistakes: ['Saving one channel of several.', 'Keeping the only copy on the control itself.'],
  setUpTogether: 'machine as it was found',
  minutes: 30,
};

export const switches: TestDefinition = {
  ...check,
  id: 'FC-02',
  title: 'Axis: switches, reference mark, encoder',
  boundTitle: '{axis}: switches, reference mark, encoder',
  procedure: [
    'Move the axis at reduced speed in set-up mode, hand near the emergency stop, nobody else inside.',
    'Reference the axis three times from different places, and come near both ends of its travel.',
    ...answerSteps,
  ],
  appliesTo: { kind: 'linear-axis' },
  layout: {
    kind: 'check-list',
    items: [
      { id: 'reference', question: 'Reference point is found three times without alarm' },
      {
        id: 'repeat',
        question: 'Reference point comes back to the same place',
        value: { label: 'largest difference of three', unit: 'mm' },
      },
      { id: 'ends', question: 'Soft limits stop the axis before its end switches' },
      { id: 'switches', question: 'End switches are signalled on the diagnosis page' },
      { id: 'encoder', question: 'Encoder or scale gives no alarm over the whole travel' },
      { id: 'wipers', question: 'Wipers and covers are whole and run freely' },
    ],
  },
  cautions: moving,
  dependsOn: { components: [], moved: ['axis'], positioned: ['axis'] },
  workingStep: workingSteps.preparation,
  usualMistakes: ['Taking a soft limit that was never set for a working one.', 'Trying an end switch at rapid.'],
  setUpTogether: 'machine running without tools',
  minutes: 10,
};

export const clamping: TestDefinition = {
  ...check,
  id: 'FC-03',
  title: 'Spindle: clamping and pressures',
  boundTitle: 'Clamping and pressures of {spindle}',
  procedure: [
    'Clamp and release a ring or bar at the pressure that is set; read the gauges at rest and while clamping.',
    'The signals of clamped and released must stand where they belong; the spindle must not start while nothing is clamped. Never try that with a part that could fly off.',
    ...answerSteps,
  ],
  appliesTo: { kind: 'spindle', types: ['main', 'sub'] },
  layout: {
    kind: 'check-list',
    items: [
      { id: 'clamps', question: 'Clamps and releases fully, without a jerk' },
      { id: 'signals', question: 'Clamped and released are signalled rightly' },
      { id: 'lock', question: 'Spindle does not start unless it is clamped' },
      {
        id: 'pressure',
        question: 'Clamping pressure stands as the maker says',
        value: { label: 'pressure', unit: 'bar' },
      },
      { id: 'held', question: 'Pressure holds when the pump stops', value: { label: 'fall in 5 min', unit: 'bar' } },
      { id: 'leaks', question: 'Cylinder and hoses do not leak' },
    ],
  },
  cautions: [...guarded, 'isolate-before-touching'],
  dependsOn: { components: ['spindle'], moved: [], positioned: [] },
  workingStep: workingSteps['spindle-run-out'],
  usualMistakes: [
    'Reading the pressure at the pump instead of at the cylinder.',
    'Leaving the pressure of the trial set for production.',
  ],
  setUpTogether: 'chuck of {spindle}',
  minutes: 15,
};

export const orientation: TestDefinition = {
  ...check,
  id: 'FC-05',
  title: 'Spindle: orientation and C axis engaging',
  boundTitle: 'Orientation of {spindle}',
  procedure: [
    'Orient the spindle ten times from both directions of rotation, low speed, doors closed; engage the C axis where there is one.',
    ...answerSteps,
  ],
  appliesTo: { kind: 'spindle', types: ['main', 'sub'] },
  layout: {
    kind: 'check-list',
    items: [
      { id: 'stops', question: 'Stops at its orientation ten times without alarm' },
      { id: 'repeat', question: 'Orientation repeats', value: { label: 'range of ten', unit: '°' } },
      { id: 'brake', question: 'Brake or clamp holds and is signalled' },
      { id: 'c-axis', question: 'C axis engages and disengages' },
    ],
  },
  cautions: guarded,
  dependsOn: { components: ['spindle'], moved: [], positioned: [] },
  workingStep: workingSteps['rotary-axes'],
  usualMistakes: ['Testing from one direction only.', 'Mixing the orientation of the control with that of the chuck.'],
  setUpTogether: 'machine running without tools',
  minutes: 10,
};

export const turretIndexing: TestDefinition = {
  ...check,
  id: 'FC-04',
  title: 'Turret: indexing, clamping and its sensors',
  boundTitle: '{turret}: indexing, clamping and its sensors',
  procedure: [
    'Index the turret round in both directions, single steps first, then over half a turn; hands out until it stands still and is held.',
    'Watch the signals on the diagnosis page: position, unclamped, clamped.',
    ...answerSteps,
  ],
  appliesTo: { kind: 'turret', types: ['turret'] },
  layout: {
    kind: 'check-list',
    items: [
      { id: 'all', question: 'Every station is found, in both directions' },
      { id: 'names', question: 'Shown station agrees with the one in front' },
      { id: 'clamped', question: 'Clamped and unclamped are signalled rightly' },
      {
        id: 'time',
        question: 'Indexing takes the time that the maker names',
        value: { label: 'time of one step', unit: 's' },
      },
      { id: 'quiet', question: 'Indexes without a knock' },
      {
        id: 'pressure',
        question: 'Clamping pressure stands as the maker says',
        value: { label: 'pressure', unit: 'bar' },
      },
    ],
  },
  cautions: [...moving, 'stored-energy'],
  dependsOn: { components: ['turret'], moved: [], positioned: [] },
  canDisturb: ['turret'],
  workingStep: workingSteps.turret,
  usualMistakes: [
    'Trying only the stations that carry tools.',
    'Adjusting a sensor until the alarm goes, when it is the clamp that does not close.',
  ],
  setUpTogether: '{turret} indexing by itself',
  minutes: 15,
};

export const tailstock: TestDefinition = {
  ...check,
  id: 'FC-06',
  title: 'Tailstock: quill, thrust and interlock',
  boundTitle: '{tailstock}: quill, thrust and interlock',
  procedure: [
    'Move the quill out and back at the pressure that is set, against a bar in the spindle at rest.',
    ...answerSteps,
  ],
  appliesTo: { kind: 'tailstock' },
  layout: {
    kind: 'check-list',
    items: [
      { id: 'moves', question: 'Quill moves smoothly over its whole stroke' },
      { id: 'thrust', question: 'Thrust is as the maker says', value: { label: 'thrust', unit: 'kN' } },
      { id: 'signals', question: 'Front and rear positions are signalled rightly' },
      { id: 'lock', question: 'Spindle stops when the quill loses the part' },
      { id: 'clamp', question: 'Tailstock clamps on the bed' },
    ],
  },
  cautions: moving,
  dependsOn: { components: ['tailstock'], moved: [], positioned: [] },
  workingStep: workingSteps.tailstock,
  usualMistakes: [
    'Judging the thrust by the gauge of another circuit.',
    'Trying the loss of the part with a part in the chuck that could fall.',
  ],
  setUpTogether: 'tailstock at a bar',
  minutes: 10,
};

export const guideBush: TestDefinition = {
  ...check,
  id: 'FC-14',
  title: 'Guide bush: drive, adjustment, signals',
  boundTitle: '{guideBush}: drive, adjustment, signals',
  procedure: ['Set the bush on a ground bar and run it at low speed, doors closed.', ...answerSteps],
  appliesTo: { kind: 'guide-bush' },
  layout: {
    kind: 'check-list',
    items: [
      { id: 'adjust', question: 'Bush closes and opens over its range' },
      { id: 'drive', question: 'Rotary bush turns with the spindle, without play that can be heard' },
      { id: 'seal', question: 'Chips and coolant stay out' },
    ],
  },
  cautions: guarded,
  dependsOn: { components: ['guide-bush'], moved: [], positioned: [] },
  workingStep: workingSteps['guide-bush'],
  usualMistakes: ['Closing the bush on a bar that is not round.', 'Forgetting to set it for the bar of the next job.'],
  setUpTogether: 'bar in {guideBush}',
  minutes: 10,
};

export const drivenTools: TestDefinition = {
  ...check,
  id: 'FC-15',
  title: 'Driven tools: engaging, turning, cooling',
  boundTitle: 'Driven tools of {turret}: engaging, turning, cooling',
  procedure: [
    'Run each driven station at low and at its highest speed for some minutes, doors closed.',
    ...answerSteps,
  ],
  appliesTo: { kind: 'driven-tools' },
  layout: {
    kind: 'check-list',
    items: [
      { id: 'engage', question: 'Drive engages at every driven station' },
      { id: 'direction', question: 'Direction of rotation is as programmed' },
      { id: 'warm', question: 'Stations stay cool', value: { label: 'highest temperature', unit: '°C' } },
      { id: 'noise', question: 'Turns without noise at its highest speed' },
      { id: 'coolant', question: 'Inner coolant comes where it is fitted' },
    ],
  },
  cautions: guarded,
  dependsOn: { components: ['turret'], moved: [], positioned: [] },
  workingStep: workingSteps['live-tools'],
  usualMistakes: [
    'Running a holder faster than its own limit.',
    'Touching a holder to feel its warmth before it stands still.',
  ],
  setUpTogether: 'machine running without tools',
  minutes: 20,
};
