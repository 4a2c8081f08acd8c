import { findReport } from '@/db/queries/reports';
import { notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';

/** The machine-readable document, to the letter as it was hashed when it was issued. */
export const GET = route({
  action: 'report.read',
  params: idParams,
  async handle({ trx, params }) {
    const report = await findReport(trx, params.id);
    if (!report) throw notFound('report');
    const { model } = await trx('reports')
      .where({ id: params.id })
      .first({ model: trx.raw('model::text') });
    return {
      raw: { bytes: Buffer.from(model), contentType: 'application/json' },
      headers: { 'x-content-sha256': report.modelSha256 },
    };
  },
});
