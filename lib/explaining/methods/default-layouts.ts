import type { MeasuredResult } from '@/lib/evaluation';
import type { Layout, ShownIn } from '@/standards/types';

type Measured = MeasuredResult['method'];

export interface MethodLayout {
  /** Fits the worked example of the method. */
  layout: Exclude<Layout, { kind: 'check-list' }>;
  /** What of the layout a person may choose in the calculator, by the names of its fields. */
  asked: string[];
  /** Figures that may be judged, the usual one first. */
  judges?: { value: string; label: string }[];
  /** Unit of the result where it is not mm. */
  shownIn?: Exclude<ShownIn, 'items'>;
  /** Words for a positive and a negative figure, for methods whose result has a sign. */
  signs?: [positive: string, negative: string];
  /** Choices of a layout that go into no input. */
  choices?: Record<string, string>;
}

const quarters = ['0', '90', '180', '270'];
const eighths = ['0', '45', '90', '135', '180', '225', '270', '315'];
const figure = (value: string, words: string) => ({ value, label: words });
const same = (...values: string[]) => values.map((value) => ({ value, label: value }));

/** How the calculator lays a method's fields out until a person wants it otherwise. */
export const defaultLayouts: Record<Measured, MethodLayout> = {
  straightness: {
    layout: { kind: 'profile', positionsMm: [], reference: 'minimum-zone' },
    asked: ['reference', 'localLengthMm'],
  },
  'straightness-from-angles': {
    layout: { kind: 'angle-steps', stepLengthMm: '100', steps: 5, returnRun: false, reference: 'minimum-zone' },
    asked: ['reference', 'steps', 'returnRun'],
  },
  'straightness-reversal': {
    layout: { kind: 'two-runs', positionsMm: [], reference: 'minimum-zone' },
    asked: ['reference'],
  },
  flatness: { layout: { kind: 'grid', xMm: [], yMm: [], reference: 'minimum-zone' }, asked: ['reference'] },
  parallelism: {
    layout: { kind: 'angles-by-position', anglesDeg: ['0', '180'], positionsMm: [], positionName: 'z', sag: false },
    asked: ['anglesDeg', 'sag'],
    judges: [figure('slope', 'slope over the measuring length'), figure('range', 'range of the means')],
    signs: ['readings rise along the positions', 'readings fall along the positions'],
  },
  'squareness-to-axis': {
    layout: {
      kind: 'angles-by-position',
      anglesDeg: ['0', '180'],
      positionsMm: [],
      positionName: 'radius',
      sag: false,
    },
    asked: ['anglesDeg'],
    signs: ['concave', 'convex'],
  },
  squareness: {
    layout: { kind: 'square-reversed', referencePositionsMm: [], measuredPositionsMm: [] },
    asked: [],
    signs: ['more than 90°', 'less than 90°'],
  },
  'angular-deviation': {
    layout: { kind: 'angular-runs', positionsMm: [], quantity: 'pitch', bothDirections: true },
    asked: ['quantity', 'bothDirections'],
    shownIn: 'mm/m',
  },
  'run-out': {
    layout: { kind: 'turns', insertions: 4, anglesDeg: quarters, insertionLabel: 'insertion' },
    asked: ['insertions', 'anglesDeg'],
    judges: [figure('mean', 'mean over the insertions'), figure('largest', 'largest insertion')],
  },
  'axial-run-out': {
    layout: { kind: 'circles', names: ['circle 1', 'circle 2'], anglesDeg: quarters },
    asked: ['names', 'anglesDeg'],
  },
  coaxiality: { layout: { kind: 'swept-sections', positionsMm: [], surface: 'outside' }, asked: [] },
  'centre-height': {
    layout: { kind: 'tool-centre', form: 'sweep', surface: 'bore', radiiMm: [] },
    asked: [],
    signs: ['tool above the spindle axis', 'tool below the spindle axis'],
    choices: { '/form': 'sweep' },
  },
  'axis-of-rotation': {
    layout: { kind: 'rotation-turns', turns: 3, anglesDeg: eighths, direction: 'radial' },
    asked: ['direction', 'turns'],
    judges: same('total', 'synchronous', 'asynchronous'),
  },
  indexing: {
    layout: { kind: 'stations', stations: [], repeats: 3, radiusMm: '100' },
    asked: ['repeats'],
    judges: [figure('repeatability', 'repeatability'), figure('accuracy', 'accuracy')],
  },
  positioning: {
    layout: { kind: 'target-cycles', quantity: 'linear', cycles: 5, targets: [] },
    asked: ['quantity', 'cycles'],
    judges: same('A', 'E', 'R', 'B', 'M', 'Aforward', 'Abackward', 'Eforward', 'Ebackward', 'Rforward', 'Rbackward'),
  },
  circular: {
    layout: { kind: 'circle-trace', anglesDeg: [], nominalRadiusMm: '50', arcDeg: '360' },
    asked: [],
    judges: [figure('Gb', 'Gb, both directions together'), figure('G', 'G, the larger of both directions')],
  },
  'lost-motion': {
    layout: { kind: 'approach-pairs', places: ['middle of the travel'], feeds: ['cutting-feed', 'rapid'], pairs: 3 },
    asked: ['places', 'feeds', 'pairs'],
  },
  'reference-shift': { layout: { kind: 'target-and-found', basis: 'diameter' }, asked: [] },
  roundness: { layout: { kind: 'round-trace', anglesDeg: [], surface: 'outside' }, asked: [] },
  'diameter-consistency': { layout: { kind: 'diameters', positionsMm: [] }, asked: [] },
  drift: { layout: { kind: 'time-series', minutes: [], temperature: true }, asked: ['temperature'] },
  'two-collar': {
    layout: { kind: 'two-collars', distanceMm: '100' },
    asked: [],
    signs: ['free end leans toward the tool', 'free end leans away from the tool'],
  },
};
