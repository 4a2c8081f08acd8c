import type { EvaluationInput } from '@/lib/evaluation';
import { shiftInputs, shiftOutputs } from './axes';
import { type GuideField, type GuideSource, given, type MethodGuide, maybe } from './method-guide';

const practice = (text: string): GuideSource => ({ kind: 'common-practice', text });
const derived = (text: string): GuideSource => ({ kind: 'derived', text });
const advice = [given('formula', '', 'that the amounts come from'), given('verify', '', 'what to do afterwards')];

/** What all corrections share; each is told apart by its kind. */
function guide(
  own: Omit<MethodGuide, 'method' | 'group' | 'outputs' | 'example'> & {
    outputs: GuideField[];
    example: { words: string; input: Extract<EvaluationInput, { method: 'correction' }> };
  },
): MethodGuide {
  return { ...own, method: 'correction', group: 'corrections', outputs: [...own.outputs, ...advice] };
}

const D1 = given('D1', 'mm', 'diameter near the headstock');
const D2 = given('D2', 'mm', 'diameter of the far collar');

export const correctionGuides: MethodGuide[] = [
  guide({
    slug: 'correct-lost-motion',
    title: 'New value for lost motion in the control',
    source: practice('play that is found is added to the value that the control has'),
    sentence: 'The control’s compensation after lost motion was measured, for cutting feed and rapid apart.',
    purpose:
      'For a control that keeps a value for lost motion. What is still found is added to what it has, counted as the control counts. Above a limit of your own the mechanics come first.',
    formulas: ['new = present + lost motion · (2 on diameter) / unit'],
    inputs: [
      given('unit', 'µm', 'what one count of the control is worth'),
      given('basis', '', 'radius or diameter: what the control’s value counts in'),
      maybe('cuttingFeed', 'counts, µm', 'present value and lost motion found; this or rapid is needed'),
      maybe('rapid', 'counts, µm', 'the same at rapid'),
      maybe('limit', 'µm', 'above it the mechanics are looked at first'),
    ],
    outputs: [
      maybe('cuttingFeed', 'counts', 'change, new value, and the whole count to enter'),
      maybe('rapid', 'counts', 'the same at rapid'),
      maybe('mechanicsFirst', '', 'whether the limit is passed'),
    ],
    sign: 'Lost motion positive: play that is not compensated yet.',
    sensitiveTo: ['The sign of the control: if the play has grown after the change, it is the other one.'],
    example: {
      words: '19 counts of 1 µm on diameter, too much by 8 µm at the slide.',
      input: {
        method: 'correction',
        kind: 'lost-motion',
        unit: '1',
        basis: 'diameter',
        cuttingFeed: { present: '19', lostMotion: '-8' },
        limit: '20',
      },
    },
  }),
  guide({
    slug: 'correct-reference',
    title: 'Shift of a reference point',
    source: practice('target less found, half of it on diameter'),
    sentence: 'How far to shift a reference, and what to enter in a control that counts on diameter.',
    purpose:
      'After a reference point was found off. The shift is given as the way of the slide and as the control counts it. Begin with a small amount and see which way it goes.',
    formulas: ['shift = 1000·(target − found), half of it on diameter', 'shift in the control = shift · factor'],
    inputs: shiftInputs,
    outputs: shiftOutputs,
    sign: 'Positive: the slide lacks this way in the plus direction.',
    sensitiveTo: ['Software limits and change positions move with the reference: check them again.'],
    example: {
      words: 'A diameter found 0.060 mm too large.',
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
  guide({
    slug: 'correct-pitch',
    title: 'Pitch compensation table',
    source: practice('mean bidirectional deviation at equal intervals, linear between the targets'),
    sentence: 'From the means of a positioning test to the table that a control takes.',
    purpose:
      'For an axis whose systematic deviation is compensated point by point. Values are rounded so that incremental ones add up to the absolute ones and nothing drifts.',
    formulas: [
      'absolute(k) = round(−(mean(p) − mean(reference))/unit)',
      'incremental(k) = absolute(k) − absolute(k − 1)',
    ],
    inputs: [
      given('positions', 'mm', 'targets, two or more, none twice'),
      given('means', 'µm', 'mean bidirectional deviation at each'),
      given('referencePosition', 'mm', 'where the table is zero'),
      given('start', 'mm', 'first point of the table'),
      given('end', 'mm', 'last point, above the first'),
      given('interval', 'mm', 'distance of the points'),
      given('unit', 'µm', 'what one count of the control is worth'),
      given('form', '', 'incremental or absolute'),
    ],
    outputs: [given('points', 'mm', 'places of the table'), given('values', 'counts', 'one a point')],
    sign: 'A deviation above zero needs a value below zero, unless the control counts the other way.',
    sensitiveTo: [
      'Reversal is no part of it: compensate the lost motion first.',
      'Targets too far apart hide the screw’s periodic error.',
    ],
    example: {
      words: 'Two means over 100 mm, a point every 50 mm.',
      input: {
        method: 'correction',
        kind: 'pitch-table',
        positions: ['0', '100'],
        means: ['0', '10'],
        referencePosition: '0',
        start: '0',
        end: '100',
        interval: '50',
        unit: '1',
        form: 'absolute',
      },
    },
  }),
  guide({
    slug: 'correct-jacks',
    title: 'Raising one of two jack points',
    source: practice('slope times the distance of the points'),
    sentence: 'Which of two jack points to raise against the other, and by how much.',
    purpose: 'For a base on jacks or wedges whose slope has to change by a known amount.',
    formulas: ['raise = |slope change| · span / 1000'],
    inputs: [
      given('slopeChange', 'µm/m', 'change that is wanted; positive: B must rise against A'),
      given('span', 'mm', 'distance of the points'),
    ],
    outputs: [given('raise', 'µm', 'how far to raise it'), given('point', '', 'B, A or none')],
    sign: 'Positive change: raise B. Negative: raise A.',
    sensitiveTo: ['Other jacks must carry nothing meanwhile, and all must carry afterwards.'],
    example: {
      words: '50 µm/m over 400 mm.',
      input: { method: 'correction', kind: 'two-jack-points', slopeChange: '50', span: '400' },
    },
  }),
  guide({
    slug: 'correct-pivot',
    title: 'Turning about a pivot with a push screw',
    source: practice('slope times the distance from the pivot'),
    sentence: 'How far to push at a screw to turn a slope out about a pivot.',
    purpose: 'For a headstock, a turret or a slide that swings about a pin and is held by a push screw.',
    formulas: ['movement = −slope · distance / 1000'],
    inputs: [given('slope', 'µm/m', 'the error'), given('distance', 'mm', 'from pivot to screw')],
    outputs: [
      given('movement', 'µm', 'at the screw, positive in the direction of a positive slope'),
      given('direction', '', 'plus, minus or none'),
    ],
    sign: 'Movement positive: in the direction of a positive slope.',
    sensitiveTo: ['Tightening moves it again: read it at final torque.'],
    example: {
      words: '40 µm/m, screw 500 mm from the pivot.',
      input: { method: 'correction', kind: 'pivot-and-push-screw', slope: '40', distance: '500' },
    },
  }),
  guide({
    slug: 'correct-shim',
    title: 'Shim under a base',
    source: practice('the error of height with the opposite sign'),
    sentence: 'Thickness to add or to remove under a base that stands too low or too high.',
    purpose: 'For a turret, a tool post or a tailstock whose height is off and is set by shims.',
    formulas: ['thickness = −height error'],
    inputs: [given('heightError', 'µm', 'positive: too high')],
    outputs: [given('thickness', 'µm', 'positive: add; negative: remove'), given('action', '', 'add, remove or none')],
    sign: 'Thickness positive: add.',
    sensitiveTo: ['Several thin shims spring: take one piece, free of burrs.'],
    example: { words: '22.5 µm too low.', input: { method: 'correction', kind: 'shim', heightError: '-22.5' } },
  }),
  guide({
    slug: 'correct-turret',
    title: 'Turret parallel and on centre in one setting',
    source: derived('straight line through both errors'),
    sentence: 'Both amounts at the jack points that take slope and height out together.',
    purpose:
      'For a turret that leans and stands off centre. Setting one after the other spoils the first; both amounts at once do not.',
    formulas: ['raise = −height + slope · (height position − jack position) / 1000'],
    inputs: [
      given('slope', 'µm/m', 'the error, positive where it rises with z'),
      given('height', 'µm', 'error of height at the height position'),
      given('heightPosition', 'mm', 'where the height was read'),
      given('jackA', 'mm', 'place of one jack point'),
      given('jackB', 'mm', 'place of the other, elsewhere'),
    ],
    outputs: [given('raiseA', 'µm', 'amount at A, negative: lower'), given('raiseB', 'µm', 'amount at B')],
    sign: 'Positive: raise. Negative: lower.',
    sensitiveTo: ['All positions are counted from one zero along z.'],
    example: {
      words: 'Falls by 245 µm/m and stands 52 µm low.',
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
  guide({
    slug: 'correct-taper',
    title: 'Headstock turned for a taper',
    source: practice('half the difference of the diameters over their distance'),
    sentence: 'From two turned collars to the movement at the headstock’s screw.',
    purpose:
      'For a headstock that swings about a pin. Two collars give the slope; the distance to the screw gives the amount.',
    formulas: ['slope = 10⁶·(D1 − D2)/(2·length)', 'movement = −slope · distance / 1000'],
    inputs: [D1, D2, given('length', 'mm', 'from collar to collar'), given('distance', 'mm', 'from pivot to screw')],
    outputs: [
      given('slope', 'µm/m', 'that has to go'),
      given('movement', 'µm', 'at the screw'),
      given('direction', '', 'where the free end must go: away-from-tool, toward-tool or none'),
    ],
    sign: 'Slope positive: the free end leans toward the tool.',
    sensitiveTo: ['Cut deflection looks like a taper: try it with another depth of cut first.'],
    example: {
      words: 'Two collars 100 mm apart, screw 400 mm from the pivot.',
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
  guide({
    slug: 'mandrel-sag',
    title: 'Sag of a test mandrel',
    source: { kind: 'published', text: 'beam clamped at one end under its own weight (Euler–Bernoulli, any textbook)' },
    sentence: 'How far a solid round mandrel bends by its own weight, at its end or at any place.',
    purpose: 'For readings in the vertical plane along a mandrel: what it sags is taken out of them.',
    formulas: ['sag = 2ρg/(3·E·d²) · (x⁴ − 4·L·x³ + 6·L²·x²)'],
    inputs: [
      given('length', 'mm', 'L, free length'),
      given('diameter', 'mm', 'd'),
      maybe('density', 'kg/m³', 'ρ; else 7850 (steel)'),
      maybe('modulus', 'GPa', 'E; else 206 (steel)'),
      maybe('at', 'mm', 'x; else the end'),
    ],
    outputs: [given('sag', 'µm', 'how far it hangs down there')],
    sign: null,
    sensitiveTo: ['A hollow or stepped mandrel sags otherwise: turn it by half a turn and compare.'],
    example: {
      words: 'Solid steel, 40 mm thick, 300 mm free.',
      input: { method: 'correction', kind: 'mandrel-sag', length: '300', diameter: '40' },
    },
  }),
];
