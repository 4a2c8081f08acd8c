import { ApiProblem, api } from './api-client';

const noConnection = () =>
  new ApiProblem({
    status: 0,
    title: 'No connection',
    detail: 'The server did not answer. Try again when the network is back.',
  });

async function post(path: string, fields: Record<string, string>): Promise<Response> {
  const { data } = await api<{ csrfToken: string }>('/api/auth/csrf');
  const body = new URLSearchParams({ ...fields, csrfToken: data.csrfToken, json: 'true', callbackUrl: '/' });
  try {
    return await fetch(path, { method: 'POST', body });
  } catch {
    throw noConnection();
  }
}

export type SignInOutcome =
  | { ok: true }
  | { ok: false; reason: 'wrong' }
  | { ok: false; reason: 'wait'; waitSeconds: number };

/** @throws ApiProblem when the server did not answer */
export async function signIn(email: string, password: string): Promise<SignInOutcome> {
  const response = await post('/api/auth/callback/credentials', { email, password });
  const answer = (await response.json().catch(() => ({}))) as { url?: string };
  const error = answer.url ? new URL(answer.url, window.location.origin).searchParams.get('error') : null;
  if (response.ok && !error) return { ok: true };
  const waitSeconds = /^wait:(\d+)$/.exec(error ?? '')?.[1];
  return waitSeconds ? { ok: false, reason: 'wait', waitSeconds: Number(waitSeconds) } : { ok: false, reason: 'wrong' };
}

/** @throws ApiProblem when the server did not answer */
export async function signOut(): Promise<void> {
  await post('/api/auth/signout', {});
}

/** Moves the session to another organisation of the same account. */
export async function chooseOrganisation(organisationId: string): Promise<void> {
  const { data } = await api<{ csrfToken: string }>('/api/auth/csrf');
  await api('/api/auth/session', { method: 'POST', body: { csrfToken: data.csrfToken, data: { organisationId } } });
}
