import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { ArchiveHits } from '@/components/archive/archive-hits';
import { RecentReports } from '@/components/archive/recent-reports';
import { LinkButton } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { PageTitle, SectionTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { recentReports } from '@/db/read-models/archive-reports';
import { archiveSearch } from '@/db/read-models/archive-search';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';

export const metadata: Metadata = { title: 'Archive' };

interface Search {
  q?: string;
  after?: string;
  /** Set by the box in the header: a single exact hit opens its machine. */
  open?: string;
}

export default async function ArchivePage({ searchParams }: { searchParams: Promise<Search> }) {
  const viewer = await requireViewer();
  const { q: typed = '', after, open } = await searchParams;
  const q = typed.trim().slice(0, 200);
  if (!q) {
    const reports = await inScope(scopeOf(viewer), (trx) => recentReports(trx, 12));
    return (
      <>
        <PageTitle>Archive</PageTitle>
        <p className="max-w-prose">
          Type any part of the serial number into the box above, in any case, with or without dashes; O and 0, I, L and
          1, B and 8, S and 5, Z and 2 count as the same. Report and order numbers, makers and owners are found too. The
          key <kbd className="rounded border-[1.5px] border-ink bg-leaf px-1.5 font-mono text-sm">/</kbd> goes to the
          box from any page.
        </p>
        <SectionTitle>Issued last</SectionTitle>
        {reports.length === 0 ? (
          <EmptyState title="No report yet">Every report that is issued stands here for good.</EmptyState>
        ) : (
          <RecentReports reports={reports} timeZone={viewer.timeZone} />
        )}
      </>
    );
  }
  const { items, next } = await inScope(scopeOf(viewer), (trx) => archiveSearch(trx, { q, after, limit: 20 }));
  const [first, second] = items;
  // Not when another serial number looks the same: then the reader compares both with the plate.
  const alone = first?.match === 'exact' && second?.match !== 'exact' && second?.match !== 'folded';
  if (open && !after && alone) redirect(`/machines/${first.machine.id}`);
  const count = next || after ? '' : items.length === 1 ? '1 machine' : `${items.length} machines`;
  return (
    <>
      <PageTitle note={items.length > 0 ? count : undefined}>
        Archive: <span className="font-mono">{q}</span>
      </PageTitle>
      {items.length === 0 ? (
        <EmptyState
          title="Nothing found"
          action={
            can(viewer.roles, 'machine.manage') && <LinkButton href="/machines/new">Register a machine</LinkButton>
          }
        >
          Neither a serial number nor a report, job, order, maker or owner contains this. A shorter part often helps:
          the last four signs of the serial number.
        </EmptyState>
      ) : (
        <ArchiveHits hits={items} query={q} timeZone={viewer.timeZone} />
      )}
      {next && (
        <Link
          href={`/archive?${new URLSearchParams({ q, after: next })}`}
          className="mt-2 inline-flex min-h-12 items-center text-blue underline"
        >
          More machines
        </Link>
      )}
    </>
  );
}
