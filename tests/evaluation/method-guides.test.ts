import { describe, expect, it } from 'vitest';
import type { z } from 'zod';
import { evaluateUnknown, evaluationInput } from '@/lib/evaluation';
import { explain } from '@/lib/explaining/explain';
import { methodGuides } from '@/lib/explaining/methods/method-guides';
import { exampleInputs } from './example-inputs';

type Shape = Record<string, z.ZodType>;
type Schema = { shape: Shape } | { options: { shape: Shape }[] };

/** The fields of a method's schema, whether it stands alone or is one kind of several. */
function shapeOf(method: string, kind: string | undefined): Shape {
  const all = (evaluationInput.options as unknown as Schema[]).flatMap((one) =>
    'options' in one ? one.options : [one],
  );
  const is = (schema: z.ZodType | undefined, value: string) => schema?.safeParse(value).success === true;
  const found = all.find(({ shape }) => is(shape.method, method) && (kind === undefined || is(shape.kind, kind)));
  if (!found) throw new Error(`no schema of ${method} ${kind ?? ''}`);
  return found.shape;
}

const kindOf = (input: object) => ('kind' in input ? String(input.kind) : undefined);
const common = new Set(['method', 'deviation', 'judgedBy', 'signed']);

it('there is a guide for every method and every kind of correction, each at its own address', () => {
  const wanted = new Set(
    exampleInputs.map((input) => (input.method === 'correction' ? `correction-${input.kind}` : input.method)),
  );
  expect(methodGuides.map(({ slug }) => slug).sort()).toEqual([...wanted].sort());
  expect(wanted.size).toBe(35);
});

describe.each(methodGuides.map((guide) => ({ slug: guide.slug, guide })))('$slug', ({ guide }) => {
  const { method, example, inputs, outputs } = guide;
  const kind = method === 'correction' ? kindOf(example.input) : undefined;
  const result = evaluateUnknown(example.input) as Record<string, unknown>;

  it('names the fields of its input as the interface has them, and which may stay out', () => {
    const shape = Object.entries(shapeOf(method, kind)).filter(
      ([name]) => name !== 'method' && (name !== 'kind' || method !== 'correction'),
    );
    const listed = (fields: { name: string; optional: boolean }[]) =>
      fields.map(({ name, optional }) => `${name}${optional ? '?' : ''}`).sort();
    expect(listed(inputs.map(({ name, optional }) => ({ name, optional: optional === true })))).toEqual(
      listed(shape.map(([name, schema]) => ({ name, optional: schema.isOptional() }))),
    );
  });

  it('names every field of the result that inputs of this method give', () => {
    const own = exampleInputs.filter((input) => input.method === method && (!kind || kindOf(input) === kind));
    const results = [example.input, ...own].map((input) => evaluateUnknown(input));
    const seen = new Set(results.flatMap((one) => Object.keys(one)).filter((name) => !common.has(name)));
    if (method === 'correction') seen.delete('kind');
    const names = outputs.map(({ name }) => name);
    expect([...seen].filter((name) => !names.includes(name))).toEqual([]);
    const always = outputs.filter(({ optional }) => !optional).map(({ name }) => name);
    expect(always.filter((name) => results.some((one) => !(name in one)))).toEqual([]);
  });

  it('has an example that is evaluated and explained, and sentences that are whole', () => {
    expect(result.method).toBe(method);
    const text = JSON.stringify(explain(example.input, evaluateUnknown(example.input)));
    expect(text).not.toMatch(/undefined|NaN|null/);
    for (const sentence of [guide.sentence, guide.purpose, example.words, ...guide.sensitiveTo])
      expect(sentence).toMatch(/^\S.*[.]$/s);
    expect(guide.source.text.length).toBeGreaterThan(10);
  });
});
