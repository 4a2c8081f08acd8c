import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { componentConditionsForm } from '@/lib/schemas/component-conditions';
import { keepComponentConditions } from '@/lib/services/keep-component-conditions';

/** What was opened: what the work did to each component of the machine. */
export const PUT = route({
  action: 'job.manage',
  params: idParams,
  body: componentConditionsForm,
  needsVersion: true,
  async handle({ trx, viewer, params, body, expectedVersion }) {
    await keepComponentConditions(trx, viewer, params.id, expectedVersion, body);
    return { body: { version: expectedVersion + 1 }, version: expectedVersion + 1 };
  },
});
