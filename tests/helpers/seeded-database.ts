import { execFile } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import path from 'node:path';
import { promisify } from 'node:util';
import { type ClonedDatabase, cloneDatabase } from './clone-database';

/** A clone with the demo scenario in it, filled by the same command that `npm start` uses. */
export async function seededDatabase(): Promise<ClonedDatabase> {
  const database = await cloneDatabase();
  await promisify(execFile)(process.execPath, ['--import', 'tsx', 'db/seeds/demo.ts'], {
    cwd: path.resolve(import.meta.dirname, '../..'),
    env: {
      ...process.env,
      APP_DATABASE_URL: database.appUrl,
      OWNER_DATABASE_URL: database.ownerUrl,
      WITNESSMARK_DEMO: '1',
      NEXTAUTH_SECRET: randomBytes(24).toString('hex'),
    },
  });
  return database;
}
