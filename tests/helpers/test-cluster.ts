import { execFile, fork } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { once } from 'node:events';
import path from 'node:path';
import { promisify } from 'node:util';

const root = path.join(import.meta.dirname, '../..');

/** Passwords of the two roles on a throw-away cluster; all databases of one cluster share its roles. */
export type TestCluster = { adminUrl: string; ownerPassword: string; appPassword: string };

const variable = 'TEST_CLUSTER';

/** Starts a throw-away cluster that nobody else uses; it also ends when this process ends. */
export async function startSeparateCluster(): Promise<{ adminUrl: string; stop: () => Promise<void> }> {
  const child = fork(path.join(root, 'db/server/test-cluster.mjs'), { detached: true, execArgv: [] });
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

/**
 * The throw-away cluster of this test run: the one whose address stands in `TEST_CLUSTER_URL`, or one started here,
 * which `stop` removes again. The answer is left in the environment, where the processes of the tests find it.
 */
export async function startTestCluster(): Promise<{ cluster: TestCluster; stop: () => Promise<void> }> {
  const known = process.env[variable];
  if (known) return { cluster: JSON.parse(known) as TestCluster, stop: async () => undefined };
  const given = process.env.TEST_CLUSTER_URL;
  const { adminUrl, stop } = given ? { adminUrl: given, stop: async () => undefined } : await startSeparateCluster();
  const password = () => randomBytes(18).toString('base64url');
  const cluster = { adminUrl, ownerPassword: password(), appPassword: password() };
  process.env[variable] = JSON.stringify(cluster);
  return {
    cluster,
    stop: async () => {
      delete process.env[variable];
      await stop();
    },
  };
}

/** The cluster that the set-up of this run has made; for the processes of the tests. */
export function testCluster(): TestCluster {
  const known = process.env[variable];
  if (!known) throw new Error('No test cluster: this project of the tests has no set-up that starts one.');
  return JSON.parse(known) as TestCluster;
}

/** Makes the roles and the named database on the cluster and migrates it; answers the two roles' addresses. */
export async function prepareDatabase(
  cluster: TestCluster,
  database: string,
): Promise<{ ownerUrl: string; appUrl: string }> {
  const { stdout } = await promisify(execFile)(
    process.execPath,
    ['--import', 'tsx', path.join(root, 'db/server/prepare-database.ts')],
    {
      cwd: root,
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
