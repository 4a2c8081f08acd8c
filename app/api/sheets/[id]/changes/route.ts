import { listChanges } from '@/db/queries/operations';
import { listPasses } from '@/db/queries/passes';
import { findSheet } from '@/db/queries/sheets';
import { notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { correctedReadings } from '@/lib/reporting/corrected-readings';
import { idParams } from '@/lib/schemas/common';

/** Readings that were put right, by set: what stood there before is kept and shown. */
export const GET = route({
  action: 'job.read',
  params: idParams,
  async handle({ trx, params }) {
    if (!(await findSheet(trx, params.id))) throw notFound('sheet');
    const passIds = (await listPasses(trx, [params.id])).map((pass) => pass.id);
    const changes = await listChanges(trx, passIds);
    const items = passIds.flatMap((passId) =>
      correctedReadings(changes, passId).map((corrected) => ({ passId, ...corrected })),
    );
    return { body: { items, next: null } };
  },
});
