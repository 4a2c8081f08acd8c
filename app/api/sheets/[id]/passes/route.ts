import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { passForm } from '@/lib/schemas/job';
import { startPass } from '@/lib/services/start-pass';

export const POST = route({
  action: 'sheet.measure',
  params: idParams,
  body: passForm,
  async handle({ trx, viewer, params, body }) {
    const id = await startPass(trx, params.id, { kind: body.kind, linkTo: body.linkTo ?? null }, viewer);
    return { status: 201, body: { id } };
  },
});
