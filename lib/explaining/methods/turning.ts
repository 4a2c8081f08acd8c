import { sources } from '@/lib/explaining/sources';
import { given, type MethodGuide, maybe } from './method-guide';

const sweep = { '0': '10', '90': '4', '180': '2', '270': '8' };
const surface = given('surface', '', 'outside (a mandrel) or bore');
const sag = maybe('sag', 'µm', 'true droop of the bracket: half of its sag reading on a stiff bar');
const up = maybe('up', '°', 'angle at which the indicator stands on top; else 90');

export const turningGuides: MethodGuide[] = [
  {
    slug: 'run-out',
    method: 'run-out',
    group: 'turning',
    ...sources['run-out'],
    sentence: 'Total indicator reading over a turn, averaged over the ways in which the mandrel can be put in.',
    purpose:
      'For spindle noses, bores and tapers. The mandrel is read over a turn, taken out, put in a quarter of a turn further and read again, four times: what belongs to the mandrel changes its place and drops out of the eccentricity.',
    formulas: ['T = max r − min r of a turn', 'figure = mean of T over the insertions, or the largest T'],
    inputs: [
      given('insertions', 'µm', 'each with two readings or more, with angles of its own where they differ'),
      maybe('angles', '°', 'common to all; with three different ones or more the eccentricity is given'),
      maybe('judge', '', 'mean (else) or largest'),
    ],
    outputs: [
      given('perInsertion', 'µm, °', 'total reading of each, and its eccentricity where angles are given'),
      given('mean', 'µm', 'mean total reading'),
      given('largest', 'µm', 'largest total reading'),
      given('spread', 'µm', 'largest less smallest of them'),
      maybe('eccentricity', 'µm', 'of the spindle: amplitude of the mean first harmonic'),
      maybe('phase', '°', 'where it lies'),
    ],
    sign: null,
    sensitiveTo: [
      'Dirt in the taper: wipe it every time, and look at the spread of the insertions.',
      'A worn plunger that hangs shows too little.',
    ],
    example: {
      words: 'Four insertions of a mandrel, four angles each.',
      input: {
        method: 'run-out',
        angles: ['0', '90', '180', '270'],
        insertions: [
          { readings: ['0', '3', '5', '2'] },
          { readings: ['0', '2', '4', '3'] },
          { readings: ['1', '4', '5', '2'] },
          { readings: ['0', '2', '5', '3'] },
        ],
      },
    },
  },
  {
    slug: 'axial-run-out',
    method: 'axial-run-out',
    group: 'turning',
    ...sources['axial-run-out'],
    sentence: 'Face run-out or axial slip on one or more circles; the worst circle counts.',
    purpose:
      'For the face of a spindle nose, a chuck seat or a screw. Each circle is read over a turn with the indicator parallel to the axis; the largest total reading is judged.',
    formulas: ['T = max r − min r of a circle', 'figure = largest T'],
    inputs: [given('circles', 'µm', 'readings of one turn each, two or more, with a name where there are several')],
    outputs: [given('perCircle', 'µm', 'total reading of each circle'), given('largest', 'µm', 'the largest of them')],
    sign: null,
    sensitiveTo: [
      'An axial load must be on the spindle, as the maker says.',
      'Chips under the plunger on a wide face.',
    ],
    example: {
      words: 'Two circles on the face of a nose.',
      input: {
        method: 'axial-run-out',
        circles: [
          { name: 'circle 1', readings: ['0', '2', '3', '1'] },
          { name: 'circle 2', readings: ['0', '1', '4', '2'] },
        ],
      },
    },
  },
  {
    slug: 'coaxiality',
    method: 'coaxiality',
    group: 'turning',
    ...sources.coaxiality,
    sentence: 'Two axes in one line: one carries the indicator and sweeps the other at one or more places.',
    purpose:
      'For main and sub-spindle, tailstock, guide bush or turret bores. Read at 0°, 90°, 180° and 270°; half the differences of opposite readings give the offset. A second section further on gives the tilt.',
    formulas: [
      'ex = q·(r0 − r180)/2 − sag·cos(up)',
      'ey = q·(r90 − r270)/2 − sag·sin(up); q = +1 outside, −1 bore',
      'offset = √(ex² + ey²)',
      'closure = (r0 + r180) − (r90 + r270)',
    ],
    inputs: [
      given('sections', 'mm, µm', 'position and the readings at 0, 90, 180, 270°'),
      surface,
      sag,
      up,
      maybe('basis', '', 'offset (else) or total-indicator-reading, which is twice the offset'),
      maybe('plane', '', 'both (else), x or y alone'),
    ],
    outputs: [
      given('sections', 'µm', 'ex, ey, offset and closure of each section'),
      maybe('tiltX', 'µm/m', 'slope of ex over the sections'),
      maybe('tiltY', 'µm/m', 'slope of ey'),
      maybe('tilt', 'µm/m', 'both together'),
    ],
    sign: 'ex and ey: where the swept axis lies as seen from the sweeping one. The judged offset has no sign.',
    sensitiveTo: [
      'Sag of the bracket: try it on a stiff bar first, and state half of what it reads.',
      'A closure that is far from zero: something moved, or the surface is not round.',
      'Whether the tolerance means the offset or the total reading, which is twice as large.',
    ],
    example: {
      words: 'Two sections 100 mm apart on a mandrel, bracket checked and found stiff.',
      input: {
        method: 'coaxiality',
        sections: [
          { position: '0', readings: sweep },
          { position: '100', readings: { '0': '12', '90': '5', '180': '2', '270': '9' } },
        ],
        surface: 'outside',
        sag: '0',
      },
    },
  },
  {
    slug: 'centre-height',
    method: 'centre-height',
    group: 'turning',
    ...sources['centre-height'],
    sentence: 'A tool hole or tool against the height of the spindle axis, and what it does to a diameter.',
    purpose:
      'For turrets and gang slides. Swept from the spindle, by top and bottom, or by comparing the heights of two mandrels over one base. Small radii suffer most: the error of a diameter grows as the height squared over the radius.',
    formulas: [
      'ey = q·(r90 − r270)/2 − sag, or height of the tool − height of the spindle',
      'effect on the diameter = 2·(√(r² + ey²) − r) ≈ ey²/r',
    ],
    inputs: [
      maybe('sweep', 'µm', 'readings at 0, 90, 180, 270°'),
      maybe('top', 'µm', 'with bottom, in place of a sweep'),
      maybe('bottom', 'µm', 'with top'),
      maybe('toolHeight', 'µm', 'with spindleHeight, in place of both'),
      maybe('spindleHeight', 'µm', 'with toolHeight'),
      { ...surface, optional: true },
      sag,
      up,
      maybe('radii', 'mm', 'radii at which the effect on the diameter is wanted'),
    ],
    outputs: [
      given('ey', 'µm', 'height of the tool over the spindle axis'),
      maybe('ex', 'µm', 'offset along X, with a sweep'),
      maybe('diameterEffects', 'µm', 'error of the diameter at each radius'),
    ],
    sign: 'Positive: the tool stands above the spindle axis.',
    sensitiveTo: [
      'Sag of the bracket counts in full.',
      'Two heights need the same base and the same diameter of both mandrels.',
    ],
    example: {
      words: 'A boring-bar hole swept from the spindle, bracket sags by 1 µm.',
      input: {
        method: 'centre-height',
        sweep: { '0': '2', '90': '11', '180': '-2', '270': '-13' },
        surface: 'bore',
        sag: '1',
        radii: ['1', '5', '25'],
      },
    },
  },
  {
    slug: 'axis-of-rotation',
    method: 'axis-of-rotation',
    group: 'turning',
    ...sources['axis-of-rotation'],
    sentence: 'Error motion of a spindle: what comes back every turn and what does not.',
    purpose:
      'For a spindle at speed, with sensors on a master ball or cylinder. The mean over the turns shows what the bearings do every turn, the rest is what they do by chance: the one shapes the piece, the other roughens it.',
    formulas: [
      'm(k) = mean over the turns of r(i, k)',
      'synchronous = max − min of (m − fit); axial: of m',
      'asynchronous = largest spread over the turns at one angle',
      'fit = c + a·cos θ + b·sin θ',
    ],
    inputs: [
      given('turns', 'µm (tilt µm/m)', 'two turns or more, the same four angles or more in each'),
      maybe('angles', '°', 'else evenly round'),
      given('direction', '', 'radial, axial or tilt'),
      maybe('judge', '', 'total (else), synchronous or asynchronous'),
    ],
    outputs: [
      given('total', 'µm', 'over all turns'),
      given('synchronous', 'µm', 'what comes back every turn'),
      given('asynchronous', 'µm', 'what does not'),
      maybe('eccentricity', 'µm', 'of the ball on the spindle, taken out; radial and tilt'),
      maybe('fundamental', 'µm', 'axial: the part that comes once a turn, which is real'),
      maybe('residualSynchronous', 'µm', 'axial: synchronous without it'),
    ],
    sign: null,
    sensitiveTo: [
      'The form of the ball counts as synchronous motion.',
      'Too few turns: the asynchronous part looks small.',
    ],
    example: {
      words: 'Three turns, eight angles, radial at the tool.',
      input: {
        method: 'axis-of-rotation',
        direction: 'radial',
        judge: 'total',
        turns: [
          ['0', '0.8', '1.1', '0.7', '0.1', '-0.9', '-1.2', '-0.8'],
          ['0.2', '0.7', '1.3', '0.6', '0', '-0.8', '-1.1', '-0.9'],
          ['0.1', '0.9', '1', '0.8', '-0.1', '-0.7', '-1.3', '-0.7'],
        ],
        angles: ['0', '45', '90', '135', '180', '225', '270', '315'],
      },
    },
  },
  {
    slug: 'indexing',
    method: 'indexing',
    group: 'turning',
    ...sources.indexing,
    sentence: 'How well a turret or rotary table comes back to each of its stations.',
    purpose:
      'For turrets and dividing heads. Each station is approached several times and read at the same place. The range of the worst station is the repeatability; the departure of each station’s mean from the mean of all is the accuracy.',
    formulas: [
      'range = max r − min r of a station',
      'departure = mean of a station − mean of the means',
      'angle = figure / radius · 1000',
    ],
    inputs: [
      given('stations', 'µm', 'name and two readings or more of each'),
      maybe('radius', 'mm', 'where it is read: gives the angles'),
      maybe('judge', '', 'repeatability (else) or accuracy'),
    ],
    outputs: [
      given('ranges', 'µm', 'range of each station'),
      given('worst', 'µm', 'the largest of them'),
      given('worstStation', '', 'whose it is'),
      given('departures', 'µm', 'of each station’s mean'),
      given('largestDeparture', 'µm', 'largest amount of them'),
      maybe('worstAngle', 'µm/m', 'worst range as an angle'),
      maybe('largestDepartureAngle', 'µm/m', 'largest departure as an angle'),
    ],
    sign: null,
    sensitiveTo: [
      'The accuracy contains the seats of the tool holders.',
      'Clamping pressure and dirt in the coupling.',
    ],
    example: {
      words: 'Four stations, indexed three times each, read at radius 100 mm.',
      input: {
        method: 'indexing',
        radius: '100',
        stations: [
          { name: '1', readings: ['0', '1', '0.5'] },
          { name: '4', readings: ['2', '2.5', '1.5'] },
          { name: '7', readings: ['-1', '0.5', '0'] },
          { name: '10', readings: ['1', '1', '1.5'] },
        ],
      },
    },
  },
];
