import type { Plane, TestDefinition } from '../types';
import { lathePlanes, tailstockCommon } from './tailstock-motion';
import { centresYz, centresZx, quillTaper } from './tailstock-tolerances';

type LathePlane = Extract<Plane, 'ZX' | 'YZ'>;

export function quillTaperAxis(plane: LathePlane): TestDefinition {
  const { letter, side, positive, negative } = lathePlanes[plane];
  const yz = plane === 'YZ';
  return {
    ...tailstockCommon,
    id: `TS-3${letter}`,
    title: `Taper of the tailstock quill parallel to Z motion, in ${plane}`,
    boundTitle: `Taper of the quill of {tailstock} parallel to the {axis} motion, in ${plane}`,
    procedure: [
      'Clamp the tailstock as for work, draw the quill in and clamp it. Wipe the taper and the mandrel clean, put the mandrel in and mark 0° on both.',
      `Fix the indicator to the carriage and set it on the mandrel close to the quill, ${side}. Pushing the plunger in counts positive: a rising reading means that the free end ${positive}.`,
      'Positions count from the quill along the mandrel to its free end. At the first one set the indicator near zero.',
      'Move the carriage along Z only, always from the same side, and read at every position. Back at the first position the reading must return within a tenth of the tolerance.',
      'Draw the mandrel, turn it by 180°, put it in again and read the same positions. The mean of both drops run-out and tilt of the mandrel.',
      yz
        ? 'Write the sag of the mandrel at each position; it is added to the means. The result is the least-squares slope of the means times the measuring length.'
        : 'The result is the least-squares slope of the means times the measuring length.',
    ],
    appliesTo: { kind: 'tailstock-and-axis', plane },
    layout: {
      kind: 'angles-by-position',
      anglesDeg: ['0', '180'],
      positionsMm: ['0', '75', '150', '225', '300'],
      positionName: 'along the mandrel',
      sag: yz,
      turned: 'mandrel',
    },
    tolerance: quillTaper,
    direction: 'either',
    instruments: ['indicator', 'indicator stand', 'test mandrel'],
    sketch: {
      scene: 'tailstock-quill',
      anglesDeg: ['0', '180'],
      plane,
      positiveMeans: `+ free end ${positive}`,
    },
    dependsOn: { components: ['tailstock'], moved: ['axis'], positioned: [] },
    judgedFigure: `least-squares slope over the measuring length${yz ? ', mandrel sag added' : ''}`,
    positiveMeans: `free end ${positive}`,
    negativeMeans: `free end ${negative}`,
    usualMistakes: [
      'Turning the quill or the mandrel in the taper without drawing it out and cleaning both again.',
      'A tang or draw bar that pushes the mandrel to one side.',
      'Forgetting the sag of the mandrel in the upright plane.',
    ],
    setUpTogether: 'test mandrel in the quill of {tailstock}',
    minutes: 25,
  };
}

export function lineOfCentres(plane: LathePlane): TestDefinition {
  const { letter, side } = lathePlanes[plane];
  const yz = plane === 'YZ';
  return {
    ...tailstockCommon,
    id: `TS-4${letter}`,
    title: `Line of centres parallel to Z motion, in ${plane}`,
    boundTitle: `Line of centres from {spindle} to {tailstock} parallel to the {axis} motion, in ${plane}`,
    procedure: [
      'Put clean centres into spindle and quill and hold a mandrel between them, about three quarters of the distance between centres long, 500 mm at most. Clamp tailstock and quill as for work, with the usual light pressure of the centre.',
      `Fix the indicator to the carriage and set it on the mandrel close to the spindle, ${side}. Pushing the plunger in counts positive.`,
      'Positions count from the spindle along the mandrel toward the tailstock. At the first one set the indicator near zero.',
      'Move the carriage along Z only, always from the same side, and read near the spindle, in the middle and near the tailstock. Back at the first position the reading must return within a tenth of the tolerance.',
      'Turn the mandrel by 180° between the centres and read the same positions again. The mean of both drops the run-out of the mandrel; the spindle centre must run true, or is turned with the mandrel.',
      yz
        ? 'A mandrel between centres hangs through in the middle, alike on both sides, so that its sag does not change the difference of the ends. The tailstock may be the higher one, not the lower.'
        : 'The result is the difference of the ends, by the least-squares slope.',
    ],
    appliesTo: { kind: 'tailstock-and-spindle', plane },
    layout: {
      kind: 'angles-by-position',
      anglesDeg: ['0', '180'],
      positionsMm: ['0', '200', '400'],
      positionName: 'along the mandrel',
      sag: false,
      turned: 'mandrel',
    },
    tolerance: yz ? centresYz : centresZx,
    direction: yz ? 'tailstock-high' : 'either',
    instruments: ['indicator', 'indicator stand', 'mandrel between centres'],
    sketch: {
      scene: 'between-centres',
      anglesDeg: ['0', '180'],
      plane,
      positiveMeans: yz ? '+ tailstock higher' : '+ tailstock end toward the tool',
    },
    dependsOn: { components: ['spindle', 'tailstock'], moved: ['axis'], positioned: [] },
    judgedFigure: 'difference of the ends over the length of the mandrel, by the least-squares slope',
    positiveMeans: yz ? 'tailstock higher than the spindle' : 'tailstock end toward the tool',
    negativeMeans: yz ? 'tailstock lower than the spindle' : 'tailstock end away from the tool',
    usualMistakes: [
      'Chips or burrs in the centre holes, so that the mandrel does not run true.',
      'More pressure of the quill than in work, which bends the mandrel and lifts the tailstock.',
      'Correcting the tailstock sideways before spindle and quill themselves lie parallel to Z.',
    ],
    setUpTogether: 'mandrel between {spindle} and {tailstock}',
    minutes: 25,
  };
}
