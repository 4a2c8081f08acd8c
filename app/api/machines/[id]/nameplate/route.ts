import { z } from 'zod';
import { recordEvent } from '@/db/queries/audit';
import { findFile } from '@/db/queries/reports';
import { invalid, notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { id, idParams } from '@/lib/schemas/common';

/** The photograph of the nameplate; an earlier one stays in the store. */
export const PUT = route({
  action: 'machine.manage',
  params: idParams,
  body: z.strictObject({ fileId: id }),
  async handle({ trx, viewer, params, body }) {
    if (!(await findFile(trx, body.fileId)))
      throw invalid([{ pointer: '/fileId', detail: 'Upload the picture first.' }]);
    const changed = await trx('machines').where({ id: params.id }).update({ nameplate_file_id: body.fileId });
    if (changed === 0) throw notFound('machine');
    await recordEvent(trx, viewer, {
      action: 'machine.changed',
      subjectType: 'machine',
      subjectId: params.id,
      detail: { nameplate: body.fileId },
    });
    return { body: { fileId: body.fileId } };
  },
});
