import { renderToStaticMarkup } from 'react-dom/server';
import { beforeAll, describe, expect, it } from 'vitest';
import { ReportPage } from '@/components/report/report-page';
import { checkFindings } from '@/lib/reporting/check-findings';
import type { ReportModel } from '@/lib/reporting/report-model';
import { withSignature } from '@/lib/reporting/with-signature';
import { type Fonts, loadFonts } from '@/templates/report/fonts';
import { renderReportPdf } from '@/templates/report/render';
import { reportPages } from '@/templates/report/report-pages';
import {
  functionCheck,
  oneOfEachLayout,
  reportOf,
  storedJob,
  storedSheet,
  widestLayouts,
} from '../helpers/every-layout';
import { boxesOf, misplacedWords } from '../helpers/page-boxes';
import { flat, pdfText } from '../helpers/pdf-text';
import { sampleReportModel } from '../helpers/sample-report-model';

const answered = (entries: Record<string, string>) =>
  Object.fromEntries(Object.entries(entries).map(([pointer, text]) => [`/items/${pointer}`, { text, unit: null }]));
const notInOrder = answered({
  'air/value': '3.2',
  'bush/answer': 'not-fitted',
  'lamp/answer': 'no',
  'lamp/remark': 'tube broken, a new one is ordered',
});
const inOrder = answered({ 'air/value': '5.1' });

const exclusions = Array.from({ length: 60 }, (_, k) => ({
  title: `Test ${k + 1} that this plan leaves out`,
  reason: (['not-agreed', 'not-applicable'] as const)[k % 2]!,
  text: null,
}));

const of = (kind: 'catalogue' | 'widest'): ReportModel => {
  const tests = kind === 'catalogue' ? oneOfEachLayout() : widestLayouts();
  const sheets = tests.map((definition, k) => storedSheet(definition, k + 1));
  const checks = [storedSheet(functionCheck(), 50, notInOrder), storedSheet(functionCheck(), 51, inOrder)];
  return reportOf(storedJob([...sheets, ...checks], { exclusions }));
};
const models = { catalogue: of('catalogue'), widest: of('widest') };

let fonts: Fonts;
beforeAll(async () => {
  fonts = await loadFonts();
});

const markup = (model: ReportModel) => renderToStaticMarkup(<ReportPage model={model} photosAt="/photos" />);
const words = (model: ReportModel) =>
  markup(model)
    .replaceAll(/<[^>]*>/g, ' ')
    .replaceAll(/\s+/g, ' ');

