import type { PhotoBlock } from '@/lib/reporting/report-model';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { beside, type FlowItem, type Op, type Slab, slabItem, space, stack } from '@/templates/report/flow/ops';
import type { Kit } from '@/templates/report/flow/parts';
import { TYPE } from '@/templates/report/theme';

const GAP_PT = 14;
const HIGHEST_PT = 190;

/** Photographs of a test, two in a row, each with its words below it. */
export function testPhotos(kit: Kit, photos: readonly PhotoBlock[] | undefined): FlowItem[] {
  if (!photos?.length) return [];
  const widthPt = (kit.widthPt - GAP_PT) / 2;
  const slabs = photos.map((photo) => photoSlab(kit, photo, widthPt));
  const items: FlowItem[] = [
    space(6),
    slabItem(kit.type.line(REPORT_WORDS.block.photos, TYPE.columnHead), { keepWithNext: true }),
  ];
  for (let at = 0; at < slabs.length; at += 2) {
    const row = slabs.slice(at, at + 2).map((slab, index) => ({ slab, x: index * (widthPt + GAP_PT) }));
    items.push(space(4), slabItem(beside(row)));
  }
  return items;
}

function photoSlab(kit: Kit, photo: PhotoBlock, widthPt: number): Slab {
  const scale = Math.min(widthPt / photo.widthPx, HIGHEST_PT / photo.heightPx);
  const size = { widthPt: photo.widthPx * scale, heightPt: photo.heightPx * scale };
  const picture: Op = { op: 'picture', x: 0, y: 0, ...size, fileId: photo.fileId };
  const words = kit.type.paragraph(photo.words, TYPE.quiet, widthPt);
  return stack([{ heightPt: size.heightPt, ops: [picture] }, words], 3);
}
