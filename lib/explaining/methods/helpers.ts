import { sources } from '@/lib/explaining/sources';
import { given, type MethodGuide, maybe } from './method-guide';

export const helperGuides: MethodGuide[] = [
  {
    slug: 'uncertainty',
    method: 'uncertainty',
    group: 'helpers',
    ...sources.uncertainty,
    sentence: 'Several sources of uncertainty put together, with the expanded uncertainty for a report.',
    purpose:
      'Before a result is compared with a tolerance by guarded acceptance. Each source is stated with its half-width and shape, or as a standard uncertainty; they are taken as independent of each other.',
    formulas: ['u = √Σ(c · a / divisor)²', 'ν = u⁴ / Σ((c·u)⁴/ν)', 'U = k · u, k two-sided Student t at ν'],
    inputs: [
      given(
        'components',
        '',
        'name, value, shape (normal, rectangular, triangular, u-shaped); divisor, sensitivity, degreesOfFreedom where known',
      ),
      given('coverage', '', '0.95 or 0.99'),
    ],
    outputs: [
      given('standard', 'as given', 'combined standard uncertainty'),
      maybe('degreesOfFreedom', '', 'effective degrees of freedom, where they are not infinite'),
      given('coverageFactor', '', 'k'),
      given('expanded', 'as given', 'U = k · u'),
    ],
    sign: null,
    sensitiveTo: [
      'A full range counts with half of itself as a rectangular half-width.',
      'A certificate’s U at k = 2 is normal with divisor 2.',
      'The largest source decides nearly alone.',
    ],
    example: {
      words: 'Certificate, resolution and repeat readings of an indicator, µm.',
      input: {
        method: 'uncertainty',
        components: [
          { name: 'certificate', value: '1.2', distribution: 'normal', divisor: '2' },
          { name: 'resolution', value: '0.5', distribution: 'rectangular' },
          { name: 'repeat readings', value: '0.7', distribution: 'normal', degreesOfFreedom: '9' },
        ],
        coverage: '0.95',
      },
    },
  },
  {
    slug: 'conformity',
    method: 'conformity',
    group: 'helpers',
    ...sources.conformity,
    sentence: 'Within tolerance, out of tolerance or undecided, by simple or guarded acceptance.',
    purpose:
      'For a figure at the edge of its tolerance, and for the question how sure a verdict is. The rule is agreed before measuring. Guarded acceptance keeps a distance from the limit that covers the uncertainty.',
    formulas: [
      'y = |e|, or s·e where one side is permitted',
      'simple: y ≤ T is within; guarded: y ≤ T − g within, y > T + g out, between undecided',
      'g = 1.65·u or U = 2·u',
      'probability = Φ((T − y)/u), with the other side taken off where there is one',
    ],
    inputs: [
      given('deviation', 'µm', 'the figure'),
      given('signed', '', 'whether its sign says something'),
      given('tolerance', 'µm', 'above zero, in the unit of the figure'),
      given('direction', '', 'either, or the one permitted side'),
      given('rule', '', 'simple or guarded'),
      maybe('standardUncertainty', 'µm', 'needed for guarded'),
      maybe('guard', '', '1.65u (else) or U'),
    ],
    outputs: [
      given('verdict', '', 'within-tolerance, out-of-tolerance or undecided'),
      given('limit', 'µm', 'T − g'),
      given('margin', 'µm', 'distance to the limit, negative beyond it'),
      maybe('probability', '', 'that the true value conforms'),
    ],
    sign: 'Margin negative: beyond the limit.',
    sensitiveTo: [
      'Near the limit simple acceptance is wrong about every second time.',
      'One-sided tests: only the tolerance is guarded, not the zero side.',
    ],
    example: {
      words: 'A figure of 18 with a tolerance of 20 and u = 1, guarded by U.',
      input: {
        method: 'conformity',
        deviation: '18',
        signed: true,
        tolerance: '20',
        direction: 'either',
        rule: 'guarded',
        standardUncertainty: '1',
        guard: 'U',
      },
    },
  },
  {
    slug: 'rounding',
    method: 'rounding',
    group: 'helpers',
    ...sources.rounding,
    sentence: 'A figure to the nearest multiple of a step, once and at the end.',
    purpose: 'For figures on paper. A verdict never uses the rounded figure.',
    formulas: ['nearest multiple of the resolution; a tie goes to the even multiple, or away from zero'],
    inputs: [
      given('value', '', 'the figure'),
      given('resolution', '', 'the step, above zero; its decimals are those of the answer'),
      maybe('rule', '', 'half-even (else) or half-away-from-zero'),
    ],
    outputs: [given('rounded', '', 'the rounded figure')],
    sign: null,
    sensitiveTo: ['Rounding in two stages gives another figure.'],
    example: {
      words: 'A tie.',
      input: { method: 'rounding', value: '0.0125', resolution: '0.001', rule: 'half-even' },
    },
  },
  {
    slug: 'tolerance',
    method: 'tolerance',
    group: 'helpers',
    ...sources.tolerance,
    sentence: 'A tolerance given for one length, for the length that was really measured.',
    purpose:
      'For parallelism, squareness and straightness that are given per length. It grows in proportion and never falls below its floor. Run-out and offsets at one place are never scaled.',
    formulas: ['T = min(max(T0 · L/L0, Tmin), Tmax)'],
    inputs: [
      given('base', 'µm', 'tolerance as given'),
      given('baseLength', 'mm', 'length that it is given for'),
      given('length', 'mm', 'length that was measured'),
      maybe('minimum', 'µm', 'floor'),
      maybe('maximum', 'µm', 'cap'),
    ],
    outputs: [given('tolerance', 'µm', 'for the measured length')],
    sign: null,
    sensitiveTo: ['The floor: 5 µm is usual on turning machines, but it is to be looked up.'],
    example: {
      words: '15 µm over 300 mm, measured over 240 mm.',
      input: { method: 'tolerance', base: '15', baseLength: '300', length: '240', minimum: '5' },
    },
  },
];
