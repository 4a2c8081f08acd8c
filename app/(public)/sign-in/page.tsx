import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { SignInForm } from '@/components/people/sign-in-form';
import { PageTitle } from '@/components/ui/page-title';
import { appDb } from '@/db/client';
import { accountByEmail, firstOrganisationNeeded } from '@/db/queries/accounts';
import { demoAccounts, demoPassword } from '@/lib/auth/demo-accounts';
import { currentViewer } from '@/lib/auth/session';
import { env } from '@/lib/env';

export const metadata: Metadata = { title: 'Sign in' };

export default async function SignInPage() {
  if (await currentViewer()) redirect('/');
  if (await firstOrganisationNeeded(appDb())) redirect('/welcome');
  const isDemo = env.WITNESSMARK_DEMO === '1' && (await accountByEmail(appDb(), demoAccounts[0].email)) !== undefined;
  return (
    <>
      <PageTitle>Sign in</PageTitle>
      <SignInForm demo={isDemo ? { accounts: demoAccounts, password: demoPassword } : null} />
      <p className="mt-8">
        Without an account: the{' '}
        <Link href="/calculator" className="inline-flex min-h-11 items-center text-blue underline">
          calculator
        </Link>{' '}
        evaluates readings and shows every step.
      </p>
    </>
  );
}
