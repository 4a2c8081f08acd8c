import type { Knex } from 'knex';
import { recordEvent } from '@/db/queries/audit';
import { findMember, lockActiveAdministrators, type Member, updateMember } from '@/db/queries/members';
import type { Viewer } from '@/lib/auth/viewer';
import { changedMeanwhile, conflict, invalid, notFound } from '@/lib/errors';
import type { MemberChange } from '@/lib/schemas/people';

/** Changes name, function, roles or the right to sign in; somebody who can manage members always remains. */
export async function changeMember(
  trx: Knex.Transaction,
  viewer: Viewer,
  id: string,
  version: number,
  change: MemberChange,
): Promise<Member> {
  const administrators = await lockActiveAdministrators(trx);
  const before = await findMember(trx, id);
  if (!before) throw notFound('member');
  if (change.roles && change.roles.includes('customer') !== before.roles.includes('customer')) {
    throw invalid([
      {
        pointer: '/roles',
        detail: 'A customer’s person does not become staff, nor the other way round. Send a new invitation.',
      },
    ]);
  }
  const staysAdministrator = !change.disabled && (change.roles ?? before.roles).includes('administrator');
  if (!staysAdministrator && administrators.length === 1 && administrators[0] === id) {
    throw conflict('This is the last administrator. Make somebody else an administrator first.');
  }
  if (!(await updateMember(trx, id, version, change))) throw changedMeanwhile();
  const action =
    change.disabled === undefined ? 'member.changed' : change.disabled ? 'member.disabled' : 'member.enabled';
  await recordEvent(trx, viewer, { action, subjectType: 'member', subjectId: id, detail: change });
  return (await findMember(trx, id)) ?? before;
}
