import { jobBoard } from '@/db/read-models/job-board';
import { notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { checkFindings } from '@/lib/reporting/check-findings';
import { idParams } from '@/lib/schemas/common';

export const GET = route({
  action: 'job.read',
  params: idParams,
  async handle({ trx, viewer, params }) {
    const board = await jobBoard(trx, params.id);
    if (!board) throw notFound('job');
    return { body: { findings: checkFindings(board, viewer.timeZone) }, version: board.job.version };
  },
});
