import type { Db } from '@/db/client';
import type { Role } from '@/lib/auth/permissions';

/** Accounts, tokens and throttles stand outside row-level security; only these named functions reach them (db/global-tables.ts). */

export interface AccountForSignIn {
  id: string;
  name: string;
  passwordHash: string | null;
  sessionVersion: number;
  disabled: boolean;
}

export async function accountByEmail(db: Db, email: string): Promise<AccountForSignIn | undefined> {
  const { rows } = await db.raw(
    `select id, name, password_hash as "passwordHash", session_version as "sessionVersion", disabled from account_by_email(?)`,
    [email],
  );
  return rows[0];
}

export interface AccountMembership {
  organisationId: string;
  organisationName: string;
  roles: Role[];
}

export async function accountMemberships(db: Db, accountId: string): Promise<AccountMembership[]> {
  const { rows } = await db.raw(
    `select organisation_id as "organisationId", organisation_name as "organisationName", roles from account_memberships(?)`,
    [accountId],
  );
  return rows;
}

export interface AccountSession {
  email: string;
  sessionVersion: number;
  accountDisabled: boolean;
  membershipId: string;
  memberName: string;
  functionTitle: string | null;
  roles: Role[];
  customerId: string | null;
  memberDisabled: boolean;
  organisationName: string;
  organisationCode: string;
  timeZone: string;
  setUpDone: boolean;
}

export async function accountSession(
  db: Db,
  accountId: string,
  organisationId: string,
): Promise<AccountSession | undefined> {
  const { rows } = await db.raw(
    `select email, session_version as "sessionVersion", account_disabled as "accountDisabled", membership_id as "membershipId",
            member_name as "memberName", function_title as "functionTitle", roles, customer_id as "customerId",
            member_disabled as "memberDisabled", organisation_name as "organisationName", organisation_code as "organisationCode",
            time_zone as "timeZone", set_up_done as "setUpDone"
       from account_session(?, ?)`,
    [accountId, organisationId],
  );
  return rows[0];
}

/** Answers false when the address is taken. */
export async function createAccount(
  db: Db,
  account: { id: string; email: string; name: string; passwordHash: string },
): Promise<boolean> {
  const { rows } = await db.raw('select account_create(?, ?, ?, ?) as id', [
    account.id,
    account.email,
    account.name,
    account.passwordHash,
  ]);
  return rows[0].id !== null;
}

export const endSessions = (db: Db, accountId: string) => db.raw('select account_end_sessions(?)', [accountId]);

/** Takes one attempt out of a bucket; answers the seconds to wait, 0 when the attempt may go on. */
export async function takeAttempt(db: Db, bucket: string, capacity: number, refillPerSecond: number): Promise<number> {
  const { rows } = await db.raw('select throttle_take(?, ?, ?) as wait', [bucket, capacity, refillPerSecond]);
  return rows[0].wait;
}

export const clearAttempts = (db: Db, bucket: string) => db.raw('select throttle_clear(?)', [bucket]);

export async function createToken(
  db: Db,
  token: { hash: string; purpose: 'invitation' | 'signing'; subjectId: string; expiresAt: Date },
): Promise<void> {
  await db.raw('select access_token_create(?, ?, ?, ?)', [token.hash, token.purpose, token.subjectId, token.expiresAt]);
}

export interface FoundToken {
  organisationId: string;
  purpose: 'invitation' | 'signing';
  subjectId: string;
  expiresAt: Date;
  usedAt: Date | null;
}

export async function findToken(db: Db, hash: string): Promise<FoundToken | undefined> {
  const { rows } = await db.raw(
    `select organisation_id as "organisationId", purpose, subject_id as "subjectId", expires_at as "expiresAt", used_at as "usedAt"
       from access_token_find(?)`,
    [hash],
  );
  return rows[0];
}

/** True exactly once. */
export async function useToken(db: Db, hash: string): Promise<boolean> {
  const { rows } = await db.raw('select access_token_use(?) as used', [hash]);
  return rows[0].used;
}

export async function firstOrganisationNeeded(db: Db): Promise<boolean> {
  const { rows } = await db.raw('select first_organisation_needed() as needed');
  return rows[0].needed;
}

export async function createFirstOrganisation(
  db: Db,
  organisation: { id: string; name: string; code: string; timeZone: string },
): Promise<boolean> {
  const { rows } = await db.raw('select first_organisation_create(?, ?, ?, ?) as done', [
    organisation.id,
    organisation.name,
    organisation.code,
    organisation.timeZone,
  ]);
  return rows[0].done;
}
