import { closedTurn, movingSlide } from '../iso-13041-1-2020/parts';
import type { TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { base } from './as-engine-lathe';
import { leadscrewLead, leadscrewSlip } from './tolerances';

const common = {
  ...base,
  appliesTo: { kind: 'linear-axis' as const, letters: ['Z'] },
  direction: 'either' as const,
  dependsOn: { components: ['bed' as const], moved: ['axis' as const], positioned: [] },
};

export const screwSlip: TestDefinition = {
  ...common,
  id: 'LS-1',
  title: 'Leadscrew: axial slip',
  boundTitle: 'Leadscrew of {axis}: axial slip',
  procedure: [
    'Put a clean ball with a little grease into the centre hole at the free end of the leadscrew. Close the half nut in the middle of the bed, so that the screw pulls.',
    'Fix the indicator to the bed, flat contact point against the ball, plunger along the screw. Pushing the plunger in counts positive.',
    'Take up the play by driving the carriage a little in one direction, and set the indicator near zero at 0°.',
    'Turn the screw slowly, always the same way, and read every 45° over one turn.',
    'Read once more back at 0°: the closing reading must agree with the first within a tenth of the tolerance.',
    'The result is the largest less the smallest reading of the turn. The play of the thrust bearing is another thing: it shows when the direction is changed.',
  ],
  method: 'axial-run-out',
  layout: { kind: 'circles', names: ['ball on the axis of the screw'], anglesDeg: closedTurn, turned: 'screw' },
  tolerance: leadscrewSlip,
  resolution: { valueUm: '0.5', rule: 'half-even' },
  instruments: ['indicator', 'indicator stand', 'ball'],
  cautions: movingSlide,
  sketch: { scene: 'axial-slip', anglesDeg: ['0', '90', '180', '270'] },
  workingStep: workingSteps['lost-motion'],
  judgedFigure: 'largest less smallest reading of the turn, on the axis of the screw',
  usualMistakes: [
    'Turning the screw without load, so that it floats in its thrust bearing.',
    'A ball that does not lie on the axis because the centre hole is damaged.',
  ],
  setUpTogether: 'indicator at the end of the leadscrew of {axis}',
  minutes: 15,
};

export const screwLead: TestDefinition = {
  ...common,
  id: 'LS-2',
  title: 'Leadscrew: lead over 300 mm',
  boundTitle: 'Lead that the leadscrew gives the {axis} slide, over 300 mm',
  procedure: [
    'Set the change gears for a lead that gives whole numbers, close the half nut and let the spindle drive the carriage. Divide the spindle at the chuck, or mark whole turns.',
    'Set a length standard with steps, gauge blocks or a laser up along Z; with blocks, an indicator on the carriage finds each end. A reading is the place reached less the place that the turns of the spindle should give, plus where it lies further in + of Z.',
    'Take up all play in one direction, set the first place as 0 and note it.',
    'Go on in the same direction, never back, and read every 50 mm up to 300 mm.',
    'Drive back well behind the first place, come back to it in the same direction and read it once more: it must repeat within a tenth of the tolerance.',
    'The result is the largest less the smallest of the readings over the 300 mm. Take the part of the bed that is used most; a second one may be measured besides.',
  ],
  method: 'positioning',
  judge: 'Eforward',
  layout: {
    kind: 'target-cycles',
    quantity: 'linear',
    cycles: 1,
    targets: ['0', '50', '100', '150', '200', '250', '300'],
    oneWay: true,
  },
  tolerance: leadscrewLead,
  resolution: { valueUm: '1', rule: 'half-even' },
  instruments: ['step gauge', 'gauge blocks', 'laser interferometer', 'indicator'],
  cautions: movingSlide,
  sketch: { scene: 'laser-along-motion', positiveMeans: '+ carriage too far in + of Z' },
  workingStep: workingSteps.positioning,
  judgedFigure: 'largest less smallest deviation of one direction over 300 mm',
  usualMistakes: [
    'Changing the direction on the way, so that the play of gears, nut and thrust bearing enters.',
    'Not dividing the spindle finely enough: a degree of the spindle is a 360th of the lead.',
    'Measuring a warm screw against a cold length standard.',
  ],
  setUpTogether: 'length standard along {axis}',
  minutes: 45,
};
