import { z } from 'zod';
import { route } from '@/lib/http/route';
import { findTest } from '@/lib/services/tolerance-values';

/** One test, whole: what the program itself plans and judges by. */
export const GET = route({
  action: 'catalogue.read',
  params: z.object({ code: z.string().max(80), test: z.string().max(40) }),
  async handle({ trx, params }) {
    const found = await findTest(trx, params.code, params.test);
    const { tests: _, ...code } = found.code;
    return { body: { code, definition: found.test } };
  },
});
