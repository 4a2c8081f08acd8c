import { appDb, inScope } from '@/db/client';
import { createAccount } from '@/db/queries/accounts';
import { own } from '@/db/queries/jobs';
import { demoPassword } from '@/lib/auth/demo-accounts';
import { hashPassword } from '@/lib/auth/password';
import type { Role } from '@/lib/auth/permissions';
import type { Viewer } from '@/lib/auth/viewer';
import { newId } from '@/lib/id';

interface DemoMember {
  email: string;
  name: string;
  functionTitle: string;
  roles: Role[];
  customer?: string;
}

export const quillmereMembers: DemoMember[] = [
  {
    email: 'admin@quillmere.example',
    name: 'M. Sandiford',
    functionTitle: 'quality manager',
    roles: ['administrator'],
  },
  { email: 'reviewer@quillmere.example', name: 'J. Penhale', functionTitle: 'lead engineer', roles: ['reviewer'] },
  { email: 'inspector@quillmere.example', name: 'T. Orrell', functionTitle: 'service engineer', roles: ['inspector'] },
  {
    email: 'customer@ashdown.example',
    name: 'C. Vale',
    functionTitle: 'production engineer',
    roles: ['customer'],
    customer: 'Ashdown Turned Parts',
  },
];

export const brackwaterMembers: DemoMember[] = [
  {
    email: 'admin@brackwater.example',
    name: 'R. Ferrand',
    functionTitle: 'owner',
    roles: ['administrator', 'reviewer', 'inspector'],
  },
];

export interface DemoOrganisation {
  organisationId: string;
  name: string;
  code: string;
  timeZone: string;
  addressLines: string[];
  contact: string;
  customers: string[];
  members: DemoMember[];
}

/** Adds customers and members of an organisation that exists; answers who is who. */
export async function addPeople(
  organisation: DemoOrganisation,
): Promise<{ viewers: Map<string, Viewer>; customers: Map<string, string> }> {
  const passwordHash = await hashPassword(demoPassword);
  const viewers = new Map<string, Viewer>();
  const customers = new Map(organisation.customers.map((name) => [name, newId()]));
  const scope = { organisationId: organisation.organisationId, accountId: newId(), customerId: null };
  await inScope(
    scope,
    async (trx) => {
      for (const [name, id] of customers) await trx('customers').insert({ organisation_id: own(trx), id, name });
      for (const member of organisation.members) {
        const accountId = newId();
        await createAccount(trx, { id: accountId, email: member.email, name: member.name, passwordHash });
        const membershipId = newId();
        const customerId = member.customer ? (customers.get(member.customer) ?? null) : null;
        await trx('memberships').insert({
          organisation_id: own(trx),
          id: membershipId,
          account_id: accountId,
          name: member.name,
          email: member.email,
          function_title: member.functionTitle,
          roles: member.roles,
          customer_id: customerId,
        });
        viewers.set(member.email, {
          accountId,
          organisationId: organisation.organisationId,
          membershipId,
          name: member.name,
          email: member.email,
          functionTitle: member.functionTitle,
          roles: member.roles,
          customerId,
          organisationName: organisation.name,
          organisationCode: organisation.code,
          timeZone: organisation.timeZone,
          setUpDone: true,
        });
      }
    },
    appDb(),
  );
  return { viewers, customers };
}
