import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { handIn } from '@/lib/services/hand-in';

export const POST = route({
  action: 'job.manage',
  params: idParams,
  async handle({ trx, viewer, params }) {
    await handIn(trx, viewer, params.id);
    return { body: { state: 'in-check' } };
  },
});
