import type { FieldError } from '@/lib/errors';
import { newId } from '@/lib/id';

/** What the server refused, or why it could not be reached (`status` 0), in words for the person in front of the screen. */
export class ApiProblem extends Error {
  readonly status: number;
  readonly title: string;
  readonly detail: string;
  readonly errors: FieldError[];
  readonly extra: Record<string, unknown>;

  constructor(
    problem: { status: number; title: string; detail: string; errors?: FieldError[] } & Record<string, unknown>,
  ) {
    const { status, title, detail, errors, ...extra } = problem;
    super(detail);
    this.name = 'ApiProblem';
    this.status = status;
    this.title = title;
    this.detail = detail;
    this.errors = errors ?? [];
    this.extra = extra;
  }
}

export interface ApiAnswer<T> {
  data: T;
  /** Version of the resource, from its entity tag; to be sent back as `version` with a change. */
  version: number | null;
}

export interface ApiRequest {
  method?: 'GET' | 'POST' | 'PATCH' | 'PUT' | 'DELETE';
  body?: unknown;
  /** Version that was changed (If-Match). */
  version?: number;
  /** One key an action: the same action sent twice happens once. Made anew for a POST that brings none. */
  idempotencyKey?: string;
  signal?: AbortSignal;
}

/**
 * One request to our own interface.
 * @throws ApiProblem for every refusal and when there was no answer
 */
export async function api<T>(path: string, request: ApiRequest = {}): Promise<ApiAnswer<T>> {
  const { method = 'GET', body, version, signal } = request;
  const headers: Record<string, string> = { accept: 'application/json, application/problem+json' };
  if (body !== undefined) headers['content-type'] = 'application/json';
  if (version !== undefined) headers['if-match'] = `"${version}"`;
  if (method === 'POST') headers['idempotency-key'] = request.idempotencyKey ?? newId();
  const response = await reach(path, {
    method,
    headers,
    signal,
    body: body === undefined ? undefined : JSON.stringify(body),
  });
  const content = await read(response);
  if (!response.ok) throw asProblem(response, content);
  const tag = /"(\d+)"/.exec(response.headers.get('etag') ?? '')?.[1];
  return { data: content as T, version: tag === undefined ? null : Number(tag) };
}

/**
 * Sends a file; the answer names it. The bytes are the body, so that nothing has to be packed and unpacked.
 * @throws ApiProblem as `api` does
 */
export async function uploadFile(kind: 'certificate' | 'nameplate' | 'photo', file: File): Promise<string> {
  const response = await reach(`/api/files?kind=${kind}&name=${encodeURIComponent(file.name)}`, {
    method: 'POST',
    headers: { 'content-type': 'application/octet-stream', 'idempotency-key': newId() },
    body: file,
  });
  const content = await read(response);
  if (!response.ok) throw asProblem(response, content);
  return (content as { id: string }).id;
}

async function reach(path: string, init: RequestInit): Promise<Response> {
  try {
    return await fetch(path, init);
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw new ApiProblem({
      status: 0,
      title: 'No connection',
      detail: 'The server did not answer. What you typed is still here; try again when the network is back.',
    });
  }
}

async function read(response: Response): Promise<unknown> {
  const text = await response.text();
  if (!text) return undefined;
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}

function asProblem(response: Response, content: unknown): ApiProblem {
  const problem = (typeof content === 'object' && content !== null ? content : {}) as Partial<ApiProblem>;
  return new ApiProblem({
    title: 'Not possible',
    detail: `The server answered with ${response.status} and gave no reason. What you typed is still here.`,
    ...problem,
    status: response.status,
  });
}
