import { createHash } from 'node:crypto';
import type { Knex } from 'knex';
import { z } from 'zod';
import { inScope } from '@/db/client';
import { findIdempotentAnswer, keepIdempotentAnswer } from '@/db/queries/idempotency';
import { type Action, can, permissions } from '@/lib/auth/permissions';
import { scopeOf, viewerOf } from '@/lib/auth/session';
import type { Viewer } from '@/lib/auth/viewer';
import { DomainError } from '@/lib/errors';
import { parseOr422, problemResponse } from './problem';
import { parseJson, readBody, refuseForeignOrigin } from './read-request';

export interface RouteContext<P, Q, B> {
  viewer: Viewer;
  trx: Knex.Transaction;
  params: P;
  query: Q;
  body: B;
  request: Request;
}

export interface RouteAnswer {
  status?: number;
  body?: unknown;
  /** Instead of a body: bytes as they are. */
  raw?: { bytes: Uint8Array; contentType: string };
  /** Entity tag of the answer's resource. */
  version?: number;
  headers?: Record<string, string>;
}

interface RouteSpec<P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType> {
  /** One of these is enough. */
  action: Action | readonly Action[];
  params?: P;
  query?: Q;
  body?: B;
  /** A change of a resource that others change too wants If-Match; the handler gets the version in `expectedVersion`. */
  needsVersion?: boolean;
  handle(
    context: RouteContext<z.output<P>, z.output<Q>, z.output<B>> & { expectedVersion: number },
  ): Promise<RouteAnswer>;
}

/** A handler that can say what it takes: the interface's description is made from this. */
export interface RouteHandler {
  (request: Request, context: { params: Promise<Record<string, string>> }): Promise<Response>;
  description: { action: Action[]; params?: z.ZodType; query?: z.ZodType; body?: z.ZodType; needsVersion?: boolean };
}

const none = z.unknown();

/**
 * One shape for every handler: who is it → does the request fit → may they → one transaction in which only their organisation's rows
 * exist → answer, or a problem in plain words. A POST that carries an Idempotency-Key is answered the same way the second time.
 */
export function route<
  P extends z.ZodType = typeof none,
  Q extends z.ZodType = typeof none,
  B extends z.ZodType = typeof none,
>(spec: RouteSpec<P, Q, B>): RouteHandler {
  const handler = async (request: Request, context: { params: Promise<Record<string, string>> }): Promise<Response> => {
    try {
      const viewer = await viewerOf(request.headers);
      if (!viewer)
        throw new DomainError(
          401,
          'Please sign in',
          'You are not signed in, or your session has ended. What you typed stays here.',
        );
      refuseForeignOrigin(request);
      const actions = [spec.action].flat() as Action[];
      if (!actions.some((action) => can(viewer.roles, action))) {
        throw new DomainError(
          403,
          'Not allowed',
          `Your role does not include this: ${permissions[actions[0]!].means}.`,
        );
      }
      const params = spec.params ? parseOr422(spec.params, await context.params) : (undefined as z.output<P>);
      const query = spec.query
        ? parseOr422(spec.query, Object.fromEntries(new URL(request.url).searchParams))
        : (undefined as z.output<Q>);
      const text = spec.body ? await readBody(request) : '';
      const body = spec.body ? parseOr422(spec.body, parseJson(text)) : (undefined as z.output<B>);
      const expectedVersion = spec.needsVersion ? readIfMatch(request) : 0;
      const key = request.method === 'POST' ? request.headers.get('idempotency-key') : null;
      const requestHash = createHash('sha256')
        .update(`${request.method} ${new URL(request.url).pathname}\n${text}`)
        .digest('hex');

      return await inScope(scopeOf(viewer), async (trx) => {
        if (key) {
          const kept = await findIdempotentAnswer(trx, viewer.accountId, key);
          if (kept && kept.requestHash !== requestHash) {
            throw new DomainError(422, 'Key used already', 'This Idempotency-Key was used for another request.');
          }
          if (kept) return respond({ status: kept.status, body: kept.answer });
        }
        const answer = await spec.handle({ viewer, trx, params, query, body, request, expectedVersion });
        if (key) await keepIdempotentAnswer(trx, { accountId: viewer.accountId, key, requestHash, answer });
        return respond(answer);
      });
    } catch (error) {
      return problemResponse(error, request);
    }
  };
  return Object.assign(handler, { description: { ...spec, action: [spec.action].flat() as Action[] } });
}

/** The answer as JSON, never kept by a cache in between. */
export function respond(answer: RouteAnswer): Response {
  const headers: Record<string, string> = { 'cache-control': 'no-store', ...answer.headers };
  if (answer.version !== undefined) headers.etag = `"${answer.version}"`;
  if (answer.raw) {
    const body = new Uint8Array(answer.raw.bytes);
    return new Response(body, {
      status: answer.status ?? 200,
      headers: { 'content-type': answer.raw.contentType, ...headers },
    });
  }
  if (answer.body === undefined || answer.body === null)
    return new Response(null, { status: answer.status ?? 204, headers });
  return new Response(JSON.stringify(answer.body), {
    status: answer.status ?? 200,
    headers: { 'content-type': 'application/json', ...headers },
  });
}

function readIfMatch(request: Request): number {
  const value = request.headers.get('if-match');
  if (!value) throw new DomainError(428, 'Version missing', 'Say with If-Match which version you changed.');
  const version = Number(/^(?:W\/)?"(\d+)"$/.exec(value)?.[1]);
  if (!Number.isInteger(version))
    throw new DomainError(412, 'Changed meanwhile', 'If-Match holds no version of this resource.');
  return version;
}
