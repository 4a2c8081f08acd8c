import { encode } from 'next-auth/jwt';
import type { TestPerson } from './test-workshop';

type Handler = (request: Request, context: { params: Promise<Record<string, string>> }) => Promise<Response>;

export interface Call {
  /** Who asks; nobody: without a session. */
  as?: Pick<TestPerson, 'accountId' | 'organisationId'> & { sessionVersion?: number };
  method?: string;
  path?: string;
  params?: Record<string, string>;
  body?: unknown;
  headers?: Record<string, string>;
}

export interface CallAnswer<T> {
  status: number;
  body: T;
  headers: Headers;
  /** From the entity tag. */
  version: number | null;
}

/** Calls a real route handler with a real signed session cookie. */
export async function callRoute<T = Record<string, unknown>>(
  handler: unknown,
  call: Call = {},
): Promise<CallAnswer<T>> {
  const { path = '/api/test', params = {}, body } = call;
  const method = call.method ?? (body === undefined ? 'GET' : 'POST');
  const headers = new Headers({ host: '127.0.0.1:3000', ...call.headers });
  if (call.as) headers.set('cookie', await sessionCookie(call.as));
  const request = new Request(new URL(path, 'http://127.0.0.1:3000'), {
    method,
    headers,
    body: body === undefined ? undefined : JSON.stringify(body),
  });
  const response = await (handler as Handler)(request, { params: Promise.resolve(params) });
  const text = await response.text();
  const isJson = /json/.test(response.headers.get('content-type') ?? '');
  const tag = /"(\d+)"/.exec(response.headers.get('etag') ?? '')?.[1];
  return {
    status: response.status,
    body: (text && isJson ? JSON.parse(text) : text || undefined) as T,
    headers: response.headers,
    version: tag === undefined ? null : Number(tag),
  };
}

async function sessionCookie(who: NonNullable<Call['as']>): Promise<string> {
  const token = await encode({
    token: { sub: who.accountId, organisationId: who.organisationId, sessionVersion: who.sessionVersion ?? 1 },
    secret: process.env.NEXTAUTH_SECRET ?? '',
  });
  return `next-auth.session-token=${token}`;
}

/** `If-Match` for a version that was read. */
export const ifMatch = (version: number | null) => ({ 'if-match': `"${version}"` });
