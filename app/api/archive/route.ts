import { z } from 'zod';
import { archiveSearch } from '@/db/read-models/archive-search';
import { nextLink } from '@/lib/http/next-link';
import { route } from '@/lib/http/route';

const query = z.object({
  q: z.string('Write what you look for.').trim().min(1, 'Write what you look for.').max(200, 'At most 200 characters.'),
  after: z.string().max(600).optional(),
});

/** By serial number and more; see the read model for the order. */
export const GET = route({
  action: 'archive.search',
  query,
  async handle({ trx, query: { q, after }, request }) {
    const page = await archiveSearch(trx, { q, after, limit: 20 });
    return { body: page, headers: nextLink(request, page.next) };
  },
});
