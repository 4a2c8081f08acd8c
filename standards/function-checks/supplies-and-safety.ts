import type { CheckItem, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { answerSteps, atRest, check, guarded } from './parts';

const nothing = { components: [], moved: [], positioned: [] };

function supply(id: string, title: string, first: string, items: CheckItem[], usualMistakes: string[]): TestDefinition {
  return {
    ...check,
    id,
    title,
    boundTitle: title,
    procedure: [first, ...answerSteps],
    appliesTo: { kind: 'machine' },
    layout: { kind: 'check-list', items },
    cautions: atRest,
    dependsOn: nothing,
    workingStep: workingSteps.preparation,
    usualMistakes,
    setUpTogether: 'machine running without tools',
    minutes: 10,
  };
}

export const lubrication = supply(
  'FC-07',
  'Lubrication',
  'Start a lubrication cycle and look whether oil or grease comes at each place that the maker’s plan names.',
  [
    { id: 'level', question: 'Tank is filled with the right lubricant' },
    {
      id: 'pressure',
      question: 'Pressure builds up and falls again',
      value: { label: 'highest pressure', unit: 'bar' },
    },
    { id: 'places', question: 'Lubricant comes at every guideway and screw' },
    { id: 'alarm', question: 'Low level and low pressure give an alarm' },
  ],
  ['Believing a running pump when a line is broken behind it.', 'Filling in another oil than the maker names.'],
);

export const coolant = supply(
  'FC-08',
  'Coolant',
  'Run the pumps with doors closed and look at nozzles, filters and the tank.',
  [
    { id: 'flow', question: 'Coolant comes at every nozzle and station' },
    { id: 'pressure', question: 'Pressure is as the maker says', value: { label: 'pressure', unit: 'bar' } },
    { id: 'filter', question: 'Filters and sieves are clean' },
    { id: 'leaks', question: 'Nothing runs out of the machine' },
    { id: 'level', question: 'Low level is signalled' },
  ],
  [
    'Leaving coolant on while measuring: slides and mandrel change their temperature.',
    'Judging the flow with one pump of several.',
  ],
);

export const chips = supply(
  'FC-09',
  'Chip conveyor',
  'Run the conveyor forward and back, guards on; never reach in while it can start.',
  [
    { id: 'runs', question: 'Runs forward and back without jerks' },
    { id: 'overload', question: 'Overload stops it and is signalled' },
    { id: 'guards', question: 'Its guards are on and whole' },
  ],
  [
    'Clearing a jam by hand while the drive is only switched off at the panel.',
    'Forgetting that it may start with the program.',
  ],
);

function safety(
  id: string,
  title: string,
  steps: string[],
  items: CheckItem[],
  usualMistakes: string[],
): TestDefinition {
  return {
    ...check,
    id,
    title,
    boundTitle: title,
    procedure: [...steps, ...answerSteps],
    appliesTo: { kind: 'machine' },
    layout: { kind: 'check-list', items },
    cautions: guarded,
    dependsOn: nothing,
    workingStep: workingSteps.restore,
    usualMistakes,
    setUpTogether: 'machine closed, ready to hand over',
    minutes: 20,
  };
}

export const doors = safety(
  'FC-10',
  'Doors, guards and interlocks',
  [
    'Every guard that was taken off is back with all its screws, every door closes and locks.',
    'Try each interlock as the maker’s instructions say, by an authorised person, with axes and spindles at rest. A guard is never defeated to try it.',
  ],
  [
    { id: 'guards', question: 'All guards and covers are back and fast' },
    { id: 'locked', question: 'Doors lock while axes or spindles move' },
    { id: 'start', question: 'Nothing starts with a door open' },
    { id: 'windows', question: 'Windows are whole and not past their date' },
    { id: 'setup', question: 'Set-up mode holds reduced speed and needs the enabling device' },
    { id: 'bypass', question: 'No bridge, key or plug is left in an interlock' },
  ],
  ['Handing over with a jumper that was only meant for an hour.', 'Trying one door of several.'],
);

export const emergencyStop = safety(
  'FC-11',
  'Emergency stop',
  [
    'With everything at rest, press each emergency stop in turn, also those at bar feeder, conveyor and the rear; then once with an axis moving slowly.',
    'Resetting alone must start nothing.',
  ],
  [
    { id: 'each', question: 'Every emergency stop takes the drives off' },
    { id: 'reset', question: 'Nothing starts by resetting' },
    { id: 'brake', question: 'Vertical and slanted axes hold', value: { label: 'largest sag', unit: 'mm' } },
    { id: 'marked', question: 'Every emergency stop can be reached and is marked' },
  ],
  ['Leaving out the one behind the machine.', 'Pressing only while nothing could have moved anyway.'],
);

export const restored: TestDefinition = {
  ...safety(
    'FC-12',
    'Restored: protections, limits and parameters',
    [
      'Put back what was changed for the work, and prove it. Compare the parameters with the backup: only what the job records may differ.',
    ],
    [
      { id: 'lock', question: 'Parameter writing is locked again' },
      { id: 'compared', question: 'Parameters agree with the backup but for what the job records' },
      { id: 'limits', question: 'Soft limits, change and transfer positions are checked' },
      { id: 'overrides', question: 'Overrides, speed limits and monitors stand as before' },
      { id: 'saved', question: 'A new backup is saved and handed over' },
    ],
    ['Restoring the old backup over the new corrections.', 'Leaving a monitor off that was in the way.'],
  ),
  canDisturb: ['everything'],
};

export const dryRun: TestDefinition = {
  ...check,
  id: 'FC-13',
  title: 'Dry run of a test cycle',
  boundTitle: 'Dry run of a test cycle, channel {channel}',
  procedure: [
    'Run a cycle without part and tools that moves every axis over most of its travel, indexes every turret and turns every spindle; doors closed.',
    'First at reduced override, then as in production, for the time that is agreed.',
    ...answerSteps,
  ],
  appliesTo: { kind: 'channel' },
  layout: {
    kind: 'check-list',
    items: [
      { id: 'ran', question: 'Cycle ran without alarm' },
      { id: 'duration', question: 'It ran for the agreed time', value: { label: 'duration', unit: 'min' } },
      { id: 'cycle', question: 'Cycle time is as before the work', value: { label: 'time of one cycle', unit: 's' } },
      { id: 'noise', question: 'No unusual noise, knock or smell' },
      { id: 'warm', question: 'Bearings, nuts and motors stay at usual temperatures' },
    ],
  },
  cautions: guarded,
  dependsOn: nothing,
  workingStep: workingSteps.restore,
  usualMistakes: ['Running one channel while the others wait for it.', 'Stopping after the first cycle.'],
  setUpTogether: 'machine closed, ready to hand over',
  minutes: 60,
};

export const synchronised: TestDefinition = {
  ...check,
  id: 'FC-16',
  title: 'Sub-spindle: synchronised running and transfer',
  boundTitle: '{spindle} with {reference}: synchronised running and transfer',
  procedure: [
    'Run both spindles in step at low speed, then at working speed, doors closed; then transfer a soft trial part.',
    ...answerSteps,
  ],
  appliesTo: { kind: 'main-and-sub-spindle' },
  layout: {
    kind: 'check-list',
    items: [
      { id: 'speed', question: 'Both spindles keep step while speeding up and down' },
      { id: 'angle', question: 'Angle between them repeats', value: { label: 'difference of angle', unit: '°' } },
      { id: 'transfer', question: 'Trial part goes over without a mark or a jerk' },
      { id: 'force', question: 'Thrust at the stop is as set' },
    ],
  },
  cautions: guarded,
  dependsOn: { components: ['reference', 'spindle'], moved: [], positioned: ['spindle-axis'] },
  workingStep: workingSteps.transfer,
  usualMistakes: ['Trying the transfer at full speed first.', 'Closing both chucks before the speeds agree.'],
  setUpTogether: 'transfer part in {spindle}',
  minutes: 20,
};
