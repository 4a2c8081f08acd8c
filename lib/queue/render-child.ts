import type { ReportModel } from '@/lib/reporting/report-model';
import { renderReportPdf } from '@/templates/report/render';
import type { ReportPhotos } from '@/templates/report/report-document';

/** `model`: the report and its photographs, see `ReportToDraw`. */
export type RenderRequest = { id: number; model: unknown };
export type ReportToDraw = { report: ReportModel; photos: ReportPhotos };
export type RenderAnswer =
  | { kind: 'ready' }
  | { kind: 'done'; id: number; pdf: Uint8Array; rssBytes: number }
  | { kind: 'failed'; id: number; message: string; rssBytes: number };

/**
 * The process that draws reports, apart from web server and queue, because drawing stops the event loop for its
 * whole length. Drawing needs no database and no settings: the model goes in, the bytes come out.
 */
function answer(message: RenderAnswer): void {
  if (!process.connected) process.exit(0);
  process.send?.(message);
}

process.on('message', async ({ id, model }: RenderRequest) => {
  try {
    const { report, photos } = model as ReportToDraw;
    const pdf = await renderReportPdf(report, photos);
    answer({ kind: 'done', id, pdf, rssBytes: process.memoryUsage.rss() });
  } catch (error) {
    const message = error instanceof Error ? (error.stack ?? error.message) : String(error);
    answer({ kind: 'failed', id, message, rssBytes: process.memoryUsage.rss() });
  }
});

// Without its worker this process has no purpose, however the worker ended.
process.on('disconnect', () => process.exit(0));
// A Ctrl-C reaches the whole group; the worker finishes the drawing in hand and then closes the channel.
process.on('SIGINT', () => undefined);

answer({ kind: 'ready' });
