import { z } from 'zod';
import { machineList } from '@/db/read-models/machine-list';
import { nextLink } from '@/lib/http/next-link';
import { route } from '@/lib/http/route';
import { id } from '@/lib/schemas/common';
import { machineFields } from '@/lib/schemas/machine';
import { registerMachine } from '@/lib/services/register-machine';

const query = z.object({ after: z.string().max(600).optional(), customer: id.optional() });

export const GET = route({
  action: 'machine.read',
  query,
  async handle({ trx, query: { after, customer }, request }) {
    const page = await machineList(trx, { after, ownerId: customer, limit: 50 });
    return { body: page, headers: nextLink(request, page.next) };
  },
});

export const POST = route({
  action: 'machine.manage',
  body: machineFields,
  async handle({ trx, viewer, body }) {
    const machine = await registerMachine(trx, viewer, body);
    const headers = { location: `/api/machines/${machine.id}` };
    return { status: 201, body: machine, version: machine.version, headers };
  },
});
