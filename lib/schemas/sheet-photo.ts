import { z } from 'zod';
import { id } from './common';

export const mostPhotos = 12;

/** A photograph that is added to a sheet; the file was uploaded before. */
export const sheetPhoto = z.object({
  fileId: id,
  item: z.string().trim().min(1).max(60).nullable().default(null),
  caption: z.string().trim().max(200, 'At most 200 characters.').default(''),
});

export type SheetPhotoForm = z.output<typeof sheetPhoto>;
