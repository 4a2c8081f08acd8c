import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { Composer } from '@/components/composer/composer';
import { PageTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { ownDefinitionHistory } from '@/db/queries/own-definitions';
import { exampleMachines } from '@/db/read-models/example-machines';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { composedAgain } from '@/lib/planning/new-composition';
import { type OwnDefinitionForm, ownId } from '@/lib/schemas/own-definition';

export const metadata: Metadata = { title: 'New version of an own test' };

export default async function NewVersionPage({ params }: { params: Promise<{ id: string }> }) {
  const viewer = await requireViewer();
  const asked = ownId.safeParse((await params).id);
  if (!can(viewer.roles, 'catalogue.compose') || !asked.success) notFound();
  const id = asked.data;
  const { newest, written, machines } = await inScope(scopeOf(viewer), async (trx) => {
    const history = await ownDefinitionHistory(trx, id);
    return {
      newest: history[0],
      written: history.find(({ composed }) => composed),
      machines: await exampleMachines(trx),
    };
  });
  if (!newest || !written) notFound();
  return (
    <>
      <p className="mb-1 text-sm text-ink2">
        <Link href={`/catalogue/own/${id}`} className="inline-flex min-h-9 items-center font-mono text-blue underline">
          {id}
        </Link>
      </p>
      <PageTitle note={`Sheets that were planned with version ${newest.version} or an older one keep it`}>
        Version {newest.version + 1}
      </PageTitle>
      <Composer
        basedOn={{ id, version: newest.version }}
        composed={composedAgain(written.composed as OwnDefinitionForm)}
        machines={machines}
      />
    </>
  );
}
