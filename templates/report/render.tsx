import { renderToBuffer } from '@react-pdf/renderer';
import type { ReportModel } from '@/lib/reporting/report-model';
import { loadFonts } from '@/templates/report/fonts';
import { ReportDocument, type ReportPhotos } from '@/templates/report/report-document';
import { reportPages } from '@/templates/report/report-pages';

/**
 * The report as a PDF. The same model gives the same bytes: no clock, no random name. Stops the event loop while it paints, so it
 * belongs in a process of its own.
 * @param photos every photograph that the model names
 * @throws Error where one of them is missing
 * @throws MissingGlyphError where a word of the model has a character that no font of the report has
 */
export async function renderReportPdf(model: ReportModel, photos: ReportPhotos = {}): Promise<Buffer> {
  const missing = model.blocks.flatMap((block) => block.photos ?? []).find(({ fileId }) => !photos[fileId]);
  if (missing) throw new Error(`the photo ${missing.fileId} of the report was not handed over`);
  const made = reportPages(model, await loadFonts());
  return renderToBuffer(<ReportDocument model={model} made={made} date={dateOf(model)} photos={photos} />);
}

/** Date of the document's information: when it was issued; a draft has that of the job's first day. */
function dateOf(model: ReportModel): Date {
  for (const text of [model.document.issuedAt, model.job.from]) {
    const date = new Date(text?.match(/^\d{4}-\d{2}-\d{2}(T.*)?/)?.[0] ?? '');
    if (!Number.isNaN(date.getTime())) return date;
  }
  return new Date(0);
}
