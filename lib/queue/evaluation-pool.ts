import path from 'node:path';
import { EvaluationError } from '@/lib/evaluation';
import type { EvaluationAnswer, EvaluationRequest } from './evaluation-child';
import { ProcessEnded, WarmProcess } from './warm-process';

/** More than this many wait: whoever comes then is asked to come again. */
const MOST_WAITING = 8;

/** All places are taken. */
export class NoPlaceFree extends Error {
  override readonly name = 'NoPlaceFree';
}

type Waiting = { begin: () => void };

/**
 * One warm process that computes large evaluations, one at a time, first come first served; whoever goes away frees
 * the place, waiting or in hand. The process is started by the first request and replaced after a failure.
 */
export class EvaluationPool {
  /** Evaluations that the process answered: results and refusals. */
  answered = 0;
  private readonly process: WarmProcess<EvaluationRequest, EvaluationAnswer>;
  private readonly waiting: Waiting[] = [];
  private isBusy = false;

  constructor(
    // Not from the folder of this module: the built web server carries it elsewhere, beside its own files.
    childModule: string = path.join(/* turbopackIgnore: true */ process.cwd(), 'lib/queue/evaluation-child.ts'),
  ) {
    this.process = new WarmProcess(childModule, 'The computing process', {
      maxRequests: 1000,
      maxRssBytes: 400 * 1024 * 1024,
      startTimeoutMs: 60_000,
    });
  }

  get processId(): number | undefined {
    return this.process.processId;
  }

  /**
   * @param input the evaluation's input as JSON text
   * @param timeLimitMs for the computing itself; waiting for a place and for the start of the process do not count
   * @returns the result as JSON text
   * @throws EvaluationError, TookTooLong, NoPlaceFree, the signal's reason
   */
  async evaluate(input: string, timeLimitMs: number, signal?: AbortSignal): Promise<string> {
    await this.takePlace(signal);
    try {
      const ask = () => this.process.ask({ input, timeLimitMs }, timeLimitMs, 'computing', signal);
      // Somebody else may have ended the process just now; a second death is this input's doing.
      const answer = await ask().catch((error) => {
        if (error instanceof ProcessEnded) return ask();
        throw error;
      });
      this.answered += 1;
      if (answer.kind === 'done') return answer.result;
      if (answer.kind === 'refused') throw new EvaluationError(answer.issues);
      throw new Error(answer.kind === 'failed' ? answer.message : 'Unexpected answer.');
    } finally {
      this.isBusy = false;
      this.waiting.shift()?.begin();
    }
  }

  /** Ends the process; the next request starts another. */
  close(): void {
    this.process.end();
  }

  private takePlace(signal?: AbortSignal): Promise<void> {
    signal?.throwIfAborted();
    if (!this.isBusy) {
      this.isBusy = true;
      return Promise.resolve();
    }
    if (this.waiting.length >= MOST_WAITING) throw new NoPlaceFree('All places for large evaluations are taken.');
    return new Promise((resolve, reject) => {
      const onAbort = () => {
        this.waiting.splice(this.waiting.indexOf(place), 1);
        reject(signal?.reason);
      };
      const place: Waiting = {
        begin: () => {
          signal?.removeEventListener('abort', onAbort);
          this.isBusy = true;
          resolve();
        },
      };
      signal?.addEventListener('abort', onAbort, { once: true });
      this.waiting.push(place);
    });
  }
}

declare global {
  var witnessmarkEvaluations: EvaluationPool | undefined;
}

/** The web server's one pool; modules are loaded more than once in a built application, its globals are not. */
export function evaluationPool(): EvaluationPool {
  globalThis.witnessmarkEvaluations ??= new EvaluationPool();
  return globalThis.witnessmarkEvaluations;
}
