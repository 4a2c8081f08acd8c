import { appDb } from '@/db/client';
import { takeAttempt } from '@/db/queries/accounts';
import { DomainError } from '@/lib/errors';
import { EvaluationError, evaluationInput } from '@/lib/evaluation';
import { problemResponse } from '@/lib/http/problem';
import { computeEvaluation } from '@/lib/services/compute-evaluation';

/** Room for a burst, then four requests a second for one address: a calculator, not a data centre. */
const limit = { capacity: 240, refillPerSecond: 4 };
const maxBytes = 2_000_000;

/** The calculator: the evaluation's own door as JSON, for anybody, without an account. */
async function calculate(request: Request): Promise<Response> {
  try {
    const address = request.headers.get('x-forwarded-for')?.split(',')[0]?.trim() ?? 'local';
    const waitSeconds = await takeAttempt(appDb(), `evaluations:${address}`, limit.capacity, limit.refillPerSecond);
    if (waitSeconds > 0) {
      throw new DomainError(429, 'Too many requests', 'Please wait a moment.', [], {
        retryAfterSeconds: Math.ceil(waitSeconds),
      });
    }
    const text = await request.text();
    if (text.length > maxBytes) throw new DomainError(422, 'Too much at once', 'The request is larger than 2 MB.');
    const result = await computeEvaluation(text, parse(text), request.signal);
    return new Response(`{"result":${result}}`, {
      headers: { 'content-type': 'application/json', 'cache-control': 'no-store' },
    });
  } catch (error) {
    // Nobody reads this answer any more.
    if (request.signal.aborted) return new Response(null, { status: 499 });
    if (error instanceof EvaluationError) {
      const detail = error.issues.map((issue) => issue.detail).join(' ');
      return problemResponse(new DomainError(422, 'This cannot be evaluated', detail, [...error.issues]), request);
    }
    return problemResponse(error, request);
  }
}

export const POST = Object.assign(calculate, { description: { action: [], body: evaluationInput } });

function parse(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    throw new DomainError(422, 'Cannot be read', 'The request is not valid JSON.', [
      { pointer: '', detail: 'Not valid JSON.' },
    ]);
  }
}
