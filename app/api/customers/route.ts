import { recordEvent } from '@/db/queries/audit';
import { insertCustomer, listCustomers } from '@/db/queries/customers';
import { route } from '@/lib/http/route';
import { customerFields } from '@/lib/schemas/customer';

export const GET = route({
  action: 'customer.list',
  async handle({ trx }) {
    return { body: { items: await listCustomers(trx), next: null } };
  },
});

export const POST = route({
  action: 'customer.manage',
  body: customerFields,
  async handle({ trx, viewer, body }) {
    const id = await insertCustomer(trx, body);
    const detail = { name: body.name };
    await recordEvent(trx, viewer, { action: 'customer.added', subjectType: 'customer', subjectId: id, detail });
    return { status: 201, body: { id, ...body }, version: 1 };
  },
});
