import type { CautionId, TestDefinition } from '../types';

const cautions: CautionId[] = [
  'isolate-before-touching',
  'reduced-speed-enabling-device',
  'other-channels-at-rest',
  'stored-energy',
  'maker-and-local-rules-first',
];

/** Every ten degrees of a whole turn. */
export const tens: string[] = Array.from({ length: 36 }, (_, k) => String(k * 10));

/** What circular tests of the coordinate planes and of a control’s contouring share. */
export const circular = {
  method: 'circular',
  direction: 'either' as const,
  resolution: { valueUm: '0.1', rule: 'half-even' as const },
  instruments: ['circular-test gauge'],
  cautions,
  layout: { kind: 'circle-trace' as const, anglesDeg: tens, nominalRadiusMm: '50', arcDeg: '360' },
  sketch: { scene: 'circular-gauge' as const },
  dependsOn: { components: [], moved: ['axis' as const, 'reference' as const], positioned: [] },
  usualMistakes: [
    'Leaving one axis compensated and the other not, or changing a compensation between the two directions.',
    'Taking the reading while the axes still speed up: the first and last part of the path belong to the overlap.',
    'Reading the squareness from a partial arc, which does not hold it.',
  ],
  minutes: 30,
} satisfies Partial<TestDefinition>;

export const circularSteps = [
  'Set the circular-test gauge up with its centre in the middle of the working space of both axes. Note the place, the radius, the feed, and which compensations are active.',
  'The angle counts from the first named axis to the second. On lathes X often cannot pass the centre: take an arc of 180 to 220° then and write it; its centre is less certain.',
  'Let the machine run a part of the circle before and after the recorded path, so that it has its feed when recording begins and ends.',
  'Record the path counterclockwise, then clockwise, at the same feed and with nothing touched between them.',
  'Take the readings over from the gauge’s text file, or type the deviation from the nominal radius at each angle.',
];
