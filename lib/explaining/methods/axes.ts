import { sources } from '@/lib/explaining/sources';
import { given, type MethodGuide, maybe } from './method-guide';

const both = (name: string, words: string) => [
  maybe(name, 'µm', `${words}, both directions`),
  maybe(`${name}forward`, 'µm', `${words}, + direction`),
  maybe(`${name}backward`, 'µm', `${words}, − direction`),
];
const trace = ['0', '2', '3', '1', '-1', '-2', '-1', '0'];
const circle = (shift: number) =>
  trace.map((radius, k) => ({ angle: String(k * 45), radius: trace[(k + shift) % trace.length] ?? radius }));

export const axisGuides: MethodGuide[] = [
  {
    slug: 'positioning',
    method: 'positioning',
    group: 'axes',
    ...sources.positioning,
    sentence: 'Accuracy and repeatability of an axis: A, E, R, B and M from runs in both directions.',
    purpose:
      'For a linear or rotary axis measured by laser or a step gauge. Targets are approached several times from both sides. The systematic part (E, M, B) can be compensated; what scatters (R) cannot, and A holds both together.',
    formulas: [
      'x̄↑ = Σ x/n; s↑ = √(Σ(x − x̄↑)²/(n − 1))',
      'B = max |x̄↑ − x̄↓|',
      'R = max of (2s↑ + 2s↓ + |B|; 4s↑; 4s↓)',
      'E = max(x̄↑; x̄↓) − min(x̄↑; x̄↓); M = max x̄ − min x̄',
      'A = max(x̄↑ + 2s↑; x̄↓ + 2s↓) − min(x̄↑ − 2s↑; x̄↓ − 2s↓)',
      'to 20 °C: x20 = x − (P − zero) · α · (T − 20)/1000',
    ],
    inputs: [
      given('kind', '', 'linear or rotary'),
      given('targets', 'mm (rotary °)', 'two or more, none twice'),
      given('forward', 'µm (rotary µm/m)', 'deviations in the + direction, a list for each target'),
      maybe('backward', 'µm (rotary µm/m)', 'the same in the − direction'),
      maybe('judge', '', 'figure that is judged; else A, of one run E'),
      maybe(
        'temperature',
        '°C, µm/(m·K), mm',
        'of the scale, its expansion and the zero, where the instrument did not correct',
      ),
    ],
    outputs: [
      ...both('A', 'accuracy'),
      ...both('E', 'systematic deviation'),
      ...both('R', 'repeatability'),
      maybe('B', 'µm', 'reversal value, largest amount'),
      maybe('meanB', 'µm', 'mean reversal value, with its sign'),
      maybe('M', 'µm', 'range of the mean of both directions'),
      given('at', 'mm', 'target at which each figure occurs'),
      given('positions', 'µm', 'means, standard deviations, R and B at each target'),
      given('cycles', '', 'runs in each direction'),
    ],
    sign: 'A deviation is positive where the axis went further than it was told. The judged figures have no sign.',
    sensitiveTo: [
      'Temperature: 1 °C over 1 m of steel is about 11.5 µm.',
      'Dead path and cosine of the laser.',
      'Targets at whole multiples of the screw’s pitch hide its periodic error.',
      'With one run R and A cannot be given.',
    ],
    example: {
      words: 'Five targets over 402 mm, five runs each way.',
      input: {
        method: 'positioning',
        kind: 'linear',
        targets: ['0', '105', '198', '311', '402'],
        forward: [
          ['0.2', '-0.1', '0.3', '0', '0.1'],
          ['1.4', '1.1', '1.6', '1.3', '1.1'],
          ['2.9', '2.6', '3.1', '2.8', '2.6'],
          ['2.2', '2.5', '2', '2.4', '2.4'],
          ['4.1', '3.8', '4.4', '4', '4.2'],
        ],
        backward: [
          ['-1.9', '-2.2', '-1.8', '-2.1', '-2'],
          ['-0.6', '-1', '-0.7', '-0.9', '-0.8'],
          ['0.9', '0.5', '1', '0.7', '0.9'],
          ['0.4', '0.1', '0.6', '0.3', '0.1'],
          ['2.2', '1.8', '2.3', '2', '2.2'],
        ],
        judge: 'A',
      },
    },
  },
  {
    slug: 'circular',
    method: 'circular',
    group: 'axes',
    ...sources.circular,
    sentence: 'Two axes driven in a circle, both ways round: circular deviation, squareness and scale of the axes.',
    purpose:
      'For a bar gauge or a grid encoder over a circle. Going round in both directions tells geometry, which stays, from lost motion and lag, which turn over. The figures stand in a plain table; what causes them is for the person to find.',
    formulas: [
      'G = least max r − min r over all centres',
      'Gb = the same over both directions together',
      'squareness = −2q/R · 1000, q of sin 2θ',
      'scale difference = 2p/R · 1000, p of cos 2θ',
    ],
    inputs: [
      maybe('clockwise', '°, µm', 'angle, and radius less nominal; five or more'),
      maybe('counterclockwise', '°, µm', 'the same the other way round; one of both is needed'),
      given('nominalRadius', 'mm', 'radius that was programmed'),
      maybe('arc', '°', 'arc that was measured; else 360'),
      maybe('judge', '', 'Gb (else, where both ways were run) or G'),
    ],
    outputs: [
      maybe('clockwise', 'µm', 'G, G by least squares, Fmax, Fmin'),
      maybe('counterclockwise', 'µm', 'the same the other way round'),
      maybe('Gb', 'µm', 'both directions together'),
      maybe('D', 'µm', 'mean radius less nominal'),
      given('Fmax', 'µm', 'largest radial deviation about the centre as set'),
      given('Fmin', 'µm', 'smallest'),
      given('centre', 'µm', 'of the least-squares circle'),
      maybe('squareness', 'µm/m', 'of the two axes; whole circle only'),
      maybe('scaleDifference', 'µm/m', 'first axis against second; whole circle only'),
      maybe('lagDifference', 'µm/m', 'what turns its sign with the direction'),
      given('partialArc', '', 'whether less than a circle was measured'),
    ],
    sign: 'Squareness: positive where the angle between the plus directions is more than 90°. The judged figure has no sign.',
    sensitiveTo: [
      'Feed: at a high feed the lag of the drives is seen, at a low one the guideways.',
      'Of a partial arc the centre is less certain.',
    ],
    example: {
      words: 'Eight angles each way on a circle of 100 mm radius.',
      input: {
        method: 'circular',
        nominalRadius: '100',
        counterclockwise: circle(0),
        clockwise: circle(1),
        judge: 'Gb',
      },
    },
  },
  {
    slug: 'lost-motion',
    method: 'lost-motion',
    group: 'axes',
    ...sources['lost-motion'],
    sentence: 'Play and wind-up of an axis: the same target approached from both sides, at cutting feed and at rapid.',
    purpose:
      'Before a control’s value for lost motion is changed. An indicator on the slide is read at one target approached in + and in −, several pairs at several places. Controls often keep one value for cutting feed and one for rapid, so both are taken.',
    formulas: [
      'mean = mean of (forward − backward)',
      'lost motion = −mean over the places',
      'figure = largest |mean| of a place',
    ],
    inputs: [
      given('places', 'µm', 'feed, name of the place and pairs of readings forward, backward'),
      maybe('sense', '', 'what moving in + does to the plunger: plus-pushes-in (else) or plus-releases'),
    ],
    outputs: [
      given('places', 'µm', 'mean and spread at each place'),
      maybe('cuttingFeed', 'µm', 'mean, lost motion and spread over the places at cutting feed'),
      maybe('rapid', 'µm', 'the same at rapid'),
    ],
    sign: 'Lost motion positive: play that is not compensated. Negative: compensated too much.',
    sensitiveTo: [
      'The way before each approach must be longer than the play.',
      'A large figure belongs to the mechanics first; a parameter only hides it.',
      'On an X that counts diameters the control’s value may count double.',
    ],
    example: {
      words: 'One place, three pairs at each feed.',
      input: {
        method: 'lost-motion',
        sense: 'plus-pushes-in',
        places: [
          {
            feed: 'cutting-feed',
            place: 'place 1',
            pairs: [
              { forward: '0', backward: '4' },
              { forward: '0.5', backward: '4' },
              { forward: '0', backward: '3.5' },
            ],
          },
          {
            feed: 'rapid',
            place: 'place 1',
            pairs: [
              { forward: '0', backward: '6' },
              { forward: '0', backward: '5.5' },
              { forward: '0.5', backward: '6' },
            ],
          },
        ],
      },
    },
  },
  {
    slug: 'reference-shift',
    method: 'reference-shift',
    group: 'axes',
    ...sources['reference-shift'],
    sentence: 'How far an axis stands from where its control believes it is.',
    purpose:
      'After a belt, an encoder or a motor was changed, or after a crash. The place that the control shows when the tool stands on the spindle’s axis, or on its face, is compared with what it should show.',
    formulas: [
      'shift = 1000 · (target − found), half of it where the figures are diameters',
      'as the control counts = shift · factor',
    ],
    inputs: [
      given('target', 'mm', 'what the control should show'),
      given('found', 'mm', 'what it shows'),
      given('basis', '', 'radius or diameter: what both figures are'),
      maybe('controlFactor', '', '1 (else) or 2: how the control counts its shift'),
    ],
    outputs: [
      given('shift', 'µm', 'way that the slide lacks in +'),
      given('controlShift', 'µm', 'the same as the control counts it'),
    ],
    sign: 'Shift positive: the slide lacks way in +. The judged amount has no sign.',
    sensitiveTo: [
      'The sign in the control is found out by a small trial, referenced and measured again.',
      'Software limits and change positions move with it.',
    ],
    example: {
      words: 'An X that shows diameters.',
      input: { method: 'reference-shift', target: '39.998', found: '40.046', basis: 'diameter', controlFactor: '2' },
    },
  },
];
