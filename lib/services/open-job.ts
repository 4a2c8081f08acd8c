import type { Db } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import { insertJob } from '@/db/queries/jobs';
import type { Viewer } from '@/lib/auth/viewer';
import { invalid } from '@/lib/errors';
import type { JobForm } from '@/lib/schemas/job';
import type { MakeUp } from '@/lib/schemas/make-up';
import { codes } from '@/standards/registry';

/** Opens a job on a machine; it keeps the make-up and the editions that it began with. */
export async function openJob(db: Db, viewer: Viewer, form: JobForm): Promise<string> {
  const machine: { makeUp: MakeUp } | undefined = await db('machines')
    .where({ id: form.machineId })
    .first({ makeUp: 'make_up' });
  if (!machine) throw invalid([{ pointer: '/machineId', detail: 'Choose a registered machine.' }]);
  const customer = await db('customers').where({ id: form.customerId }).first('id');
  if (!customer) throw invalid([{ pointer: '/customerId', detail: 'Choose the customer.' }]);
  const id = await insertJob(db, {
    ...form,
    codes: codes().map(({ code, edition }) => ({ code, edition })),
    makeUp: machine.makeUp,
    createdBy: viewer.accountId,
  });
  await recordEvent(db, viewer, {
    action: 'job.opened',
    subjectType: 'job',
    subjectId: id,
    detail: { reference: form.reference },
  });
  return id;
}
