import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { Composer } from '@/components/composer/composer';
import { PageTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { exampleMachines } from '@/db/read-models/example-machines';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { newComposition } from '@/lib/planning/new-composition';

export const metadata: Metadata = { title: 'Compose an own test' };

export default async function NewOwnTestPage({ searchParams }: { searchParams: Promise<{ measure?: string }> }) {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'catalogue.compose')) notFound();
  const { measure } = await searchParams;
  const machines = await inScope(scopeOf(viewer), exampleMachines);
  return (
    <>
      <PageTitle note="It is planned beside the codes, for every machine that has what it is done on">
        Compose an own test
      </PageTitle>
      <Composer basedOn={null} composed={newComposition(measure)} machines={machines} />
    </>
  );
}
