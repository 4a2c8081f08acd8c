'use client';

import { useDeferredValue, useMemo } from 'react';
import type { SheetData } from '@/components/sheet/sheet-data';
import { Notice } from '@/components/ui/notice';
import { composeDefinition } from '@/lib/planning/compose-definition';
import { type ExampleMachine, exampleSheet } from '@/lib/planning/example-sheet';
import { ownDefinitionProblems } from '@/lib/planning/own-definition-problems';
import { ownDefinitionFields } from '@/lib/schemas/own-definition';
import type { ComposerForm, Typed } from './composer-form';
import { exampleData } from './example-data';
import { TryOutSheet } from './try-out-sheet';

/** The sheet drawn from what stands in the composer at this moment, or what is still in the way. */
export function ComposerPreview({ api, machines }: { api: ComposerForm; machines: ExampleMachine[] }) {
  const typed = JSON.stringify(api.form.watch('form'));
  const settled = useDeferredValue(typed);
  const shown = useMemo(() => preview(JSON.parse(settled), machines), [settled, machines]);
  return (
    <section aria-labelledby="preview">
      <h2 id="preview" className="text-lg font-semibold">
        The sheet
      </h2>
      <p className="mb-3 text-sm text-ink2">As the inspector will find it. Try readings; nothing of it is kept.</p>
      {'data' in shown ? (
        <TryOutSheet key={whatJudges(shown.data)} data={shown.data} />
      ) : (
        <Notice tone="brass" title="Not to be drawn yet">
          <ul>
            {shown.missing.map((detail) => (
              <li key={detail}>{detail}</li>
            ))}
          </ul>
        </Notice>
      )}
    </section>
  );
}

/** What is tried stays while only words change; another layout or tolerance begins anew. */
function whatJudges({ definition, rules, sheet }: SheetData): string {
  const { layout, method, judge, resolution, positiveMeans, negativeMeans } = definition;
  return JSON.stringify([layout, method, judge, resolution, positiveMeans, negativeMeans, rules, sheet.component]);
}

/** Texts that are not written yet do not keep the sheet from being drawn. */
function withTexts(typed: Typed): Typed {
  const or = (text: unknown, instead: string) => (typeof text === 'string' && text.trim().length > 5 ? text : instead);
  return {
    ...typed,
    title: or(typed.title, 'Test without a title yet'),
    procedure: 'as written\nin the steps',
    instruments: 'as chosen',
    judgedFigure: or(typed.judgedFigure, 'as described'),
    positiveMeans: typed.positiveMeans || 'one way',
    negativeMeans: typed.negativeMeans || 'the other way',
  };
}

function preview(typed: Typed, machines: ExampleMachine[]): { data: SheetData } | { missing: string[] } {
  const parsed = ownDefinitionFields.safeParse(withTexts(typed));
  if (!parsed.success) return { missing: firstOfEach(parsed.error.issues) };
  const problems = ownDefinitionProblems(parsed.data);
  if (problems.length > 0) return { missing: distinct(problems.map(({ detail }) => detail)) };
  const definition = composeDefinition(parsed.data, 'OWN', 1);
  const example = exampleSheet(definition, machines);
  if (!example) return { missing: ['No machine here has what it is done on, so it cannot be shown.'] };
  return { data: exampleData(definition, example) };
}

/** One message a field is enough. */
function firstOfEach(issues: { path: PropertyKey[]; message: string }[]): string[] {
  const byPlace = new Map<string, string>();
  for (const { path, message } of issues) {
    const place = path.join('/');
    if (!byPlace.has(place)) byPlace.set(place, message);
  }
  return distinct([...byPlace.values()]);
}

const distinct = (texts: string[]) => [...new Set(texts)];
