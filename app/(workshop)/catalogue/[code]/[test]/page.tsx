import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { ProvenanceLine, ToleranceTable } from '@/components/catalogue/tolerance-table';
import { SetUpSketch } from '@/components/sketches/set-up-sketch';
import { Notice } from '@/components/ui/notice';
import { PageTitle, SectionTitle } from '@/components/ui/page-title';
import { can } from '@/lib/auth/permissions';
import { requireViewer } from '@/lib/auth/session';
import { exampleComponent, findCatalogueTest } from '@/lib/planning/catalogue';
import { DIRECTION_WORDS } from '@/lib/reporting/words';
import { cautionText } from '@/standards/cautions';

export const metadata: Metadata = { title: 'Test' };

interface Params {
  code: string;
  test: string;
}

export default async function CatalogueTestPage({ params }: { params: Promise<Params> }) {
  const viewer = await requireViewer();
  const wanted = await params;
  const found = findCatalogueTest(decodeURIComponent(wanted.code), decodeURIComponent(wanted.test));
  if (!found || !can(viewer.roles, 'catalogue.read')) notFound();
  const { code, test } = found;
  return (
    <>
      <p className="mb-1 text-sm text-ink2">
        <Link href="/catalogue" className="inline-flex min-h-9 items-center text-blue underline">
          Catalogue
        </Link>{' '}
        · {code.title} · own number <span className="font-mono">{test.id}</span>
        {test.testNumber && ` · number there ${test.testNumber}`}
      </p>
      <PageTitle>{test.title}</PageTitle>
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
        </div>
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
            {test.judgedFigure}; permissible {DIRECTION_WORDS[test.direction]}; shown in steps of{' '}
            <span className="font-mono">{test.resolution.valueUm}</span> µm.
          </p>
          {test.positiveMeans && <p className="mt-1">A positive figure means: {test.positiveMeans}.</p>}
          {test.negativeMeans && <p>A negative one: {test.negativeMeans}.</p>}
          <SectionTitle>Tolerances</SectionTitle>
          <ToleranceTable rule={test.tolerance} />
        </div>
      </div>
    </>
  );
}
