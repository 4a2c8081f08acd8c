import type { Provenance, TestDefinition } from './types';

export interface Edition {
  code: string;
  edition: string;
  source: Provenance;
  /** Numbers of the tests in that edition by our own ids, as far as they are known, and how well. */
  numbers: Record<string, string>;
  numberSource: Provenance;
}

/**
 * The same tests as they belong to another edition of their code: identity, source and number change, nothing else. For editions of
 * which no difference in what is measured is known.
 */
export function asEdition(definitions: readonly TestDefinition[], other: Edition): TestDefinition[] {
  return definitions.map((definition) => {
    const { testNumber: _, testNumberSource: __, ...same } = definition;
    const number = other.numbers[definition.id];
    return {
      ...same,
      code: other.code,
      edition: other.edition,
      version: 1,
      source: other.source,
      ...(number === undefined ? {} : { testNumber: number, testNumberSource: other.numberSource }),
    };
  });
}
