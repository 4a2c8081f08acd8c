import { listMembers } from '@/db/queries/members';
import { route } from '@/lib/http/route';

export const GET = route({
  action: 'member.list',
  async handle({ trx }) {
    return { body: { items: await listMembers(trx), next: null } };
  },
});
