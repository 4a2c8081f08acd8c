import { beforeAll, describe, expect, it } from 'vitest';
import type { FlowItem, Slab } from '@/templates/report/flow/ops';
import { paginate } from '@/templates/report/flow/pager';
import { type Fonts, loadFonts } from '@/templates/report/fonts';
import { type ReportPages, reportPages } from '@/templates/report/report-pages';
import { boxesOf, misplacedWords } from '../helpers/page-boxes';
import { manyBlocks, sampleReportModel, summaryRow } from '../helpers/sample-report-model';

let fonts: Fonts;
beforeAll(async () => {
  fonts = await loadFonts();
});

describe('pages of a report', () => {
  const remark = 'W'.repeat(200);
  const base = sampleReportModel();
  const long = manyBlocks(60).map((block, index) => ({
    ...block,
    remark: index % 7 ? block.remark : remark,
    title: index % 9 ? block.title : `${block.title} ${block.title} ${block.title}`,
  }));
  const models = {
    usual: base,
    long: {
      ...base,
      blocks: long,
      summary: long.map(summaryRow),
      machine: { ...base.machine, serialNumber: 'W'.repeat(60), manufacturer: 'A maker with a long name, Limited' },
      remarks: [{ ...base.remarks[0]!, text: remark }],
    },
  };

  it.each([
    ['usual', 'A4'],
    ['usual', 'Letter'],
    ['long', 'A4'],
    ['long', 'Letter'],
  ] as const)('%s model on %s: no word outside the printable page, none on another', (name, paper) => {
    const made = reportPages({ ...models[name], paper }, fonts);
    expect(misplacedWords(made)).toEqual([]);
  });

  it('starts no page of a long report with an empty rest: every page has more than its foot', () => {
    const made = reportPages(models.long, fonts);
    for (const page of made.pages) expect(boxesOf(made, page.ops).length).toBeGreaterThan(8);
  });
});

describe('signatures', () => {
  const words = (made: ReportPages) => made.pages.map((page) => boxesOf(made, page.ops).map((box) => box.what));
  // Whatever stands before them: however far down the page they begin, they stay on one.
  it.each([1, 2, 3, 4, 5, 6, 7, 8])('stand on one page after %i tests', (count) => {
    const blocks = manyBlocks(count);
    const made = reportPages(sampleReportModel({ blocks, summary: blocks.map(summaryRow) }), fonts);
    const roles = sampleReportModel().signatures.map((signature) => signature.roleWords);
    const signed = words(made).filter((page) => page.includes('Signatures'));
    expect(signed).toHaveLength(1);
    expect(signed[0]).toEqual(expect.arrayContaining(roles));
    // Nothing of them is carried over to the next page: the names below the lines are there too.
    const names = sampleReportModel().signatures.map(({ name }) => name);
    for (const name of names)
      expect(
        signed[0]!.some((text) => text.startsWith(name)),
        name,
      ).toBe(true);
  });

  it('the letterhead gives the time of issuing as that, not as the time of signing', () => {
    const { document } = sampleReportModel();
    const made = reportPages(
      sampleReportModel({ document: { ...document, state: 'signed-with-remarks', issuedAt: '2026-03-12 11:30' } }),
      fonts,
    );
    expect(words(made)[0]).toContain('issued 12 March 2026, 11:30 · signed with remarks');
  });
});

describe('laying out on pages', () => {
  const slab = (heightPt: number, what = ''): Slab => ({
    heightPt,
    ops: what ? [{ op: 'line', x1: 0, y1: 0, x2: 1, y2: heightPt, ink: 'ink', widthPt: 1 }] : [],
  });
  const header = slab(20, 'header');

  it.each([5, 37, 55, 71, 90])(
    'leaves no row alone, repeats the header, never ends with a heading (%d pt above the table)',
    (above) => {
      for (let count = 1; count <= 120; count += 1) {
        const rows = Array.from({ length: count }, () => slab(10));
        const heading = slab(14);
        const items: FlowItem[] = [
          { kind: 'slab', slab: slab(above) },
          { kind: 'slab', slab: heading, keepWithNext: true },
          { kind: 'rows', header, rows },
        ];
        const pages = paginate(items, 100);
        let placed = 0;
        for (const page of pages) {
          const slabs = page.slabs.map((entry) => entry.slab);
          const own = slabs.filter((entry) => rows.includes(entry));
          placed += own.length;
          if (own.length) expect(slabs.filter((entry) => entry === header)).toHaveLength(1);
          if (own.length === 1) expect(count).toBe(1);
          if (slabs.includes(heading)) expect(own.length).toBeGreaterThan(0);
          const last = page.slabs.at(-1)!;
          expect(last.yPt + last.slab.heightPt).toBeLessThanOrEqual(100.02);
        }
        expect(placed).toBe(count);
      }
    },
  );

  it('keeps a block together where that costs less than a part of the page, and splits it otherwise', () => {
    const block: FlowItem = {
      kind: 'together',
      items: [
        { kind: 'slab', slab: slab(30) },
        { kind: 'slab', slab: slab(30) },
      ],
    };
    const after = (used: number) =>
      paginate([{ kind: 'slab', slab: slab(used) }, block], 100).map((page) => page.slabs.length);
    expect(after(35)).toEqual([3]);
    expect(after(70)).toEqual([1, 2]);
    expect(after(55)).toEqual([1, 2]);
    expect(after(45)).toEqual([2, 1]);
  });

  it('drops space at the head of a page', () => {
    const pages = paginate(
      [
        { kind: 'slab', slab: slab(95) },
        { kind: 'space', heightPt: 10 },
        { kind: 'slab', slab: slab(20) },
      ],
      100,
    );
    expect(pages[1]?.slabs[0]?.yPt).toBe(0);
  });
});
