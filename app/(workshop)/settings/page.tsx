import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { CodesForm } from '@/components/organisation/codes-form';
import { ConfirmationForm } from '@/components/organisation/confirmation-form';
import { OrganisationForm } from '@/components/organisation/organisation-form';
import { PageTitle, SectionTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { ownOrganisation } from '@/db/queries/organisations';
import { currentOwnDefinitions } from '@/db/queries/own-definitions';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { offeredCodes } from '@/lib/planning/offered-codes';
import { timeZones } from '@/lib/time-zones';

export const metadata: Metadata = { title: 'Letterhead and defaults' };

export default async function SettingsPage() {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'organisation.change')) notFound();
  const { organisation, hasOwnTests } = await inScope(scopeOf(viewer), async (trx) => ({
    organisation: await ownOrganisation(trx),
    hasOwnTests: (await currentOwnDefinitions(trx)).length > 0,
  }));
  return (
    <>
      <PageTitle note="Every report that is issued from now on carries it">Letterhead and defaults</PageTitle>
      <OrganisationForm organisation={organisation} timeZones={timeZones()} />
      <SectionTitle>Test codes of a new job</SectionTitle>
      <CodesForm offered={offeredCodes(hasOwnTests)} chosen={organisation.codes} version={organisation.version} />
      <SectionTitle>Confirmation of tolerances</SectionTitle>
      <ConfirmationForm organisation={organisation} />
    </>
  );
}
