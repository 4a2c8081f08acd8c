import { describe, expect, it } from 'vitest';
import { evaluateUnknown, evaluationInput } from '@/lib/evaluation';
import { explain } from '@/lib/explaining/explain';
import { allGuides } from '@/lib/explaining/methods/all-guides';

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
