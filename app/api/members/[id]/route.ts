import { findMember } from '@/db/queries/members';
import { notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { memberChange } from '@/lib/schemas/people';
import { changeMember } from '@/lib/services/change-member';

export const GET = route({
  action: 'member.list',
  params: idParams,
  async handle({ trx, params }) {
    const member = await findMember(trx, params.id);
    if (!member) throw notFound('member');
    return { body: member, version: member.version };
  },
});

/** Name, function, roles, and whether the person may sign in; holds from the person's next request on. */
export const PATCH = route({
  action: 'member.manage',
  params: idParams,
  body: memberChange,
  needsVersion: true,
  async handle({ trx, viewer, params, body, expectedVersion }) {
    const member = await changeMember(trx, viewer, params.id, expectedVersion, body);
    return { body: member, version: member.version };
  },
});
