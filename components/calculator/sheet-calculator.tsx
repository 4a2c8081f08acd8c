'use client';

import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import type { EvaluationInput, EvaluationMethod } from '@/lib/evaluation';
import { type Chosen, chosenOr, type SheetForm } from '@/lib/explaining/methods/calculator-form';
import { cellsOfInput, chosenFor, formDefinition } from '@/lib/explaining/methods/form-definition';
import type { GuideField } from '@/lib/explaining/methods/method-guide';
import { read } from '@/lib/sheet/read-cell';
import { sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells } from '@/lib/sheet/types';
import { Dec } from '@/lib/units/decimal';
import { FormActions } from './form-actions';
import { type JudgingTexts, noJudging, readJudging } from './judging';
import { JudgingFields } from './judging-fields';
import { type KeptForm, keep, readKept } from './kept-form';
import { OpenForm } from './open-form';
import { OptionFields } from './option-fields';

const beginOf = (form: SheetForm): Cells =>
  Object.fromEntries(Object.entries(form.setUp).map(([pointer, text]) => [pointer, { text, unit: null }]));

/** A method's form in the layout of its sheet: readings are typed, read and judged as on a sheet, and nothing is kept by the server. */
export function SheetCalculator(props: {
  slug: string;
  method: EvaluationMethod;
  title: string;
  form: SheetForm;
  example: EvaluationInput;
  outputs: GuideField[];
}) {
  const { slug, method, title, form, example, outputs } = props;
  const [chosen, setChosen] = useState<Chosen>({});
  const [judging, setJudging] = useState<JudgingTexts>(noJudging);
  const [begin, setBegin] = useState<{ cells: Cells; round: number }>(() => ({ cells: beginOf(form), round: 0 }));
  const [said, setSaid] = useState('');
  const cells = useRef(begin.cells);

  const write = useCallback(
    (change: Partial<KeptForm>) => {
      if (change.cells) cells.current = change.cells;
      keep(slug, { chosen, judging, cells: cells.current, ...change });
    },
    [slug, chosen, judging],
  );
  /** Fields are made anew, with what stands in them. */
  const anew = useCallback((next: KeptForm) => {
    cells.current = next.cells;
    setChosen(next.chosen);
    setJudging(next.judging);
    setBegin(({ round }) => ({ cells: next.cells, round: round + 1 }));
  }, []);
  useEffect(() => {
    const kept = readKept(slug);
    if (kept) anew({ ...kept, judging: { ...noJudging, ...kept.judging } });
  }, [slug, anew]);

  const figures = useMemo(() => readFigures(form, chosen), [form, chosen]);
  const definition = useMemo(
    () => formDefinition(method, title, form, { ...chosen, ...figures.values }),
    [method, title, form, chosen, figures],
  );
  const shownIn = definition.shownIn === 'items' ? 'mm' : (definition.shownIn ?? 'mm');
  const { rules, problems } = useMemo(() => readJudging(judging, shownIn), [judging, shownIn]);
  const fill = () => {
    const wanted = chosenFor(form, example);
    const of = formDefinition(method, title, form, wanted);
    const next = { chosen: wanted, judging, cells: cellsOfInput((held) => sheetFields(of, held), example) };
    anew(next);
    keep(slug, next);
    setSaid('The example is filled in.');
  };
  const clear = () => {
    anew({ chosen: {}, judging: noJudging, cells: beginOf(form) });
    keep(slug, null);
    setSaid('Cleared.');
  };
  return (
    <section aria-label="Form">
      <FormActions onExample={fill} onClear={clear} said={said} />
      <OptionFields
        options={form.options}
        chosen={chosenOr(form.options, chosen)}
        problems={figures.problems}
        onChange={(next) => {
          setChosen(next);
          write({ chosen: next });
        }}
      />
      <OpenForm
        key={begin.round}
        definition={definition}
        rules={rules}
        cells={cells}
        outputs={outputs}
        onCells={(next) => write({ cells: next })}
        say={setSaid}
      >
        <JudgingFields
          texts={judging}
          problems={problems}
          shownIn={shownIn}
          signed={form.positiveMeans !== undefined}
          hasBasis={form.hasBasis === true}
          onChange={(next) => {
            setJudging(next);
            write({ judging: next });
          }}
        />
      </OpenForm>
    </section>
  );
}

/** Options that are figures, read by the parser of all fields; what cannot be read is left out and said so. */
function readFigures(form: SheetForm, chosen: Chosen) {
  const values: Chosen = {};
  const problems: Record<string, string> = {};
  for (const option of form.options) {
    if (option.kind !== 'figure') continue;
    const outcome = read({ text: chosen[option.name] ?? '', unit: null }, option.unit);
    const above = outcome.state === 'ok' && new Dec(outcome.value).gt(0);
    values[option.name] = above ? outcome.value : '';
    if (outcome.state === 'bad') problems[option.name] = outcome.problem;
    else if (outcome.state === 'ok' && !above) problems[option.name] = 'It must be above zero.';
  }
  return { values, problems };
}
