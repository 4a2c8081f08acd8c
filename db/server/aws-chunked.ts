/**
 * Undoes the transfer coding `aws-chunked` (Amazon S3 API reference, "Signature Calculations: Transferring Payload in
 * Multiple Chunks"): chunks of `hex-size[;chunk-signature=…]\r\n bytes \r\n`, an empty chunk, then trailing headers.
 * Throws when a size is malformed or bytes are missing.
 */
export function decodeAwsChunked(body: Buffer): { bytes: Buffer; trailers: Map<string, string> } {
  const parts: Buffer[] = [];
  let at = 0;
  const line = (): string => {
    const end = body.indexOf('\r\n', at);
    const text = body.toString('latin1', at, end === -1 ? body.length : end);
    at = end === -1 ? body.length : end + 2;
    return text;
  };
  for (;;) {
    const size = line().split(';')[0] ?? '';
    if (!/^[0-9a-f]+$/i.test(size)) throw new Error(`"${size}" is no chunk size.`);
    const length = Number.parseInt(size, 16);
    if (length === 0) break;
    if (at + length > body.length) throw new Error('The body ends inside a chunk.');
    parts.push(body.subarray(at, at + length));
    at += length;
    if (line() !== '') throw new Error('A chunk is longer than its size says.');
  }
  const trailers = new Map<string, string>();
  while (at < body.length) {
    const [name, ...value] = line().split(':');
    if (name && value.length > 0) trailers.set(name.trim().toLowerCase(), value.join(':').trim());
  }
  return { bytes: Buffer.concat(parts), trailers };
}
