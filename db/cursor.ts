import { DomainError } from '@/lib/errors';

/** Where the next page begins: the sort key of the last row, opaque to the reader. */
export const writeCursor = (key: string[]): string => Buffer.from(JSON.stringify(key)).toString('base64url');

/** @throws DomainError 422 when it is not one of ours */
export function readCursor(cursor: string | null | undefined, length: number): string[] | null {
  if (!cursor) return null;
  try {
    const key: unknown = JSON.parse(Buffer.from(cursor, 'base64url').toString());
    if (Array.isArray(key) && key.length === length && key.every((part) => typeof part === 'string')) return key;
  } catch {
    // Said below.
  }
  throw new DomainError(
    422,
    'Cannot be read',
    'This is not the mark of a page of this list. Begin at the first page.',
    [{ pointer: '/after', detail: 'Not the mark of a page of this list.' }],
  );
}
