import { Logger, run } from 'graphile-worker';
import { env } from '@/lib/env';
import { renderPool } from './render-pool';
import { tasks } from './tasks';
import { announceWorker } from './worker-presence';

/** One line an event, warnings and errors only: the log is read by people. */
const logger = new Logger(() => (level, message) => {
  if (level === 'error' || level === 'warning') process.stderr.write(`${new Date().toISOString()} ${message}\n`);
});

/**
 * The worker process: mail and reports. SIGTERM lets the jobs in hand finish. When the database goes away the process
 * ends with an error and whoever started it starts it again; it then waits for the database, and what was in hand is
 * taken up again.
 */
function endWith(code: number, reason: string): void {
  process.stderr.write(`${new Date().toISOString()} worker ends: ${reason}\n`);
  process.exit(code);
}

const presence = await announceWorker(env.OWNER_DATABASE_URL, () => endWith(1, 'the database connection was lost'));
renderPool.warmUp();

const runner = await run({
  connectionString: env.OWNER_DATABASE_URL,
  taskList: tasks,
  concurrency: 4,
  maxPoolSize: 6,
  pollInterval: 1000,
  noHandleSignals: true,
  logger,
});

let stopping = false;
async function stop(): Promise<void> {
  if (stopping) return;
  stopping = true;
  setTimeout(() => endWith(1, 'jobs in hand did not finish in time'), 25_000).unref();
  await runner.stop();
  await renderPool.close();
  await presence.leave();
  process.exit(0);
}
process.on('SIGTERM', stop).on('SIGINT', stop);

await runner.promise.catch((error: unknown) => endWith(1, String(error)));
if (!stopping) endWith(1, 'the queue stopped');
