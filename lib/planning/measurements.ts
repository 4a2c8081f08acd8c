import type { OwnDefinitionInput } from '@/lib/schemas/own-definition';
import type { Layout, ShownIn, SketchSpec, ToleranceRule } from '@/standards/types';

/** Something that can be measured on a sheet, by the name that the trade has for it. */
export interface Measurement {
  id: string;
  label: string;
  /** What the readings come to. */
  gives: string;
  method: string;
  /** Whether the result carries a sign that says something, so that it can be permitted to one side only. */
  signed: boolean;
  /** Figures of the method that can be judged; the first is what it does by itself. Empty: there is one only. */
  judges: { value: string; label: string }[];
  toleranceUnit: NonNullable<ToleranceRule['unit']>;
  shownIn?: ShownIn;
  /** A tolerance given over a length is scaled to the length really measured. */
  perLength: boolean;
  scene: SketchSpec['scene'];
  /** Fields to begin with, as the composer shows them. */
  layout: OwnDefinitionInput['layout'];
  /** Layouts of the method that differ in more than figures from what stands in `layout`. */
  fits?: (layout: Layout) => string | null;
}

const length = { toleranceUnit: 'µm' as const, signed: false, judges: [], perLength: false };
const rotary = (layout: Layout) => layout.kind === 'target-cycles' && layout.quantity === 'rotary';
const tilt = (layout: Layout) => layout.kind === 'rotation-turns' && layout.direction === 'tilt';

