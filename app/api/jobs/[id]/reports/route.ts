import { z } from 'zod';
import { jobBoard } from '@/db/read-models/job-board';
import { notFound } from '@/lib/errors';
import { requestOrigin } from '@/lib/http/request-origin';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { issueReport } from '@/lib/services/issue-report';

export const GET = route({
  action: 'job.read',
  params: idParams,
  async handle({ trx, params }) {
    const board = await jobBoard(trx, params.id);
    if (!board) throw notFound('job');
    return { body: { items: board.reports, next: null } };
  },
});

export const POST = route({
  action: 'report.issue',
  params: idParams,
  body: z.object({ confirmed: z.boolean(), annex: z.boolean().default(false) }),
  async handle({ trx, viewer, params, body, request }) {
    const issued = await issueReport(trx, viewer, params.id, body, requestOrigin(request));
    return { status: 201, body: issued, headers: { location: `/api/reports/${issued.id}` } };
  },
});
