import { type ChildProcess, fork } from 'node:child_process';
import path from 'node:path';
import type { RenderAnswer, RenderRequest, ReportToDraw } from './render-child';

export type RenderPoolLimits = {
  /** A process is replaced after this many documents, or when it holds more memory than this. */
  maxRenders: number;
  maxRssBytes: number;
  /** One drawing; and the start of a process with its fonts. */
  renderTimeoutMs: number;
  startTimeoutMs: number;
};

export const defaultRenderLimits: RenderPoolLimits = {
  maxRenders: 50,
  maxRssBytes: 400 * 1024 * 1024,
  renderTimeoutMs: 20_000,
  startTimeoutMs: 60_000,
};

type Warm = { child: ChildProcess; renders: number; rssBytes: number };

/** Waits for the next answer of the process; its death or the time limit are errors. */
function nextAnswer(child: ChildProcess, timeoutMs: number, what: string): Promise<RenderAnswer> {
  return new Promise((resolve, reject) => {
    const finish = (act: () => void) => {
      clearTimeout(timer);
      child.off('message', onMessage).off('exit', onExit).off('error', onError);
      act();
    };
    const onMessage = (message: unknown) => finish(() => resolve(message as RenderAnswer));
    const onExit = (code: number | null, signal: string | null) =>
      finish(() => reject(new Error(`The drawing process ended (${signal ?? code}) while ${what}.`)));
    const onError = (error: Error) => finish(() => reject(error));
    const timer = setTimeout(
      () => finish(() => reject(new Error(`The drawing process took more than ${timeoutMs / 1000} s while ${what}.`))),
      timeoutMs,
    );
    child.on('message', onMessage).on('exit', onExit).on('error', onError);
  });
}

/** One warm drawing process, one document at a time, replaced before it grows old and after it failed. */
export class RenderPool {
  private child: ChildProcess | undefined;
  private warm: Promise<Warm> | undefined;
  private last: Promise<unknown> = Promise.resolve();
  private nextId = 1;

  constructor(
    private readonly childModule: string = path.join(import.meta.dirname, 'render-child.ts'),
    private readonly limits: RenderPoolLimits = defaultRenderLimits,
  ) {}

  /** Starts the process ahead of the first document. */
  warmUp(): void {
    this.warm ??= this.start();
    this.warm.catch(() => undefined);
  }

  /** Draws one document; a second try in a fresh process after a failure, then the error. */
  render(model: unknown): Promise<Buffer> {
    const turn = this.last.then(() => this.attempt(model).catch(() => this.attempt(model)));
    this.last = turn.catch(() => undefined);
    return turn;
  }

  /** Waits for the drawing in hand and ends the process. */
  async close(): Promise<void> {
    await this.last;
    this.retire();
  }

  private async start(): Promise<Warm> {
    const child = fork(this.childModule, { execArgv: ['--import', 'tsx'], serialization: 'advanced' });
    this.child = child;
    try {
      await nextAnswer(child, this.limits.startTimeoutMs, 'starting');
      return { child, renders: 0, rssBytes: 0 };
    } catch (error) {
      child.kill('SIGKILL');
      throw error;
    }
  }

  /** Also ends a process that is still starting. */
  private retire(): void {
    this.child?.kill('SIGKILL');
    this.child = undefined;
    this.warm = undefined;
  }

  private async attempt(model: unknown): Promise<Buffer> {
    try {
      this.warmUp();
      const warm = (await this.warm)!;
      const request: RenderRequest = { id: this.nextId++, model };
      const answered = nextAnswer(warm.child, this.limits.renderTimeoutMs, 'drawing');
      warm.child.send(request);
      const answer = await answered;
      if (answer.kind !== 'done') throw new Error(answer.kind === 'failed' ? answer.message : 'Unexpected answer.');
      this.recycle(warm, answer.rssBytes);
      return Buffer.from(answer.pdf);
    } catch (error) {
      this.retire();
      throw error;
    }
  }

  private recycle(warm: Warm, rssBytes: number): void {
    warm.renders += 1;
    if (warm.renders < this.limits.maxRenders && rssBytes <= this.limits.maxRssBytes) return;
    this.retire();
    this.warmUp();
  }
}

/** The worker's own pool. */
export const renderPool = new RenderPool();

/** Draws a report as PDF in the warm process. Throws after two failed tries. */
export function renderPdf(drawn: ReportToDraw): Promise<Buffer> {
  return renderPool.render(drawn);
}
