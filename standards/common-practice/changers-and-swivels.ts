import type { CautionId, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { code, edition, source } from './source';

const cautions: CautionId[] = [
  'isolate-before-touching',
  'reduced-speed-enabling-device',
  'turret-and-sub-spindle-pinch',
  'stored-energy',
  'other-channels-at-rest',
  'maker-and-local-rules-first',
];

const base = { code, edition, version: 1, source, direction: 'either' as const, cautions };

export const changerPosition: TestDefinition = {
  ...base,
  id: 'TCH-1',
  title: 'Tool changer: change position',
  boundTitle: 'Tool changer {toolChanger}: change position',
  procedure: [
    'Back the parameters up. Bring gripper and tool spindle to the change position in single steps, drives at reduced speed, no tool in the gripper.',
    'With a gauge tool in the spindle, measure how far the gripper’s seat stands beside it in each direction, and the angle of the orientation.',
    'Answer the items and write the figures; limits are those of the maker.',
    'Change a light gauge tool slowly first, then at working speed with doors closed, ten times.',
  ],
  appliesTo: { kind: 'tool-changer' },
  method: 'function-check',
  layout: {
    kind: 'check-list',
    items: [
      {
        id: 'height',
        question: 'Gripper meets the groove of the tool within the maker’s limit',
        value: { label: 'departure along the tool', unit: 'mm' },
      },
      {
        id: 'side',
        question: 'Gripper meets the tool sideways within the maker’s limit',
        value: { label: 'departure across', unit: 'mm' },
      },
      {
        id: 'orientation',
        question: 'Spindle orientation fits the drive keys',
        value: { label: 'orientation', unit: '°' },
      },
      { id: 'clamping', question: 'Clamping and releasing are signalled and hold' },
      { id: 'repeat', question: 'Ten changes ran without alarm' },
    ],
  },
  tolerance: null,
  shownIn: 'items',
  resolution: { valueUm: '1', rule: 'half-even' },
  instruments: ['gauge tool', 'indicator'],
  sketch: { scene: 'checklist' },
  dependsOn: { components: ['tool-changer'], moved: [], positioned: [] },
  workingStep: workingSteps['reference-points'],
  judgedFigure: 'items not in order',
  usualMistakes: [
    'Trying the first change at working speed with a heavy tool.',
    'Correcting the gripper when it was the spindle’s orientation that had moved.',
  ],
  setUpTogether: 'gauge tool at {toolChanger}',
  minutes: 30,
};

export const swivelPositions: TestDefinition = {
  ...base,
  id: 'SW-1',
  title: 'Swivel axis: repeatability of its positions',
  boundTitle: '{rotary}: repeatability of its positions',
  procedure: [
    'Hold a mandrel in the tool spindle or a square on the swivel head. Indicator fixed to the bed, plunger on the mandrel at a known radius from the swivel axis.',
    'Swivel to the position, clamp as when cutting, set the indicator to zero. Pushing the plunger in counts positive.',
    'Swivel away by some 90° and back, always from the same side, and read; five times at each position. Then set the indicator up at the next one.',
    'Without swivelling, moving away and back with the linear axes must return within a tenth of what is judged.',
    'The result is the largest range of a position, given as an angle too where the radius is written. There is no tolerance unless it is agreed.',
  ],
  appliesTo: { kind: 'rotary-axis', letters: ['A', 'B'] },
  method: 'indexing',
  judge: 'repeatability',
  layout: { kind: 'stations', stations: ['0°', '45°', '90°', '−45°'], repeats: 5, radiusMm: '150' },
  tolerance: null,
  resolution: { valueUm: '0.5', rule: 'half-even' },
  instruments: ['indicator', 'indicator stand', 'test mandrel'],
  sketch: { scene: 'swivel-axis' },
  dependsOn: { components: ['rotary'], moved: [], positioned: ['rotary'] },
  workingStep: workingSteps['rotary-axes'],
  judgedFigure: 'largest less smallest reading of the worst position',
  usualMistakes: [
    'Clamping for one reading and not for the next.',
    'Coming from both sides by turns: lost motion of the swivel is then read as repeatability.',
  ],
  setUpTogether: 'mandrel at {rotary}',
  minutes: 40,
};

export const crossDrill: TestDefinition = {
  ...base,
  id: 'GX-1',
  title: 'Cross drill spindle: on the centre of the work',
  boundTitle: 'Cross drill of {turret}: on the centre of {spindle}',
  procedure: [
    'Put a mandrel into the cross drill spindle and one into the work spindle.',
    'Take the height of both axes from the same base with the same indicator. Pushing the plunger in counts positive. Turn each by half a turn and take the mean.',
    'Back at the first mandrel the reading must return within a tenth of what is judged.',
    'A drill beside the centre drills a slanting hole in round bar. There is no tolerance unless it is agreed.',
  ],
  appliesTo: { kind: 'driven-tools-and-spindle' },
  method: 'centre-height',
  layout: { kind: 'tool-centre', form: 'heights', surface: 'outside', radiiMm: ['1', '5', '10'] },
  tolerance: null,
  resolution: { valueUm: '0.5', rule: 'half-even', byForm: { sweep: '0.5', heights: '1' } },
  instruments: ['indicator', 'indicator stand', 'test mandrel'],
  sketch: { scene: 'tool-hole-heights', positiveMeans: '+ drill above the spindle axis' },
  dependsOn: { components: ['turret', 'spindle'], moved: [], positioned: ['turret-axes'] },
  workingStep: workingSteps['live-tools'],
  judgedFigure: 'height of the drill’s axis over the spindle axis',
  positiveMeans: 'above the spindle axis',
  negativeMeans: 'below the spindle axis',
  usualMistakes: [
    'Measuring the mandrel’s run-out instead of its axis: turn it by half a turn.',
    'Forgetting that Y, where there is one, can take the height up.',
  ],
  setUpTogether: 'mandrels in {spindle} and {turret}',
  minutes: 15,
};
