import type { CautionId, Provenance, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { code, edition, source } from './source';

const cautions: CautionId[] = [
  'isolate-before-touching',
  'reduced-speed-enabling-device',
  'stored-energy',
  'support-heavy-parts',
  'maker-and-local-rules-first',
];

const levelLimit: Provenance = {
  kind: 'common-practice',
  text: '.02 to .04 mm/m along and across; .04/1000 across is also in a published accuracy sheet of an engine lathe',
};

const level = {
  code,
  edition,
  version: 1,
  source,
  // Engine lathes have levelling tests of their own code.
  machineKinds: { not: ['engine-lathe'] },
  appliesTo: { kind: 'machine' as const },
  method: 'angular-deviation',
  tolerance: { by: 'all' as const, unit: 'µm/m' as const, allUm: '40', provenance: levelLimit },
  direction: 'either' as const,
  shownIn: 'mm/m' as const,
  resolution: { valueUm: '1', rule: 'half-even' as const },
  instruments: ['precision level'],
  cautions,
  sketch: { scene: 'level-on-carriage' as const, positiveMeans: '+ bubble toward the tailstock end or the operator' },
  dependsOn: { components: ['bed' as const], moved: [], positioned: [] },
  workingStep: workingSteps.level,
  setUpTogether: 'level on the carriage',
  usualMistakes: [
    'Levelling a machine that stands on three feet only: look for a soft foot first.',
    'Reading before the bubble has come to rest, or with a level that is warmer than the machine.',
    'Screwing feet at one place without reading the others again.',
  ],
  minutes: 40,
};

const stations = ['0', '150', '300', '450', '600'];

export const levelAlong: TestDefinition = {
  ...level,
  id: 'LV-1',
  title: 'Level along the bed',
  boundTitle: 'Level along the bed',
  procedure: [
    'The machine stands on its feet as the maker’s plan shows, fastenings as in use. Clean the place of the level on the carriage.',
    'Set the level up along Z. Check it by turning it round: both readings, halved, are the true slope.',
    'Move the carriage to each position, let the bubble rest, and read. Seconds of arc or divisions may be typed with their unit once they are mm/m.',
    'Back at the first position it must read as before, within a tenth of the tolerance.',
    'The result is the largest less the smallest reading: how much the bed bends. The slope itself is set at the feet.',
    'Let the machine stand for a day and read again; again after one to three months.',
  ],
  layout: { kind: 'angular-runs', positionsMm: stations, quantity: 'pitch', bothDirections: false },
  judgedFigure: 'largest less smallest reading along the bed',
};

export const levelAcross: TestDefinition = {
  ...level,
  id: 'LV-2',
  title: 'Level across the bed: twist',
  boundTitle: 'Level across the bed: twist',
  procedure: [
    'The machine stands on its feet as the maker’s plan shows, fastenings as in use. Clean the place of the level on the carriage.',
    'Set the level up across the bed. Check it by turning it round: both readings, halved, are the true slope.',
    'Move the carriage to each position, let the bubble rest, and read.',
    'Back at the first position it must read as before, within a tenth of the tolerance.',
    'The result is the largest less the smallest reading: the twist of the bed over its length. At a height h above the bed a twist moves the tool by h times its angle, and the diameter by twice that.',
    'Level first: everything else moves with it.',
  ],
  layout: { kind: 'angular-runs', positionsMm: stations, quantity: 'roll', bothDirections: false },
  judgedFigure: 'largest less smallest reading across the bed',
};

export const softFoot: TestDefinition = {
  ...level,
  id: 'LV-3',
  title: 'Feet: load and soft foot',
  boundTitle: 'Feet: load and soft foot',
  procedure: [
    'Fix an indicator to the floor beside a foot, plunger on the casting near it.',
    'Loosen the foot and see how far the casting springs; tighten it again. One foot after the other, never two at once.',
    'A foot whose casting springs more than its neighbours’ carries too much, one that does not move carries nothing. Pack it in one piece, flat and without burrs.',
  ],
  method: 'function-check',
  layout: {
    kind: 'check-list',
    items: [
      { id: 'pattern', question: 'Feet stand as the maker’s plan shows' },
      {
        id: 'spring',
        question: 'No foot springs more than the others',
        value: { label: 'largest spring of a casting', unit: 'mm' },
      },
      { id: 'tight', question: 'All feet carry and are tightened to the maker’s torque' },
      { id: 'packing', question: 'Packing is in one piece, flat and free of burrs' },
    ],
  },
  tolerance: null,
  shownIn: 'items',
  instruments: ['indicator', 'indicator stand', 'torque wrench'],
  sketch: { scene: 'checklist' },
  canDisturb: ['everything'],
  judgedFigure: 'items not in order',
  minutes: 30,
};

export const mandrelTrueness: TestDefinition = {
  code,
  edition,
  version: 1,
  source,
  id: 'MT-1',
  title: 'Mandrel: trueness by half a turn',
  boundTitle: 'Mandrel in {spindle}: trueness by half a turn',
  procedure: [
    'Put the clean mandrel into the clean bore, draw it in, and mark 0°.',
    'Indicator near the nose: zero, turn the spindle by hand by half a turn, read. Pushing the plunger in counts positive.',
    'The same at the free end. Half of the difference is how far the mandrel stands beside the spindle axis there.',
    'A mandrel that stands well off is taken out, cleaned and put in again, at another angle where need be, before anything is measured along it.',
    'Tests along the mandrel are read at 0° and 180° in any case: what is left drops out of their mean.',
  ],
  appliesTo: { kind: 'spindle', types: ['main', 'sub'] },
  method: 'run-out',
  judge: 'largest',
  layout: {
    kind: 'turns',
    insertions: 2,
    anglesDeg: ['0', '180'],
    insertionLabel: 'turn',
    names: ['at the nose', 'at the free end'],
  },
  tolerance: null,
  direction: 'either',
  resolution: { valueUm: '0.5', rule: 'half-even' },
  instruments: ['indicator', 'indicator stand', 'test mandrel'],
  cautions: ['isolate-before-touching', 'turn-spindle-by-hand', 'support-heavy-parts', 'maker-and-local-rules-first'],
  sketch: { scene: 'mandrel-half-turn', anglesDeg: ['0', '180'], positiveMeans: '+ plunger pushed in' },
  dependsOn: { components: ['spindle'], moved: [], positioned: [] },
  workingStep: workingSteps['spindle-run-out'],
  judgedFigure: 'larger difference over half a turn',
  usualMistakes: [
    'Trusting a mandrel because its certificate is good, when a chip sits in the bore.',
    'Drawing it in with another force than in the tests that follow.',
  ],
  setUpTogether: 'test mandrel in {spindle}',
  leads: true,
  minutes: 5,
};
