import { ownDefinitionHistory } from '@/db/queries/own-definitions';
import { notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { ownDefinitionParams } from '@/lib/schemas/own-definition';

/** One own test with everything that was ever written of it, newest first. */
export const GET = route({
  action: 'catalogue.read',
  params: ownDefinitionParams,
  async handle({ trx, params }) {
    const history = await ownDefinitionHistory(trx, params.id);
    const [newest] = history;
    if (!newest) throw notFound('own test');
    const definition = history.find((row) => row.definition)?.definition ?? null;
    return {
      body: {
        ...{ id: params.id, version: newest.version, withdrawn: newest.withdrawn, definition },
        history: history.map(({ version, withdrawn, definition: written, composed, accountName, recordedAt }) => ({
          ...{ version, withdrawn, definition: written, composed, by: accountName, at: recordedAt },
        })),
      },
      version: newest.version,
    };
  },
});
