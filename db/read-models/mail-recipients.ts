import type { Db } from '@/db/client';

/** Who is told about a report: the customer's members when it is issued; inspectors and reviewers of the job when it is answered. */
export function mailRecipients(
  db: Db,
  jobId: string,
  whom: 'customer' | 'office',
): Promise<{ membershipId: string; email: string }[]> {
  const members = db('memberships').whereNull('memberships.disabled_at').orderBy('memberships.email').select({
    membershipId: 'memberships.id',
    email: 'memberships.email',
  });
  if (whom === 'customer') {
    return members.whereIn('memberships.customer_id', db('jobs').where({ id: jobId }).select('customer_id'));
  }
  return members.whereIn(
    'memberships.id',
    db('job_people')
      .where({ job_id: jobId })
      .whereIn('role', ['inspector', 'reviewer'])
      .whereNotNull('membership_id')
      .select('membership_id'),
  );
}
