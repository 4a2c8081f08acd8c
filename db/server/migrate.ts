import knex from 'knex';
import pg from 'pg';
import config from '@/knexfile';

/**
 * Runs the pending migrations as the owner. Two installations starting on one server wait for each other; a lock
 * that a killed run left in Knex's own table is freed, which is safe because the advisory lock is held.
 */
export async function migrate(ownerUrl: string): Promise<void> {
  const guard = new pg.Client({ connectionString: ownerUrl });
  await guard.connect();
  const db = knex({ ...config, connection: { connectionString: ownerUrl, application_name: 'witnessmark-migrate' } });
  try {
    await guard.query("select pg_advisory_lock(hashtext('witnessmark migrations'))");
    await db.migrate.forceFreeMigrationsLock();
    await db.migrate.latest();
  } finally {
    await db.destroy();
    await guard.end();
  }
}
