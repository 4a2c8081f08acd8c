import { recordEvent } from '@/db/queries/audit';
import { findCustomer, updateCustomer } from '@/db/queries/customers';
import { changedMeanwhile, notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { customerChange } from '@/lib/schemas/customer';

export const GET = route({
  action: 'customer.list',
  params: idParams,
  async handle({ trx, params }) {
    const customer = await findCustomer(trx, params.id);
    if (!customer) throw notFound('customer');
    return { body: customer, version: customer.version };
  },
});

export const PATCH = route({
  action: 'customer.manage',
  params: idParams,
  body: customerChange,
  needsVersion: true,
  async handle({ trx, viewer, params, body, expectedVersion }) {
    if (!(await findCustomer(trx, params.id))) throw notFound('customer');
    if (!(await updateCustomer(trx, params.id, expectedVersion, body))) throw changedMeanwhile();
    const event = { action: 'customer.changed', subjectType: 'customer', subjectId: params.id, detail: body } as const;
    await recordEvent(trx, viewer, event);
    const customer = await findCustomer(trx, params.id);
    return { body: customer, version: customer?.version };
  },
});
