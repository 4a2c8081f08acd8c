import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { operationBatch } from '@/lib/schemas/operation';
import { keepReadings } from '@/lib/services/keep-readings';

/**
 * A batch of committed changes. Sent again it changes nothing: every operation carries its own id, and the answer of each is the one
 * that it had the first time.
 */
export const POST = route({
  action: 'sheet.measure',
  params: idParams,
  body: operationBatch,
  async handle({ trx, viewer, params, body }) {
    return {
      body: await keepReadings(trx, params.id, body.operations, { accountId: viewer.accountId, name: viewer.name }),
    };
  },
});
