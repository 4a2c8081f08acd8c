import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { CodeTests, type TestLine } from '@/components/catalogue/code-tests';
import { ProvenanceLine } from '@/components/catalogue/tolerance-table';
import { LinkButton } from '@/components/ui/button';
import { PageTitle, SectionTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { currentOwnDefinitions, newestOwnDefinitions } from '@/db/queries/own-definitions';
import { holdingToleranceValues, newestToleranceValues } from '@/db/queries/tolerance-values';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { catalogueWithOwn } from '@/lib/planning/catalogue-with-own';
import { cellStates, confirmedCount } from '@/lib/planning/cell-states';

export const metadata: Metadata = { title: 'Catalogue' };

const filters = [
  { key: 'all', label: 'All tests' },
  { key: 'unconfirmed', label: 'Not wholly confirmed' },
  { key: 'waiting', label: 'Waiting for the second person' },
] as const;
type Filter = (typeof filters)[number]['key'];

const shows: Record<Filter, (line: TestLine) => boolean> = {
  all: () => true,
  unconfirmed: ({ count }) => count.confirmed < count.total,
  waiting: ({ count }) => count.waiting > 0,
};

export default async function CataloguePage({ searchParams }: { searchParams: Promise<{ show?: string }> }) {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'catalogue.read')) notFound();
  const asked = (await searchParams).show;
  const chosen = filters.find(({ key }) => key === asked)?.key ?? 'all';
  const { codes, withdrawn } = await inScope(scopeOf(viewer), async (trx) => {
    const holding = await holdingToleranceValues(trx);
    const newest = await newestToleranceValues(trx);
    const own = catalogueWithOwn(await currentOwnDefinitions(trx));
    return {
      codes: own.map((code) => ({
        code,
        lines: code.tests.map((test) => ({ test, count: confirmedCount(cellStates(test, holding, newest)) })),
      })),
      withdrawn: (await newestOwnDefinitions(trx)).filter((row) => row.withdrawn).map((row) => row.definitionId),
    };
  });
  return (
    <>
      <PageTitle
        note="Every test that a plan can be made of, in working order"
        action={
          <div className="flex flex-wrap gap-3">
            <LinkButton href="/catalogue/glossary">Words of the trade</LinkButton>
            <LinkButton href="/catalogue/methods">Methods</LinkButton>
            <LinkButton href="/catalogue/values">Values as a table</LinkButton>
            {can(viewer.roles, 'catalogue.compose') && (
              <LinkButton href="/catalogue/own/new">Compose an own test</LinkButton>
            )}
          </div>
        }
      >
        Catalogue
      </PageTitle>
      <nav aria-label="Which tests" className="flex flex-wrap gap-x-5">
        {filters.map(({ key, label }) => (
          <Link
            key={key}
            href={key === 'all' ? '/catalogue' : `/catalogue?show=${key}`}
            aria-current={key === chosen ? 'page' : undefined}
            className={`inline-flex min-h-12 items-center border-b-[3px] ${key === chosen ? 'border-blue font-semibold' : 'border-transparent text-ink2 hover:border-line'}`}
          >
            {label}
          </Link>
        ))}
      </nav>
      <nav aria-label="Codes" className="mt-2 flex flex-wrap gap-x-5">
        {codes.map(({ code }) => (
          <a key={code.slug} href={`#${code.slug}`} className="inline-flex min-h-11 items-center text-blue underline">
            {code.title}
          </a>
        ))}
      </nav>
      {codes.map(({ code, lines }) => {
        const shown = lines.filter(shows[chosen]);
        return (
          <section key={code.slug} aria-labelledby={code.slug}>
            <SectionTitle
              id={code.slug}
              note={chosen === 'all' ? undefined : `${shown.length} of ${lines.length} tests`}
            >
              {code.title}
            </SectionTitle>
            {chosen === 'all' && (
              <>
                <p className="max-w-prose">{code.subject}</p>
                <ProvenanceLine provenance={code.source} />
              </>
            )}
            {shown.length > 0 && <CodeTests slug={code.slug} title={code.title} lines={shown} />}
          </section>
        );
      })}
      {chosen === 'all' && withdrawn.length > 0 && (
        <p className="mt-6">
          Withdrawn own tests:{' '}
          {withdrawn.map((id) => (
            <Link key={id} href={`/catalogue/own/${id}`} className="mr-3 font-mono text-blue underline">
              {id}
            </Link>
          ))}
        </p>
      )}
    </>
  );
}
