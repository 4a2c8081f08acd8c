import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { agreeToTolerance } from '@/lib/services/tolerance-values';

/** The second person agrees to a value that waits. */
export const POST = route({
  action: 'catalogue.agree',
  params: idParams,
  async handle({ trx, viewer, params }) {
    return { status: 201, body: await agreeToTolerance(trx, viewer, params.id) };
  },
});
