import type { Op } from '@/templates/report/flow/ops';

export interface PlacedPicture {
  fileId: string;
  xPt: number;
  yPt: number;
  widthPt: number;
  heightPt: number;
}

/** Where the photographs of a page stand, from its upper left corner. */
export function picturesOf(ops: readonly Op[], x = 0, y = 0): PlacedPicture[] {
  return ops.flatMap((op) => {
    if (op.op === 'group') return picturesOf(op.ops, x + op.x, y + op.y);
    if (op.op !== 'picture') return [];
    const { fileId, widthPt, heightPt } = op;
    return [{ fileId, xPt: x + op.x, yPt: y + op.y, widthPt, heightPt }];
  });
}
