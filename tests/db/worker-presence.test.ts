import pg from 'pg';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { announceWorker } from '@/lib/queue/worker-presence';
import { type ClonedDatabase, cloneDatabase } from '@/tests/helpers/clone-database';

let database: ClonedDatabase;
let owner: pg.Client;
beforeAll(async () => {
  database = await cloneDatabase();
  owner = new pg.Client({ connectionString: database.ownerUrl });
  await owner.connect();
});
afterAll(async () => {
  await owner.end();
  await database.drop();
});

/** A job as a worker leaves it that was killed while doing it. */
async function leaveTakenJob(): Promise<void> {
  await owner.query('delete from graphile_worker._private_jobs');
  await owner.query("select graphile_worker.add_job('send-mail', '{}')");
  await owner.query("update graphile_worker._private_jobs set locked_by = 'killed', locked_at = now(), attempts = 1");
}

async function takenBy(): Promise<string | null> {
  const { rows } = await owner.query<{ locked_by: string | null }>(
    'select locked_by from graphile_worker._private_jobs',
  );
  expect(rows.length).toBe(1);
  return rows[0]!.locked_by;
}

test('a worker that is alone gives back the jobs of the dead', async () => {
  await leaveTakenJob();
  const presence = await announceWorker(database.ownerUrl, () => undefined);
  expect(await takenBy()).toBeNull();
  await presence.leave();
});

test('a second worker leaves the jobs of the first alone', async () => {
  const first = await announceWorker(database.ownerUrl, () => undefined);
  await leaveTakenJob();
  const second = await announceWorker(database.ownerUrl, () => undefined);
  expect(await takenBy()).toBe('killed');
  await first.leave();
  await second.leave();
});

test('a worker learns that its connection is lost', async () => {
  let tellLost: () => void;
  const lost = new Promise<void>((resolve) => {
    tellLost = resolve;
  });
  await announceWorker(database.ownerUrl, () => tellLost());
  const { rowCount } = await owner.query(
    "select pg_terminate_backend(pid) from pg_stat_activity where application_name = 'witnessmark-worker' and datname = current_database()",
  );
  expect(rowCount).toBe(1);
  await lost;
});
