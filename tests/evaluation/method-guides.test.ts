import { describe, expect, it } from 'vitest';
import { evaluateUnknown, evaluationInput } from '@/lib/evaluation';
import { explain } from '@/lib/explaining/explain';
import { allGuides, findGuide } from '@/lib/explaining/methods/all-guides';
import { evaluateList, listFields } from '@/lib/explaining/methods/evaluate-list';
import { exampleCells, startingCells, textsByPointer } from '@/lib/explaining/methods/example-cells';
import { fieldLists } from '@/lib/explaining/methods/field-lists';
import { layoutOfMethod, methodDefinition } from '@/lib/explaining/methods/method-definition';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import { allFields } from '@/lib/sheet/sheet-fields';

interface ObjectSchema {
  shape: Record<string, { safeParse(value: unknown): { success: boolean }; value?: unknown }>;
}

/** Schema of the kind of input that an example is. */
function schemaOf(input: { method: string; kind?: string }): ObjectSchema {
  const schemas = (evaluationInput.options as readonly unknown[]).flatMap((option) =>
    'options' in (option as object) ? (option as { options: ObjectSchema[] }).options : [option as ObjectSchema],
  );
  const takes = (schema: ObjectSchema, field: string, value: unknown) =>
    schema.shape[field]?.safeParse(value).success === true;
  return schemas.find(
    (schema) =>
      takes(schema, 'method', input.method) && (input.method !== 'correction' || takes(schema, 'kind', input.kind)),
  )!;
}

const judged = ['method', 'deviation', 'judgedBy', 'signed'];
const name = (field: { name: string }) => field.name;

describe('guides of the methods', () => {
  it('there is one for every method and every correction', () => {
    const methods = evaluationInput.options.flatMap((option) =>
      'options' in option
        ? option.options.map((one) => `correction ${one.shape.kind.value}`)
        : [option.shape.method.value],
    );
    const described = allGuides.map(({ method, example }) =>
      method === 'correction' && example.input.method === 'correction' ? `correction ${example.input.kind}` : method,
    );
    expect([...described].sort()).toEqual([...methods].sort());
    expect(new Set(allGuides.map(({ slug }) => slug)).size).toBe(allGuides.length);
    expect(allGuides.filter(({ group }) => !['helpers', 'corrections'].includes(group))).toHaveLength(22);
  });

  it.each(allGuides.map((guide) => [guide.slug, guide] as const))('%s lists the fields of its input', (_, guide) => {
    const { shape } = schemaOf(guide.example.input);
    const told = guide.method === 'correction' ? ['method', 'kind'] : ['method'];
    expect(guide.inputs.map(name).sort()).toEqual(
      Object.keys(shape)
        .filter((field) => !told.includes(field))
        .sort(),
    );
    for (const { name: field, optional = false } of guide.inputs) {
      expect(shape[field]!.safeParse(undefined).success, `${guide.slug} ${field} may be left out`).toBe(optional);
    }
  });

  it.each(allGuides.map((guide) => [guide.slug, guide] as const))(
    '%s: its example is evaluated, explained, and gives the fields that are listed',
    (_, guide) => {
      const result = evaluateUnknown(guide.example.input);
      const own = Object.keys(result).filter(
        (field) => ![...judged, 'kind'].includes(field) && result[field as never] !== undefined,
      );
      expect(own.filter((field) => !guide.outputs.some((output) => output.name === field))).toEqual([]);
      expect(guide.outputs.filter(({ optional }) => !optional).map(name)).toEqual(
        guide.outputs.filter((output) => !output.optional && own.includes(output.name)).map(name),
      );
      const { steps } = explain(guide.example.input, result);
      expect(steps.length).toBeGreaterThan(0);
      expect(guide.title.length).toBeGreaterThan(5);
      expect(guide.sentence).toMatch(/\.$/);
      expect(guide.source.text.length).toBeGreaterThan(10);
    },
  );
});

