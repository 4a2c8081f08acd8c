import { machineView } from '@/db/read-models/machine-view';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { transfer } from '@/lib/schemas/machine';
import { transferMachine } from '@/lib/services/transfer-machine';

/** Hands the machine on to another owner. */
export const POST = route({
  action: 'machine.transfer',
  params: idParams,
  body: transfer,
  async handle({ trx, viewer, params, body }) {
    await transferMachine(trx, viewer, params.id, body);
    return { status: 201, body: await machineView(trx, params.id) };
  },
});
