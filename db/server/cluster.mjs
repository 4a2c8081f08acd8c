import { spawn, spawnSync } from 'node:child_process';
import {
  chownSync,
  existsSync,
  mkdirSync,
  openSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { findPostgres, postgresUser } from './debian.mjs';
import { PlainError } from './plain-error.mjs';
import { processesInFolder, stopProcesses } from './processes.mjs';

export const superuser = 'postgres';

/** Whether the user that runs PostgreSQL can stand in this folder. */
export function postgresReaches(folder, { uid, gid } = postgresUser()) {
  return spawnSync('/bin/sh', ['-c', 'cd -- "$1"', 'sh', folder], { uid, gid, cwd: '/' }).status === 0;
}

/**
 * Who must run the server on these data: their owner, whoever made them. Data that a copy by root has left to root,
 * which PostgreSQL refuses, are given to the system's user for it.
 */
export function clusterUser(directory) {
  const { uid, gid } = statSync(directory);
  const me = process.geteuid();
  if (me !== 0) {
    if (uid === me) return {};
    throw new PlainError(`The data in ${directory} belong to another user of this machine; start as that user.`);
  }
  if (uid !== 0) return { uid, gid };
  const user = postgresUser();
  const given = spawnSync('chown', ['-R', `${user.uid}:${user.gid}`, directory], { encoding: 'utf8' });
  if (given.status !== 0) throw new Error(`chown: ${given.stderr}`);
  return user;
}

/** Makes a cluster in `directory`; whole or not at all, so that a kill in between leaves nothing half-made. */
export function createCluster({ directory, bin, password }) {
  const user = postgresUser();
  const draft = `${directory}.new`;
  const passwordFile = `${directory}.password`;
  rmSync(draft, { recursive: true, force: true });
  mkdirSync(draft, { recursive: true, mode: 0o700 });
  writeFileSync(passwordFile, `${password}\n`, { mode: 0o600 });
  if (user.uid !== undefined) for (const entry of [draft, passwordFile]) chownSync(entry, user.uid, user.gid);
  const args = ['-D', draft, '-U', superuser, '-A', 'scram-sha-256', '--pwfile', passwordFile];
  const options = { ...user, cwd: '/', encoding: 'utf8', env: { PATH: process.env.PATH, LC_ALL: 'C.UTF-8' } };
  const made = spawnSync(
    path.join(bin, 'initdb'),
    [...args, '-E', 'UTF8', '--locale=C.UTF-8', '--data-checksums'],
    options,
  );
  rmSync(passwordFile, { force: true });
  if (made.status !== 0) throw new Error(`initdb: ${made.stderr ?? made.error?.message}`);
  renameSync(draft, directory);
}

/** The programs that fit the data: a cluster is bound to the major version that made it. */
export function postgresFor(directory) {
  const major = readFileSync(path.join(directory, 'PG_VERSION'), 'utf8').trim();
  const found = findPostgres(major);
  if (found) return found;
  throw new PlainError(
    `The data in ${directory} was written by PostgreSQL ${major}, which is missing; run \`apt-get install postgresql-${major}\`.`,
  );
}

/**
 * Ends whatever still runs on this data from an earlier life and removes its stale pid file. The file is removed
 * only when no process stands in the folder any more, so two servers can never write the same data.
 */
export async function clearCluster(directory) {
  const find = () => processesInFolder(directory);
  const gone = await stopProcesses(find, [
    ['SIGINT', 20_000],
    ['SIGQUIT', 10_000],
    ['SIGKILL', 10_000],
  ]);
  if (!gone) throw new PlainError(`A PostgreSQL server still uses ${directory} and does not stop.`);
  rmSync(path.join(directory, 'postmaster.pid'), { force: true });
}

/** Settings of the server: loopback only; a throw-away cluster also gives up safety against power failure. */
function serverArguments({ directory, port, throwAway }) {
  const settings = {
    port,
    listen_addresses: '127.0.0.1',
    unix_socket_directories: '',
    password_encryption: 'scram-sha-256',
    max_connections: throwAway ? 300 : 100,
    timezone: 'UTC',
    log_timezone: 'UTC',
    ...(throwAway && { fsync: 'off', synchronous_commit: 'off', full_page_writes: 'off', autovacuum: 'off' }),
  };
  return ['-D', directory, ...Object.entries(settings).flatMap(([name, value]) => ['-c', `${name}=${value}`])];
}

/** What a supervisor needs to run the server; output goes to a file, never to a pipe that could fill or break. */
export function serverCommand({ directory, bin, port, throwAway = false }) {
  return {
    command: path.join(bin, 'postgres'),
    args: serverArguments({ directory, port, throwAway }),
    // Not our environment: the server ends by its folder, and it needs nothing of ours.
    options: { ...clusterUser(directory), cwd: '/', env: { PATH: process.env.PATH, LC_ALL: 'C.UTF-8', TZ: 'UTC' } },
  };
}

/** Waits until the server answers; `isRunning` ends the wait early when its process has died. */
export async function waitForServer({ bin, port, isRunning, timeoutMs = 90_000 }) {
  const probe = ['-q', '-h', '127.0.0.1', '-p', String(port), '-U', superuser, '-d', 'postgres', '-t', '2'];
  for (const end = Date.now() + timeoutMs; Date.now() < end; await sleep(100)) {
    if (spawnSync(path.join(bin, 'pg_isready'), probe).status === 0) return true;
    if (!isRunning()) return false;
  }
  return false;
}

/** Starts a throw-away server without supervision, for tests. */
export function spawnServer(description, logFile) {
  const { command, args, options } = serverCommand(description);
  const log = openSync(logFile, 'a');
  return spawn(command, args, { ...options, detached: true, stdio: ['ignore', log, log] });
}

export function hasCluster(directory) {
  return existsSync(path.join(directory, 'PG_VERSION'));
}
