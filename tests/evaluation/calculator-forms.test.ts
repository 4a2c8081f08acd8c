import { describe, expect, it } from 'vitest';
import { evaluateUnknown } from '@/lib/evaluation';
import { explain } from '@/lib/explaining/explain';
import { allGuides } from '@/lib/explaining/methods/all-guides';
import { chosenOr } from '@/lib/explaining/methods/calculator-form';
import { fieldFormOf, formFields } from '@/lib/explaining/methods/field-forms';
import { evaluateFields } from '@/lib/explaining/methods/field-input';
import { cellsOfInput, chosenFor, formDefinition, leavesOf } from '@/lib/explaining/methods/form-definition';
import { sheetForms } from '@/lib/explaining/methods/sheet-forms';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import { allFields, sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells, SheetRules } from '@/lib/sheet/types';

const rules: SheetRules = {
  definition: { id: 'calculator', code: 'calculator', edition: '', version: 1 },
  tolerance: null,
  direction: 'either',
  decisionRule: 'simple',
};
const onSheets = allGuides.filter(({ method }) => sheetForms[method]);
const onFields = allGuides.filter(({ example }) => fieldFormOf(example.input));

it('every method has one form', () => {
  expect([...onSheets, ...onFields].map(({ slug }) => slug).sort()).toEqual(allGuides.map(({ slug }) => slug).sort());
  expect(onSheets).toHaveLength(22);
});

describe.each(onSheets.map((guide) => ({ slug: guide.slug, guide })))('form of $slug', ({ guide }) => {
  const form = sheetForms[guide.method]!;
  const { input } = guide.example;

  it('holds the worked example, which comes out as when it is evaluated by itself', () => {
    const definition = formDefinition(guide.method, guide.title, form, chosenFor(form, input));
    const cells = cellsOfInput((held) => sheetFields(definition, held), input);
    const outcome = judgeSheet(rules, definition, cells);
    if (outcome.state !== 'complete') throw new Error(JSON.stringify({ ...outcome, plot: null, cells }));
    expect(outcome.result.deviation).toBe((evaluateUnknown(input) as { deviation: string }).deviation);
    expect(outcome.judgement.verdict).toBe('for-information');
  });

  it('draws fields for every choice, each field named once', () => {
    for (const option of form.options) {
      const values = option.kind === 'choice' ? option.choices.map(({ value }) => value) : ['', '200'];
      for (const value of values) {
        const definition = formDefinition(guide.method, guide.title, form, { [option.name]: value });
        const begin: Cells = Object.fromEntries(
          Object.entries(form.setUp).map(([pointer, text]) => [pointer, { text, unit: null }]),
        );
        const labels = allFields(sheetFields(definition, begin)).map(({ label }) => label);
        expect(labels.length).toBeGreaterThan(0);
        expect(new Set(labels).size).toBe(labels.length);
      }
    }
  });

  it('takes only choices that it offers', () => {
    const chosen = chosenFor(form, input);
    expect(Object.keys(chosen).filter((name) => !form.options.some((option) => option.name === name))).toEqual([]);
    for (const [name, value] of Object.entries(chosen)) expect(chosenOr(form.options, chosen)[name]).toBe(value);
  });
});

describe.each(onFields.map((guide) => ({ slug: guide.slug, guide })))('form of $slug', ({ guide }) => {
  const form = fieldFormOf(guide.example.input)!;
  const { input } = guide.example;
  const base = { method: input.method, ...('kind' in input ? { kind: input.kind as string } : {}) };
  const texts = Object.fromEntries(leavesOf(input));

  it('holds the worked example, which comes out as when it is evaluated by itself', () => {
    const outcome = evaluateFields(form, base, texts);
    expect(outcome.reason).toBe('');
    expect(outcome.result).toEqual(evaluateUnknown(input));
    const explained = explain(input, outcome.result!);
    expect(explained.steps.length).toBeGreaterThan(0);
  });

  it('says what is missing, reads a decimal comma, and says at the field what it cannot read', () => {
    expect(evaluateFields(form, base, {})).toMatchObject({ result: null, reason: expect.stringMatching(/\S/) });
    const figure = allFields(formFields(form, () => true)).find(
      ({ role, pointer }) => role === 'reading' && texts[pointer]?.includes('.'),
    );
    if (figure) {
      const comma = { ...texts, [figure.pointer]: texts[figure.pointer]!.replace('.', ',') };
      expect(evaluateFields(form, base, comma).result).toEqual(evaluateUnknown(input));
    }
    const any = allFields(formFields(form, () => true)).find(({ role }) => role === 'reading')!;
    const bad = evaluateFields(form, base, { ...texts, [any.pointer]: '1.2.3' });
    expect(bad.result).toBeNull();
    expect(bad.problems[any.pointer]).toMatch(/decimal mark/);
  });
});

it('takes the shape that a row of an uncertainty budget shows while none was chosen', () => {
  const base = { method: 'uncertainty' as const };
  const texts = { '/coverage': '0.95', '/components/0/name': 'resolution', '/components/0/value': '2' };
  expect(evaluateFields(fieldFormOf(base)!, base, texts).input).toEqual({
    method: 'uncertainty',
    coverage: '0.95',
    components: [{ name: 'resolution', value: '2', distribution: 'normal' }],
  });
});

it('begins with the spindle turned by half a turn', () => {
  const { options } = sheetForms.parallelism!;
  expect(chosenOr(options, {})).toMatchObject({ angles: '0 180', judge: 'slope' });
});
