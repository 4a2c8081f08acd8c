import type { TestDefinition, ToleranceRule } from '../types';
import { workingSteps } from '../working-order';
import { base, movingSlide, wholeMicrometre } from './parts';
import { xAngular, yAngular, zAngular } from './tolerances';

type Quantity = 'pitch' | 'yaw' | 'roll';

interface Slide {
  name: 'Z' | 'X' | 'Y';
  letters: string[];
  number: 6 | 7 | 8;
  positionsMm: string[];
  tolerance: ToleranceRule;
  /** About which axis the slide turns; on a lathe the letter says more than the name. */
  about: Record<Quantity, 'X' | 'Y' | 'Z'>;
  /** With what the angle can be seen. */
  seen: Record<Quantity, { words: string; instruments: string[] }>;
}

const collimator = {
  words:
    'Set up an autocollimator or a laser with angle optics on a part that stands still, looking along the travel, its mirror on the slide.',
  instruments: ['autocollimator', 'laser interferometer'],
};
const levelOr = (how: string) => ({
  words: `Put a level on the slide, ${how}. On a slant bed stand it on a wedge that brings it level, or look along the travel with an autocollimator or a laser with angle optics instead.`,
  instruments: ['precision level', 'autocollimator', 'laser interferometer'],
});
const twoIndicators =
  'fix two indicators to the slide, a known distance apart across the travel, against one straightedge or two that do not move; the change of their difference divided by the distance is the angle, in µm/m';

const slides: Slide[] = [
  {
    name: 'Z',
    letters: ['Z', 'W'],
    number: 6,
    positionsMm: ['0', '100', '200', '300', '400', '500'],
    tolerance: zAngular,
    about: { pitch: 'X', yaw: 'Y', roll: 'Z' },
    seen: {
      pitch: levelOr('along the travel'),
      yaw: collimator,
      roll: {
        words: `Put a level on the slide, across the travel; on a slant bed on a wedge that brings it level. Where that cannot be done, ${twoIndicators}. An autocollimator cannot see roll.`,
        instruments: ['precision level', 'indicator', 'straightedge'],
      },
    },
  },
  {
    name: 'X',
    letters: ['X', 'U'],
    number: 7,
    positionsMm: ['0', '40', '80', '120', '160', '200'],
    tolerance: xAngular,
    about: { pitch: 'Z', yaw: 'Y', roll: 'X' },
    seen: {
      pitch: levelOr('along the travel'),
      yaw: collimator,
      roll: {
        words: `Put a level on the slide, across the travel (along Z). Where the slide stands too steep for it, ${twoIndicators}. An autocollimator cannot see roll.`,
        instruments: ['precision level', 'indicator', 'straightedge'],
      },
    },
  },
  {
    name: 'Y',
    letters: ['Y', 'V'],
    number: 8,
    positionsMm: ['0', '20', '40', '60', '80', '100'],
    tolerance: yAngular,
    about: { pitch: 'X', yaw: 'Z', roll: 'Y' },
    seen: {
      pitch: levelOr('along Z'),
      yaw: levelOr('along X'),
      roll: {
        words: `Where Y stands upright a level sees nothing of its roll: ${twoIndicators}. On a slanting Y a level across the travel shows it. An autocollimator along the travel cannot see roll.`,
        instruments: ['indicator', 'straightedge', 'precision level'],
      },
    },
  },
];

const suffix: Record<Quantity, string> = { pitch: 'a', yaw: 'b', roll: 'c' };

function angular(slide: Slide, quantity: Quantity): TestDefinition {
  const { name, about, seen } = slide;
  const word = quantity.charAt(0).toUpperCase() + quantity.slice(1);
  const letter = about[quantity];
  return {
    ...base,
    id: `AX-${slide.number}${suffix[quantity]}`,
    title: `${word} of ${name} motion: rotation about ${letter}`,
    boundTitle: `${word} of the {axis} motion, rotation about ${letter}`,
    procedure: [
      seen[quantity].words,
      `Fix the sign by hand before the first reading: a rotation about ${letter} counts positive by the right-hand rule, thumb along the plus direction of ${letter}. Whether it is kept the same for all readings matters more than which way it counts.`,
      'At the first position set the instrument to zero or note it as it stands; only differences count.',
      'Move over the whole travel in plus and read at five positions at least, always stopping from the same side; wait until the instrument stands still. Readings are angles: 0.001 mm/m is 1 µm/m, one second of arc 4.85 µm/m.',
      'Then go back and read the same positions in minus.',
      'Back at the first position the reading must return within a tenth of the tolerance.',
      'The result is the largest less the smallest angle of both directions together.',
    ],
    appliesTo: { kind: 'linear-axis', letters: slide.letters },
    method: 'angular-deviation',
    layout: { kind: 'angular-runs', positionsMm: slide.positionsMm, quantity, bothDirections: true },
    tolerance: slide.tolerance,
    direction: 'either',
    shownIn: 'mm/m',
    resolution: wholeMicrometre,
    instruments: seen[quantity].instruments,
    cautions: movingSlide,
    sketch: {
      scene: seen[quantity].instruments[0] === 'precision level' ? 'level-on-carriage' : 'angle-instrument',
      positiveMeans: `+ right-hand rotation about ${letter}`,
    },
    dependsOn: { components: ['bed'], moved: ['axis'], positioned: [] },
    workingStep: workingSteps.straightness,
    judgedFigure: `largest less smallest ${quantity} over the travel, both directions together`,
    usualMistakes: [
      'Taking the division of a level for what it shows over one metre when it is meant over its own base.',
      'Reading while the instrument is still settling, or with the machine rocking on its feet.',
      quantity === 'roll'
        ? 'Trying to see roll with an autocollimator, which looks along the axis of the rotation.'
        : 'Letting the beam or mirror be warmed by a lamp, a hand or the cabinet fan.',
    ],
    setUpTogether: `angle instrument on {axis}, about ${letter}`,
    minutes: 25,
  };
}

export const angularDeviations: TestDefinition[] = slides.flatMap((slide) =>
  (['pitch', 'yaw', 'roll'] as const).map((quantity) => angular(slide, quantity)),
);
