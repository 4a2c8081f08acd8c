import { sources } from '@/lib/explaining/sources';
import { given, type MethodGuide, maybe } from './method-guide';

const positions = given('positions', 'mm', 'two or more, none twice');
const turned = given(
  'readings',
  'µm',
  'lists by the angle at which the mandrel or disc stood: one angle, or an even number evenly round',
);
const measuringLength = maybe(
  'measuringLength',
  'mm',
  'length that the figure is wanted over; else that of the positions',
);
const means = given('means', 'µm', 'mean over the angles at each position');
const fitSlope = given('fitSlope', 'µm/m', 'slope of the least-squares line through the means');
const reversed = given('reversed', '', 'whether opposite angles were read');

export const angleGuides: MethodGuide[] = [
  {
    slug: 'parallelism',
    method: 'parallelism',
    group: 'angles',
    ...sources.parallelism,
    sentence: 'A motion against a spindle axis, read along a mandrel that is turned by half a turn.',
    purpose:
      'For a slide that has to run along a spindle, a quill or a tailstock. Read along the mandrel, turn the spindle by 180° and read again at the same places: the mean of both takes the mandrel’s own run-out away. The slope of the means over the measuring length is the figure.',
    formulas: ['m(z) = (r0 + r180)/2', 'b = Σ(z − z̄)(m − m̄)/Σ(z − z̄)²', 'e = b · L / 1000'],
    inputs: [
      positions,
      turned,
      measuringLength,
      maybe('judge', '', 'slope (else), or range of the means'),
      maybe('sag', 'µm', 'fall of the mandrel at each position along the reading direction'),
      maybe('localLength', 'mm', 'length of a window for a local figure of the range'),
    ],
    outputs: [
      means,
      fitSlope,
      given('difference', 'µm', 'mean at the largest position less that at the smallest'),
      given('range', 'µm', 'largest less smallest mean'),
      reversed,
      maybe('local', 'µm', 'largest range over any window of the local length'),
    ],
    sign: 'Positive: the readings rise along the positions. What that means for the machine depends on where the plunger stands.',
    sensitiveTo: [
      'Without turning the spindle, the mandrel’s own run-out is read as an error of the slide.',
      'In the vertical plane a long mandrel sags; its sag belongs in.',
      'Temperature: a warm headstock grows upwards while you read.',
    ],
    example: {
      words: 'Two places 300 mm apart, spindle at 0° and at 180°.',
      input: {
        method: 'parallelism',
        positions: ['0', '300'],
        readings: { '0': ['0', '12'], '180': ['4', '-2'] },
      },
    },
  },
  {
    slug: 'squareness-to-axis',
    method: 'squareness-to-axis',
    group: 'angles',
    ...sources['squareness-to-axis'],
    sentence: 'A cross slide against the spindle axis, read over a disc that is turned by half a turn.',
    purpose:
      'For the cross slide of a lathe, which decides whether a faced surface comes out hollow or domed. A disc on the spindle is read along the slide, then turned by 180° and read again, so that its own wobble drops out.',
    formulas: ['m(ρ) = (r0 + r180)/2', 'e = −b · L / 1000, b the slope of the means'],
    inputs: [
      { ...positions, words: 'distance from the axis along the slide, with its sign; two or more' },
      turned,
      measuringLength,
      maybe('sag', 'µm', 'fall of the disc or mandrel at each position along the reading direction'),
    ],
    outputs: [
      means,
      fitSlope,
      given('e', 'µm', 'the figure that is judged'),
      given('direction', '', 'concave, convex or none'),
    ],
    sign: 'Positive: concave, a faced surface is deeper in the middle. Negative: convex.',
    sensitiveTo: [
      'A disc that is loose or bruised on its seat.',
      'Reading across the middle: the sign of the distance changes there.',
      'End play of the spindle while it is turned by hand.',
    ],
    example: {
      words: 'From radius 20 to radius 170 mm, spindle at 0° and at 180°.',
      input: {
        method: 'squareness-to-axis',
        positions: ['20', '170'],
        readings: { '0': ['1', '-6'], '180': ['-1', '-10'] },
      },
    },
  },
  {
    slug: 'squareness',
    method: 'squareness',
    group: 'angles',
    ...sources.squareness,
    sentence: 'Two motions at right angles, by a square that is turned over so that its own error drops out.',
    purpose:
      'For a Y axis against X, or any two slides that must be square. Both arms of the square are read, then the square is turned by 180° about the measured arm and both are read again. Half the sum is the machine, half the difference is the square.',
    formulas: [
      's = slope of the reference arm + slope of the measured arm',
      'squareness = (s1 + s2)/2',
      'error of the square = (s1 − s2)/2',
      'e = squareness · L / 1000',
    ],
    inputs: [
      given('first', 'µm/m, or mm and µm', 'reference arm and measured arm, each as a slope or as points'),
      maybe('second', 'µm/m, or mm and µm', 'the same with the square turned over'),
      maybe('squareError', 'µm/m', 'known error of the square, where it is not turned over'),
      given('measuringLength', 'mm', 'length that the figure is wanted over'),
    ],
    outputs: [
      given('s1', 'µm/m', 'both slopes together, square as first set up'),
      maybe('s2', 'µm/m', 'the same with the square turned over'),
      given('squareness', 'µm/m', 'of the two motions'),
      maybe('squareError', 'µm/m', 'of the square: what it adds as first set up'),
    ],
    sign: 'Positive: the angle between the plus directions is more than 90°.',
    sensitiveTo: [
      'The plunger on the wrong side turns the sign: type the slope with the opposite one.',
      'A heavy square bends a light slide; support it as the piece would.',
    ],
    example: {
      words: 'Reference arm over 150 mm, measured arm over 70 mm, square turned over once.',
      input: {
        method: 'squareness',
        first: {
          referenceArm: {
            points: [
              { position: '0', reading: '0' },
              { position: '150', reading: '1' },
            ],
          },
          measuredArm: {
            points: [
              { position: '0', reading: '0' },
              { position: '70', reading: '6' },
            ],
          },
        },
        second: {
          referenceArm: {
            points: [
              { position: '0', reading: '0' },
              { position: '150', reading: '-1' },
            ],
          },
          measuredArm: {
            points: [
              { position: '0', reading: '0' },
              { position: '70', reading: '3' },
            ],
          },
        },
        measuringLength: '70',
      },
    },
  },
  {
    slug: 'angular-deviation',
    method: 'angular-deviation',
    group: 'angles',
    ...sources['angular-deviation'],
    sentence: 'Pitch, yaw or roll of a slide over its travel, out and back.',
    purpose:
      'For a carriage that nods, swings or rolls on its way. An autocollimator, a laser or a level is read at each stop going out and coming back. The largest less the smallest of all readings is the figure; the difference of both ways is the hysteresis.',
    formulas: ['figure = max − min of all readings, both ways', 'hysteresis = max |forward − backward|'],
    inputs: [
      positions,
      given('forward', 'µm/m', 'one a position'),
      maybe('backward', 'µm/m', 'one a position, on the way back'),
      maybe('kind', '', 'pitch, yaw or roll: a name only'),
    ],
    outputs: [
      maybe('hysteresis', 'µm/m', 'largest difference of both ways at one position'),
      maybe('hysteresisAt', 'mm', 'where it is'),
    ],
    sign: null,
    sensitiveTo: [
      'A level sees the tilt of the whole bed too: read a second one on the headstock and take the difference.',
      'Roll cannot be seen by an autocollimator.',
    ],
    example: {
      words: 'Three stops over 200 mm, out and back.',
      input: {
        method: 'angular-deviation',
        positions: ['0', '100', '200'],
        forward: ['0', '4', '6'],
        backward: ['1', '5', '8'],
        kind: 'pitch',
      },
    },
  },
];
