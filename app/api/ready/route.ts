import { readiness } from '@/lib/services/readiness';

/** Whether everything is there that the program needs: 503 while something is missing. */
export async function GET(): Promise<Response> {
  const parts = await readiness();
  const ready = Object.values(parts).every((state) => state === 'ready');
  return Response.json(
    { status: ready ? 'ready' : 'not-ready', parts },
    { status: ready ? 200 : 503, headers: { 'cache-control': 'no-store' } },
  );
}
