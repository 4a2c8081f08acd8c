import { recordEvent } from '@/db/queries/audit';
import { findJob } from '@/db/queries/jobs';
import { listExclusions } from '@/db/queries/plans';
import { listSheets } from '@/db/queries/sheets';
import { notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { planForm } from '@/lib/schemas/job';
import { makePlan } from '@/lib/services/make-plan';
import { planMaking } from '@/lib/services/plan-making';

/**
 * The planned sheets in working order. Before the plan is made, the proposals, each with its estimate of time and why it follows from
 * what was opened, and what the plan can begin from.
 */
export const GET = route({
  action: 'job.read',
  params: idParams,
  async handle({ trx, viewer, params }) {
    const job = await findJob(trx, params.id);
    if (!job) throw notFound('job');
    const nothing = { proposals: [], estimates: {}, follows: {}, starts: [] };
    return {
      body: {
        made: job.planMadeAt !== null,
        ...(job.planMadeAt ? nothing : await planMaking(trx, job, viewer.timeZone)),
        sheets: await listSheets(trx, params.id),
        exclusions: await listExclusions(trx, params.id),
      },
    };
  },
});

export const POST = route({
  action: 'job.manage',
  params: idParams,
  body: planForm,
  async handle({ trx, viewer, params, body }) {
    const made = await makePlan(trx, params.id, body);
    await recordEvent(trx, viewer, { action: 'plan.made', subjectType: 'job', subjectId: params.id, detail: made });
    return { status: 201, body: made };
  },
});
