import type { Metadata } from 'next';
import Link from 'next/link';
import { MachineTable } from '@/components/machines/machine-table';
import { LinkButton } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { PageTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { machineList } from '@/db/read-models/machine-list';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';

export const metadata: Metadata = { title: 'Machines' };

export default async function MachinesPage({ searchParams }: { searchParams: Promise<{ after?: string }> }) {
  const viewer = await requireViewer();
  const { after } = await searchParams;
  const { items, next } = await inScope(scopeOf(viewer), (trx) => machineList(trx, { after, limit: 50 }));
  const register = can(viewer.roles, 'machine.manage') && (
    <LinkButton href="/machines/new" variant="strong">
      Register a machine
    </LinkButton>
  );
  return (
    <>
      <PageTitle action={items.length > 0 && register}>Machines</PageTitle>
      {items.length === 0 ? (
        <EmptyState title={after ? 'That was the last page' : 'No machine yet'} action={register}>
          {viewer.customerId
            ? 'Machines of your company appear here as soon as they are registered.'
            : 'A machine is registered once, by its serial number; jobs and reports hang on it for ever.'}
        </EmptyState>
      ) : (
        <MachineTable machines={items} />
      )}
      <nav aria-label="Pages" className="mt-4 flex gap-3">
        {after && <LinkButton href="/machines">First page</LinkButton>}
        {next && (
          <Link
            href={`/machines?after=${encodeURIComponent(next)}`}
            className="inline-flex min-h-12 items-center text-blue underline"
          >
            More machines
          </Link>
        )}
      </nav>
    </>
  );
}
