import { createHash } from 'node:crypto';
import { z } from 'zod';
import { findFile, findReport } from '@/db/queries/reports';
import { DomainError, notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { getFile } from '@/lib/storage/storage';

/** The document: with the customer's answer once there is one; `?as=issued` as it was shown before. The hash is checked at each read. */
export const GET = route({
  action: 'report.read',
  params: idParams,
  query: z.object({ as: z.enum(['issued', 'signed']).optional() }),
  async handle({ trx, params, query }) {
    const report = await findReport(trx, params.id);
    if (!report) throw notFound('report');
    const fileId =
      query.as === 'issued' ? report.pdfFileId : (report.signedPdfFileId ?? (query.as ? null : report.pdfFileId));
    if (!fileId) {
      throw report.pdfState === 'failed'
        ? new DomainError(
            503,
            'Not drawn',
            `The PDF could not be drawn. Tell your administrator this id: ${report.pdfErrorId}`,
          )
        : new DomainError(503, 'Not ready yet', 'The PDF is being drawn. Try again in a few seconds.', [], {
            retryAfterSeconds: 2,
          });
    }
    const file = await findFile(trx, fileId);
    const stored = file && (await getFile(file.key));
    if (!file || !stored)
      throw new DomainError(503, 'Not reachable', 'The store of files does not answer at the moment.');
    if (createHash('sha256').update(stored.bytes).digest('hex') !== file.sha256) {
      throw new Error(`stored file ${file.id} does not have its hash`);
    }
    return {
      raw: { bytes: stored.bytes, contentType: file.contentType },
      headers: { 'content-disposition': `inline; filename="${file.name}"`, 'x-content-type-options': 'nosniff' },
    };
  },
});
