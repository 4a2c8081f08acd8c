import 'server-only';
import { cookies, headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { getToken } from 'next-auth/jwt';
import { cache } from 'react';
import { appDb, type Scope } from '@/db/client';
import { accountSession } from '@/db/queries/accounts';
import type { Viewer } from '@/lib/auth/viewer';
import { env } from '@/lib/env';

/** Who is asking: read from the signed cookie and checked against the database at each request. */
export const currentViewer = cache(async (): Promise<Viewer | null> => {
  const token = await getToken({
    req: { cookies: await cookies(), headers: await headers() } as unknown as Parameters<typeof getToken>[0]['req'],
    secret: env.NEXTAUTH_SECRET,
  });
  if (!token?.sub || !token.organisationId) return null;
  const session = await accountSession(appDb(), token.sub, token.organisationId);
  if (!session || session.accountDisabled || session.memberDisabled) return null;
  if (session.sessionVersion !== token.sessionVersion) return null;
  return {
    accountId: token.sub,
    organisationId: token.organisationId,
    membershipId: session.membershipId,
    name: session.memberName,
    email: session.email,
    functionTitle: session.functionTitle,
    roles: session.roles,
    customerId: session.customerId,
    organisationName: session.organisationName,
    organisationCode: session.organisationCode,
    timeZone: session.timeZone,
    setUpDone: session.setUpDone,
  };
});

/** For pages: nobody signed in goes to the sign-in page. */
export async function requireViewer(): Promise<Viewer> {
  const viewer = await currentViewer();
  if (!viewer) redirect('/sign-in');
  return viewer;
}

export const scopeOf = (viewer: Viewer): Scope => ({
  organisationId: viewer.organisationId,
  accountId: viewer.accountId,
  customerId: viewer.customerId,
});
