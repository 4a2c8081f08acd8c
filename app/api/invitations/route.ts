import { listOpenInvitations } from '@/db/queries/invitations';
import { route } from '@/lib/http/route';
import { invitation } from '@/lib/schemas/people';
import { inviteMember } from '@/lib/services/invite-member';

export const GET = route({
  action: 'member.manage',
  async handle({ trx }) {
    return { body: { items: await listOpenInvitations(trx), next: null } };
  },
});

export const POST = route({
  action: 'member.manage',
  body: invitation,
  async handle({ trx, viewer, body }) {
    return { status: 201, body: { id: await inviteMember(trx, viewer, body) } };
  },
});
