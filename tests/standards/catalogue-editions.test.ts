import { describe, expect, it } from 'vitest';
import type { TestDefinition } from '@/standards/types';
import { definitions } from './whole-catalogue';

const of = (code: string, edition: string) => definitions.filter((one) => one.code === code && one.edition === edition);

function withoutIdentity(definition: TestDefinition) {
  const { code, edition, source, testNumber, testNumberSource, ...same } = definition;
  return { is: `${code} ${edition}`, source, testNumber, testNumberSource, same };
}

describe('ISO 13041-1, two editions', () => {
  const newer = of('ISO 13041-1', '2020');
  const older = of('ISO 13041-1', '2004');

  it('hold the same tests, which differ in identity, number and source only', () => {
    expect(older).toHaveLength(newer.length);
    for (const [k, twin] of newer.entries()) {
      const [a, b] = [withoutIdentity(older[k]!), withoutIdentity(twin)];
      expect(a.same).toEqual(b.same);
      expect(a.source).not.toEqual(b.source);
    }
  });

  it('say what is not known of the difference', () => {
    for (const { source } of older) {
      expect(source.kind).toBe('from-memory');
      expect(source.text).toMatch(/differs .* not known/);
    }
  });

  it('number tests only where a number is remembered, never in the newer edition', () => {
    expect(newer.filter(({ testNumber }) => testNumber !== undefined)).toEqual([]);
    const numbered = older.filter(({ testNumber }) => testNumber !== undefined);
    expect(numbered).toHaveLength(28);
    for (const { testNumberSource } of numbered) expect(testNumberSource?.confidence).toBe('low');
    const number = (id: string) => older.find((one) => one.id === id)?.testNumber;
    expect([number('SP-1a'), number('AX-3'), number('SS-1'), number('TS-4b')]).toEqual(['G1 a)', 'G4 b)', 'G6', 'G13']);
    expect(number('TU-1')).toBeUndefined();
  });
});

describe('engine lathes', () => {
  const own = of('ISO 1708', '1989');

  it('have a code of their own, and the tests of NC machines leave them out', () => {
    for (const { machineKinds } of own) expect(machineKinds).toEqual({ only: ['engine-lathe'] });
    for (const { machineKinds, code } of definitions)
      if (code === 'ISO 13041-1') expect(machineKinds).toEqual({ not: ['engine-lathe'] });
  });

  it.each([
    ['AX-1a', 'toward-tool'],
    ['AX-1b', 'rising-to-free-end'],
    ['AX-2', 'concave-only'],
    ['TS-2a', 'toward-tool'],
    ['TS-2b', 'rising-to-free-end'],
    ['TS-3a', 'toward-tool'],
    ['TS-3b', 'rising-to-free-end'],
    ['TS-4b', 'tailstock-high'],
  ])('%s: %s', (id, direction) => {
    expect(own.find((one) => one.id === id)?.direction).toBe(direction);
  });

  it('an NC machine may lean either way along Z', () => {
    const [zx, yz] = ['AX-1a', 'AX-1b'].map((id) => of('ISO 13041-1', '2020').find((one) => one.id === id)?.direction);
    expect([zx, yz]).toEqual(['either', 'either']);
  });
});
