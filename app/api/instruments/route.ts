import { z } from 'zod';
import { recordEvent } from '@/db/queries/audit';
import { insertInstrument } from '@/db/queries/instruments';
import { instrumentList } from '@/db/read-models/instrument-list';
import { instrumentView } from '@/db/read-models/instrument-view';
import { todayIn } from '@/lib/dates';
import { nextLink } from '@/lib/http/next-link';
import { route } from '@/lib/http/route';
import { instrumentFields } from '@/lib/schemas/instrument';

export const GET = route({
  action: 'instrument.read',
  query: z.object({ after: z.string().max(600).optional() }),
  async handle({ trx, viewer, query: { after }, request }) {
    const page = await instrumentList(trx, { after, today: todayIn(viewer.timeZone), limit: 100 });
    return { body: page, headers: nextLink(request, page.next) };
  },
});

export const POST = route({
  action: 'instrument.manage',
  body: instrumentFields,
  async handle({ trx, viewer, body }) {
    const id = await insertInstrument(trx, body);
    const detail = { number: body.number, name: body.name };
    await recordEvent(trx, viewer, { action: 'instrument.added', subjectType: 'instrument', subjectId: id, detail });
    const instrument = await instrumentView(trx, id, todayIn(viewer.timeZone));
    return { status: 201, body: instrument, version: 1, headers: { location: `/api/instruments/${id}` } };
  },
});
