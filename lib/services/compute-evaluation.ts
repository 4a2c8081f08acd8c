import { env } from '@/lib/env';
import { DomainError } from '@/lib/errors';
import { evaluateUnknown } from '@/lib/evaluation';
import { countReadings } from '@/lib/evaluation/count-readings';
import { newId } from '@/lib/id';
import { evaluationPool, NoPlaceFree } from '@/lib/queue/evaluation-pool';
import { TookTooLong } from '@/lib/queue/warm-process';

/** Up to here an evaluation takes a few milliseconds and is computed at once, here. */
const MOST_READINGS_HERE = 500;
/** Longer texts leave the event loop too, whatever they hold: checking them takes its time as well. */
const LONGEST_TEXT_HERE = 200_000;

/**
 * Evaluates JSON of unknown origin without stopping the web server: large inputs in a process beside it.
 *
 * @param text the input as JSON text, and `input`, the same parsed
 * @param signal aborted when whoever asked has gone: the place is freed
 * @returns the result as JSON text
 * @throws EvaluationError where the input is refused; DomainError 503 with an id where it takes too long or no place is free
 */
export async function computeEvaluation(text: string, input: unknown, signal: AbortSignal): Promise<string> {
  const readings = countReadings(input);
  if (readings <= MOST_READINGS_HERE && text.length <= LONGEST_TEXT_HERE) return JSON.stringify(evaluateUnknown(input));
  const limitMs = env.EVALUATION_TIME_LIMIT_MS;
  try {
    return await evaluationPool().evaluate(text, limitMs, signal);
  } catch (error) {
    if (error instanceof TookTooLong) {
      throw unavailable(
        'This takes too long',
        `Computing these ${readings} readings took more than ${limitMs / 1000} s and was stopped. Please try again, or with fewer readings.`,
        30,
      );
    }
    if (error instanceof NoPlaceFree) {
      throw unavailable('Busy', 'Other large evaluations are being computed. Please try again in a moment.', 10);
    }
    throw error;
  }
}

/** The id stands in the log too, so that somebody who asks can be answered. */
function unavailable(title: string, detail: string, retryAfterSeconds: number): DomainError {
  const errorId = newId();
  console.error(JSON.stringify({ errorId, title, detail }));
  return new DomainError(503, title, detail, [], { retryAfterSeconds, errorId });
}
