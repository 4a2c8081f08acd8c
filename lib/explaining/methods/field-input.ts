import { EvaluationError, type EvaluationInput, type EvaluationResult, evaluateUnknown } from '@/lib/evaluation';
import { read } from '@/lib/sheet/read-cell';
import { allFields } from '@/lib/sheet/sheet-fields';
import type { Field } from '@/lib/sheet/types';
import { parseNumber } from '@/lib/units/parse-number';
import { type FieldForm, formFields } from './field-forms';

export interface FieldOutcome {
  /** null while a field cannot be read. */
  input: Record<string, unknown> | null;
  result: EvaluationResult | null;
  /** What is wrong at a field. */
  problems: Record<string, string>;
  /** What is wrong with all of them together, or still missing; '' where there is a result. */
  reason: string;
}

type Texts = Record<string, string>;
type Base = { method: EvaluationInput['method']; kind?: string };

const isFilled = (texts: Texts) => (pointer: string) => (texts[pointer] ?? '').trim() !== '';
const truths: Record<string, boolean> = { true: true, false: false };

/** What stands in the fields of a form, read by the one number parser, put together and evaluated. */
export function evaluateFields(form: FieldForm, base: Base, texts: Texts): FieldOutcome {
  const fields = allFields(formFields(form, isFilled(texts)));
  const problems: Record<string, string> = {};
  const values: [string, string | boolean][] = [];
  for (const field of fields) {
    const text = (texts[field.pointer] ?? '').trim() || firstChoice(field, isFilled(texts), fields);
    if (text === '') continue;
    const figure = readField(field, text);
    if ('problem' in figure) problems[field.pointer] = figure.problem;
    else values.push([field.pointer, figure.value]);
  }
  const [unreadable] = Object.keys(problems);
  if (unreadable !== undefined) {
    const label = fields.find(({ pointer }) => pointer === unreadable)?.label ?? unreadable;
    return { input: null, result: null, problems, reason: `${label}: ${problems[unreadable]}` };
  }
  const missing = form.setUp.filter(({ optional, pointer }) => !optional && !isFilled(texts)(pointer));
  if (missing.length > 0) {
    return {
      input: null,
      result: null,
      problems,
      reason: `Still missing: ${missing.map(({ label }) => label).join(', ')}.`,
    };
  }
  const input = inputOf(base, values);
  try {
    return { input, result: evaluateUnknown(input), problems, reason: '' };
  } catch (error) {
    if (!(error instanceof EvaluationError)) throw error;
    const at = Object.fromEntries(error.issues.map(({ pointer, detail }) => [pointer, detail]));
    const known = Object.entries(at).filter(([pointer]) => fields.some((field) => field.pointer === pointer));
    const reason = error.issues.map(({ pointer, detail }) => `${nameOf(fields, pointer)}: ${detail}.`).join(' ');
    return { input, result: null, problems: Object.fromEntries(known), reason };
  }
}

/** A choice in a row that holds something: the one that it shows. Above the rows what is not said stays out. */
function firstChoice({ role, pointer, options }: Field, filled: (pointer: string) => boolean, fields: Field[]): string {
  const row = /^(\/[^/]+\/\d+\/)/.exec(pointer)?.[1];
  if (role !== 'choice' || row === undefined) return '';
  return fields.some((field) => field.pointer.startsWith(row) && filled(field.pointer))
    ? (options?.[0]?.value ?? '')
    : '';
}

const nameOf = (fields: Field[], pointer: string) =>
  fields.find((field) => field.pointer === pointer)?.label ?? (pointer.slice(1).replaceAll('/', ' ') || 'Input');

function readField(field: Field, text: string): { value: string | boolean } | { problem: string } {
  if (field.role === 'choice') return { value: truths[text] ?? text };
  if (field.role === 'set-up' && field.unit === null) return { value: text };
  if (field.unit !== null) {
    const outcome = read({ text, unit: null }, field.unit);
    return outcome.state === 'ok'
      ? { value: outcome.value }
      : { problem: outcome.state === 'bad' ? outcome.problem : '' };
  }
  const parsed = parseNumber(text);
  if (!parsed.ok) return { problem: parsed.problem };
  return parsed.unit === null ? { value: parsed.value } : { problem: 'Write the figure without a unit.' };
}

/** `/components/1/value` → input.components[1].value; rows that are empty close up. */
export function inputOf(base: Base, values: readonly [string, string | boolean][]): Record<string, unknown> {
  const input: Record<string, unknown> = { ...base };
  for (const [pointer, value] of values) {
    const path = pointer.slice(1).split('/');
    let place: Record<string, unknown> = input;
    path.slice(0, -1).forEach((name) => {
      place[name] ??= {};
      place = place[name] as Record<string, unknown>;
    });
    place[path.at(-1)!] = value;
  }
  return Object.fromEntries(Object.entries(input).map(([name, part]) => [name, closedUp(part)]));
}

function closedUp(part: unknown): unknown {
  if (typeof part !== 'object' || part === null) return part;
  const entries = Object.entries(part).map(([name, inner]) => [name, closedUp(inner)] as const);
  if (entries.every(([name]) => /^\d+$/.test(name)))
    return entries.sort(([a], [b]) => Number(a) - Number(b)).map(([, inner]) => inner);
  return Object.fromEntries(entries);
}