export const measurements: Measurement[] = [
  {
    ...length,
    id: 'run-out',
    label: 'Run-out, radial',
    gives: 'the total indicator reading of a turn, or the mean of several insertions',
    method: 'run-out',
    judges: [
      { value: 'mean', label: 'mean of the turns' },
      { value: 'largest', label: 'largest of the turns' },
    ],
    scene: 'spindle-nose',
    layout: { kind: 'turns', insertions: 1, anglesDeg: '0 45 90 135 180 225 270 315 360', insertionLabel: 'turn' },
  },
  {
    ...length,
    id: 'face-run-out',
    label: 'Run-out of a face, axial slip',
    gives: 'the largest total indicator reading of the circles',
    method: 'axial-run-out',
    scene: 'face-run-out',
    layout: { kind: 'circles', names: 'near the edge', anglesDeg: '0 45 90 135 180 225 270 315' },
  },
  {
    ...length,
    id: 'straightness',
    label: 'Straightness, indicator on a straightedge',
    gives: 'the breadth of the line that was measured',
    method: 'straightness',
    perLength: true,
    scene: 'straightedge-along-motion',
    layout: { kind: 'profile', positionsMm: '0 50 100 150 200 250 300', reference: 'minimum-zone', localLengthMm: '' },
  },
  {
    ...length,
    id: 'straightness-turned-over',
    label: 'Straightness, straightedge turned over',
    gives: 'the breadth of the line, without the straightedge’s own part',
    method: 'straightness-reversal',
    perLength: true,
    scene: 'straightedge-turned-over',
    layout: { kind: 'two-runs', positionsMm: '0 50 100 150 200 250 300', reference: 'minimum-zone' },
  },
  {
    ...length,
    id: 'straightness-by-angles',
    label: 'Straightness, level or autocollimator step by step',
    gives: 'the breadth of the line that the angles add up to',
    method: 'straightness-from-angles',
    perLength: true,
    scene: 'level-steps',
    layout: { kind: 'angle-steps', stepLengthMm: '100', steps: 6, returnRun: true, reference: 'minimum-zone' },
  },
  {
    ...length,
    id: 'flatness',
    label: 'Flatness',
    gives: 'the breadth of the surface that was measured',
    method: 'flatness',
    scene: 'straightedge-along-motion',
    layout: { kind: 'grid', xMm: '0 100 200', yMm: '0 80 160', reference: 'minimum-zone' },
  },
  {
    ...length,
    id: 'parallelism',
    label: 'Parallelism of a motion, mandrel turned',
    gives: 'the rise over the measuring length, with the mandrel’s own part taken out',
    method: 'parallelism',
    signed: true,
    judges: [
      { value: 'slope', label: 'slope over the measuring length' },
      { value: 'range', label: 'largest less smallest mean' },
    ],
    perLength: true,
    scene: 'mandrel-along-motion',
    layout: {
      kind: 'angles-by-position',
      anglesDeg: '0 180',
      positionsMm: '0 75 150 225 300',
      positionName: 'z',
      sag: false,
    },
  },
  {
    ...length,
    id: 'squareness-to-axis',
    label: 'Squareness of a cross motion to a spindle axis',
    gives: 'the fall of a face over the measuring length, concave or convex',
    method: 'squareness-to-axis',
    signed: true,
    perLength: true,
    scene: 'disc-across-motion',
    layout: {
      kind: 'angles-by-position',
      anglesDeg: '0 180',
      positionsMm: '20 50 80 110 140',
      positionName: 'radius',
      sag: false,
    },
  },
  {
    ...length,
    id: 'squareness',
    label: 'Squareness of two motions, square turned over',
    gives: 'the angle between the motions, as a length over the measured arm',
    method: 'squareness',
    signed: true,
    perLength: true,
    scene: 'square-two-motions',
    layout: { kind: 'square-reversed', referencePositionsMm: '0 50 100', measuredPositionsMm: '0 50 100' },
  },
  {
    ...length,
    id: 'coaxiality',
    label: 'Coaxiality, swept',
    gives: 'the largest offset of the axes',
    method: 'coaxiality',
    scene: 'two-spindles-sweep',
    layout: { kind: 'swept-sections', positionsMm: '0 150', surface: 'outside' },
  },
  {
    ...length,
    id: 'centre-height',
    label: 'Centre height of a tool place',
    gives: 'how far the tool stands above the spindle axis',
    method: 'centre-height',
    signed: true,
    scene: 'tool-hole-sweep',
    layout: { kind: 'tool-centre', form: 'sweep', surface: 'bore', radiiMm: '5 16' },
  },
  {
    ...length,
    id: 'lost-motion',
    label: 'Lost motion',
    gives: 'the largest mean difference between coming from plus and from minus',
    method: 'lost-motion',
    scene: 'slide-approach',
    layout: { kind: 'approach-pairs', places: 'middle of the travel', feeds: ['cutting-feed'], pairs: 5 },
  },
  {
    ...length,
    id: 'reference-shift',
    label: 'Reference point, target and found',
    gives: 'how far the slide stands from its target',
    method: 'reference-shift',
    scene: 'target-and-found',
    layout: { kind: 'target-and-found', basis: null },
  },
  {
    ...length,
    id: 'positioning',
    label: 'Positioning of a linear axis, cycles both ways',
    gives: 'accuracy A, or another figure of ISO 230-2',
    method: 'positioning',
    judges: ['A', 'E', 'R', 'B', 'M'].map((value) => ({ value, label: value })),
    scene: 'laser-along-motion',
    layout: { kind: 'target-cycles', quantity: 'linear', cycles: 5, targets: '0 50 100 150 200' },
    fits: (layout) => (rotary(layout) ? 'Choose the positioning of a rotary axis for targets in degrees.' : null),
  },
  {
    ...length,
    id: 'positioning-rotary',
    label: 'Positioning of a rotary axis, cycles both ways',
    gives: 'accuracy A, or another figure of ISO 230-2',
    method: 'positioning',
    judges: ['A', 'E', 'R', 'B', 'M'].map((value) => ({ value, label: value })),
    toleranceUnit: '″',
    shownIn: '″',
    scene: 'rotary-axis',
    layout: { kind: 'target-cycles', quantity: 'rotary', cycles: 3, targets: '0 45 90 135 180 225 270 315' },
    fits: (layout) => (rotary(layout) ? null : 'Choose the positioning of a linear axis for targets in mm.'),
  },
  {
    ...length,
    id: 'angular-deviation',
    label: 'Pitch, yaw or roll over a travel',
    gives: 'largest less smallest angle over the travel',
    method: 'angular-deviation',
    toleranceUnit: 'µm/m',
    shownIn: 'mm/m',
    scene: 'angle-instrument',
    layout: { kind: 'angular-runs', positionsMm: '0 50 100 150 200', quantity: 'pitch', bothDirections: true },
  },
  {
    ...length,
    id: 'circular',
    label: 'Circular test of two axes',
    gives: 'circular deviation',
    method: 'circular',
    judges: [
      { value: 'Gb', label: 'Gb, both directions together' },
      { value: 'G', label: 'G, the larger of the two' },
    ],
    scene: 'circular-gauge',
    layout: {
      kind: 'circle-trace',
      anglesDeg: '0 30 60 90 120 150 180 210 240 270 300 330',
      nominalRadiusMm: '100',
      arcDeg: '360',
    },
  },
  {
    ...length,
    id: 'axis-of-rotation',
    label: 'Error motion of a spindle, radial or axial',
    gives: 'total, synchronous or asynchronous error motion',
    method: 'axis-of-rotation',
    judges: [
      { value: 'total', label: 'total' },
      { value: 'synchronous', label: 'synchronous' },
      { value: 'asynchronous', label: 'asynchronous' },
    ],
    scene: 'spindle-sensors',
    layout: { kind: 'rotation-turns', turns: 3, anglesDeg: '0 45 90 135 180 225 270 315', direction: 'radial' },
    fits: (layout) => (tilt(layout) ? 'Tilt is an angle: measure it radially in two planes instead.' : null),
  },
  {
    ...length,
    id: 'indexing',
    label: 'Indexing of a turret, repeatability or place',
    gives: 'the worst scatter of a station, or its departure from the mean',
    method: 'indexing',
    judges: [
      { value: 'repeatability', label: 'repeatability' },
      { value: 'accuracy', label: 'departure from the mean of the stations' },
    ],
    scene: 'turret-index',
    layout: { kind: 'stations', stations: '', repeats: 3, radiusMm: '' },
  },
  {
    ...length,
    id: 'two-collar',
    label: 'Taper of a turned piece, two collars',
    gives: 'half the difference of the diameters over their distance',
    method: 'two-collar',
    signed: true,
    perLength: true,
    scene: 'two-collar-piece',
    layout: { kind: 'two-collars', distanceMm: '150' },
  },
  {
    ...length,
    id: 'diameters',
    label: 'Consistency of turned diameters',
    gives: 'largest less smallest diameter',
    method: 'diameter-consistency',
    scene: 'test-piece-cylinder',
    layout: { kind: 'diameters', positionsMm: '20 80 140' },
  },
  {
    ...length,
    id: 'roundness',
    label: 'Roundness',
    gives: 'the breadth of the ring that holds the profile',
    method: 'roundness',
    scene: 'test-piece-cylinder',
    layout: { kind: 'round-trace', anglesDeg: '0 30 60 90 120 150 180 210 240 270 300 330', surface: 'outside' },
  },
  {
    ...length,
    id: 'drift',
    label: 'Drift over time',
    gives: 'largest less smallest reading',
    method: 'drift',
    scene: 'drift-at-tool',
    layout: { kind: 'time-series', minutes: '0 10 20 30 40 50 60', temperature: true },
  },
  {
    ...length,
    id: 'function-check',
    label: 'Function check, items one after another',
    gives: 'how many items are not in order',
    method: 'function-check',
    shownIn: 'items',
    scene: 'checklist',
    layout: { kind: 'check-list', items: [{ question: '', value: null }] },
  },
];

export const findMeasurement = (id: string): Measurement | null => measurements.find((one) => one.id === id) ?? null;
