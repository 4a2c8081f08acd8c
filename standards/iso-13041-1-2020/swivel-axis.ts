import type { CautionId, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { base, halfMicrometre, movingSlide, wholeMicrometre } from './parts';
import { pivotPlace, swivelAtStops, swivelPlane } from './tool-tolerances';

const cautions: CautionId[] = [...movingSlide, 'turret-and-sub-spindle-pinch'];

const common = {
  ...base,
  appliesTo: { kind: 'rotary-axis' as const, letters: ['B' as const] },
  direction: 'either' as const,
  cautions,
  workingStep: workingSteps['rotary-axes'],
  setUpTogether: 'test mandrel in the tool spindle on {rotary}',
};

export const swivelInZx: TestDefinition = {
  ...common,
  id: 'B-1',
  title: 'Swivel axis: tool axis stays in the ZX plane',
  boundTitle: 'Swivel axis {rotary}: tool axis stays in the ZX plane',
  procedure: [
    'Put a clean mandrel into the tool spindle. Turn it so that its run-out lies across the height that is read, and leave it there.',
    'Swivel to 0° and clamp. Fix the indicator to a part that stands still, on top of the mandrel (+Y side), plunger pointing down along Y, close to the tool spindle. Pushing the plunger in counts positive.',
    'Set it to zero at the highest line of the mandrel.',
    'Swivel to −45°, 45° and 90°, clamping each time as for work; bring the same place of the mandrel back under the plunger with X and Z alone, find the highest line and read. Y is not moved.',
    'Back at 0° the reading must return within a tenth of the tolerance.',
    'Read the same angles again at 100 mm from the nose: a difference that grows outward means that the swivel axis leans against the ZX plane, or the tool axis against the swivel.',
    'The result is the larger range of height of the two places.',
  ],
  method: 'axial-run-out',
  layout: {
    kind: 'circles',
    names: ['close to the nose', '100 mm from the nose'],
    anglesDeg: ['0', '-45', '45', '90'],
    turned: 'swivel axis',
  },
  tolerance: swivelPlane,
  resolution: halfMicrometre,
  instruments: ['indicator', 'indicator stand', 'test mandrel'],
  sketch: { scene: 'swivel-axis', plane: 'ZX' },
  dependsOn: { components: ['rotary'], moved: ['rotary', 'turret-axes'], positioned: [] },
  judgedFigure: 'largest range of height over the swivel, of the two places',
  usualMistakes: [
    'Reading beside the highest line of the mandrel after swivelling.',
    'Comparing readings taken clamped with others taken unclamped.',
    'Bringing the mandrel back with Y as well, which hides what is looked for.',
  ],
  minutes: 40,
};

export const pivotCentre: TestDefinition = {
  ...common,
  id: 'B-2',
  title: 'Swivel axis: place of its centre in X and Z',
  boundTitle: 'Swivel axis {rotary}: place of its centre in X and Z',
  procedure: [
    'Put a ball of known distance from the nose into the tool spindle and turn out its run-out. Note the distance from the ball to the swivel centre that the control holds: it is the nominal radius.',
    'Fix the indicator or a touch probe to a part that stands still, so that the centre of the ball can be found in X and in Z. Pushing the plunger in counts positive.',
    'At 0° bring the ball to the zero of the indicators with X and Z and note both slides, as radius values.',
    'Swivel from angle to angle, clamp, bring the ball to the same zero again and note X and Z. What the slides have gone through is the circle of the ball about the swivel centre.',
    'For each angle work out the distance of the ball from the centre that the control holds; what it is more or less than the nominal radius is the reading. Angles count from Z to X.',
    'Go back through the same angles and read them again. Back at 0° both slides must show the first values within a few micrometres.',
    'The circle fitted to the readings has its centre where the swivel really turns: its two figures are the error of the stored centre. The width of the ring only says how well the swivel holds its circle.',
  ],
  method: 'circular',
  judge: 'G',
  layout: {
    kind: 'circle-trace',
    anglesDeg: ['0', '15', '30', '45', '60', '75', '90'],
    nominalRadiusMm: '200',
    arcDeg: '90',
  },
  tolerance: pivotPlace,
  resolution: wholeMicrometre,
  instruments: ['indicator', 'indicator stand', 'touch probe', 'ball on a mandrel'],
  sketch: { scene: 'swivel-axis', plane: 'ZX' },
  dependsOn: { components: ['rotary'], moved: ['rotary', 'turret-axes'], positioned: [] },
  judgedFigure: 'width of the ring of the readings; the place of its centre is what is wanted, limits by contract',
  usualMistakes: [
    'Noting X as a diameter.',
    'Swivelling through a small arc: the place of the centre then scatters many times more than the readings.',
    'Leaving a centre correction of the control switched on that already moves the slides along.',
  ],
  minutes: 60,
};

function atStop(id: string, stop: '0' | '90'): TestDefinition {
  const along = stop === '0' ? 'Z' : 'X';
  const across = stop === '0' ? 'X' : 'Z';
  return {
    ...common,
    id,
    title: `Swivel axis at ${stop}°: tool axis parallel to ${along} motion`,
    boundTitle: `Tool axis on {rotary} at ${stop}° parallel to ${along} motion`,
    procedure: [
      `Put a clean mandrel into the tool spindle, swivel to ${stop}° from the side from which the program comes, and clamp. Mark 0° on the tool spindle.`,
      `Fix the indicator to a part that stands still, plunger in the ZX plane on the +${across} side of the mandrel and square to it. Pushing the plunger in counts positive: a rising reading means that the free end leans toward +${across}.`,
      'Positions count from the nose along the mandrel to its free end. At the first one set the indicator near zero.',
      `Move in ${along} only, always approaching from the same side, and read at every position. Back at the first position the reading must return within a tenth of the tolerance.`,
      'Turn the tool spindle by 180° by hand and read the same positions again. The mean of both drops run-out and tilt of the mandrel.',
      'The result is the least-squares slope of the means times the measuring length. Swivel away and back once: the figure must repeat, or the index and not the angle is at fault.',
    ],
    method: 'parallelism',
    layout: {
      kind: 'angles-by-position',
      anglesDeg: ['0', '180'],
      positionsMm: ['20', '90', '160', '230', '300'],
      positionName: 'along the mandrel',
      sag: false,
      turned: 'tool spindle',
    },
    tolerance: swivelAtStops,
    resolution: halfMicrometre,
    instruments: ['indicator', 'indicator stand', 'test mandrel'],
    cautions: [...cautions, 'turn-spindle-by-hand'],
    sketch: { scene: 'swivel-axis', anglesDeg: ['0', '180'], plane: 'ZX', positiveMeans: `+ toward +${across}` },
    dependsOn: { components: ['rotary'], moved: ['turret-axes'], positioned: ['rotary'] },
    judgedFigure: 'least-squares slope over the measuring length',
    positiveMeans: `free end leans toward +${across}`,
    negativeMeans: `free end leans toward −${across}`,
    usualMistakes: [
      'Coming to the angle from the other side than in work, so that the play of the swivel enters.',
      'Correcting the zero of the swivel before the tool spindle itself runs true.',
    ],
    minutes: 25,
  };
}

export const swivelAtZero = atStop('B-3a', '0');
export const swivelAtNinety = atStop('B-3b', '90');
