import sharp from 'sharp';
import type { Db } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import { holdJob } from '@/db/queries/jobs';
import { findFile } from '@/db/queries/reports';
import { insertPhoto, listPhotos, removePhoto } from '@/db/queries/sheet-photos';
import { findSheet, type SheetRow } from '@/db/queries/sheets';
import type { Viewer } from '@/lib/auth/viewer';
import { conflict, DomainError, notFound } from '@/lib/errors';
import { mostPhotos, type SheetPhotoForm } from '@/lib/schemas/sheet-photo';
import { getFile } from '@/lib/storage/storage';
import { closedBecause } from './keep-readings';

async function openSheet(db: Db, sheetId: string): Promise<SheetRow> {
  const sheet = await findSheet(db, sheetId);
  const job = sheet && (await holdJob(db, sheet.jobId));
  if (!sheet || !job) throw notFound('sheet');
  const closed = closedBecause(job.state);
  if (closed) throw conflict(closed);
  return sheet;
}

/**
 * Adds an uploaded photograph to a sheet of a job that is open.
 * @throws DomainError 404, 409 when the job is closed, 422 when the file is no photograph or the sheet has enough of them
 */
export async function addPhoto(db: Db, viewer: Viewer, sheetId: string, form: SheetPhotoForm): Promise<string> {
  await openSheet(db, sheetId);
  const refuse = (detail: string) =>
    new DomainError(422, 'This photo cannot be added', detail, [{ pointer: '/fileId', detail }]);
  const file = await findFile(db, form.fileId);
  if (file?.contentType !== 'image/jpeg') throw refuse('There is no such photo. Choose it again.');
  const there = await listPhotos(db, [sheetId]);
  if (there.length >= mostPhotos)
    throw refuse(`A sheet holds ${mostPhotos} photos at most. Take one away before the next.`);
  const stored = await getFile(file.key);
  if (!stored) throw new DomainError(503, 'Not reachable', 'The store of files does not answer at the moment.');
  const { width, height } = await sharp(stored.bytes).metadata();
  const photo = { ...form, sheetId, widthPx: width, heightPx: height, addedBy: viewer.name };
  const id = await insertPhoto(db, photo);
  await recordEvent(db, viewer, {
    action: 'sheet.photo-added',
    subjectType: 'sheet',
    subjectId: sheetId,
    detail: { photo: id, file: form.fileId, item: form.item },
  });
  return id;
}

/** Takes a photograph off a sheet of an open job; it stays stored. */
export async function takePhotoAway(db: Db, viewer: Viewer, sheetId: string, photoId: string): Promise<void> {
  await openSheet(db, sheetId);
  if (!(await removePhoto(db, sheetId, photoId, viewer.name))) throw notFound('photo');
  await recordEvent(db, viewer, {
    action: 'sheet.photo-removed',
    subjectType: 'sheet',
    subjectId: sheetId,
    detail: { photo: photoId },
  });
}
