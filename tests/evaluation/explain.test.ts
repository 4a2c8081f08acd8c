import { describe, expect, it } from 'vitest';
import { simulatedReadings } from '@/db/seeds/simulated-readings';
import { type EvaluationInput, evaluateUnknown } from '@/lib/evaluation';
import { explain } from '@/lib/explaining/explain';
import { explainOutcome } from '@/lib/explaining/explain-outcome';
import { fig } from '@/lib/explaining/figures';
import { bind } from '@/lib/planning/bind';
import { findTolerance } from '@/lib/planning/find-tolerance';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { defaultSetUp } from '@/lib/sheet/default-set-up';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import { allFields, sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells } from '@/lib/sheet/types';
import { allDefinitions } from '@/standards/registry';
import { checkArithmetic } from './check-arithmetic';
import job from './data/worked-job.json';

describe('the worked job', () => {
  const passes = job.plan.flatMap((sheet) =>
    (sheet.passes ?? []).flatMap((pass) =>
      'request' in pass && pass.request ? [{ id: pass.id, request: pass.request }] : [],
    ),
  );

  it.each(passes)('$id ends at its deviation, and its arithmetic is right', ({ request }) => {
    const input = request as unknown as EvaluationInput;
    const result = evaluateUnknown(input) as { deviation: string };
    const { steps, source, ruleSet, title } = explain(input, result as never);
    expect(steps.length).toBeGreaterThan(0);
    expect(steps.at(-1)!.value).toContain(fig(result.deviation));
    expect(JSON.stringify(steps)).not.toMatch(/undefined|NaN|\[object|null/);
    checkArithmetic(steps);
    expect([source.text.length > 10, title.length > 5]).toEqual([true, true]);
    expect(ruleSet).toMatch(/^witnessmark-\d+$/);
  });
});

/** Share 0.7 gives signs, ties and further limits enough. */
const sheets = allDefinitions().flatMap((definition) => {
  for (const { makeUp } of startingMakeUps) {
    const [component] = bind(definition.appliesTo, makeUp);
    if (!component) continue;
    const tolerance = findTolerance(definition, component, makeUp);
    const setUp: Cells = defaultSetUp(definition, component, makeUp);
    const readings = simulatedReadings({ definition, setUp, tolerance, share: 0.7, stepUm: 0.2, seed: definition.id });
    const units = new Map(allFields(sheetFields(definition, setUp)).map(({ pointer, unit }) => [pointer, unit]));
    const typed = Object.entries(readings).map(([pointer, text]) => [
      pointer,
      { text, unit: units.get(pointer) ?? null },
    ]);
    const cells = { ...setUp, ...Object.fromEntries(typed) } as Cells;
    const rules = { definition, tolerance, direction: definition.direction, decisionRule: 'simple' as const };
    return [{ name: `${definition.id} of ${definition.code} ${definition.edition}`, definition, rules, cells }];
  }
  return [];
});

describe('every sheet of the catalogue', () => {
  it('covers every definition', () => expect(sheets).toHaveLength(allDefinitions().length));

  it.each(sheets)('$name says how its figure came about', ({ definition, rules, cells }) => {
    const outcome = judgeSheet(rules, definition, cells);
    if (outcome.state !== 'complete') throw new Error(outcome.state);
    const explanation = explainOutcome(outcome, rules, definition, cells);
    expect(JSON.stringify(explanation)).not.toMatch(/undefined|NaN|\[object/);
    expect(explanation.readings.length).toBeGreaterThanOrEqual(outcome.filled);
    expect(explanation.steps.some(({ value }) => value.includes(fig(outcome.result.deviation)))).toBe(true);
    checkArithmetic(explanation.steps);
  });
});

it('works out again a fair part of all steps', () => {
  const counts = sheets.map(({ definition, rules, cells }) => {
    const outcome = judgeSheet(rules, definition, cells);
    return outcome.state === 'complete' ? checkArithmetic(explainOutcome(outcome, rules, definition, cells).steps) : 0;
  });
  expect(counts.reduce((sum, count) => sum + count, 0)).toBeGreaterThan(3 * sheets.length);
});
