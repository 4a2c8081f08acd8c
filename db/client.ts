import createKnex, { type Knex } from 'knex';
import pg from 'pg';
import { env } from '@/lib/env';

/** Every query takes this first: the pool, or the transaction that carries the organisation. */
export type Db = Knex | Knex.Transaction;

// A date is a day, not a moment: it must not move with a time zone. NUMERIC and BIGINT arrive as exact strings already.
pg.types.setTypeParser(pg.types.builtins.DATE, (text) => text);

declare global {
  var witnessmarkPool: Knex | undefined;
}

/** The application's pool, as the role that owns nothing and is subject to row-level security. */
export function appDb(): Knex {
  globalThis.witnessmarkPool ??= createKnex({
    client: 'pg',
    connection: { connectionString: env.APP_DATABASE_URL, application_name: 'witnessmark' },
    pool: { min: 0, max: 10 },
    acquireConnectionTimeout: 10_000,
  });
  return globalThis.witnessmarkPool;
}

export interface Scope {
  organisationId: string;
  accountId: string;
  /** Set for somebody from a customer, null for staff. */
  customerId: string | null;
}

/** What the worker does on behalf of nobody in particular. */
export const systemScope = (organisationId: string): Scope => ({
  organisationId,
  accountId: '00000000-0000-0000-0000-000000000000',
  customerId: null,
});

/**
 * Runs `work` in one transaction in which only rows of the scope's organisation exist.
 * Outside of it every access to such a table fails (db/tenant-table.ts).
 */
export async function inScope<T>(
  scope: Scope,
  work: (trx: Knex.Transaction) => Promise<T>,
  db: Knex = appDb(),
): Promise<T> {
  return db.transaction(async (trx) => {
    await trx.raw(
      `select set_config('app.organisation', ?, true), set_config('app.account', ?, true), set_config('app.customer', ?, true)`,
      [scope.organisationId, scope.accountId, scope.customerId ?? 'staff'],
    );
    return work(trx);
  });
}
