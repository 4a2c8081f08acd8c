import type { Metadata } from 'next';
import Link from 'next/link';
import { MethodList } from '@/components/calculator/method-list';
import { VisitorNote } from '@/components/calculator/visitor-note';
import { PageTitle } from '@/components/ui/page-title';

export const metadata: Metadata = {
  title: 'Calculator',
  description:
    'Evaluate readings of turning machines: straightness, parallelism, run-out, positioning and more, with every step shown.',
};

export default function CalculatorPage() {
  return (
    <>
      <PageTitle
        action={
          <Link href="/sign-in" className="inline-flex min-h-11 items-center text-blue underline">
            Sign in
          </Link>
        }
      >
        Calculator
      </PageTitle>
      <p className="max-w-prose">
        Readings in, result out, with every step shown. It is the arithmetic of our sheets and reports, open to anybody.
      </p>
      <VisitorNote />
      <MethodList base="/calculator" />
    </>
  );
}
