import { z } from 'zod';
import { createFileServer } from './file-server';

const settings = z
  .object({
    FAKE_FILES_PORT: z.coerce.number().int(),
    FAKE_FILES_FOLDER: z.string().min(1),
    S3_ACCESS_KEY_ID: z.string().min(1),
  })
  .parse(process.env);

const server = createFileServer(settings.FAKE_FILES_FOLDER, settings.S3_ACCESS_KEY_ID);
server.once('error', (error) => {
  process.stderr.write(`${error.message}\n`);
  process.exit(1);
});
server.listen(settings.FAKE_FILES_PORT, '127.0.0.1');

process.on('SIGTERM', () => process.exit(0));
