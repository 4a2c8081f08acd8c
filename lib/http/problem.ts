import type { z } from 'zod';
import { asDomainError } from '@/db/errors';
import { DomainError, type FieldError } from '@/lib/errors';
import { newId } from '@/lib/id';

/** RFC 9457. Unexpected errors are logged with an id, and only the id is answered. */
export function problemResponse(thrown: unknown, request: Request): Response {
  const error = asDomainError(thrown);
  const instance = new URL(request.url).pathname;
  if (error instanceof DomainError) {
    const headers: Record<string, string> = { 'content-type': 'application/problem+json' };
    if (typeof error.extra.retryAfterSeconds === 'number')
      headers['retry-after'] = String(error.extra.retryAfterSeconds);
    return new Response(
      JSON.stringify({
        type: 'about:blank',
        title: error.title,
        status: error.status,
        detail: error.detail,
        instance,
        ...(error.errors.length ? { errors: error.errors } : {}),
        ...error.extra,
      }),
      { status: error.status, headers },
    );
  }
  const errorId = newId();
  console.error(
    JSON.stringify({
      errorId,
      instance,
      message: String(error),
      stack: error instanceof Error ? error.stack : undefined,
    }),
  );
  return new Response(
    JSON.stringify({
      type: 'about:blank',
      title: 'Something went wrong here',
      status: 500,
      detail: `This was not your doing. Nothing was saved by this request. If it happens again, tell your administrator this id: ${errorId}`,
      instance,
      errorId,
    }),
    { status: 500, headers: { 'content-type': 'application/problem+json' } },
  );
}

const escapePointer = (part: PropertyKey) => String(part).replaceAll('~', '~0').replaceAll('/', '~1');

/** What zod found, as JSON pointers and sentences. */
export const fieldErrors = (error: z.ZodError): FieldError[] =>
  error.issues.map((issue) => ({
    pointer: issue.path.length ? `/${issue.path.map(escapePointer).join('/')}` : '',
    detail: issue.code === 'unrecognized_keys' ? `Unknown field: ${issue.keys.join(', ')}.` : issue.message,
  }));

/** @throws DomainError 422 naming every field that does not fit */
export function parseOr422<S extends z.ZodType>(schema: S, value: unknown): z.output<S> {
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  const errors = fieldErrors(parsed.error);
  throw new DomainError(422, 'Please look at the marked fields', errors.map((e) => e.detail).join(' '), errors);
}
