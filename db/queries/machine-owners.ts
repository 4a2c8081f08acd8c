import type { Db } from '@/db/client';
import { newId } from '@/lib/id';

export interface MachineOwner {
  customerId: string;
  customerName: string;
  fromDate: string;
  /** Owned up to, not including, this day; null while it lasts. */
  untilDate: string | null;
  seesHistory: boolean;
}

/** Newest first; the first one without an end is the owner now. */
export const listOwners = (db: Db, machineId: string): Promise<MachineOwner[]> =>
  db('machine_owners')
    .join('customers', (on) =>
      on
        .on('customers.organisation_id', 'machine_owners.organisation_id')
        .andOn('customers.id', 'machine_owners.customer_id'),
    )
    .where('machine_owners.machine_id', machineId)
    .orderBy([
      { column: 'machine_owners.from_date', order: 'desc' },
      { column: 'machine_owners.id', order: 'desc' },
    ])
    .select({
      customerId: 'machine_owners.customer_id',
      customerName: 'customers.name',
      fromDate: 'machine_owners.from_date',
      untilDate: 'machine_owners.until_date',
      seesHistory: 'machine_owners.sees_history',
    });

export async function insertOwner(
  db: Db,
  owner: { machineId: string; customerId: string; fromDate: string; seesHistory: boolean },
): Promise<void> {
  await db('machine_owners').insert({
    organisation_id: db.raw('app_organisation()'),
    id: newId(),
    machine_id: owner.machineId,
    customer_id: owner.customerId,
    from_date: owner.fromDate,
    sees_history: owner.seesHistory,
  });
}

/** Ends the ownership that lasts. */
export const endOwnership = (db: Db, machineId: string, untilDate: string): Promise<number> =>
  db('machine_owners').where({ machine_id: machineId }).whereNull('until_date').update({ until_date: untilDate });
