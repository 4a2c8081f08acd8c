import Link from 'next/link';
import type { ReactNode } from 'react';
import { ProvenanceLine, ToleranceTable } from '@/components/catalogue/tolerance-table';
import { SetUpSketch } from '@/components/sketches/set-up-sketch';
import { Notice } from '@/components/ui/notice';
import { PageTitle, SectionTitle } from '@/components/ui/page-title';
import { appliesToChoices } from '@/lib/planning/applies-to-words';
import { exampleComponent } from '@/lib/planning/catalogue';
import { DIRECTION_WORDS } from '@/lib/reporting/words';
import { cautionText } from '@/standards/cautions';
import type { ShownIn, TestDefinition } from '@/standards/types';

/** Unit in which the step of a result is given; a count of items has none. */
const stepUnits: Record<ShownIn, string | null> = { mm: 'µm', 'mm/m': 'µm/m', '″': '″', items: null };

/** One test of the catalogue, whole. `children`: what the organisation says of its tolerances, and further sections. */
export function TestView(props: {
  test: TestDefinition;
  codeTitle: string;
  action?: ReactNode;
  notice?: ReactNode;
  children?: ReactNode;
}) {
  const { test, codeTitle, action, notice, children } = props;
  const step = stepUnits[test.shownIn ?? 'mm'];
  return (
    <>
      <p className="mb-1 text-sm text-ink2">
        <Link href="/catalogue" className="inline-flex min-h-9 items-center text-blue underline">
          Catalogue
        </Link>{' '}
        · {codeTitle} · own number <span className="font-mono">{test.id}</span>
        {test.testNumber && ` · number there ${test.testNumber}`}
        {test.version > 1 && ` · version ${test.version}`}
      </p>
      <PageTitle action={action}>{test.title}</PageTitle>
      {notice}
      <div className="grid gap-x-10 lg:grid-cols-[24rem_minmax(0,1fr)]">
        <div>
          <SetUpSketch spec={test.sketch} component={exampleComponent(test)} />
          <Notice tone="brass" title="Before you begin" className="mt-4 text-[15px]">
            <ul className="grid gap-1.5">
              {test.cautions.map((caution) => (
                <li key={caution}>{cautionText(caution)}</li>
              ))}
            </ul>
          </Notice>
          <SectionTitle>Instruments</SectionTitle>
          <p>{test.instruments.join(', ')}</p>
          <SectionTitle>Done on</SectionTitle>
          <p>{appliesToChoices[test.appliesTo.kind].label}</p>
        </div>
        <div>
          <div className="max-w-prose">
            <h2 className="text-lg font-semibold">How it is measured</h2>
            <ol className="mt-1 grid list-decimal gap-1.5 pl-6">
              {test.procedure.map((step) => (
                <li key={step}>{step}</li>
              ))}
            </ol>
            <ProvenanceLine provenance={test.source} />
            <SectionTitle>What is judged</SectionTitle>
            <p>
              {test.judgedFigure}
              {step && (
                <>
                  ; permissible {DIRECTION_WORDS[test.direction]}; shown in steps of{' '}
                  <span className="font-mono">{test.resolution.valueUm}</span> {step}
                </>
              )}
              .
            </p>
            {test.method !== 'function-check' && (
              <p className="mt-1">
                <Link href={`/catalogue/methods/${test.method}`} className="text-blue underline">
                  How readings become this figure
                </Link>
              </p>
            )}
            {test.positiveMeans && <p className="mt-1">A positive figure means: {test.positiveMeans}.</p>}
            {test.negativeMeans && <p>A negative one: {test.negativeMeans}.</p>}
            {test.usualMistakes && test.usualMistakes.length > 0 && (
              <>
                <SectionTitle>What goes wrong most often</SectionTitle>
                <ul className="grid list-disc gap-1.5 pl-6">
                  {test.usualMistakes.map((mistake) => (
                    <li key={mistake}>{mistake}</li>
                  ))}
                </ul>
              </>
            )}
            <SectionTitle>Tolerances</SectionTitle>
            <ToleranceTable rule={test.tolerance} />
            {test.also?.map(({ figure, label, tolerance }) => (
              <div key={figure} className="mt-4">
                <h3 className="font-semibold">{label}</h3>
                <ToleranceTable rule={tolerance} />
              </div>
            ))}
          </div>
          {children}
        </div>
      </div>
    </>
  );
}