describe('the calculator’s fields', () => {
  const measured = allGuides.flatMap((guide) => {
    const own = layoutOfMethod(guide);
    return own ? [[guide.slug, guide, own] as const] : [];
  });

  it('every measuring method has a layout', () => expect(measured).toHaveLength(22));

  it.each(measured)('%s: its example, typed into its fields, comes to the same result', (_, guide, own) => {
    const definition = methodDefinition(guide, own, own.layout, own.judges?.[0]?.value);
    const rules = {
      definition: { id: guide.slug, code: 'calculator', edition: '', version: 1 },
      tolerance: null,
      direction: 'either' as const,
      decisionRule: 'simple' as const,
    };
    const start = startingCells(guide, definition, own);
    expect(judgeSheet(rules, definition, start).state).not.toBe('complete');
    const outcome = judgeSheet(rules, definition, exampleCells(guide, definition, own));
    expect(outcome.problems.filter(({ severity }) => severity === 'cannot-read')).toEqual([]);
    expect(outcome.state, 'reason' in outcome ? outcome.reason : '').toBe('complete');
    expect('result' in outcome && outcome.result).toEqual(evaluateUnknown(guide.example.input));
    expect('directionWords' in outcome && outcome.directionWords === null).toBe(
      'judgement' in outcome && !outcome.judgement.signed,
    );
  });
});

describe('the calculator’s fields of helpers and corrections', () => {
  const others = allGuides.filter((guide) => layoutOfMethod(guide) === null);
  const cellsOf = (input: unknown) =>
    Object.fromEntries(Object.entries(textsByPointer(input)).map(([at, text]) => [at, { text, unit: null }]));

  it.each(others.map((guide) => [guide.slug, guide] as const))(
    '%s: its example, typed into its fields, comes to the same result',
    (_, guide) => {
      const list = fieldLists[guide.slug]!;
      const empty = evaluateList(guide, list, {});
      expect(empty.state).toBe('not-yet');
      const cells = cellsOf(guide.example.input);
      const pointers = allFields(listFields(list, cells)).map(({ pointer }) => pointer);
      expect(new Set(pointers).size).toBe(pointers.length);
      const outcome = evaluateList(guide, list, cells);
      expect(outcome.state === 'complete' ? outcome.result : outcome).toEqual(evaluateUnknown(guide.example.input));
    },
  );

  it('read commas and units, say at the field what cannot be read, and close up rows that are empty', () => {
    const tolerance = findGuide('tolerance')!;
    const typed = (texts: Record<string, string>) =>
      Object.fromEntries(Object.entries(texts).map(([at, text]) => [at, { text, unit: null }]));
    const texts = { '/base': '0,015 mm', '/baseLength': '300', '/length': '240', '/minimum': '5' };
    const outcome = evaluateList(tolerance, fieldLists.tolerance!, typed(texts));
    expect(outcome).toMatchObject({ state: 'complete', input: { base: '15' }, result: { tolerance: '12' } });
    const slip = evaluateList(tolerance, fieldLists.tolerance!, typed({ ...texts, '/length': '24o' }));
    expect(slip.problems).toMatchObject([{ pointer: '/length', severity: 'cannot-read' }]);
    const zero = evaluateList(tolerance, fieldLists.tolerance!, typed({ ...texts, '/length': '0' }));
    expect(zero.problems).toMatchObject([{ pointer: '/length' }]);
    const rounding = evaluateList(findGuide('rounding')!, fieldLists.rounding!, typed({ '/value': '1,25 mm' }));
    expect(rounding.problems).toMatchObject([{ pointer: '/value' }]);

    const uncertainty = findGuide('uncertainty')!;
    const rows = evaluateList(
      uncertainty,
      fieldLists.uncertainty!,
      typed({ '/components/1/name': 'level', '/components/1/value': '2,5', '/components/3/name': 'foot' }),
    );
    expect(rows).toMatchObject({ state: 'not-yet', reason: expect.stringContaining('row 4') });
    const whole = evaluateList(
      uncertainty,
      fieldLists.uncertainty!,
      typed({ '/components/1/name': 'level', '/components/1/value': '2,5' }),
    );
    expect(whole).toMatchObject({
      state: 'complete',
      input: { coverage: '0.95', components: [{ name: 'level', value: '2.5', distribution: 'normal' }] },
      result: { standard: '2.5' },
    });
  });
});
