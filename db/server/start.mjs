import { existsSync } from 'node:fs';
import path from 'node:path';
import { baseEnvironment, chooseServices, program, waitForAnswer, webServer } from './application.mjs';
import { ensureBuild } from './build.mjs';
import { openDataFolder, openSecrets, writeWhole } from './data-folder.mjs';
import { readDatabaseUrl } from './existing-server.mjs';
import { startLocalPostgres } from './local-postgres.mjs';
import { takeLock, withLock } from './lock.mjs';
import { ensurePackages } from './node-packages.mjs';
import { requireNode } from './node-version.mjs';
import { PlainError } from './plain-error.mjs';
import { isFree } from './ports.mjs';
import { identity, isAlive, processesOfRun, signal, stopProcesses } from './processes.mjs';
import { abortSteps, runStep } from './run-step.mjs';
import { say } from './say.mjs';
import { Supervisor } from './supervisor.mjs';

const root = path.resolve(import.meta.dirname, '../..');

function readAddress() {
  const host = process.env.HOST || '127.0.0.1';
  const port = Number(process.env.PORT || 3000);
  if (!Number.isInteger(port) || port < 1 || port > 65_535)
    throw new PlainError('PORT must be a number from 1 to 65535.');
  return { host, port, url: process.env.NEXTAUTH_URL || `http://localhost:${port}` };
}

/** npm, when it started us: if it is killed without telling us, nobody is left to stop us. */
function npmParent() {
  return process.env.npm_lifecycle_event === 'start' ? identity(process.ppid) : undefined;
}

/** One run at a time in a data folder. A run whose npm was killed is ending anyway and is waited for. */
async function takeRunLock(file, url) {
  const details = { url, npm: npmParent() };
  let { release, holder } = takeLock(file, details);
  if (holder?.npm && !isAlive(holder.npm)) {
    signal(holder.pid, 'SIGTERM');
    await stopProcesses(
      () => (isAlive(holder) ? [holder.pid] : []),
      [
        ['SIGTERM', 40_000],
        ['SIGKILL', 5_000],
      ],
    );
    ({ release, holder } = takeLock(file, details));
  }
  if (release) return release;
  throw new PlainError(
    `Witnessmark already runs from this folder at ${holder.url} (process ${holder.pid}); stop it before starting it again.`,
  );
}

async function prepareDatabase({ adminUrl, database, data, secrets, env }) {
  const { command, args, options } = program(root, 'db/server/prepare-database.ts', {
    ...env,
    ADMIN_DATABASE_URL: adminUrl,
    DATABASE_NAME: database,
    OWNER_PASSWORD: secrets.ownerPassword,
    APP_PASSWORD: secrets.appPassword,
  });
  const step = { ...options, logFolder: data.inside('log') };
  const output = await runStep('prepare-database', command, args, step).catch((error) => {
    throw error.exitCode === 3 ? new PlainError(error.lastLine) : error;
  });
  return JSON.parse(output.trim().split('\n').at(-1));
}

const cleanUps = [];
let stopping;

/** Stops everything in order; a second signal ends it at once. */
async function stop(supervisor) {
  supervisor.stopRestarting();
  abortSteps();
  await Promise.all([supervisor.stop('web'), supervisor.stop('worker', { waitMs: 15_000 })]);
  await Promise.all([supervisor.stop('mail'), supervisor.stop('files')]);
  await supervisor.stop('postgres', { askWith: 'SIGINT', waitMs: 30_000, lastSignal: 'SIGQUIT' });
  for (const cleanUp of cleanUps.reverse()) cleanUp();
}

