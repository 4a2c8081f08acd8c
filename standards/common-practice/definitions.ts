import type { TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { castingHeight, castingInYz, castingInZx, holderParallel, stationHeight } from './castings-and-gangs';
import { changerPosition, crossDrill, swivelPositions } from './changers-and-swivels';
import { bushCoaxiality, bushRunOut, strokeInYz, strokeInZx } from './guide-bush';
import { levelAcross, levelAlong, mandrelTrueness, softFoot } from './level-and-mandrel';
import { crossReference, longitudinalReference, transferPosition, verticalReference } from './reference-points';
import { code, edition, source } from './source';
import { lostMotion } from './tolerances';

export const definitions: TestDefinition[] = [
  softFoot,
  levelAlong,
  levelAcross,
  mandrelTrueness,
  castingInZx,
  castingInYz,
  castingHeight,
  stationHeight,
  holderParallel,
  bushCoaxiality,
  bushRunOut,
  strokeInZx,
  strokeInYz,
  swivelPositions,
  crossDrill,
  {
    id: 'PO-B',
    code,
    edition,
    version: 1,
    title: 'Lost motion, cutting feed and rapid',
    boundTitle: 'Lost motion of {axis}, cutting feed and rapid',
    procedure: [
      'Note the lost-motion values that the control holds now, for cutting feed and for rapid: what is measured comes on top of them.',
      'Fix the indicator to a standing part, plunger along the axis against the slide. Choose whether moving in + pushes the plunger in or releases it.',
      'At cutting feed, first place: move well away in minus (more than one turn of the screw), come back in plus to the target and stop. Set the indicator near zero and read: approach in +.',
      'Go on past the target in plus by the same distance, come back in minus to the same target and read: approach in −.',
      'Seven such pairs at each place; places at both ends and in the middle of the travel. Then the same at rapid.',
      'An indicator sees the movement of the slide, never the diameter, whatever the control displays.',
      'The result is the largest mean difference of a place. Axes with a scale in the loop: find out what the scale closes before anything is changed.',
    ],
    appliesTo: { kind: 'linear-axis' },
    method: 'lost-motion',
    layout: {
      kind: 'approach-pairs',
      places: ['near end', 'middle', 'far end'],
      feeds: ['cutting-feed', 'rapid'],
      pairs: 7,
    },
    tolerance: lostMotion,
    direction: 'either',
    resolution: { valueUm: '0.1', rule: 'half-even' },
    instruments: ['indicator', 'indicator stand'],
    cautions: [
      'isolate-before-touching',
      'reduced-speed-enabling-device',
      'other-channels-at-rest',
      'stored-energy',
      'maker-and-local-rules-first',
    ],
    sketch: { scene: 'slide-approach', positiveMeans: '+ play that is not compensated' },
    dependsOn: { components: [], moved: ['axis'], positioned: [] },
    workingStep: workingSteps['lost-motion'],
    judgedFigure: 'largest amount of the mean difference of a place',
    usualMistakes: [
      'Coming to the first target without having moved a good way toward it: the play is then not taken up yet.',
      'Indicator on a stand that gives way with the slide: its own play is read.',
      'Setting a new value in the control from one pair, or from one place of a worn screw.',
    ],
    setUpTogether: 'indicator at the slide of {axis}',
    minutes: 20,
    source,
  },
  crossReference,
  longitudinalReference,
  verticalReference,
  transferPosition,
  changerPosition,
];
