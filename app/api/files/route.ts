import { z } from 'zod';
import { readBytes } from '@/lib/http/read-request';
import { route } from '@/lib/http/route';
import { keepFile } from '@/lib/services/keep-file';

const mostBytes = 15_000_000;

/** The bytes are the body; the kind and a name come with the address. */
export const POST = route({
  action: ['instrument.manage', 'machine.manage', 'sheet.measure'],
  query: z.object({ kind: z.enum(['certificate', 'nameplate', 'photo']), name: z.string().max(200).default('') }),
  async handle({ trx, viewer, query, request }) {
    const bytes = await readBytes(request, mostBytes);
    const id = await keepFile(trx, {
      organisationId: viewer.organisationId,
      kind: query.kind,
      name: query.name,
      bytes,
    });
    return { status: 201, body: { id } };
  },
});
