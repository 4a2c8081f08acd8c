import { execFile } from 'node:child_process';
import { writeFile } from 'node:fs/promises';
import path from 'node:path';
import { promisify } from 'node:util';
import { findPostgres } from './debian.mjs';
import { prepareDatabase, startSeparateCluster } from './throw-away-cluster';

/** Lines that differ between versions and runs, or say what every dump says. */
function isNoise(line: string): boolean {
  return /^(--|SET |SELECT pg_catalog\.|\\restrict|\\unrestrict|CREATE SCHEMA public|COMMENT ON SCHEMA public)/.test(
    line,
  );
}

/** Rights of the owner on its own objects, which it has anyway, and of the database's maker. */
function isOwnersRight(line: string): boolean {
  return /^(GRANT|REVOKE) .* (TO|FROM) (witnessmark_owner|postgres|pg_database_owner);$/.test(line);
}

/** The text without noise, with single empty lines between statements. */
export function tidySchema(dump: string): string {
  const lines = dump.split('\n').filter((line) => !isNoise(line) && !isOwnersRight(line));
  return `${lines
    .join('\n')
    .replace(/\n{3,}/g, '\n\n')
    .trim()}\n`;
}

/**
 * The schema `public` of a migrated database as text: tables, functions, policies and grants; without owners, the
 * bookkeeping of the migrations, comments and anything that depends on the version of the tools.
 */
export async function dumpSchema(ownerUrl: string): Promise<string> {
  const bin = findPostgres()?.bin;
  if (!bin) throw new Error('PostgreSQL is missing: run `apt-get install postgresql`.');
  const { stdout } = await promisify(execFile)(
    path.join(bin, 'pg_dump'),
    ['--schema-only', '--schema=public', '--no-owner', '--exclude-table=knex_migrations*', ownerUrl],
    { maxBuffer: 64 * 1024 * 1024, env: { ...process.env, LC_ALL: 'C.UTF-8' } },
  );
  return tidySchema(stdout);
}

if (process.argv[1] === import.meta.filename) {
  const { adminUrl, stop } = await startSeparateCluster();
  try {
    const cluster = { adminUrl, ownerPassword: 'owner', appPassword: 'app' };
    const { ownerUrl } = await prepareDatabase(cluster, 'witnessmark_schema');
    await writeFile(path.join(import.meta.dirname, '../schema.sql'), await dumpSchema(ownerUrl));
  } finally {
    await stop();
  }
}
