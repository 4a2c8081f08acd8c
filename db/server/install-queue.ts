import { Logger, runMigrations } from 'graphile-worker';

const quiet = new Logger(() => () => undefined);

/**
 * Installs or upgrades the queue's own tables (schema `graphile_worker`) as the owner. Must have run before the
 * project's migrations, because `enqueue()` refers to them. Does nothing when they are up to date.
 */
export async function installQueue(ownerUrl: string): Promise<void> {
  await runMigrations({ connectionString: ownerUrl, logger: quiet });
}
