import { sources } from '@/lib/explaining/sources';
import { given, type MethodGuide, maybe } from './method-guide';

/** Invented runs, the same as one of the reference cases of the evaluation. */
const forward = [
  ['0.2', '-0.1', '0.3', '0', '0.1'],
  ['1.4', '1.1', '1.6', '1.3', '1.1'],
  ['2.9', '2.6', '3.1', '2.8', '2.6'],
  ['2.2', '2.5', '2', '2.4', '2.4'],
  ['4.1', '3.8', '4.4', '4', '4.2'],
];
const backward = [
  ['-1.9', '-2.2', '-1.8', '-2.1', '-2'],
  ['-0.6', '-1', '-0.7', '-0.9', '-0.8'],
  ['0.9', '0.5', '1', '0.7', '0.9'],
  ['0.4', '0.1', '0.6', '0.3', '0.1'],
  ['2.2', '1.8', '2.3', '2', '2.2'],
];
const circle = (radii: string[]) => radii.map((radius, k) => ({ angle: String(k * 45), radius }));

export const shiftInputs = [
  given('target', 'mm', 'where it should be, as shown'),
  given('found', 'mm', 'where it was found, as shown'),
  given('basis', '', 'radius: the figures are ways of the slide; diameter: they are diameters'),
  maybe('controlFactor', '', '1 (else) or 2: whether the control counts its shift on the diameter'),
];
export const shiftOutputs = [
  given('shift', 'µm', 'way that the slide lacks in the plus direction'),
  given('controlShift', 'µm', 'the same as the control counts it'),
];

