import type { CautionId, Provenance, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { code, edition } from './source';
import { contour, diameters, facedFlatness, faceOverGrid, roundness, threadLead, transferPart } from './tolerances';

const source: Provenance = {
  kind: 'from-memory',
  text: 'list of finished test pieces of ISO 13041-6 as remembered; procedure in our own words after common practice',
  confidence: 'medium',
};

const cutting: CautionId[] = [
  'guards-back-before-cutting',
  'stored-energy',
  'isolate-before-touching',
  'other-channels-at-rest',
  'maker-and-local-rules-first',
];

const base = {
  code,
  edition,
  version: 1,
  source,
  machineKinds: { not: ['engine-lathe'] },
  direction: 'either' as const,
  cautions: cutting,
  workingStep: workingSteps['cutting-test'],
};

const turned = {
  ...base,
  appliesTo: { kind: 'turning-turret-and-spindle' as const },
  dependsOn: { components: ['spindle' as const, 'turret' as const], moved: ['axis' as const], positioned: [] },
};

const cut =
  'Machine warm, guards back, door closed. Finishing cut with the maker’s tool and material, or those that are agreed; write them in the remark.';

const eachTenDegrees = Array.from({ length: 36 }, (_, k) => String(k * 10));

export const turnedPieces: TestDefinition[] = [
  {
    ...turned,
    id: 'WP-1a',
    title: 'Finished cylinder: roundness',
    boundTitle: 'Finished cylinder, {turret} on {spindle}: roundness',
    procedure: [
      cut,
      'Take the piece to a roundness instrument, or turn it between centres under an indicator on a firm table. Never judge it in the spindle that turned it.',
      'Read round one section at even angles; worse sections are further sets. Pushing the plunger in counts positive.',
      'The result is the width between two concentric circles of least separation.',
    ],
    method: 'roundness',
    layout: { kind: 'round-trace', anglesDeg: eachTenDegrees, surface: 'outside' },
    tolerance: roundness,
    resolution: { valueUm: '0.1', rule: 'half-even' },
    instruments: ['roundness instrument'],
    sketch: { scene: 'test-piece-cylinder' },
    judgedFigure: 'width between two concentric circles of least separation',
    usualMistakes: [
      'Clamping so hard that the jaws show as three lobes.',
      'Measuring with a two-point micrometer, which does not see lobes of an odd number.',
    ],
    setUpTogether: 'finished cylinder in {spindle}',
    minutes: 30,
  },
  {
    ...turned,
    id: 'WP-1b',
    title: 'Finished cylinder: consistency of diameter',
    boundTitle: 'Finished cylinder, {turret} on {spindle}: consistency of diameter',
    procedure: [
      cut,
      'Let the piece come to the temperature of the micrometer.',
      'Measure the diameter at several places along the axis, all in one axial plane, beginning near the headstock. Positions count from the headstock.',
      'Measure the first once more at the end: it must repeat.',
      'The result is the largest less the smallest diameter. It should be the larger one that lies near the headstock; the figure says which it is.',
    ],
    method: 'diameter-consistency',
    layout: { kind: 'diameters', positionsMm: ['20', '90', '160', '230', '300'] },
    tolerance: diameters,
    resolution: { valueUm: '1', rule: 'half-even' },
    instruments: ['outside micrometer'],
    sketch: { scene: 'test-piece-cylinder', plane: 'ZX' },
    judgedFigure: 'largest less smallest diameter',
    usualMistakes: [
      'Measuring at different places of the circumference, so that out-of-roundness is read as taper.',
      'Taking a piece so thin that it bends away from the tool.',
    ],
    setUpTogether: 'finished cylinder in {spindle}',
    minutes: 20,
  },
  {
    ...turned,
    id: 'WP-2',
    title: 'Faced disc: flatness',
    boundTitle: 'Faced disc, {turret} on {spindle}: flatness',
    procedure: [
      cut,
      'Face a disc to the middle in one cut. Leave it in the chuck.',
      'Fix the indicator to the bed or a plate, not to the slide that cut the face: that slide would show its own path as flat. Or take the disc to a plate or measuring machine. Plunger toward the headstock.',
      'Read from near the middle outward along a radius. Pushing the plunger in counts positive: readings that rise going outward mean that the rim stands proud and the middle is deeper, which is allowed.',
      'Positions are distances from the middle. Back at the first the reading must return within a tenth of the tolerance.',
      'The result is the rise from the middle to the rim by the least-squares slope. A middle that stands proud is not allowed.',
    ],
    method: 'parallelism',
    layout: {
      kind: 'angles-by-position',
      anglesDeg: ['0'],
      positionsMm: ['20', '50', '80', '110'],
      positionName: 'radius',
      sag: false,
    },
    tolerance: facedFlatness,
    direction: 'concave-only',
    resolution: { valueUm: '0.5', rule: 'half-even' },
    instruments: ['indicator', 'indicator stand', 'surface plate'],
    sketch: { scene: 'test-piece-face', plane: 'ZX', positiveMeans: '+ concave' },
    judgedFigure: 'rise of the face from the middle to the rim, by the least-squares slope',
    positiveMeans: 'concave',
    negativeMeans: 'convex',
    usualMistakes: [
      'Measuring with the indicator on the slide that faced the disc.',
      'A worn tool, which leaves the middle proud whatever the geometry.',
    ],
    setUpTogether: 'faced disc in {spindle}',
    minutes: 25,
  },
  {
    ...turned,
    id: 'WP-2b',
    insteadOf: 'WP-2',
    title: 'Faced disc: flatness over the whole face',
    boundTitle: 'Faced disc, {turret} on {spindle}: flatness over the whole face',
    procedure: [
      cut,
      'Face a disc to the middle in one cut. Take it to a surface plate or a measuring machine and let it come to temperature.',
      'Read at the points of a grid over the face; x and y count from the middle. Rows can be added where the disc is larger. Pushing the plunger in counts positive.',
      'Read the first point again at the end: it must return within a tenth of the tolerance.',
      'The result is the distance of the two parallel planes of least separation that hold all points. It does not tell concave from convex: look at the plot.',
    ],
    method: 'flatness',
    layout: {
      kind: 'grid',
      xMm: ['-100', '-50', '0', '50', '100'],
      yMm: ['-100', '-50', '0', '50', '100'],
      reference: 'minimum-zone',
    },
    tolerance: faceOverGrid,
    resolution: { valueUm: '0.5', rule: 'half-even' },
    instruments: ['indicator', 'indicator stand', 'surface plate'],
    sketch: { scene: 'test-piece-face', plane: 'ZX' },
    judgedFigure: 'distance of the two parallel planes of least separation',
    usualMistakes: [
      'Reading corners of the grid that lie beyond the rim: leave such points out.',
      'Pressing the disc on the plate, which bends it flat.',
    ],
    setUpTogether: 'faced disc in {spindle}',
    minutes: 40,
  },
  {
    ...turned,
    id: 'WP-3',
    title: 'Finished thread: lead',
    boundTitle: 'Finished thread, {turret} on {spindle}: lead',
    procedure: [
      cut,
      'Turn a thread of some 60 mm with the machine’s threading cycle.',
      'Measure the place of one flank along a line parallel to the axis, turn by turn, on a measuring machine or with a ball in the thread. Targets are multiples of the lead near those proposed; change them to fit.',
      'Deviation is the measured place less the target. Set the first to zero.',
      'The result is the range of the deviations over 50 mm.',
    ],
    method: 'positioning',
    judge: 'Eforward',
    layout: { kind: 'target-cycles', quantity: 'linear', cycles: 1, targets: ['0', '10', '20', '30', '40', '50'] },
    tolerance: threadLead,
    resolution: { valueUm: '1', rule: 'half-even' },
    instruments: ['measuring machine'],
    sketch: { scene: 'test-piece-cylinder', plane: 'ZX' },
    judgedFigure: 'range of the deviations of the lead over 50 mm',
    usualMistakes: [
      'Measuring the first turns, where the axis had not yet reached its feed.',
      'Measuring a piece that is still warm.',
    ],
    setUpTogether: 'finished thread in {spindle}',
    minutes: 30,
  },
  {
    ...turned,
    id: 'WP-4',
    title: 'Finished contour: deviation of the profile',
    boundTitle: 'Finished contour, {turret} on {spindle}: deviation of the profile',
    procedure: [
      cut,
      'Turn the agreed contour of arcs and cones in one finishing pass.',
      'Measure it on a contour instrument or measuring machine; give the deviation square to the programmed contour at even distances along it, outward positive.',
      'The result is the width of the deviations: how far the profile may be shifted and turned as a whole is taken out by the reference line.',
    ],
    method: 'straightness',
    layout: {
      kind: 'profile',
      positionsMm: ['0', '10', '20', '30', '40', '50', '60', '70', '80', '90', '100'],
      reference: 'least-squares',
    },
    tolerance: contour,
    resolution: { valueUm: '0.5', rule: 'half-even' },
    instruments: ['contour instrument'],
    sketch: { scene: 'test-piece-cylinder', plane: 'ZX' },
    judgedFigure: 'width of the deviations about the least-squares line along the contour',
    usualMistakes: [
      'Forgetting the radius of the tool’s nose in program or evaluation.',
      'Judging the steps at the quadrants as form: they belong to lost motion.',
    ],
    setUpTogether: 'finished contour in {spindle}',
    minutes: 40,
  },
  {
    ...base,
    id: 'WP-7',
    title: 'Transfer part: main spindle to sub-spindle',
    boundTitle: 'Transfer part from {reference} to {spindle}',
    procedure: [
      cut,
      'Turn a diameter in the main spindle, take the piece over into the sub-spindle at working speed as in production, and turn a second diameter there.',
      'Stop, lock out, and leave the piece in the sub-spindle. Turn it slowly by hand under an indicator.',
      'Read the diameter that was turned in the sub-spindle first: it must hardly run out. Then read the one that was turned in the main spindle.',
      'The result is the larger total reading: twice the offset of the axes at the place of transfer, and whatever the collet adds.',
    ],
    appliesTo: { kind: 'main-and-sub-spindle' },
    method: 'run-out',
    judge: 'largest',
    layout: {
      kind: 'turns',
      insertions: 2,
      anglesDeg: ['0', '45', '90', '135', '180', '225', '270', '315', '360'],
      insertionLabel: 'turn',
      names: ['diameter turned in the sub-spindle', 'diameter turned in the main spindle'],
    },
    tolerance: transferPart,
    resolution: { valueUm: '0.5', rule: 'half-even' },
    instruments: ['indicator', 'indicator stand'],
    sketch: { scene: 'transfer-piece', positiveMeans: '+ plunger pushed in' },
    dependsOn: { components: ['reference', 'spindle'], moved: [], positioned: ['spindle-axis'] },
    workingStep: workingSteps.transfer,
    judgedFigure: 'larger total reading of the two diameters',
    usualMistakes: [
      'Transferring at standstill when production transfers while turning.',
      'Taking the whole reading for the offset of the axes: the offset is half of it.',
    ],
    setUpTogether: 'transfer part in {spindle}',
    minutes: 30,
  },
];

const checked = {
  ...base,
  appliesTo: { kind: 'driven-tools-and-spindle' as const },
  method: 'function-check',
  tolerance: null,
  shownIn: 'items' as const,
  resolution: { valueUm: '1', rule: 'half-even' as const },
  instruments: ['measuring machine'],
  sketch: { scene: 'test-piece-pattern' as const },
  dependsOn: { components: ['spindle' as const, 'turret' as const], moved: [], positioned: ['turret-axes' as const] },
  judgedFigure: 'items not in order; figures are noted, their limits are by contract',
  minutes: 45,
};

const noted = (id: string, question: string, label: string) => ({ id, question, value: { label, unit: 'mm' } });

export const milledFeatures: TestDefinition[] = [
  {
    ...checked,
    id: 'WP-5',
    title: 'Milled flats and square, milled circle',
    boundTitle: 'Milled flats, square and circle, {turret} on {spindle}',
    procedure: [
      cut,
      'Mill a square and a circle with driven tools, the circle by X and C or by X and Y, whichever the machine has.',
      'Measure on a measuring machine and write each figure; .020 to .040 are usual (from memory, low confidence), the contract’s limits count.',
    ],
    layout: {
      kind: 'check-list',
      items: [
        noted('flatness', 'Flats are flat within the agreed limit', 'largest flatness deviation'),
        noted('square', 'Sides are square to each other within the agreed limit', 'largest squareness deviation'),
        noted('across', 'Sizes across the flats agree within the agreed limit', 'largest less smallest size'),
        noted('circle', 'Milled circle is round within the agreed limit', 'roundness deviation'),
      ],
    },
    usualMistakes: [
      'C axis not clamped or braked as in production.',
      'Climb and conventional milling mixed on one piece.',
    ],
    setUpTogether: 'milled piece in {spindle}',
  },
  {
    ...checked,
    id: 'WP-6',
    title: 'Drilled or bored pattern',
    boundTitle: 'Drilled or bored pattern, {turret} on {spindle}',
    procedure: [
      cut,
      'Bore the agreed pattern with driven tools, on the face and, where the machine can, on the circumference.',
      'Measure the places of the holes on a measuring machine and write the largest departure; the limits are those of the contract.',
    ],
    layout: {
      kind: 'check-list',
      items: [
        noted('face', 'Pattern on the face lies within the agreed limit', 'largest departure of a hole'),
        noted(
          'circumference',
          'Pattern on the circumference lies within the agreed limit',
          'largest departure of a hole',
        ),
        noted('depth', 'Depths agree within the agreed limit', 'largest less smallest depth'),
      ],
    },
    usualMistakes: ['Drilling without a centre bore, so that the drill and not the machine is tested.'],
    setUpTogether: 'milled piece in {spindle}',
  },
];
