import { sources } from '@/lib/explaining/sources';
import { given, type MethodGuide, maybe } from './method-guide';

export const pieceGuides: MethodGuide[] = [
  {
    slug: 'roundness',
    method: 'roundness',
    group: 'piece',
    ...sources.roundness,
    sentence: 'How far a turned ring departs from a circle, about the narrowest ring or the least-squares centre.',
    purpose:
      'For test pieces and journals on a rotary table or between centres. The eccentricity of the set-up is taken out with the centre. The narrowest ring is worked out exactly.',
    formulas: ['d = r − (a·cos θ + b·sin θ)', 'figure = least max d − min d over a and b, or about the fitted centre'],
    inputs: [
      given('points', '°, µm', 'angle and reading, four or more, no angle twice'),
      maybe('reference', '', 'minimum-zone (else) or least-squares'),
      maybe('surface', '', 'outside or bore: turns the centre only'),
    ],
    outputs: [
      given('minimumZone', 'µm', 'width of the narrowest ring'),
      given('leastSquares', 'µm', 'width about the least-squares centre'),
      given('centre', 'µm', 'least-squares centre'),
      given('centreMinimumZone', 'µm', 'centre of the narrowest ring'),
    ],
    sign: null,
    sensitiveTo: [
      'Between centres, the centre holes are measured too.',
      'A large eccentricity distorts the trace: set the piece to a few hundredths first.',
      'Few angles hide lobes: 12 see three lobes well, not eleven.',
    ],
    example: {
      words: 'Eight angles of a turned ring.',
      input: {
        method: 'roundness',
        points: ['2', '3', '1', '0', '1', '2', '0', '-1'].map((reading, k) => ({ angle: String(k * 45), reading })),
        surface: 'outside',
      },
    },
  },
  {
    slug: 'diameter-consistency',
    method: 'diameter-consistency',
    group: 'piece',
    ...sources['diameter-consistency'],
    sentence: 'How far the diameters of one turned piece differ along its length, and which way it tapers.',
    purpose:
      'For a finishing test piece turned in one pass. The largest less the smallest diameter is judged; the taper from first to last says where to look.',
    formulas: [
      'figure = 1000·(max D − min D)',
      'taper = 1000·(D first − D last)',
      'slope = −½ of the least-squares slope of D',
    ],
    inputs: [given('sections', 'mm', 'distance from the headstock and diameter, two or more')],
    outputs: [
      given('taper', 'µm', 'first less last diameter'),
      given('slope', 'µm/m', 'of the radius along the piece'),
      given('direction', '', 'larger-near-headstock, larger-far-end or none'),
    ],
    sign: 'Taper positive: larger near the headstock.',
    sensitiveTo: [
      'A slender piece bends away from the tool: the middle comes out thick.',
      'A warm piece: measure all diameters at one temperature.',
    ],
    example: {
      words: 'Three diameters along 100 mm.',
      input: {
        method: 'diameter-consistency',
        sections: [
          { position: '0', diameter: '80.012' },
          { position: '50', diameter: '80.009' },
          { position: '100', diameter: '80.007' },
        ],
      },
    },
  },
  {
    slug: 'drift',
    method: 'drift',
    group: 'piece',
    ...sources.drift,
    sentence: 'How far the tool wanders from the piece while the machine warms up or stands.',
    purpose:
      'For a spindle run from cold, or a machine in a hall whose temperature changes. Readings over time give the range of the first hour and of all; temperatures beside them help to say why.',
    formulas: [
      'first hour = max − min of readings up to 60 min after the first',
      'figure = max − min of all',
      'rate = least-squares slope, per hour',
    ],
    inputs: [given('points', 'min, µm, °C', 'minutes, reading, and temperature where there is one; two or more')],
    outputs: [
      given('firstHour', 'µm', 'range of the first hour'),
      given('range', 'µm', 'range of all'),
      given('rate', 'µm/h', 'drift an hour'),
      maybe('temperatureRange', '°C', 'range of the temperatures'),
    ],
    sign: null,
    sensitiveTo: ['The stand of the indicator warms up as well.', 'An open door in the hall is seen at once.'],
    example: {
      words: 'Ninety minutes from a cold start.',
      input: {
        method: 'drift',
        points: [
          ['0', '0', '20.1'],
          ['15', '4', '20.8'],
          ['30', '7', '21.4'],
          ['60', '10', '22.0'],
          ['90', '11.5', '22.2'],
        ].map(([minutes, reading, temperature]) => ({
          minutes: minutes!,
          reading: reading!,
          temperature: temperature!,
        })),
      },
    },
  },
  {
    slug: 'two-collar',
    method: 'two-collar',
    group: 'piece',
    ...sources['two-collar'],
    sentence: 'Two turned collars show whether the spindle and the longitudinal slide run the same way.',
    purpose:
      'For aligning a headstock by cutting: two collars on one bar are turned with one setting of the tool. Half the difference of their diameters over their distance is the slope that the headstock has to lose.',
    formulas: ['slope = 10⁶·(D1 − D2)/(2·L)', 'e = 1000·(D1 − D2)/2'],
    inputs: [
      given('D1', 'mm', 'diameter near the headstock'),
      given('D2', 'mm', 'diameter of the far collar'),
      given('distance', 'mm', 'from collar to collar'),
    ],
    outputs: [
      given('slope', 'µm/m', 'of the spindle axis against the slide'),
      given('diameterDifference', 'µm', 'first less second diameter'),
      given('direction', '', 'larger-near-headstock, larger-far-end or none'),
    ],
    sign: 'Positive: the free end leans toward the tool.',
    sensitiveTo: [
      'A bar that bends away from the tool turns thick at its free end: take a stout one and a light cut.',
      'A worn tool makes the second collar larger.',
    ],
    example: {
      words: 'Two collars 100 mm apart.',
      input: { method: 'two-collar', D1: '30.012', D2: '30.007', distance: '100' },
    },
  },
];
