import { createHash } from 'node:crypto';
import { z } from 'zod';
import { inScope, systemScope } from '@/db/client';
import { findFile, findReport } from '@/db/queries/reports';
import { DomainError, notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { id } from '@/lib/schemas/common';
import { getFile } from '@/lib/storage/storage';

/** A photograph of a report, for everybody who may read the report. Its bytes are those whose hash the report names. */
export const GET = route({
  action: 'report.read',
  params: z.object({ id, fileId: id }),
  async handle({ trx, viewer, params }) {
    const report = await findReport(trx, params.id);
    const photo = report?.model.blocks
      .flatMap(({ photos }) => photos ?? [])
      .find(({ fileId }) => fileId === params.fileId);
    if (!photo) throw notFound('photo');
    // Files are closed to customers; this one is part of a document that they were shown.
    const file = await inScope(systemScope(viewer.organisationId), (own) => findFile(own, photo.fileId));
    const stored = file && (await getFile(file.key));
    if (!file || !stored)
      throw new DomainError(503, 'Not reachable', 'The store of files does not answer at the moment.');
    if (createHash('sha256').update(stored.bytes).digest('hex') !== photo.sha256)
      throw new Error(`photo ${file.id} of report ${params.id} does not have its hash`);
    return {
      raw: { bytes: stored.bytes, contentType: file.contentType },
      headers: {
        'content-disposition': 'inline; filename="photo.jpg"',
        'content-security-policy': "default-src 'none'; sandbox",
        'x-content-type-options': 'nosniff',
      },
    };
  },
});
