import { recordEvent } from '@/db/queries/audit';
import { findMachine, updateMachine } from '@/db/queries/machines';
import { machineView } from '@/db/read-models/machine-view';
import { changedMeanwhile, notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { machineChange } from '@/lib/schemas/machine';

export const GET = route({
  action: 'machine.read',
  params: idParams,
  async handle({ trx, params }) {
    const machine = await machineView(trx, params.id);
    if (!machine) throw notFound('machine');
    return { body: machine, version: machine.version };
  },
});

/** Nameplate and make-up. Jobs keep the make-up with which their plan was made. */
export const PATCH = route({
  action: 'machine.manage',
  params: idParams,
  body: machineChange,
  needsVersion: true,
  async handle({ trx, viewer, params, body, expectedVersion }) {
    const before = await findMachine(trx, params.id);
    if (!before) throw notFound('machine');
    if (!(await updateMachine(trx, params.id, expectedVersion, body))) throw changedMeanwhile();
    await recordEvent(trx, viewer, {
      action: 'machine.changed',
      subjectType: 'machine',
      subjectId: params.id,
      detail: { before, change: body },
    });
    const machine = await machineView(trx, params.id);
    return { body: machine, version: machine?.version };
  },
});
