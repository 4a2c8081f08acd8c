import { type FlowItem, heightOf, type Slab } from '@/templates/report/flow/ops';

export interface PlacedSlab {
  slab: Slab;
  yPt: number;
}

export interface PageContent {
  slabs: PlacedSlab[];
  bookmarks: { title: string; yPt: number }[];
}

/** A block moves to a new page as a whole when it leaves no more than this part of the page empty. */
const EMPTY_PART = 0.5;
/** Fewest rows of a table at the foot and at the head of a page. */
const ROWS_TOGETHER = 2;

/**
 * Lays flowing items on pages. Headings stay with what follows, rows are never split and never left alone, headers are repeated.
 * What is higher than a page is an error of the caller.
 */
export function paginate(items: readonly FlowItem[], pageHeightPt: number): PageContent[] {
  const pager = new Pager(pageHeightPt);
  pager.place(items);
  return pager.pages;
}

class Pager {
  readonly pages: PageContent[] = [{ slabs: [], bookmarks: [] }];
  private y = 0;

  constructor(private readonly heightPt: number) {}

  place(items: readonly FlowItem[]): void {
    for (const [index, item] of items.entries()) {
      if (item.kind === 'space') this.space(item.heightPt);
      else if (item.kind === 'together') this.together(item.items);
      else {
        // What must stand on the same page: everything that is chained to this item.
        const chain = chainHeight(items, index);
        if (this.y > 0 && chain > this.left() && chain <= this.heightPt) this.newPage();
        if (item.kind === 'rows') this.rows(item.header, item.rows);
        else this.put(item.slab, item.bookmark);
      }
    }
  }

  private together(items: readonly FlowItem[]): void {
    const height = heightOf(items);
    const wasted = this.left() / this.heightPt;
    if (height > this.left() && height <= this.heightPt && wasted <= EMPTY_PART) this.newPage();
    this.place(items);
  }

  private rows(header: Slab | null, rows: readonly Slab[]): void {
    let next = 0;
    while (next < rows.length) {
      let count = this.fittingRows(header, rows, next);
      const rest = rows.length - next - count;
      if (rest > 0 && rest < ROWS_TOGETHER) count -= ROWS_TOGETHER - rest;
      if (count < Math.min(ROWS_TOGETHER, rows.length - next) && this.y > 0) {
        this.newPage();
        continue;
      }
      if (header) this.put(header);
      for (const row of rows.slice(next, next + Math.max(count, 1))) this.put(row);
      next += Math.max(count, 1);
      if (next < rows.length) this.newPage();
    }
  }

  private fittingRows(header: Slab | null, rows: readonly Slab[], from: number): number {
    let left = this.left() - (header?.heightPt ?? 0);
    let count = 0;
    for (const row of rows.slice(from)) {
      left -= row.heightPt;
      if (left < 0) break;
      count += 1;
    }
    return count;
  }

  private put(slab: Slab, bookmark?: string): void {
    if (slab.heightPt > this.heightPt)
      throw new Error('A piece of the report that cannot be split is higher than a page');
    if (this.y > 0 && slab.heightPt > this.left()) this.newPage();
    if (bookmark) this.page().bookmarks.push({ title: bookmark, yPt: this.y });
    this.page().slabs.push({ slab, yPt: this.y });
    this.y += slab.heightPt;
  }

  private space(heightPt: number): void {
    if (this.y > 0) this.y = Math.min(this.y + heightPt, this.heightPt);
  }

  private newPage(): void {
    this.pages.push({ slabs: [], bookmarks: [] });
    this.y = 0;
  }

  private left(): number {
    return this.heightPt - this.y + 0.01;
  }

  private page(): PageContent {
    return this.pages[this.pages.length - 1] as PageContent;
  }
}

/** Height of an item with all that must stand below it on the same page. */
function chainHeight(items: readonly FlowItem[], index: number): number {
  const item = items[index];
  if (!item) return 0;
  if (item.kind === 'space') return item.heightPt + chainHeight(items, index + 1);
  if (item.kind === 'together') return chainHeight(item.items, 0);
  const own = item.kind === 'slab' ? item.slab.heightPt : firstRowsHeight(item.header, item.rows);
  const whole = item.kind === 'slab' || item.rows.length <= ROWS_TOGETHER + 1;
  return own + (item.keepWithNext && whole ? chainHeight(items, index + 1) : 0);
}

function firstRowsHeight(header: Slab | null, rows: readonly Slab[]): number {
  // Three rows cannot be split without leaving one alone.
  const count = rows.length <= ROWS_TOGETHER + 1 ? rows.length : ROWS_TOGETHER;
  return (header?.heightPt ?? 0) + rows.slice(0, count).reduce((sum, row) => sum + row.heightPt, 0);
}
