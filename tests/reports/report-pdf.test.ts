import { beforeAll, describe, expect, it } from 'vitest';
import type { ReportModel, TestBlock } from '@/lib/reporting/report-model';
import { MissingGlyphError } from '@/templates/report/flow/typesetter';
import { renderReportPdf } from '@/templates/report/render';
import { flat, pdfText } from '../helpers/pdf-text';
import { manyBlocks, sampleReportModel, summaryRow } from '../helpers/sample-report-model';

const withBlocks = (blocks: TestBlock[], change: Partial<ReportModel> = {}) =>
  sampleReportModel({ blocks, summary: blocks.map(summaryRow), ...change });

/** Every figure and every word that the readings, results and the sections of a model hold. */
function wordsOf(model: ReportModel): string[] {
  const blocks = model.blocks.flatMap((block) => [
    block.title,
    block.reference,
    block.remark,
    block.leftOut?.reason,
    block.leftOut?.text,
    ...(block.leftOut ? [] : [block.judgedFigure, block.toleranceWords, block.toleranceSource, ...block.instruments]),
    ...block.passes.flatMap((pass) => [
      pass.resultMm,
      pass.by,
      ...pass.tables.flatMap((table) => [
        table.title,
        ...table.columns,
        ...table.rows.flatMap((row) => [row.label, ...row.cells]),
      ]),
      ...pass.setUp.flatMap(({ label, value }) => [label, value]),
      ...pass.figures.flatMap(({ label, value }) => [label, value]),
      ...pass.corrections.flatMap((c) => [c.was, c.now, c.by, c.reason]),
      pass.linkedWords,
    ]),
  ]);
  const { machine, customer, job, document } = model;
  const rest = [
    ...[
      machine.manufacturer,
      machine.model,
      machine.serialNumber,
      String(machine.year),
      machine.control,
      machine.hours,
      machine.sizeClass,
    ],
    ...machine.components.map((component) => `${component.id} ${component.what}`),
    'What was opened',
    'T2 removed and refitted, casting scraped',
    ...[
      customer.name,
      customer.engineer,
      customer.order,
      job.reference,
      job.scope,
      job.decisionRule,
      document.number,
      document.checkedBy,
    ],
    ...model.conditions.lines.flatMap(({ label, value }) => [label, value]),
    ...model.conditions.temperatures.flatMap(({ air, machine: own }) => [air, own]),
    ...model.instruments.flatMap((i) => [i.number, i.name, i.certificate, i.due, i.uncertainty]),
    ...model.summary.flatMap((row) => [row.title, row.asFound, row.asLeft, row.toleranceMm]),
    ...model.notInPlan.flatMap(({ title, reason }) => [title, reason]),
    ...model.remarks.flatMap((remark) => [remark.text, remark.owner]),
    ...model.signatures.flatMap((s) => [s.roleWords, s.name, s.function, s.company, s.outcome, s.reason]),
    ...[model.headline, model.statement],
  ];
  return [...blocks, ...rest].filter((word): word is string => !!word);
}

let sample: Buffer;
let read: { pages: string[]; text: string };

beforeAll(async () => {
  sample = await renderReportPdf(sampleReportModel());
  read = await pdfText(sample);
});

