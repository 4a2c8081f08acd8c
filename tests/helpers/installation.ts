import { type ChildProcess, fork } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, readdirSync, readFileSync, readlinkSync, realpathSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { identity } from '@/db/server/processes.mjs';

const root = path.join(import.meta.dirname, '../..');

/** A port of loopback that was free a moment ago. */
export async function freePort(): Promise<number> {
  const server = createServer().listen(0, '127.0.0.1');
  await once(server, 'listening');
  const address = server.address();
  server.close();
  if (address === null || typeof address === 'string') throw new Error('No port.');
  return address.port;
}

function readQuietly(file: string): string {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return '';
  }
}

function standsIn(pid: string, folder: string): boolean {
  try {
    return readlinkSync(`/proc/${pid}/cwd`).startsWith(`${folder}/`);
  } catch {
    return false;
  }
}

/** One installation with its own data folder, started by the program behind `npm start`. */
export class Installation {
  readonly folder = realpathSync(mkdtempSync(path.join(tmpdir(), 'witnessmark-installation-')));
  output = '';
  private child: ChildProcess | undefined;

  constructor(
    readonly port: number,
    private readonly env: Record<string, string> = {},
  ) {
    // A later run tidies up after this one by it, should this one be killed.
    writeFileSync(this.inside('owner.json'), JSON.stringify(identity(process.pid)));
  }

  get url(): string {
    return `http://localhost:${this.port}`;
  }

  inside(name: string): string {
    return path.join(this.folder, name);
  }

  json<T>(name: string): T {
    return JSON.parse(readFileSync(this.inside(name), 'utf8')) as T;
  }

  /** Numbers of the processes `postgres`, `mail`, `files`, `worker` and `web`; null while one is being started again. */
  processes(): Record<string, number | null> {
    return this.json('processes.json');
  }

  /** Runs the program; resolves with null when the installation is ready, or with the exit code when it ended before. */
  async start(): Promise<number | null> {
    this.output = '';
    const { DATABASE_URL: _url, npm_lifecycle_event: _event, ...surroundings } = process.env;
    const child = fork(path.join(root, 'db/server/start.mjs'), {
      env: { ...surroundings, WITNESSMARK_DATA: this.folder, PORT: String(this.port), ...this.env },
      execArgv: [],
      silent: true,
    });
    child.stdout?.on('data', (data) => (this.output += String(data)));
    child.stderr?.on('data', (data) => (this.output += String(data)));
    const ended = new Promise<number | null>((resolve) => child.once('close', (code) => resolve(code ?? 1)));
    const ready = once(child, 'message', { signal: AbortSignal.timeout(300_000) }).then(() => null);
    const result = await Promise.race([ready, ended]);
    ready.catch(() => undefined);
    if (result === null) this.child = child;
    return result;
  }

  /** Sends the signal to the program and waits for its end; answers the exit code. */
  async signal(name: NodeJS.Signals): Promise<number | null> {
    const { child } = this;
    if (!child) throw new Error('This installation does not run.');
    this.child = undefined;
    const ended = once(child, 'exit');
    child.kill(name);
    return ((await ended) as [number | null])[0];
  }

  /** Every process of this installation that is alive, found by its surroundings or by where it stands. */
  alive(): number[] {
    const mark = `WITNESSMARK_DATA=${this.folder}`;
    return readdirSync('/proc')
      .filter((pid) => /^\d+$/.test(pid) && Number(pid) !== process.pid)
      .filter((pid) => readQuietly(`/proc/${pid}/environ`).split('\0').includes(mark) || standsIn(pid, this.folder))
      .map(Number);
  }

  killEverything(): void {
    this.child = undefined;
    for (const pid of this.alive()) {
      try {
        process.kill(pid, 'SIGKILL');
      } catch {
        // Went with its parent.
      }
    }
  }

  async remove(): Promise<void> {
    if (this.child) await this.signal('SIGTERM');
    rmSync(this.folder, { recursive: true, force: true });
  }
}