function stopOnSignals(supervisor) {
  const onSignal = () => {
    if (stopping) return;
    say('Stopping');
    stopping = stop(supervisor).then(
      () => process.exit(0),
      (error) => {
        process.stderr.write(`${error.stack}\n`);
        process.exit(1);
      },
    );
  };
  for (const name of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(name, onSignal);
  process.on('disconnect', onSignal);
  const npm = npmParent();
  if (npm) setInterval(() => isAlive(npm) || onSignal(), 1000).unref();
}

/** The database: an existing server when DATABASE_URL names one, else a cluster of our own. */
async function openServer({ data, secrets, supervisor }) {
  if (process.env.DATABASE_URL) return readDatabaseUrl(process.env.DATABASE_URL);
  const adminUrl = await startLocalPostgres({ data, secrets, supervisor, say });
  return { adminUrl, database: 'witnessmark' };
}

async function start() {
  const { host, port, url } = readAddress();
  const data = openDataFolder(root);
  cleanUps.push(await takeRunLock(data.inside('run.lock'), url));
  const logFolder = data.inside('log');
  const supervisor = new Supervisor({
    logFolder,
    say,
    onChange: () => writeWhole(data.inside('processes.json'), JSON.stringify(supervisor.pids())),
  });
  stopOnSignals(supervisor);
  try {
    await run({ host, port, url, data, logFolder, supervisor });
  } catch (error) {
    if (stopping) return;
    stopping = stop(supervisor);
    await stopping;
    throw error;
  }
}

async function run({ host, port, url, data, logFolder, supervisor }) {
  // What an earlier run left behind when it was killed.
  await stopProcesses(
    () => processesOfRun(data.folder),
    [
      ['SIGTERM', 8_000],
      ['SIGKILL', 5_000],
    ],
  );
  if (!(await isFree(port, host))) {
    throw new PlainError(`Port ${port} is in use by another program; choose another one with PORT=… npm start.`);
  }
  const secrets = openSecrets(data.inside('secrets.json'));
  const env = baseEnvironment(data);
  const setUpLock = path.join(root, '.data/set-up.lock');
  const server = await openServer({ data, secrets, supervisor });
  await withLock(setUpLock, say, () => ensurePackages({ root, logFolder, env, say }));

  const services = await chooseServices(data, secrets);
  for (const [name, standIn] of Object.entries(services.standIns)) {
    supervisor.start(name, () => program(root, standIn.script, { ...env, ...standIn.env }));
  }
  const building = withLock(setUpLock, say, () => ensureBuild({ root, logFolder, env, say }));
  building.catch(() => {});

  say('Preparing the database');
  const { ownerUrl, appUrl } = await prepareDatabase({ ...server, data, secrets, env });
  const webEnv = {
    ...env,
    ...services.env,
    APP_DATABASE_URL: appUrl,
    PORT: String(port),
    WITNESSMARK_DEMO: process.env.WITNESSMARK_DEMO === '0' ? '0' : '1',
    NEXTAUTH_SECRET: process.env.NEXTAUTH_SECRET || secrets.nextAuthSecret,
    NEXTAUTH_URL: url,
  };
  const ownerEnv = { ...webEnv, NODE_ENV: 'production', OWNER_DATABASE_URL: ownerUrl };
  const demo = webEnv.WITNESSMARK_DEMO === '1' && existsSync(path.join(root, 'db/seeds/demo.ts'));
  if (demo) {
    say('Looking after the demo scenario');
    const { command, args, options } = program(root, 'db/seeds/demo.ts', ownerEnv);
    await runStep('demo', command, args, { ...options, logFolder });
  }
  await building;

  say('Starting worker and web server');
  supervisor.start('worker', () => program(root, 'lib/queue/worker.ts', ownerEnv));
  supervisor.start('web', () => webServer(root, { host, port, env: webEnv }));
  const local = `http://${host === '0.0.0.0' ? '127.0.0.1' : host.includes(':') ? '[::1]' : host}:${port}`;
  const answers = await waitForAnswer(`${local}/api/health`, () => supervisor.failures('web') > 3);
  if (!answers) throw new PlainError(`The web server does not answer; its log is ${path.join(logFolder, 'web.log')}.`);
  announce({ url, host, demo, data });
  process.send?.({ ready: true, url });
}

function announce({ url, host, demo, data }) {
  const accounts = ['admin', 'reviewer', 'inspector'].map((name) => `${name}@quillmere.example`);
  const lines = [
    '',
    `Witnessmark is ready: ${url}`,
    ...(demo
      ? [
          'Demo accounts, all with the password witness-the-mark:',
          ...[...accounts, 'customer@ashdown.example', 'admin@brackwater.example'].map((account) => `  ${account}`),
        ]
      : []),
    ...(process.env.SMTP_URL ? [] : [`Mail is kept in ${data.inside('mail')}`]),
    ...(host === '127.0.0.1'
      ? ['Only this machine can reach it; HOST=0.0.0.0 npm start opens it to the network.']
      : []),
    'Ctrl-C stops it.',
    '',
  ];
  process.stdout.write(`${lines.join('\n')}\n`);
}

requireNode();
function describe(error) {
  if (error instanceof PlainError) return error.message;
  if (error.code !== 'EACCES') return error.stack;
  return `${error.path ?? 'A file here'} belongs to another user of this machine; start as that user.`;
}

start().catch((error) => {
  process.stderr.write(`${describe(error)}\n`);
  process.exit(1);
});
