import type { Knex } from 'knex';
import { createToken } from '@/db/queries/accounts';
import { recordEvent } from '@/db/queries/audit';
import { insertInvitation, revokeInvitations } from '@/db/queries/invitations';
import { queueMail } from '@/db/queries/outbox';
import { newToken, tokenHash } from '@/lib/auth/token';
import type { Viewer } from '@/lib/auth/viewer';
import { env } from '@/lib/env';
import { DomainError, invalid } from '@/lib/errors';
import type { Invitation } from '@/lib/schemas/people';
import { invitationMail } from '@/templates/email/invitation';

const validDays = 7;

/** Notes the invitation and queues its mail; an earlier one to the same address stops working. Answers its id. */
export async function inviteMember(trx: Knex.Transaction, viewer: Viewer, wanted: Invitation): Promise<string> {
  if (await trx('memberships').where({ email: wanted.email }).first('id')) {
    const detail = 'Somebody with this address is a member already.';
    throw new DomainError(409, 'Taken already', detail, [{ pointer: '/email', detail }]);
  }
  if (wanted.customerId && !(await trx('customers').where({ id: wanted.customerId }).first('id'))) {
    throw invalid([{ pointer: '/customerId', detail: 'There is no such customer.' }]);
  }
  await revokeInvitations(trx, { email: wanted.email });
  const expiresAt = new Date(Date.now() + validDays * 86_400_000);
  const id = await insertInvitation(trx, { ...wanted, invitedBy: viewer.accountId, expiresAt });
  const token = newToken();
  await createToken(trx, { hash: tokenHash(token), purpose: 'invitation', subjectId: id, expiresAt });
  const mail = invitationMail({
    name: wanted.name,
    invitedBy: viewer.name,
    organisationName: viewer.organisationName,
    roles: wanted.roles,
    url: `${env.NEXTAUTH_URL}/invitation/${token}`,
    validDays,
  });
  await queueMail(trx, { to: wanted.email, ...mail });
  const detail = { email: wanted.email, roles: wanted.roles };
  await recordEvent(trx, viewer, { action: 'member.invited', subjectType: 'invitation', subjectId: id, detail });
  return id;
}
