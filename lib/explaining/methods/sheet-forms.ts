import type { EvaluationMethod } from '@/lib/evaluation';
import type { Layout } from '@/standards/types';
import { type Chosen, choice, type FormOption, type SheetForm } from './calculator-form';

type Of<K extends Layout['kind']> = Extract<Layout, { kind: K }>;

const evenly = (count: number, overDeg = 360): string[] =>
  Array.from({ length: count }, (_, k) => String((k * overDeg) / count));
const numbered = (word: string, count: number) => Array.from({ length: count }, (_, k) => `${word} ${k + 1}`);
const spaced = (text: string | undefined) => (text ?? '').split(' ');

const line = choice('reference', 'Reference line', {
  'minimum-zone': 'minimum zone',
  'least-squares': 'least squares',
  'end-points': 'through the end points',
});
const lineOf = ({ reference }: Chosen) => reference as Of<'profile'>['reference'];
const count = (name: string, label: string, counts: number[]): FormOption => choice(name, label, counts.map(String));
const roundAngles = choice('angles', 'Angles in a turn', {
  '4': '0, 90, 180, 270°',
  '8': 'each 45°',
  '12': 'each 30°',
});
/** As a list, because a key that is a whole number would come first. */
const half: FormOption = {
  kind: 'choice',
  name: 'angles',
  label: 'The spindle stands at',
  choices: [
    { value: '0 180', label: '0° and 180°' },
    { value: '0 90 180 270', label: '0°, 90°, 180° and 270°' },
    { value: '0', label: 'one angle, nothing is turned' },
  ],
};
const yesNo = (name: string, label: string) => choice(name, label, { no: 'no', yes: 'yes' });
const sag = yesNo('sag', 'The mandrel’s sag is stated');

const overPositions = (positionName: Of<'angles-by-position'>['positionName']) => (chosen: Chosen) => ({
  layout: {
    kind: 'angles-by-position' as const,
    anglesDeg: spaced(chosen.angles),
    positionsMm: [],
    positionName,
    sag: chosen.sag === 'yes',
  },
  ...(chosen.judge ? { judge: chosen.judge } : {}),
});

