import type { TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { base, halfMicrometre, sagNote } from './parts';
import { coaxiality, toolHoleHeight } from './tolerances';

export const spindleCoaxiality: TestDefinition = {
  ...base,
  id: 'SS-1',
  title: 'Main spindle and sub-spindle: coaxiality',
  boundTitle: '{reference} and {spindle}: coaxiality',
  procedure: [
    'Put the clean mandrel into the sub-spindle. Bring the sub-spindle to the place where it works (its transfer position) and leave it there; note the position of its axis.',
    'Fix the indicator to a short, stiff bracket on the main spindle, plunger on the mandrel, pointing to the axis. Pushing the plunger in counts positive.',
    sagNote,
    'First section, near the nose of the sub-spindle: turn the main spindle by hand and read at 0° (+X), 90° (+Y), 180° and 270°. Back at 0° the first reading must return within a tenth of the tolerance.',
    'Check as you go: the readings at 0° and 180° together must equal those at 90° and 270° together, within a few micrometres.',
    'Take the second section, 80 to 100 mm further out, in the same way. Run-out of the mandrel drops out when the sub-spindle is turned by 180° and both sweeps are averaged; do so where it is not small.',
    'The result is the largest offset of the axes: half the differences, not the total reading, which is twice as large.',
  ],
  appliesTo: { kind: 'main-and-sub-spindle' },
  method: 'coaxiality',
  layout: { kind: 'swept-sections', positionsMm: ['20', '100'], surface: 'outside' },
  tolerance: coaxiality,
  direction: 'either',
  resolution: halfMicrometre,
  instruments: ['indicator', 'indicator bracket', 'test mandrel'],
  cautions: [
    'isolate-before-touching',
    'turn-spindle-by-hand',
    'turret-and-sub-spindle-pinch',
    'other-channels-at-rest',
    'maker-and-local-rules-first',
  ],
  sketch: { scene: 'two-spindles-sweep', anglesDeg: ['0', '90', '180', '270'] },
  dependsOn: { components: ['reference', 'spindle'], moved: [], positioned: ['spindle-axis'] },
  workingStep: workingSteps['sub-spindle-coaxiality'],
  judgedFigure: 'largest offset of the axes, both planes together',
  usualMistakes: [
    'Leaving the sag of the bracket out, which shows as an offset in height.',
    'Comparing the total reading with a tolerance that is meant for the offset, or the other way round.',
    'Sweeping at another place of the sub-spindle than the one at which it takes the part over.',
  ],
  setUpTogether: 'test mandrel in {spindle}',
  minutes: 35,
};

export const toolHole: TestDefinition = {
  ...base,
  id: 'TU-3',
  title: 'Tool hole: height and offset against the spindle axis',
  boundTitle: 'Tool hole of {turret}: height and offset against the axis of {spindle}',
  procedure: [
    'Index the turret to the station that is measured, let it clamp, and bring the hole in front of the spindle with its axes at the position where it works.',
    'By sweep: fix the indicator to a short, stiff bracket on the spindle. Sweep the mouth of the hole (or a mandrel in it), turning the spindle by hand, and read at 0° (+X), 90° (+Y), 180° and 270°. Pushing the plunger in counts positive.',
    sagNote,
    'By two heights: take the height of a mandrel in the tool hole and of a mandrel in the spindle, both from the same base and with the same indicator, and write both.',
    'Back at the first angle or height the reading must return within a tenth of the tolerance.',
    'The height of the tool hole over the spindle axis is judged. The offset in X is for information: reference and tool offsets take it up.',
  ],
  appliesTo: { kind: 'turret-and-spindle' },
  method: 'centre-height',
  layout: { kind: 'tool-centre', form: 'sweep', surface: 'bore', radiiMm: ['1', '5', '25'] },
  tolerance: toolHoleHeight,
  direction: 'either',
  /** A sweep gives half of a difference, two heights give a whole one: half and whole reading step. */
  resolution: { valueUm: '0.5', rule: 'half-even', byForm: { sweep: '0.5', heights: '1' } },
  instruments: ['indicator', 'indicator bracket', 'test mandrel'],
  cautions: [
    'isolate-before-touching',
    'turret-and-sub-spindle-pinch',
    'turn-spindle-by-hand',
    'other-channels-at-rest',
    'maker-and-local-rules-first',
  ],
  sketch: {
    scene: 'tool-hole-sweep',
    anglesDeg: ['0', '90', '180', '270'],
    positiveMeans: '+ tool hole above the spindle axis',
  },
  dependsOn: { components: ['turret', 'spindle'], moved: [], positioned: ['turret-axes'] },
  workingStep: workingSteps.turret,
  judgedFigure: 'height of the tool hole over the spindle axis; the offset in X is for information',
  positiveMeans: 'tool hole above the spindle axis',
  negativeMeans: 'tool hole below the spindle axis',
  usualMistakes: [
    'Sweeping before the turret is clamped, or with the clamping pressure off.',
    'Taking the offset in X for the error: references take it up, the height does not change by them.',
    'Forgetting the sag of a long bracket.',
  ],
  setUpTogether: 'indicator on {spindle}',
  minutes: 20,
};
