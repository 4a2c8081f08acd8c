import { sources } from '@/lib/explaining/sources';
import { given, type MethodGuide, maybe } from './method-guide';

export const helperGuides: MethodGuide[] = [
  {
    slug: 'tolerance',
    method: 'tolerance',
    group: 'helpers',
    ...sources.tolerance,
    sentence: 'A tolerance that is given over one length, brought to the length that was really measured.',
    purpose:
      'For straightness, parallelism and squareness when less or more than the stated length was measured. It grows and shrinks in proportion, but never below a floor. Run-out, indexing and offsets at a fixed place are never scaled.',
    formulas: ['T = min(max(T0 · L/L0, Tmin), Tmax)'],
    inputs: [
      given('base', 'µm', 'tolerance T0 as it is given'),
      given('baseLength', 'mm', 'length L0 that it is given over'),
      given('length', 'mm', 'length L really measured'),
      maybe('minimum', 'µm', 'floor Tmin; else 0'),
      maybe('maximum', 'µm', 'most that it may come to'),
    ],
    outputs: [given('tolerance', 'µm', 'tolerance over the measured length')],
    sign: null,
    sensitiveTo: ['A floor of 5 µm is usual for turning machines; a contract may say another one.'],
    example: {
      words: '15 µm over 300 mm, 240 mm measured.',
      input: { method: 'tolerance', base: '15', baseLength: '300', length: '240', minimum: '5' },
    },
  },
  {
    slug: 'conformity',
    method: 'conformity',
    group: 'helpers',
    ...sources.conformity,
    sentence: 'Within, out of tolerance or undecided, with or without a guard band for the uncertainty.',
    purpose:
      'For a figure that is already worked out. Simple acceptance compares it with the tolerance. Guarded acceptance takes a band for the uncertainty off first, so that what is accepted conforms nearly for certain; between both limits nothing is decided.',
    formulas: [
      'g = 0 (simple), 1.65·u or 2·u (guarded)',
      'within: y ≤ T − g; out: y > T + g; between: undecided',
      'probability, either side: Φ((T − e)/u) − Φ((−T − e)/u)',
    ],
    inputs: [
      given('deviation', 'µm', 'figure that is judged'),
      given('signed', '', 'whether its sign says something'),
      given('tolerance', 'µm', 'T, above 0, in the unit of the figure'),
      given('direction', '', 'how it may lie; either, where it has no sign'),
      given('rule', '', 'simple or guarded'),
      maybe('standardUncertainty', 'µm', 'u; needed for guarded'),
      maybe('guard', '', '1.65u (else) or U, which is 2u'),
    ],
    outputs: [
      given('verdict', '', 'within-tolerance, out-of-tolerance or undecided'),
      given('limit', 'µm', 'T − g'),
      given('margin', 'µm', 'how far the figure is from its limit; negative beyond it'),
      maybe('probability', '', 'that the true value conforms'),
    ],
    sign: 'A one-sided tolerance lets the figure lie between 0 and T on its side only.',
    sensitiveTo: [
      'Which rule holds is agreed before measuring.',
      'An uncertainty above a quarter of the tolerance leaves little to decide.',
    ],
    example: {
      words: '18 µm against 20 µm, standard uncertainty 1 µm, guarded by U.',
      input: {
        method: 'conformity',
        deviation: '18',
        signed: false,
        tolerance: '20',
        direction: 'either',
        rule: 'guarded',
        standardUncertainty: '1',
        guard: 'U',
      },
    },
  },
  {
    slug: 'uncertainty',
    method: 'uncertainty',
    group: 'helpers',
    ...sources.uncertainty,
    sentence: 'Combines the parts of an uncertainty: certificate, resolution, repeat readings, temperature.',
    purpose:
      'For a budget before or after measuring. Each part becomes a standard uncertainty by its distribution; their squares add up. Few repeat readings widen the factor for the chosen coverage.',
    formulas: [
      'u = √Σ(c·a/divisor)²; divisors: normal 1, rectangular √3, triangular √6, u-shaped √2',
      'ν = u⁴/Σ((c·u)⁴/ν)',
      'U = k·u, k two-sided Student t at ν, cut down to a whole number',
    ],
    inputs: [
      given(
        'components',
        'one unit for all',
        'name, half-width or standard uncertainty, distribution, and where known divisor, sensitivity, degrees of freedom',
      ),
      given('coverage', '', '0.95 or 0.99'),
    ],
    outputs: [
      given('standard', 'that unit', 'combined standard uncertainty'),
      maybe('degreesOfFreedom', '', 'effective ones; left out where all are infinite'),
      given('coverageFactor', '', 'k'),
      given('expanded', 'that unit', 'expanded uncertainty U'),
    ],
    sign: null,
    sensitiveTo: [
      'A certificate’s U at k = 2 is entered as normal with divisor 2.',
      'Parts that hang together, such as two lengths at one temperature, must be put into one first.',
    ],
    example: {
      words: 'Indicator, its resolution, and four repeat readings.',
      input: {
        method: 'uncertainty',
        coverage: '0.95',
        components: [
          { name: 'indicator, from its certificate', value: '1.2', distribution: 'normal', divisor: '2' },
          { name: 'resolution', value: '0.5', distribution: 'rectangular' },
          { name: 'repeat readings', value: '0.4', distribution: 'normal', degreesOfFreedom: '3' },
        ],
      },
    },
  },
  {
    slug: 'rounding',
    method: 'rounding',
    group: 'helpers',
    ...sources.rounding,
    sentence: 'Rounds a figure once to a step, a tie to the even multiple or away from zero.',
    purpose:
      'For figures that go on paper. Rounding is done once, at the end; a verdict always uses the figure before rounding.',
    formulas: ['nearest multiple of the step; a tie by the chosen rule'],
    inputs: [
      given('value', '', 'figure'),
      given('resolution', '', 'step, above 0'),
      maybe('rule', '', 'half-even (else) or half-away-from-zero'),
    ],
    outputs: [given('rounded', '', 'with as many decimals as the step has')],
    sign: null,
    sensitiveTo: ['Rounding twice can move a figure by a whole step.'],
    example: {
      words: 'A tie in the third decimal.',
      input: { method: 'rounding', value: '0.0125', resolution: '0.001', rule: 'half-even' },
    },
  },
];
