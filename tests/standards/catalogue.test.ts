import { describe, expect, it } from 'vitest';
import { planSheets } from '@/lib/planning/plan-sheets';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { figures } from '@/lib/sheet/figures';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import { allFields, sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells } from '@/lib/sheet/types';
import { Fraction } from '@/lib/units/fraction';
import { cautions } from '@/standards/cautions';
import { allDefinitions, codes, codeTitle, currentDefinitions, findDefinition } from '@/standards/registry';
import type { Provenance, TestDefinition } from '@/standards/types';
import { workingSteps } from '@/standards/working-order';

const definitions = allDefinitions();
const named = definitions.map((definition) => ({ name: `${definition.id} v${definition.version}`, definition }));

function expectProvenance(provenance: Provenance) {
  expect(provenance.text.length).toBeGreaterThan(10);
  if (provenance.kind === 'from-memory') expect(provenance.confidence).toBeDefined();
}

/** Every sheet that any of the starting make-ups asks for, with the definition it is made from. */
const planned = startingMakeUps.flatMap(({ kind, makeUp }) =>
  planSheets(makeUp, definitions).map((sheet) => {
    const { id, code, edition, version } = sheet.definition;
    return {
      name: `${kind} ${sheet.key}`,
      sheet,
      definition: findDefinition(id, code, edition, version) as TestDefinition,
    };
  }),
);

describe('registry', () => {
  it('identifies a definition by id, code, edition and version', () => {
    const identities = definitions.map(({ id, code, edition, version }) => [id, code, edition, version].join('|'));
    expect(new Set(identities).size).toBe(identities.length);
    for (const { id, code, edition, version } of definitions)
      expect(findDefinition(id, code, edition, version)?.id).toBe(id);
    expect(findDefinition('SP-1a', 'ISO 13041-1', '2004', 1)).toBeNull();
    expect(findDefinition('SP-1a', 'ISO 13041-1', '2020', 99)).toBeNull();
    expect(currentDefinitions().length).toBe(
      new Set(definitions.map(({ id, code, edition }) => `${id}|${code}|${edition}`)).size,
    );
  });

  it('knows the code of every definition, and says where it is known from', () => {
    const known = codes();
    for (const { code, edition } of definitions)
      expect(known.some((one) => one.code === code && one.edition === edition)).toBe(true);
    for (const { source } of known) expectProvenance(source);
    expect(known.map(({ code, edition }) => codeTitle(code, edition))).toEqual([
      'ISO 13041-1:2020',
      'common practice',
      'ISO 13041-6:2009',
    ]);
  });

  it('holds the ten tests', () => {
    const ids = [
      'SP-1a',
      'SP-2a',
      'SP-2b',
      'AX-5',
      'AX-1a',
      'AX-1b',
      'AX-2',
      'AX-4',
      'TU-3',
      'SS-3a',
      'SS-3b',
      'SS-3c',
      'SS-1',
      'PO-B',
      'WP-1',
    ];
    for (const id of ids) expect(definitions.filter((one) => one.id === id)).not.toEqual([]);
  });
});

