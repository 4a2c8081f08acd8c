import type { Plane, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { base, halfMicrometre, movingSlide } from './parts';
import { quillMotionYz, quillMotionZx, tailstockMotionYz, tailstockMotionZx } from './tailstock-tolerances';

type LathePlane = Extract<Plane, 'ZX' | 'YZ'>;

/** How the two planes of a lathe are read and what a rising reading says there. */
export const lathePlanes = {
  ZX: {
    letter: 'a',
    side: 'on the tool side (+X), plunger in the ZX plane pointing to the axis',
    positive: 'leans toward the tool',
    negative: 'leans away from the tool',
    direction: 'toward-tool',
  },
  YZ: {
    letter: 'b',
    side: 'on top (+Y side), plunger pointing down to the axis in the YZ plane',
    positive: 'rises',
    negative: 'falls',
    direction: 'rising-to-free-end',
  },
} as const;

export const tailstockCommon = {
  ...base,
  resolution: halfMicrometre,
  cautions: movingSlide,
  workingStep: workingSteps.tailstock,
  method: 'parallelism',
};

export function tailstockMotion(plane: LathePlane): TestDefinition {
  const { letter, side } = lathePlanes[plane];
  return {
    ...tailstockCommon,
    id: `TS-1${letter}`,
    title: `Tailstock motion parallel to Z motion, in ${plane}`,
    boundTitle: `Motion of {tailstock} parallel to the {axis} motion, in ${plane}`,
    procedure: [
      'Draw the quill in and clamp it. Bring carriage and tailstock together; they are moved along the bed with the same distance between them.',
      `Fix the indicator to the carriage and set it on the quill near its mouth, ${side}. Pushing the plunger in counts positive. With two indicators both planes are read in one go.`,
      'At the first position clamp the tailstock as for work and set the indicator to zero.',
      'Release the tailstock, move carriage and tailstock to the next position, clamp the tailstock again in the same way, and read. Positions are those of the Z slide.',
      'Go over the whole travel that the tailstock has, and come back: the first position must read the same again within a tenth of the tolerance.',
      'The result is the largest less the smallest reading over the travel.',
    ],
    appliesTo: { kind: 'tailstock-and-axis', plane },
    judge: 'range',
    layout: {
      kind: 'angles-by-position',
      anglesDeg: ['0'],
      positionsMm: ['0', '150', '300', '450', '600', '750', '900'],
      positionName: 'along the slide',
      sag: false,
    },
    tolerance: plane === 'ZX' ? tailstockMotionZx : tailstockMotionYz,
    direction: 'either',
    instruments: ['indicator', 'indicator stand'],
    sketch: { scene: 'tailstock-quill', plane },
    dependsOn: { components: ['bed', 'tailstock'], moved: ['axis'], positioned: [] },
    judgedFigure: 'largest less smallest reading over the travel',
    usualMistakes: [
      'Reading with the tailstock unclamped, or clamped differently hard at each position.',
      'Letting the distance between carriage and tailstock change, so that another place of the quill is read.',
      'Dirt on the tailstock ways, which lifts it at one place only.',
    ],
    setUpTogether: 'indicator on the {axis} slide at {tailstock}',
    minutes: 25,
  };
}

export function quillMotion(plane: LathePlane): TestDefinition {
  const { letter, side, positive, negative, direction } = lathePlanes[plane];
  return {
    ...tailstockCommon,
    id: `TS-2${letter}`,
    title: `Tailstock quill parallel to Z motion, in ${plane}`,
    boundTitle: `Quill of {tailstock} parallel to the {axis} motion, in ${plane}`,
    procedure: [
      'Clamp the tailstock as for work, run the quill out by about 100 mm and clamp it. The ground outside of the quill is what is read.',
      `Fix the indicator to the carriage and set it on the quill close to the tailstock body, ${side}. Pushing the plunger in counts positive: a rising reading means that the free end ${positive}.`,
      'Positions count from the tailstock body along the quill to its free end. At the first one set the indicator to zero.',
      'Move the carriage along Z only, always from the same side, and read at every position.',
      'Come back to the first position: the reading must return within a tenth of the tolerance.',
      `The result is the difference of the ends over the length. The free end may be one that ${positive}, not one that ${negative}.`,
    ],
    appliesTo: { kind: 'tailstock-and-axis', plane },
    layout: {
      kind: 'angles-by-position',
      anglesDeg: ['0'],
      positionsMm: ['0', '50', '100'],
      positionName: 'along the quill',
      sag: false,
    },
    tolerance: plane === 'ZX' ? quillMotionZx : quillMotionYz,
    direction,
    instruments: ['indicator', 'indicator stand'],
    sketch: { scene: 'tailstock-quill', plane, positiveMeans: `+ free end ${positive}` },
    dependsOn: { components: ['tailstock'], moved: ['axis'], positioned: [] },
    judgedFigure: 'difference of the ends over the measuring length, by the least-squares slope',
    positiveMeans: `free end ${positive}`,
    negativeMeans: `free end ${negative}`,
    usualMistakes: [
      'Reading with the quill unclamped, where it hangs in its bore.',
      'Counting the positions from the free end, so that the sign comes out the other way round.',
      'A worn place of the quill where the clamp sits, taken for an error of the bore.',
    ],
    setUpTogether: 'indicator on the {axis} slide at {tailstock}',
    minutes: 15,
  };
}
