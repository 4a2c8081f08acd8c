import type { Plane, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { base, halfMicrometre, indexedTurret, sagNote } from './parts';
import { drivenTool, type ToolSpindleKind, toolSpindle } from './tool-spindle-run-outs';
import { toolSpindleAxis, toolSpindleHeight } from './tool-tolerances';

type Along = 'Z' | 'X';

/** Which way a reading may go in a plane: the side of the mandrel, and what a rising reading says. */
const sides: Record<Plane, { side: string; leans: (along: Along) => [string, string] }> = {
  ZX: {
    side: 'in the ZX plane',
    leans: (along) => (along === 'Z' ? ['leans toward +X', 'leans toward −X'] : ['leans toward +Z', 'leans toward −Z']),
  },
  YZ: { side: 'on top (+Y side) in the YZ plane', leans: () => ['rises', 'falls'] },
  XY: { side: 'on top (+Y side) in the XY plane', leans: () => ['rises', 'falls'] },
};

/** Axial tools lie along Z, radial tools along X, which is square to Z. */
export function toolAxis(kind: ToolSpindleKind, along: Along, plane: Plane, id: string): TestDefinition {
  const { side, leans } = sides[plane];
  const [positive, negative] = leans(along);
  const inZx = plane === 'ZX';
  const plunger = inZx ? `on its +${along === 'Z' ? 'X' : 'Z'} side, ${side}` : side;
  const way = along === 'Z' ? 'axial' : 'radial';
  return {
    ...base,
    id,
    title: `${kind.name}, ${way}: axis parallel to ${along} motion, in ${plane}`,
    boundTitle:
      kind === toolSpindle
        ? `Axis of {spindle} parallel to ${along} motion, in ${plane}`
        : `Axis of the ${way} driven tool of {turret} parallel to ${along} motion, in ${plane}`,
    procedure: [
      kind.prepare,
      `The tool must point along ${along}${along === 'X' ? ', square to Z' : ''}; where it cannot, this test does not apply. Put a clean mandrel in and mark 0°.`,
      `Fix the indicator to a part that stands still, plunger on the mandrel ${plunger}, square to it. Pushing the plunger in counts positive: a rising reading means that the free end ${positive}.`,
      'Positions count from the nose along the mandrel to its free end. At the first one set the indicator near zero.',
      `Move in ${along} only, always approaching from the same side, and read at every position. Back at the first position the reading must return within a tenth of the tolerance.`,
      'Turn the tool spindle by 180° by hand and read the same positions again. The mean of both drops run-out and tilt of the mandrel.',
      inZx
        ? 'The result is the least-squares slope of the means times the measuring length.'
        : 'Write the sag of the mandrel where it is long; it is added to the means. The result is the least-squares slope of the means times the measuring length.',
    ],
    appliesTo: kind === drivenTool ? { kind: 'driven-tools', points: way } : kind.appliesTo,
    method: 'parallelism',
    layout: {
      kind: 'angles-by-position',
      anglesDeg: ['0', '180'],
      positionsMm: ['10', '35', '60', '85', '110'],
      positionName: 'along the mandrel',
      sag: !inZx,
      turned: 'tool spindle',
    },
    tolerance: toolSpindleAxis,
    direction: 'either',
    resolution: halfMicrometre,
    instruments: ['indicator', 'indicator stand', 'test mandrel'],
    cautions: [...indexedTurret, 'turn-spindle-by-hand'],
    sketch: {
      scene: 'tool-spindle-mandrel',
      anglesDeg: ['0', '180'],
      plane,
      positiveMeans: `+ free end ${positive}`,
    },
    dependsOn: { components: kind.rests, moved: ['turret-axes'], positioned: [] },
    workingStep: workingSteps['live-tools'],
    judgedFigure: `least-squares slope over the measuring length${inZx ? '' : ', mandrel sag added'}`,
    positiveMeans: `free end ${positive}`,
    negativeMeans: `free end ${negative}`,
    usualMistakes: [
      'Reading at one angle only, so that the run-out of a mandrel in a collet is taken for tilt.',
      'Moving another axis than the one the tool points along.',
      kind === drivenTool
        ? 'Measuring one holder and taking its error for that of the turret.'
        : 'Leaving the swivel axis unclamped, or clamped otherwise than in work.',
    ],
    setUpTogether: `test mandrel in ${kind.bound}`,
    minutes: 20,
  };
}

export function toolHeight(kind: ToolSpindleKind, id: string): TestDefinition {
  const own = kind === toolSpindle;
  const work = own ? '{reference}' : '{spindle}';
  return {
    ...base,
    id,
    title: own
      ? 'Tool spindle: height against the work spindle axis'
      : 'Driven tool: height against the work spindle axis',
    boundTitle: own
      ? `Height of {spindle} against the axis of ${work}`
      : `Height of the driven tool of {turret} against the axis of ${work}`,
    procedure: [
      kind.prepare,
      'By two heights: put a mandrel into the tool spindle and one into the work spindle. Take the height of both on top with the same indicator from the same base, allow for unequal diameters, and write both. Turn each mandrel to the middle of its run-out first.',
      'By sweep, where the tool points along Z: fix the indicator to a short, stiff bracket on the work spindle, sweep a mandrel in the tool spindle and read at 0° (+X), 90° (+Y), 180° and 270°. Pushing the plunger in counts positive.',
      sagNote,
      'Back at the first height or angle the reading must return within a tenth of the tolerance.',
      'The height of the tool axis over the work spindle axis is judged. A Y axis stands at the place that the control takes for the centre; note it.',
    ],
    appliesTo: own ? { kind: 'tool-spindle-and-spindle' } : { kind: 'driven-tools-and-spindle' },
    method: 'centre-height',
    layout: { kind: 'tool-centre', form: 'heights', surface: 'outside', radiiMm: ['1', '5', '25'] },
    tolerance: toolSpindleHeight,
    direction: 'either',
    resolution: { valueUm: '0.5', rule: 'half-even', byForm: { sweep: '0.5', heights: '1' } },
    instruments: ['indicator', 'indicator stand', 'test mandrel'],
    cautions: [...indexedTurret, 'turn-spindle-by-hand'],
    sketch: { scene: 'tool-hole-heights', positiveMeans: '+ tool above the work spindle axis' },
    dependsOn: {
      components: own ? ['spindle', 'reference'] : ['turret', 'spindle'],
      moved: [],
      positioned: ['turret-axes'],
    },
    workingStep: workingSteps['live-tools'],
    judgedFigure: 'height of the tool axis over the work spindle axis',
    positiveMeans: 'tool above the work spindle axis',
    negativeMeans: 'tool below the work spindle axis',
    usualMistakes: [
      'Comparing mandrels of unequal diameter without allowing for half the difference.',
      'Leaving Y where the last program left it instead of at its centre.',
      'Taking heights on the highest place of the run-out of one mandrel and the lowest of the other.',
    ],
    setUpTogether: `height indicator at ${work}`,
    minutes: 25,
  };
}

/** TU-7 and TU-8, tool spindles first. */
export const toolAxes: TestDefinition[] = [
  toolAxis(toolSpindle, 'Z', 'ZX', 'TU-7a'),
  toolAxis(toolSpindle, 'X', 'ZX', 'TU-7b'),
  toolAxis(drivenTool, 'Z', 'ZX', 'TU-7c'),
  toolAxis(drivenTool, 'X', 'ZX', 'TU-7d'),
  toolAxis(toolSpindle, 'Z', 'YZ', 'TU-7e'),
  toolAxis(toolSpindle, 'X', 'XY', 'TU-7f'),
  toolAxis(drivenTool, 'Z', 'YZ', 'TU-7g'),
  toolAxis(drivenTool, 'X', 'XY', 'TU-7h'),
  toolHeight(toolSpindle, 'TU-8a'),
  toolHeight(drivenTool, 'TU-8b'),
];
