import { randomBytes } from 'node:crypto';
import { writeFileSync } from 'node:fs';
import type { TestProject } from 'vitest/node';
import { appRole, ownerRole, urlFor } from '@/db/server/create-roles';
import { freePort, Installation } from './installation';
import { startTestCluster } from './test-cluster';

/** What the browser tests are told about the running application. */
export type RunningApplication = {
  baseUrl: string;
  /** Mails arrive here as .eml files. */
  mailFolder: string;
  /** Numbers of the processes `mail`, `files`, `worker` and `web`; one that is killed is started again and changes its number. */
  processesFile: string;
  ownerUrl: string;
  appUrl: string;
};

declare module 'vitest' {
  interface ProvidedContext {
    baseUrl: string;
    application: RunningApplication;
  }
}

/**
 * Set-up of the project `browser`: the whole application as `npm start` runs it, with the demo scenario, on a fresh
 * database of the test cluster, built first when the build is missing or old.
 */
export default async function setUp(project: TestProject): Promise<() => Promise<void>> {
  const { cluster, stop } = await startTestCluster();
  const database = `browser_${randomBytes(6).toString('hex')}`;
  const installation = new Installation(await freePort(), {
    WITNESSMARK_DEMO: '1',
    DATABASE_URL: cluster.adminUrl.replace(/\/postgres$/, `/${database}`),
  });
  const tearDown = async () => {
    await installation.remove();
    await stop();
  };
  // The roles belong to the whole cluster: the application must use the passwords that the other tests use.
  const { ownerPassword, appPassword } = cluster;
  writeFileSync(installation.inside('secrets.json'), JSON.stringify({ ownerPassword, appPassword }), { mode: 0o600 });
  if ((await installation.start()) !== null) {
    await tearDown();
    throw new Error(`The application did not start:\n${installation.output}`);
  }
  project.provide('baseUrl', installation.url);
  project.provide('application', {
    baseUrl: installation.url,
    mailFolder: installation.inside('mail'),
    processesFile: installation.inside('processes.json'),
    ownerUrl: urlFor(cluster.adminUrl, ownerRole, ownerPassword, database),
    appUrl: urlFor(cluster.adminUrl, appRole, appPassword, database),
  });
  return tearDown;
}
