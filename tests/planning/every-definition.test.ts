import { describe, expect, it } from 'vitest';
import { simulatedReadings } from '@/db/seeds/simulated-readings';
import { bind } from '@/lib/planning/bind';
import { findTolerance } from '@/lib/planning/find-tolerance';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { defaultSetUp } from '@/lib/sheet/default-set-up';
import { figures } from '@/lib/sheet/figures';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import { allFields, sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells, SheetRules } from '@/lib/sheet/types';
import { allDefinitions } from '@/standards/registry';
import type { TestDefinition } from '@/standards/types';

/** A place where the definition can be planned; a kind of machine that it is not meant for does not count. */
function placeOf(definition: TestDefinition) {
  for (const { makeUp } of startingMakeUps) {
    const [component] = bind(definition.appliesTo, makeUp);
    if (component) return { component, makeUp };
  }
  return null;
}

function measured(definition: TestDefinition, share: number) {
  const { component, makeUp } = placeOf(definition)!;
  const tolerance = findTolerance(definition, component, makeUp);
  const setUp: Cells = defaultSetUp(definition, component, makeUp);
  const stepUm = Number(definition.resolution.valueUm) <= 0.5 ? 0.2 : 1;
  const readings = simulatedReadings({ definition, setUp, tolerance, share, stepUm, seed: definition.id });
  const units = new Map(allFields(sheetFields(definition, setUp)).map(({ pointer, unit }) => [pointer, unit]));
  const typed = Object.entries(readings).map(([pointer, text]) => [
    pointer,
    { text, unit: units.get(pointer) ?? null },
  ]);
  const rules: SheetRules = { definition, tolerance, direction: definition.direction, decisionRule: 'simple' };
  return { rules, setUp, cells: { ...setUp, ...Object.fromEntries(typed) } as Cells };
}

describe.each(
  allDefinitions().map((definition) => ({
    name: `${definition.code} ${definition.edition} ${definition.id}`,
    definition,
  })),
)('$name', ({ definition }) => {
  it('can be planned on one of the machines to start from', () => {
    expect(placeOf(definition)).not.toBeNull();
  });

  it('is whole once every reading of the proposed set-up is there, and empty before', () => {
    const { rules, setUp, cells } = measured(definition, 0.4);
    expect(judgeSheet(rules, definition, setUp).state).toBe('empty');
    const outcome = judgeSheet(rules, definition, cells);
    if (outcome.state !== 'complete') throw new Error(JSON.stringify({ ...outcome, plot: null }));
    expect(outcome.problems.filter(({ severity }) => severity === 'cannot-read')).toEqual([]);
    expect(outcome.filled).toBe(outcome.total);
    expect(outcome.displayed.unit).toBe(definition.shownIn);
    for (const { label, value } of figures(outcome)) expect(`${label} ${value}`).not.toMatch(/undefined|NaN|null/);
    if (definition.method !== 'function-check') expect(outcome.result.method).toBe(definition.method);
  });

  it('comes out within and out of its tolerance where invented readings are meant to', () => {
    if (!measured(definition, 0.4).rules.tolerance && definition.method !== 'function-check') return;
    for (const [share, verdict] of [
      [0.4, 'within-tolerance'],
      [0.7, 'within-tolerance'],
      [1.6, 'out-of-tolerance'],
    ] as const) {
      const { rules, cells } = measured(definition, share);
      expect(judgeSheet(rules, definition, cells)).toMatchObject({ judgement: { verdict } });
    }
  });

  it('has fields with names of their own, and takes readings in an order that goes through all of them', () => {
    const { setUp } = measured(definition, 0.4);
    const fields = sheetFields(definition, setUp);
    const labels = allFields(fields).map(({ label }) => label);
    expect(labels.filter((label, index) => labels.indexOf(label) !== index)).toEqual([]);
    expect(new Set(fields.order).size).toBe(fields.order.length);
    const pointers = new Set(allFields(fields).map(({ pointer }) => pointer));
    expect(fields.order.filter((pointer) => !pointers.has(pointer))).toEqual([]);
  });

  it('says while it is taken what is still missing, and never evaluates what is not there', () => {
    const { rules, setUp, cells } = measured(definition, 0.4);
    const order = sheetFields(definition, setUp).order;
    const half = order.slice(0, Math.max(1, Math.floor(order.length / 2)));
    const some = { ...setUp, ...Object.fromEntries(half.map((pointer) => [pointer, cells[pointer]!])) };
    const outcome = judgeSheet(rules, definition, some);
    if (order.length === half.length) return;
    expect(['not-yet', 'partial']).toContain(outcome.state);
    if (outcome.state === 'not-yet') expect(outcome.reason).toMatch(/^[A-Z].*\.$/);
    if (outcome.state === 'partial') expect(outcome.basedOn).not.toBeNull();
  });
});
