import { setTimeout as sleep } from 'node:timers/promises';
import pg from 'pg';

const lockName = "hashtext('witnessmark worker')";

async function connectPatiently(ownerUrl: string): Promise<pg.Client> {
  for (let waitMs = 200; ; waitMs = Math.min(waitMs * 2, 5_000)) {
    const client = new pg.Client({
      connectionString: ownerUrl,
      keepAlive: true,
      application_name: 'witnessmark-worker',
    });
    try {
      await client.connect();
      return client;
    } catch {
      await client.end().catch(() => undefined);
      await sleep(waitMs);
    }
  }
}

/** Jobs stay marked as taken when their worker dies, for hours; this gives them back at once. */
async function releaseJobsOfTheDead(client: pg.Client): Promise<void> {
  const { rows } = await client.query<{ ids: string[] | null }>(
    `select array_agg(distinct locked_by) as ids from (
       select locked_by from graphile_worker._private_jobs where locked_by is not null
       union select locked_by from graphile_worker._private_job_queues where locked_by is not null) as taken`,
  );
  const ids = rows[0]?.ids;
  if (ids) await client.query('select graphile_worker.force_unlock_workers($1::text[])', [ids]);
}

/**
 * Waits for the database, then notes this worker's presence as a shared advisory lock that lives as long as its
 * connection. When nobody else is present, all jobs still marked as taken belong to dead workers and are released.
 * `onLost` is called when the connection breaks: what this worker had in hand is then in doubt, and it should end
 * and begin again.
 */
export async function announceWorker(ownerUrl: string, onLost: () => void): Promise<{ leave: () => Promise<void> }> {
  const client = await connectPatiently(ownerUrl);
  let leaving = false;
  const lost = () => {
    if (!leaving) onLost();
  };
  client.on('error', lost).on('end', lost);
  // The connection of a worker killed this moment may take an instant to be noticed by the server.
  for (let attempt = 0; attempt < 10; attempt++) {
    const { rows } = await client.query<{ alone: boolean }>(`select pg_try_advisory_lock(${lockName}) as alone`);
    if (rows[0]?.alone) {
      await releaseJobsOfTheDead(client);
      await client.query(`select pg_advisory_lock_shared(${lockName}), pg_advisory_unlock(${lockName})`);
      break;
    }
    await sleep(300);
  }
  await client.query(`select pg_advisory_lock_shared(${lockName})`);
  return {
    leave: async () => {
      leaving = true;
      await client.end().catch(() => undefined);
    },
  };
}
