import type { EvaluationInput } from '@/lib/evaluation';
import { type GuideField, type GuideSource, given, type MethodGuide, maybe } from './method-guide';

type CorrectionInput = Extract<EvaluationInput, { method: 'correction' }>;
type Own = Pick<MethodGuide, 'title' | 'sentence' | 'purpose' | 'formulas' | 'inputs' | 'sign' | 'sensitiveTo'> & {
  outputs: GuideField[];
  source: GuideSource;
  example: { words: string; input: CorrectionInput };
};

const common = [given('formula', '', 'the formula in words'), given('verify', '', 'how to make sure afterwards')];
const practice: GuideSource = {
  kind: 'common-practice',
  text: 'workshop practice; signs are verified by measuring again',
};
const derived = (text: string): GuideSource => ({ kind: 'derived', text });

const correction = (own: Own): MethodGuide => ({
  ...own,
  slug: `correction-${own.example.input.kind}`,
  method: 'correction',
  group: 'corrections',
  outputs: [...own.outputs, ...common],
});

const feed = 'present value in counts, lost motion found in µm at the slide';
const newValues = 'change and new value in counts, not rounded, and the new whole count';

export const correctionGuides: MethodGuide[] = [
  correction({
    title: 'New value for lost motion',
    sentence: 'What to enter in the control after lost motion was measured.',
    purpose:
      'For the compensation values at cutting feed and at rapid. It adds what was found to what stands there, doubled where the control counts diameters, and warns where the mechanics should be looked at first.',
    formulas: ['new = present + lost motion · (2 on diameter) / unit'],
    inputs: [
      given('unit', 'µm', 'one count of the control'),
      given('basis', '', 'radius or diameter: what the control’s value counts in'),
      maybe('cuttingFeed', 'counts, µm', feed),
      maybe('rapid', 'counts, µm', feed),
      maybe('limit', 'µm', 'above it the mechanics come first'),
    ],
    outputs: [
      maybe('cuttingFeed', 'counts', newValues),
      maybe('rapid', 'counts', newValues),
      maybe('mechanicsFirst', '', 'whether a figure lies above the limit'),
    ],
    sign: 'Lost motion positive: play that is not compensated.',
    sensitiveTo: ['The sign that a control uses: enter, measure again, and turn it round where it has grown.'],
    source: practice,
    example: {
      words: 'A control that counts in µm on the diameter.',
      input: {
        method: 'correction',
        kind: 'lost-motion',
        unit: '1',
        basis: 'diameter',
        cuttingFeed: { present: '19', lostMotion: '-8' },
        rapid: { present: '22', lostMotion: '3' },
        limit: '20',
      },
    },
  }),
  correction({
    title: 'Amount of a reference shift',
    sentence: 'What to enter for an axis that stands beside its reference.',
    purpose: 'The figures of the reference shift with what to do about them: a small trial first, then all of it.',
    formulas: ['shift = 1000 · (target − found), half of it on diameter', 'in the control: shift · factor'],
    inputs: [
      given('target', 'mm', 'what the control should show'),
      given('found', 'mm', 'what it shows'),
      given('basis', '', 'radius or diameter'),
      maybe('controlFactor', '', '1 (else) or 2'),
    ],
    outputs: [
      given('shift', 'µm', 'way that the slide lacks in +'),
      given('controlShift', 'µm', 'as the control counts it'),
    ],
    sign: 'Shift positive: the slide lacks way in +.',
    sensitiveTo: ['Software limits and change positions move with it.'],
    source: practice,
    example: {
      words: 'An X that shows diameters and shifts them.',
      input: {
        method: 'correction',
        kind: 'reference-shift',
        target: '39.998',
        found: '40.058',
        basis: 'diameter',
        controlFactor: '2',
      },
    },
  }),
  correction({
    title: 'Pitch table',
    sentence: 'Compensation values along an axis from its mean deviations.',
    purpose:
      'After a positioning test. The mean of both directions is taken between the targets in a straight line and turned round; differences of rounded values are used, so that nothing adds up over the travel.',
    formulas: [
      'absolute = −(mean at the point − mean at the reference) / unit',
      'incremental = difference of neighbouring absolute values',
    ],
    inputs: [
      given('positions', 'mm', 'targets of the positioning test, two or more'),
      given('means', 'µm', 'mean of both directions at each'),
      given('referencePosition', 'mm', 'where the axis is referenced'),
      given('start', 'mm', 'first point of the table'),
      given('end', 'mm', 'its end'),
      given('interval', 'mm', 'distance of the points'),
      given('unit', 'µm', 'one count of the control'),
      given('form', '', 'incremental or absolute'),
    ],
    outputs: [given('points', 'mm', 'points of the table'), given('values', 'counts', 'value at each')],
    sign: 'A value turns the deviation round.',
    sensitiveTo: [
      'A table that is entered at the wrong end.',
      'Temperature during the test: it is compensated for ever.',
    ],
    source: practice,
    example: {
      words: 'Three targets, a point each 50 mm.',
      input: {
        method: 'correction',
        kind: 'pitch-table',
        positions: ['0', '100', '200'],
        means: ['0', '10', '6'],
        referencePosition: '0',
        start: '0',
        end: '200',
        interval: '50',
        unit: '1',
        form: 'absolute',
      },
    },
  }),
  correction({
    title: 'Two jack points',
    sentence: 'How much to raise one of two points to change a slope.',
    purpose: 'For bases, tailstocks and turret castings that stand on two points.',
    formulas: ['raise = |slope change| · span / 1000'],
    inputs: [
      given('slopeChange', 'µm/m', 'wanted; positive: point B must rise against A'),
      given('span', 'mm', 'distance of the points'),
    ],
    outputs: [given('raise', 'µm', 'amount'), given('point', '', 'A, B or none')],
    sign: 'Slope change positive: B rises.',
    sensitiveTo: ['Clamping moves it again by some microns.'],
    source: derived('the slope over the distance of the points'),
    example: {
      words: 'Points 400 mm apart.',
      input: { method: 'correction', kind: 'two-jack-points', slopeChange: '50', span: '400' },
    },
  }),
  correction({
    title: 'Pivot and push screw',
    sentence: 'How far to move at the screw to turn a slope back.',
    purpose: 'For headstocks and slides that turn about a dowel and are pushed at the other end.',
    formulas: ['movement = −slope · distance / 1000'],
    inputs: [given('slope', 'µm/m', 'the error'), given('distance', 'mm', 'from the pivot to the screw')],
    outputs: [given('movement', 'µm', 'at the screw'), given('direction', '', 'plus, minus or none')],
    sign: 'Movement positive: in the direction of a positive slope.',
    sensitiveTo: ['Watch it on an indicator at the screw while you tighten.'],
    source: derived('the slope over the lever'),
    example: {
      words: 'A screw 500 mm from the dowel.',
      input: { method: 'correction', kind: 'pivot-and-push-screw', slope: '40', distance: '500' },
    },
  }),
  correction({
    title: 'Shim under a base',
    sentence: 'What to add or take away for an error of height.',
    purpose: 'For bases that stand on a shim over their whole seat.',
    formulas: ['thickness = −height error'],
    inputs: [given('heightError', 'µm', 'positive: too high')],
    outputs: [given('thickness', 'µm', 'positive: add'), given('action', '', 'add, remove or none')],
    sign: 'Thickness positive: add.',
    sensitiveTo: ['Several thin shims are a spring: one piece, free of burrs.'],
    source: derived('the height error turned round'),
    example: {
      words: 'A tailstock that stands low.',
      input: { method: 'correction', kind: 'shim', heightError: '-22.5' },
    },
  }),
  correction({
    title: 'Turret parallel and on centre at once',
    sentence: 'Both jack amounts so that one setting does not spoil the other.',
    purpose: 'For a turret casting on two jack points that is both out of parallel and off centre.',
    formulas: ['raise = −height + slope · (height position − jack position) / 1000'],
    inputs: [
      given('slope', 'µm/m', 'the error, rising with the position'),
      given('height', 'µm', 'the error at the height position'),
      given('heightPosition', 'mm', 'where the height was read'),
      given('jackA', 'mm', 'place of the first jack point'),
      given('jackB', 'mm', 'place of the second, another one'),
    ],
    outputs: [given('raiseA', 'µm', 'at A'), given('raiseB', 'µm', 'at B')],
    sign: 'Positive: raise.',
    sensitiveTo: ['All positions must be counted from the same end.'],
    source: derived('a straight line through both errors'),
    example: {
      words: 'A casting that hangs and stands low.',
      input: {
        method: 'correction',
        kind: 'turret-parallel-and-centre',
        slope: '-245',
        height: '-52',
        heightPosition: '250',
        jackA: '310',
        jackB: '490',
      },
    },
  }),
  correction({
    title: 'Headstock for a taper',
    sentence: 'How to turn a headstock so that two collars come out alike.',
    purpose: 'After the two-collar test, where the headstock turns about a pivot and is moved by a screw.',
    formulas: ['slope = 1000000 · (D1 − D2) / (2 · length)', 'movement = −slope · distance / 1000'],
    inputs: [
      given('D1', 'mm', 'collar near the headstock'),
      given('D2', 'mm', 'far collar'),
      given('length', 'mm', 'from collar to collar'),
      given('distance', 'mm', 'from the pivot to the screw'),
    ],
    outputs: [
      given('slope', 'µm/m', 'the error'),
      given('movement', 'µm', 'at the screw'),
      given('direction', '', 'where the free end must go'),
    ],
    sign: 'Slope positive: the free end leans toward the tool and must go away from it.',
    sensitiveTo: ['Never by the wear offset of the tool: that moves the diameter, not the taper.'],
    source: derived('the taper over the length, times the lever'),
    example: {
      words: 'Collars 100 mm apart, screw 400 mm from the pivot.',
      input: {
        method: 'correction',
        kind: 'headstock-for-taper',
        D1: '30.012',
        D2: '30.007',
        length: '100',
        distance: '400',
      },
    },
  }),
  correction({
    title: 'Sag of a mandrel',
    sentence: 'How far a solid round mandrel hangs down by its own weight.',
    purpose:
      'Before a vertical parallelism is believed. For a hollow or stepped mandrel turn it by half a turn instead.',
    formulas: ['sag = 2ρg / (3·E·d²) · (x⁴ − 4·L·x³ + 6·L²·x²)'],
    inputs: [
      given('length', 'mm', 'free length'),
      given('diameter', 'mm', 'of the solid bar'),
      maybe('density', 'kg/m³', 'else 7850'),
      maybe('modulus', 'GPa', 'else 206'),
      maybe('at', 'mm', 'where it is wanted; else at the end'),
    ],
    outputs: [given('sag', 'µm', 'downwards')],
    sign: null,
    sensitiveTo: ['It grows with the fourth power of the length.'],
    source: { kind: 'derived', text: 'textbook: beam clamped at one end under its own weight' },
    example: {
      words: 'Steel, 40 mm thick, 300 mm long.',
      input: { method: 'correction', kind: 'mandrel-sag', length: '300', diameter: '40' },
    },
  }),
];
