import type { Knex } from 'knex';
import { recordEvent } from '@/db/queries/audit';
import { endOwnership, insertOwner, listOwners } from '@/db/queries/machine-owners';
import { findMachine } from '@/db/queries/machines';
import type { Viewer } from '@/lib/auth/viewer';
import { invalid, notFound } from '@/lib/errors';
import type { Transfer } from '@/lib/schemas/machine';

/** The owner now owns it up to the day before; the new one from that day, with or without the reports of the years before. */
export async function transferMachine(
  trx: Knex.Transaction,
  viewer: Viewer,
  machineId: string,
  form: Transfer,
): Promise<void> {
  if (!(await findMachine(trx, machineId))) throw notFound('machine');
  if (!(await trx('customers').where({ id: form.customerId }).first('id'))) {
    throw invalid([{ pointer: '/customerId', detail: 'There is no such customer.' }]);
  }
  const now = (await listOwners(trx, machineId)).find(({ untilDate }) => untilDate === null);
  if (now?.customerId === form.customerId) {
    throw invalid([{ pointer: '/customerId', detail: `${now.customerName} owns it already.` }]);
  }
  if (now && form.fromDate <= now.fromDate) {
    throw invalid([
      { pointer: '/fromDate', detail: `${now.customerName} owns it since ${now.fromDate}; take a later day.` },
    ]);
  }
  await endOwnership(trx, machineId, form.fromDate);
  await insertOwner(trx, { machineId, ...form });
  const event = { action: 'machine.transferred', subjectType: 'machine', subjectId: machineId, detail: form } as const;
  await recordEvent(trx, viewer, event);
}
