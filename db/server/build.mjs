import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { runStep } from './run-step.mjs';

/** What the built application is made of. Tests, migrations and this folder's scripts are not in it. */
const sources = [
  'app',
  'components',
  'templates',
  'lib',
  'standards',
  'db',
  'public',
  'proxy.ts',
  'next.config.mjs',
  'postcss.config.mjs',
  'tailwind.config.ts',
  'tsconfig.json',
  'package.json',
  'package-lock.json',
];
const leftOut = new Set(['db/server', 'db/seeds', 'db/schema.sql']);

function* files(root, relative) {
  const absolute = path.join(root, relative);
  if (leftOut.has(relative) || !existsSync(absolute)) return;
  if (!statSync(absolute).isDirectory()) yield relative;
  else for (const name of readdirSync(absolute).sort()) yield* files(root, path.join(relative, name));
}

/** One hash over names and contents of everything that goes into the build. */
export function sourceHash(root) {
  const hash = createHash('sha256').update(process.versions.node);
  for (const source of sources) {
    for (const file of files(root, source)) {
      const content = readFileSync(path.join(root, file));
      hash.update(`${file}\0${content.length}\0`).update(content);
    }
  }
  return hash.digest('hex');
}

/** Builds the application when its sources have changed since the last finished build. */
export async function ensureBuild({ root, logFolder, env, say }) {
  const marker = path.join(root, '.next/witnessmark-sources');
  const hash = sourceHash(root);
  if (existsSync(marker) && readFileSync(marker, 'utf8') === hash) return;
  say('Building');
  rmSync(marker, { force: true });
  const args = [path.join(root, 'node_modules/next/dist/bin/next'), 'build'];
  await runStep('build', process.execPath, args, {
    cwd: root,
    env: { ...env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' },
    logFolder,
  });
  writeFileSync(marker, hash);
}
