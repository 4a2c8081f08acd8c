import { movingSlide } from '../iso-13041-1-2020/parts';
import { zStraightness } from '../iso-13041-1-2020/straightness';
import type { TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { asEngineLathe, base } from './as-engine-lathe';
import { carriageStraightness, levelAcross, levelAlong } from './tolerances';

export const bedAlong: TestDefinition = {
  ...base,
  id: 'BD-1a',
  title: 'Bed levelling, along',
  boundTitle: 'Bed levelling along {axis}',
  procedure: [
    'Set the machine on its feet as the maker says, every foot carrying, and clean the ways.',
    'Put a level along the bed, on the carriage or on a foot of known length. Make the steps equal to the length of the foot, so that each foot lands where the one before it ended.',
    'An angle counts positive when the foot ahead, away from the headstock, is the higher one. A constant tilt drops out.',
    'Go from the headstock to the tailstock step by step, wait until the level stands still, and read each step; then go back and read the same steps again.',
    'Back at the first step the level must show the first reading again within half a division.',
    'The angles are added up to heights; the result is the width about the minimum-zone line. The bed may stand higher in the middle, not hollow: look at the line of heights for it, the figure does not tell them apart.',
  ],
  appliesTo: { kind: 'longitudinal-axis', planes: ['YZ'] },
  method: 'straightness-from-angles',
  layout: { kind: 'angle-steps', stepLengthMm: '150', steps: 6, returnRun: true, reference: 'minimum-zone' },
  tolerance: levelAlong,
  direction: 'either',
  resolution: { valueUm: '0.1', rule: 'half-even' },
  instruments: ['precision level', 'foot of known length'],
  cautions: movingSlide,
  sketch: { scene: 'level-steps', plane: 'YZ', positiveMeans: '+ next foot higher' },
  dependsOn: { components: ['bed'], moved: ['axis'], positioned: [] },
  workingStep: workingSteps.level,
  judgedFigure: 'width about the minimum-zone line of the heights added up',
  usualMistakes: [
    'A foot that carries nothing: the bed takes its shape only when the machine is loaded.',
    'Levelling in one go on a fresh foundation and not looking again after a day and after some months.',
    'Reading the level before it has come to rest or while a hand or a lamp warms it.',
  ],
  setUpTogether: 'level on the carriage of {axis}',
  minutes: 40,
};

export const bedAcross: TestDefinition = {
  ...base,
  id: 'BD-1b',
  title: 'Bed levelling, across: twist',
  boundTitle: 'Bed levelling across {axis}: twist',
  procedure: [
    'Put the level across the bed, on the carriage or on a bridge that lies on both ways, and leave it there.',
    'An angle counts positive by the right-hand rule about the plus direction of Z; the same way for all readings.',
    'At the first position next to the headstock note the level as it stands; only differences count.',
    'Move along the whole bed, stop at five positions at least, always from the same side, wait until the level stands still, and read. 0.01 mm/m is 10 µm/m.',
    'Then come back and read the same positions again. At the first one the level must show the first reading within half a division.',
    'The result is the largest less the smallest reading: the twist of the bed as the carriage feels it.',
  ],
  appliesTo: { kind: 'linear-axis', letters: ['Z'] },
  method: 'angular-deviation',
  layout: {
    kind: 'angular-runs',
    positionsMm: ['0', '150', '300', '450', '600', '750', '900'],
    quantity: 'roll',
    bothDirections: true,
  },
  tolerance: levelAcross,
  direction: 'either',
  shownIn: 'mm/m',
  resolution: { valueUm: '1', rule: 'half-even' },
  instruments: ['precision level', 'bridge for the level'],
  cautions: movingSlide,
  sketch: { scene: 'level-on-carriage', positiveMeans: '+ right-hand rotation about Z' },
  dependsOn: { components: ['bed'], moved: ['axis'], positioned: [] },
  workingStep: workingSteps.level,
  judgedFigure: 'largest less smallest level reading along the bed, both directions together',
  usualMistakes: [
    'Turning the level round between positions, which brings in its own zero error.',
    'Taking what one division means over one metre for what it means over the base of the level.',
    'Correcting twist at the headstock end, where the weight of the headstock hides it.',
  ],
  setUpTogether: 'level on the carriage of {axis}',
  minutes: 20,
};

export const carriageInZx: TestDefinition = asEngineLathe(zStraightness, {
  title: 'Straightness of carriage motion in the horizontal plane',
  boundTitle: 'Straightness of the {axis} motion of the carriage, in {plane}',
  procedure: [
    'Set a straightedge up along Z, or hold a long mandrel between centres, and let it come to the temperature of the machine. Its working face looks along X.',
    'Fix the indicator to the carriage, plunger square to the straightedge or mandrel, at the height of the centres. Bring both ends to the same reading roughly; what is left drops out with the reference line.',
    'At the first position set the indicator to zero. Pushing the plunger in counts positive.',
    'Move along the whole travel, always approaching from the same side, and read at every position.',
    'Come back to the first position: the reading must return within a tenth of the tolerance.',
    'The result is the width about the minimum-zone line.',
  ],
  appliesTo: { kind: 'longitudinal-axis', planes: ['ZX'] },
  layout: {
    kind: 'profile',
    positionsMm: ['0', '100', '200', '300', '400', '500', '600', '700', '800', '900'],
    reference: 'minimum-zone',
  },
  tolerance: carriageStraightness,
  sketch: { scene: 'straightedge-along-motion', plane: 'ZX', positiveMeans: '+ plunger pushed in' },
  judgedFigure: 'width about the minimum-zone line',
  usualMistakes: [
    'A mandrel that is bent: turn it by 180° and read again before its figure is believed.',
    'Reading near the headstock only, where the ways of a lathe are worn most.',
    'Letting the carriage hang on the screw or the half nut instead of moving it by hand the same way each time.',
  ],
});
