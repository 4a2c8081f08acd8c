import { z } from 'zod';
import { route } from '@/lib/http/route';
import { toleranceValuesForm } from '@/lib/schemas/tolerance-value';
import { findTest, sayOfTolerance, toleranceValuesOf } from '@/lib/services/tolerance-values';

const params = z.object({ code: z.string().max(80), test: z.string().max(40) });

/** Every figure of the test's tolerances with what the organisation says of it, and everything that was ever said. */
export const GET = route({
  action: 'catalogue.read',
  params,
  async handle({ trx, params: { code, test } }) {
    const found = await findTest(trx, code, test);
    const { id, edition, version } = found.test;
    return {
      body: {
        definition: { id, code: found.test.code, edition, version },
        ...(await toleranceValuesOf(trx, found.test)),
      },
    };
  },
});

/** Confirms, replaces or withdraws figures of one test. */
export const POST = route({
  action: 'catalogue.confirm',
  params,
  body: toleranceValuesForm,
  async handle({ trx, viewer, params: { code, test }, body }) {
    const found = await findTest(trx, code, test);
    await sayOfTolerance(trx, viewer, found.test, body);
    return { status: 201, body: await toleranceValuesOf(trx, found.test) };
  },
});
