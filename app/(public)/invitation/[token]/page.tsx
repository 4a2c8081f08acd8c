import type { Metadata } from 'next';
import { AcceptanceForm } from '@/components/people/acceptance-form';
import { LinkButton } from '@/components/ui/button';
import { PageTitle } from '@/components/ui/page-title';
import { openInvitation } from '@/lib/services/accept-invitation';

export const metadata: Metadata = { title: 'Invitation', referrer: 'no-referrer' };

export default async function InvitationPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const open = await openInvitation(token);
  if (!open) {
    return (
      <>
        <PageTitle>This invitation is no longer open</PageTitle>
        <p className="max-w-prose">
          It was accepted already, taken back, or its seven days are over. Ask the person who invited you for a new one.
        </p>
        <div className="mt-5">
          <LinkButton href="/sign-in">Sign in</LinkButton>
        </div>
      </>
    );
  }
  const { organisationName, invitation, hasAccount } = open;
  return (
    <>
      <PageTitle>Join {organisationName}</PageTitle>
      <p className="mb-5 max-w-prose">
        You are invited as {invitation.roles.join(' and ')}, with the address{' '}
        <span className="font-mono">{invitation.email}</span>.
        {hasAccount && ' This address has an account already; sign in with its password.'}
      </p>
      <AcceptanceForm token={token} name={invitation.name} hasAccount={hasAccount} />
    </>
  );
}
