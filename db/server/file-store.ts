import { createHash, randomBytes } from 'node:crypto';
import { mkdir, open, readFile, rename, rm } from 'node:fs/promises';
import path from 'node:path';

export type StoredObject = {
  key: string;
  /** Name of the file with the bytes. */
  file: string;
  sizeBytes: number;
  contentType: string;
  etag: string;
  modified: string;
  checksums: Record<string, string>;
};

async function writeDurably(file: string, content: string | Uint8Array): Promise<void> {
  const handle = await open(file, 'w', 0o600);
  try {
    await handle.writeFile(content);
    await handle.sync();
  } finally {
    await handle.close();
  }
}

function isNoFile(error: unknown): boolean {
  return (error as NodeJS.ErrnoException).code === 'ENOENT';
}

/**
 * Objects on the disk: the bytes in a file with a fresh name, and a small record under the digest of the key which
 * says which file counts. Renaming the record is the one moment of change, so a kill leaves the old object or the new
 * one. Digests as names leave no way out of the folder, whatever the key is.
 */
export class FileStore {
  constructor(private readonly folder: string) {}

  private record(bucket: string, key: string): string {
    return path.join(this.folder, `${createHash('sha256').update(`${bucket}\0${key}`).digest('hex')}.json`);
  }

  async head(bucket: string, key: string): Promise<StoredObject | undefined> {
    try {
      return JSON.parse(await readFile(this.record(bucket, key), 'utf8')) as StoredObject;
    } catch (error) {
      if (isNoFile(error)) return undefined;
      throw error;
    }
  }

  async get(bucket: string, key: string): Promise<{ object: StoredObject; bytes: Buffer } | undefined> {
    const object = await this.head(bucket, key);
    return object && { object, bytes: await readFile(path.join(this.folder, object.file)) };
  }

  async put(
    bucket: string,
    key: string,
    bytes: Uint8Array,
    facts: Pick<StoredObject, 'contentType' | 'checksums'>,
  ): Promise<StoredObject> {
    await mkdir(this.folder, { recursive: true });
    const former = await this.head(bucket, key);
    const record = this.record(bucket, key);
    const object: StoredObject = {
      key: `${bucket}/${key}`,
      file: `${randomBytes(16).toString('hex')}.bin`,
      sizeBytes: bytes.length,
      etag: `"${createHash('md5').update(bytes).digest('hex')}"`,
      modified: new Date().toUTCString(),
      ...facts,
    };
    await writeDurably(path.join(this.folder, object.file), bytes);
    const draft = path.join(this.folder, `${object.file}.record`);
    await writeDurably(draft, JSON.stringify(object, null, 1));
    await rename(draft, record);
    if (former) await rm(path.join(this.folder, former.file), { force: true });
    return object;
  }

  async delete(bucket: string, key: string): Promise<void> {
    const former = await this.head(bucket, key);
    await rm(this.record(bucket, key), { force: true });
    if (former) await rm(path.join(this.folder, former.file), { force: true });
  }
}
