import { jobBoard } from '@/db/read-models/job-board';
import { notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { jobChange } from '@/lib/schemas/job';
import { changeJob } from '@/lib/services/change-job';

export const GET = route({
  action: 'job.read',
  params: idParams,
  async handle({ trx, params }) {
    const board = await jobBoard(trx, params.id);
    if (!board) throw notFound('job');
    return { body: board, version: board.job.version };
  },
});

/** Before the plan is made. */
export const PATCH = route({
  action: 'job.manage',
  params: idParams,
  body: jobChange,
  needsVersion: true,
  async handle({ trx, viewer, params, body, expectedVersion }) {
    await changeJob(trx, viewer, params.id, expectedVersion, body);
    return { body: { version: expectedVersion + 1 }, version: expectedVersion + 1 };
  },
});
