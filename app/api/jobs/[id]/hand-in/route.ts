import { recordEvent } from '@/db/queries/audit';
import { lockJob, setJobState } from '@/db/queries/jobs';
import { conflict, notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';

/** The inspector hands the job to the office for the check. Readings can still be put right until the report is out. */
export const POST = route({
  action: 'job.manage',
  params: idParams,
  async handle({ trx, viewer, params }) {
    const job = await lockJob(trx, params.id);
    if (!job) throw notFound('job');
    if (job.state !== 'open') throw conflict('This job has been handed in already.');
    if (!job.planMadeAt) throw conflict('Make the plan first.');
    await setJobState(trx, params.id, 'in-check');
    await recordEvent(trx, viewer, {
      action: 'job.changed',
      subjectType: 'job',
      subjectId: params.id,
      detail: { state: 'in-check' },
    });
    return { body: { state: 'in-check' } };
  },
});
