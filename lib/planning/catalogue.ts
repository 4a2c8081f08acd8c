import { bind } from '@/lib/planning/bind';
import { fitsKind } from '@/lib/planning/fits-kind';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { codes, codeTitle, currentDefinitions, type TestCode } from '@/standards/registry';
import type { BoundComponent, TestDefinition } from '@/standards/types';

export interface CatalogueCode extends TestCode {
  /** `iso-13041-1-2020`, for addresses. */
  slug: string;
  /** `ISO 13041-1:2020`. */
  title: string;
  tests: TestDefinition[];
}

export const slugOf = (code: string, edition: string): string =>
  `${code} ${edition}`
    .trim()
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-');

/** Every code with its newest tests, in working order. */
export function catalogue(): CatalogueCode[] {
  const tests = currentDefinitions();
  return codes().map((code) => ({
    ...code,
    slug: slugOf(code.code, code.edition),
    title: codeTitle(code.code, code.edition),
    tests: tests
      .filter((test) => test.code === code.code && test.edition === code.edition)
      .sort((a, b) => a.workingStep - b.workingStep || a.id.localeCompare(b.id)),
  }));
}

/** By slug (`iso-13041-1-2020`) or by title (`ISO 13041-1:2020`), and the test's own id in any case. */
export function findCatalogueTest(code: string, test: string): { code: CatalogueCode; test: TestDefinition } | null {
  const wanted = slugOf(code, '');
  const found = catalogue().find(({ slug }) => slug === wanted);
  const definition = found?.tests.find(({ id }) => id.toLowerCase() === test.toLowerCase());
  return found && definition ? { code: found, test: definition } : null;
}

/** A component on which the test can be shown, taken from the starting make-ups. */
export function exampleComponent(test: TestDefinition): BoundComponent {
  for (const { makeUp } of startingMakeUps.filter((start) => fitsKind(test, start.makeUp))) {
    const [first] = bind(test.appliesTo, makeUp);
    if (first) return first;
  }
  return {};
}
