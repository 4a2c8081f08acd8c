import type { Db } from '@/db/client';

/** A worker that lives holds a shared advisory lock (lib/queue/worker-presence.ts); the server lists the locks that are held. */
export async function workerPresent(db: Db): Promise<boolean> {
  const { rows } = await db.raw(
    `select exists (
       select 1 from pg_locks
        where locktype = 'advisory' and granted and objsubid = 1
          and database = (select oid from pg_database where datname = current_database())
          and ((classid::bigint << 32) | objid::bigint) = hashtext('witnessmark worker')::bigint) as present`,
  );
  return rows[0].present;
}
