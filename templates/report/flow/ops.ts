import type { DrawingItem, Ink } from '@/components/plots/drawing';
import type { TextStyle } from '@/templates/report/theme';

/** What is put on paper: positions in pt from the upper left corner of what holds it, y down. */
export type Op =
  /** `y` is the base line. */
  | { op: 'text'; x: number; y: number; text: string; style: TextStyle }
  | { op: 'line'; x1: number; y1: number; x2: number; y2: number; ink: Ink; widthPt: number; dash?: number[] }
  | {
      op: 'box';
      x: number;
      y: number;
      widthPt: number;
      heightPt: number;
      ink: Ink;
      fill?: Ink;
      lineWidthPt: number;
      radiusPt?: number;
    }
  /** A drawing's own items, scaled. */
  | { op: 'drawing'; x: number; y: number; scale: number; items: readonly DrawingItem[] }
  /** A photograph, by its file; the document lays it over the canvas. */
  | { op: 'picture'; x: number; y: number; widthPt: number; heightPt: number; fileId: string }
  | { op: 'turned'; x: number; y: number; deg: number; text: string; style: TextStyle }
  | { op: 'group'; x: number; y: number; ops: readonly Op[] };

/** A piece of a page that is never split. */
export interface Slab {
  heightPt: number;
  ops: readonly Op[];
}

/** What flows over the pages, in order. */
export type FlowItem =
  /** `keepWithNext`: never the last thing on a page. `bookmark`: an entry of the document's outline. */
  | { kind: 'slab'; slab: Slab; keepWithNext?: boolean; bookmark?: string }
  /** Rows that may be split between rows; the header is repeated; never a single row alone on a page. */
  | { kind: 'rows'; header: Slab | null; rows: readonly Slab[]; keepWithNext?: boolean }
  /** Vanishes at the head of a page. */
  | { kind: 'space'; heightPt: number }
  /** Kept on one page where that does not leave more than a part of a page empty. */
  | { kind: 'together'; items: readonly FlowItem[] };

export const slabItem = (slab: Slab, more: { keepWithNext?: boolean; bookmark?: string } = {}): FlowItem => ({
  kind: 'slab',
  slab,
  ...more,
});

export const space = (heightPt: number): FlowItem => ({ kind: 'space', heightPt });

export const moved = (slab: Slab, x: number, y: number): Op => ({ op: 'group', x, y, ops: slab.ops });

/** Slabs below each other. */
export function stack(slabs: readonly Slab[], gapPt = 0): Slab {
  let y = 0;
  const ops: Op[] = [];
  slabs.forEach((slab, index) => {
    if (index) y += gapPt;
    ops.push(moved(slab, 0, y));
    y += slab.heightPt;
  });
  return { heightPt: y, ops };
}

/** Slabs beside each other, heads aligned. */
export function beside(placed: readonly { slab: Slab; x: number }[]): Slab {
  return {
    heightPt: Math.max(0, ...placed.map(({ slab }) => slab.heightPt)),
    ops: placed.map(({ slab, x }) => moved(slab, x, 0)),
  };
}

/** The same items, the last of them on one page with what follows. */
export function keptWithNext(items: readonly FlowItem[]): FlowItem[] {
  return items.map((item, index) =>
    index === items.length - 1 && item.kind === 'slab' ? { ...item, keepWithNext: true } : item,
  );
}

/** Flowing items as one piece that is not split. */
export function asSlab(items: readonly FlowItem[]): Slab {
  const ops: Op[] = [];
  let y = 0;
  for (const item of items) {
    for (const slab of slabsOf(item)) {
      ops.push(moved(slab, 0, y));
      y += slab.heightPt;
    }
    if (item.kind === 'space') y += item.heightPt;
  }
  return { heightPt: y, ops };
}

function slabsOf(item: FlowItem): readonly Slab[] {
  if (item.kind === 'slab') return [item.slab];
  if (item.kind === 'rows') return item.header ? [item.header, ...item.rows] : item.rows;
  return item.kind === 'together' ? [asSlab(item.items)] : [];
}

export function ruleLine(widthPt: number, ink: Ink = 'ink', lineWidthPt = 1): Slab {
  return {
    heightPt: lineWidthPt,
    ops: [{ op: 'line', x1: 0, y1: 0.5, x2: widthPt, y2: 0.5, ink, widthPt: lineWidthPt }],
  };
}

/** Height of items on one page, without the spaces at the ends. */
export function heightOf(items: readonly FlowItem[]): number {
  return items.reduce((sum, item) => sum + itemHeight(item), 0);
}

function itemHeight(item: FlowItem): number {
  if (item.kind === 'slab') return item.slab.heightPt;
  if (item.kind === 'space') return item.heightPt;
  if (item.kind === 'together') return heightOf(item.items);
  return (item.header?.heightPt ?? 0) + item.rows.reduce((sum, row) => sum + row.heightPt, 0);
}
