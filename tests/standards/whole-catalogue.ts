import { appliesToChoices } from '@/lib/planning/applies-to-words';
import type { MakeUp } from '@/lib/schemas/make-up';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { allDefinitions } from '@/standards/registry';
import type { TestDefinition } from '@/standards/types';

export const definitions = allDefinitions();

export const identity = ({ id, code, edition, version }: TestDefinition) => `${id} of ${code} ${edition} v${version}`;

export const named = definitions.map((definition) => ({ name: identity(definition), definition }));

export const isMeasured = ({ layout }: TestDefinition) => layout.kind !== 'check-list';

/** Names of the parts that every component of such a test has. */
export const partsOf = ({ appliesTo }: TestDefinition): string[] => [
  ...appliesToChoices[appliesTo.kind].parts,
  ...('plane' in appliesTo && appliesTo.plane ? ['plane'] : []),
];

const turning = startingMakeUps.find(({ kind }) => kind === 'turning-centre')!.makeUp;

/** A turning centre with tailstock and W axis, which none of the make-ups to start from has. */
const withTailstock: MakeUp = {
  ...turning,
  linearAxes: [
    ...turning.linearAxes,
    { id: 'W1', letter: 'W', number: 1, channel: 1, carries: 'TS1', travelMm: '500', programmedOn: 'radius' },
  ],
  tailstock: { id: 'TS1', channel: 1 },
  distanceBetweenCentresMm: '800',
};

export const makeUps = [...startingMakeUps, { kind: 'turning-centre-with-tailstock', makeUp: withTailstock }];
