import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import { decodeAwsChunked } from './aws-chunked';
import { keptChecksums, wrongChecksums } from './checksums';
import { FileStore, type StoredObject } from './file-store';

const largestBytes = 256 * 1024 * 1024;

class Refusal extends Error {
  constructor(
    readonly status: number,
    readonly code: string,
    message: string,
  ) {
    super(message);
  }
}

function headersOf(request: IncomingMessage): Map<string, string> {
  return new Map(Object.entries(request.headers).map(([name, value]) => [name, String(value)]));
}

async function readBody(request: IncomingMessage): Promise<Buffer> {
  const parts: Buffer[] = [];
  let length = 0;
  for await (const part of request as AsyncIterable<Buffer>) {
    length += part.length;
    if (length > largestBytes) throw new Refusal(400, 'EntityTooLarge', 'The object is too large for this store.');
    parts.push(part);
  }
  return Buffer.concat(parts);
}

/** Takes the body out of its transfer coding and checks every length and checksum the client sent with it. */
function unpack(body: Buffer, headers: Map<string, string>): { bytes: Buffer; sent: Map<string, string> } {
  const chunked =
    headers.get('x-amz-content-sha256')?.startsWith('STREAMING-') ||
    headers.get('content-encoding')?.includes('aws-chunked');
  const sent = new Map(headers);
  let bytes = body;
  if (chunked) {
    const decoded = decodeAwsChunked(body);
    bytes = decoded.bytes;
    for (const [name, value] of decoded.trailers) sent.set(name, value);
    const length = headers.get('x-amz-decoded-content-length');
    if (length !== undefined && Number(length) !== bytes.length) {
      throw new Refusal(400, 'IncompleteBody', 'The decoded length differs from the one announced.');
    }
  }
  const wrong = wrongChecksums(sent, bytes);
  if (wrong.length > 0) throw new Refusal(400, 'BadDigest', `The bytes do not fit ${wrong.join(', ')}.`);
  return { bytes, sent };
}

function objectHeaders(object: StoredObject, withChecksums: boolean): Record<string, string | number> {
  return {
    'content-type': object.contentType,
    'content-length': object.sizeBytes,
    etag: object.etag,
    'last-modified': object.modified,
    ...(withChecksums && object.checksums),
  };
}

async function answer(store: FileStore, request: IncomingMessage, response: ServerResponse): Promise<void> {
  const [, bucket = '', ...rest] = new URL(request.url ?? '/', 'http://localhost').pathname.split('/');
  const key = rest.map(decodeURIComponent).join('/');
  if (bucket === '' || key === '') {
    // Buckets need not be made here: a bucket is there as soon as it is named.
    if (bucket !== '' && (request.method === 'HEAD' || request.method === 'PUT')) response.writeHead(200).end();
    else throw new Refusal(501, 'NotImplemented', 'This store knows single objects only.');
    return;
  }
  const withChecksums = request.headers['x-amz-checksum-mode'] === 'ENABLED';
  switch (request.method) {
    case 'PUT': {
      const { bytes, sent } = unpack(await readBody(request), headersOf(request));
      if (sent.get('if-none-match') === '*' && (await store.head(bucket, key))) {
        throw new Refusal(412, 'PreconditionFailed', 'There is an object under this key already.');
      }
      const contentType = sent.get('content-type') ?? 'application/octet-stream';
      const object = await store.put(bucket, key, bytes, { contentType, checksums: keptChecksums(sent) });
      response.writeHead(200, { etag: object.etag, ...object.checksums }).end();
      return;
    }
    case 'HEAD': {
      const object = await store.head(bucket, key);
      response.writeHead(object ? 200 : 404, object && objectHeaders(object, withChecksums)).end();
      return;
    }
    case 'GET': {
      const found = await store.get(bucket, key);
      if (!found) throw new Refusal(404, 'NoSuchKey', 'There is no object under this key.');
      response.writeHead(200, objectHeaders(found.object, withChecksums)).end(found.bytes);
      return;
    }
    case 'DELETE':
      await store.delete(bucket, key);
      response.writeHead(204).end();
      return;
    default:
      throw new Refusal(405, 'MethodNotAllowed', 'This store knows PUT, GET, HEAD and DELETE.');
  }
}

function refuse(response: ServerResponse, error: unknown): void {
  const known = error instanceof Refusal ? error : new Refusal(500, 'InternalError', String(error));
  const text = known.message.replaceAll('&', '&amp;').replaceAll('<', '&lt;');
  response.writeHead(known.status, { 'content-type': 'application/xml' });
  response.end(
    `<?xml version="1.0" encoding="UTF-8"?><Error><Code>${known.code}</Code><Message>${text}</Message></Error>`,
  );
}

/**
 * The local stand-in for an S3-compatible store: PUT, GET, HEAD and DELETE of single objects by path. It knows one
 * access key and asks for it; it does not compute signatures, because it listens on loopback only.
 */
export function createFileServer(folder: string, accessKeyId: string): Server {
  const store = new FileStore(folder);
  return createServer((request, response) => {
    const signedBy = /Credential=([^/]+)\//.exec(request.headers.authorization ?? '')?.[1];
    const work =
      signedBy === accessKeyId
        ? answer(store, request, response)
        : Promise.reject(new Refusal(403, 'InvalidAccessKeyId', 'This access key is not known here.'));
    work.catch((error: unknown) => refuse(response, error));
  });
}
