import path from 'node:path';
import type { RenderAnswer, RenderRequest, ReportToDraw } from './render-child';
import { WarmProcess } from './warm-process';

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

/** One warm drawing process, one document at a time, replaced before it grows old and after it failed. */
export class RenderPool {
  private readonly process: WarmProcess<RenderRequest, RenderAnswer>;
  private last: Promise<unknown> = Promise.resolve();
  private nextId = 1;

  constructor(
    childModule: string = path.join(import.meta.dirname, 'render-child.ts'),
    private readonly limits: RenderPoolLimits = defaultRenderLimits,
  ) {
    const { maxRenders, maxRssBytes, startTimeoutMs } = limits;
    this.process = new WarmProcess(childModule, 'The drawing process', {
      maxRequests: maxRenders,
      maxRssBytes,
      startTimeoutMs,
    });
  }

  /** Starts the process ahead of the first document. */
  warmUp(): void {
    this.process.warmUp();
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
    this.process.end();
  }

  private async attempt(model: unknown): Promise<Buffer> {
    const answer = await this.process.ask({ id: this.nextId++, model }, this.limits.renderTimeoutMs, 'drawing');
    if (answer.kind === 'done') return Buffer.from(answer.pdf);
    // A failed drawing may have left the process in a state that fails the next one too.
    this.process.end();
    throw new Error(answer.kind === 'failed' ? answer.message : 'Unexpected answer.');
  }
}

/** The worker's own pool. */
export const renderPool = new RenderPool();

/** Draws a report as PDF in the warm process. Throws after two failed tries. */
export function renderPdf(drawn: ReportToDraw): Promise<Buffer> {
  return renderPool.render(drawn);
}