describe.each(named)('$name', ({ definition }) => {
  it('is complete', () => {
    const { title, boundTitle, procedure, judgedFigure, instruments, sketch, source } = definition;
    for (const text of [title, boundTitle, judgedFigure, ...procedure, ...instruments])
      expect(text.trim().length).toBeGreaterThan(5);
    expect(procedure.length).toBeGreaterThanOrEqual(4);
    expect(instruments.length).toBeGreaterThan(0);
    expect(sketch.scene).not.toBe('');
    expect(Object.values(workingSteps) as number[]).toContain(definition.workingStep);
    expectProvenance(source);
  });

  it('checks that the reading returns, and says how the sign counts', () => {
    const text = definition.procedure.join(' ');
    expect(text).toMatch(/back at|come back|once more|again at its end|back in minus/i);
    expect(text).toMatch(/positive|plus|larger/i);
  });

  it('has cautions: makers and local rules always, and none that gets round a guard', () => {
    expect(definition.cautions).toContain('maker-and-local-rules-first');
    expect(definition.cautions.length).toBeGreaterThanOrEqual(3);
    for (const id of definition.cautions) expect(cautions[id].length).toBeGreaterThan(20);
  });

  it('has a tolerance with its source, or none on purpose', () => {
    const rule = definition.tolerance;
    if (!rule) return expect(definition.id).toBe('PO-B');
    expectProvenance(rule.provenance);
    const figures = [
      rule.allUm,
      ...(rule.byClassUm ?? []),
      ...(rule.steps ?? []).map(({ toleranceUm }) => toleranceUm),
    ];
    expect(figures.some((figure) => figure !== undefined)).toBe(true);
    for (const figure of figures) if (figure !== undefined) expect(Fraction.from(figure).sign()).toBe(1);
    if (rule.local) expectProvenance(rule.local.provenance);
    // Run-out, coaxiality and heights at a fixed place are never worked out for another length.
    if (['run-out', 'coaxiality', 'centre-height'].includes(definition.method)) expect(rule.perLength).toBeUndefined();
  });

  it('has a table that rises, without gap or overlap', () => {
    const { byClassUm = [], steps = [] } = definition.tolerance ?? {};
    expectRising([...byClassUm]);
    expectRising(steps.map(({ toleranceUm }) => toleranceUm));
    steps.forEach((step, k) => {
      if (k > 0) expect(step.overMm).toBe(steps[k - 1]?.upToMm);
      if (step.upToMm !== null) expect(Fraction.from(step.upToMm).compare(Fraction.from(step.overMm))).toBe(1);
    });
  });

  it('is asked for by at least one of the make-ups to start from', () => {
    expect(planned.some(({ sheet }) => sheet.definition.id === definition.id)).toBe(true);
  });
});

function expectRising(figures: string[]) {
  figures.forEach((figure, k) => {
    if (k > 0) expect(Fraction.from(figure).compare(Fraction.from(figures[k - 1]!))).toBeGreaterThanOrEqual(0);
  });
}

describe.each(planned)('sheet $name', ({ sheet, definition }) => {
  const rules = {
    definition: sheet.definition,
    tolerance: sheet.tolerance,
    direction: sheet.direction,
    decisionRule: 'simple' as const,
  };

  it('has fields with distinct pointers, labels, and every reading once in the order', () => {
    const fields = sheetFields(definition, sheet.setUp);
    const all = allFields(fields);
    expect(new Set(all.map(({ pointer }) => pointer)).size).toBe(all.length);
    expect(new Set(all.map(({ label }) => label)).size).toBe(all.length);
    expect(new Set(fields.order).size).toBe(fields.order.length);
    for (const pointer of fields.order) expect(all.find((field) => field.pointer === pointer)?.role).toBe('reading');
    for (const pointer of Object.keys(sheet.setUp)) expect(all.map((field) => field.pointer)).toContain(pointer);
    for (const table of fields.tables)
      for (const row of table.rows) expect(row.cells.length).toBe(table.columns.length);
  });

  it('makes an input that evaluates once every reading in the order is there', () => {
    const fields = sheetFields(definition, sheet.setUp);
    const readings = fields.order.map((pointer, k) => {
      const text = pointer.startsWith('/D') ? `30.00${k}` : String((k * 7) % 3);
      return [pointer, { text, unit: null }];
    });
    const cells: Cells = { ...sheet.setUp, ...Object.fromEntries(readings) };
    const outcome = judgeSheet(rules, definition, cells);
    if (outcome.state !== 'complete') throw new Error(JSON.stringify(outcome));
    expect(outcome.filled).toBe(outcome.total);
    expect(outcome.result.method).toBe(definition.method);
    expect(outcome.judgement.verdict === 'for-information').toBe(sheet.tolerance === null);
    expect(outcome.judgement.toleranceArithmetic === null).toBe(sheet.tolerance?.perLength === undefined);
    expect(figures(outcome).length).toBeGreaterThan(0);
    if (outcome.result.signed) expect(definition.positiveMeans && definition.negativeMeans).toBeTruthy();
  });

  it('is empty before the first reading, and not yet judged with one', () => {
    expect(judgeSheet(rules, definition, sheet.setUp).state).toBe('empty');
    const [first] = sheetFields(definition, sheet.setUp).order;
    const outcome = judgeSheet(rules, definition, { ...sheet.setUp, [first!]: { text: '1', unit: null } });
    if (outcome.state !== 'not-yet') throw new Error(outcome.state);
    expect(outcome.reason).toMatch(/^[A-Z].*\.$/);
  });
});
