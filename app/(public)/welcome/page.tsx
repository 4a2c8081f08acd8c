import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { CodesForm } from '@/components/organisation/codes-form';
import { FirstMachine } from '@/components/organisation/first-machine';
import { FoundingForm } from '@/components/organisation/founding-form';
import { OrganisationForm } from '@/components/organisation/organisation-form';
import { WelcomeSteps } from '@/components/organisation/welcome-steps';
import { PageTitle } from '@/components/ui/page-title';
import { appDb, inScope } from '@/db/client';
import { firstOrganisationNeeded } from '@/db/queries/accounts';
import { listCustomers } from '@/db/queries/customers';
import { ownOrganisation } from '@/db/queries/organisations';
import { can } from '@/lib/auth/permissions';
import { currentViewer, scopeOf } from '@/lib/auth/session';
import { offeredCodes } from '@/lib/planning/offered-codes';
import { timeZones } from '@/lib/time-zones';

export const metadata: Metadata = { title: 'Welcome' };

/** The first start without the demo: administrator and organisation, letterhead, first customer and machine. */
export default async function WelcomePage({ searchParams }: { searchParams: Promise<{ step?: string }> }) {
  const viewer = await currentViewer();
  if (!viewer) {
    if (!(await firstOrganisationNeeded(appDb()))) redirect('/sign-in');
    return (
      <>
        <PageTitle>Welcome. Let us set the workshop up.</PageTitle>
        <WelcomeSteps at={0} />
        <FoundingForm timeZones={timeZones()} />
      </>
    );
  }
  if (!can(viewer.roles, 'organisation.change')) redirect('/');
  const { organisation, customers } = await inScope(scopeOf(viewer), async (trx) => ({
    organisation: await ownOrganisation(trx),
    customers: await listCustomers(trx),
  }));
  const { step } = await searchParams;
  if (step === 'codes') {
    return (
      <>
        <PageTitle>The test codes that you work by</PageTitle>
        <WelcomeSteps at={2} />
        <CodesForm
          offered={offeredCodes()}
          chosen={organisation.codes}
          version={organisation.version}
          goOnTo="/welcome?step=machine"
        />
      </>
    );
  }
  if (step !== 'machine') {
    return (
      <>
        <PageTitle>The letterhead of your reports</PageTitle>
        <WelcomeSteps at={1} />
        <OrganisationForm organisation={organisation} timeZones={timeZones()} goOnTo="/welcome?step=codes" />
      </>
    );
  }
  return (
    <>
      <PageTitle>Your first machine</PageTitle>
      <WelcomeSteps at={3} />
      <FirstMachine version={organisation.version} customers={customers.map(({ id, name }) => ({ id, name }))} />
    </>
  );
}
