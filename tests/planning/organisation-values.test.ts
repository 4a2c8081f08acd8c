import { describe, expect, it } from 'vitest';
import { findTolerance } from '@/lib/planning/find-tolerance';
import { type OrganisationValues, toleranceCellKey, toleranceCells } from '@/lib/planning/organisation-values';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import type { Confirmation, TestDefinition, ToleranceRule } from '@/standards/types';
import { newestDefinitions } from './data/newest-definitions';
import { workedMachine } from './data/worked-machine';

const provenance = { kind: 'from-memory', text: 'as remembered', confidence: 'low' } as const;
const first = newestDefinitions[0]!;
const definition = (tolerance: ToleranceRule, also?: TestDefinition['also']): TestDefinition => ({
  ...first,
  id: 'T',
  tolerance,
  also,
});
const confirmation = (state: Confirmation['state']): Confirmation => ({
  state,
  by: 'T. Orrell',
  on: '2026-03-10',
  edition: '2020',
  clause: 'table 3',
  secondBy: null,
});
const values = (test: TestDefinition, entries: [string, string, Confirmation['state']][]): OrganisationValues =>
  new Map(
    entries.map(([cell, toleranceUm, state]) => [
      toleranceCellKey(test, cell),
      { toleranceUm, confirmation: confirmation(state) },
    ]),
  );

const byTravel: ToleranceRule = {
  by: 'travel',
  steps: [
    { overMm: '0', upToMm: '500', toleranceUm: '10' },
    { overMm: '500', upToMm: null, toleranceUm: '15' },
  ],
  local: { toleranceUm: '6', lengthMm: '300', provenance },
  provenance,
};

describe('figures of a tolerance', () => {
  it('have a name each, further limits too', () => {
    const test = definition(byTravel, [
      { figure: 'R', label: 'repeatability', tolerance: { by: 'size-class', byClassUm: ['4', '5', '6'], provenance } },
      { figure: 'E', label: 'systematic', tolerance: { by: 'all', allUm: '8', unit: '″', provenance } },
    ]);
    expect(toleranceCells(test)).toEqual([
      { cell: 'step-0-500', words: 'travel up to 500 mm', toleranceUm: '10', unit: 'µm' },
      { cell: 'step-500-up', words: 'travel over 500 mm', toleranceUm: '15', unit: 'µm' },
      { cell: 'local', words: 'local, over any 300 mm', toleranceUm: '6', unit: 'µm' },
      { cell: 'also-R-class-1', words: 'repeatability: size class 1', toleranceUm: '4', unit: 'µm' },
      { cell: 'also-R-class-2', words: 'repeatability: size class 2', toleranceUm: '5', unit: 'µm' },
      { cell: 'also-R-class-3', words: 'repeatability: size class 3', toleranceUm: '6', unit: 'µm' },
      { cell: 'also-E-all', words: 'systematic: all sizes', toleranceUm: '8', unit: '″' },
    ]);
  });

  it.each(newestDefinitions.map((test) => [`${test.code} ${test.id}`, test] as const))(
    'of %s are distinct, and the one that a machine finds is among them',
    (_, test) => {
      const cells = toleranceCells(test);
      expect(new Set(cells.map(({ cell }) => cell)).size).toBe(cells.length);
      for (const { makeUp } of startingMakeUps) {
        const plain = findTolerance(test, { axis: makeUp.linearAxes[0]!.id }, makeUp);
        if (!plain) continue;
        const all = values(
          test,
          cells.map(({ cell, toleranceUm }) => [cell, toleranceUm, 'confirmed']),
        );
        const confirmed = findTolerance(test, { axis: makeUp.linearAxes[0]!.id }, makeUp, all);
        expect(confirmed?.confirmation?.state).toBe('confirmed');
        expect(confirmed?.also?.map((limit) => limit.confirmation?.state) ?? []).toEqual(
          (plain.also ?? []).map(() => 'confirmed'),
        );
        expect({ ...confirmed, also: undefined, confirmation: undefined }).toEqual({ ...plain, also: undefined });
      }
    },
  );
});

describe('the tolerance of a bound test', () => {
  const x1 = { axis: 'X1' };

  it('takes a replaced figure with where it was looked up, only in its own cell', () => {
    const test = definition(byTravel);
    const found = findTolerance(
      test,
      x1,
      workedMachine,
      values(test, [
        ['step-0-500', '9', 'replaced'],
        ['step-500-up', '1', 'replaced'],
        ['local', '6', 'confirmed'],
      ]),
    );
    expect(found).toMatchObject({
      baseUm: '9',
      provenance: { kind: 'published', text: '2020, table 3; put in by T. Orrell on 2026-03-10' },
      confirmation: { state: 'replaced', by: 'T. Orrell' },
      local: { toleranceUm: '6', provenance: { kind: 'from-memory' } },
    });
    const other = { ...test, version: test.version + 1 };
    expect(findTolerance(other, x1, workedMachine, values(test, [['step-0-500', '9', 'replaced']]))).toMatchObject({
      baseUm: '10',
      provenance: { kind: 'from-memory' },
    });
  });

  it('is confirmed when the local figure is too', () => {
    const test = definition(byTravel);
    const half = findTolerance(test, x1, workedMachine, values(test, [['step-0-500', '10', 'confirmed']]));
    expect([half?.baseUm, half?.confirmation]).toEqual(['10', undefined]);
  });

  it('turns seconds of arc into µm/m', () => {
    // 1″ = π/648000 rad = 4.84813681109535993589914102357… µm/m (published constant).
    const test = definition(
      { by: 'all', allUm: '8', unit: '″', local: { toleranceUm: '4', lengthMm: '300', provenance }, provenance },
      [{ figure: 'R', label: 'R', tolerance: { by: 'all', allUm: '1', unit: '″', provenance } }],
    );
    const found = findTolerance(test, {}, workedMachine);
    expect(found?.baseUm).toMatch(/^38\.785094488762879487193128188\d*$/);
    expect(found?.local?.toleranceUm).toMatch(/^19\.392547244381439743596564094\d*$/);
    expect(found?.also?.[0]?.toleranceUm).toMatch(/^4\.848136811095359935899141023\d*$/);
    expect(
      findTolerance(definition({ by: 'all', allUm: '40', unit: 'µm/m', provenance }), {}, workedMachine),
    ).toMatchObject({ baseUm: '40' });
  });

  it('finds its step by the distance between centres, and none where the machine has none', () => {
    const test = definition({ ...byTravel, by: 'centre-distance', local: undefined });
    const lathe = startingMakeUps.find(({ kind }) => kind === 'engine-lathe')!.makeUp;
    expect(findTolerance(test, {}, lathe)).toMatchObject({
      baseUm: '15',
      foundBy: 'distance between centres 1000 mm: over 500',
    });
    expect(findTolerance(test, {}, workedMachine)).toBeNull();
  });
});
