import type { Db } from '@/db/client';
import type { Role } from '@/lib/auth/permissions';
import { newId } from '@/lib/id';

export interface Member {
  id: string;
  accountId: string;
  name: string;
  email: string;
  functionTitle: string | null;
  roles: Role[];
  customerId: string | null;
  customerName: string | null;
  disabledAt: Date | null;
  version: number;
}

const columns = {
  id: 'memberships.id',
  accountId: 'memberships.account_id',
  name: 'memberships.name',
  email: 'memberships.email',
  functionTitle: 'memberships.function_title',
  roles: 'memberships.roles',
  customerId: 'memberships.customer_id',
  customerName: 'customers.name',
  disabledAt: 'memberships.disabled_at',
  version: 'memberships.version',
};

const members = (db: Db) =>
  db('memberships').leftJoin('customers', (on) =>
    on.on('customers.organisation_id', 'memberships.organisation_id').andOn('customers.id', 'memberships.customer_id'),
  );

export const listMembers = (db: Db): Promise<Member[]> =>
  members(db).orderBy(['memberships.disabled_at', 'memberships.name', 'memberships.id']).select(columns);

export const findMember = (db: Db, id: string): Promise<Member | undefined> =>
  members(db).where('memberships.id', id).first(columns);

export async function insertMember(
  db: Db,
  member: {
    accountId: string;
    name: string;
    email: string;
    functionTitle: string | null;
    roles: Role[];
    customerId: string | null;
  },
): Promise<string> {
  const id = newId();
  await db('memberships').insert({
    organisation_id: db.raw('app_organisation()'),
    id,
    account_id: member.accountId,
    name: member.name,
    email: member.email,
    function_title: member.functionTitle,
    roles: member.roles,
    customer_id: member.customerId,
  });
  return id;
}

/** Answers false when somebody else changed the member meanwhile. */
export async function updateMember(
  db: Db,
  id: string,
  version: number,
  change: { name?: string; functionTitle?: string | null; roles?: Role[]; disabled?: boolean },
): Promise<boolean> {
  const changed = await db('memberships')
    .where({ id, version })
    .update({
      version: version + 1,
      ...(change.name === undefined ? {} : { name: change.name }),
      ...(change.functionTitle === undefined ? {} : { function_title: change.functionTitle }),
      ...(change.roles === undefined ? {} : { roles: change.roles }),
      ...(change.disabled === undefined ? {} : { disabled_at: change.disabled ? db.fn.now() : null }),
    });
  return changed === 1;
}

/** Ids of those who can manage members; locked, so that two of them cannot disable each other at the same moment. */
export const lockActiveAdministrators = (db: Db): Promise<string[]> =>
  db('memberships')
    .whereNull('disabled_at')
    .whereRaw(`'administrator' = any (roles)`)
    .orderBy('id')
    .forUpdate()
    .pluck('id');
