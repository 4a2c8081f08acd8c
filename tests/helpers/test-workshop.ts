import createKnex from 'knex';
import { appDb, inScope, type Scope, systemScope } from '@/db/client';
import { createAccount } from '@/db/queries/accounts';
import { insertCustomer } from '@/db/queries/customers';
import { insertMember } from '@/db/queries/members';
import { hashPassword } from '@/lib/auth/password';
import type { Role } from '@/lib/auth/permissions';
import { newId } from '@/lib/id';
import { cloneDatabase } from './clone-database';

export const testPassword = 'a witness of our own';

export interface TestPerson {
  accountId: string;
  memberId: string;
  organisationId: string;
  email: string;
}

export interface TestWorkshop {
  organisationId: string;
  customerId: string;
  otherCustomerId: string;
  people: Record<Role, TestPerson>;
  /** Administrator of another organisation. */
  stranger: TestPerson;
  ownerUrl: string;
  scope: Scope;
  close: () => Promise<void>;
}

/**
 * A database of its own with two small organisations, one person a role, two customers; the application's settings point to it.
 * Invented names only.
 */
export async function openTestWorkshop(): Promise<TestWorkshop> {
  const database = await cloneDatabase();
  process.env.APP_DATABASE_URL = database.appUrl;
  process.env.NEXTAUTH_SECRET = 'a secret of the tests, long enough';
  process.env.NEXTAUTH_URL = 'http://127.0.0.1:3000';
  const organisationId = await foundOrganisation(database.ownerUrl, 'Tarn Fitting', 'TFT');
  const strangersId = await foundOrganisation(database.ownerUrl, 'Moss Spindles', 'MSP');
  const [customerId, otherCustomerId] = await inScope(systemScope(organisationId), async (trx) => [
    await insertCustomer(trx, { name: 'Aldery Turned Parts', addressLines: [], contact: null, email: null }),
    await insertCustomer(trx, { name: 'Benn Valves', addressLines: [], contact: null, email: null }),
  ]);
  const person = (role: Role) =>
    addPerson(organisationId, `${role}@tarn.example`, [role], role === 'customer' ? (customerId ?? null) : null);
  return {
    organisationId,
    customerId: customerId ?? '',
    otherCustomerId: otherCustomerId ?? '',
    people: {
      administrator: await person('administrator'),
      reviewer: await person('reviewer'),
      inspector: await person('inspector'),
      customer: await person('customer'),
    },
    stranger: await addPerson(
      strangersId,
      'administrator@moss.example',
      ['administrator', 'reviewer', 'inspector'],
      null,
    ),
    ownerUrl: database.ownerUrl,
    scope: systemScope(organisationId),
    close: async () => {
      await appDb().destroy();
      globalThis.witnessmarkPool = undefined;
      await database.drop();
    },
  };
}

async function foundOrganisation(ownerUrl: string, name: string, code: string): Promise<string> {
  const owner = createKnex({ client: 'pg', connection: ownerUrl });
  const organisation_id = newId();
  try {
    await owner('organisations').insert({ organisation_id, name, code, time_zone: 'Europe/Berlin', set_up_done: true });
  } finally {
    await owner.destroy();
  }
  return organisation_id;
}

export async function addPerson(
  organisationId: string,
  email: string,
  roles: Role[],
  customerId: string | null,
): Promise<TestPerson> {
  const accountId = newId();
  const passwordHash = await hashPassword(testPassword);
  const name = email.split('@')[0] ?? email;
  const memberId = await inScope(systemScope(organisationId), async (trx) => {
    await createAccount(trx, { id: accountId, email, name, passwordHash });
    return insertMember(trx, { accountId, email, name, functionTitle: null, roles, customerId });
  });
  return { accountId, memberId, organisationId, email };
}
