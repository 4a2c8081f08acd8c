import { describe, expect, it } from 'vitest';
import { codes, codeTitle, currentDefinitions, findDefinition } from '@/standards/registry';
import { expectProvenance } from './expect-provenance';
import { definitions } from './whole-catalogue';

describe('registry', () => {
  it('identifies a definition by id, code, edition and version', () => {
    const identities = definitions.map(({ id, code, edition, version }) => [id, code, edition, version].join('|'));
    expect(new Set(identities).size).toBe(identities.length);
    for (const one of definitions) expect(findDefinition(one.id, one.code, one.edition, one.version)).toBe(one);
    expect(findDefinition('SP-1a', 'ISO 13041-1', '1999', 1)).toBeNull();
    expect(findDefinition('SP-1a', 'ISO 13041-1', '2020', 99)).toBeNull();
    expect(currentDefinitions().length).toBe(
      new Set(definitions.map(({ id, code, edition }) => `${id}|${code}|${edition}`)).size,
    );
  });

  it('knows the code of every definition, and says where it is known from', () => {
    const known = codes();
    for (const { code, edition } of definitions)
      expect(known.filter((one) => one.code === code && one.edition === edition)).toHaveLength(1);
    for (const { code, edition, source, subject } of known) {
      expectProvenance(source);
      expect(subject).toMatch(/\w{4}/);
      expect(definitions.some((one) => one.code === code && one.edition === edition)).toBe(true);
    }
    const titles = known.map(({ code, edition }) => codeTitle(code, edition));
    expect(new Set(titles).size).toBe(titles.length);
    for (const title of [
      'ISO 13041-1:2020',
      'ISO 13041-1:2004',
      'ISO 1708:1989',
      'common practice',
      'ISO 13041-6:2009',
    ])
      expect(titles).toContain(title);
  });

  it('has no title twice in a code, unless the one is for the main spindle and the other for the sub-spindle', () => {
    const titles = definitions.map(
      ({ title, code, edition, version, appliesTo }) =>
        `${code} ${edition} v${version} ${title} ${appliesTo.kind === 'spindle' ? appliesTo.types : ''}`,
    );
    expect(titles.filter((title, k) => titles.indexOf(title) !== k)).toEqual([]);
  });

  it('names no test as the one stood in for that is not there', () => {
    const stands = definitions.filter(({ insteadOf }) => insteadOf !== undefined);
    expect(stands.map(({ id }) => id)).toContain('AX-5s');
    for (const { insteadOf, code, edition } of stands)
      expect(definitions.some((one) => one.id === insteadOf && one.code === code && one.edition === edition)).toBe(
        true,
      );
  });
});

describe('geometric tests', () => {
  const rows = [
    ...['SP-1a', 'SP-1b', 'SP-1c', 'SP-2a', 'SP-2b', 'AX-1a', 'AX-1b', 'AX-2', 'AX-3', 'AX-4'],
    ...['AX-5', 'AX-5x', 'AX-5y', 'AX-5s', 'AX-5r', 'AX-6a', 'AX-6b', 'AX-6c', 'AX-7a', 'AX-7b', 'AX-7c'],
    ...['AX-8a', 'AX-8b', 'AX-8c', 'SS-1', 'SS-2a', 'SS-2b', 'SS-3a', 'SS-3b', 'SS-3c', 'SS-3d', 'SS-3e'],
    ...['TS-1a', 'TS-1b', 'TS-2a', 'TS-2b', 'TS-3a', 'TS-3b', 'TS-4a', 'TS-4b'],
    ...['TU-1', 'TU-2a', 'TU-2b', 'TU-3', 'TU-4', 'TU-5', 'TU-6a', 'TU-6b', 'TU-6c', 'TU-6d'],
    ...['TU-7a', 'TU-7b', 'TU-7c', 'TU-7d', 'TU-7e', 'TU-7f', 'TU-7g', 'TU-7h', 'TU-8a', 'TU-8b'],
    ...['TU-9a', 'TU-9b', 'TU-9c', 'TU-9d', 'B-1', 'B-2', 'B-3a', 'B-3b'],
  ];
  const engineLathe = [
    ...['BD-1a', 'BD-1b', 'SP-1a', 'SP-1b', 'SP-1c', 'SP-2a', 'SP-2b', 'SP-3', 'AX-5', 'AX-1a', 'AX-1b', 'AX-2'],
    ...['TS-1a', 'TS-1b', 'TS-2a', 'TS-2b', 'TS-3a', 'TS-3b', 'TS-4b', 'LS-1', 'LS-2'],
  ];
  it.each([
    ['ISO 13041-1', '2020', rows],
    ['ISO 13041-1', '2004', rows],
    ['ISO 1708', '1989', engineLathe],
  ])('%s:%s holds every row', (code, edition, wanted) => {
    const ids = currentDefinitions()
      .filter((one) => one.code === code && one.edition === edition)
      .map(({ id }) => id);
    expect(ids.sort()).toEqual([...wanted].sort());
  });
});
