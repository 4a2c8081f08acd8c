import { appDb, inScope, systemScope } from '@/db/client';
import { accountByEmail, createAccount, findToken, useToken as spendToken } from '@/db/queries/accounts';
import { recordEvent } from '@/db/queries/audit';
import { findInvitation, type InvitationRow, markInvitationAccepted } from '@/db/queries/invitations';
import { insertMember } from '@/db/queries/members';
import { ownOrganisation } from '@/db/queries/organisations';
import { hashPassword, passwordMatches } from '@/lib/auth/password';
import { tokenHash } from '@/lib/auth/token';
import { conflict, invalid, notFound } from '@/lib/errors';
import { parseOr422 } from '@/lib/http/problem';
import { newId } from '@/lib/id';
import { acceptance } from '@/lib/schemas/people';

export interface OpenInvitation {
  organisationId: string;
  organisationName: string;
  invitation: InvitationRow;
  /** The address has an account already: its own password is asked for, no new one. */
  hasAccount: boolean;
}

/** What a token leads to while it can still be accepted; nothing otherwise. */
export async function openInvitation(token: string): Promise<OpenInvitation | null> {
  const found = await findToken(appDb(), tokenHash(token));
  if (found?.purpose !== 'invitation' || found.usedAt || found.expiresAt <= new Date()) return null;
  return inScope(systemScope(found.organisationId), async (trx) => {
    const invitation = await findInvitation(trx, found.subjectId);
    if (!invitation || invitation.acceptedAt || invitation.revokedAt) return null;
    const organisation = await ownOrganisation(trx);
    const account = await accountByEmail(trx, invitation.email);
    return {
      organisationId: organisation.id,
      organisationName: organisation.name,
      invitation,
      hasAccount: account !== undefined,
    };
  });
}

/**
 * Makes the invited person a member: with a new account, or with the account that the address has already when its password is right.
 * @throws DomainError when the invitation is no longer open or the password does not do
 */
export async function acceptInvitation(answer: {
  token: string;
  name: string;
  functionTitle: string | null;
  password: string;
}): Promise<{ email: string }> {
  const open = await openInvitation(answer.token);
  if (!open) throw notFound('open invitation');
  if (!open.hasAccount) parseOr422(acceptance, answer);
  const passwordHash = await hashPassword(answer.password);
  return inScope(systemScope(open.organisationId), async (trx) => {
    // The lock of this update lets one of two simultaneous answers through.
    if (!(await spendToken(trx, tokenHash(answer.token)))) throw notFound('open invitation');
    const { email, roles, customerId, id } = open.invitation;
    const known = await accountByEmail(trx, email);
    if (known && (known.disabled || !(await passwordMatches(known.passwordHash, answer.password)))) {
      throw invalid([{ pointer: '/password', detail: 'This is not the password of your account.' }]);
    }
    const accountId = known?.id ?? newId();
    if (!known && !(await createAccount(trx, { id: accountId, email, name: answer.name, passwordHash }))) {
      throw conflict('An account for this address was made a moment ago. Open the link once more.');
    }
    const { name, functionTitle } = answer;
    const memberId = await insertMember(trx, { accountId, email, name, functionTitle, roles, customerId });
    await markInvitationAccepted(trx, id);
    await recordEvent(
      trx,
      { accountId, name },
      { action: 'member.joined', subjectType: 'member', subjectId: memberId },
    );
    return { email };
  });
}
