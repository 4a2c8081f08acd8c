import { listSignatures } from '@/db/queries/reports';
import { requestOrigin } from '@/lib/http/request-origin';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { signatureForm } from '@/lib/schemas/signature';
import { signReport } from '@/lib/services/sign-report';

export const GET = route({
  action: 'report.read',
  params: idParams,
  async handle({ trx, params }) {
    return { body: { items: await listSignatures(trx, params.id), next: null } };
  },
});

export const POST = route({
  action: ['report.sign', 'report.witness'],
  params: idParams,
  body: signatureForm,
  async handle({ trx, viewer, params, body, request }) {
    return { status: 201, body: await signReport(trx, viewer, params.id, body, requestOrigin(request)) };
  },
});
