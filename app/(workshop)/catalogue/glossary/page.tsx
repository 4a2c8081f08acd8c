import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { TermList } from '@/components/help/term-list';
import { PageTitle } from '@/components/ui/page-title';
import { can } from '@/lib/auth/permissions';
import { requireViewer } from '@/lib/auth/session';
import { glossary } from '@/standards/glossary';

export const metadata: Metadata = { title: 'Words of the trade' };

export default async function GlossaryPage() {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'catalogue.read')) notFound();
  return (
    <>
      <p className="mb-1 text-sm">
        <Link href="/catalogue" className="inline-flex min-h-9 items-center text-blue underline">
          Catalogue
        </Link>
      </p>
      <PageTitle note={`${glossary.length} words as they are used here, in our own sentences`}>
        Words of the trade
      </PageTitle>
      <TermList terms={glossary} className="gap-x-10 md:grid-cols-2" />
    </>
  );
}
