import type { Db } from '@/db/client';
import { newId } from '@/lib/id';
import { own } from './jobs';

export interface SheetPhoto {
  id: string;
  sheetId: string;
  /** Item of a function check; null: the sheet as a whole. */
  item: string | null;
  caption: string;
  fileId: string;
  sha256: string;
  widthPx: number;
  heightPx: number;
  addedBy: string;
  addedAt: Date;
}

/** Photographs of sheets that were not taken away, oldest first. */
export const listPhotos = (db: Db, sheetIds: string[]): Promise<SheetPhoto[]> =>
  db('sheet_photos')
    .join('files', (join) =>
      join.on('files.organisation_id', 'sheet_photos.organisation_id').andOn('files.id', 'file_id'),
    )
    .whereIn('sheet_id', sheetIds)
    .whereNull('removed_at')
    .orderBy(['added_at', 'sheet_photos.id'])
    .select({
      id: 'sheet_photos.id',
      sheetId: 'sheet_id',
      item: 'item',
      caption: 'caption',
      fileId: 'file_id',
      sha256: 'files.sha256',
      widthPx: 'width_px',
      heightPx: 'height_px',
      addedBy: 'added_by',
      addedAt: 'added_at',
    });

export async function insertPhoto(db: Db, photo: Omit<SheetPhoto, 'id' | 'sha256' | 'addedAt'>): Promise<string> {
  const id = newId();
  await db('sheet_photos').insert({
    organisation_id: own(db),
    id,
    sheet_id: photo.sheetId,
    item: photo.item,
    caption: photo.caption,
    file_id: photo.fileId,
    width_px: photo.widthPx,
    height_px: photo.heightPx,
    added_by: photo.addedBy,
  });
  return id;
}

/** @returns false where there is no such photograph at the sheet, or it was taken away before */
export async function removePhoto(db: Db, sheetId: string, photoId: string, by: string): Promise<boolean> {
  const changed = await db('sheet_photos')
    .where({ sheet_id: sheetId, id: photoId })
    .whereNull('removed_at')
    .update({ removed_at: db.fn.now(), removed_by: by });
  return changed === 1;
}
