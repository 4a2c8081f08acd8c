import { sources } from '@/lib/explaining/sources';
import { given, type MethodGuide, maybe } from './method-guide';

const reference = given('reference', '', 'line: end-points, least-squares or minimum-zone');
const slope = given('slope', 'µm/m', 'slope of the reference line');
const intercept = given('intercept', 'µm', 'height of the reference line at position 0');
const residuals = given('residuals', 'µm', 'reading less reference line, in the order of the points');

export const straightGuides: MethodGuide[] = [
  {
    slug: 'straightness',
    method: 'straightness',
    group: 'straight',
    ...sources.straightness,
    sentence:
      'How far a motion or an edge departs from a straight line, over the whole length and over any part of it.',
    purpose:
      'For a slide read against a straightedge or a stretched wire, or a guideway read along its length. The line is chosen first: through both ends, by least squares, or the middle of the narrowest strip that holds every reading. A contract that names no line should be asked about, because the three give different figures.',
    formulas: [
      'd = z − (a + b·x/1000)',
      'S = max d − min d',
      'S local = the largest S over any window of the local length, its line fitted anew',
    ],
    inputs: [
      reference,
      given('points', 'mm, µm', 'position and reading of each point, three or more, no position twice'),
      maybe('localLength', 'mm', 'length of the window for the local figure'),
    ],
    outputs: [
      slope,
      intercept,
      residuals,
      maybe('local', 'µm', 'largest figure over any window of the local length'),
      maybe('localAt', 'mm', 'where the worst window begins'),
    ],
    sign: null,
    sensitiveTo: [
      'A straightedge that is not straight itself counts in full: turn it over and use the reversal instead.',
      'Too few points hide a wave that is shorter than their distance.',
      'Lining the edge up coarsely does no harm: the slope of the line takes it out.',
    ],
    example: {
      words: 'Six places over 500 mm of a bed, a micron indicator against a straightedge.',
      input: {
        method: 'straightness',
        reference: 'minimum-zone',
        points: ['0', '3', '5', '4', '6', '5'].map((reading, k) => ({ position: String(k * 100), reading })),
      },
    },
  },
  {
    slug: 'straightness-from-angles',
    method: 'straightness-from-angles',
    group: 'straight',
    ...sources['straightness-from-angles'],
    sentence: 'A straight-line profile put together from a level or an autocollimator, foot behind foot.',
    purpose:
      'For beds that are longer than any straightedge. The foot of the instrument is moved on by its own length each time, so that every angle becomes a step of height. Reading on the way back as well shows by its closure whether the instrument or the bed moved meanwhile.',
    formulas: ['h(0) = 0; h(k) = h(k−1) + step · angle / 1000', 'then as straightness'],
    inputs: [
      reference,
      given('stepLength', 'mm', 'length of the foot, which is the step'),
      given('angles', 'µm/m', 'one a step, next foot higher positive; two or more'),
      maybe('returnAngles', 'µm/m', 'taken on the way back, listed by step like the first ones'),
    ],
    outputs: [
      given('heights', 'µm', 'height of each foot over the last one, one more than there are steps'),
      maybe('closure', 'µm', 'difference of the end height out and back'),
      slope,
      intercept,
      residuals,
    ],
    sign: null,
    sensitiveTo: [
      'An angle that is wrong shifts every height after it.',
      'A foot that is not set down exactly where the last one stood leaves gaps.',
      'A level follows the tilting of the whole machine when a heavy carriage moves along it.',
    ],
    example: {
      words: 'Five steps of 100 mm with a level that reads to 5 µm/m.',
      input: {
        method: 'straightness-from-angles',
        reference: 'minimum-zone',
        stepLength: '100',
        angles: ['30', '20', '-10', '20', '-10'],
      },
    },
  },
  {
    slug: 'straightness-reversal',
    method: 'straightness-reversal',
    group: 'straight',
    ...sources['straightness-reversal'],
    sentence: 'Tells the slide’s straightness from the straightedge’s own, by turning the edge over.',
    purpose:
      'For slides that are about as straight as the straightedge. After the first run the edge is turned by half a turn about its length and read from its other side. What keeps its sign belongs to the edge, what changes it to the slide.',
    formulas: ['slide = (second − first)/2', 'straightedge = (first + second)/2', 'S = max d − min d of the slide'],
    inputs: [
      given('positions', 'mm', 'three or more, none twice'),
      given('first', 'µm', 'one a position'),
      given('second', 'µm', 'at the same positions, edge turned over'),
      maybe('reference', '', 'line: end-points, least-squares or minimum-zone (taken where none is named)'),
    ],
    outputs: [
      given('machine', 'µm', 'profile of the slide'),
      given('straightedge', 'µm', 'profile of the edge'),
      given('machineStraightness', 'µm', 'straightness of the slide'),
      given('straightedgeStraightness', 'µm', 'straightness of the edge'),
    ],
    sign: 'Profile of the slide: positive means away from the edge in the first run.',
    sensitiveTo: [
      'Both runs must use the same line on the edge, seen from both sides.',
      'The edge sags alike in both runs only where it lies on its side.',
    ],
    example: {
      words: 'Five places over 400 mm.',
      input: {
        method: 'straightness-reversal',
        positions: ['0', '100', '200', '300', '400'],
        first: ['0', '1.2', '0.8', '-0.4', '0.3'],
        second: ['0', '3.6', '4.2', '2.8', '0.9'],
        reference: 'minimum-zone',
      },
    },
  },
  {
    slug: 'flatness',
    method: 'flatness',
    group: 'straight',
    ...sources.flatness,
    sentence: 'How far a face departs from a plane: the narrowest slab, least squares, or three points of your own.',
    purpose:
      'For tables, faces of turrets and bases that were scraped. Heights over a grid are compared with a plane. The narrowest pair of parallel planes gives the smallest figure that any plane can give; it is worked out exactly.',
    formulas: ['d = z − (a + b·x/1000 + c·y/1000)', 'flatness = max d − min d'],
    inputs: [
      given('points', 'mm, mm, µm', 'x, y and reading of each point, four or more, not on one line'),
      given('reference', '', 'plane: three-points, least-squares or minimum-zone'),
      maybe('three', '', 'three points by their number, counted from 0; only with three-points'),
    ],
    outputs: [
      given('a', 'µm', 'height of the plane at x 0, y 0'),
      given('b', 'µm/m', 'slope of the plane along x'),
      given('c', 'µm/m', 'slope of the plane along y'),
      given('residuals', 'µm', 'reading less plane'),
    ],
    sign: null,
    sensitiveTo: [
      'A stray reading at a corner tilts the narrowest slab at once.',
      'Places near the edge of the face, where it is chamfered or worn.',
    ],
    example: {
      words: 'Nine places on a square of 300 mm.',
      input: {
        method: 'flatness',
        reference: 'minimum-zone',
        points: ['0', '2', '1', '3', '6', '4', '1', '3', '2'].map((reading, k) => ({
          x: String((k % 3) * 150),
          y: String(Math.floor(k / 3) * 150),
          reading,
        })),
      },
    },
  },
];
