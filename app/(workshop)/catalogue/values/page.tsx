import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { ImportForm } from '@/components/catalogue/import-form';
import { buttonClass } from '@/components/ui/button';
import { PageTitle, SectionTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { confirmedCount } from '@/lib/planning/cell-states';
import { testsWithCells } from '@/lib/services/values-table';

export const metadata: Metadata = { title: 'Values of the tolerances' };

export default async function ValuesPage() {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'catalogue.read')) notFound();
  const tests = await inScope(scopeOf(viewer), testsWithCells);
  const { confirmed, waiting, total } = confirmedCount(tests.flatMap(({ cells }) => cells));
  return (
    <>
      <p className="mb-1 text-sm text-ink2">
        <Link href="/catalogue" className="inline-flex min-h-9 items-center text-blue underline">
          Catalogue
        </Link>
      </p>
      <PageTitle note={`${confirmed} of ${total} figures confirmed${waiting > 0 ? `, ${waiting} waiting` : ''}`}>
        Values of the tolerances as a table
      </PageTitle>
      <div className="max-w-prose">
        <p>
          A CSV file with a line for each figure: which test, which figure, its unit, what you say of it, edition and
          page of your copy. Commas between the columns, decimal points in the figures.
        </p>
        <p className="mt-3">
          <a href="/api/catalogue/values.csv" download className={buttonClass('plain')}>
            Save the table
          </a>
        </p>
      </div>
      {can(viewer.roles, 'catalogue.confirm') && (
        <>
          <SectionTitle>Take a table over</SectionTitle>
          <ImportForm />
        </>
      )}
    </>
  );
}
