import { route } from '@/lib/http/route';
import { ownDefinitionParams } from '@/lib/schemas/own-definition';
import { withdrawOwnTest } from '@/lib/services/own-definitions';

/** Takes a test out of new plans; sheets that have it keep it. */
export const POST = route({
  action: 'catalogue.compose',
  params: ownDefinitionParams,
  async handle({ trx, viewer, params }) {
    return { status: 201, body: await withdrawOwnTest(trx, viewer, params.id) };
  },
});
