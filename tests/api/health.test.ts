import net from 'node:net';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET as health } from '@/app/api/health/route';
import { GET as ready } from '@/app/api/ready/route';
import packageJson from '@/package.json';
import { callRoute } from '@/tests/helpers/call-route';
import { openTestWorkshop, type TestWorkshop } from '@/tests/helpers/test-workshop';

type Parts = Record<'database' | 'queue' | 'mail' | 'files', string>;

let workshop: TestWorkshop;
let mail: net.Server;
beforeAll(async () => {
  workshop = await openTestWorkshop();
  mail = net.createServer((socket) => {
    socket.on('error', () => undefined).end('220 tests\r\n');
  });
  await new Promise<void>((resolve) => mail.listen(0, '127.0.0.1', resolve));
  process.env.SMTP_URL = `smtp://127.0.0.1:${(mail.address() as net.AddressInfo).port}`;
  // Nothing listens there: the discard port.
  process.env.S3_ENDPOINT = 'http://127.0.0.1:9';
  process.env.S3_BUCKET = 'tests';
  process.env.S3_ACCESS_KEY_ID = 'tests';
  process.env.S3_SECRET_ACCESS_KEY = 'tests';
});
afterAll(async () => {
  await workshop.close();
  mail.close();
});

describe('health', () => {
  it('says that the process answers, and which version', async () => {
    const { status, body } = await callRoute(health);
    expect({ status, body }).toEqual({ status: 200, body: { status: 'up', version: packageJson.version } });
  });
});

describe('ready', () => {
  it('names each part that is missing', async () => {
    const { status, body } = await callRoute<{ status: string; parts: Parts }>(ready);
    expect(status).toBe(503);
    expect(body.parts).toEqual({ database: 'ready', queue: 'not-ready', mail: 'ready', files: 'not-ready' });
  });

  it('sees a worker by the lock that it holds, and that it is gone', async () => {
    const worker = new pg.Client({ connectionString: workshop.ownerUrl });
    await worker.connect();
    await worker.query(`select pg_advisory_lock_shared(hashtext('witnessmark worker'))`);
    expect((await callRoute<{ parts: Parts }>(ready)).body.parts.queue).toBe('ready');
    await worker.end();
    await expect.poll(async () => (await callRoute<{ parts: Parts }>(ready)).body.parts.queue).toBe('not-ready');
  });
});
