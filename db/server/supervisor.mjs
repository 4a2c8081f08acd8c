import { spawn } from 'node:child_process';
import { closeSync, openSync, renameSync, statSync } from 'node:fs';
import path from 'node:path';
import { signal } from './processes.mjs';

const firstPauseMs = 500;
const longestPauseMs = 30_000;
const soundAfterMs = 60_000;
const largeLogBytes = 5 * 1024 * 1024;

function openLog(file) {
  try {
    if (statSync(file).size > largeLogBytes) renameSync(file, `${file}.old`);
  } catch {
    // The first run.
  }
  return openSync(file, 'a');
}

/**
 * Keeps processes running: one that ends without being asked is started again, after a pause that doubles while it
 * keeps failing. Each runs in a process group of its own, so that Ctrl-C reaches only this program, which then stops
 * them in order. Their output goes to files, so that they do not depend on this program's terminal.
 */
export class Supervisor {
  #entries = new Map();
  #stopping = false;

  constructor({ logFolder, say, onChange = () => {} }) {
    this.logFolder = logFolder;
    this.say = say;
    this.onChange = onChange;
  }

  /** Starts the process and keeps it; `description()` is asked before every start. */
  start(name, description) {
    this.#entries.set(name, { name, description, pauseMs: firstPauseMs, failures: 0 });
    this.#launch(this.#entries.get(name));
  }

  pid(name) {
    return this.#entries.get(name)?.child?.pid;
  }

  /** How often it has ended without being asked. */
  failures(name) {
    return this.#entries.get(name)?.failures ?? 0;
  }

  pids() {
    return Object.fromEntries([...this.#entries.keys()].map((name) => [name, this.pid(name) ?? null]));
  }

  async #launch(entry) {
    const { command, args, options, before } = entry.description();
    try {
      await before?.();
    } catch (error) {
      this.say(`${entry.name}: ${error.message}`);
    }
    if (this.#stopping || entry.stopped) return;
    const log = openLog(path.join(this.logFolder, `${entry.name}.log`));
    const child = spawn(command, args, { ...options, detached: true, stdio: ['ignore', log, log] });
    closeSync(log);
    const startedAt = Date.now();
    entry.child = child;
    entry.ended = new Promise((resolve) => {
      child.once('error', resolve);
      child.once('exit', resolve);
    }).then(() => this.#ended(entry, child, startedAt));
    this.onChange();
  }

  #ended(entry, child, startedAt) {
    entry.child = undefined;
    // What it had started itself must not outlive it.
    if (child.pid) signal(-child.pid, 'SIGKILL');
    this.onChange();
    if (this.#stopping || entry.stopped) return;
    entry.failures += 1;
    if (Date.now() - startedAt > soundAfterMs) entry.pauseMs = firstPauseMs;
    const how = child.signalCode ?? child.exitCode;
    this.say(`${entry.name} ended (${how}); starting it again. Its log: ${path.join(this.logFolder, entry.name)}.log`);
    entry.timer = setTimeout(() => this.#launch(entry), entry.pauseMs);
    entry.pauseMs = Math.min(entry.pauseMs * 2, longestPauseMs);
  }

  /** Asks one process to end, waits, and ends it hard when it does not. */
  async stop(name, { askWith = 'SIGTERM', waitMs = 10_000, lastSignal = 'SIGKILL' } = {}) {
    const entry = this.#entries.get(name);
    if (!entry) return;
    entry.stopped = true;
    clearTimeout(entry.timer);
    const { child } = entry;
    if (!child?.pid) return;
    signal(child.pid, askWith);
    const hard = setTimeout(() => signal(lastSignal === 'SIGKILL' ? -child.pid : child.pid, lastSignal), waitMs);
    await entry.ended;
    clearTimeout(hard);
  }

  /** From now on nothing is started again. */
  stopRestarting() {
    this.#stopping = true;
  }
}
