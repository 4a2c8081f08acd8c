import { recordEvent } from '@/db/queries/audit';
import { revokeInvitations } from '@/db/queries/invitations';
import { notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';

/** Takes an invitation back: its link no longer works. */
export const DELETE = route({
  action: 'member.manage',
  params: idParams,
  async handle({ trx, viewer, params }) {
    if ((await revokeInvitations(trx, { id: params.id })) === 0) throw notFound('open invitation');
    const event = { action: 'member.invitation-revoked', subjectType: 'invitation', subjectId: params.id } as const;
    await recordEvent(trx, viewer, event);
    return { status: 204 };
  },
});
