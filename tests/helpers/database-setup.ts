import { prepareDatabase } from '@/db/server/throw-away-cluster';
import { startTestCluster } from './test-cluster';

/** Name of the database that is migrated once and cloned for every file of tests. */
const template = 'witnessmark_template';

/** Set-up of the project `database`: a cluster and a migrated template database; `cloneDatabase()` copies it. */
export default async function setUp(): Promise<() => Promise<void>> {
  const { cluster, stop } = await startTestCluster();
  try {
    const { ownerUrl, appUrl } = await prepareDatabase(cluster, template);
    process.env.TEST_TEMPLATE = JSON.stringify({ name: template, ownerUrl, appUrl });
  } catch (error) {
    await stop();
    throw error;
  }
  return stop;
}
