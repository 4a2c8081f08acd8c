import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { runStep } from './run-step.mjs';

function lockHash(root) {
  const hash = createHash('sha256').update(process.versions.modules);
  return hash.update(readFileSync(path.join(root, 'package-lock.json'))).digest('hex');
}

/**
 * Whether npm itself has already installed exactly what the lock file says. npm writes its record last, so an
 * interrupted installation has none.
 */
function npmAgrees(root) {
  const record = path.join(root, 'node_modules/.package-lock.json');
  if (!existsSync(record)) return false;
  const wanted = JSON.parse(readFileSync(path.join(root, 'package-lock.json'), 'utf8')).packages;
  const installed = JSON.parse(readFileSync(record, 'utf8')).packages;
  return Object.entries(wanted).every(([place, { version, optional, link }]) => {
    if (place === '' || link) return true;
    return installed[place] ? installed[place].version === version : Boolean(optional);
  });
}

/** Installs the packages of the lock file when it has changed since the last finished installation. */
export async function ensurePackages({ root, logFolder, env, say }) {
  const marker = path.join(root, 'node_modules/.witnessmark-lock');
  const hash = lockHash(root);
  if (existsSync(marker) && readFileSync(marker, 'utf8') === hash) return;
  if (!npmAgrees(root)) {
    say('Installing packages');
    // Building needs the development packages, whatever the surroundings say about production.
    const npm = process.env.npm_execpath;
    const [command, ...args] = npm ? [process.execPath, npm] : ['npm'];
    await runStep('npm-ci', command, [...args, 'ci', '--no-audit', '--no-fund'], {
      cwd: root,
      env: { ...env, NODE_ENV: 'development', npm_config_production: '', npm_config_omit: '' },
      logFolder,
    });
  }
  writeFileSync(marker, hash);
}
