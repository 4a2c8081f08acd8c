import { publicRoute } from '@/lib/http/public-route';
import { acceptanceWithAccount } from '@/lib/schemas/people';
import { acceptInvitation } from '@/lib/services/accept-invitation';

/** The answer to an invitation, by somebody who may have no account yet. */
export const POST = publicRoute({
  throttle: { name: 'invitation', capacity: 10, refillPerSecond: 1 / 10 },
  body: acceptanceWithAccount,
  async handle({ body }) {
    return { status: 201, body: await acceptInvitation(body) };
  },
});
