import { createHash } from 'node:crypto';
import { inScope, systemScope } from '@/db/client';
import { closeJob } from '@/db/queries/jobs';
import { queueMail } from '@/db/queries/outbox';
import {
  findFile,
  findReport,
  insertFile,
  keepReportPdf,
  lockReport,
  noteRenderFailure,
  type ReportRow,
} from '@/db/queries/reports';
import { mailRecipients } from '@/db/read-models/mail-recipients';
import { env } from '@/lib/env';
import { newId } from '@/lib/id';
import type { ReportModel } from '@/lib/reporting/report-model';
import { signedModel } from '@/lib/services/signed-model';
import { getFile, putFile } from '@/lib/storage/storage';
import { reportAnsweredMail } from '@/templates/email/report-answered';
import { reportIssuedMail } from '@/templates/email/report-issued';
import type { ReportPhotos } from '@/templates/report/report-document';
import { renderPdf } from './render-pool';

/** Nobody is told about a report of last year because its document is drawn again. */
const newsDays = 7;

/**
 * Draws the PDF of a report, stores it and tells those whom it concerns; once for the document as issued, once more with the
 * customer's answer. Repeating it changes nothing: a document that is there stays.
 */
export async function renderReport(organisationId: string, reportId: string): Promise<void> {
  const scope = systemScope(organisationId);
  try {
    const report = await inScope(scope, (trx) => findReport(trx, reportId));
    if (!report) return;
    if (!report.pdfFileId) await renderOne(organisationId, report, 'issued', report.model);
    if (report.signedAt && !report.signedPdfFileId) {
      const model = await inScope(scope, (trx) => signedModel(trx, report));
      await renderOne(organisationId, report, 'signed', model);
    }
  } catch (error) {
    const errorId = newId();
    console.error(JSON.stringify({ errorId, reportId, message: String(error) }));
    await inScope(scope, (trx) => noteRenderFailure(trx, reportId, errorId));
    throw error;
  }
}

/** The photographs that the report names, as they were when it was issued. */
async function photosOf(organisationId: string, model: ReportModel): Promise<ReportPhotos> {
  const named = model.blocks.flatMap(({ photos }) => photos ?? []);
  const photos: Record<string, Uint8Array> = {};
  for (const { fileId, sha256 } of named) {
    const file = await inScope(systemScope(organisationId), (trx) => findFile(trx, fileId));
    const stored = file && (await getFile(file.key));
    if (!stored || createHash('sha256').update(stored.bytes).digest('hex') !== sha256)
      throw new Error(`photo ${fileId} is not there as it was when the report was issued`);
    photos[fileId] = stored.bytes;
  }
  return photos;
}

async function renderOne(
  organisationId: string,
  report: ReportRow,
  kind: 'issued' | 'signed',
  model: ReportModel,
): Promise<void> {
  const bytes = await renderPdf({ report: model, photos: await photosOf(organisationId, model) });
  const sha256 = createHash('sha256').update(bytes).digest('hex');
  const key = `${organisationId}/reports/${report.id}-${kind}.pdf`;
  await putFile(key, bytes, 'application/pdf');
  await inScope(systemScope(organisationId), async (trx) => {
    const current = await lockReport(trx, report.id);
    if (!current || (kind === 'signed' ? current.signedPdfFileId : current.pdfFileId)) return;
    const name = `${report.number}-r${report.revision}${kind === 'signed' ? '-signed' : ''}.pdf`;
    const fileId = await insertFile(trx, {
      key,
      kind: 'report',
      name,
      contentType: 'application/pdf',
      byteLength: bytes.length,
      sha256,
    });
    await keepReportPdf(trx, report.id, kind, fileId);
    if (kind === 'signed' && report.state !== 'refused') await closeJob(trx, report.jobId);
    if (
      Date.now() - (kind === 'signed' ? (report.signedAt ?? report.issuedAt) : report.issuedAt).getTime() >
      newsDays * 86_400_000
    )
      return;
    const url = `${env.NEXTAUTH_URL}/reports/${report.id}`;
    const mail = kind === 'signed' ? reportAnsweredMail(model, url) : reportIssuedMail(model, url);
    for (const person of await mailRecipients(trx, report.jobId, kind === 'signed' ? 'office' : 'customer')) {
      await queueMail(trx, {
        to: person.email,
        ...mail,
        messageId: `${report.id}-${kind}-${person.membershipId}@witnessmark`,
      });
    }
  });
}
