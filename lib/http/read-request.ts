import { DomainError } from '@/lib/errors';

const maxBodyBytes = 2_000_000;

/** A page of another site must not act with our cookie: browsers name the origin of every request that changes something. */
export function refuseForeignOrigin(request: Request): void {
  if (request.method === 'GET' || request.method === 'HEAD') return;
  const origin = request.headers.get('origin');
  const host = request.headers.get('x-forwarded-host') ?? request.headers.get('host');
  if (origin && new URL(origin).host !== host)
    throw new DomainError(403, 'Not allowed', 'This request came from another site.');
}

/** The request's text. @throws DomainError 422 when it is too large */
export async function readBody(request: Request): Promise<string> {
  const text = await request.text();
  if (text.length > maxBodyBytes)
    throw new DomainError(422, 'Too much at once', 'The request is larger than 2 MB. Send it in parts.');
  return text;
}

/** @throws DomainError 400 */
export function parseJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    throw new DomainError(400, 'Cannot be read', 'The request is not valid JSON.');
  }
}

/** The body as bytes, for uploads; refused before it is read where the sender says that it is too large. */
export async function readBytes(request: Request, mostBytes: number): Promise<Buffer> {
  const tooLarge = () =>
    new DomainError(
      422,
      'This file cannot be taken',
      `The file is larger than ${Math.floor(mostBytes / 1_000_000)} MB.`,
    );
  if (Number(request.headers.get('content-length') ?? 0) > mostBytes) throw tooLarge();
  const bytes = Buffer.from(await request.arrayBuffer());
  if (bytes.length > mostBytes) throw tooLarge();
  return bytes;
}
