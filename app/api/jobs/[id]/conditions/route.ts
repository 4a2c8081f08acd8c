import { findJob, updateConditions } from '@/db/queries/jobs';
import { changedMeanwhile, notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { conditionsForm } from '@/lib/schemas/job';

export const PUT = route({
  action: 'job.manage',
  params: idParams,
  body: conditionsForm,
  needsVersion: true,
  async handle({ trx, params, body, expectedVersion }) {
    if (!(await findJob(trx, params.id))) throw notFound('job');
    if (!(await updateConditions(trx, params.id, expectedVersion, body))) throw changedMeanwhile();
    return { body: { version: expectedVersion + 1 }, version: expectedVersion + 1 };
  },
});
