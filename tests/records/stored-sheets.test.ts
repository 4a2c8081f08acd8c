import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { definitionOf } from '@/lib/planning/definition-of';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import type { StoredDefinition } from './take-records';

const here = import.meta.dirname;
const versions = readdirSync(here, { withFileTypes: true }).flatMap((entry) =>
  entry.isDirectory() ? [entry.name] : [],
);

const stored = versions.flatMap((version) =>
  ['sheets', 'varied'].flatMap((sub) =>
    readdirSync(path.join(here, version, sub)).map((file) => {
      const content = JSON.parse(readFileSync(path.join(here, version, sub, file), 'utf8')) as StoredDefinition;
      return { name: `${version}/${sub}/${file}`, version, ...content };
    }),
  ),
);

/** Where what is said now differs from what was said then; what was not said then may be said now. */
function differences(now: unknown, then: unknown, at = ''): string[] {
  if (typeof then !== 'object' || then === null) {
    return Object.is(now, then) ? [] : [`${at}: was ${JSON.stringify(then)}, is ${JSON.stringify(now)}`];
  }
  if (typeof now !== 'object' || now === null) return [`${at}: was there, is ${JSON.stringify(now)}`];
  if (Array.isArray(then) && (now as unknown[]).length !== then.length) {
    return [`${at}: had ${then.length} entries, has ${(now as unknown[]).length}`];
  }
  return Object.entries(then).flatMap(([key, value]) =>
    differences((now as Record<string, unknown>)[key], value, `${at}/${key}`),
  );
}

it('the records of the first rule set hold every definition that it had, in every state and verdict', () => {
  const first = stored.filter(({ version }) => version === 'witnessmark-1');
  const definitions = new Set(first.map(({ definition }) => definition.id));
  expect([...definitions].sort()).toEqual(
    ['AX-1a', 'AX-1b', 'AX-2', 'AX-4', 'AX-5', 'PO-B', 'SP-1a', 'SP-2a', 'SP-2b', 'SS-1'].concat([
      'SS-3a',
      'SS-3b',
      'SS-3c',
      'TU-3',
      'WP-1',
    ]),
  );
  const passes = first.flatMap((one) => one.passes);
  expect(passes.length).toBeGreaterThan(200);
  expect(new Set(passes.map(({ outcome }) => outcome.state))).toEqual(
    new Set(['empty', 'not-yet', 'partial', 'complete']),
  );
  const verdicts = passes.flatMap(({ outcome }) => ('judgement' in outcome ? [outcome.judgement.verdict] : []));
  expect(new Set(verdicts)).toEqual(new Set(['within-tolerance', 'out-of-tolerance', 'undecided', 'for-information']));
});

it('a difference is seen, an addition is none', () => {
  expect(differences({ a: '1.50', b: ['x'] }, { a: '1.5', b: ['x', 'y'] })).toHaveLength(2);
  expect(differences({ a: '1.5', b: null, more: 1 }, { a: '1.5', b: null })).toEqual([]);
  expect(differences({}, { a: '1.5' })).toHaveLength(1);
});

describe.each(stored)('$name', ({ passes }) => {
  it.each(passes.map((pass, index) => [`${index + 1} ${pass.sheet} ${pass.kind}`, pass] as const))(
    '%s',
    (_, { rules, cells, outcome }) => {
      const now = judgeSheet(rules, definitionOf(rules.definition), cells);
      expect(differences(now, outcome)).toEqual([]);
    },
  );
});
