import { listPhotos } from '@/db/queries/sheet-photos';
import { findSheet } from '@/db/queries/sheets';
import { notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { sheetPhoto } from '@/lib/schemas/sheet-photo';
import { addPhoto } from '@/lib/services/add-photo';

export const GET = route({
  action: 'job.read',
  params: idParams,
  async handle({ trx, params }) {
    if (!(await findSheet(trx, params.id))) throw notFound('sheet');
    return { body: { items: await listPhotos(trx, [params.id]), next: null } };
  },
});

export const POST = route({
  action: 'sheet.measure',
  params: idParams,
  body: sheetPhoto,
  async handle({ trx, viewer, params, body }) {
    return { status: 201, body: { id: await addPhoto(trx, viewer, params.id, body) } };
  },
});
