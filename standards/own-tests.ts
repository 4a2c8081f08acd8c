import type { Provenance } from './types';

/** Tests that an organisation composed itself stand beside the codes under this name. */
export const ownTests = {
  code: 'own tests',
  edition: '',
  subject: 'Tests that this organisation has composed itself.',
  source: { kind: 'common-practice', text: 'composed by this organisation' } satisfies Provenance as Provenance,
};

export const isOwnTest = ({ code }: { code: string }): boolean => code === ownTests.code;
