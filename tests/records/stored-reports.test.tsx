import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { ReportPage } from '@/components/report/report-page';
import type { ReportModel } from '@/lib/reporting/report-model';
import { renderReportPdf } from '@/templates/report/render';
import { pdfText } from '@/tests/helpers/pdf-text';
import type { StoredReport } from './take-records';

const here = import.meta.dirname;
const versions = readdirSync(here, { withFileTypes: true }).flatMap((entry) =>
  entry.isDirectory() ? [entry.name] : [],
);
const reports = versions.flatMap((version) =>
  readdirSync(path.join(here, version, 'reports')).map((file) => {
    const report = JSON.parse(readFileSync(path.join(here, version, 'reports', file), 'utf8')) as StoredReport;
    return { name: `${version}/${file} ${report.number} ${report.state}`, ...report };
  }),
);

const squeezed = (text: string) => text.replaceAll(/\s+/g, '');

/** What nobody may find missing in an old report, whatever becomes of its looks. */
function said(model: ReportModel): string[] {
  return [
    model.document.number,
    model.headline,
    model.machine.serialNumber,
    ...model.instruments.map(({ number }) => number),
    ...model.summary.flatMap((row) => [row.title, row.asFound, row.asLeft, row.toleranceMm]),
    ...model.blocks.flatMap(({ passes }) => passes.flatMap(({ resultMm, kindWords }) => [resultMm, kindWords])),
    // Sets taken while adjusting print what they came to; their readings stay in the data.
    ...model.blocks.flatMap(({ passes }) =>
      passes.flatMap(({ tables, kind }) =>
        kind === 'adjusting' ? [] : tables.flatMap(({ rows }) => rows.flatMap(({ cells }) => cells)),
      ),
    ),
  ].flatMap((text) => (text ? [squeezed(text)] : []));
}

it('there are reports in several states', () => {
  expect(reports.length).toBeGreaterThanOrEqual(5);
  expect(new Set(reports.map(({ state }) => state)).size).toBeGreaterThanOrEqual(3);
});

describe.each(reports)('$name', ({ model: text, sha256 }) => {
  const model = JSON.parse(text) as ReportModel;

  it('is the text that was frozen', () => {
    expect(createHash('sha256').update(text).digest('hex')).toBe(sha256);
  });

  it('is drawn as a page with every figure', () => {
    const words = squeezed(
      renderToStaticMarkup(<ReportPage model={model} photosAt="/photos" />)
        .replaceAll(/<[^>]+>/g, ' ')
        .replaceAll('&#x27;', "'")
        .replaceAll('&quot;', '"')
        .replaceAll('&gt;', '>')
        .replaceAll('&lt;', '<')
        .replaceAll('&amp;', '&'),
    );
    expect(said(model).length).toBeGreaterThan(100);
    expect(said(model).filter((one) => !words.includes(one))).toEqual([]);
  });

  it('is drawn as a PDF, the same bytes each time, with every figure', async () => {
    const pdf = await renderReportPdf(model);
    expect(
      createHash('sha256')
        .update(await renderReportPdf(model))
        .digest('hex'),
    ).toBe(createHash('sha256').update(pdf).digest('hex'));
    const { pages, text: written } = await pdfText(pdf);
    expect(pages.length).toBeGreaterThanOrEqual(Math.ceil(model.blocks.length / 4));
    const numbers = model.blocks.flatMap(({ passes }) =>
      passes.flatMap(({ resultMm }) => (resultMm ? [resultMm] : [])),
    );
    const words = squeezed(written);
    for (const one of [model.document.number, model.machine.serialNumber, ...numbers].map(squeezed)) {
      expect(words).toContain(one);
    }
  });
});
