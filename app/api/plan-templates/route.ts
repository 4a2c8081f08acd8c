import { listPlanTemplates } from '@/db/queries/plan-templates';
import { route } from '@/lib/http/route';
import { planTemplateForm, planTemplateQuery } from '@/lib/schemas/plan-template';
import { keepTemplateOf } from '@/lib/services/keep-plan-template';

/** Templates, newest first; of one maker and model where the query names them. */
export const GET = route({
  action: 'job.read',
  query: planTemplateQuery,
  async handle({ trx, query }) {
    return { body: { templates: await listPlanTemplates(trx, query) } };
  },
});

export const POST = route({
  action: 'job.manage',
  body: planTemplateForm,
  async handle({ trx, viewer, body }) {
    const id = await keepTemplateOf(trx, viewer, body);
    return { status: 201, body: { id }, headers: { location: `/api/plan-templates/${id}` } };
  },
});
