import { z } from 'zod';
import { recordEvent } from '@/db/queries/audit';
import { lockJob, setJobState } from '@/db/queries/jobs';
import { conflict, notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams, line } from '@/lib/schemas/common';

/** Opens a job again after its report is out; what was issued stays, the next report is a new revision. */
export const POST = route({
  action: 'report.issue',
  params: idParams,
  body: z.object({ reason: line('The reason', 500) }),
  async handle({ trx, viewer, params, body }) {
    const job = await lockJob(trx, params.id);
    if (!job) throw notFound('job');
    if (job.state === 'open') throw conflict('This job is open already.');
    await setJobState(trx, params.id, 'open');
    await recordEvent(trx, viewer, {
      action: 'job.changed',
      subjectType: 'job',
      subjectId: params.id,
      detail: { reopened: body.reason, was: job.state },
    });
    return { body: { state: 'open' } };
  },
});
