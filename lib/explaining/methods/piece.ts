import { sources } from '@/lib/explaining/sources';
import { given, type MethodGuide, maybe } from './method-guide';

export const pieceGuides: MethodGuide[] = [
  {
    slug: 'two-collar',
    method: 'two-collar',
    group: 'piece',
    ...sources['two-collar'],
    sentence: 'Two collars turned without a tailstock show whether spindle and slide are parallel at the tool.',
    purpose:
      'The oldest test of a lathe: the same tool takes a light cut over two collars without the cross slide being moved. Their difference is the taper that every piece will have.',
    formulas: ['slope = 1000000 · (D1 − D2)/(2·L)', 'e = 1000 · (D1 − D2)/2'],
    inputs: [
      given('D1', 'mm', 'collar near the headstock'),
      given('D2', 'mm', 'far collar'),
      given('distance', 'mm', 'from collar to collar'),
    ],
    outputs: [
      given('slope', 'µm/m', 'of the spindle axis in the plane of the tool'),
      given('diameterDifference', 'µm', 'D1 less D2'),
      given('direction', '', 'larger-near-headstock, larger-far-end or none'),
    ],
    sign: 'Positive: the free end leans toward the tool, the collar near the headstock is larger.',
    sensitiveTo: [
      'A slender piece gives way to the tool.',
      'Tool wear between the two cuts.',
      'Measure both collars at the same temperature.',
    ],
    example: {
      words: 'Collars 100 mm apart.',
      input: { method: 'two-collar', D1: '30.012', D2: '30.007', distance: '100' },
    },
  },
  {
    slug: 'diameter-consistency',
    method: 'diameter-consistency',
    group: 'piece',
    ...sources['diameter-consistency'],
    sentence: 'How alike the diameters of a turned cylinder are along its length.',
    purpose:
      'For the finished test piece. Diameters are taken in one axial plane along the cylinder; the largest less the smallest is judged, the taper says which end is larger.',
    formulas: [
      'figure = 1000 · (max D − min D)',
      'taper = 1000 · (D first − D last)',
      'slope = −½ of the least-squares slope of D',
    ],
    inputs: [given('sections', 'mm, mm', 'distance from the headstock and diameter; two or more')],
    outputs: [
      given('taper', 'µm', 'first less last diameter'),
      given('slope', 'µm/m', 'of the axis, as with two collars'),
      given('direction', '', 'larger-near-headstock, larger-far-end or none'),
    ],
    sign: 'Taper positive: larger near the headstock. The judged figure has no sign.',
    sensitiveTo: ['Temperature of the piece: 1 °C on 50 mm is 0.6 µm.', 'Chatter marks and burrs.'],
    example: {
      words: 'Four sections over 90 mm.',
      input: {
        method: 'diameter-consistency',
        sections: ['30.0104', '30.0081', '30.0072', '30.0044'].map((diameter, k) => ({
          position: String(10 + k * 30),
          diameter,
        })),
      },
    },
  },
  {
    slug: 'roundness',
    method: 'roundness',
    group: 'piece',
    ...sources.roundness,
    sentence: 'How far a trace departs from a circle, about the centre that makes it smallest.',
    purpose:
      'For turned test pieces and bearing seats. A trace over one turn is compared with two concentric circles; the centre is found exactly. The least-squares figure stands beside it.',
    formulas: ['figure = least max − min of (r − a·cos θ − b·sin θ) over a, b', 'least squares: a and b fitted'],
    inputs: [
      given('points', '°, µm', 'angle and reading, four or more'),
      maybe('reference', '', 'minimum-zone (else) or least-squares'),
      maybe('surface', '', 'outside (else) or bore: turns the sign of the centre'),
    ],
    outputs: [
      given('minimumZone', 'µm', 'about the best centre'),
      given('leastSquares', 'µm', 'about the least-squares centre'),
      given('centre', 'µm', 'least-squares centre'),
      given('centreMinimumZone', 'µm', 'best centre'),
    ],
    sign: null,
    sensitiveTo: [
      'Three or four points cannot show a form with as many lobes.',
      'The error motion of the spindle that turns the piece while it is read.',
    ],
    example: {
      words: 'Eight angles on a cylinder that sits 3 µm off the middle.',
      input: {
        method: 'roundness',
        reference: 'minimum-zone',
        surface: 'outside',
        points: ['3', '2.6', '0.2', '-2.1', '-2.8', '-2.4', '0.1', '2.3'].map((reading, k) => ({
          angle: String(k * 45),
          reading,
        })),
      },
    },
  },
  {
    slug: 'drift',
    method: 'drift',
    group: 'piece',
    ...sources.drift,
    sentence: 'What moves while a machine warms up or stands: over the first hour and over all.',
    purpose:
      'For spindle runs and for the surroundings of a machine. One place is read again and again, with the temperature beside it where it is wanted.',
    formulas: [
      'figure = max − min of all',
      'first hour = max − min of the first 60 min',
      'rate = least-squares slope · 60',
    ],
    inputs: [given('points', 'min, µm, °C', 'time and reading, temperature where it was read; two or more')],
    outputs: [
      given('firstHour', 'µm', 'range in the first hour'),
      given('range', 'µm', 'range over all'),
      given('rate', 'µm/h', 'slope over all'),
      maybe('temperatureRange', '°C', 'range of the temperatures'),
    ],
    sign: null,
    sensitiveTo: [
      'The stand and the bracket of the indicator warm up too.',
      'A door or a gate that is opened meanwhile.',
    ],
    example: {
      words: 'Two hours after the spindle was started, read each half hour.',
      input: {
        method: 'drift',
        points: [
          ['0', '0', '21.2'],
          ['30', '4.5', '23.8'],
          ['60', '7', '25.6'],
          ['90', '8.5', '26.4'],
          ['120', '9', '26.7'],
        ].map(([minutes, reading, temperature]) => ({
          minutes: minutes!,
          reading: reading!,
          temperature: temperature!,
        })),
      },
    },
  },
];
