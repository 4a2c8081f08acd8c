import type { TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { milledFeatures, turnedPieces } from './finished-pieces';
import { code, edition, source } from './source';
import { twoCollars } from './tolerances';

export const definitions: TestDefinition[] = [
  {
    id: 'WP-1',
    code,
    edition,
    version: 1,
    title: 'Two-collar cutting test',
    boundTitle: 'Two-collar cutting test, {turret} on {spindle}',
    procedure: [
      'Chuck a stiff bar with two collars, 100 to 300 mm apart, without tailstock. Machine warm, a sharp tool, material that cuts cleanly.',
      'Put the guards back and close the door. Take light, equal finishing cuts over both collars in one pass, without moving X between them and without any taper value in the program.',
      'Stop, wait until everything stands still, and let the piece come to the temperature of the micrometer.',
      'Measure D1, the collar near the headstock, and D2, the far one, at the same place of the circumference. Measure D1 once more at the end: it must repeat.',
      'The result is half the difference of the diameters over the distance. The larger diameter may lie near the headstock (the free end leans toward the tool), not the other way round.',
    ],
    appliesTo: { kind: 'turning-turret-and-spindle' },
    method: 'two-collar',
    layout: { kind: 'two-collars', distanceMm: '100' },
    tolerance: twoCollars,
    direction: 'toward-tool',
    resolution: { valueUm: '0.5', rule: 'half-even' },
    instruments: ['outside micrometer'],
    cautions: [
      'guards-back-before-cutting',
      'stored-energy',
      'isolate-before-touching',
      'other-channels-at-rest',
      'maker-and-local-rules-first',
    ],
    sketch: { scene: 'two-collar-piece', plane: 'ZX', positiveMeans: '+ larger near the headstock' },
    dependsOn: { components: ['spindle', 'turret'], moved: ['axis'], positioned: ['turret-cross-axis'] },
    workingStep: workingSteps['cutting-test'],
    judgedFigure: 'half the difference of diameters over the distance',
    usualMistakes: [
      'A blunt tool or a thin piece: the free end then bends away and comes out thicker.',
      'Moving X between the collars, or measuring the piece while it is still warm.',
      'Correcting the taper by a wear value in the program, which hides the geometry.',
    ],
    setUpTogether: 'test piece in {spindle}',
    minutes: 30,
    positiveMeans: 'larger near the headstock: free end leans toward the tool',
    negativeMeans: 'larger at the far end: free end leans away from the tool',
    source,
  },
  ...turnedPieces,
  ...milledFeatures,
];
