import { recordEvent } from '@/db/queries/audit';
import { findInstrument, insertCalibration, listCalibrations } from '@/db/queries/instruments';
import { notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { calibrationFields } from '@/lib/schemas/instrument';

export const GET = route({
  action: 'instrument.read',
  params: idParams,
  async handle({ trx, params }) {
    if (!(await findInstrument(trx, params.id))) throw notFound('instrument');
    return { body: { items: await listCalibrations(trx, params.id), next: null } };
  },
});

/** A certificate is added; earlier ones stay, because reports name them. */
export const POST = route({
  action: 'instrument.manage',
  params: idParams,
  body: calibrationFields,
  async handle({ trx, viewer, params, body }) {
    if (!(await findInstrument(trx, params.id))) throw notFound('instrument');
    const id = await insertCalibration(trx, params.id, body);
    const event = { action: 'instrument.calibrated', subjectType: 'instrument', subjectId: params.id } as const;
    await recordEvent(trx, viewer, { ...event, detail: { calibrationId: id, ...body } });
    return { status: 201, body: { id, ...body } };
  },
});
