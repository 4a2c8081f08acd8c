import { describe, expect, it } from 'vitest';
import { standsInFor } from '@/lib/planning/alternatives';
import { choicesOfPlan } from '@/lib/planning/choices-of-plan';
import { estimateOf, minutesWords, pastDurations } from '@/lib/planning/estimate-minutes';
import { setUpRuns } from '@/lib/planning/group-proposals';
import { keepTogether } from '@/lib/planning/keep-together';
import { machineParts } from '@/lib/planning/machine-parts';
import { planSheets } from '@/lib/planning/plan-sheets';
import { anyTouched, whyItFollows } from '@/lib/planning/what-follows';
import type { ComponentConditions } from '@/lib/schemas/component-conditions';
import { newestDefinitions } from './data/newest-definitions';
import { workedMachine } from './data/worked-machine';

const plan = planSheets(workedMachine, newestDefinitions);
const sheet = (key: string) => plan.find((one) => one.key === key)!;
const said = (entries: Record<string, ComponentConditions[string]['condition']>): ComponentConditions =>
  Object.fromEntries(Object.entries(entries).map(([id, condition]) => [id, { condition, text: null }]));
const why = (key: string, conditions: ComponentConditions) =>
  whyItFollows(sheet(key).dependsOn, workedMachine, conditions);

describe('what follows from what was opened', () => {
  it('is whatever rests on the component itself', () => {
    expect(why('SP-1a:S1', said({ S1: 'replaced' }))).toEqual(['main spindle S1 was replaced']);
    expect(why('AX-5:Z1:ZX', said({ Z1: 'repaired' }))).toEqual(['axis Z1 was repaired']);
  });

  it('is whatever rests on an axis that carries it', () => {
    expect(why('AX-2:X2:S1', said({ T2: 'refitted' }))).toEqual([
      'X2 carries turret T2, which was removed and refitted',
    ]);
    expect(why('AX-1a:Z1:S1', said({ bed: 'repaired' }))).toEqual(['Z1 moves on the bed, which was repaired']);
  });

  it('gives every reason, in the order of the make-up', () => {
    expect(why('TU-3:T2:S2', said({ T2: 'repaired', S2: 'replaced' }))).toEqual([
      'sub-spindle S2 was replaced',
      'turret T2 was repaired',
    ]);
  });

  it('is nothing that rests on other parts, on untouched ones or on parts that the machine does not have', () => {
    expect(why('SP-1a:S1', said({ T2: 'repaired', S1: 'untouched', TS1: 'replaced' }))).toBeNull();
    expect(why('AX-1a:Z1:S1', said({ T2: 'repaired' }))).toBeNull();
    expect(
      whyItFollows({ components: [], moved: [], positioned: [] }, workedMachine, said({ T2: 'repaired' })),
    ).toEqual([]);
    expect([anyTouched({}), anyTouched(said({ S1: 'untouched' })), anyTouched(said({ S1: 'refitted' }))]).toEqual([
      false,
      false,
      true,
    ]);
  });

  it('names every part of a machine once', () => {
    const ids = machineParts(workedMachine).map(({ id }) => id);
    expect(ids).toEqual(['S1', 'S2', 'T1', 'T2', 'X1', 'Y1', 'Z1', 'X2', 'Z2', 'Z3', 'bed']);
  });
});

describe('time', () => {
  const nose = { definition: { id: 'SP-1a', code: 'ISO 13041-1', edition: '2020', version: 1 }, minutes: 20 };

  it('comes from the own past only where it is long enough', () => {
    const past = (passes: number) => pastDurations([{ code: 'ISO 13041-1', id: 'SP-1a', minutes: 11.2, passes }]);
    expect(estimateOf(nose, past(3))).toEqual({ minutes: 12, fromPasses: 3 });
    expect(estimateOf(nose, past(2))).toEqual({ minutes: 20, fromPasses: null });
    expect(estimateOf(nose, new Map())).toEqual({ minutes: 20, fromPasses: null });
  });

  it.each([
    [0, '0 min'],
    [59, '59 min'],
    [60, '1 h'],
    [62, '1 h'],
    [63, '1 h 5 min'],
    [118, '2 h'],
    [1130, '18 h 50 min'],
  ])('%i is %s', (minutes, words) => {
    expect(minutesWords(minutes)).toBe(words);
  });
});

describe('what is set up together', () => {
  it('moves up to the first of its step, and no further', () => {
    const entries = ['1a', '1-', '1b', '1a', '2a', '1-', '2b', '2a'];
    const words = (entry: string) => (entry[1] === '-' ? null : entry[1]!);
    expect(keepTogether(entries, (entry) => Number(entry[0]), words)).toEqual([
      ...['1a', '1a', '1-', '1b', '2a', '2a', '1-', '2b'],
    ]);
  });

  it('stands under its words', () => {
    const sheets = ['a', 'a', null, null, 'b', 'a'].map((setUpTogether) => ({ setUpTogether }));
    expect(setUpRuns(sheets).map(({ words, sheets: { length } }) => [words, length])).toEqual([
      ['a', 2],
      [null, 2],
      ['b', 1],
      ['a', 1],
    ]);
  });
});

describe('another way to measure', () => {
  it('is found only for the same component, and only for tests that say so', () => {
    for (const one of plan) {
      const other = standsInFor(one, plan);
      if (!other) continue;
      expect(other.definition.code).toBe(one.definition.code);
      expect(other.component.axis).toBe(one.component.axis);
      expect(other.key).not.toBe(one.key);
      expect(standsInFor(other, plan)).toBeNull();
    }
    expect(standsInFor(sheet('SP-1a:S1'), plan)).toBeNull();
  });
});

describe('choices of a made plan', () => {
  it('are a form again, what was left out later among the reasons', () => {
    const contract = { baseUm: '4.5', foundBy: 'contract', provenance: { kind: 'contract' as const, text: 'order 7' } };
    const choices = choicesOfPlan({
      sheets: [
        { key: 'A', tolerance: contract, leftOutReason: null, leftOutText: null },
        { key: 'B', tolerance: contract, leftOutReason: 'not-possible', leftOutText: 'no room' },
        { key: 'C', tolerance: null, leftOutReason: null, leftOutText: null },
      ],
      exclusions: [{ key: 'D', reason: 'not-agreed', text: null }],
    });
    expect(choices).toEqual({
      include: ['A', 'C'],
      exclusions: [
        { key: 'D', reason: 'not-agreed', text: null },
        { key: 'B', reason: 'not-possible', text: 'no room' },
      ],
      contractTolerances: [{ key: 'A', toleranceUm: '4.5', source: 'order 7' }],
    });
  });
});
