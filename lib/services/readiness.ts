import net from 'node:net';
import { appDb } from '@/db/client';
import { firstOrganisationNeeded } from '@/db/queries/accounts';
import { workerPresent } from '@/db/queries/worker-presence';
import { env } from '@/lib/env';
import { headFile } from '@/lib/storage/storage';

export type Part = 'database' | 'queue' | 'mail' | 'files';
export type Readiness = Record<Part, 'ready' | 'not-ready'>;

const limitMs = 2_000;

/** Looks at each thing that the program needs, at the same time, none longer than two seconds. */
export async function readiness(): Promise<Readiness> {
  const checks: Record<Part, () => Promise<boolean>> = {
    database: async () => typeof (await firstOrganisationNeeded(appDb())) === 'boolean',
    queue: () => workerPresent(appDb()),
    mail: () => reachable(env.SMTP_URL),
    files: async () => {
      await headFile('ready');
      return true;
    },
  };
  const parts = Object.entries(checks).map(async ([part, check]) => [part, await inTime(check())] as const);
  return Object.fromEntries(
    (await Promise.all(parts)).map(([part, ready]) => [part, ready ? 'ready' : 'not-ready']),
  ) as Readiness;
}

async function inTime(check: Promise<boolean>): Promise<boolean> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<boolean>((resolve) => {
    timer = setTimeout(() => resolve(false), limitMs);
  });
  try {
    return await Promise.race([check.catch(() => false), late]);
  } finally {
    clearTimeout(timer);
  }
}

/** Whether something listens there; nothing is sent. */
function reachable(url: string): Promise<boolean> {
  const { hostname, port, protocol } = new URL(url);
  const socket = net.connect({
    host: hostname,
    port: Number(port) || (protocol === 'smtps:' ? 465 : 25),
    timeout: limitMs,
  });
  return new Promise<boolean>((resolve) => {
    socket.once('connect', () => resolve(true));
    socket.once('error', () => resolve(false));
    socket.once('timeout', () => resolve(false));
  }).finally(() => socket.destroy());
}
