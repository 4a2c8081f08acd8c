import { z } from 'zod';
import { appDb } from '@/db/client';
import { takeAttempt } from '@/db/queries/accounts';
import { DomainError } from '@/lib/errors';
import { parseOr422, problemResponse } from './problem';
import { parseJson, readBody, refuseForeignOrigin } from './read-request';
import { type RouteAnswer, type RouteHandler, respond } from './route';

interface PublicRouteSpec<P extends z.ZodType, B extends z.ZodType> {
  /** Whoever has no session is slowed down by address: so many at once, then one each `1 / refillPerSecond` seconds. */
  throttle: { name: string; capacity: number; refillPerSecond: number };
  params?: P;
  body?: B;
  handle(context: { params: z.output<P>; body: z.output<B>; request: Request }): Promise<RouteAnswer>;
}

const none = z.unknown();

/** Where the request came from, as far as the server in front of us says so. */
export const clientAddress = (request: Request): string =>
  request.headers.get('x-forwarded-for')?.split(',')[0]?.trim() || 'unknown';

/** The wrapper for what needs no session: the same checks and the same problems as `route`, and a limit on how often. */
export function publicRoute<P extends z.ZodType = typeof none, B extends z.ZodType = typeof none>(
  spec: PublicRouteSpec<P, B>,
): RouteHandler {
  const handler = async (request: Request, context: { params: Promise<Record<string, string>> }): Promise<Response> => {
    try {
      refuseForeignOrigin(request);
      const params = spec.params ? parseOr422(spec.params, await context.params) : (undefined as z.output<P>);
      const body = spec.body ? parseOr422(spec.body, parseJson(await readBody(request))) : (undefined as z.output<B>);
      await refuseTooMany(`${spec.throttle.name}:${clientAddress(request)}`, spec.throttle);
      return respond(await spec.handle({ params, body, request }));
    } catch (error) {
      return problemResponse(error, request);
    }
  };
  return Object.assign(handler, { description: { action: [], params: spec.params, body: spec.body } });
}

/** @throws DomainError 429 with the seconds to wait */
export async function refuseTooMany(
  bucket: string,
  limit: { capacity: number; refillPerSecond: number },
): Promise<void> {
  const wait = Math.ceil(await takeAttempt(appDb(), bucket, limit.capacity, limit.refillPerSecond));
  if (wait === 0) return;
  throw new DomainError(429, 'Too many attempts', `Please wait ${wait} seconds, then try again.`, [], {
    retryAfterSeconds: wait,
  });
}
