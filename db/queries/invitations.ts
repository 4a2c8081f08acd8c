import type { Db } from '@/db/client';
import type { Role } from '@/lib/auth/permissions';
import { newId } from '@/lib/id';

export interface InvitationRow {
  id: string;
  email: string;
  name: string;
  roles: Role[];
  customerId: string | null;
  expiresAt: Date;
  acceptedAt: Date | null;
  revokedAt: Date | null;
}

const columns = {
  id: 'id',
  email: 'email',
  name: 'name',
  roles: 'roles',
  customerId: 'customer_id',
  expiresAt: 'expires_at',
  acceptedAt: 'accepted_at',
  revokedAt: 'revoked_at',
};

/** Those that can still be accepted, newest first. */
export const listOpenInvitations = (db: Db): Promise<InvitationRow[]> =>
  db('invitations')
    .whereNull('accepted_at')
    .whereNull('revoked_at')
    .where('expires_at', '>', db.fn.now())
    .orderBy('id', 'desc')
    .select(columns);

export const findInvitation = (db: Db, id: string): Promise<InvitationRow | undefined> =>
  db('invitations').where({ id }).first(columns);

export async function insertInvitation(
  db: Db,
  invitation: {
    email: string;
    name: string;
    roles: Role[];
    customerId: string | null;
    invitedBy: string;
    expiresAt: Date;
  },
): Promise<string> {
  const id = newId();
  await db('invitations').insert({
    organisation_id: db.raw('app_organisation()'),
    id,
    email: invitation.email,
    name: invitation.name,
    roles: invitation.roles,
    customer_id: invitation.customerId,
    invited_by: invitation.invitedBy,
    expires_at: invitation.expiresAt,
  });
  return id;
}

/** A newer invitation, or an administrator, takes the earlier one back. Answers how many were open. */
export const revokeInvitations = (db: Db, which: { id: string } | { email: string }): Promise<number> =>
  db('invitations').where(which).whereNull('accepted_at').whereNull('revoked_at').update({ revoked_at: db.fn.now() });

export const markInvitationAccepted = (db: Db, id: string): Promise<number> =>
  db('invitations').where({ id }).update({ accepted_at: db.fn.now() });
