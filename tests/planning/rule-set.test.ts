import { expect, it } from 'vitest';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import { findDefinition } from '@/standards/registry';

const definition = findDefinition('WP-1', 'ISO 13041-6', '2009', 1)!;
const rules = { definition, tolerance: null, direction: 'toward-tool' as const, decisionRule: 'simple' as const };
const cells = Object.fromEntries(
  Object.entries({ '/D1': '30.012', '/D2': '30.007', '/distance': '100' }).map(([at, text]) => [
    at,
    { text, unit: null },
  ]),
);

it('a sheet is judged by the rules with which it was begun, and by no others', () => {
  expect(judgeSheet({ ...rules, ruleSet: 'witnessmark-1' }, definition, cells)).toEqual(
    judgeSheet(rules, definition, cells),
  );
  expect(() => judgeSheet({ ...rules, ruleSet: 'witnessmark-99' }, definition, cells)).toThrow(/witnessmark-99/);
});
