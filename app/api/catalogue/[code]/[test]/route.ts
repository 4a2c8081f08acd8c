import { z } from 'zod';
import { notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { findCatalogueTest } from '@/lib/planning/catalogue';

/** One test, whole: what the program itself plans and judges by. */
export const GET = route({
  action: 'catalogue.read',
  params: z.object({ code: z.string().max(80), test: z.string().max(40) }),
  async handle({ params }) {
    const found = findCatalogueTest(params.code, params.test);
    if (!found) throw notFound('test');
    const { tests: _, ...code } = found.code;
    return { body: { code, definition: found.test } };
  },
});
