import { route } from '@/lib/http/route';
import { newOwnVersion, ownDefinitionParams } from '@/lib/schemas/own-definition';
import { composeOwnVersion } from '@/lib/services/own-definitions';

/** A new version made from the one that If-Match names. Sheets that were planned keep theirs. */
export const POST = route({
  action: 'catalogue.compose',
  params: ownDefinitionParams,
  body: newOwnVersion,
  needsVersion: true,
  async handle({ trx, viewer, params, body, expectedVersion }) {
    const definition = await composeOwnVersion(trx, viewer, params.id, expectedVersion, body.form);
    return { status: 201, body: { definition }, version: definition.version };
  },
});
