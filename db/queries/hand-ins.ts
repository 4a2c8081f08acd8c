import type { Db } from '@/db/client';

/** Who handed a job in for the check, and when; undefined while it has not been, or since it was opened again. */
export async function handedIn(db: Db, jobId: string): Promise<{ name: string; at: Date } | undefined> {
  const last: { name: string; at: Date; state: string | null } | undefined = await db('audit_events')
    .where({ subject_type: 'job', subject_id: jobId, action: 'job.changed' })
    .whereRaw(`(detail ->> 'state' is not null or detail ->> 'reopened' is not null)`)
    .orderBy('sequence', 'desc')
    .first({ name: 'account_name', at: 'happened_at', state: db.raw(`detail ->> 'state'`) });
  return last?.state === 'in-check' ? { name: last.name, at: last.at } : undefined;
}
