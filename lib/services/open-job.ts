import type { Db } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import { insertJob } from '@/db/queries/jobs';
import { ownOrganisation } from '@/db/queries/organisations';
import { currentOwnDefinitions } from '@/db/queries/own-definitions';
import type { Viewer } from '@/lib/auth/viewer';
import { invalid } from '@/lib/errors';
import { newestEditions } from '@/lib/planning/newest-editions';
import { offeredCodes } from '@/lib/planning/offered-codes';
import type { JobForm } from '@/lib/schemas/job';
import type { MakeUp } from '@/lib/schemas/make-up';
import { sameCode, type TestCodeChoice } from '@/lib/schemas/test-codes';
import { codeTitle } from '@/standards/registry';

/** Opens a job on a machine; it keeps the make-up and the editions that it began with. */
export async function openJob(db: Db, viewer: Viewer, form: JobForm): Promise<string> {
  const machine: { makeUp: MakeUp } | undefined = await db('machines')
    .where({ id: form.machineId })
    .first({ makeUp: 'make_up' });
  if (!machine) throw invalid([{ pointer: '/machineId', detail: 'Choose a registered machine.' }]);
  const customer = await db('customers').where({ id: form.customerId }).first('id');
  if (!customer) throw invalid([{ pointer: '/customerId', detail: 'Choose the customer.' }]);
  const organisation = await ownOrganisation(db);
  const id = await insertJob(db, {
    ...form,
    codes: jobCodes(form.codes ?? organisation.codes, (await currentOwnDefinitions(db)).length > 0),
    refuseUnconfirmed: form.refuseUnconfirmed ?? organisation.refuseUnconfirmed,
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

/** The codes that were chosen, or the newest edition of each; each must be in the catalogue. Own tests are taken also while there are none. */
function jobCodes(chosen: TestCodeChoice | null, hasOwnTests: boolean): TestCodeChoice {
  const asChoice = (offered: ReturnType<typeof offeredCodes>) =>
    offered.map(({ code, edition }) => ({ code, edition }));
  const wanted = chosen ?? asChoice(newestEditions(offeredCodes(hasOwnTests)));
  const unknown = wanted.filter((one) => !asChoice(offeredCodes(true)).some((other) => sameCode(one, other)));
  if (unknown.length > 0) {
    const names = unknown.map(({ code, edition }) => codeTitle(code, edition)).join(', ');
    throw invalid([{ pointer: '/codes', detail: `Not in the catalogue: ${names}.` }]);
  }
  return wanted;
}
