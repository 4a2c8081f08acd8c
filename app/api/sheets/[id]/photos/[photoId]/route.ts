import { z } from 'zod';
import { route } from '@/lib/http/route';
import { id } from '@/lib/schemas/common';
import { takePhotoAway } from '@/lib/services/add-photo';

export const DELETE = route({
  action: 'sheet.measure',
  params: z.object({ id, photoId: id }),
  async handle({ trx, viewer, params }) {
    await takePhotoAway(trx, viewer, params.id, params.photoId);
    return {};
  },
});
