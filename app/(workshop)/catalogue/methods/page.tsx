import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { MethodList } from '@/components/calculator/method-list';
import { PageTitle } from '@/components/ui/page-title';
import { can } from '@/lib/auth/permissions';
import { requireViewer } from '@/lib/auth/session';

export const metadata: Metadata = { title: 'Methods' };

export default async function MethodsPage() {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'catalogue.read')) notFound();
  return (
    <div className="max-w-4xl">
      <p className="mb-1 text-sm text-ink2">
        <Link href="/catalogue" className="inline-flex min-h-9 items-center text-blue underline">
          Catalogue
        </Link>
      </p>
      <PageTitle>Methods</PageTitle>
      <p className="max-w-prose">How readings become figures, with a worked example of each.</p>
      <MethodList base="/catalogue/methods" />
    </div>
  );
}
