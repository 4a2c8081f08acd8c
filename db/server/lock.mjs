import { linkSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { identity, isAlive } from './processes.mjs';

function holderOf(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return undefined;
  }
}

/**
 * Takes the lock file for this process, or answers who holds it. A lock whose process is dead is taken over. The file
 * appears whole (a link to a finished draft), so a reader never sees half of it.
 */
export function takeLock(file, details = {}) {
  mkdirSync(path.dirname(file), { recursive: true });
  const draft = `${file}.${process.pid}`;
  writeFileSync(draft, JSON.stringify({ ...identity(process.pid), ...details }));
  try {
    for (let attempt = 0; attempt < 20; attempt++) {
      try {
        linkSync(draft, file);
        return { release: () => rmSync(file, { force: true }) };
      } catch (error) {
        if (error.code !== 'EEXIST') throw error;
      }
      const holder = holderOf(file);
      if (isAlive(holder)) return { holder };
      // Moving it away first: of two that find the same dead lock, only one succeeds.
      try {
        renameSync(file, `${draft}.dead`);
        rmSync(`${draft}.dead`, { force: true });
      } catch (error) {
        if (error.code !== 'ENOENT') throw error;
      }
    }
    throw new Error(`The lock ${file} could not be taken.`);
  } finally {
    rmSync(draft, { force: true });
  }
}

/** Runs `act` while holding the lock, waiting for another holder first. */
export async function withLock(file, say, act) {
  let told = false;
  for (;;) {
    const { release, holder } = takeLock(file);
    if (release) {
      try {
        return await act();
      } finally {
        release();
      }
    }
    if (!told) say(`Waiting for process ${holder.pid}, which prepares the same folder`);
    told = true;
    await sleep(500);
  }
}
