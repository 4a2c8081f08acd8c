import { recordEvent } from '@/db/queries/audit';
import { removePlanTemplate } from '@/db/queries/plan-templates';
import { notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';

export const DELETE = route({
  action: 'job.manage',
  params: idParams,
  async handle({ trx, viewer, params }) {
    if (!(await removePlanTemplate(trx, params.id))) throw notFound('template');
    await recordEvent(trx, viewer, {
      action: 'plan-template.removed',
      subjectType: 'plan-template',
      subjectId: params.id,
    });
    return { status: 204 };
  },
});
