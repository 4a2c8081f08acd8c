import { describe, expect, it } from 'vitest';
import { planSheets } from '@/lib/planning/plan-sheets';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { figures } from '@/lib/sheet/figures';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import { allFields, sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells, Field } from '@/lib/sheet/types';
import { codes, currentDefinitions, findDefinition } from '@/standards/registry';
import type { PlannedSheet, TestDefinition } from '@/standards/types';

/** Every sheet that any of the make-ups asks for, edition by edition, with the definition it is made from. */
const planned = startingMakeUps.flatMap(({ title, makeUp }) =>
  codes().flatMap(({ code, edition }) => {
    const tests = currentDefinitions().filter((one) => one.code === code && one.edition === edition);
    return planSheets(makeUp, tests).map((sheet) => ({
      name: `${sheet.key} of ${code} ${edition}, ${title}`,
      sheet,
      definition: definitionOf(sheet),
    }));
  }),
);

function definitionOf({ definition: { id, code, edition, version } }: PlannedSheet): TestDefinition {
  const found = findDefinition(id, code, edition, version);
  if (!found) throw new Error(`no definition ${id}`);
  return found;
}

/** One sheet of each definition is evaluated; the others differ in their component only. */
const oneOfEach = planned.filter(
  ({ definition }, k) => planned.findIndex((other) => other.definition === definition) === k,
);

/** Something that can stand in the field: readings that differ, a first choice, an answer. */
function typed(field: Field, k: number): string {
  if (field.options) return field.options[0]!.value;
  if (field.pointer.startsWith('/D') || field.pointer.endsWith('/diameter')) return `30.00${k % 9}`;
  return String((k * 7) % 3);
}

it('every test of the catalogue is asked for by at least one of the make-ups', () => {
  const asked = new Set(planned.map(({ definition }) => definition));
  const missing = currentDefinitions().filter((one) => !asked.has(one));
  expect(missing.map(({ id, code, edition }) => `${id} ${code} ${edition}`)).toEqual([]);
});

it('no sheet of a code stands twice in a plan', () => {
  const names = planned.map(({ name }) => name);
  expect(new Set(names).size).toBe(names.length);
});

it('sheets of one plan that have the same title are of different definitions', () => {
  const titles = planned.map(
    ({ name, sheet }) => `${name.slice(0, name.lastIndexOf(' '))} ${sheet.definition.id} ${sheet.title}`,
  );
  expect(titles.filter((title, k) => titles.indexOf(title) !== k)).toEqual([]);
});

describe.each(oneOfEach)('$name', ({ sheet, definition }) => {
  const rules = {
    definition: sheet.definition,
    tolerance: sheet.tolerance,
    direction: sheet.direction,
    decisionRule: 'simple' as const,
  };

  it('has fields with distinct pointers and labels, and every reading once in the order', () => {
    const fields = sheetFields(definition, sheet.setUp);
    const all = allFields(fields);
    expect(new Set(all.map(({ pointer }) => pointer)).size).toBe(all.length);
    expect(new Set(all.map(({ label }) => label)).size).toBe(all.length);
    expect(new Set(fields.order).size).toBe(fields.order.length);
    for (const pointer of fields.order) expect(all.find((field) => field.pointer === pointer)).toBeDefined();
    for (const pointer of Object.keys(sheet.setUp)) expect(all.map((field) => field.pointer)).toContain(pointer);
    for (const table of fields.tables)
      for (const row of table.rows) expect(row.cells.length).toBe(table.columns.length);
  });

  it('gives a result once every reading in the order is there', () => {
    const fields = sheetFields(definition, sheet.setUp);
    const all = allFields(fields);
    const readings = fields.order.map((pointer, k) => {
      const field = all.find((one) => one.pointer === pointer)!;
      return [pointer, { text: typed(field, k), unit: null }];
    });
    const cells: Cells = { ...sheet.setUp, ...Object.fromEntries(readings) };
    const outcome = judgeSheet(rules, definition, cells);
    if (outcome.state !== 'complete') throw new Error(JSON.stringify(outcome));
    expect(outcome.filled).toBe(outcome.total);
    expect(figures(outcome).length).toBeGreaterThan(0);
    if (definition.layout.kind === 'check-list') return;
    expect(outcome.result.method).toBe(definition.method);
    expect(outcome.judgement.verdict === 'for-information').toBe(sheet.tolerance === null);
    expect(outcome.judgement.toleranceArithmetic === null).toBe(sheet.tolerance?.perLength === undefined);
    expect(outcome.judgement.local !== null).toBe(sheet.tolerance?.local !== undefined);
    if (outcome.result.signed) expect(definition.positiveMeans && definition.negativeMeans).toBeTruthy();
    if (definition.direction !== 'either') expect(outcome.result.signed).toBe(true);
  });

  it('is empty before the first reading, and not yet judged with one', () => {
    expect(judgeSheet(rules, definition, sheet.setUp).state).toBe('empty');
    const fields = sheetFields(definition, sheet.setUp);
    const [first] = fields.order;
    const field = allFields(fields).find(({ pointer }) => pointer === first)!;
    const outcome = judgeSheet(rules, definition, { ...sheet.setUp, [first!]: { text: typed(field, 1), unit: null } });
    if (definition.layout.kind === 'check-list') return;
    if (outcome.state !== 'not-yet') throw new Error(outcome.state);
    expect(outcome.reason).toMatch(/^[A-Z].*\.$/);
  });
});
