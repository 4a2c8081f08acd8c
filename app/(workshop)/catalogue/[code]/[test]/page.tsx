import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { TestView } from '@/components/catalogue/test-view';
import { ValuesSection } from '@/components/catalogue/values-section';
import { SectionTitle } from '@/components/ui/page-title';
import { can } from '@/lib/auth/permissions';
import { requireViewer } from '@/lib/auth/session';
import { loadTest, valuesViewer } from '../../load-test';

export const metadata: Metadata = { title: 'Test' };

interface Params {
  code: string;
  test: string;
}

export default async function CatalogueTestPage({ params }: { params: Promise<Params> }) {
  const viewer = await requireViewer();
  const wanted = await params;
  if (!can(viewer.roles, 'catalogue.read')) notFound();
  const found = await loadTest(viewer, decodeURIComponent(wanted.code), decodeURIComponent(wanted.test));
  if (!found) notFound();
  const { code, test, cells, history, fourEyes } = found;
  return (
    <TestView test={test} codeTitle={code.title}>
      <SectionTitle>What we say of the tolerances</SectionTitle>
      <ValuesSection
        address={{ code: code.slug, test: test.id }}
        cells={cells}
        history={history}
        viewer={valuesViewer(viewer)}
        fourEyes={fourEyes}
      />
    </TestView>
  );
}
