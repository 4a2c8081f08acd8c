import { fork, spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { ensureBuild } from './build.mjs';
import { ensurePostgres, ensureProgram } from './debian.mjs';
import { withLock } from './lock.mjs';
import { ensurePackages } from './node-packages.mjs';
import { requireNode } from './node-version.mjs';
import { PlainError } from './plain-error.mjs';
import { signal } from './processes.mjs';
import { abortSteps, runStep } from './run-step.mjs';
import { say } from './say.mjs';
import { countReport } from './test-report.mjs';

requireNode();
const root = path.resolve(import.meta.dirname, '../..');
const filters = process.argv.slice(2);
const setUpLock = path.join(root, '.data/set-up.lock');

/** The tests bring their own settings: nothing of an installation in the surroundings may reach them. */
const settings =
  /^(DATABASE_URL|APP_DATABASE_URL|OWNER_DATABASE_URL|PORT|HOST|NODE_ENV|SMTP_URL|MAIL_FROM|NEXTAUTH_.*|S3_.*|WITNESSMARK_.*|TEST_CLUSTER.*|TEST_TEMPLATE|npm_lifecycle_.*)$/;
const env = {
  ...Object.fromEntries(Object.entries(process.env).filter(([name]) => !settings.test(name))),
  TZ: 'UTC',
  NEXT_TELEMETRY_DISABLED: '1',
  AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true',
};

const total = { passed: 0, failed: 0 };
let cluster;
let runner;
let interrupted = false;

/** A check that is no test: silent when it passes, one failure with its output when it does not. */
async function check(name, act) {
  try {
    await act();
    say(`${name}: in order`);
  } catch (error) {
    total.failed += 1;
    say(`${name}: failed`);
    process.stdout.write(`${error.message}\n`);
  }
}

async function startCluster() {
  cluster = fork(path.join(import.meta.dirname, 'test-cluster.mjs'), { detached: true });
  const [message] = await once(cluster, 'message');
  if (message.error) throw new PlainError(message.error);
  return message.adminUrl;
}

async function stopCluster() {
  if (!cluster?.connected) return;
  const ended = once(cluster, 'exit');
  cluster.disconnect();
  await ended;
}

async function runProject(project, folder, clusterUrl) {
  const report = path.join(folder, `${project}.json`);
  const args = ['run', '--project', project, '--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
  if (filters.length > 0) args.push('--passWithNoTests', ...filters);
  runner = spawn(process.execPath, [path.join(root, 'node_modules/vitest/vitest.mjs'), ...args], {
    cwd: root,
    env: { ...env, TEST_CLUSTER_URL: clusterUrl },
    stdio: ['ignore', 'inherit', 'inherit'],
    detached: true,
  });
  const [code] = await once(runner, 'exit');
  const { passed, failed } = countReport(report, code ?? 1);
  total.passed += passed;
  total.failed += failed;
}

async function prepare(logFolder) {
  ensurePostgres(say);
  ensureProgram(say, '/usr/bin/chromium', 'chromium', 'Chromium');
  ensureProgram(say, '/usr/bin/pdftotext', 'poppler-utils', 'Poppler');
  await withLock(setUpLock, say, () => ensurePackages({ root, logFolder, env, say }));
}

async function runEverything(folder) {
  const logFolder = path.join(folder, 'log');
  mkdirSync(logFolder);
  await prepare(logFolder);
  const clusterUrl = await startCluster();
  if (filters.length === 0) {
    const tool = (...args) => [process.execPath, args, { cwd: root, env, logFolder }];
    await check('Build', () => withLock(setUpLock, say, () => ensureBuild({ root, logFolder, env, say })));
    await check('Types', () => runStep('types', ...tool('node_modules/typescript/bin/tsc', '--noEmit')));
    await check('Lint', () => runStep('lint', ...tool('node_modules/@biomejs/biome/bin/biome', 'check', '.')));
  }
  for (const project of ['unit', 'database', 'browser']) {
    if (!interrupted) await runProject(project, folder, clusterUrl);
  }
  if (!interrupted && total.passed + total.failed === 0) throw new PlainError(`No test fits ${filters.join(' ')}.`);
}

const folder = mkdtempSync(path.join(tmpdir(), 'witnessmark-reports-'));
async function finish() {
  await stopCluster();
  rmSync(folder, { recursive: true, force: true });
  process.stdout.write(`${total.passed} passed, ${total.failed} failed\n`);
  process.exit(total.failed === 0 ? 0 : 1);
}

for (const name of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
  process.on(name, () => {
    if (interrupted) return;
    interrupted = true;
    abortSteps();
    // The runner first ends what its set-up has started.
    if (runner?.pid && runner.exitCode === null) signal(runner.pid, 'SIGINT');
  });
}

try {
  await runEverything(folder);
} catch (error) {
  total.failed += 1;
  process.stdout.write(`${error instanceof PlainError ? error.message : error.stack}\n`);
}
if (interrupted) total.failed += 1;
await finish();
