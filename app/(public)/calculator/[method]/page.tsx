import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { Calculator } from '@/components/calculator/calculator';
import { GuideView } from '@/components/calculator/guide-view';
import { VisitorNote } from '@/components/calculator/visitor-note';
import { PageTitle } from '@/components/ui/page-title';
import { findGuide } from '@/lib/explaining/methods/all-guides';

type Params = { params: Promise<{ method: string }> };

export async function generateMetadata({ params }: Params): Promise<Metadata> {
  const guide = findGuide((await params).method);
  return guide ? { title: `${guide.title} · Calculator`, description: guide.sentence } : { title: 'Calculator' };
}

export default async function CalculatorMethodPage({ params }: Params) {
  const guide = findGuide((await params).method);
  if (!guide) notFound();
  const { slug, method, title, sentence, example, outputs } = guide;
  return (
    <>
      <p className="mb-1 text-sm text-ink2">
        <Link href="/calculator" className="inline-flex min-h-9 items-center text-blue underline">
          Calculator
        </Link>
      </p>
      <PageTitle>{title}</PageTitle>
      <p className="mb-5 max-w-prose text-ink2">{sentence}</p>
      <Calculator slug={slug} method={method} title={title} example={example.input} outputs={outputs} />
      <GuideView guide={guide} />
      <VisitorNote />
    </>
  );
}
