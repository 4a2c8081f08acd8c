import type { Plane, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { base, movingSlide } from './parts';
import { straightness } from './tolerances';

export const zStraightness: TestDefinition = {
  ...base,
  id: 'AX-5',
  title: 'Straightness of Z motion',
  boundTitle: 'Straightness of the {axis} motion, in {plane}',
  procedure: [
    'Set the straightedge up along Z, supported at its stated points, and let it come to the temperature of the machine. Its working face looks along X for the ZX plane, along Y for the YZ plane.',
    'Fix the indicator to the moving part, plunger square to the straightedge. Level the straightedge roughly so that both ends read alike; what is left drops out with the reference line.',
    'At the first position set the indicator to zero. Pushing the plunger in counts positive.',
    'Move along the whole travel, always approaching from the same side, and read at every position. A laser with straightness optics or a taut wire (not for the vertical) may stand in for the straightedge.',
    'Come back to the first position: the reading must return within a tenth of the tolerance.',
    'The result is the width about the minimum-zone line. The local limit over any 300 mm must hold too.',
  ],
  appliesTo: { kind: 'longitudinal-axis', planes: ['ZX', 'YZ'] },
  method: 'straightness',
  layout: {
    kind: 'profile',
    positionsMm: ['0', '50', '100', '150', '200', '250', '300', '350', '400', '450', '500'],
    localLengthMm: '300',
    reference: 'minimum-zone',
  },
  tolerance: straightness,
  direction: 'either',
  resolution: { valueUm: '0.1', rule: 'half-even' },
  instruments: ['indicator', 'indicator stand', 'straightedge'],
  cautions: movingSlide,
  sketch: { scene: 'straightedge-along-motion', positiveMeans: '+ plunger pushed in' },
  dependsOn: { components: ['bed'], moved: ['axis'], positioned: [] },
  workingStep: workingSteps.straightness,
  judgedFigure: 'width about the minimum-zone line; also the local width over any 300 mm',
  usualMistakes: [
    'Supporting the straightedge at its ends, where it sags most, instead of at its stated points.',
    'Reading before the straightedge has taken the temperature of the machine.',
    'Taking positions too far apart, so that a short hump is never met and the local width looks better than it is.',
  ],
  setUpTogether: 'straightedge along {axis}',
  minutes: 35,
};

/** X and Y are measured like Z; only how the straightedge lies and what the slide carries differ. */
function shortSlide(which: {
  id: string;
  name: 'X' | 'Y';
  letters: string[];
  planes: Plane[];
  face: string;
  positionsMm: string[];
  mistake: string;
}): TestDefinition {
  return {
    ...zStraightness,
    id: which.id,
    title: `Straightness of ${which.name} motion`,
    procedure: [
      `Set a straightedge up along ${which.name} on a part that stands still, supported at its stated points, and let it come to the temperature of the machine. ${which.face}`,
      'Fix the indicator to the slide that moves, plunger square to the straightedge. Bring the straightedge roughly into line, so that both ends read alike; what is left drops out with the reference line.',
      'At the first position set the indicator to zero. Pushing the plunger in counts positive.',
      'Move along the whole travel, always approaching from the same side, and read at every position. A laser with straightness optics may stand in for the straightedge.',
      'Come back to the first position: the reading must return within a tenth of the tolerance.',
      'The result is the width about the minimum-zone line. The local limit over any 300 mm must hold too; on a shorter travel it holds for the whole of it.',
    ],
    appliesTo: { kind: 'linear-axis-in-planes', letters: which.letters, planes: which.planes },
    layout: { kind: 'profile', positionsMm: which.positionsMm, localLengthMm: '300', reference: 'minimum-zone' },
    usualMistakes: [
      which.mistake,
      'Reading before the straightedge has taken the temperature of the machine.',
      'Stopping short of the ends of the travel, where slides are often worn least and covers press most.',
    ],
    minutes: 30,
  };
}

export const xStraightness = shortSlide({
  id: 'AX-5x',
  name: 'X',
  letters: ['X', 'U'],
  planes: ['ZX'],
  face: 'Its working face looks along Z, across the travel in the ZX plane.',
  positionsMm: ['0', '20', '40', '60', '80', '100', '120', '140', '160', '180', '200'],
  mistake: 'On a slant bed, holding the straightedge so loosely that it creeps down while it is read.',
});

export const yStraightness = shortSlide({
  id: 'AX-5y',
  name: 'Y',
  letters: ['Y', 'V'],
  planes: ['XY', 'YZ'],
  face: 'Its working face looks along X for the XY plane, along Z for the YZ plane.',
  positionsMm: ['0', '10', '20', '30', '40', '50', '60', '70', '80', '90', '100'],
  mistake: 'Where Y is made of two slides moving together, taking one of them alone.',
});
