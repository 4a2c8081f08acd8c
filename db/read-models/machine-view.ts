import type { Db } from '@/db/client';
import { listOwners, type MachineOwner } from '@/db/queries/machine-owners';
import { findMachine, type MachineRow } from '@/db/queries/machines';

export interface MachineView extends MachineRow {
  /** The owner now; null where none is known or it is not the reader's to see. */
  customer: { id: string; name: string } | null;
  owners: MachineOwner[];
}

/** One machine with its owners. */
export async function machineView(db: Db, id: string): Promise<MachineView | undefined> {
  const machine = await findMachine(db, id);
  if (!machine) return undefined;
  const owners = await listOwners(db, id);
  const owner = owners.find(({ untilDate }) => untilDate === null);
  return { ...machine, customer: owner ? { id: owner.customerId, name: owner.customerName } : null, owners };
}