describe('acceptance report', () => {
  it('has every word and figure of the model in its searchable text', () => {
    const text = flat(read.text).replaceAll(' ', '');
    const missing = wordsOf(sampleReportModel()).filter((word) => !text.includes(flat(word).replaceAll(' ', '')));
    expect(missing).toEqual([]);
  });

  it('can be read figure by figure in the order of the table', () => {
    const rows = read.text.split('\n').map(flat);
    expect(rows.some((row) => /60 9 7 8/.test(row))).toBe(true);
    expect(rows.some((row) => /120 17 14 15\.5/.test(row))).toBe(true);
  });

  it('has document number, revision, serial number and page x of y on every page', () => {
    const { length } = read.pages;
    expect(length).toBeGreaterThan(5);
    read.pages.forEach((page, index) => {
      expect(flat(page)).toContain('QMF-2026-000214 r1');
      expect(page).toContain('LK32-0O81-B');
      expect(flat(page)).toContain(`page ${index + 1} of ${length}`);
      expect(page).not.toContain('DRAFT');
    });
  });

  it('is the same byte for byte when made again, in whatever order reports are made', async () => {
    await renderReportPdf(sampleReportModel({ headline: 'Another report in between.' }));
    expect((await renderReportPdf(sampleReportModel())).equals(sample)).toBe(true);
  });

  it('has the same searchable text from the second document on', async () => {
    const again = await pdfText(await renderReportPdf(sampleReportModel()));
    expect(again.text).toBe(read.text);
    const other = await pdfText(await renderReportPdf(withBlocks(manyBlocks(3))));
    expect(flat(other.text)).toContain('insertion 1, μm insertion 2, μm');
    expect(flat(other.text)).toContain('Bore run-out at 300 mm');
  });

  it('says on every page of a draft that it is one', async () => {
    const model = sampleReportModel();
    const draft = { ...model, document: { ...model.document, state: 'draft' as const, issuedAt: null } };
    const pdf = await renderReportPdf(draft);
    const { pages } = await pdfText(pdf);
    for (const page of pages) expect(page).toContain('DRAFT');
    expect((await renderReportPdf(draft)).equals(pdf)).toBe(true);
  });

  it('refuses a text with signs that no font has, and names them all', async () => {
    const failing = renderReportPdf(sampleReportModel({ statement: 'measured by 松 with 竹' }));
    await expect(failing).rejects.toThrow(MissingGlyphError);
    await expect(failing).rejects.toThrow(/松 \(U\+677E\), 竹 \(U\+7AF9\)/);
  });

  it('prints the signs of drawings, in Plex or in DejaVu', async () => {
    const signs = 'µ Ø ⌀ ⊥ ∥ ∠ ↗ ± ≤ ≥ − → Δ ° α ž Я';
    const { text } = await pdfText(await renderReportPdf(sampleReportModel({ statement: signs })));
    expect(flat(text)).toContain(flat(signs));
  });

  it('has an outline with every test', async () => {
    const source = sample.toString('latin1');
    expect(source).toMatch(/\/Outlines/);
    expect(source.match(/\/Title/g)?.length).toBeGreaterThanOrEqual(sampleReportModel().blocks.length + 5);
  });
});

describe('acceptance report of unusual size', () => {
  const remark =
    'The guideway was scraped over its whole length and the gib set again; the customer has seen the second measurement and wants the third one after four weeks of two shifts, before the warranty begins. Agreed on.';
  const serial = 'LK32-0O81-B/I1l1-8B8B-S5S5-Z2Z2-QQ0O-0000000000001';

  it.each(['A4', 'Letter'] as const)(
    'prints 60 tests, a long serial number and a remark of 200 characters on %s',
    async (paper) => {
      const base = sampleReportModel();
      const model = withBlocks(manyBlocks(60), {
        paper,
        machine: { ...base.machine, serialNumber: serial },
        remarks: [{ ...base.remarks[0]!, text: remark }],
      });
      expect(remark.length).toBeGreaterThanOrEqual(200);
      const { pages, text } = await pdfText(await renderReportPdf(model));
      for (const [index, page] of pages.entries()) {
        expect(page.replace(/\s/g, '')).toContain(serial);
        expect(flat(page)).toContain(`page ${index + 1} of ${pages.length}`);
      }
      expect(flat(text)).toContain(remark.slice(0, 60));
      for (const block of model.blocks) expect(flat(text)).toContain(flat(`${block.order} · ${block.title}`));
    },
  );

  it('prints a remark longer than a page, and a table of 400 readings, without losing a word', async () => {
    const words = Array.from({ length: 1200 }, (_, index) => `word${index}`).join(' ');
    const rows = Array.from({ length: 400 }, (_, index) => ({
      label: `${index * 5}`,
      cells: [`${index}.5`, `${index}.25`, `−${index}`],
    }));
    const [block] = manyBlocks(3).slice(2);
    const tables = [{ title: 'many', columns: ['z, mm', '0°, µm', '180°, µm', 'mean, µm'], rows }];
    const long: TestBlock = { ...block!, remark: words, passes: block!.passes.map((pass) => ({ ...pass, tables })) };
    const { text } = await pdfText(await renderReportPdf(withBlocks([long])));
    const read = new Set(flat(text).split(' '));
    expect(words.split(' ').filter((word) => !read.has(word))).toEqual([]);
    expect(rows.filter((row) => !read.has(row.cells[0]!)).length).toBe(0);
  });

  it('prints a model without anything that can be missing', async () => {
    const base = sampleReportModel();
    const bare: ReportModel = {
      ...base,
      letterhead: { name: 'Quillmere Machine Fitting', addressLines: [], contact: null },
      machine: { ...base.machine, year: null, control: null, hours: null, sizeClass: null, site: null, components: [] },
      customer: { name: 'Ashdown Turned Parts', engineer: null, order: null },
      job: { ...base.job, scope: null, to: null, codes: [], people: [] },
      conditions: { place: null, lines: [], temperatures: [], airRange: null },
      instruments: [],
      summary: [],
      notInPlan: [],
      blocks: [],
      remarks: [],
      signatures: [],
    };
    const { pages } = await pdfText(await renderReportPdf(bare));
    expect(pages).toHaveLength(1);
  });
});
