import { findMachine } from '@/db/queries/machines';
import { machineHistory } from '@/db/read-models/machine-history';
import { notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';

/** Jobs, reports, and how each test drifted over the signed ones. */
export const GET = route({
  action: 'machine.read',
  params: idParams,
  async handle({ trx, params }) {
    if (!(await findMachine(trx, params.id))) throw notFound('machine');
    return { body: await machineHistory(trx, params.id) };
  },
});
