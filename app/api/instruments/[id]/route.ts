import { recordEvent } from '@/db/queries/audit';
import { findInstrument, updateInstrument } from '@/db/queries/instruments';
import { instrumentView } from '@/db/read-models/instrument-view';
import { todayIn } from '@/lib/dates';
import { changedMeanwhile, notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { instrumentChange } from '@/lib/schemas/instrument';

export const GET = route({
  action: 'instrument.read',
  params: idParams,
  async handle({ trx, viewer, params }) {
    const instrument = await instrumentView(trx, params.id, todayIn(viewer.timeZone));
    if (!instrument) throw notFound('instrument');
    return { body: instrument, version: instrument.version };
  },
});

export const PATCH = route({
  action: 'instrument.manage',
  params: idParams,
  body: instrumentChange,
  needsVersion: true,
  async handle({ trx, viewer, params, body, expectedVersion }) {
    if (!(await findInstrument(trx, params.id))) throw notFound('instrument');
    if (!(await updateInstrument(trx, params.id, expectedVersion, body))) throw changedMeanwhile();
    const event = { action: 'instrument.changed', subjectType: 'instrument', subjectId: params.id } as const;
    await recordEvent(trx, viewer, { ...event, detail: body });
    const instrument = await instrumentView(trx, params.id, todayIn(viewer.timeZone));
    return { body: instrument, version: instrument?.version };
  },
});
