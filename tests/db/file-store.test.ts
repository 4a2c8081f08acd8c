import { randomBytes } from 'node:crypto';
import { once } from 'node:events';
import { mkdtemp, readdir, rm } from 'node:fs/promises';
import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { Readable } from 'node:stream';
import { PutObjectCommand, S3Client } from '@aws-sdk/client-s3';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { crc32 } from '@/db/server/checksums';
import { createFileServer } from '@/db/server/file-server';
import { deleteFile, getFile, headFile, putFile } from '@/lib/storage/storage';

let server: Server;
let folder: string;
let endpoint: string;

beforeAll(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'witnessmark-files-'));
  server = createFileServer(folder, 'test-key').listen(0, '127.0.0.1');
  await once(server, 'listening');
  endpoint = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  Object.assign(process.env, {
    S3_ENDPOINT: endpoint,
    S3_BUCKET: 'tests',
    S3_ACCESS_KEY_ID: 'test-key',
    S3_SECRET_ACCESS_KEY: 'secret',
  });
});
afterAll(async () => {
  server.closeAllConnections();
  server.close();
  await rm(folder, { recursive: true });
});

test('a file comes back as it was stored, with its type', async () => {
  const bytes = randomBytes(3_000_000);
  const key = 'reports/Ø 40 µm/ä+b.pdf';
  await putFile(key, bytes, 'application/pdf');
  expect(await headFile(key)).toEqual({ sizeBytes: 3_000_000, contentType: 'application/pdf' });
  const found = await getFile(key);
  expect(found?.contentType).toBe('application/pdf');
  expect(found?.bytes.equals(bytes)).toBe(true);
});

test('an empty file is a file', async () => {
  await putFile('empty', new Uint8Array(), 'text/plain');
  expect((await getFile('empty'))?.bytes.length).toBe(0);
});

test('replacing keeps one copy, deleting none', async () => {
  const before = (await readdir(folder)).length;
  await putFile('note', Buffer.from('one'), 'text/plain');
  await putFile('note', Buffer.from('two'), 'text/plain');
  expect((await getFile('note'))?.bytes.toString()).toBe('two');
  expect((await readdir(folder)).length).toBe(before + 2);
  await deleteFile('note');
  await deleteFile('note');
  expect(await getFile('note')).toBeNull();
  expect(await headFile('note')).toBeNull();
  expect((await readdir(folder)).length).toBe(before);
});

test('a streamed upload, which travels in chunks with a trailing checksum, is stored undamaged', async () => {
  const bytes = randomBytes(700_001);
  const parts = [bytes.subarray(0, 10), bytes.subarray(10, 400_000), bytes.subarray(400_000)];
  const client = new S3Client({
    endpoint,
    region: 'eu-central-1',
    forcePathStyle: true,
    credentials: { accessKeyId: 'test-key', secretAccessKey: 'secret' },
  });
  await client.send(
    new PutObjectCommand({
      Bucket: 'tests',
      Key: 'streamed',
      Body: Readable.from(parts),
      ContentLength: bytes.length,
      ChecksumAlgorithm: 'CRC32',
    }),
  );
  client.destroy();
  expect((await getFile('streamed'))?.bytes.equals(bytes)).toBe(true);
});

async function rawPut(headers: Record<string, string>, body: string): Promise<number> {
  const authorization = 'AWS4-HMAC-SHA256 Credential=test-key/20260101/x/s3/aws4_request';
  const response = await fetch(`${endpoint}/tests/raw`, {
    method: 'PUT',
    body,
    headers: { authorization, ...headers },
  });
  await response.text();
  return response.status;
}

test('bytes that do not fit their checksum or length are refused', async () => {
  const crc = Buffer.alloc(4);
  crc.writeUInt32BE(crc32(Buffer.from('123456789')));
  // Check value of CRC-32/ISO-HDLC for the digits 1 to 9, as published in catalogues of CRC algorithms.
  expect(crc.toString('hex')).toBe('cbf43926');
  const right = { 'x-amz-checksum-crc32': crc.toString('base64') };
  expect(await rawPut(right, '123456789')).toBe(200);
  expect(await rawPut(right, '123456780')).toBe(400);
  const chunked = { 'x-amz-content-sha256': 'STREAMING-UNSIGNED-PAYLOAD-TRAILER', 'x-amz-decoded-content-length': '9' };
  const trailer = `x-amz-checksum-crc32:${crc.toString('base64')}\r\n\r\n`;
  expect(await rawPut(chunked, `4\r\n1234\r\n5\r\n56789\r\n0\r\n${trailer}`)).toBe(200);
  expect(await rawPut(chunked, `4\r\n1234\r\n5\r\n56780\r\n0\r\n${trailer}`)).toBe(400);
  expect(await rawPut(chunked, `4\r\n1234\r\n0\r\n\r\n`)).toBe(400);
});

test('another access key is refused', async () => {
  const response = await fetch(`${endpoint}/tests/empty`, {
    headers: { authorization: 'AWS4-HMAC-SHA256 Credential=other/20260101/x/s3/aws4_request' },
  });
  expect(response.status).toBe(403);
  expect((await fetch(`${endpoint}/tests/empty`)).status).toBe(403);
});
