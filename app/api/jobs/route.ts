import { z } from 'zod';
import { listJobs } from '@/db/read-models/job-list';
import { route } from '@/lib/http/route';
import { jobForm } from '@/lib/schemas/job';
import { openJob } from '@/lib/services/open-job';

const query = z.object({
  state: z.enum(['open', 'in-check', 'issued', 'closed']).optional(),
  after: z.string().max(80).optional(),
});

export const GET = route({
  action: 'job.read',
  query,
  async handle({ trx, query: { state, after }, request }) {
    const page = await listJobs(trx, { state, after: after ?? null, limit: 50 });
    const headers: Record<string, string> = {};
    if (page.next) {
      const url = new URL(request.url);
      url.searchParams.set('after', page.next);
      headers.link = `<${url.pathname}${url.search}>; rel="next"`;
    }
    return { body: page, headers };
  },
});

export const POST = route({
  action: 'job.manage',
  body: jobForm,
  async handle({ trx, viewer, body }) {
    const id = await openJob(trx, viewer, body);
    return { status: 201, body: { id }, headers: { location: `/api/jobs/${id}` } };
  },
});
