import { cookies } from 'next/headers';
import Link from 'next/link';
import type { ReactNode } from 'react';
import { Footer } from '@/components/layout/footer';
import { Header } from '@/components/layout/header';
import { Notice } from '@/components/ui/notice';
import { appDb } from '@/db/client';
import { accountMemberships } from '@/db/queries/accounts';
import { can } from '@/lib/auth/permissions';
import { officeFor, roomsFor } from '@/lib/auth/places';
import { requireViewer } from '@/lib/auth/session';
import { readTheme, themeCookie } from '@/lib/theme';

/** The signed-in shell. */
export default async function WorkshopLayout({ children }: { children: ReactNode }) {
  const viewer = await requireViewer();
  const memberships = await accountMemberships(appDb(), viewer.accountId);
  const theme = readTheme((await cookies()).get(themeCookie)?.value);
  const person = {
    name: viewer.name,
    roles: viewer.roles,
    organisationName: viewer.organisationName,
    otherOrganisations: memberships
      .filter(({ organisationId }) => organisationId !== viewer.organisationId)
      .map(({ organisationId, organisationName }) => ({ id: organisationId, name: organisationName })),
  };
  return (
    <div className="flex min-h-dvh flex-col">
      <a href="#main" className="sr-only focus:not-sr-only focus:p-3">
        Skip to the content
      </a>
      <Header person={person} places={roomsFor(viewer.roles)} office={officeFor(viewer.roles)} theme={theme} />
      {!viewer.setUpDone && can(viewer.roles, 'organisation.change') && (
        <Notice tone="brass" title="The workshop is not quite set up">
          <Link href="/welcome" className="underline">
            Go on with letterhead and first machine
          </Link>
        </Notice>
      )}
      <main id="main" tabIndex={-1} className="w-full max-w-[90rem] px-7 pb-10 pt-5 outline-none">
        {children}
      </main>
      <Footer />
    </div>
  );
}
