import { randomBytes } from 'node:crypto';
import pg from 'pg';
import { testCluster } from './test-cluster';

export type ClonedDatabase = { ownerUrl: string; appUrl: string; drop: () => Promise<void> };

async function asAdmin(statement: string): Promise<void> {
  const client = new pg.Client({ connectionString: testCluster().adminUrl });
  await client.connect();
  try {
    await client.query(statement);
  } finally {
    await client.end();
  }
}

function withDatabase(url: string, name: string): string {
  const address = new URL(url);
  address.pathname = `/${name}`;
  return address.href;
}

/**
 * A fresh database, copied from the migrated template: addresses of the owner and of the application's role, and
 * `drop`, which also ends connections that are still open. One a file of tests is the habit.
 */
export async function cloneDatabase(): Promise<ClonedDatabase> {
  const known = process.env.TEST_TEMPLATE;
  if (!known) throw new Error('No template database: only the project `database` of the tests makes one.');
  const template = JSON.parse(known) as { name: string; ownerUrl: string; appUrl: string };
  const name = `clone_${randomBytes(6).toString('hex')}`;
  await asAdmin(`create database ${name} template ${template.name} owner witnessmark_owner`);
  return {
    ownerUrl: withDatabase(template.ownerUrl, name),
    appUrl: withDatabase(template.appUrl, name),
    drop: () => asAdmin(`drop database if exists ${name} with (force)`),
  };
}
