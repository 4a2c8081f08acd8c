import { version } from '@/lib/version';

/** The process answers. */
export function GET(): Response {
  return Response.json({ status: 'up', version }, { headers: { 'cache-control': 'no-store' } });
}
