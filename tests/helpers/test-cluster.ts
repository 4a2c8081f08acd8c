import { randomBytes } from 'node:crypto';
import { startSeparateCluster, type ThrowAwayCluster } from '@/db/server/throw-away-cluster';

const variable = 'TEST_CLUSTER';

/**
 * The throw-away cluster of this test run: the one whose address stands in `TEST_CLUSTER_URL`, or one started here,
 * which `stop` removes again. The answer is left in the environment, where the processes of the tests find it.
 */
export async function startTestCluster(): Promise<{ cluster: ThrowAwayCluster; stop: () => Promise<void> }> {
  const known = process.env[variable];
  if (known) return { cluster: JSON.parse(known) as ThrowAwayCluster, stop: async () => undefined };
  const given = process.env.TEST_CLUSTER_URL;
  const { adminUrl, stop } = given ? { adminUrl: given, stop: async () => undefined } : await startSeparateCluster();
  // All databases of one cluster share its roles, and so their passwords.
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
export function testCluster(): ThrowAwayCluster {
  const known = process.env[variable];
  if (!known) throw new Error('No test cluster: this project of the tests has no set-up that starts one.');
  return JSON.parse(known) as ThrowAwayCluster;
}
