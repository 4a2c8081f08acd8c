import type { Knex } from 'knex';
import { recordEvent } from '@/db/queries/audit';
import { insertOwner } from '@/db/queries/machine-owners';
import { insertMachine } from '@/db/queries/machines';
import { type MachineView, machineView } from '@/db/read-models/machine-view';
import type { Viewer } from '@/lib/auth/viewer';
import { todayIn } from '@/lib/dates';
import { invalid } from '@/lib/errors';
import type { MachineFields } from '@/lib/schemas/machine';

/** Registers a machine; the customer that was named is its first owner and sees all that is measured from now on. */
export async function registerMachine(
  trx: Knex.Transaction,
  viewer: Viewer,
  form: MachineFields,
): Promise<MachineView> {
  const { customerId, ...machine } = form;
  if (customerId && !(await trx('customers').where({ id: customerId }).first('id'))) {
    throw invalid([{ pointer: '/customerId', detail: 'There is no such customer.' }]);
  }
  const id = await insertMachine(trx, machine);
  if (customerId) {
    await insertOwner(trx, { machineId: id, customerId, fromDate: todayIn(viewer.timeZone), seesHistory: true });
  }
  const { manufacturer, model, serialNumber } = machine;
  const detail = { manufacturer, model, serialNumber, customerId };
  await recordEvent(trx, viewer, { action: 'machine.registered', subjectType: 'machine', subjectId: id, detail });
  const view = await machineView(trx, id);
  if (!view) throw new Error('The machine that was registered is not there.');
  return view;
}
