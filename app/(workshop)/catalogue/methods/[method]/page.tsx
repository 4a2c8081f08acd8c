import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { GuideView } from '@/components/calculator/guide-view';
import { WorkedExample } from '@/components/calculator/worked-example';
import { LinkButton } from '@/components/ui/button';
import { PageTitle } from '@/components/ui/page-title';
import { can } from '@/lib/auth/permissions';
import { requireViewer } from '@/lib/auth/session';
import { findGuide } from '@/lib/explaining/methods/all-guides';

type Params = { params: Promise<{ method: string }> };

export async function generateMetadata({ params }: Params): Promise<Metadata> {
  return { title: findGuide((await params).method)?.title ?? 'Method' };
}

export default async function MethodPage({ params }: Params) {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'catalogue.read')) notFound();
  const guide = findGuide((await params).method);
  if (!guide) notFound();
  return (
    <div className="max-w-4xl">
      <p className="mb-1 text-sm text-ink2">
        <Link href="/catalogue/methods" className="inline-flex min-h-9 items-center text-blue underline">
          Methods
        </Link>
      </p>
      <PageTitle action={<LinkButton href={`/calculator/${guide.slug}`}>Try it in the calculator</LinkButton>}>
        {guide.title}
      </PageTitle>
      <p className="max-w-prose text-ink2">{guide.sentence}</p>
      <GuideView guide={guide} />
      <WorkedExample guide={guide} />
    </div>
  );
}
