import { createHash } from 'node:crypto';
import sharp from 'sharp';
import type { Db } from '@/db/client';
import { insertFile } from '@/db/queries/reports';
import { DomainError } from '@/lib/errors';
import { newId } from '@/lib/id';
import { putFile } from '@/lib/storage/storage';

export type UploadKind = 'certificate' | 'nameplate' | 'photo';

const longestSidePx = 2400;
const mostPixels = 50_000_000;

const refuse = (detail: string) =>
  new DomainError(422, 'This file cannot be taken', detail, [{ pointer: '/file', detail }]);

/**
 * Takes an uploaded file in: a PDF as it is, a picture drawn anew (turned upright, at most 2400 px, without the camera's notes such as
 * the place). What it is, is read from its bytes, never from its name.
 * @throws DomainError 422 in words for the person who chose the file
 */
export async function keepFile(
  db: Db,
  upload: { organisationId: string; kind: UploadKind; name: string; bytes: Buffer },
): Promise<string> {
  const { bytes, contentType, ending } = await checkedFile(upload.kind, upload.bytes);
  const key = `${upload.organisationId}/${upload.kind}s/${newId()}.${ending}`;
  await putFile(key, bytes, contentType);
  return insertFile(db, {
    key,
    kind: upload.kind,
    name: safeName(upload.name, ending),
    contentType,
    byteLength: bytes.length,
    sha256: createHash('sha256').update(bytes).digest('hex'),
  });
}

async function checkedFile(
  kind: UploadKind,
  bytes: Buffer,
): Promise<{ bytes: Buffer; contentType: string; ending: string }> {
  if (bytes.length === 0) throw refuse('The file is empty.');
  if (bytes.subarray(0, 5).toString('latin1') === '%PDF-') {
    if (kind !== 'certificate') throw refuse('Choose a picture (JPEG, PNG or WebP).');
    return { bytes, contentType: 'application/pdf', ending: 'pdf' };
  }
  try {
    const picture = sharp(bytes, { limitInputPixels: mostPixels, failOn: 'error' });
    const { format } = await picture.metadata();
    if (format !== 'jpeg' && format !== 'png' && format !== 'webp')
      throw refuse('Choose a PDF, or a picture as JPEG, PNG or WebP.');
    const drawn = await picture
      .rotate()
      .resize({ width: longestSidePx, height: longestSidePx, fit: 'inside', withoutEnlargement: true })
      .jpeg({ quality: 80 })
      .toBuffer();
    return { bytes: drawn, contentType: 'image/jpeg', ending: 'jpg' };
  } catch (error) {
    if (error instanceof DomainError) throw error;
    throw refuse('This is neither a PDF nor a picture that can be read (JPEG, PNG or WebP, up to 50 million pixels).');
  }
}

/** A name for the download: letters, digits, dot, dash; nothing that could be a path. */
const safeName = (name: string, ending: string): string => {
  const stem = name
    .replace(/\.[^.]*$/, '')
    .replace(/[^\p{L}\p{N}._-]+/gu, '-')
    .replace(/^[.-]+/, '')
    .slice(0, 80);
  return `${stem || 'file'}.${ending}`;
};
