import { inScope, systemScope } from '@/db/client';
import { createAccount, createFirstOrganisation } from '@/db/queries/accounts';
import { recordEvent } from '@/db/queries/audit';
import { insertMember } from '@/db/queries/members';
import { hashPassword } from '@/lib/auth/password';
import { conflict } from '@/lib/errors';
import { newId } from '@/lib/id';
import type { Founding } from '@/lib/schemas/organisation';

/** First start: organisation and first administrator, in one transaction and only while there is no organisation. */
export async function foundOrganisation(form: Founding): Promise<void> {
  const passwordHash = await hashPassword(form.password);
  const [organisationId, accountId] = [newId(), newId()];
  await inScope(systemScope(organisationId), async (trx) => {
    const { organisationName, code, timeZone, name, email } = form;
    if (!(await createFirstOrganisation(trx, { id: organisationId, name: organisationName, code, timeZone }))) {
      throw conflict('There is an organisation already. Sign in, or ask its administrator for an invitation.');
    }
    if (!(await createAccount(trx, { id: accountId, email, name, passwordHash }))) {
      throw conflict('There is an account for this address already.');
    }
    await insertMember(trx, {
      accountId,
      name,
      email,
      functionTitle: null,
      roles: ['administrator', 'reviewer', 'inspector'],
      customerId: null,
    });
    await recordEvent(
      trx,
      { accountId, name },
      { action: 'organisation.founded', subjectType: 'organisation', subjectId: organisationId },
    );
  });
}
