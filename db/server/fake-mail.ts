import { createHash } from 'node:crypto';
import { readdir, rename, writeFile } from 'node:fs/promises';
import path from 'node:path';
import type { Readable } from 'node:stream';
import { SMTPServer } from 'smtp-server';
import { z } from 'zod';

const { FAKE_MAIL_PORT: port, FAKE_MAIL_FOLDER: folder } = z
  .object({ FAKE_MAIL_PORT: z.coerce.number().int(), FAKE_MAIL_FOLDER: z.string().min(1) })
  .parse(process.env);

async function read(stream: Readable): Promise<Buffer> {
  const parts: Buffer[] = [];
  for await (const part of stream) parts.push(part as Buffer);
  return Buffer.concat(parts);
}

/**
 * Name of a mail: when it came, and a digest of its Message-ID. A mail server shows a mail that is delivered twice
 * under one Message-ID once; so does this.
 */
async function keep(message: Buffer): Promise<void> {
  const header = message.toString('latin1').split(/\r?\n\r?\n/)[0] ?? '';
  const messageId = /^message-id:\s*(\S+)/im.exec(header)?.[1] ?? createHash('sha256').update(message).digest('hex');
  const digest = createHash('sha256').update(messageId).digest('hex').slice(0, 16);
  if ((await readdir(folder)).some((name) => name.endsWith(`-${digest}.eml`))) return;
  const file = path.join(folder, `${new Date().toISOString().replaceAll(':', '')}-${digest}.eml`);
  await writeFile(`${file}.new`, message, { mode: 0o600 });
  await rename(`${file}.new`, file);
}

/** The local stand-in for a mail server: accepts every mail on loopback and keeps it as a file. */
const server = new SMTPServer({
  disabledCommands: ['STARTTLS'],
  authOptional: true,
  logger: false,
  disableReverseLookup: true,
  size: 30 * 1024 * 1024,
  onData(stream, _session, callback) {
    read(stream)
      .then(keep)
      .then(
        () => callback(),
        (error: Error) => callback(error),
      );
  },
});
server.on('error', (error) => process.stderr.write(`${error.message}\n`));
server.server.once('error', () => process.exit(1));
server.listen(port, '127.0.0.1');

process.on('SIGTERM', () => process.exit(0));
