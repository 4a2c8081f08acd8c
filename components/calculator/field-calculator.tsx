'use client';

import { useEffect, useMemo, useState } from 'react';
import { ExplanationTable } from '@/components/explain/explanation';
import { FieldErrorLine } from '@/components/ui/field';
import type { EvaluationInput } from '@/lib/evaluation';
import { explain } from '@/lib/explaining/explain';
import { type FieldForm, formFields } from '@/lib/explaining/methods/field-forms';
import { evaluateFields } from '@/lib/explaining/methods/field-input';
import { leavesOf } from '@/lib/explaining/methods/form-definition';
import type { GuideField } from '@/lib/explaining/methods/method-guide';
import type { Cells } from '@/lib/sheet/types';
import { FormActions } from './form-actions';
import { noJudging } from './judging';
import { keep, readKept } from './kept-form';
import { PlainField } from './plain-field';
import { PlainTable } from './plain-table';
import { RequestPanel } from './request-panel';
import { ResultTable } from './result-table';

type Texts = Record<string, string>;

const asCells = (texts: Texts): Cells =>
  Object.fromEntries(Object.entries(texts).map(([pointer, text]) => [pointer, { text, unit: null }]));

/** A list of fields for helpers and corrections, evaluated at every keystroke. */
export function FieldCalculator(props: {
  slug: string;
  form: FieldForm;
  example: EvaluationInput;
  outputs: GuideField[];
}) {
  const { slug, form, example, outputs } = props;
  const [texts, setTexts] = useState<Texts>(form.begin);
  const [said, setSaid] = useState('');
  useEffect(() => {
    const kept = readKept(slug);
    if (kept) setTexts(Object.fromEntries(Object.entries(kept.cells).map(([pointer, { text }]) => [pointer, text])));
  }, [slug]);
  const change = (next: Texts) => {
    setTexts(next);
    keep(slug, { chosen: {}, judging: noJudging, cells: asCells(next) });
  };
  const fields = formFields(form, (pointer) => (texts[pointer] ?? '').trim() !== '');
  const base = useMemo(
    () => ({ method: example.method, ...('kind' in example ? { kind: String(example.kind) } : {}) }),
    [example],
  );
  const outcome = useMemo(() => evaluateFields(form, base, texts), [form, base, texts]);
  const type = (pointer: string, text: string) => change({ ...texts, [pointer]: text });
  return (
    <section aria-label="Form">
      <FormActions
        onExample={() => {
          change(Object.fromEntries(leavesOf(example)));
          setSaid('The example is filled in.');
        }}
        onClear={() => {
          setTexts(form.begin);
          keep(slug, null);
          setSaid('Cleared.');
        }}
        said={said}
      />
      <div className="grid gap-x-6 gap-y-3 sm:grid-cols-2 lg:grid-cols-3">
        {fields.setUp.map((field) => (
          <PlainField
            key={field.pointer}
            field={field}
            text={texts[field.pointer] ?? ''}
            problem={outcome.problems[field.pointer]}
            onType={type}
          />
        ))}
      </div>
      {fields.tables.map((table) => (
        <PlainTable key={table.title} table={table} texts={texts} problems={outcome.problems} onType={type} />
      ))}
      <div aria-live="polite">{outcome.reason && <Reason words={outcome.reason} wrong={hasProblem(outcome)} />}</div>
      {outcome.result && (
        <div className="mt-6">
          <h2 className="mb-1 text-lg font-semibold">Result</h2>
          <ResultTable result={outcome.result} fields={outputs} />
          <h2 className="mb-2 mt-6 text-lg font-semibold">How this figure came about</h2>
          <ExplanationTable explanation={explain(outcome.input as EvaluationInput, outcome.result)} />
        </div>
      )}
      <RequestPanel input={outcome.input} />
    </section>
  );
}

const hasProblem = ({ input, problems }: { input: object | null; problems: Texts }) =>
  input !== null || Object.keys(problems).length > 0;

/** What is still missing is said quietly; what cannot be taken as what it is. */
function Reason({ words, wrong }: { words: string; wrong: boolean }) {
  return (
    <div className="mt-4">
      {wrong ? <FieldErrorLine>{words}</FieldErrorLine> : <p className="text-ink2">{words}</p>}
    </div>
  );
}
