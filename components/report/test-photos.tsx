import type { PhotoBlock } from '@/lib/reporting/report-model';
import { REPORT_WORDS } from '@/lib/reporting/words';

/** Photographs of a test, each with its words. `at`: address below which the files are found. */
export function TestPhotos({ photos, at }: { photos: PhotoBlock[] | undefined; at: string }) {
  if (!photos?.length) return null;
  return (
    <section className="mt-4" aria-label={REPORT_WORDS.block.photos}>
      <p className="text-sm font-semibold text-ink2">{REPORT_WORDS.block.photos}</p>
      <ul className="grid gap-4 sm:grid-cols-2">
        {photos.map((photo, index) => (
          <li key={photo.fileId}>
            <img
              src={`${at}/${photo.fileId}`}
              width={photo.widthPx}
              height={photo.heightPx}
              alt={photo.words || `${REPORT_WORDS.block.photo} ${index + 1}`}
              className="max-h-80 w-full object-contain object-left"
            />
            <p className="text-[15px]">{photo.words}</p>
          </li>
        ))}
      </ul>
    </section>
  );
}
