import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { CodesForm } from '@/components/organisation/codes-form';
import { OrganisationForm } from '@/components/organisation/organisation-form';
import { PageTitle, SectionTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { ownOrganisation } from '@/db/queries/organisations';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { offeredCodes } from '@/lib/planning/offered-codes';
import { timeZones } from '@/lib/time-zones';

export const metadata: Metadata = { title: 'Letterhead and defaults' };

export default async function SettingsPage() {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'organisation.change')) notFound();
  const organisation = await inScope(scopeOf(viewer), ownOrganisation);
  return (
    <>
      <PageTitle note="Every report that is issued from now on carries it">Letterhead and defaults</PageTitle>
      <OrganisationForm key={organisation.version} organisation={organisation} timeZones={timeZones()} />
      <SectionTitle>Test codes of a new job</SectionTitle>
      <CodesForm
        key={`codes ${organisation.version}`}
        offered={offeredCodes()}
        chosen={organisation.codes}
        version={organisation.version}
      />
    </>
  );
}