/** The form of each method that a sheet can hold; the rest of the calculator has lists of fields (field-forms.ts). */
export const sheetForms: Partial<Record<EvaluationMethod, SheetForm>> = {
  straightness: {
    options: [line, { kind: 'figure', name: 'localLength', label: 'Local length, where one is wanted', unit: 'mm' }],
    layoutOf: (chosen) => ({
      layout: {
        kind: 'profile',
        positionsMm: [],
        reference: lineOf(chosen),
        ...(chosen.localLength ? { localLengthMm: chosen.localLength } : {}),
      },
    }),
    setUp: {},
  },
  'straightness-from-angles': {
    options: [line, yesNo('returnAngles', 'Read on the way back too')],
    layoutOf: (chosen) => ({
      layout: {
        kind: 'angle-steps',
        stepLengthMm: '100',
        steps: 5,
        returnRun: chosen.returnAngles === 'yes',
        reference: lineOf(chosen),
      },
    }),
    setUp: { '/stepLength': '100' },
  },
  'straightness-reversal': {
    options: [line],
    layoutOf: (chosen) => ({ layout: { kind: 'two-runs', positionsMm: [], reference: lineOf(chosen) } }),
    setUp: {},
  },
  flatness: {
    options: [
      choice('reference', 'Reference plane', { 'minimum-zone': 'minimum zone', 'least-squares': 'least squares' }),
    ],
    layoutOf: ({ reference }) => ({
      layout: { kind: 'grid', xMm: [], yMm: [], reference: reference as Of<'grid'>['reference'] },
    }),
    setUp: {},
  },
  parallelism: {
    options: [
      half,
      choice('judge', 'What is judged', {
        slope: 'slope over the measuring length',
        range: 'largest less smallest mean',
      }),
      sag,
    ],
    layoutOf: overPositions('z'),
    setUp: {},
    positiveMeans: 'the readings rise along the positions',
    negativeMeans: 'the readings fall along the positions',
  },
  'squareness-to-axis': {
    options: [half, sag],
    layoutOf: overPositions('radius'),
    setUp: {},
    positiveMeans: 'concave',
    negativeMeans: 'convex',
  },
  squareness: {
    options: [],
    layoutOf: () => ({ layout: { kind: 'square-reversed', referencePositionsMm: [], measuredPositionsMm: [] } }),
    setUp: {},
    positiveMeans: 'more than 90°',
    negativeMeans: 'less than 90°',
  },
  'run-out': {
    options: [
      count('insertions', 'Turns, or insertions of the mandrel', [4, 2, 1]),
      roundAngles,
      choice('judge', 'What is judged', { mean: 'mean of the turns', largest: 'the largest' }),
    ],
    layoutOf: ({ insertions, angles, judge }) => ({
      layout: {
        kind: 'turns',
        insertions: Number(insertions),
        anglesDeg: evenly(Number(angles)),
        insertionLabel: 'insertion',
      },
      judge,
    }),
    setUp: {},
  },
  'axial-run-out': {
    options: [count('circles', 'Circles', [2, 1, 3]), roundAngles],
    layoutOf: ({ circles, angles }) => ({
      layout: { kind: 'circles', names: numbered('circle', Number(circles)), anglesDeg: evenly(Number(angles)) },
    }),
    setUp: {},
  },
  coaxiality: {
    options: [],
    layoutOf: () => ({ layout: { kind: 'swept-sections', positionsMm: [], surface: 'outside' } }),
    setUp: { '/surface': 'outside', '/up': '90' },
    hasBasis: true,
  },
  'centre-height': {
    options: [],
    layoutOf: () => ({ layout: { kind: 'tool-centre', form: 'sweep', surface: 'bore', radiiMm: [] } }),
    setUp: { '/form': 'sweep', '/surface': 'bore', '/up': '90' },
    positiveMeans: 'above the spindle axis',
    negativeMeans: 'below the spindle axis',
  },
  'angular-deviation': {
    options: [
      choice('kind', 'Angle', ['pitch', 'yaw', 'roll']),
      choice('ways', 'Read', { both: 'out and back', out: 'out only' }),
    ],
    layoutOf: ({ kind, ways }) => ({
      layout: {
        kind: 'angular-runs',
        positionsMm: [],
        quantity: kind as Of<'angular-runs'>['quantity'],
        bothDirections: ways === 'both',
      },
    }),
    setUp: {},
    shownIn: () => 'mm/m',
  },
  positioning: {
    options: [
      choice('kind', 'Axis', { linear: 'linear', rotary: 'rotary' }),
      count('cycles', 'Runs each way', [5, 3, 2, 1]),
      choice('ways', 'Targets approached', { both: 'from both sides', forward: 'in the + direction only' }),
      choice('judge', 'What is judged', ['A', 'E', 'R', 'B', 'M']),
    ],
    layoutOf: ({ kind, cycles, ways, judge }) => ({
      layout: {
        kind: 'target-cycles',
        quantity: kind as 'linear' | 'rotary',
        cycles: Number(cycles),
        targets: [],
        ...(ways === 'forward' ? { oneWay: true as const } : {}),
      },
      judge,
    }),
    setUp: {},
    shownIn: ({ kind }) => (kind === 'rotary' ? '″' : 'mm'),
  },
  circular: {
    options: [choice('judge', 'What is judged', { Gb: 'both ways together (Gb)', G: 'the larger of both (G)' })],
    layoutOf: ({ judge }) => ({
      layout: { kind: 'circle-trace', anglesDeg: [], nominalRadiusMm: '100', arcDeg: '360' },
      judge,
    }),
    setUp: { '/nominalRadius': '100' },
  },
  'axis-of-rotation': {
    options: [
      choice('direction', 'Direction', ['radial', 'axial', 'tilt']),
      count('turns', 'Turns', [3, 2, 5, 10]),
      choice('judge', 'What is judged', ['total', 'synchronous', 'asynchronous']),
    ],
    layoutOf: ({ direction, turns, judge }) => ({
      layout: {
        kind: 'rotation-turns',
        turns: Number(turns),
        anglesDeg: [],
        direction: direction as Of<'rotation-turns'>['direction'],
      },
      judge,
    }),
    setUp: {},
    shownIn: ({ direction }) => (direction === 'tilt' ? 'mm/m' : 'mm'),
  },
  indexing: {
    options: [
      choice('judge', 'What is judged', { repeatability: 'repeatability', accuracy: 'accuracy' }),
      count('repeats', 'Times that each station is indexed', [3, 2, 5, 7]),
    ],
    layoutOf: ({ judge, repeats }) => ({
      layout: { kind: 'stations', stations: [], repeats: Number(repeats), radiusMm: '' },
      judge,
    }),
    setUp: {},
  },
  'lost-motion': {
    options: [
      choice('feeds', 'Feeds', {
        'cutting-feed rapid': 'cutting feed and rapid',
        'cutting-feed': 'cutting feed',
        rapid: 'rapid',
      }),
      count('places', 'Places', [1, 2, 3]),
      count('pairs', 'Pairs at each', [3, 5, 7]),
    ],
    layoutOf: ({ feeds, places, pairs }) => ({
      layout: {
        kind: 'approach-pairs',
        places: numbered('place', Number(places)),
        feeds: spaced(feeds) as Of<'approach-pairs'>['feeds'],
        pairs: Number(pairs),
      },
    }),
    setUp: { '/sense': 'plus-pushes-in' },
  },
  'reference-shift': {
    options: [],
    layoutOf: () => ({ layout: { kind: 'target-and-found', basis: null } }),
    setUp: { '/basis': 'radius', '/controlFactor': '1' },
  },
  roundness: {
    options: [],
    layoutOf: () => ({ layout: { kind: 'round-trace', anglesDeg: [], surface: 'outside' } }),
    setUp: { '/surface': 'outside' },
  },
  'diameter-consistency': {
    options: [],
    layoutOf: () => ({ layout: { kind: 'diameters', positionsMm: [] } }),
    setUp: {},
  },
  drift: {
    options: [choice('temperature', 'Temperature beside it', { yes: 'yes', no: 'no' })],
    layoutOf: ({ temperature }) => ({
      layout: { kind: 'time-series', minutes: [], temperature: temperature === 'yes' },
    }),
    setUp: {},
  },
  'two-collar': {
    options: [],
    layoutOf: () => ({ layout: { kind: 'two-collars', distanceMm: '' } }),
    setUp: {},
    positiveMeans: 'larger near the headstock',
    negativeMeans: 'larger at the far end',
  },
};
