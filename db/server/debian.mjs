import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { PlainError } from './plain-error.mjs';

const isRoot = () => process.getuid?.() === 0;

/** Programs of the newest PostgreSQL on this machine, or of the given major version. */
export function findPostgres(major) {
  const root = '/usr/lib/postgresql';
  const versions = existsSync(root) ? readdirSync(root).filter((name) => /^\d+$/.test(name)) : [];
  const complete = versions.filter((version) => existsSync(path.join(root, version, 'bin', 'initdb')));
  const wanted = major ? complete.filter((version) => version === major) : complete;
  const newest = wanted.sort((a, b) => Number(b) - Number(a))[0];
  return newest === undefined ? undefined : { major: newest, bin: path.join(root, newest, 'bin') };
}

/** User and group that run PostgreSQL: `postgres` when we are root, because the server refuses root; else ourselves. */
export function postgresUser() {
  if (!isRoot()) return {};
  const line = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((entry) => entry.startsWith('postgres:'));
  if (!line) throw new PlainError('PostgreSQL needs the system user postgres; run `apt-get install postgresql`.');
  const [, , uid, gid] = line.split(':');
  return { uid: Number(uid), gid: Number(gid) };
}

function apt(...args) {
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive', LC_ALL: 'C.UTF-8' };
  return spawnSync('apt-get', ['-q', '-o', 'DPkg::Lock::Timeout=300', ...args], { env, encoding: 'utf8' });
}

function install(packages) {
  const done = apt('install', '-y', '--no-install-recommends', ...packages);
  if (done.status === 0) return;
  const reason = `${done.stderr ?? done.error?.message ?? ''}`.trim().split('\n').slice(-3).join(' ');
  throw new PlainError(`Debian could not install ${packages.join(' ')}: ${reason}`);
}

let listsAreFresh = false;
function refreshLists() {
  // A failure here is not the end: the lists may be good enough, and the installation says what is really missing.
  if (!listsAreFresh) apt('update');
  listsAreFresh = true;
}

/** Without this, Debian's package makes and starts a cluster of its own on port 5432. */
function forbidMainCluster() {
  const file = '/etc/postgresql-common/createcluster.conf';
  const text = existsSync(file) ? readFileSync(file, 'utf8') : '';
  const line = 'create_main_cluster = false';
  if (/^\s*create_main_cluster\s*=/m.test(text)) {
    writeFileSync(file, text.replace(/^\s*create_main_cluster\s*=.*$/m, line));
  } else writeFileSync(file, `${text}${text === '' || text.endsWith('\n') ? '' : '\n'}${line}\n`);
}

function refuseUnlessRoot(what, packages) {
  if (isRoot()) return;
  throw new PlainError(`${what} is missing on this machine; run \`sudo apt-get install ${packages}\` and try again.`);
}

/** PostgreSQL's programs, installed from Debian when they are missing and we may. */
export function ensurePostgres(say) {
  const found = findPostgres();
  if (found) return found;
  refuseUnlessRoot('PostgreSQL', 'postgresql');
  say('Installing PostgreSQL from Debian');
  refreshLists();
  install(['postgresql-common']);
  forbidMainCluster();
  install(['postgresql']);
  const installed = findPostgres();
  if (!installed) throw new PlainError('PostgreSQL was installed, but its programs are not under /usr/lib/postgresql.');
  return installed;
}

/** A Debian package that brings the given program. */
export function ensureProgram(say, program, debianPackage, name) {
  if (existsSync(program)) return;
  refuseUnlessRoot(name, debianPackage);
  say(`Installing ${name} from Debian`);
  refreshLists();
  install([debianPackage]);
}
