import { publicRoute } from '@/lib/http/public-route';
import { founding } from '@/lib/schemas/organisation';
import { foundOrganisation } from '@/lib/services/found-organisation';

/** First start: organisation and first administrator. Possible once. */
export const POST = publicRoute({
  throttle: { name: 'welcome', capacity: 10, refillPerSecond: 1 / 10 },
  body: founding,
  async handle({ body }) {
    await foundOrganisation(body);
    return { status: 201, body: { email: body.email } };
  },
});