export const axisGuides: MethodGuide[] = [
  {
    slug: 'positioning',
    method: 'positioning',
    group: 'axes',
    ...sources.positioning,
    sentence: 'Accuracy, repeatability and reversal of a numerically controlled axis over its travel.',
    purpose:
      'For a linear or rotary axis read by laser or scale at targets over its travel, several runs both ways. It tells what is systematic from what scatters. A single run gives no repeatability and no A: these figures are left out then.',
    formulas: [
      'B(i) = mean forward − mean backward; B = max |B(i)|',
      's(i) = √(Σ(x − mean)²/(n − 1)); R(i) forward = 4·s(i)',
      'R = max over i of max(2·s forward + 2·s backward + |B(i)|; R forward; R backward)',
      'E = max of all means − min of all means; M = max − min of the bidirectional means',
      'A = max(mean + 2s) − min(mean − 2s), both ways together',
      'to 20 °C: x − (P − zero)·α·(t − 20)/1000',
    ],
    inputs: [
      given('kind', '', 'linear or rotary'),
      given('targets', 'mm (rotary °)', 'two or more, any order, none twice'),
      given('forward', 'µm (rotary µm/m)', 'actual less target: a list a target, one figure a run'),
      maybe('backward', 'µm (rotary µm/m)', 'the same, targets approached in the minus direction'),
      maybe('judge', '', 'the figure that is judged; else A, with one run E'),
      maybe('temperature', '°C, µm/(m·K), mm', 'celsius, alpha and zero; only where the instrument has not done it'),
    ],
    outputs: [
      maybe('A', 'µm', 'accuracy, both ways'),
      maybe('Aforward', 'µm', 'accuracy going forward'),
      maybe('Abackward', 'µm', 'accuracy going backward'),
      maybe('E', 'µm', 'systematic deviation, both ways'),
      given('Eforward', 'µm', 'systematic deviation going forward'),
      maybe('Ebackward', 'µm', 'systematic deviation going backward'),
      maybe('R', 'µm', 'repeatability, both ways'),
      maybe('Rforward', 'µm', 'repeatability going forward'),
      maybe('Rbackward', 'µm', 'repeatability going backward'),
      maybe('B', 'µm', 'largest amount of reversal'),
      maybe('meanB', 'µm', 'mean reversal, with its sign'),
      maybe('M', 'µm', 'range of the bidirectional means'),
      given('positions', 'mm, µm', 'means, reversal and scatter of each target'),
      given('at', 'mm', 'targets at which each figure occurs'),
      given('cycles', '', 'number of runs'),
    ],
    sign: 'Deviation = actual less target. Mean reversal positive: the axis stands further in plus when it comes from the minus side.',
    sensitiveTo: [
      'Temperature: 1 m of steel grows about 11 µm a kelvin.',
      'Targets that fall on whole turns of the screw hide its periodic error.',
      'A line of measurement away from the line of work adds the tilt of the slide.',
    ],
    example: {
      words: 'Five targets over 402 mm, five runs both ways.',
      input: {
        method: 'positioning',
        kind: 'linear',
        targets: ['0', '105', '198', '311', '402'],
        forward,
        backward,
        judge: 'A',
      },
    },
  },
  {
    slug: 'circular',
    method: 'circular',
    group: 'axes',
    ...sources.circular,
    sentence: 'Two axes on a circle: form, reversal, squareness and scale from one trace.',
    purpose:
      'For a quick look at two axes that move together, by a telescoping bar or a master disc, clockwise and counterclockwise. The table says how far each part goes by its formula; it names no causes.',
    formulas: [
      'G = least separation of two concentric circles round the trace; Gb: both directions together',
      'Fmax, Fmin: largest and smallest radius about the centre as set',
      'D = mean least-squares radius − nominal radius',
      'c + a·cos θ + b·sin θ + p·cos 2θ + q·sin 2θ: squareness = −2q/R·1000, scale = 2p/R·1000',
    ],
    inputs: [
      maybe('clockwise', '°, µm', 'angle and radius less nominal, five or more; one direction at least'),
      maybe('counterclockwise', '°, µm', 'the same the other way'),
      given('nominalRadius', 'mm', 'radius of the programmed circle'),
      maybe('arc', '°', 'arc that was run; else 360'),
      maybe('judge', '', 'Gb (else, with both directions) or G'),
    ],
    outputs: [
      maybe('clockwise', 'µm', 'G, G about the least-squares centre, Fmax, Fmin'),
      maybe('counterclockwise', 'µm', 'the same the other way'),
      maybe('Gb', 'µm', 'both directions together'),
      maybe('D', 'µm', 'mean radius less nominal'),
      given('Fmax', 'µm', 'largest radius less nominal, centre as set'),
      given('Fmin', 'µm', 'smallest'),
      given('centre', 'µm', 'of the least-squares circle of all readings'),
      maybe('squareness', 'µm/m', 'of both axes; whole circle only'),
      maybe('scaleDifference', 'µm/m', 'positive: the first axis travels too far'),
      maybe('lagDifference', 'µm/m', 'part of the squareness that turns with the direction'),
      given('partialArc', '', 'whether less than a whole circle was run'),
    ],
    sign: 'Squareness positive: more than 90° between the plus directions.',
    sensitiveTo: [
      'Feed: at a high one the control’s lag shows as a shrunken or egg-shaped circle.',
      'The centre: it is fitted, so coarse setting does no harm.',
      'Fewer than some 30 angles miss short reversal peaks.',
    ],
    example: {
      words: 'Radius 50 mm, eight angles, both ways.',
      input: {
        method: 'circular',
        nominalRadius: '50',
        counterclockwise: circle(['1', '2', '0', '-2', '0.5', '1.5', '-0.5', '-2']),
        clockwise: circle(['0.5', '2.5', '0.5', '-1.5', '0', '2', '0', '-1.5']),
      },
    },
  },
  {
    slug: 'lost-motion',
    method: 'lost-motion',
    group: 'axes',
    ...sources['lost-motion'],
    sentence: 'Play of an axis on reversal, at cutting feed and at rapid, at several places.',
    purpose:
      'For a screw and its bearings, or the value that the control compensates. The same target is approached from both sides several times. The mean difference is the reversal; its opposite is the play that is not compensated.',
    formulas: ['mean = mean of (forward − backward)', 'lost motion = −mean', 'figure = largest |mean| of all places'],
    inputs: [
      given('places', 'µm', 'feed, name of the place, and pairs of readings at one target, both ways'),
      maybe('sense', '', 'plus-pushes-in (else) or plus-releases: what moving in plus does to the plunger'),
    ],
    outputs: [
      given('places', 'µm', 'mean and spread of each place'),
      maybe('cuttingFeed', 'µm', 'mean, lost motion and spread over the places'),
      maybe('rapid', 'µm', 'the same at rapid'),
    ],
    sign: 'Lost motion positive: play that is not compensated. Negative: too much is compensated.',
    sensitiveTo: [
      'A place near the end of the travel may differ from the middle: a worn screw is worn where it works.',
      'The indicator’s own hysteresis counts in full.',
    ],
    example: {
      words: 'One place, three pairs at each feed.',
      input: {
        method: 'lost-motion',
        places: [
          {
            feed: 'cutting-feed',
            place: 'middle of the travel',
            pairs: [
              { forward: '0', backward: '8' },
              { forward: '1', backward: '8' },
              { forward: '0', backward: '9' },
            ],
          },
          {
            feed: 'rapid',
            place: 'middle of the travel',
            pairs: [
              { forward: '-1', backward: '9' },
              { forward: '0', backward: '10' },
              { forward: '0', backward: '9' },
            ],
          },
        ],
        sense: 'plus-pushes-in',
      },
    },
  },
  {
    slug: 'reference-shift',
    method: 'reference-shift',
    group: 'axes',
    ...sources['reference-shift'],
    sentence: 'How far a reference point lies from where it should be, on radius or on diameter.',
    purpose:
      'For an axis whose zero was lost, or a turret that was knocked. What the control shows is compared with what it should show; on a diameter half of it is the way of the slide.',
    formulas: ['shift = 1000·(target − found), half of it on diameter', 'shift in the control = shift · factor'],
    inputs: shiftInputs,
    outputs: shiftOutputs,
    sign: 'Positive: the slide lacks this way in the plus direction.',
    sensitiveTo: [
      'Mixing radius and diameter doubles or halves the shift.',
      'The factor of the control is to be looked up or tried with a small amount.',
    ],
    example: {
      words: 'A diameter found 0.060 mm too large.',
      input: { method: 'reference-shift', target: '39.998', found: '40.058', basis: 'diameter', controlFactor: '2' },
    },
  },
];
