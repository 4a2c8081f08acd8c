import path from 'node:path';
import type { Knex } from 'knex';
import { env } from './lib/env';

/** Migrations run as the owner role; the application's own pool is made in db/client.ts. */
const config: Knex.Config = {
  client: 'pg',
  connection: () => ({ connectionString: env.OWNER_DATABASE_URL, application_name: 'witnessmark-migrate' }),
  pool: { min: 0, max: 2 },
  migrations: {
    directory: path.join(import.meta.dirname, 'migrations'),
    extension: 'ts',
    loadExtensions: ['.ts'],
  },
};

export default config;
