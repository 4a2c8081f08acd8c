import type { Db } from '@/db/client';
import { newId } from '@/lib/id';
import type { CustomerFields } from '@/lib/schemas/customer';

export interface Customer extends CustomerFields {
  id: string;
  version: number;
}

const columns = {
  id: 'id',
  name: 'name',
  addressLines: 'address_lines',
  contact: 'contact',
  email: 'email',
  version: 'version',
};

export const listCustomers = (db: Db): Promise<Customer[]> => db('customers').orderBy(['name', 'id']).select(columns);

export const findCustomer = (db: Db, id: string): Promise<Customer | undefined> =>
  db('customers').where({ id }).first(columns);

export async function insertCustomer(db: Db, customer: CustomerFields): Promise<string> {
  const id = newId();
  await db('customers').insert({
    organisation_id: db.raw('app_organisation()'),
    id,
    name: customer.name,
    address_lines: customer.addressLines,
    contact: customer.contact,
    email: customer.email,
  });
  return id;
}

/** Answers false when somebody else changed the customer meanwhile. */
export async function updateCustomer(
  db: Db,
  id: string,
  version: number,
  change: Partial<CustomerFields>,
): Promise<boolean> {
  const columnsOf = {
    name: change.name,
    address_lines: change.addressLines,
    contact: change.contact,
    email: change.email,
  };
  const given = Object.fromEntries(Object.entries(columnsOf).filter(([, value]) => value !== undefined));
  const changed = await db('customers')
    .where({ id, version })
    .update({ ...given, version: version + 1 });
  return changed === 1;
}
