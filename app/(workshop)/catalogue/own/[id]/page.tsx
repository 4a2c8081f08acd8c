import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { OwnVersions } from '@/components/catalogue/own-versions';
import { TestView } from '@/components/catalogue/test-view';
import { ValuesSection } from '@/components/catalogue/values-section';
import { WithdrawButton } from '@/components/catalogue/withdraw-button';
import { LinkButton } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { SectionTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { ownOrganisation } from '@/db/queries/organisations';
import { ownDefinitionHistory } from '@/db/queries/own-definitions';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { dayIn } from '@/lib/dates';
import { ownSlug } from '@/lib/planning/catalogue-with-own';
import { ownId } from '@/lib/schemas/own-definition';
import { toleranceValuesOf } from '@/lib/services/tolerance-values';
import { valuesViewer } from '../../load-test';

export const metadata: Metadata = { title: 'Own test' };

/** One own test: the newest version, or with `?version=` an older one as sheets still have it. */
export default async function OwnTestPage(props: {
  params: Promise<{ id: string }>;
  searchParams: Promise<{ version?: string }>;
}) {
  const viewer = await requireViewer();
  const asked = ownId.safeParse((await props.params).id);
  if (!can(viewer.roles, 'catalogue.read') || !asked.success) notFound();
  const { version } = await props.searchParams;
  const found = await inScope(scopeOf(viewer), async (trx) => {
    const history = await ownDefinitionHistory(trx, asked.data);
    const wanted = history.find((row) => row.definition && (!version || String(row.version) === version));
    if (!wanted?.definition) return null;
    const { fourEyes } = await ownOrganisation(trx);
    return { history, test: wanted.definition, fourEyes, said: await toleranceValuesOf(trx, wanted.definition) };
  });
  const newest = found?.history[0];
  if (!found || !newest) notFound();
  const { history, test, fourEyes, said } = found;
  const current = !newest.withdrawn && newest.version === test.version;
  const mayCompose = can(viewer.roles, 'catalogue.compose');
  const reader = valuesViewer(viewer);
  return (
    <TestView
      test={test}
      codeTitle="own tests"
      action={
        mayCompose && (
          <div className="flex flex-wrap gap-3">
            <LinkButton href={`/catalogue/own/${test.id}/new-version`}>Make a new version</LinkButton>
            {!newest.withdrawn && <WithdrawButton id={test.id} />}
          </div>
        )
      }
      notice={
        current ? null : (
          <Notice tone="brass" title={newest.withdrawn ? 'Withdrawn' : 'An older version'} className="mb-5">
            {newest.withdrawn
              ? `${newest.accountName} withdrew it on ${dayIn(newest.recordedAt, viewer.timeZone)}. New plans do not have it; sheets that do keep it.`
              : `Version ${newest.version} is the one that new plans have. Sheets that were planned with this one keep it.`}
          </Notice>
        )
      }
    >
      <SectionTitle>What we say of the tolerances</SectionTitle>
      <ValuesSection
        address={{ code: ownSlug, test: test.id }}
        cells={said.cells}
        history={said.history}
        viewer={current ? reader : { ...reader, mayConfirm: false, mayAgree: false }}
        fourEyes={fourEyes}
      />
      <SectionTitle>Versions</SectionTitle>
      <OwnVersions id={test.id} history={history} shown={test.version} timeZone={viewer.timeZone} />
    </TestView>
  );
}
