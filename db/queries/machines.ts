import type { Db } from '@/db/client';
import { newId } from '@/lib/id';
import type { MachineChange, MachineFields } from '@/lib/schemas/machine';
import type { MakeUp } from '@/lib/schemas/make-up';
import { foldSerial } from '@/lib/schemas/serial-number';

export interface MachineRow {
  id: string;
  manufacturer: string;
  model: string;
  serialNumber: string;
  year: number | null;
  control: string | null;
  site: string | null;
  kind: MakeUp['kind'];
  makeUp: MakeUp;
  nameplateFileId: string | null;
  version: number;
}

const columns = {
  id: 'id',
  manufacturer: 'manufacturer',
  model: 'model',
  serialNumber: 'serial_number',
  year: 'year',
  control: 'control',
  site: 'site',
  kind: 'kind',
  makeUp: 'make_up',
  nameplateFileId: 'nameplate_file_id',
  version: 'version',
};

export const findMachine = (db: Db, id: string): Promise<MachineRow | undefined> =>
  db('machines').where({ id }).first(columns);

export async function insertMachine(db: Db, machine: Omit<MachineFields, 'customerId'>): Promise<string> {
  const id = newId();
  await db('machines').insert({
    organisation_id: db.raw('app_organisation()'),
    id,
    ...changedColumns(machine),
  });
  return id;
}

/** Answers false when somebody else changed the machine meanwhile. */
export async function updateMachine(db: Db, id: string, version: number, change: MachineChange): Promise<boolean> {
  const changed = await db('machines')
    .where({ id, version })
    .update({ ...changedColumns(change), version: version + 1 });
  return changed === 1;
}

/** Only what was given; the folded serial number and the kind follow from what they are made of. */
function changedColumns(change: MachineChange) {
  const all = {
    manufacturer: change.manufacturer,
    model: change.model,
    serial_number: change.serialNumber,
    serial_folded: change.serialNumber === undefined ? undefined : foldSerial(change.serialNumber),
    year: change.year,
    control: change.control,
    site: change.site,
    kind: change.makeUp?.kind,
    make_up: change.makeUp === undefined ? undefined : JSON.stringify(change.makeUp),
  };
  return Object.fromEntries(Object.entries(all).filter(([, value]) => value !== undefined));
}
