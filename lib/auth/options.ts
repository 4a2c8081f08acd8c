import type { NextAuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { appDb } from '@/db/client';
import { accountByEmail, accountMemberships, clearAttempts, takeAttempt } from '@/db/queries/accounts';
import { passwordMatches } from '@/lib/auth/password';
import { env } from '@/lib/env';

declare module 'next-auth' {
  interface User {
    organisationId: string;
    sessionVersion: number;
  }
}
declare module 'next-auth/jwt' {
  interface JWT {
    organisationId?: string;
    sessionVersion?: number;
  }
}

/** Five quick failures, then one attempt every 20 seconds: slowed down, never locked out for good. */
const attempts = { capacity: 5, refillPerSecond: 1 / 20 };
/** One address tries many accounts: room for a whole workshop behind one router, not for a list of stolen passwords. */
const attemptsFrom = { capacity: 60, refillPerSecond: 1 / 2 };

const addressOf = (request: { headers?: Record<string, string> } | undefined): string =>
  request?.headers?.['x-forwarded-for']?.split(',')[0]?.trim() || 'unknown';

/** @throws an error that the sign-in page turns into "wait n seconds" */
async function refuseTooMany(bucket: string, limit: { capacity: number; refillPerSecond: number }): Promise<void> {
  const waitSeconds = await takeAttempt(appDb(), bucket, limit.capacity, limit.refillPerSecond);
  if (waitSeconds > 0) throw new Error(`wait:${Math.ceil(waitSeconds)}`);
}

/**
 * Sign-in by e-mail and password. The session is a signed cookie (the library's credentials need that); its version is compared with
 * the database's at every request, so that disabling somebody or ending sessions holds from the next request on.
 */
export const authOptions = (): NextAuthOptions => ({
  secret: env.NEXTAUTH_SECRET,
  session: { strategy: 'jwt', maxAge: 12 * 3600, updateAge: 1800 },
  pages: { signIn: '/sign-in', error: '/sign-in' },
  providers: [
    CredentialsProvider({
      credentials: { email: { type: 'email' }, password: { type: 'password' } },
      async authorize(credentials, request) {
        const email = credentials?.email?.trim().toLowerCase() ?? '';
        const password = credentials?.password ?? '';
        if (email.length > 320 || password.length > 1000) return null;
        const bucket = `sign-in:${email}`;
        await refuseTooMany(`sign-in-from:${addressOf(request)}`, attemptsFrom);
        await refuseTooMany(bucket, attempts);
        const account = await accountByEmail(appDb(), email);
        if (!(await passwordMatches(account?.passwordHash, password)) || !account || account.disabled) return null;
        const [first] = await accountMemberships(appDb(), account.id);
        if (!first) return null;
        await clearAttempts(appDb(), bucket);
        return {
          id: account.id,
          email,
          name: account.name,
          organisationId: first.organisationId,
          sessionVersion: account.sessionVersion,
        };
      },
    }),
  ],
  callbacks: {
    async jwt({ token, user, trigger, session }) {
      if (user) {
        token.sub = user.id;
        token.organisationId = user.organisationId;
        token.sessionVersion = user.sessionVersion;
      }
      // Changing the organisation: only to one in which the account is a member.
      if (trigger === 'update' && token.sub && typeof session?.organisationId === 'string') {
        const wanted = session.organisationId;
        const mine = await accountMemberships(appDb(), token.sub);
        if (mine.some((membership) => membership.organisationId === wanted)) token.organisationId = wanted;
      }
      return token;
    },
  },
});
