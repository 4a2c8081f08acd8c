import { createHash } from 'node:crypto';
import { findFile } from '@/db/queries/reports';
import { DomainError, notFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/schemas/common';
import { getFile } from '@/lib/storage/storage';

export const GET = route({
  action: ['instrument.read', 'machine.read'],
  params: idParams,
  async handle({ trx, params }) {
    const file = await findFile(trx, params.id);
    if (!file) throw notFound('file');
    const stored = await getFile(file.key);
    if (!stored) throw new DomainError(503, 'Not reachable', 'The store of files does not answer at the moment.');
    if (createHash('sha256').update(stored.bytes).digest('hex') !== file.sha256)
      throw new Error(`stored file ${file.id} does not have its hash`);
    const shown = file.contentType === 'image/jpeg' ? 'inline' : 'attachment';
    return {
      raw: { bytes: stored.bytes, contentType: file.contentType },
      headers: {
        'content-disposition': `${shown}; filename*=UTF-8''${encodeURIComponent(file.name)}`,
        'content-security-policy': "default-src 'none'; sandbox",
        'x-content-type-options': 'nosniff',
      },
    };
  },
});
