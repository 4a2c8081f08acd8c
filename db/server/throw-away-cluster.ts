import { execFile, fork } from 'node:child_process';
import { once } from 'node:events';
import path from 'node:path';
import { promisify } from 'node:util';

/** A cluster for tests and tools: the administrator's address, and the passwords of our two roles on it. */
export type ThrowAwayCluster = { adminUrl: string; ownerPassword: string; appPassword: string };

/** Starts a throw-away cluster that nobody else uses; it also ends when this process ends. */
export async function startSeparateCluster(): Promise<{ adminUrl: string; stop: () => Promise<void> }> {
  const child = fork(path.join(import.meta.dirname, 'test-cluster.mjs'), { detached: true, execArgv: [] });
  const [message] = (await once(child, 'message')) as [{ adminUrl?: string; error?: string }];
  if (!message.adminUrl) throw new Error(message.error);
  return {
    adminUrl: message.adminUrl,
    stop: async () => {
      const exited = once(child, 'exit');
      child.disconnect();
      await exited;
    },
  };
}

/** Makes the roles and the named database on the cluster and migrates it; answers the two roles' addresses. */
export async function prepareDatabase(
  cluster: ThrowAwayCluster,
  database: string,
): Promise<{ ownerUrl: string; appUrl: string }> {
  const { stdout } = await promisify(execFile)(
    process.execPath,
    ['--import', 'tsx', path.join(import.meta.dirname, 'prepare-database.ts')],
    {
      cwd: path.join(import.meta.dirname, '../..'),
      env: {
        ...process.env,
        ADMIN_DATABASE_URL: cluster.adminUrl,
        DATABASE_NAME: database,
        OWNER_PASSWORD: cluster.ownerPassword,
        APP_PASSWORD: cluster.appPassword,
      },
    },
  );
  return JSON.parse(stdout) as { ownerUrl: string; appUrl: string };
}
