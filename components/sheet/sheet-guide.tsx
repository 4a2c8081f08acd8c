'use client';

import Link from 'next/link';
import type { ReactNode } from 'react';
import { TermList } from '@/components/help/term-list';
import { SetUpSketch } from '@/components/sketches/set-up-sketch';
import { isSettled } from '@/lib/planning/is-settled';
import { provenanceWords } from '@/lib/reporting/record-words';
import { sentence } from '@/lib/reporting/report-text';
import { toleranceSource } from '@/lib/reporting/tolerance-source';
import type { SheetData } from './sheet-data';
import { toleranceWords } from './tolerance-words';

/** Where the sheet stands and what it is called; then sketch and cautions, before the first reading. */
export function SheetHead({ data }: { data: SheetData }) {
  const { sheet, job, machine, neighbours, place, definition, cautions } = data;
  return (
    <>
      <div>
        <p className="flex flex-wrap items-center gap-x-4 text-[15px] text-ink2">
          <Link href={`/jobs/${job.id}`} className="inline-flex min-h-12 items-center text-blue underline">
            ‹ Plan of {job.reference}
          </Link>
          <span className="font-mono text-base text-ink">{machine.serialNumber}</span>
        </p>
        <p className="text-[15px] text-ink2">
          {sheet.position} of {neighbours.count} · {place}
        </p>
        <h1 className="text-2xl font-semibold leading-tight">{sheet.title}</h1>
      </div>
      <div className="grid gap-4 sm:max-lg:grid-cols-2">
        <SetUpSketch spec={definition.sketch} component={sheet.component} />
        <div role="note" aria-label="Cautions" className="self-start border-l-4 border-brass bg-brass-wash px-4 py-3">
          <ul className="grid gap-1 text-sm leading-snug">
            {cautions.map((caution) => (
              <li key={caution}>{caution}</li>
            ))}
          </ul>
        </div>
      </div>
    </>
  );
}

/** Help in place: it comes with the sheet, so that it is there without network. */
function Fold({ title, children }: { title: string; children: ReactNode }) {
  return (
    <details className="-mt-px border-y border-line">
      <summary className="flex min-h-12 items-center font-semibold">
        <span className="mr-2" aria-hidden="true">
          ▸
        </span>
        {title}
      </summary>
      {children}
    </details>
  );
}

/** How it is done, how large the deviation may be, and where both come from. */
export function SheetBackground({ data }: { data: SheetData }) {
  const { definition, rules, codeTitle } = data;
  const { tolerance } = rules;
  const check = definition.layout.kind === 'check-list';
  return (
    <div className="grid gap-3">
      <div>
        <Fold title={`${check ? 'How it is checked' : 'How it is measured'}, ${definition.procedure.length} steps`}>
          <ol className="mb-3 grid list-decimal gap-1.5 pl-6 text-[15px] leading-snug marker:text-ink2">
            {definition.procedure.map((step) => (
              <li key={step}>{step}</li>
            ))}
          </ol>
        </Fold>
        {definition.usualMistakes && definition.usualMistakes.length > 0 && (
          <Fold title="Usual mistakes">
            <ul className="mb-3 grid list-disc gap-1.5 pl-6 text-[15px] leading-snug marker:text-ink2">
              {definition.usualMistakes.map((mistake) => (
                <li key={mistake}>{mistake}</li>
              ))}
            </ul>
          </Fold>
        )}
        {data.words.length > 0 && (
          <Fold title="Words on this sheet">
            <TermList terms={data.words} className="mb-3 text-[15px] leading-snug" />
          </Fold>
        )}
      </div>
      <section aria-labelledby="tolerance" className="text-[15px] leading-snug text-ink2">
        <h2 id="tolerance" className="text-base font-semibold text-ink">
          {toleranceWords(tolerance, rules.direction, check ? 'items' : definition.shownIn)}
        </h2>
        {tolerance && (
          <p
            className={
              tolerance.provenance.kind === 'from-memory' && !isSettled(tolerance) ? 'font-medium text-brass' : ''
            }
          >
            {sentence(toleranceSource(tolerance, definition.code))}
          </p>
        )}
        <p className="mt-1.5">Judged: {definition.judgedFigure}.</p>
        <p className="mt-1.5">
          {codeTitle}, own id <span className="font-mono">{definition.id}</span> ·{' '}
          {provenanceWords[definition.source.kind]}: {definition.source.text}
          {rules.ruleSet && (
            <>
              {' '}
              · rule set <span className="font-mono">{rules.ruleSet}</span>
            </>
          )}
        </p>
      </section>
    </div>
  );
}
