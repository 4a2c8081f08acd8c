import { spawn } from 'node:child_process';
import { closeSync, mkdirSync, openSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { PlainError } from './plain-error.mjs';
import { signal } from './processes.mjs';

const running = new Set();

/** Ends the steps in hand at once, with everything they started. */
export function abortSteps() {
  for (const pid of running) signal(-pid, 'SIGKILL');
}

/**
 * Runs one command to its end, its output kept in a log file, and answers that output. Throws with the last lines
 * when it fails. It runs in a process group of its own, so that it can be ended with all its children.
 */
export function runStep(name, command, args, { logFolder, ...options }) {
  mkdirSync(logFolder, { recursive: true });
  const logFile = path.join(logFolder, `${name}.log`);
  writeFileSync(logFile, '');
  const log = openSync(logFile, 'a');
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { ...options, detached: true, stdio: ['ignore', log, log] });
    closeSync(log);
    child.once('error', reject);
    if (child.pid) running.add(child.pid);
    child.once('exit', (code, killedBy) => {
      running.delete(child.pid);
      const output = readFileSync(logFile, 'utf8');
      if (code === 0) return resolve(output);
      const lines = output.trim().split('\n');
      const error = new PlainError(`${name} failed (${killedBy ?? code}):\n${lines.slice(-40).join('\n')}`);
      reject(Object.assign(error, { exitCode: code, lastLine: lines.at(-1) }));
    });
  });
}
