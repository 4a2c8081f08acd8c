import { type ChildProcess, spawn } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { once } from 'node:events';
import { mkdtemp, readdir, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { appDb, inScope, systemScope } from '@/db/client';
import { queueMail } from '@/db/queries/outbox';
import { type ClonedDatabase, cloneDatabase } from '@/tests/helpers/clone-database';
import { CuttingProxy } from '@/tests/helpers/cutting-proxy';
import { freePort } from '@/tests/helpers/installation';

const root = path.join(import.meta.dirname, '../..');
const organisationId = randomUUID();
const scope = systemScope(organisationId);
let database: ClonedDatabase;
let folder: string;
let mailPort: number;
let proxy: CuttingProxy;
let smtpUrl: string;
const running = new Set<ChildProcess>();

function run(script: string, env: Record<string, string>): ChildProcess {
  const child = spawn(process.execPath, ['--import', 'tsx', path.join(root, script)], {
    cwd: root,
    env: { ...process.env, ...env },
    stdio: ['ignore', 'ignore', 'inherit'],
  });
  running.add(child);
  child.once('exit', () => running.delete(child));
  return child;
}

const startMailServer = () =>
  run('db/server/fake-mail.ts', { FAKE_MAIL_PORT: String(mailPort), FAKE_MAIL_FOLDER: folder });

const startWorker = () =>
  run('lib/queue/worker.ts', {
    OWNER_DATABASE_URL: database.ownerUrl,
    APP_DATABASE_URL: database.appUrl,
    SMTP_URL: smtpUrl,
  });

async function end(child: ChildProcess, signal: NodeJS.Signals): Promise<void> {
  const ended = once(child, 'exit');
  child.kill(signal);
  await ended;
}

beforeAll(async () => {
  database = await cloneDatabase();
  process.env.APP_DATABASE_URL = database.appUrl;
  await appDb().raw("select first_organisation_create(?, 'Outbox Test Fitting', 'OTF', 'Europe/Zurich')", [
    organisationId,
  ]);
  folder = await mkdtemp(path.join(tmpdir(), 'witnessmark-mails-'));
  mailPort = await freePort();
  proxy = new CuttingProxy(mailPort);
  smtpUrl = `smtp://127.0.0.1:${await proxy.listen()}`;
});

afterAll(async () => {
  await Promise.all([...running].map((child) => end(child, 'SIGKILL')));
  proxy.close();
  await appDb().destroy();
  await database.drop();
  await rm(folder, { recursive: true });
});

const write = (subject: string) =>
  inScope(scope, (trx) =>
    queueMail(trx, { to: 'office@ashdown.example', subject, text: 'Text.', html: '<p>Text.</p>' }),
  );

const stateOf = (id: string): Promise<string> =>
  inScope(scope, async (trx) => (await trx('outbox').where({ id }).first('state')).state);

async function becomesSent(id: string): Promise<void> {
  for (const limit = Date.now() + 40_000; (await stateOf(id)) !== 'sent'; ) {
    if (Date.now() > limit) throw new Error(`The mail is still ${await stateOf(id)}.`);
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
}

async function received(subject: string): Promise<number> {
  const names = (await readdir(folder)).filter((name) => name.endsWith('.eml'));
  const mails = await Promise.all(names.map((name) => readFile(path.join(folder, name), 'utf8')));
  return mails.filter((mail) => mail.includes(`Subject: ${subject}`)).length;
}

test('a mail written without a worker and a mail server is sent when both are there', async () => {
  const id = await write('Waiting');
  expect(await stateOf(id)).toBe('waiting');
  startMailServer();
  const worker = startWorker();
  await becomesSent(id);
  expect(await received('Waiting')).toBe(1);
  await end(worker, 'SIGTERM');
});

test('a mail of a transaction that is rolled back is never sent', async () => {
  const rolledBack = inScope(scope, async (trx) => {
    await queueMail(trx, { to: 'office@ashdown.example', subject: 'Unsaid', text: 'No.', html: '<p>No.</p>' });
    throw new Error('changed my mind');
  });
  await expect(rolledBack).rejects.toThrow('changed my mind');
  const worker = startWorker();
  await becomesSent(await write('Said'));
  expect(await received('Unsaid')).toBe(0);
  await end(worker, 'SIGTERM');
});

test('a worker killed between the server’s yes and its note of it leads to exactly one mail', async () => {
  const worker = startWorker();
  const ended = once(worker, 'exit');
  const cut = proxy.cutNext(() => worker.kill('SIGKILL'));
  const id = await write('Only once');
  await cut;
  await ended;
  expect(await stateOf(id)).toBe('waiting');
  expect(await received('Only once')).toBe(1);
  const next = startWorker();
  await becomesSent(id);
  expect(await received('Only once')).toBe(1);
  await end(next, 'SIGTERM');
});
