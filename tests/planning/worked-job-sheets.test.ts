import { describe, expect, it } from 'vitest';
import { withContractTolerance } from '@/lib/planning/contract-tolerance';
import { planSheets } from '@/lib/planning/plan-sheets';
import { figures } from '@/lib/sheet/figures';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import type { Cells, SheetRules } from '@/lib/sheet/types';
import { findDefinition } from '@/standards/registry';
import { newestDefinitions } from './data/newest-definitions';
import { type FurtherSheet, furtherSheets, workedSheets } from './data/worked-job';
import { workedMachine } from './data/worked-machine';

const plan = planSheets(workedMachine, newestDefinitions);

/** The set-up of a pass, taken from its request: everything but the method, the readings and what the definition lays down. */
function setUpOf(request: Record<string, unknown>): Cells {
  const cells: Cells = {};
  const walk = (value: unknown, pointer: string) => {
    if (typeof value === 'string') cells[pointer] = { text: value, unit: null };
    else if (typeof value === 'object' && value !== null)
      for (const [key, part] of Object.entries(value)) walk(part, `${pointer}/${key}`);
  };
  walk(request, '');
  if ('toolHeight' in request) cells['/form'] = { text: 'heights', unit: null };
  return cells;
}

function cellsOf(pass: FurtherSheet['passes'][number]): Cells {
  const readings = pass.readings.map(({ at, text, unit }) => [at, { text, unit }]);
  return { ...setUpOf(pass.request), ...Object.fromEntries(readings) };
}

function rulesOf(sheet: FurtherSheet): {
  rules: SheetRules;
  definition: NonNullable<ReturnType<typeof findDefinition>>;
} {
  const proposed = plan.find(({ key }) => key === sheet.key)!;
  const planned =
    sheet.tolerance?.kind === 'contract'
      ? withContractTolerance(proposed, { baseUm: sheet.tolerance.base, text: sheet.tolerance.text })
      : proposed;
  const { id, code, edition, version } = planned.definition;
  const definition = findDefinition(id, code, edition, version)!;
  return {
    definition,
    rules: {
      definition: planned.definition,
      tolerance: planned.tolerance,
      direction: planned.direction,
      decisionRule: 'simple',
    },
  };
}

/** Finite decimals are exact, others agree to 20 digits. */
function sameFigure(actual: string | null | undefined, wanted: string | null | undefined) {
  expect((actual ?? 'nothing').slice(0, 24)).toBe((wanted ?? 'nothing').slice(0, 24));
}

const sheets: FurtherSheet[] = [...workedSheets, ...furtherSheets];
const passes = sheets.flatMap((sheet) =>
  sheet.passes.map((pass) => ({ sheet, pass, name: `${sheet.key} ${pass.kind}` })),
);

describe('sheets of the worked job, from the readings as typed', () => {
  it.each(passes)('$name', ({ sheet, pass }) => {
    const { rules, definition } = rulesOf(sheet);
    const outcome = judgeSheet(rules, definition, cellsOf(pass));
    if (outcome.state !== 'complete') throw new Error(`${outcome.state}: ${JSON.stringify(outcome)}`);
    expect(outcome.filled).toBe(pass.readings.length);
    sameFigure(outcome.result.deviation, pass.expected.deviation);
    expect(outcome.judgement.verdict).toBe(pass.verdict);
    sameFigure(outcome.judgement.toleranceUm, sheet.tolerance?.value);
    sameFigure(outcome.judgement.limitUm, pass.conformity?.limit);
    sameFigure(outcome.judgement.marginUm, pass.conformity?.margin);
    expect(outcome.judgement.toleranceArithmetic).toBe(sheet.tolerance?.arithmetic ?? null);
    expect(outcome.displayed.textUm).toBe(pass.display.value);
    expect(outcome.displayed.extraDigits).toBe(pass.display.extraDigits);
    const local = outcome.judgement.local;
    expect(local && { deviation: local.deviationUm, tolerance: local.toleranceUm, verdict: local.verdict }).toEqual(
      pass.local,
    );
    expect(outcome.problems.filter(({ severity }) => severity === 'cannot-read')).toEqual([]);
  });

  it.each(passes)('$name: input as the contract asks for, plot and figures', ({ sheet, pass }) => {
    const { rules, definition } = rulesOf(sheet);
    const outcome = judgeSheet(rules, definition, cellsOf(pass));
    if (outcome.state !== 'complete') throw new Error(outcome.state);
    const plain = (value: unknown) => JSON.parse(JSON.stringify(value).replace(/"(-?\d+)\.0+"/g, '"$1"'));
    // A is the figure that the method judges unasked; the definition says it.
    const usual = pass.request.method === 'positioning' ? { judge: 'A' } : {};
    expect(plain({ measuringLength: pass.request.measuringLength, ...outcome.input })).toEqual(
      plain({ ...usual, ...pass.request }),
    );
    const nothingToDraw = 'toolHeight' in pass.request || 'found' in pass.request;
    expect(outcome.plot === null).toBe(nothingToDraw);
    expect(figures(outcome).length).toBeGreaterThan(0);
    for (const { label, value } of figures(outcome)) expect(`${label} ${value}`).not.toMatch(/undefined|NaN|\d\.\d{4}/);
  });

  it.each(furtherSheets)('$key: component and what it rests on', (sheet) => {
    const { component, dependsOn } = plan.find(({ key }) => key === sheet.key)!;
    expect({ component, dependsOn }).toEqual({ component: sheet.component, dependsOn: sheet.dependsOn });
  });

  it('judges the other limits of positioning from the same runs', () => {
    const sheet = furtherSheets.find(({ key }) => key === 'PO-A:Z1')!;
    const { rules, definition } = rulesOf(sheet);
    const outcome = judgeSheet(rules, definition, cellsOf(sheet.passes[0]!));
    if (outcome.state !== 'complete') throw new Error(outcome.state);
    const expected = sheet.passes[0]!.expected as unknown as Record<string, string>;
    const also = outcome.judgement.also!;
    expect(also.map(({ figure }) => figure).sort()).toEqual(rules.tolerance!.also!.map(({ figure }) => figure).sort());
    for (const { figure, deviationUm } of also) sameFigure(deviationUm, expected[figure]!.replace('-', ''));
  });

  it('says in words what the sign means', () => {
    const words = (key: string, pass = 0) => {
      const sheet = workedSheets.find((one) => one.key === key)!;
      const { rules, definition } = rulesOf(sheet);
      const outcome = judgeSheet(rules, definition, cellsOf(sheet.passes[pass]!));
      return outcome.state === 'complete' ? [outcome.displayed.textMm, outcome.directionWords] : null;
    };
    expect(words('AX-1a:Z1:S1')).toEqual(['0.0060', 'free end leans toward the tool']);
    expect(words('AX-2:X1:S1')).toEqual(['0.0035', 'concave']);
    expect(words('AX-4:Y1:X1', 1)).toEqual(['0.00504', 'angle between the + directions more than 90°']);
    expect(words('TU-3:T2:S1')).toEqual(['-0.0520', 'tool hole below the spindle axis']);
    expect(words('TU-3:T1:S1')).toEqual(['0.000', null]);
    expect(words('SP-1a:S1')).toEqual(['0.0030', null]);
  });
});
