import { z } from 'zod';
import { route } from '@/lib/http/route';
import { id } from '@/lib/schemas/common';
import { passChange } from '@/lib/schemas/job';
import { changePass } from '@/lib/services/change-pass';

export const PATCH = route({
  action: 'sheet.measure',
  params: z.object({ id, passId: id }),
  body: passChange,
  needsVersion: true,
  async handle({ trx, viewer, params, body, expectedVersion }) {
    const version = await changePass(trx, viewer, { sheetId: params.id, passId: params.passId }, expectedVersion, body);
    return { body: { version }, version };
  },
});
