import { newestOwnDefinitions } from '@/db/queries/own-definitions';
import { route } from '@/lib/http/route';
import { newOwnDefinition } from '@/lib/schemas/own-definition';
import { composeOwnTest } from '@/lib/services/own-definitions';

/** The organisation's own tests, each with its newest version; withdrawn ones are said to be so. */
export const GET = route({
  action: 'catalogue.read',
  async handle({ trx }) {
    const items = (await newestOwnDefinitions(trx)).map(({ definitionId, version, withdrawn, definition }) => ({
      ...{ id: definitionId, version, withdrawn },
      definition,
    }));
    return { body: { items, next: null } };
  },
});

export const POST = route({
  action: 'catalogue.compose',
  body: newOwnDefinition,
  async handle({ trx, viewer, body }) {
    const definition = await composeOwnTest(trx, viewer, body.id, body.form);
    return { status: 201, body: { definition }, headers: { location: `/api/catalogue/own/${definition.id}` } };
  },
});
