import { z } from 'zod';
import { recordEvent } from '@/db/queries/audit';
import { route } from '@/lib/http/route';
import { id, idParams } from '@/lib/schemas/common';
import { linkAsLeft } from '@/lib/services/link-as-left';

/** Sheets with nothing to be done: as left is declared to be as found, reading for reading. */
export const POST = route({
  action: 'sheet.measure',
  params: idParams,
  body: z.object({ sheetIds: z.array(id).min(1, 'Choose at least one sheet.').max(500) }),
  async handle({ trx, viewer, params, body }) {
    const linked = await linkAsLeft(trx, viewer, params.id, body.sheetIds);
    await recordEvent(trx, viewer, {
      action: 'sheet.linked',
      subjectType: 'job',
      subjectId: params.id,
      detail: { sheets: linked },
    });
    return { body: { linked } };
  },
});
