import {
  DeleteObjectCommand,
  GetObjectCommand,
  HeadObjectCommand,
  PutObjectCommand,
  S3Client,
  S3ServiceException,
} from '@aws-sdk/client-s3';
import { env } from '@/lib/env';

export type StoredFile = { bytes: Buffer; contentType: string };
export type StoredFileHead = { sizeBytes: number; contentType: string };

let client: S3Client | undefined;

function store(): S3Client {
  client ??= new S3Client({
    endpoint: env.S3_ENDPOINT,
    region: env.S3_REGION,
    forcePathStyle: true,
    credentials: { accessKeyId: env.S3_ACCESS_KEY_ID, secretAccessKey: env.S3_SECRET_ACCESS_KEY },
    maxAttempts: 4,
  });
  return client;
}

function isMissing(error: unknown): boolean {
  return error instanceof S3ServiceException && error.$metadata.httpStatusCode === 404;
}

const defaultType = 'application/octet-stream';

/** Stores the bytes under the key, replacing what was there; returns only when the store has them. */
export async function putFile(key: string, bytes: Uint8Array, contentType: string): Promise<void> {
  await store().send(new PutObjectCommand({ Bucket: env.S3_BUCKET, Key: key, Body: bytes, ContentType: contentType }));
}

/** The bytes under the key, their checksum verified by the client library; null when there is no such file. */
export async function getFile(key: string): Promise<StoredFile | null> {
  try {
    const found = await store().send(
      new GetObjectCommand({ Bucket: env.S3_BUCKET, Key: key, ChecksumMode: 'ENABLED' }),
    );
    const bytes = Buffer.from((await found.Body?.transformToByteArray()) ?? new Uint8Array());
    return { bytes, contentType: found.ContentType ?? defaultType };
  } catch (error) {
    if (isMissing(error)) return null;
    throw error;
  }
}

/** Size and type of the file under the key without its bytes; null when there is no such file. */
export async function headFile(key: string): Promise<StoredFileHead | null> {
  try {
    const found = await store().send(new HeadObjectCommand({ Bucket: env.S3_BUCKET, Key: key }));
    return { sizeBytes: found.ContentLength ?? 0, contentType: found.ContentType ?? defaultType };
  } catch (error) {
    if (isMissing(error)) return null;
    throw error;
  }
}

/** Removes the file under the key; no error when there is none. */
export async function deleteFile(key: string): Promise<void> {
  await store().send(new DeleteObjectCommand({ Bucket: env.S3_BUCKET, Key: key }));
}
