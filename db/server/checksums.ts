import { createHash } from 'node:crypto';

const table = Uint32Array.from({ length: 256 }, (_, index) => {
  let value = index;
  for (let bit = 0; bit < 8; bit++) value = value & 1 ? (value >>> 1) ^ 0xedb88320 : value >>> 1;
  return value;
});

/** CRC-32 of ISO 3309 (polynomial 0xEDB88320 reflected), as the store's clients send it. */
export function crc32(bytes: Uint8Array): number {
  let value = 0xffffffff;
  for (const byte of bytes) value = table[(value ^ byte) & 0xff]! ^ (value >>> 8);
  return (value ^ 0xffffffff) >>> 0;
}

function crc32Base64(bytes: Uint8Array): string {
  const word = Buffer.alloc(4);
  word.writeUInt32BE(crc32(bytes));
  return word.toString('base64');
}

const digests: Record<string, (bytes: Uint8Array) => string> = {
  'x-amz-checksum-crc32': crc32Base64,
  'x-amz-checksum-sha1': (bytes) => createHash('sha1').update(bytes).digest('base64'),
  'x-amz-checksum-sha256': (bytes) => createHash('sha256').update(bytes).digest('base64'),
  'content-md5': (bytes) => createHash('md5').update(bytes).digest('base64'),
};

/** Names of the sent checksums that do not fit the bytes; kinds not known here are not judged. */
export function wrongChecksums(sent: Map<string, string>, bytes: Uint8Array): string[] {
  return Object.entries(digests)
    .filter(([name, digest]) => sent.has(name) && sent.get(name) !== digest(bytes))
    .map(([name]) => name);
}

/** The checksum headers that a client sent and that are handed back on reading. */
export function keptChecksums(sent: Map<string, string>): Record<string, string> {
  return Object.fromEntries([...sent].filter(([name]) => /^x-amz-checksum-(crc32|sha1|sha256)$/.test(name)));
}
