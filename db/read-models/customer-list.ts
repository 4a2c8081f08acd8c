import type { Db } from '@/db/client';

export interface CustomerListItem {
  id: string;
  name: string;
  contact: string | null;
  email: string | null;
  machines: number;
}

/** The customers with the number of machines that each owns now. */
export const customerList = (db: Db): Promise<CustomerListItem[]> =>
  db('customers')
    .orderBy(['name', 'id'])
    .select({
      id: 'id',
      name: 'name',
      contact: 'contact',
      email: 'email',
      machines: db('machine_owners')
        .whereRaw('machine_owners.organisation_id = customers.organisation_id')
        .whereRaw('machine_owners.customer_id = customers.id')
        .whereNull('until_date')
        .select(db.raw('count(*)::int')),
    });
