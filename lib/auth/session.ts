import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { getToken } from 'next-auth/jwt';
import { cache } from 'react';
import { appDb, type Scope } from '@/db/client';
import { accountSession } from '@/db/queries/accounts';
import type { Viewer } from '@/lib/auth/viewer';
import { env } from '@/lib/env';

type TokenRequest = Parameters<typeof getToken>[0]['req'];

const cookiesIn = (headers: Headers): Record<string, string> =>
  Object.fromEntries(
    (headers.get('cookie') ?? '')
      .split(/;\s*/)
      .filter((pair) => pair.includes('='))
      .map((pair) => [pair.slice(0, pair.indexOf('=')), pair.slice(pair.indexOf('=') + 1)]),
  );

/** Who is asking: read from the signed cookie and checked against the database at each request. */
export async function viewerOf(headers: Headers): Promise<Viewer | null> {
  const token = await getToken({
    req: { cookies: cookiesIn(headers), headers } as unknown as TokenRequest,
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
}

/** For pages, where the request is not at hand: asked once a request, however many components want to know. */
export const currentViewer = cache(async (): Promise<Viewer | null> => viewerOf(await headers()));

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