describe.each(['catalogue', 'widest'] as const)('a report with every layout (%s)', (name) => {
  it.each(['A4', 'Letter'] as const)('on %s has no word outside the page and none on another', (paper) => {
    expect(misplacedWords(reportPages({ ...models[name], paper }, fonts))).toEqual([]);
  });

  it('has every reading, column and title of its tables in the searchable text', async () => {
    const { text } = await pdfText(await renderReportPdf(models[name]));
    const read = flat(text).replaceAll(' ', '');
    const wanted = models[name].blocks.flatMap((block) => [
      block.title,
      ...block.passes.flatMap((pass) =>
        pass.tables.flatMap((table) => [table.title ?? '', ...table.rows.flatMap((row) => [row.label, ...row.cells])]),
      ),
    ]);
    expect(wanted.length).toBeGreaterThan(500);
    expect(wanted.filter((word) => !read.includes(flat(word).replaceAll(' ', '')))).toEqual([]);
  });

  it('was measured: every block has a result, and the page shows no undefined figure', () => {
    for (const block of models[name].blocks)
      for (const pass of block.passes) expect(pass.resultMm, block.title).not.toBeNull();
    expect(markup(models[name])).not.toMatch(/NaN|undefined|\[object/);
  });
});

it('repeats the places where a table is cut between its columns', () => {
  const block = models.widest.blocks.find(({ title }) => title.includes('twenty turns'))!;
  const made = reportPages({ ...models.widest, blocks: [block] }, fonts);
  const heads = made.pages.flatMap((page) => boxesOf(made, page.ops)).filter(({ what }) => what === 'angle,');
  // As found and as left, each in two parts at least.
  expect(heads.length).toBeGreaterThanOrEqual(4);
});

describe('function checks in the report', () => {
  const { widest } = models;
  const blocks = widest.blocks.filter(({ check }) => check);

  it('are counted beside the measured tests', () => {
    expect(widest.checks).toEqual({ planned: 2, inOrder: 1, notInOrder: 1, notDone: 0, leftOut: 0 });
    expect(widest.counts.asLeft.planned).toBe(widest.blocks.length - 2);
    expect(words(widest)).toContain('Function checks: 1 of 2 in order, 1 not in order.');
    expect(reportOf(storedJob([storedSheet(oneOfEachLayout()[0]!, 1)])).checks).toBeUndefined();
  });

  it('print their items with answer, figure and remark, and no table of readings, plot or limit rule', async () => {
    const [bad] = blocks;
    expect(bad!.passes[0]!.items).toEqual([
      {
        question: 'Every emergency stop stops every movement.',
        answer: 'yes',
        value: null,
        remark: null,
        inOrder: true,
      },
      {
        question: 'The door cannot be opened while the spindle turns.',
        answer: 'yes',
        value: null,
        remark: null,
        inOrder: true,
      },
      {
        question: 'The compressed air has its pressure behind the filter.',
        answer: 'yes',
        value: '3.2 bar (4 to 6)',
        remark: null,
        inOrder: false,
      },
      { question: 'The guide bush is lubricated.', answer: 'not fitted', value: null, remark: null, inOrder: null },
      {
        question: 'The working light comes on.',
        answer: 'no',
        value: null,
        remark: 'tube broken, a new one is ordered',
        inOrder: false,
      },
    ]);
    expect(bad!.passes.flatMap((pass) => pass.tables)).toEqual([]);
    const only = { ...widest, blocks };
    const { text } = await pdfText(await renderReportPdf(only));
    for (const read of [flat(text), words(only)]) {
      expect(read).toContain('3.2 bar (4 to 6)');
      expect(read).toContain('2 items not in order');
      expect(read).toContain('tube broken, a new one is ordered');
      expect(read).toContain('yes, not in order');
    }
    expect(markup(only)).not.toMatch(/aria-label="(Deviation|Limit rule|Set-up)/);
  });

  it('are in order or not in order, never within or out of tolerance', () => {
    const rows = widest.summary.filter(({ unit }) => unit === 'items');
    expect(rows.map(({ asLeft, toleranceMm, asLeftVerdict }) => [asLeft, toleranceMm, asLeftVerdict])).toEqual([
      [null, null, 'out-of-tolerance'],
      [null, null, 'within-tolerance'],
    ]);
    const only = { ...widest, headline: '', blocks, summary: rows };
    const said = words(only).replace(/Counts .*? Function checks/, '');
    expect(said).toContain('not in order');
    expect(said).not.toMatch(/(within|out of) tolerance/);
  });

  it('are the headline of a job that measures nothing', () => {
    const model = reportOf(storedJob([storedSheet(functionCheck(), 1, inOrder)]));
    expect(model.headline).toBe('Function checks: 1 of 1 in order.');
    expect(model.counts.asLeft.planned).toBe(0);
  });

  it('are not counted as accepted out of tolerance when the customer remarks on them', () => {
    const model = reportOf(
      storedJob([storedSheet(functionCheck(), 1, notInOrder), storedSheet(oneOfEachLayout()[0]!, 2)]),
    );
    const remark = { no: 1, sheetOrder: 1, text: 'The lamp comes next week.', owner: null, due: null, closed: null };
    const signed = withSignature(model, {
      ...{ outcome: 'accept-with-remarks', name: 'C. Vale', functionTitle: null, company: null, reason: null },
      ...{
        signedAt: '2026-03-12T11:30:00Z',
        typed: 'C. Vale',
        strokes: null,
        evidence: 'on the tablet',
        remarks: [remark],
      },
    });
    expect(signed.headline).toBe(model.headline);
    expect(signed.summary[0]!.remarkNo).toBe(1);
    expect(words(signed)).toContain('not in order, remark 1');
  });

  it('stop the report while an item is not answered, and name what is not in order', () => {
    const check = storedSheet(functionCheck(), 1, notInOrder);
    const findings = checkFindings(storedJob([check]), 'Europe/Berlin');
    expect(findings.map(({ kind, weight }) => [kind, weight])).toEqual([['out-of-tolerance', 'confirm']]);
    expect(findings[0]!.text).toBe(
      'Not in order: The compressed air has its pressure behind the filter.; The working light comes on.',
    );
    const open = storedSheet(functionCheck(), 1, answered({ 'lamp/answer': '' }));
    expect(checkFindings(storedJob([open]), 'Europe/Berlin')).toMatchObject([
      {
        kind: 'not-measured',
        weight: 'blocks',
        text: 'Not every item is answered. Answer them, or leave it out with a reason.',
      },
    ]);
    expect(checkFindings(storedJob([storedSheet(functionCheck(), 1, inOrder)]), 'Europe/Berlin')).toEqual([]);
  });
});

describe('results in other units and further limits', () => {
  const positioning = models.widest.blocks[0]!;

  it('print every further figure with its limit and verdict', async () => {
    const judged = positioning.passes.at(-1)!.judgement!;
    expect(judged.also!.map(({ figure }) => figure)).toEqual(['R', 'B', 'E']);
    const { text } = await pdfText(await renderReportPdf({ ...models.widest, blocks: [positioning] }));
    for (const read of [flat(text), words({ ...models.widest, blocks: [positioning] })]) {
      expect(read).toContain('further figure R 0.0132 mm 0.009 mm out of tolerance');
      expect(read).toContain('further figure B 0.0005 mm 0.009 mm within tolerance');
      expect(read).toContain('because of further figure R');
    }
  });

  it('stand in their own unit in block and summary; mm stays in the head of the column', async () => {
    const pitch = oneOfEachLayout().find(({ layout }) => layout.kind === 'angular-runs')!;
    const model = reportOf(storedJob([storedSheet(pitch, 1), storedSheet(oneOfEachLayout()[0]!, 2)]));
    const [row, lengths] = model.summary;
    expect(row!.unit).toBe('mm/m');
    expect(lengths!.unit).toBeUndefined();
    const { text } = await pdfText(await renderReportPdf(model));
    for (const read of [flat(text), words(model)]) {
      expect(read).toContain(`${row!.toleranceMm} mm/m`);
      expect(read).toMatch(/As left [\d.]+ mm\/m, within tolerance/);
      expect(read).toContain('mm/m to the limit');
    }
  });
});

it('says each reason for not planning once, before the sixty titles', async () => {
  const { text } = await pdfText(await renderReportPdf(models.widest));
  const read = flat(text);
  for (const { title } of exclusions) expect(read.replaceAll(' ', '')).toContain(title.replaceAll(' ', ''));
  for (const reason of new Set(models.widest.notInPlan.map((entry) => entry.reason))) {
    expect(read.split(`${reason} (30)`)).toHaveLength(2);
    expect(words(models.widest).split(`${reason} (30)`)).toHaveLength(2);
  }
});

it('prints a report frozen before there were units, checks and confirmations as before', () => {
  const frozen = sampleReportModel();
  expect(frozen.checks).toBeUndefined();
  const said = words(frozen);
  expect(said).not.toContain('Function checks');
  expect(said).not.toContain('Tolerances:');
  expect(said).toMatch(/As left −?[\d.]+ mm, within tolerance/);
});
