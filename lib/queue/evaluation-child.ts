import { runInNewContext } from 'node:vm';
import { EvaluationError, type EvaluationIssue, evaluateUnknown } from '@/lib/evaluation';

/** `input`: the evaluation's input as JSON text. */
export type EvaluationRequest = { input: string; timeLimitMs: number };
export type EvaluationAnswer =
  | { kind: 'ready' }
  /** `result` as JSON text: nothing is gained by building it up again on the other side. */
  | { kind: 'done'; result: string; rssBytes: number }
  | { kind: 'refused'; issues: readonly EvaluationIssue[]; rssBytes: number }
  | { kind: 'failed'; message: string; rssBytes: number };

/** The process that computes large evaluations, apart from the web server, whose event loop they would stop. */
function answer(message: EvaluationAnswer): void {
  if (!process.connected) process.exit(0);
  process.send?.(message);
}

/** The server ends this process at the limit; where the server has died meanwhile, it ends by itself a little later. */
function within<T>(timeLimitMs: number, work: () => T): T {
  return runInNewContext('work()', { work }, { timeout: timeLimitMs + 5000 });
}

process.on('message', ({ input, timeLimitMs }: EvaluationRequest) => {
  try {
    const result = within(timeLimitMs, () => JSON.stringify(evaluateUnknown(JSON.parse(input))));
    answer({ kind: 'done', result, rssBytes: process.memoryUsage.rss() });
  } catch (error) {
    const rssBytes = process.memoryUsage.rss();
    if (error instanceof EvaluationError) return answer({ kind: 'refused', issues: error.issues, rssBytes });
    const message = error instanceof Error ? (error.stack ?? error.message) : String(error);
    answer({ kind: 'failed', message, rssBytes });
  }
});

// Without its web server this process has no purpose, however the server ended.
process.on('disconnect', () => process.exit(0));
// A Ctrl-C reaches the whole group; the server finishes its answers and then closes the channel.
process.on('SIGINT', () => undefined);

answer({ kind: 'ready' });
