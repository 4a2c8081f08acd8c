import { isOwnTest, ownTests } from '@/standards/own-tests';
import { codeTitle } from '@/standards/registry';
import type { TestDefinition } from '@/standards/types';
import { type CatalogueCode, catalogue, findCatalogueTest, slugOf } from './catalogue';

/** Short, because own tests have pages and addresses of their own: `/catalogue/own/OWN-1`. */
export const ownSlug = 'own';

const ownCode = (tests: readonly TestDefinition[]): CatalogueCode => ({
  ...ownTests,
  slug: ownSlug,
  title: codeTitle(ownTests.code, ownTests.edition),
  tests: [...tests].sort((a, b) => a.workingStep - b.workingStep || a.id.localeCompare(b.id, 'en', { numeric: true })),
});

/** Every code with its newest tests, then the organisation's own where it has any. */
export const catalogueWithOwn = (ownDefinitions: readonly TestDefinition[]): CatalogueCode[] => [
  ...catalogue(),
  ...(ownDefinitions.length > 0 ? [ownCode(ownDefinitions)] : []),
];

/** As `findCatalogueTest`; own tests are found by `own` or `own tests`. */
export function findTestWithOwn(
  code: string,
  test: string,
  ownDefinitions: readonly TestDefinition[],
): { code: CatalogueCode; test: TestDefinition } | null {
  if (code !== ownSlug && code !== ownTests.code && code !== 'own-tests') return findCatalogueTest(code, test);
  const definition = ownDefinitions.find(({ id }) => id === test.toUpperCase());
  return definition ? { code: ownCode(ownDefinitions), test: definition } : null;
}

/** Address of the page of a test, of the catalogue or an own one. */
export const testHref = (test: Pick<TestDefinition, 'code' | 'edition' | 'id'>): string =>
  `/catalogue/${isOwnTest(test) ? ownSlug : slugOf(test.code, test.edition)}/${test.id}`;
