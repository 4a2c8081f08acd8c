import { appliesToChoices } from '@/lib/planning/applies-to-words';
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
