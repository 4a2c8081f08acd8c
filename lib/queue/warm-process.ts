import { type ChildProcess, fork } from 'node:child_process';

/** What a warm process sends: `ready` once, then one answer for each request, each with the memory that it holds. */
export type WarmAnswer = { kind: string; rssBytes?: number };

export type WarmProcessLimits = {
  /** A process is replaced after this many requests, or when it holds more memory than this. */
  maxRequests: number;
  maxRssBytes: number;
  startTimeoutMs: number;
};

/** A request that took longer than its time limit; the process that worked on it is ended. */
export class TookTooLong extends Error {
  override readonly name = 'TookTooLong';
}

/** The process ended by itself, or somebody ended it. */
export class ProcessEnded extends Error {
  override readonly name = 'ProcessEnded';
}

type Started = { child: ChildProcess; requests: number };

/**
 * One Node process beside this one that answers one request at a time, kept warm, replaced before it grows old and after
 * it failed. Whoever uses it asks the next request only after the answer to the one before.
 */
export class WarmProcess<Request extends object, Answer extends WarmAnswer> {
  private child: ChildProcess | undefined;
  private started: Promise<Started> | undefined;

  constructor(
    private readonly childModule: string,
    /** What it is to people who read the log: `The drawing process`. */
    private readonly name: string,
    private readonly limits: WarmProcessLimits,
  ) {}

  /** Number of the process, also while it starts; undefined when there is none. */
  get processId(): number | undefined {
    return this.child?.pid;
  }

  /** Starts the process ahead of the first request. */
  warmUp(): void {
    this.started ??= this.start();
    this.started.catch(() => undefined);
  }

  /**
   * @param doing what it is busy with, for the message of an error
   * @throws TookTooLong, ProcessEnded, the signal's reason; the process is replaced after each
   */
  async ask(request: Request, timeoutMs: number, doing: string, signal?: AbortSignal): Promise<Answer> {
    try {
      this.warmUp();
      const started = await untilAborted(this.started!, signal);
      const answered = this.nextAnswer(started.child, timeoutMs, doing, signal);
      started.child.send(request, () => undefined);
      const answer = (await answered) as Answer;
      this.recycle(started, answer.rssBytes ?? 0);
      return answer;
    } catch (error) {
      this.end();
      throw error;
    }
  }

  /** Ends the process, also one that is still starting; the next request starts another. */
  end(): void {
    this.child?.kill('SIGKILL');
    this.child = undefined;
    this.started = undefined;
  }

  private async start(): Promise<Started> {
    const child = fork(this.childModule, { execArgv: ['--import', 'tsx'], serialization: 'advanced' });
    this.child = child;
    // One that ends between two requests is not asked again; a message that it can no longer take is no error of ours.
    child.on('exit', () => this.child === child && this.end()).on('error', () => undefined);
    try {
      await this.nextAnswer(child, this.limits.startTimeoutMs, 'starting');
      return { child, requests: 0 };
    } catch (error) {
      child.kill('SIGKILL');
      if (this.child === child) this.end();
      throw error;
    }
  }

  /** Waits for the next message of the process; its death, the time limit and the signal are errors. */
  private nextAnswer(child: ChildProcess, timeoutMs: number, doing: string, signal?: AbortSignal): Promise<WarmAnswer> {
    return new Promise((resolve, reject) => {
      const finish = (act: () => void) => {
        clearTimeout(timer);
        child.off('message', onMessage).off('exit', onExit).off('error', onError);
        signal?.removeEventListener('abort', onAbort);
        act();
      };
      const onMessage = (message: unknown) => finish(() => resolve(message as WarmAnswer));
      const onExit = (code: number | null, ended: string | null) =>
        finish(() => reject(new ProcessEnded(`${this.name} ended (${ended ?? code}) while ${doing}.`)));
      const onError = (error: Error) => finish(() => reject(error));
      const onAbort = () => finish(() => reject(signal?.reason));
      const onTimeout = () =>
        finish(() => reject(new TookTooLong(`${this.name} took more than ${timeoutMs / 1000} s while ${doing}.`)));
      const timer = setTimeout(onTimeout, timeoutMs);
      child.on('message', onMessage).on('exit', onExit).on('error', onError);
      signal?.addEventListener('abort', onAbort);
      if (child.exitCode !== null || child.signalCode !== null) onExit(child.exitCode, child.signalCode);
      else if (signal?.aborted) onAbort();
    });
  }

  private recycle(started: Started, rssBytes: number): void {
    started.requests += 1;
    if (started.requests < this.limits.maxRequests && rssBytes <= this.limits.maxRssBytes) return;
    this.end();
    this.warmUp();
  }
}

function untilAborted<T>(work: Promise<T>, signal?: AbortSignal): Promise<T> {
  if (!signal) return work;
  return new Promise((resolve, reject) => {
    const onAbort = () => reject(signal.reason);
    if (signal.aborted) onAbort();
    signal.addEventListener('abort', onAbort, { once: true });
    work.then(resolve, reject).finally(() => signal.removeEventListener('abort', onAbort));
  });
}
