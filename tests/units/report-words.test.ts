import { describe, expect, it } from 'vitest';
import { groupNotInPlan } from '@/lib/reporting/group-not-in-plan';
import { countToleranceSources, toleranceSource, toleranceSourceWords } from '@/lib/reporting/tolerance-source';
import type { Confirmation, PlannedTolerance } from '@/standards/types';

const memory = { kind: 'from-memory' as const, text: 'starter value', confidence: 'low' as const };
const confirmation: Confirmation = {
  state: 'confirmed',
  by: 'J. Penhale',
  on: '2026-11-03',
  edition: '2020',
  clause: '5.2',
  secondBy: null,
};
const tolerance = (more: Partial<PlannedTolerance> = {}): PlannedTolerance => ({
  baseUm: '15',
  foundBy: 'size class 2',
  provenance: memory,
  ...more,
});
const limit = (label: string, more: object = {}) => ({
  figure: label,
  label,
  toleranceUm: '6',
  foundBy: 'travel up to 500 mm',
  provenance: memory,
  ...more,
});

describe('where a tolerance comes from', () => {
  const code = 'ISO 13041-1';

  it('a memory says that it is one', () => {
    expect(toleranceSource(tolerance(), code)).toBe('from memory, to be confirmed: starter value (size class 2)');
    expect(toleranceSource(null, code)).toBe('');
  });

  it('who confirmed it, when, against which edition and clause; a second person too', () => {
    expect(toleranceSource(tolerance({ confirmation }), code)).toBe(
      'confirmed by J. Penhale on 2026-11-03 against ISO 13041-1:2020, clause 5.2 (size class 2)',
    );
    const two = { ...confirmation, secondBy: 'T. Orrell', edition: 'ISO 13041-1:2020 (E)', clause: 'Table 3' };
    expect(toleranceSource(tolerance({ confirmation: two, foundBy: '' }), code)).toBe(
      'confirmed by J. Penhale and T. Orrell on 2026-11-03 against ISO 13041-1:2020 (E), Table 3',
    );
    expect(
      toleranceSource(tolerance({ confirmation: { ...confirmation, state: 'replaced' }, foundBy: '' }), code),
    ).toBe('replaced by J. Penhale on 2026-11-03 with the figure of ISO 13041-1:2020, clause 5.2');
  });

  it('the contract, without naming itself twice', () => {
    const contract = tolerance({ foundBy: 'contract', provenance: { kind: 'contract', text: 'order 7714, item 4' } });
    expect(toleranceSource(contract, code)).toBe('by contract: order 7714, item 4');
  });

  it('names further limits only where they rest on something else', () => {
    expect(toleranceSource(tolerance({ also: [limit('R')] }), code)).not.toContain('R:');
    const source = toleranceSource(
      tolerance({ confirmation, foundBy: '', also: [limit('R'), limit('B', { confirmation })] }),
      code,
    );
    expect(source).toContain('clause 5.2; R: from memory, to be confirmed: starter value');
    expect(source).not.toContain('B:');
  });

  it('counts a test as confirmed only when all its limits are', () => {
    const contract = { kind: 'contract' as const, text: 'order' };
    const counts = countToleranceSources([
      null,
      tolerance(),
      tolerance({ confirmation }),
      tolerance({ confirmation, also: [limit('R')] }),
      tolerance({ confirmation: { ...confirmation, state: 'replaced' } }),
      tolerance({ provenance: contract }),
      tolerance({ provenance: contract }),
    ]);
    expect(counts).toEqual({ confirmed: 1, replaced: 1, contract: 2, unconfirmed: 2 });
    expect(toleranceSourceWords(counts)).toBe(
      'Tolerances: 1 confirmed against the organisation’s own copy, 1 replaced from its own copy, 2 by contract, 2 not confirmed.',
    );
    expect(toleranceSourceWords(undefined)).toBe('');
    expect(toleranceSourceWords(countToleranceSources([null]))).toBe('');
  });
});

it('gives every reason for not planning once, in the order in which it comes first', () => {
  expect(
    groupNotInPlan([
      { title: 'A', reason: 'not fitted' },
      { title: 'B', reason: 'not agreed' },
      { title: 'C', reason: 'not fitted' },
    ]),
  ).toEqual([
    { reason: 'not fitted', titles: ['A', 'C'] },
    { reason: 'not agreed', titles: ['B'] },
  ]);
});
