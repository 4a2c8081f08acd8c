import { renderToStaticMarkup } from 'react-dom/server';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ReportPage } from '@/components/report/report-page';
import { findReport } from '@/db/queries/reports';
import { reportSource } from '@/db/read-models/report-source';
import type { ReportModel } from '@/lib/reporting/report-model';
import { buildReport } from '@/lib/services/build-report';
import { signedModel } from '@/lib/services/signed-model';
import { sampleReportModel } from '@/tests/helpers/sample-report-model';
import { answer, ashdowns, indicator, issuedReport, measuredJob, sign } from './measured-job';
import { Workshop } from './workshop';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await Workshop.open([indicator]);
});
afterAll(() => workshop?.close());

/** The words of the page in the order in which they are read out, one cell after another. */
function wordsOf(model: ReportModel): { markup: string; words: string } {
  const markup = renderToStaticMarkup(<ReportPage model={model} photosAt="/photos" />);
  const words = markup
    .replaceAll(/<[^>]+>/g, ' ')
    .replaceAll('&#x27;', "'")
    .replaceAll('&quot;', '"')
    .replaceAll('&gt;', '>')
    .replaceAll('&lt;', '<')
    .replaceAll('&amp;', '&')
    .replaceAll(/\s+/g, ' ');
  return { markup, words };
}

/** Every figure, name and sentence of the document that a reader has to find on the page. */
function said(model: ReportModel): string[] {
  return [
    model.headline,
    model.letterhead.name,
    model.machine.serialNumber,
    model.customer.name,
    model.job.decisionRule,
    model.statement,
    ...model.conditions.lines.flatMap(({ label, value }) => [label, value]),
    ...model.instruments.flatMap(({ number, name, certificate, due }) => [number, name, certificate, due]),
    ...model.summary.flatMap((row) => [row.title, row.asFound, row.asLeft, row.toleranceMm, row.leftOut]),
    ...model.notInPlan.flatMap(({ title, reason }) => [title, reason]),
    ...model.remarks.map(({ text }) => text),
    ...model.blocks.flatMap((block) => [
      ...[block.reference, block.judgedFigure, block.toleranceSource, block.remark, block.leftOut?.text],
      ...block.passes.flatMap((pass) => [
        ...[pass.kindWords, pass.resultMm, pass.linkedWords, pass.resultWords],
        ...pass.tables.flatMap(({ columns, rows }) => [
          ...columns,
          ...rows.flatMap(({ label, cells }) => [`${label} ${cells.join(' ')}`.replaceAll(/\s+/g, ' ').trim()]),
        ]),
        ...pass.figures.flatMap(({ label, value }) => [`${label} ${value}`]),
        ...pass.corrections.flatMap(({ was, now, by, reason }) => [`${was} ${now} ${by}`, reason]),
      ]),
    ]),
    ...model.signatures.flatMap(({ name, outcome, reason }) => [name, outcome, reason]),
  ].flatMap((text) => (text ? [text] : []));
}

const expectAllSaid = (model: ReportModel) => {
  const { words } = wordsOf(model);
  const wanted = said(model);
  expect(wanted.filter((text) => !words.includes(text.replaceAll(/\s+/g, ' ').trim()))).toEqual([]);
  return { words, wanted };
};

describe('the report as a page', () => {
  it('says everything that a full document says', () => {
    const { wanted } = expectAllSaid(sampleReportModel());
    expect(wanted.length).toBeGreaterThan(200);
  });

  it('says what was issued and answered, figure by figure', async () => {
    const { reportId } = await issuedReport(workshop, ashdowns, {
      ...{ 'SP-1a:S1': 0.4, 'SP-2a:S1': 1.6, 'AX-1a:Z1:S1': 0.5 },
      ...{ 'AX-4:Y1:X1': 0.5, 'SS-1:S2:S1': 0.6, 'TU-3:T1:S1': 0.3, 'PO-B:X1': 0.4, 'WP-1:T1:Z1:S1': 0.3 },
    });
    const strokes = ['M100 100L140 60L180 120'];
    expect((await sign(workshop, reportId, answer('accept', { typed: null, strokes }))).status).toBe(201);
    const model = await workshop.as('inspector', async (trx) => signedModel(trx, (await findReport(trx, reportId))!));
    const { words } = expectAllSaid(model);
    expect(words).toContain('out');
    const { markup } = wordsOf(model);
    expect(markup).toContain(`d="${strokes[0]}"`);
    expect(markup).not.toMatch(/NaN|undefined|\[object/);
  });

  it('is marked as a draft until it is issued', async () => {
    const { jobId } = await measuredJob(workshop, ashdowns, { 'SP-1a:S1': 0.4, 'SP-2a:S1': null });
    const source = await workshop.as('inspector', (trx) => reportSource(trx, jobId));
    const model = buildReport(source!, null);
    const { words, markup } = wordsOf(model);
    expect(words).toContain('DRAFT');
    expect(markup).toContain('aria-label="Acceptance report, draft"');
    expect(words).toContain('not measured');
    expect(words).toContain('not signed yet');
    expect(wordsOf(sampleReportModel()).words).not.toContain('DRAFT');
  });

  it('names every test once as a heading and leads to it from the summary', () => {
    const model = sampleReportModel();
    const { markup } = wordsOf(model);
    for (const { order } of model.blocks) {
      expect(markup.split(`id="test-${order}"`)).toHaveLength(2);
      expect(markup).toContain(`href="#test-${order}"`);
    }
    expect(markup).not.toContain('<h1');
  });
});
