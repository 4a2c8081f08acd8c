import { readdirSync, readFileSync, readlinkSync, realpathSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';

/** Environment variable that marks every process of one run; its value is the run's data folder. */
export const runMarker = 'WITNESSMARK_RUN';

function readQuietly(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return '';
  }
}

/** Start time of a living process, in clock ticks since the machine started; undefined when there is none (or a zombie). */
export function startTicks(pid) {
  const stat = readQuietly(`/proc/${pid}/stat`);
  const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
  return stat === '' || fields[0] === 'Z' ? undefined : fields[19];
}

/** A number alone can be given to another process after a restart of the machine: identity is number, time and boot. */
export function identity(pid) {
  const ticks = startTicks(pid);
  return ticks === undefined ? undefined : { pid, ticks, boot: readQuietly('/proc/sys/kernel/random/boot_id').trim() };
}

export function isAlive(known) {
  const now = known && identity(known.pid);
  return Boolean(now && now.ticks === known.ticks && now.boot === known.boot);
}

function allPids() {
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name))
    .map(Number);
}

/** Processes started by a run on this data folder, however deep, also when their parents are dead. */
export function processesOfRun(folder) {
  const marker = `${runMarker}=${folder}`;
  return allPids().filter(
    (pid) =>
      pid !== process.pid &&
      startTicks(pid) !== undefined &&
      readQuietly(`/proc/${pid}/environ`).split('\0').includes(marker),
  );
}

/** PostgreSQL's processes all stand in their data directory, so this finds a server and its orphaned back ends. */
export function processesInFolder(folder) {
  let real;
  try {
    real = realpathSync(folder);
  } catch {
    return [];
  }
  return allPids().filter((pid) => {
    try {
      return pid !== process.pid && readlinkSync(`/proc/${pid}/cwd`) === real && startTicks(pid) !== undefined;
    } catch {
      return false;
    }
  });
}

export function signal(pid, name) {
  try {
    process.kill(pid, name);
  } catch {
    // Already gone.
  }
}

/** Sends each signal in turn to what is still there, waiting up to its time; answers whether everything went. */
export async function stopProcesses(find, steps) {
  for (const [name, waitMs] of steps) {
    for (const pid of find()) signal(pid, name);
    for (const end = Date.now() + waitMs; Date.now() < end; await sleep(50)) if (find().length === 0) return true;
  }
  return find().length === 0;
}
