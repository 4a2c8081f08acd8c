import { findReport, listSignatures } from '@/db/queries/reports';
import { notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';

export const GET = route({
  action: 'report.read',
  params: idParams,
  async handle({ trx, params }) {
    const report = await findReport(trx, params.id);
    if (!report) throw notFound('report');
    const { model, ...facts } = report;
    const signatures = await listSignatures(trx, params.id);
    return {
      body: { ...facts, model, signatures: signatures.map(({ ip: _ip, userAgent: _agent, ...rest }) => rest) },
      version: report.version,
    };
  },
});
