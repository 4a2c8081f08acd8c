'use client';

import { type ReactNode, type RefObject, useEffect, useMemo, useState } from 'react';
import { TryOutLog } from '@/components/composer/try-out-log';
import { ExplanationTable } from '@/components/explain/explanation';
import { PassPanel } from '@/components/sheet/pass-panel';
import { isJudged } from '@/components/sheet/result-words';
import { OpenPassContext, useEvaluated, useOpenPass } from '@/components/sheet/sheet-context';
import { SheetSession } from '@/components/sheet/sheet-session';
import { explainOutcome } from '@/lib/explaining/explain-outcome';
import type { GuideField } from '@/lib/explaining/methods/method-guide';
import { figures } from '@/lib/sheet/figures';
import type { CellPointer, Cells, SheetRules } from '@/lib/sheet/types';
import { parseNumber } from '@/lib/units/parse-number';
import type { Unit } from '@/lib/units/unit';
import type { TestDefinition } from '@/standards/types';
import { RequestPanel } from './request-panel';
import { ResultTable } from './result-table';

const passId = 'calculator';

/**
 * The fields of one definition, and what they come to. Another definition or other rules begin a session with what stands in the
 * fields; the page stays as it is drawn, so that whoever types a tolerance goes on typing.
 */
export function OpenForm(props: {
  definition: TestDefinition;
  rules: SheetRules;
  cells: RefObject<Cells>;
  outputs: GuideField[];
  onCells: (cells: Cells) => void;
  say: (words: string) => void;
  children: ReactNode;
}) {
  const { definition, rules, cells, outputs, onCells, say, children } = props;
  const session = useMemo(() => openSession(definition, rules, cells.current), [definition, rules, cells]);
  const [confirmed, setConfirmed] = useState<ReadonlySet<CellPointer>>(new Set());
  useEffect(() => {
    const leave = session.subscribe(() => onCells(session.cellsOf(passId)));
    return () => {
      leave();
    };
  }, [session, onCells]);
  return (
    <OpenPassContext
      value={{
        ...{ session, passId, title: definition.title, readOnly: false, keypad: false, checked: false },
        ...{ confirmed, confirm: (pointer) => setConfirmed((before) => new Set(before).add(pointer)) },
      }}
    >
      <p id="calculator-tab" className="sr-only">
        Readings
      </p>
      <PassPanel
        data={{ definition, rules }}
        panelId="calculator-form"
        tabId="calculator-tab"
        linked={false}
        onEnd={() => say('That was the last reading.')}
        say={say}
      />
      {children}
      <Results definition={definition} rules={rules} outputs={outputs} />
    </OpenPassContext>
  );
}

function openSession(definition: TestDefinition, rules: SheetRules, cells: Cells): SheetSession {
  const place = { sheetId: 'calculator', jobId: 'calculator', sheetTitle: definition.title };
  const known = Object.fromEntries(
    Object.entries(cells).map(([pointer, { text }]) => [pointer, { text, unit: typedUnit(text), version: 0 }]),
  );
  return new SheetSession(place, rules, definition, [{ id: passId, cells: known }], new TryOutLog());
}

/** The unit behind a figure; where none was typed, that of the column holds, also when another axis is chosen meanwhile. */
function typedUnit(text: string): Unit | null {
  const parsed = parseNumber(text);
  return parsed.ok ? parsed.unit : null;
}

const judged: GuideField = { name: 'deviation', unit: '', words: 'the figure that is judged' };

function Results({
  definition,
  rules,
  outputs,
}: {
  definition: TestDefinition;
  rules: SheetRules;
  outputs: GuideField[];
}) {
  const { session } = useOpenPass();
  const outcome = useEvaluated(session, passId, (evaluated) => evaluated.outcome);
  if (!isJudged(outcome)) return <RequestPanel input={null} />;
  const explanation = explainOutcome(outcome, rules, definition, session.cellsOf(passId));
  return (
    <div className="mt-6">
      <h2 className="text-lg font-semibold">Figures</h2>
      <dl className="mt-1 grid max-w-2xl grid-cols-[auto_1fr] gap-x-6 gap-y-1">
        {figures(outcome).map(({ label, value }) => (
          <div key={label} className="contents">
            <dt className="text-ink2">{label}</dt>
            <dd className="font-mono">{value}</dd>
          </div>
        ))}
      </dl>
      <h2 className="mb-2 mt-6 text-lg font-semibold">How this figure came about</h2>
      <ExplanationTable explanation={explanation} />
      <details className="mt-4 border-t border-line">
        <summary className="flex min-h-12 cursor-pointer items-center font-semibold">
          <span aria-hidden="true" className="mr-2">
            ▸
          </span>
          Every figure, not rounded
        </summary>
        <ResultTable result={outcome.result} fields={[judged, ...outputs]} />
      </details>
      <RequestPanel input={outcome.input} />
    </div>
  );
}
