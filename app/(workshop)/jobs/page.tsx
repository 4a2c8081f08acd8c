import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { JobTable } from '@/components/tables/job-table';
import { LinkButton } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { PageTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { type JobListItem, listJobs } from '@/db/read-models/job-list';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { id as isId } from '@/lib/schemas/common';

export const metadata: Metadata = { title: 'Jobs' };

const filters: { state: JobListItem['state'] | null; words: string; none: string }[] = [
  { state: null, words: 'All', none: 'No job yet' },
  { state: 'open', words: 'In work', none: 'No job is in work' },
  { state: 'in-check', words: 'In check', none: 'No job is in check' },
  { state: 'issued', words: 'Report issued', none: 'No job has an issued report' },
];

export default async function JobsPage({
  searchParams,
}: {
  searchParams: Promise<{ state?: string; after?: string }>;
}) {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'job.read')) notFound();
  const query = await searchParams;
  const filter = filters.find(({ state }) => state === query.state) ?? filters[0]!;
  const after = isId.safeParse(query.after).success ? query.after! : null;
  const { items, next } = await inScope(scopeOf(viewer), (trx) =>
    listJobs(trx, { state: filter.state ?? undefined, after, limit: 50 }),
  );
  const open = can(viewer.roles, 'job.manage') && (
    <LinkButton href="/jobs/new" variant="strong">
      Open a job
    </LinkButton>
  );
  return (
    <>
      <PageTitle action={items.length > 0 && open}>Jobs</PageTitle>
      <nav aria-label="Which jobs" className="mb-3 flex flex-wrap gap-x-5">
        {filters.map(({ state, words }) => (
          <Link
            key={words}
            href={state ? `/jobs?state=${state}` : '/jobs'}
            aria-current={filter.state === state ? 'true' : undefined}
            className={`inline-flex min-h-12 min-w-6 items-center justify-center border-b-[3px] ${filter.state === state ? 'border-blue font-semibold' : 'border-transparent text-ink2 hover:text-ink'}`}
          >
            {words}
          </Link>
        ))}
      </nav>
      {items.length === 0 ? (
        <EmptyState title={after ? 'That was the last page' : filter.none} action={open}>
          A job is one engagement on one machine: acceptance, after overhaul, after a collision, a move or a periodic
          check. It begins with the machine.
        </EmptyState>
      ) : (
        <JobTable jobs={items} />
      )}
      {next && (
        <p className="mt-4">
          <LinkButton
            href={`/jobs?${new URLSearchParams({ ...(filter.state ? { state: filter.state } : {}), after: next })}`}
          >
            Earlier jobs
          </LinkButton>
        </p>
      )}
    </>
  );
}
